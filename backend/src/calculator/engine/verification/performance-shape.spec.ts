import { curves, tryDevices } from '../index';
import type { ChainInput, Device, Stage } from '../types';
import {
  chainInput,
  currentFeedbackStage,
  voltageFeedbackDevice,
  voltageFeedbackStage,
} from './chain-builder.test-support';
import { receiverDevices, DRIVER } from './ultrasonic-receiver.test-support';

/** Five times what the bench holds, in processor time, which a busy machine does not stretch. */
const SWEEP_LIMIT_MS = 25;
const PICKER_LIMIT_MS = 750;

/** Processor time of every round, ascending. */
function roundsMs(rounds: number, action: () => unknown): number[] {
  const durations: number[] = [];
  action();
  for (let i = 0; i < rounds; i++) {
    const start = process.cpuUsage();
    action();
    const { user, system } = process.cpuUsage(start);
    durations.push((user + system) / 1e3);
  }
  return durations.sort((a, b) => a - b);
}

const medianMs = (rounds: number, action: () => unknown): number => roundsMs(rounds, action)[Math.floor(rounds / 2)];

const parasitics = {
  outputResistanceOhm: { typ: 30 },
  commonModeCapacitanceF: { typ: 2e-12 },
  differentialCapacitanceF: { typ: 1e-12 },
  phaseMarginDeg: 60,
} as const;

/** Stages of every kind of loop, with parasitics and couplings. */
function chainOf(count: number): ChainInput {
  const stages: Stage[] = Array.from({ length: count }, (_, k): Stage => {
    const id = `s${k}`;
    if (k % 4 === 3) return currentFeedbackStage(id, DRIVER, 'inverting', 500, 250, { couplingF: 1e-8 });
    const coupled = { couplingF: 1e-9, biasOhm: 1e4, isolationOhm: 20 };
    return k % 2 === 0
      ? voltageFeedbackStage(id, 'v', 'non-inverting', 300, 100, coupled)
      : voltageFeedbackStage(id, 'v', 'inverting', 1000, 300, { feedbackF: 1e-12 });
  });
  return chainInput(stages, [voltageFeedbackDevice('v', 1e9, parasitics), ...receiverDevices({ outputOhm: 20 })]);
}

const sweep = (count: number, points: number) => () => curves(chainOf(count), { fromHz: 1e5, toHz: 1e9, points });

describe('how the cost of a calculation grows', () => {
  it('8 stages in three cases at 401 points', () => {
    expect(medianMs(9, sweep(8, 401))).toBeLessThan(SWEEP_LIMIT_MS);
  });

  it('grows in proportion to the points', () => {
    const ratio = medianMs(7, sweep(8, 1601)) / medianMs(7, sweep(8, 401));
    expect(ratio).toBeLessThan(8);
  });

  it('grows in proportion to the stages', () => {
    const ratio = medianMs(7, sweep(24, 401)) / medianMs(7, sweep(6, 401));
    expect(ratio).toBeLessThan(8);
  });

  it('300 devices tried in one stage', () => {
    const candidates: Device[] = Array.from({ length: 300 }, (_, k) =>
      voltageFeedbackDevice(`candidate-${k}`, 50e6 * 1.02 ** k, parasitics),
    );
    const input = chainOf(4);
    let tried = 0;
    // The least disturbed of three: neighbours on the same machine also stretch processor time.
    const [milliseconds] = roundsMs(3, () => {
      tried = tryDevices(input, 's1', candidates).candidates.length;
    });
    expect(tried).toBeGreaterThanOrEqual(300);
    expect(milliseconds).toBeLessThan(PICKER_LIMIT_MS);
  });
});
