import { probeChain } from '../chain/probe';
import type { ChainInput, CurrentSource } from '../types';
import { chainInput, voltageFeedbackDevice, voltageFeedbackStage } from './chain-builder.test-support';
import { argument, magnitude } from './complex-matrix.test-support';
import {
  HUGE_DB,
  analysed,
  bandAt,
  firstStage,
  gainAt,
  known,
  stabilityOf,
  stageOfGain,
} from './engine-figures.test-support';
import { byInput, holdTo, listInput, numberInput } from './published-cases.test-support';

const POLE_HZ = 1e6;

/** n stages of one pole each at the same corner. */
function identicalPoles(n: number, gain = 1, gainBandwidthHz = POLE_HZ): ChainInput {
  const device = voltageFeedbackDevice('a', gainBandwidthHz, { openLoopGainDb: HUGE_DB });
  const stages = Array.from({ length: n }, (_, k) => stageOfGain(`s${k}`, 'a', gain));
  return chainInput(stages, [device], bandAt(1e3));
}

const shrinkage = (n: number): number => known(analysed(identicalPoles(n)).shrinkage);

describe('published cases: cascades', () => {
  holdTo('C01', (published) => byInput(listInput(published, 'stages'), shrinkage));
  holdTo('C02', (published) => byInput(listInput(published, 'stages'), shrinkage));

  holdTo('C07', (published) => {
    const gain = numberInput(published, 'gain');
    const counts = listInput(published, 'stages');
    const corners = counts.map((n) => known(analysed(identicalPoles(n, gain ** (1 / n), 1e9)).cornerUpperHz));
    return { bestStages: counts[corners.indexOf(Math.max(...corners))] };
  });

  holdTo('C09', (published) => {
    const n = numberInput(published, 'stages');
    const chain = analysed(identicalPoles(n));
    const rule = 1 / Math.sqrt(chain.stages.reduce((sum, stage) => sum + 1 / known(stage.cornerUpperHz) ** 2, 0));
    return { ruleOverExact: rule / known(chain.cornerUpperHz) };
  });

  /** ∫|H|² df with f = f1·tan θ, where the integrand of n poles is a polynomial in cos θ: the midpoint sum is exact. */
  function noiseBandwidth(input: ChainInput, poleHz: number): number {
    const steps = 64;
    let sum = 0;
    for (let i = 0; i < steps; i++) {
      const theta = ((i + 0.5) / steps) * (Math.PI / 2);
      sum += gainAt(input, poleHz * Math.tan(theta)) ** 2 / Math.cos(theta) ** 2;
    }
    return (sum * poleHz * Math.PI) / 2 / steps;
  }

  holdTo('G09', (published) =>
    byInput(listInput(published, 'stages'), (n) => {
      const input = identicalPoles(n);
      return noiseBandwidth(input, POLE_HZ) / known(analysed(input).cornerUpperHz);
    }),
  );

  holdTo('G16', (published) => {
    const corner = numberInput(published, 'cornerHz');
    return { noiseBandwidthKHz: noiseBandwidth(identicalPoles(1, 1, corner), corner) / 1e3 };
  });
});

describe('published cases: transimpedance', () => {
  function transimpedance(gbw: number, feedbackOhm: number, totalF: number, feedbackF: number): ChainInput {
    const device = voltageFeedbackDevice('a', gbw, { openLoopGainDb: HUGE_DB });
    // An ideal current source: its resistance is far above everything else.
    const source: CurrentSource = { kind: 'current', resistanceOhm: 1e12, capacitanceF: totalF };
    const stage = voltageFeedbackStage('s', 'a', 'transimpedance', feedbackOhm, null, { feedbackF });
    return chainInput([stage], [device], { source, gainBasis: 'transimpedance', ...bandAt(1e4) });
  }

  /** V_load per ampere over the ideal −Rf. */
  function normalised(input: ChainInput, hz: number) {
    const probe = probeChain(input, 'minimum', hz);
    const feedbackOhm = (input.stages[0] as { feedbackOhm: number }).feedbackOhm;
    const re = (probe.gain.re * probe.sourceImpedance.re - probe.gain.im * probe.sourceImpedance.im) / -feedbackOhm;
    const im = (probe.gain.re * probe.sourceImpedance.im + probe.gain.im * probe.sourceImpedance.re) / -feedbackOhm;
    return { re, im };
  }

  /** Where the response has turned 90°: the natural frequency of the second-order loop. */
  function naturalFrequency(input: ChainInput): number {
    let [low, high] = [1e4, 1e10];
    for (let i = 0; i < 200; i++) {
      const middle = Math.sqrt(low * high);
      if (normalised(input, middle).re > 0) low = middle;
      else high = middle;
    }
    return low;
  }

  // The published forms count Cf as part of CT, so the source brings the rest.
  for (const id of ['E01', 'E04', 'E05']) {
    holdTo(id, (published) => {
      const gbw = numberInput(published, 'gainBandwidthHz');
      const ohm = numberInput(published, 'feedbackOhm');
      const totalF = numberInput(published, 'capacitanceF');
      const expectedF = published.expected.feedbackPf * 1e-12;
      const bandwidth = naturalFrequency(transimpedance(gbw, ohm, totalF - expectedF, expectedF));
      // The capacitor for which Rf·Cf turns the feedback by 45° there.
      const feedbackF = leadCapacitor((farad) => transimpedance(gbw, ohm, totalF - farad, farad), bandwidth, totalF);
      return { feedbackPf: feedbackF * 1e12, bandwidthMHz: bandwidth / 1e6 };
    });
  }

  /** Cf for which the noise gain's phase is 45° below that of a pure 1 + s·Rf·CT. */
  function leadCapacitor(build: (farad: number) => ChainInput, hz: number, limitF: number): number {
    const phase = (farad: number): number => argument(probeChain(build(farad), 'minimum', hz).stages[0].noiseGain!);
    const without = phase(0);
    let [low, high] = [1e-15, limitF];
    for (let i = 0; i < 100; i++) {
      const middle = Math.sqrt(low * high);
      if (without - phase(middle) < Math.PI / 4) low = middle;
      else high = middle;
    }
    return low;
  }

  holdTo('E07', (published) => {
    const gbw = numberInput(published, 'gainBandwidthHz');
    const ohm = numberInput(published, 'feedbackOhm');
    const totalF = numberInput(published, 'capacitanceF');
    // The smallest feedback capacitor without peaking.
    const build = (farad: number): ChainInput => transimpedance(gbw, ohm, totalF, farad);
    let [low, high] = [1e-14, 1e-11];
    for (let i = 0; i < 60; i++) {
      const middle = Math.sqrt(low * high);
      if (stabilityOf(build(middle), 's').atMinimum.peakingDb > 0.001) low = middle;
      else high = middle;
    }
    return { feedbackPf: high * 1e12, bandwidthMHz: known(firstStage(build(high)).cornerUpperHz) / 1e6 };
  });

  holdTo('E11', (published) => {
    const gbw = numberInput(published, 'gainBandwidthHz');
    const ohm = numberInput(published, 'feedbackOhm');
    const totalF = numberInput(published, 'capacitanceF');
    const build = (name: string): ChainInput => transimpedance(gbw, ohm, totalF, numberInput(published, name));
    // At the natural frequency the response of a second-order loop is Q.
    const q = (input: ChainInput): number => magnitude(normalised(input, naturalFrequency(input)));
    const [flat, lead] = [build('flatFeedbackF'), build('leadFeedbackF')];
    return {
      flatQ: q(flat),
      flatMHz: known(firstStage(flat).cornerUpperHz) / 1e6,
      leadQ: q(lead),
      leadPeakingDb: stabilityOf(lead, 's').atMinimum.peakingDb,
      leadMHz: known(firstStage(lead).cornerUpperHz) / 1e6,
    };
  });
});
