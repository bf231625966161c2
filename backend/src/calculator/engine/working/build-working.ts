import { analyzeChain } from '../chain/analyze-chain';
import { EngineInputError } from '../errors';
import { CHAIN_FIGURES, STAGE_FIGURES } from '../report';
import type { ChainFigureKey, StageFigureKey, Working, WorkingRequest } from '../report';
import { chainFigure } from '../report/chain-figures';
import { factsOf } from '../report/facts';
import type { ChainFacts } from '../report/facts';
import { stageFigure } from '../report/stage-figures';
import type { ChainInput } from '../types';
import { chainDraft } from './chain-registry';
import { finish } from './scope';
import { stageDraft } from './stage-registry';
import { costWorking, unitCostWorking } from './supply-workings';

/**
 * How one figure came about.
 *
 * @param input whole chain
 * @param request stage (null: the chain), figure key, `unitCost` (stage) or `cost` (chain), and GBW case
 * @throws EngineInputError when the chain is refused, or has no such stage or figure
 */
export function buildWorking(input: ChainInput, request: WorkingRequest): Working {
  const facts = factsOf(input, analyzeChain(input, { cases: [request.gbwCase] }), request.gbwCase);
  return request.stageId === null
    ? chainWorking(facts, request.figure)
    : stageWorking(facts, request.stageId, request.figure);
}

function chainWorking(facts: ChainFacts, key: string): Working {
  if (key === 'cost') return costWorking(facts, facts.gbwCase);
  if (!isChainFigure(key)) throw refused('figure', 'The chain has no such figure.');
  const scope = { facts, figure: chainFigure(facts, key) };
  return finish(scope, chainDraft(scope, key));
}

function stageWorking(facts: ChainFacts, stageId: string, key: string): Working {
  const stage = facts.stages.find((each) => each.stage.id === stageId);
  if (!stage) throw refused('stageId', 'The chain has no such stage.');
  if (key === 'unitCost') return unitCostWorking(facts, stage.index, facts.gbwCase);
  if (!isStageFigure(key)) throw refused('figure', 'A stage has no such figure.');
  const scope = { facts, stage, figure: stageFigure(facts, stage, key) };
  return finish(scope, stageDraft(scope, key));
}

function isChainFigure(key: string): key is ChainFigureKey {
  return (CHAIN_FIGURES as readonly string[]).includes(key);
}

function isStageFigure(key: string): key is StageFigureKey {
  return (STAGE_FIGURES as readonly string[]).includes(key);
}

function refused(path: string, message: string): EngineInputError {
  return new EngineInputError([{ code: 'required', path, message }]);
}
