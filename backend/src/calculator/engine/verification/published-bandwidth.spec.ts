import { chainInput, matchedBlockDevice, matchedBlockStage } from './chain-builder.test-support';
import { magnitude } from './complex-matrix.test-support';
import {
  analysed,
  bandAt,
  firstStage,
  gainAt,
  gainStage,
  known,
  openLoopGainAt,
  stabilityOf,
} from './engine-figures.test-support';
import { probeChain } from '../chain/probe';
import { byInput, holdTo, listInput, numberInput } from './published-cases.test-support';

describe('published cases: bandwidth of feedback amplifiers', () => {
  holdTo('A01', (published) => {
    const gbw = numberInput(published, 'gainBandwidthHz');
    return byInput(listInput(published, 'gains'), (gain) => {
      if (gain < 100000) return known(firstStage(gainStage(gain, gbw, 100)).cornerFirstOrderHz);
      // Open loop: where |A| is half power of its value at DC.
      const input = gainStage(100, gbw, 100, { openLoopGainDb: { typ: 100 } });
      expect(openLoopGainAt(input, 10) / 100000).toBeCloseTo(Math.SQRT1_2, 9);
      return 10;
    });
  });

  holdTo('A02', (published) => {
    const gbw = numberInput(published, 'gainBandwidthHz');
    return byInput(listInput(published, 'gains'), (gain) => {
      const stage = firstStage(gainStage(gain, gbw, 10));
      const firstOrder = known(stage.cornerFirstOrderHz);
      expect(known(stage.cornerUpperHz) / firstOrder).toBeCloseTo(1, 5);
      return firstOrder / 1e3;
    });
  });

  holdTo('A03', (published) => {
    const frequencyHz = numberInput(published, 'frequencyHz');
    const gain = 1 + numberInput(published, 'feedbackOhm') / numberInput(published, 'gainOhm');
    const input = gainStage(gain, numberInput(published, 'gainBandwidthHz'), frequencyHz);
    const stage = firstStage(input);
    return {
      gain: stage.signalGain,
      cornerHz: known(stage.cornerUpperHz),
      outputPeakToPeakV: numberInput(published, 'inputPeakToPeakV') * gainAt(input, frequencyHz),
    };
  });

  holdTo('A04', (published) => {
    const gain = -numberInput(published, 'feedbackOhm') / numberInput(published, 'gainOhm');
    const input = gainStage(gain, numberInput(published, 'gainBandwidthHz'), 100);
    return {
      gain: probeChain(input, 'minimum', 1).gain.re,
      cornerHz: known(firstStage(input).cornerUpperHz),
    };
  });

  holdTo('A05', (published) => {
    const openLoopGainDb = { typ: 20 * Math.log10(numberInput(published, 'openLoopGain')) };
    const gain = 1 + numberInput(published, 'feedbackOhm') / numberInput(published, 'gainOhm');
    // So far below the first pole that the open-loop gain is that of DC.
    const input = gainStage(gain, 1e9, 1, { openLoopGainDb });
    const stage = firstStage(input);
    return {
      feedbackFraction: known(stage.loopGain) / numberInput(published, 'openLoopGain'),
      idealGain: stage.signalGain,
      exactGain: gainAt(input, 1),
      errorPercent: 100 * known(stage.vectorError),
    };
  });

  holdTo('A07', (published) => {
    const openLoopGain = numberInput(published, 'openLoopGain');
    const gbw = openLoopGain * numberInput(published, 'poleHz');
    const input = gainStage(10, gbw, 100, { openLoopGainDb: { typ: 20 * Math.log10(openLoopGain) } });
    const [f1, f2, f3, f4, f5] = listInput(published, 'frequenciesHz').map((hz) => openLoopGainAt(input, hz));
    return { '100 Hz': f1, '1 kHz': f2, '10 kHz': f3, '100 kHz': f4, '1 MHz': f5 };
  });

  holdTo('A08', (published) => {
    const device = matchedBlockDevice('b', 50, 20 * Math.log10(numberInput(published, 'midbandGain')), {
      lowerCornerHz: { typ: numberInput(published, 'lowerCornerHz') },
      upperCornerHz: { min: numberInput(published, 'upperCornerHz'), typ: numberInput(published, 'upperCornerHz') },
    });
    const load = { resistanceOhm: 50 };
    const input = chainInput([matchedBlockStage('s', 'b')], [device], { load, ...bandAt(600) });
    // Between matched ends half of the EMF arrives.
    const [low, high] = listInput(published, 'frequenciesHz').map((hz) => 2 * gainAt(input, hz));
    expect(known(analysed(input).cornerLowerHz)).toBeCloseTo(20, 1);
    return { '5 Hz': low, '200 kHz': high };
  });

  holdTo('P04', (published) => {
    const frequencyHz = numberInput(published, 'frequencyHz');
    const stage = firstStage(gainStage(1, numberInput(published, 'gainBandwidthHz'), frequencyHz));
    return { headroom: known(stage.headroomOperating) };
  });
});

describe('published cases: two-pole loops', () => {
  const NOISE_GAIN = 10;
  const GBW = 100e6;
  const CORNER = GBW / NOISE_GAIN;

  const withSecondPole = (ratio: number) => gainStage(NOISE_GAIN, GBW, CORNER / 10, { secondPoleHz: ratio * CORNER });
  const withMargin = (phaseMarginDeg: number) =>
    gainStage(NOISE_GAIN, GBW, CORNER / 10, { phaseMarginDeg, phaseMarginGain: NOISE_GAIN });

  holdTo('D03', (published) => {
    const { atMinimum } = stabilityOf(withSecondPole(numberInput(published, 'secondPoleOverCorner')), 's');
    return { phaseMarginDeg: atMinimum.phaseMarginDeg!, peakingDb: atMinimum.peakingDb };
  });

  holdTo('D04', (published) => {
    const { atMinimum } = stabilityOf(withSecondPole(numberInput(published, 'secondPoleOverCorner')), 's');
    return { phaseMarginDeg: atMinimum.phaseMarginDeg! };
  });

  holdTo('D05', (published) =>
    byInput(listInput(published, 'phaseMarginsDeg'), (margin) => {
      const input = margin === 90 ? gainStage(NOISE_GAIN, GBW, CORNER / 10) : withMargin(margin);
      const { crossingHz, phaseMarginDeg } = stabilityOf(input, 's').atMinimum;
      expect(phaseMarginDeg).toBeCloseTo(margin, 3);
      return gainAt(input, crossingHz!) / NOISE_GAIN;
    }),
  );

  holdTo('D08', (published) => {
    const input = withSecondPole(numberInput(published, 'secondPoleOverCorner'));
    return {
      cornerRatio: known(firstStage(input).cornerUpperHz) / CORNER,
      crossingRatio: stabilityOf(input, 's').atMinimum.crossingHz! / CORNER,
    };
  });

  holdTo('D09', (published) => {
    const secondPoleHz = numberInput(published, 'secondPoleHz');
    const [decompensated, unityStable] = listInput(published, 'gainBandwidthsHz').map(
      (gbw) => stabilityOf(gainStage(1, gbw, 1e4, { secondPoleHz }), 's').atMinimum.crossingHz! / 1e6,
    );
    return { decompensatedMHz: decompensated, unityStableMHz: unityStable };
  });

  holdTo('D10', (published) =>
    byInput(
      listInput(published, 'phaseMarginsDeg'),
      (margin) => stabilityOf(withMargin(margin), 's').atMinimum.peakingDb,
    ),
  );

  it('the loop gain at the crossing has magnitude 1 and the phase that the margin says', () => {
    const { crossingHz, phaseMarginDeg } = stabilityOf(withMargin(37), 's').atMinimum;
    const loopGain = probeChain(withMargin(37), 'minimum', crossingHz!).stages[0].loopGain!;
    expect(magnitude(loopGain)).toBeCloseTo(1, 9);
    expect(180 + (Math.atan2(loopGain.im, loopGain.re) * 180) / Math.PI).toBeCloseTo(phaseMarginDeg!, 6);
  });
});
