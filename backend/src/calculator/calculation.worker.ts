import { EngineInputError, calculate, curves, working } from './engine';
import type { ChainInput, CurveRequest, EngineIssue, Working, WorkingRequest } from './engine';
import { warmUp } from './warm-up';

export interface CalculationTask {
  readonly input: ChainInput;
  readonly curves?: CurveRequest;
  readonly working?: WorkingRequest;
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
      curves: include.curves ? curves(input, include.curves) : null,
      working: include.working ? requestedWorking(input, include.working) : null,
    };
    return { json: JSON.stringify(result) };
  });
}

/** By now the chain is accepted: what is refused here is the question, which stands under `include.working`. */
function requestedWorking(input: ChainInput, request: WorkingRequest): Working {
  try {
    return working(input, request);
  } catch (error) {
    if (!(error instanceof EngineInputError)) throw error;
    throw new EngineInputError(error.issues.map((issue) => ({ ...issue, path: `include.working.${issue.path}` })));
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
