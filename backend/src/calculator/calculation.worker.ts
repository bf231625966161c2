import { EngineInputError, calculate, curves, tryDevices, working } from './engine';
import type { ChainInput, CurveRequest, Device, EngineIssue, WorkingRequest } from './engine';
import { warmUp } from './warm-up';

interface CalculationInclude {
  readonly curves?: CurveRequest;
  readonly working?: WorkingRequest;
}

export interface CalculationTask extends CalculationInclude {
  readonly input: ChainInput;
}

export interface CandidatesTask {
  readonly input: ChainInput;
  readonly stageId: string;
  readonly candidates: readonly Device[];
}

/** A refusal travels as data: class instances do not survive the way between threads. */
export type Refusal = { readonly issues: readonly EngineIssue[] };
/** Written out already: text crosses between threads for a fraction of what its objects would cost. */
export type CalculationAnswer = { readonly json: string } | Refusal;
export type CandidatesAnswer = CalculationAnswer;

/** One live preview. */
export function runCalculation({ input, ...include }: CalculationTask): CalculationAnswer {
  return refusable(() => {
    const result = {
      report: calculate(input),
      curves: asked('curves', include.curves, (request) => curves(input, request)),
      working: asked('working', include.working, (request) => working(input, request)),
    };
    return { json: JSON.stringify(result) };
  });
}

/** A portion of the devices that are tried in one stage. */
export function runCandidates({ input, stageId, candidates }: CandidatesTask): CandidatesAnswer {
  return refusable(() => ({ json: JSON.stringify(tryDevices(input, stageId, candidates)) }));
}

/** By now the chain is accepted: what is refused here is the question, which stands under `include`. */
function asked<Q, A>(name: keyof CalculationInclude, question: Q | undefined, answer: (question: Q) => A): A | null {
  if (!question) return null;
  try {
    return answer(question);
  } catch (error) {
    if (!(error instanceof EngineInputError)) throw error;
    throw new EngineInputError(error.issues.map((issue) => ({ ...issue, path: `include.${name}.${issue.path}` })));
  }
}

/** Runs the calculator; what it refuses comes back as its issues. */
function refusable<T>(run: () => T): T | Refusal {
  try {
    return run();
  } catch (error) {
    if (error instanceof EngineInputError) return { issues: error.issues };
    throw error;
  }
}

warmUp((input) => {
  runCalculation({ input });
  runCandidates({ input, stageId: '2', candidates: input.devices });
});
