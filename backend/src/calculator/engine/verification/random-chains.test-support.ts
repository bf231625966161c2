import type { ChainInput, DatasheetValue, Device, Load, Source, Stage, VoltageFeedbackStage } from '../types';
import {
  chainInput,
  currentFeedbackDevice,
  matchedBlockDevice,
  voltageFeedbackDevice,
} from './chain-builder.test-support';

/** Small seeded generator (mulberry32, public domain algorithm): the same seed gives the same chains everywhere. */
export class SeededRandom {
  constructor(private state: number) {}

  next(): number {
    this.state = (this.state + 0x6d2b79f5) | 0;
    let t = Math.imul(this.state ^ (this.state >>> 15), 1 | this.state);
    t = (t + Math.imul(t ^ (t >>> 7), 61 | t)) ^ t;
    return ((t ^ (t >>> 14)) >>> 0) / 4294967296;
  }

  between(low: number, high: number): number {
    return low + (high - low) * this.next();
  }

  logBetween(low: number, high: number): number {
    return low * (high / low) ** this.next();
  }

  integer(low: number, high: number): number {
    return low + Math.floor(this.next() * (high - low + 1));
  }

  chance(probability: number): boolean {
    return this.next() < probability;
  }

  pick<T>(values: readonly T[]): T {
    return values[Math.floor(this.next() * values.length)];
  }

  maybe<T>(probability: number, make: () => T): T | undefined {
    return this.chance(probability) ? make() : undefined;
  }

  typ(probability: number, low: number, high: number): DatasheetValue | undefined {
    return this.maybe(probability, () => ({ typ: this.logBetween(low, high) }));
  }
}

/** A chain of all kinds with all parasitics, each there or not; 1 to 8 stages. */
export function randomChain(seed: number): ChainInput {
  const random = new SeededRandom(seed);
  const stages: Stage[] = [];
  const devices: Device[] = [];
  const count = random.integer(1, 8);
  for (let k = 0; k < count; k++) {
    const device = randomDevice(random, `d${k}`);
    const stage = randomStage(random, k, device);
    if ('topology' in stage && stage.topology === 'transimpedance' && k > 0) stages.push(notFromZeroOhm(stages.pop()!));
    stages.push(stage);
    if ('deviceId' in stage) devices.push(device);
  }
  const source = randomSource(random);
  return chainInput(stages, devices, {
    source,
    load: randomLoad(random),
    gainBasis: source.kind === 'current' ? 'transimpedance' : 'voltage',
    ...(random.chance(0.5) ? { ambientK: random.between(233, 398) } : {}),
  });
}

/** The inverting node of a transimpedance stage cannot be fed from 0 Ω: a resistor behind what stands in front. */
function notFromZeroOhm(front: Stage): Stage {
  if (front.kind === 'matched-block') return front;
  if (front.kind === 'rc-section') return { ...front, seriesOhm: front.seriesOhm ?? 100 };
  return { ...front, isolationOhm: front.isolationOhm ?? 50 };
}

function randomSource(random: SeededRandom): Source {
  if (random.chance(0.6)) {
    return {
      kind: 'voltage',
      resistanceOhm: random.logBetween(1, 1e5),
      levelKind: 'peak-emf',
      nominalLevel: 1e-4,
      largestLevel: 1e-3,
    };
  }
  return {
    kind: 'current',
    resistanceOhm: random.logBetween(1e3, 1e8),
    capacitanceF: random.logBetween(1e-12, 1e-10),
    nominalLevel: 1e-7,
    largestLevel: 1e-6,
    dcCurrentA: 1e-9,
  };
}

function randomLoad(random: SeededRandom): Load {
  return {
    resistanceOhm: random.chance(0.8) ? random.logBetween(20, 1e5) : null,
    ...(random.chance(0.5) ? { capacitanceF: random.logBetween(1e-12, 1e-9) } : {}),
  };
}

function randomDevice(random: SeededRandom, id: string): Device {
  const draw = random.next();
  if (draw < 0.55) return randomVoltageFeedback(random, id);
  return draw < 0.78 ? randomCurrentFeedback(random, id) : randomBlock(random, id);
}

function bandwidthColumns(random: SeededRandom, low: number, high: number): DatasheetValue {
  const typ = random.logBetween(low, high);
  return random.chance(0.6) ? { min: typ * random.between(0.5, 0.95), typ } : { typ };
}

function amplifierValues(random: SeededRandom) {
  return {
    supplyCurrentA: { typ: 5e-3, max: 6e-3 },
    slewRateVPerS: { typ: random.logBetween(1e6, 5e9) },
    headroomPositiveV: { typ: 1 },
    headroomNegativeV: { typ: 1.2 },
    outputCurrentA: { typ: 0.05 },
    inputOffsetVoltageV: { typ: 1e-3 },
    inputBiasCurrentA: { typ: 1e-6 },
    outputResistanceOhm: random.typ(0.7, 0.1, 200),
    inputResistanceOhm: random.typ(0.6, 1e4, 1e9),
    commonModeCapacitanceF: random.typ(0.7, 1e-13, 2e-11),
    voltageNoiseVPerRtHz: { typ: random.logBetween(5e-10, 5e-8) },
    currentNoiseAPerRtHz: { typ: random.logBetween(1e-15, 1e-10) },
    voltageNoiseCornerHz: random.maybe(0.5, () => random.logBetween(10, 1e5)),
    currentNoiseCornerHz: random.maybe(0.5, () => random.logBetween(10, 1e5)),
  };
}

function randomVoltageFeedback(random: SeededRandom, id: string): Device {
  const common = amplifierValues(random);
  const second = random.next();
  return withoutUndefined(
    voltageFeedbackDevice(id, 1, {
      ...common,
      gainBandwidthHz: bandwidthColumns(random, 1e6, 5e9),
      openLoopGainDb: random.maybe(0.7, () => ({ typ: random.between(55, 130) })),
      differentialCapacitanceF: random.typ(0.6, 1e-13, 1e-11),
      secondPoleHz: second < 0.35 ? random.logBetween(1e7, 1e10) : undefined,
      phaseMarginDeg: second > 0.6 ? random.between(20, 85) : undefined,
      phaseMarginGain: second > 0.8 ? random.between(1, 20) : undefined,
      minimumStableGain: random.maybe(0.5, () => random.pick([1, 2, 5, 10])),
    }),
  );
}

function randomCurrentFeedback(random: SeededRandom, id: string): Device {
  const feedbackOhm = random.logBetween(200, 2000);
  const bandwidth = bandwidthColumns(random, 1e7, 2e9);
  return withoutUndefined(
    currentFeedbackDevice(id, 1, random.between(1, 10), feedbackOhm, {
      ...amplifierValues(random),
      referenceBandwidthHz: bandwidth,
      invertingInputResistanceOhm: { typ: random.logBetween(5, 100) },
      openLoopTransimpedanceOhm: { typ: random.logBetween(1e5, 5e6) },
      invertingCurrentNoiseAPerRtHz: { typ: random.logBetween(1e-13, 1e-10) },
      invertingBiasCurrentA: { typ: 1e-6 },
      secondPoleHz: random.maybe(0.5, () => random.between(0.6, 5) * bandwidth.typ!),
    }),
  );
}

function randomBlock(random: SeededRandom, id: string): Device {
  const gainDb = random.between(-20, 25);
  return withoutUndefined(
    matchedBlockDevice(id, random.pick([50, 75, 300]), gainDb, {
      lowerCornerHz: random.typ(0.5, 1e3, 1e6),
      upperCornerHz: random.maybe(0.6, () => bandwidthColumns(random, 1e7, 5e9)),
      noiseFigureDb: gainDb > 0 || random.chance(0.5) ? { typ: random.between(0.5, 15) } : undefined,
    }),
  );
}

function randomStage(random: SeededRandom, k: number, device: Device): Stage {
  const base = { id: `s${k}`, name: `stage ${k}` };
  if (random.chance(0.15)) return randomSection(random, base);
  if (device.kind === 'matched-block') return { ...base, kind: 'matched-block', deviceId: device.id };
  if (device.kind === 'current-feedback') {
    const topology = random.pick(['non-inverting', 'inverting'] as const);
    return withoutUndefined({
      ...base,
      kind: 'current-feedback' as const,
      deviceId: device.id,
      topology,
      ...feedbackParts(random, topology),
      feedbackF: random.maybe(0.2, () => random.logBetween(1e-14, 1e-12)),
    });
  }
  const topology = random.pick(['non-inverting', 'follower', 'inverting', 'transimpedance'] as const);
  return withoutUndefined({
    ...base,
    kind: 'voltage-feedback' as const,
    deviceId: device.id,
    topology,
    ...feedbackParts(random, topology),
    feedbackF: random.maybe(0.4, () => random.logBetween(1e-14, 2e-11)),
  });
}

function feedbackParts(random: SeededRandom, topology: VoltageFeedbackStage['topology']) {
  const noGainResistor = topology === 'follower' || topology === 'transimpedance';
  const feedbackOhm = topology === 'follower' && random.chance(0.5) ? 0 : random.logBetween(100, 1e5);
  return {
    feedbackOhm,
    gainOhm: noGainResistor ? null : random.logBetween(20, 1e4),
    strayF: random.maybe(0.5, () => random.logBetween(1e-13, 5e-12)),
    terminationOhm: random.maybe(0.3, () => random.logBetween(30, 1e4)),
    isolationOhm: random.maybe(0.5, () => random.logBetween(1, 200)),
    ...inputCoupling(random, topology),
  };
}

function inputCoupling(random: SeededRandom, topology: VoltageFeedbackStage['topology']) {
  const plusFed = topology === 'non-inverting' || topology === 'follower';
  const coupled = random.chance(0.5);
  const biased = plusFed && (coupled || random.chance(0.3));
  return {
    couplingF: coupled ? random.logBetween(1e-11, 1e-6) : undefined,
    biasOhm: biased ? random.logBetween(1e3, 1e6) : undefined,
  };
}

function randomSection(random: SeededRandom, base: { id: string; name: string }): Stage {
  const seriesF = random.maybe(0.4, () => random.logBetween(1e-11, 1e-6));
  return withoutUndefined({
    ...base,
    kind: 'rc-section' as const,
    seriesOhm: random.maybe(0.7, () => random.logBetween(1, 1e4)),
    seriesF,
    shuntOhm: seriesF !== undefined || random.chance(0.6) ? random.logBetween(50, 1e5) : undefined,
    shuntF: random.maybe(0.6, () => random.logBetween(1e-13, 1e-9)),
  });
}

function withoutUndefined<T extends object>(value: T): T {
  return Object.fromEntries(Object.entries(value).filter(([, entry]) => entry !== undefined)) as T;
}
