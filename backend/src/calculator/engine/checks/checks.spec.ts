import { calculate } from '..';
import type { ChainInput, ChainReport, CheckId, Requirements, Verdict, VoltageFeedbackDevice } from '..';
import {
  chainInput,
  currentFeedbackDevice,
  currentFeedbackStage,
  matchedBlockDevice,
  matchedBlockStage,
  voltageFeedbackDevice,
  voltageFeedbackStage,
} from '../verification/chain-builder.test-support';
import { badness, worstCheck, worstVerdict } from './verdict-order';
import { makeCheck } from './make-check';

/** Everything entered, nothing parasitic: every check can be judged. */
const COMPLETE: Partial<VoltageFeedbackDevice> = {
  openLoopGainDb: { typ: 200 },
  minimumStableGain: 1,
  phaseMarginDeg: 90,
  outputResistanceOhm: { typ: 0 },
  slewRateVPerS: { min: 100e6 },
  headroomPositiveV: { max: 1 },
  headroomNegativeV: { max: 1 },
  outputCurrentA: { min: 50e-3 },
  inputOffsetVoltageV: { max: 0 },
  inputBiasCurrentA: { max: 0 },
  supplyVoltageV: { min: 5, max: 12 },
  supplyCurrentA: { typ: 10e-3 },
};

/** Non-inverting ×10 in the band 3 to 7 MHz, 1 mV in; GBW 1 GHz unless given. */
function chain(
  device: Partial<VoltageFeedbackDevice> = {},
  requirements: Requirements = {},
  more: Partial<ChainInput['specification']> = {},
): ChainInput {
  const part = voltageFeedbackDevice('d', 1000e6, { ...COMPLETE, ...device });
  const stages = [voltageFeedbackStage('s', 'd', 'non-inverting', 900, 100)];
  return chainInput(stages, [part], { ...more, requirements });
}

function find(report: ChainReport, id: CheckId) {
  return [...report.stages.flatMap((stage) => stage.checks), ...report.checks].find((check) => check.id === id);
}

const verdictOf = (input: ChainInput, id: CheckId): Verdict | undefined => find(calculate(input), id)?.verdict;
const gbw = (hertz: number): Partial<VoltageFeedbackDevice> => ({ gainBandwidthHz: { min: hertz } });

describe('order of badness', () => {
  it('is over > unknown > tight > clear', () => {
    expect(['clear', 'tight', 'unknown', 'over'].map((verdict) => badness(verdict as Verdict))).toEqual([0, 1, 2, 3]);
    expect(worstVerdict(['tight', 'unknown', 'clear'])).toBe('unknown');
    expect(worstVerdict([])).toBe('clear');
  });

  it('among equals takes the one further beyond its limit, and the cause before the symptom', () => {
    const over = (id: CheckId, value: number) =>
      makeCheck(
        id,
        id,
        'over',
        () => id,
        () => ({
          actual: { value, unit: 'ratio', digits: 3 },
          limit: { value: 1, unit: 'ratio', digits: 1 },
        }),
      );
    const near = over('gbw', 0.9);
    const far = over('gbw', 0.2);
    expect(worstCheck([near, far])).toBe(far);
    expect(worstCheck([over('slew', 0.1), near])).toBe(near);
    expect(worstCheck([])).toBeNull();
  });
});

describe('GBW limit: noise gain 10 at 7 MHz takes 70 MHz, target ×3 takes 210 MHz', () => {
  it.each([
    [69.999_9e6, 'over'],
    [70e6, 'tight'],
    [209.999e6, 'tight'],
    [210e6, 'clear'],
  ] as const)('%s Hz is %s', (hertz, verdict) => {
    expect(verdictOf(chain(gbw(hertz)), 'gbw')).toBe(verdict);
  });

  it('compares before rounding and prints the digits that show the side', () => {
    const check = find(calculate(chain(gbw(69.999_9e6))), 'gbw')!;
    expect(check.actual).toMatchObject({ digits: 6 });
    expect(check.sentence).toContain('uses 70.0 MHz');
    expect(check.sentence).toContain('guarantees 69.9999 MHz');
  });

  it('a typical value is never called guaranteed', () => {
    const { sentence } = find(calculate(chain({ gainBandwidthHz: { typ: 90e6 } })), 'gbw')!;
    expect(sentence).toContain('is taken at 63.0 MHz (typical × 0.7, assumed)');
    expect(sentence).not.toContain('guarantees');
  });
});

describe('closed-loop bandwidth: exact corner against 7 MHz and twice that', () => {
  it.each([
    [69e6, 'over'],
    [71e6, 'tight'],
    [139e6, 'tight'],
    [141e6, 'clear'],
  ] as const)('GBW %s Hz, corner a tenth of it, is %s', (hertz, verdict) => {
    expect(verdictOf(chain(gbw(hertz)), 'bandwidth')).toBe(verdict);
  });
});

describe('levels: 10 mV peak at 7 MHz needs 0.4398 V/µs', () => {
  it.each([
    [0.439e6, 'over'],
    [0.44e6, 'tight'],
    [0.879e6, 'tight'],
    [0.88e6, 'clear'],
  ] as const)('a slew rate of %s V/s is %s', (slew, verdict) => {
    expect(verdictOf(chain({ slewRateVPerS: { min: slew } }), 'slew')).toBe(verdict);
  });

  // ±5 V: swing left is 5 V minus the distance; 1 dB is a factor of 1.122.
  it.each([
    [4.991, 'over'],
    [4.99, 'tight'],
    [4.9889, 'tight'],
    [4.9887, 'clear'],
    [5.5, 'over'],
  ] as const)('%s V from the rails is %s for 10 mV peak', (volt, verdict) => {
    const rails = { headroomPositiveV: { max: volt }, headroomNegativeV: { max: 1 } };
    expect(verdictOf(chain(rails), 'swing')).toBe(verdict);
  });

  // 10 mV peak into 1 kΩ load and 1 kΩ of feedback: 20 µA peak.
  it.each([
    [19.9e-6, 'over'],
    [20.1e-6, 'tight'],
    [22.5e-6, 'clear'],
  ] as const)('an output current of %s A is %s', (ampere, verdict) => {
    expect(verdictOf(chain({ outputCurrentA: { min: ampere } }), 'output-current')).toBe(verdict);
  });

  it.each([
    [{ min: 5, max: 10 }, 'clear'],
    [{ min: 5, max: 9.9 }, 'over'],
    [{ min: 10.1, max: 36 }, 'over'],
    [{ max: 36 }, 'clear'],
  ] as const)('10 V in all on a device for %j is %s', (supplyVoltageV, verdict) => {
    expect(verdictOf(chain({ supplyVoltageV }), 'supply-voltage')).toBe(verdict);
  });
});

describe('missing data is unknown and names what is missing', () => {
  it.each([
    ['slew', { slewRateVPerS: undefined }, /slew rate of D is not entered\. Enter it on the device page/],
    ['swing', { headroomPositiveV: undefined }, /positive rail of D is not entered/],
    ['output-current', { outputCurrentA: undefined }, /output current of D is not entered/],
    ['supply-voltage', { supplyVoltageV: undefined }, /supply range of D is not entered/],
  ] as const)('%s', (id, device, words) => {
    const check = find(calculate(chain(device)), id)!;
    expect(check.verdict).toBe('unknown');
    expect(check.sentence).toMatch(words);
  });

  it('a level that is not set is unknown and is entered in the specification', () => {
    const source = { kind: 'voltage', resistanceOhm: 50, levelKind: 'peak-emf' } as const;
    const check = find(calculate(chain({}, {}, { source })), 'slew')!;
    expect(check.verdict).toBe('unknown');
    expect(check.sentence).toContain('Enter it in the specification.');
  });

  it('everything that is missing in a stage is said at once', () => {
    const { verdict } = calculate(chain({ slewRateVPerS: undefined, outputCurrentA: undefined }));
    expect(verdict.verdict).toBe('unknown');
    expect(verdict.lead).toBe('S1 cannot be judged: slew rate and output current.');
    expect(verdict.text.match(/Enter it on the device page\./g)).toHaveLength(1);
  });

  it('a chain without stages is unknown', () => {
    const { verdict } = calculate(chainInput([], []));
    expect(verdict).toMatchObject({ verdict: 'unknown', lead: 'The chain has no stages yet.' });
  });
});

describe('requirements of the chain: gain 19.999 dB', () => {
  it.each<[Requirements, CheckId, Verdict | undefined]>([
    [{}, 'gain', undefined],
    [{ gainDb: { target: 20, tolerance: 1 } }, 'gain', 'clear'],
    [{ gainDb: { target: 20.9, tolerance: 1 } }, 'gain', 'tight'],
    [{ gainDb: { target: 21.1, tolerance: 1 } }, 'gain', 'over'],
    // One-sided: 20 % of the gain as a ratio, 1.58 dB.
    [{ minimumGainDb: 18.3 }, 'gain', 'clear'],
    [{ minimumGainDb: 18.6 }, 'gain', 'tight'],
    [{ minimumGainDb: 20.1 }, 'gain', 'over'],
    [{ maximumGainDb: 19.9 }, 'gain', 'over'],
    [{ maximumGainDb: 21 }, 'gain', 'tight'],
    [{ maximumGainDb: 22 }, 'gain', 'clear'],
    [{ upperCornerHz: 101e6 }, 'upper-corner', 'over'],
    [{ upperCornerHz: 99e6 }, 'upper-corner', 'tight'],
    [{ upperCornerHz: 80e6 }, 'upper-corner', 'clear'],
    [{ lowerCornerHz: 1e3 }, 'chain-lower-corner', 'clear'],
    [{ supplyCurrentA: 9.9e-3 }, 'supply-current', 'over'],
    [{ supplyCurrentA: 11e-3 }, 'supply-current', 'tight'],
    [{ supplyCurrentA: 12e-3 }, 'supply-current', 'clear'],
    [{ supplyPowerW: 99e-3 }, 'supply-power', 'over'],
    [{ polarity: 'in-phase' }, 'polarity', 'clear'],
    [{ polarity: 'inverted' }, 'polarity', 'over'],
    [{ inputNoise: 1e-9 }, 'input-noise', 'unknown'],
    [{ costMicros: 1_000_000 }, 'cost', 'unknown'],
    // |T| = GBW/(NG·f) = 20 at 5 MHz: 26.02 dB.
    [{ loopGainDb: 26 }, 'loop-gain', 'clear'],
    [{ loopGainDb: 26.1 }, 'loop-gain', 'over'],
    [{ outputOffsetV: 1e-3 }, 'output-offset', 'clear'],
  ])('%j: %s is %s', (requirements, id, verdict) => {
    expect(verdictOf(chain({}, requirements), id)).toBe(verdict);
  });

  it('a gain that is set too low says so instead of blaming a stage', () => {
    const { sentence } = find(calculate(chain({}, { gainDb: { target: 40, tolerance: 1 } })), 'gain')!;
    expect(sentence).toContain('Even with ideal amplifiers it would be 20.00 dB: 19.00 dB more gain has to be set.');
  });
});

describe('current feedback', () => {
  const stage = (feedbackOhm: number, feedbackF?: number) => {
    const device = currentFeedbackDevice('d', 150e6, 3, 500);
    const set = currentFeedbackStage('s', 'd', 'inverting', feedbackOhm, feedbackOhm / 2, { feedbackF });
    return calculate(chainInput([set], [device])).stages[0];
  };

  it('has no GBW check, and says that it has no GBW', () => {
    const report = stage(500);
    expect(report.checks.some((check) => check.id === 'gbw')).toBe(false);
    expect(report.hasGbw).toBe(false);
    expect(report.cases.minimum.gbwBasis).toBe('has no GBW (current feedback)');
    expect(report.cases.minimum.figures.gbwHave.value).toBeNull();
  });

  it.each([
    [474, 'tight'],
    [475, 'clear'],
    [800, 'clear'],
  ] as const)('Rf of %s Ω against 0.95 × 500 Ω is %s', (ohm, verdict) => {
    expect(stage(ohm).checks.find((check) => check.id === 'feedback-resistor')?.verdict).toBe(verdict);
  });

  it('a bare capacitor across Rf is a caution', () => {
    expect(stage(500, 1e-12).marks).toContainEqual(expect.objectContaining({ kind: 'caution' }));
    expect(stage(500).marks.some((mark) => mark.kind === 'caution')).toBe(false);
  });
});

describe('compression of a block', () => {
  // 1 V peak EMF from 50 Ω into 50 Ω: 0.5 V peak, ×10 dB: 1.581 V peak in 50 Ω = +13.98 dBm.
  const block = (dbm: number | undefined, loadOhm: number | null = 50) => {
    const source = { kind: 'voltage', resistanceOhm: 50, levelKind: 'peak-emf', largestLevel: 1 } as const;
    const device = matchedBlockDevice('d', 50, 10, dbm === undefined ? {} : { outputP1dbDbm: { min: dbm } });
    const specification = { source, load: { resistanceOhm: loadOhm } };
    return find(calculate(chainInput([matchedBlockStage('s', 'd')], [device], specification)), 'compression');
  };

  it.each([
    [13.9, 'over'],
    [14.9, 'tight'],
    [15, 'clear'],
  ] as const)('P1dB of %s dBm is %s', (dbm, verdict) => {
    expect(block(dbm)?.verdict).toBe(verdict);
  });

  it.each([[null], [5]])('counts what is available, not what a load of %s Ω makes of the voltage', (loadOhm) => {
    expect(block(14.9, loadOhm)?.sentence).toBe(block(14.9)?.sentence);
    expect(block(15, loadOhm)?.verdict).toBe('clear');
  });

  it('is no check where the block states no compression point', () => {
    expect(block(undefined)).toBeUndefined();
  });
});

describe('marks never change a verdict', () => {
  it('a lapsed quote, a lifecycle and an unverified device stand beside it', () => {
    const quote = { currency: 'USD', breaks: [{ quantity: 1, unitPriceMicros: 1 }], validUntil: '2026-01-31' };
    const plain = { ...chain({ verified: true, quote }), today: '2026-01-31' };
    const marked = { ...chain({ verified: false, quote, lifecycle: 'obsolete' }), today: '2026-02-01' };
    const kinds = (input: ChainInput) => calculate(input).stages[0].marks.map((mark) => mark.kind);
    expect(kinds(plain)).not.toContain('quote-lapsed');
    expect(kinds(marked)).toEqual(expect.arrayContaining(['quote-lapsed', 'lifecycle', 'not-verified']));
    expect(calculate(marked).verdict).toEqual(calculate(plain).verdict);
  });
});
