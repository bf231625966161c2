import { EngineInputError, calculate, tryDevices } from '..';
import type { CandidateReport, ChainInput } from '..';
import { completeReceiver } from '../verification/complete-receiver.test-support';
import { randomChain } from '../verification/random-chains.test-support';

const baseline = completeReceiver('Baseline');
const report = tryDevices(baseline, 'S2', baseline.devices);
const of = (part: string): CandidateReport => report.candidates.find((each) => each.partNumber === part)!;

describe('devices tried in S2 of the receiver', () => {
  it('puts the cheapest that pass first, then tight, unknown and over', () => {
    expect(report.candidates.map((each) => [each.partNumber, each.verdict])).toEqual([
      ['MRWG-V300', 'clear'],
      ['QUIL-D618', 'clear'],
      ['MRWG-G072', 'over'],
      ['QUIL-D852', 'over'],
    ]);
  });

  it('leaves out devices of another kind', () => {
    expect(report.candidates.some((each) => each.partNumber === 'TLYR-C220')).toBe(false);
  });

  it('gives what each would do here: V300 260/77 = 3.377', () => {
    expect(of('MRWG-V300').headroom.value).toBeCloseTo(260 / 77, 6);
    expect(of('MRWG-V300')).toMatchObject({ reason: '', current: false, chainVerdict: 'tight' });
    expect(of('MRWG-V300').chainText).toMatch(/^flatness 0\.\d\d dB, passes$/);
    // S2 and S3 would both use it: 500 pieces, still the only break.
    expect(of('MRWG-V300').chainCost.amountMicros).toBe(8_950_000);
    expect(of('QUIL-D618').chainText).toBe('cost 11.60 of 9.00 fails');
  });

  it('says why a device fails', () => {
    expect(of('MRWG-G072')).toMatchObject({ current: true, verdict: 'over' });
    expect(of('MRWG-G072').reason).toContain('uses 77.0 MHz; MRWG-G072 guarantees 75.0 MHz');
    expect(of('MRWG-G072').chainText).toBe('gain 58.08 dB and flatness 2.44 dB fail');
    // Minimum stable gain 12 where the noise gain is 11.
    expect(of('QUIL-D852').reason).toBe('Its noise gain of 11 is below 12, the smallest at which QUIL-D852 is stable.');
  });

  it('agrees with the full report of the chain with that device', () => {
    for (const candidate of report.candidates) {
      const stages = baseline.stages.map((stage) =>
        stage.id === 'S2' ? { ...stage, deviceId: candidate.deviceId } : stage,
      ) as ChainInput['stages'];
      const full = calculate({ ...baseline, stages });
      expect(candidate.verdict).toBe(full.stages[1].verdict.verdict);
      expect(candidate.chainVerdict).toBe(full.verdict.verdict);
      expect(candidate.headroom).toEqual(full.stages[1].cases.minimum.figures.headroom);
      expect(candidate.chainCost).toEqual(full.cost);
    }
  });
});

describe('what passes here', () => {
  it('names only what applies, each with its number', () => {
    expect(report.needs.map((need) => need.text)).toEqual([
      'GBW at least 231 MHz',
      'minimum stable gain at most 11',
      // 2π · 7 MHz · 0.1 V = 4.398 V/µs, twice that 8.796.
      'slew rate at least 8.8 V/µs',
      // 0.1 V peak and 1 dB: 0.1122 V.
      'swing at least 113 mV peak on ±5 V',
      expect.stringMatching(/^output current at least \d/) as unknown as string,
      'takes a supply of 10 V',
      // 60 − 18 − 7 − 9 mA.
      'supply current at most 26 mA',
      // 9.00 − 4.10 − 1.45 − 1.95 USD.
      'price at most 1.50 USD',
    ]);
  });

  it('leaves out budgets that are not required, and asks a corner where there is no GBW', () => {
    const free = { ...baseline, specification: { ...baseline.specification, requirements: {} } };
    const ids = tryDevices(free, 'S4', []).needs.map((need) => need.id);
    expect(ids).toEqual(['corner', 'slew', 'swing', 'output-current', 'supply-voltage']);
  });
});

it('refuses a stage that is not there', () => {
  expect(() => tryDevices(baseline, 'S9', [])).toThrow(EngineInputError);
});

it('a device that the model refuses is over with the reason, and stops none of the others', () => {
  const broken = { ...baseline.devices[2], id: 'broken', partNumber: 'MRWG-X001', phaseMarginDeg: 0 };
  const { candidates } = tryDevices(baseline, 'S2', [broken as ChainInput['devices'][number], ...baseline.devices]);
  const refused = candidates.find((each) => each.partNumber === 'MRWG-X001')!;
  expect(refused.verdict).toBe('over');
  expect(refused.reason).toMatch(/phase margin/i);
  expect(candidates.some((each) => each.verdict === 'clear')).toBe(true);
});

it('gives numbers or reasons for every device in random chains', () => {
  for (const seed of [2, 5, 9, 14]) {
    const input = randomChain(seed);
    for (const stage of input.stages) {
      const { candidates, needs } = tryDevices(input, stage.id, input.devices);
      expect(JSON.stringify({ candidates, needs })).not.toMatch(/NaN|Infinity|undefined/);
      for (const each of candidates) {
        for (const figure of [each.gbwHave, each.headroom, each.cornerUpper, each.droopOperating]) {
          expect(figure.value !== null || (figure.reason ?? '') !== '').toBe(true);
        }
      }
    }
  }
});
