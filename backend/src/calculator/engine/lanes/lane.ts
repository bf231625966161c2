import type { ChainFacts, StageFacts } from '../report/facts';
import type { Lane } from '../report';
import { valueText } from '../text/phrases';

/** The two frequencies that a lane is drawn by. */
interface Reach {
  /** The team's targets are still met up to here. */
  readonly solidToHz: number | null;
  /** The device runs out of gain, or the exact corner, whichever comes first. */
  readonly cornerHz: number | null;
}

function lowest(...values: readonly (number | null)[]): number | null {
  const known = values.filter((value): value is number => value !== null && Number.isFinite(value) && value > 0);
  return known.length === 0 ? null : Math.min(...known);
}

function stageReach(facts: ChainFacts, stage: StageFacts): Reach {
  const corner = stage.analysis.cornerUpperHz.value;
  const { targetMetHz, runsOutHz } = stage.analysis;
  const isFilter = stage.stage.kind === 'rc-section';
  const cornerTarget = corner === null ? null : corner / (isFilter ? 1 : facts.policy.bandwidthTarget);
  return { solidToHz: lowest(targetMetHz, cornerTarget), cornerHz: lowest(runsOutHz, corner) };
}

function chainReach(facts: ChainFacts): Reach {
  const corner = facts.chain.cornerUpperHz.value;
  const stages = facts.stages.map((stage) => stageReach(facts, stage));
  const runsOut = facts.stages.map((stage) => stage.analysis.runsOutHz);
  return {
    solidToHz: lowest(corner, ...stages.map((stage) => stage.solidToHz)),
    cornerHz: lowest(corner, ...runsOut),
  };
}

function buildLane(facts: ChainFacts, name: string, lowerHz: number | null, reach: Reach, typical: Reach | null): Lane {
  const { band } = facts.input.specification;
  const lane = {
    lowerHz,
    solidToHz: reach.solidToHz,
    cornerHz: reach.cornerHz,
    typicalCornerHz: typical?.cornerHz ?? null,
    bandLowHz: band.lowHz,
    bandHighHz: band.highHz,
  };
  return { ...lane, description: describe(name, lane) };
}

function describe(name: string, lane: Omit<Lane, 'description'>): string {
  const frequency = (value: number): string => valueText(value, 'Hz');
  const solid = lane.solidToHz === null ? 'target not known' : `target met up to ${frequency(lane.solidToHz)}`;
  const corner = lane.cornerHz === null ? 'no upper limit known' : `limit at ${frequency(lane.cornerHz)}`;
  const typical = lane.typicalCornerHz === null ? '' : `, typically ${frequency(lane.typicalCornerHz)}`;
  const band = `band ${frequency(lane.bandLowHz)} to ${frequency(lane.bandHighHz)}`;
  const from = lane.lowerHz === null ? '' : `from ${frequency(lane.lowerHz)}, `;
  return `${name}: ${from}${solid}, ${corner}${typical}; ${band}.`;
}

function lowerCorner(value: number | null): number | null {
  return value !== null && value > 0 ? value : null;
}

/**
 * A stage's row on the frequency axis: solid while headroom target and bandwidth target are both met, then fading to the
 * frequency where the device runs out of gain for its noise gain or to its exact corner, whichever comes first.
 *
 * @param facts the case shown
 * @param typical the typical case, for the open tick; null: not known
 * @param index position of the stage
 */
export function stageLane(facts: ChainFacts, typical: ChainFacts | null, index: number): Lane {
  const stage = facts.stages[index];
  const typicalReach = typical ? stageReach(typical, typical.stages[index]) : null;
  const lower = lowerCorner(stage.analysis.cornerLowerHz.value);
  return buildLane(facts, stage.label, lower, stageReach(facts, stage), typicalReach);
}

/** The chain's row: its weakest stage and its own exact corner. */
export function chainLane(facts: ChainFacts, typical: ChainFacts | null): Lane {
  const lower = lowerCorner(facts.chain.cornerLowerHz.value);
  return buildLane(facts, 'Chain', lower, chainReach(facts), typical ? chainReach(typical) : null);
}
