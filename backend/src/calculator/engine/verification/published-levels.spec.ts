import { probeChain } from '../chain/probe';
import type { ChainInput } from '../types';
import { nearestPreferred } from '../preferred-values';
import {
  chainInput,
  currentFeedbackDevice,
  currentFeedbackStage,
  matchedBlockDevice,
  matchedBlockStage,
  rcSection,
  voltageFeedbackDevice,
  voltageFeedbackStage,
} from './chain-builder.test-support';
import { HUGE_DB, analysed, bandAt, firstStage, gainAt, gainStage, known } from './engine-figures.test-support';
import { byInput, holdTo, listInput, numberInput } from './published-cases.test-support';

describe('published cases: rise time, slew rate and levels', () => {
  /** Follower driven to a peak level at the top of its band. */
  function follower(slewRateVPerUs: number, peakV: number, topHz: number, gainBandwidthHz = 1e9): ChainInput {
    const input = gainStage(1, gainBandwidthHz, topHz / 2, { slewRateVPerS: { min: slewRateVPerUs * 1e6 } });
    return {
      ...input,
      specification: {
        ...input.specification,
        source: { kind: 'voltage', resistanceOhm: 50, levelKind: 'peak-emf', nominalLevel: peakV, largestLevel: peakV },
        supply: { positiveV: 15, negativeV: -15 },
      },
    };
  }

  holdTo('B01', (published) => {
    const stage = firstStage(gainStage(1, numberInput(published, 'cornerHz'), 1e3));
    return { riseTimeNs: known(stage.riseTimeS) * 1e9 };
  });

  holdTo('B02', (published) => {
    const gbw = numberInput(published, 'gainBandwidthHz');
    const slew = numberInput(published, 'slewRateVPerUs');
    // The peak that just needs the whole slew rate at the unity-gain frequency.
    const needed = known(firstStage(follower(slew, 1, gbw, gbw)).slewNeededVPerS);
    return {
      stepV: (slew * 1e6) / needed,
      riseTimeUs: known(firstStage(follower(slew, 1, gbw / 100, gbw)).riseTimeS) * 1e6,
    };
  });

  holdTo('B03', (published) => {
    const peakV = numberInput(published, 'peakV');
    const slew = numberInput(published, 'slewRateVPerUs');
    const fullPowerHz = known(firstStage(follower(slew, peakV, 1e3)).fullPowerBandwidthHz);
    const atFiveTimes = firstStage(follower(slew, peakV, 5 * fullPowerHz));
    return {
      fullPowerKHz: fullPowerHz / 1e3,
      peakAtFiveTimesV: (peakV * atFiveTimes.slewAvailable!.value) / known(atFiveTimes.slewNeededVPerS),
    };
  });

  holdTo('B05', (published) => {
    const input = follower(numberInput(published, 'slewRateVPerUs'), numberInput(published, 'peakV'), 1e3);
    return { fullPowerKHz: known(firstStage(input).fullPowerBandwidthHz) / 1e3 };
  });

  holdTo('B07', (published) => {
    const gain = numberInput(published, 'gain');
    const gbw = numberInput(published, 'gainBandwidthHz');
    const slewRateVPerS = { min: numberInput(published, 'slewRateVPerUs') * 1e6 };
    const corner = known(firstStage(gainStage(gain, gbw, 1e3, { slewRateVPerS })).cornerUpperHz);
    // The band's top is twice its centre: put the top at the corner.
    const stage = firstStage(gainStage(gain, gbw, corner / 2, { slewRateVPerS }));
    const peakPerSlew = known(stage.outputPeakV) / known(stage.slewNeededVPerS);
    return { cornerKHz: corner / 1e3, peakV: peakPerSlew * stage.slewAvailable!.value };
  });

  holdTo('I17', (published) => {
    const resistanceOhm = numberInput(published, 'resistanceOhm');
    const level = numberInput(published, 'powerDbm');
    const device = matchedBlockDevice('through', resistanceOhm, 0);
    const input = chainInput([matchedBlockStage('s', 'through')], [device], {
      source: {
        kind: 'voltage',
        resistanceOhm,
        levelKind: 'available-power',
        nominalLevel: level,
        largestLevel: level,
      },
      load: { resistanceOhm },
    });
    const peakV = known(analysed(input).outputPeakV);
    return { rmsMv: (1e3 * peakV) / Math.SQRT2, peakToPeakMv: 2e3 * peakV };
  });
});

describe('published cases: noise', () => {
  /** A resistor in series with an open input: its own noise is all that is added. */
  function resistorNoise(ohm: number, ambientK: number): number {
    const input = chainInput([rcSection('r', { seriesOhm: ohm })], [], {
      load: { resistanceOhm: null },
      ambientK,
      ...bandAt(1e3),
    });
    return known(analysed(input).inputNoise);
  }

  for (const id of ['G01', 'G02', 'G17']) {
    holdTo(id, (published) =>
      byInput(
        listInput(published, 'resistancesOhm'),
        (ohm) => 1e9 * resistorNoise(ohm, numberInput(published, 'ambientK')),
      ),
    );
  }

  holdTo('G04', (published) => {
    const density = resistorNoise(numberInput(published, 'resistanceOhm'), numberInput(published, 'ambientK'));
    return { noiseUv: 1e6 * density * Math.sqrt(numberInput(published, 'bandwidthHz')) };
  });

  holdTo('G12', (published) => {
    const device = voltageFeedbackDevice('a', 1e12, {
      openLoopGainDb: HUGE_DB,
      voltageNoiseVPerRtHz: { typ: numberInput(published, 'voltageNoiseNv') * 1e-9 },
      currentNoiseAPerRtHz: { typ: numberInput(published, 'currentNoisePa') * 1e-12 },
    });
    const sourceOhm = numberInput(published, 'sourceOhm');
    const feedbackOhm = numberInput(published, 'feedbackOhm');
    const stage = voltageFeedbackStage('s', 'a', 'non-inverting', feedbackOhm, numberInput(published, 'gainOhm'));
    const input = chainInput([stage], [device], {
      source: { kind: 'voltage', resistanceOhm: sourceOhm, levelKind: 'peak-emf' },
      ambientK: numberInput(published, 'ambientK'),
      ...bandAt(1e6),
    });
    const chain = analysed(input);
    // With the source's own noise: the noise factor times it.
    const added = known(chain.inputNoise);
    const factor = 10 ** (known(chain.noiseFigureDb) / 10);
    const inputNv = 1e9 * Math.sqrt((added * added * factor) / (factor - 1));
    return { outputNv: inputNv * gainAt(input, 1e6), inputNv };
  });

  holdTo('H01', (published) => {
    const noiseFigures = listInput(published, 'noiseFiguresDb');
    const devices = listInput(published, 'gainsDb').map((gainDb, k) =>
      matchedBlockDevice(`b${k}`, 50, gainDb, { noiseFigureDb: { typ: noiseFigures[k] } }),
    );
    const stages = devices.map(({ id }) => matchedBlockStage(`s-${id}`, id));
    const chain = analysed(chainInput(stages, devices, { load: { resistanceOhm: 50 } }), 'typical');
    const noiseFigureDb = known(chain.noiseFigureDb);
    const noiseFactor = 10 ** (noiseFigureDb / 10);
    return { noiseFactor, noiseFigureDb, noiseTemperatureK: 290 * (noiseFactor - 1) };
  });

  holdTo('H10', (published) => {
    const sourceOhm = numberInput(published, 'sourceOhm');
    // A block of 3.0103 dB of noise figure adds as much as the source has available: k·T0 per hertz.
    const device = matchedBlockDevice('b', sourceOhm, 0, { noiseFigureDb: { typ: 10 * Math.log10(2) } });
    const input = chainInput([matchedBlockStage('s', 'b')], [device], { load: { resistanceOhm: sourceOhm } });
    const watts = known(analysed(input, 'typical').inputNoise) ** 2 / (4 * sourceOhm);
    return { densityDbm: 10 * Math.log10(watts * 1e3) };
  });
});

describe('published cases: current feedback', () => {
  const Z0_HUGE = { typ: 1e15 };

  holdTo('F01', (published) => {
    const sum = numberInput(published, 'sumOhm');
    const rb = numberInput(published, 'invertingInputOhm');
    const [low, high] = listInput(published, 'noiseGains');
    const reference = sum - low * rb;
    const device = currentFeedbackDevice('c', 300e6, low, reference, {
      invertingInputResistanceOhm: { typ: rb },
      openLoopTransimpedanceOhm: Z0_HUGE,
    });
    // The feedback resistor at the higher gain for which the first-order corner stays that of the reference circuit.
    const corner = (feedbackOhm: number): number => {
      const stage = currentFeedbackStage('s', 'c', 'non-inverting', feedbackOhm, feedbackOhm / (high - 1));
      return known(firstStage(chainInput([stage], [device], bandAt(1e6))).cornerFirstOrderHz);
    };
    const atKiloohm = corner(1000);
    const constant = atKiloohm * (1000 + high * rb);
    const at8Ohm = constant / 300e6 - high * rb;
    expect(corner(at8Ohm) / 300e6).toBeCloseTo(1, 9);
    return { at2Ohm: reference, at8Ohm, nearestE96Ohm: nearestPreferred(reference, 'E96') };
  });

  holdTo('F02', (published) => {
    const feedbackOhm = numberInput(published, 'feedbackOhm');
    const noiseGain = numberInput(published, 'noiseGain');
    const device = currentFeedbackDevice('c', 100e6, 1, feedbackOhm, {
      invertingInputResistanceOhm: { typ: numberInput(published, 'invertingInputOhm') },
      openLoopTransimpedanceOhm: Z0_HUGE,
    });
    const corner = (gain: number): number => {
      const gainOhm = gain === 1 ? null : feedbackOhm / (gain - 1);
      const stage = currentFeedbackStage('s', 'c', 'non-inverting', feedbackOhm, gainOhm);
      return known(firstStage(chainInput([stage], [device], bandAt(1e6))).cornerUpperHz);
    };
    return { ratio: corner(noiseGain) / corner(1) };
  });

  it('at its reference circuit the complete model is at half power of the ideal gain at the stated bandwidth', () => {
    const device = currentFeedbackDevice('c', 200e6, 2, 750, {
      invertingInputResistanceOhm: { typ: 25 },
      openLoopTransimpedanceOhm: { typ: 800e3 },
      outputResistanceOhm: { typ: 15 },
      secondPoleHz: 500e6,
    });
    const stage = currentFeedbackStage('s', 'c', 'non-inverting', 750, 750);
    const input = chainInput([stage], [device], { load: { resistanceOhm: null }, ...bandAt(1e6) });
    expect(Math.hypot(...Object.values(probeChain(input, 'minimum', 200e6).gain)) / 2).toBeCloseTo(Math.SQRT1_2, 9);
    expect(known(firstStage(input).cornerUpperHz) / 200e6).toBeCloseTo(1, 9);
  });
});
