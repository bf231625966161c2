import fc from 'fast-check';
import { calculate } from '..';
import { receiver } from '../verification/ultrasonic-receiver.test-support';
import { frequencyAxis, stepDown, stepUp } from './axis';

it('stepDown and stepUp give 1-2-5 steps', () => {
  expect([1e6, 1.9e6, 2e6, 4.9e6, 5e6, 9.9e6].map(stepDown)).toEqual([1e6, 1e6, 2e6, 2e6, 5e6, 5e6]);
  expect([1e6, 1.1e6, 2e6, 2.1e6, 5.1e6].map(stepUp)).toEqual([1e6, 2e6, 2e6, 5e6, 1e7]);
});

it('frequencyAxis contains the band with room on both sides and spans at least two decades', () => {
  fc.assert(
    fc.property(
      fc.double({ min: 1, max: 1e9, noNaN: true }),
      fc.double({ min: 1, max: 1e3, noNaN: true }),
      (low, width) => {
        const axis = frequencyAxis([], low, low * width);
        expect(axis.fromHz).toBeLessThan(low);
        expect(axis.toHz).toBeGreaterThan(low * width);
        expect(axis.toHz / axis.fromHz).toBeGreaterThanOrEqual(100 * (1 - 1e-9));
      },
    ),
  );
});

describe('lanes of the receiver (scenario figures: GBW/NG and GBW/(3·NG))', () => {
  const report = calculate(receiver('Baseline'));
  const lane = (index: number) => report.stages[index].cases.minimum.lane;

  it('S2 is solid to 75/(11·3) = 2.273 MHz, its tick at 6.818 MHz, the typical one at 100/11 = 9.091 MHz', () => {
    expect(lane(1).solidToHz! / 1e6).toBeCloseTo(2.2727, 3);
    expect(lane(1).cornerHz! / 1e6).toBeCloseTo(6.8182, 3);
    expect(lane(1).typicalCornerHz! / 1e6).toBeCloseTo(9.0909, 3);
  });

  it('a band that ends in the solid part is clear, beyond the tick over', () => {
    expect(lane(0).solidToHz).toBeGreaterThan(lane(0).bandHighHz);
    expect(lane(1).cornerHz).toBeLessThan(lane(1).bandHighHz);
  });

  it('current feedback is solid to its corner over the bandwidth target: 150/2 MHz', () => {
    expect(lane(3).solidToHz! / 1e6).toBeCloseTo(75, 2);
    expect(lane(3).cornerHz! / 1e6).toBeCloseTo(150, 2);
  });

  // Typical corners 160, 9.09, 70 and 180 MHz: 0.013 + 2.920 + 0.070 + 0.011 dB at 8.90 MHz.
  it("the chain's lane ends where its weakest stage and its own corner (6.67 MHz) do", () => {
    const chain = report.cases.minimum.lane;
    expect(chain.solidToHz! / 1e6).toBeCloseTo(2.2727, 3);
    expect(chain.cornerHz! / 1e6).toBeCloseTo(6.67, 2);
    expect(chain.description).toBe(
      'Chain: target met up to 2.27 MHz, limit at 6.67 MHz, typically 8.90 MHz; band 3.00 MHz to 7.00 MHz.',
    );
  });

  it('one axis holds every mark of every case', () => {
    for (const stage of report.stages) {
      for (const { lane: each } of Object.values(stage.cases)) {
        for (const mark of [each.solidToHz, each.cornerHz, each.typicalCornerHz]) {
          expect(mark).toBeGreaterThan(report.axis.fromHz);
          expect(mark).toBeLessThan(report.axis.toHz);
        }
      }
    }
  });
});
