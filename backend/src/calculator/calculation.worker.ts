import { EngineInputError, calculate, curves, working } from './engine';
import type { ChainInput, CurveRequest, EngineIssue, WorkingRequest } from './engine';
import { warmUp } from './warm-up';

interface CalculationInclude {
  readonly curves?: CurveRequest;
  readonly working?: WorkingRequest;
}

export interface CalculationTask extends CalculationInclude {
  readonly input: ChainInput;
}

/** A refusal travels as data: class instances do not survive the way between threads. */
export type Refusal = { readonly issues: readonly EngineIssue[] };
/** Written out already: text crosses between threads for a fraction of what its objects would cost. */
export type CalculationAnswer = { readonly json: string } | Refusal;

/** One live preview. Runs in a thread of its own where there is one, so that people typing do not wait for each other. */
export default function runCalculation({ input, ...include }: CalculationTask): CalculationAnswer {
  return refusable(() => {
    const result = {
      report: calculate(input),
      curves: asked('curves', include.curves, (request) => curves(input, request)),
      working: asked('working', include.working, (request) => working(input, request)),
    };
    return { json: JSON.stringify(result) };
  });
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
export function refusable<T>(run: () => T): T | Refusal {
  try {
    return run();
  } catch (error) {
    if (error instanceof EngineInputError) return { issues: error.issues };
    throw error;
  }
}

warmUp((input) => runCalculation({ input }));
