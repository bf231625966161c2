import { EngineInputError, summarize } from '../calculator/engine';
import type { ChainInput } from '../calculator/engine';
import type { OptionSummaryDto } from './dto/summary.dto';

/** What lists show of an option. A chain that cannot be calculated says why and is never green. */
export function optionSummary(input: ChainInput): OptionSummaryDto {
  const { currency } = input;
  const limitMicros = input.specification.requirements.costMicros;
  const costLimit = limitMicros === undefined ? null : { amountMicros: limitMicros, currency };
  try {
    return { ...summarize(input), costLimit };
  } catch (error) {
    if (!(error instanceof EngineInputError)) throw error;
    return { ...notCalculated(error.issues[0]?.message ?? error.message, currency), costLimit };
  }
}

/** The figures of an option that has none, with the reason. */
export function notCalculated(reason: string, currency: string): OptionSummaryDto {
  return {
    verdict: 'unknown',
    lead: 'Cannot be calculated.',
    text: reason,
    worstHeadroom: { value: null, unit: 'ratio', digits: 3, reason },
    worstHeadroomStage: null,
    gain: { value: null, unit: 'dB', digits: 3, reason },
    cost: { amountMicros: null, currency, reason },
    costLimit: null,
    reason,
  };
}
