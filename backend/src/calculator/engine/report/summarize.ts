import type { ChainSummary } from '../report';
import type { ChainInput } from '../types';
import { chainFigure } from './chain-figures';
import { worstHeadroomStage } from './derived';
import { evaluate } from './evaluate';
import { fullLabel } from './facts';
import { chainVerdictReport } from './verdict-report';

/**
 * A chain in one line, for lists: the project's case only and without remedies, so it is cheap.
 *
 * @param input whole chain
 * @throws EngineInputError when the input is refused
 */
export function summarizeChain(input: ChainInput): ChainSummary {
  const judgement = evaluate(input);
  const { facts } = judgement;
  const { verdict, lead, text } = chainVerdictReport(judgement, judgement);
  const worst = worstHeadroomStage(facts);
  return {
    verdict,
    lead,
    text,
    worstHeadroom: chainFigure(facts, 'worstHeadroom'),
    worstHeadroomStage: worst ? fullLabel(worst) : null,
    gain: chainFigure(facts, 'gainOperating'),
    cost: facts.cost.total,
  };
}
