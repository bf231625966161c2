import { Complex, add, complex, divide, magnitudeSquared, multiply, scale } from '../complex';
import { BOLTZMANN_J_PER_K } from '../constants';
import type { FeedbackParts } from './feedback-parts';
import type { NoiseSource, StageNoise } from './network-stage';
import type { Port } from './port';

/** Noise data of an amplifier; null: the datasheet is silent. Corners in Hz, 0 = white. */
export interface AmplifierNoise {
  readonly voltageVPerRtHz: number | null;
  readonly voltageCornerHz: number;
  readonly plusCurrentAPerRtHz: number | null;
  readonly minusCurrentAPerRtHz: number | null;
  /** What the current noise of the − input is called in the device's data. */
  readonly minusCurrentDatum: string;
  readonly currentCornerHz: number;
  readonly ambientK: number;
}

/** Transfers of a feedback network to its open-circuit output. */
export interface NoiseTransfers {
  /** From a voltage in series with the amplifier's own + input. */
  readonly voltage: Complex;
  /** From an EMF behind Zp at the + pin. */
  readonly plusEmf: Complex;
  /** From a current into the inverting node, Ω. */
  readonly nodeCurrent: Complex;
  /** From a current out of the output into the inverting node (the noise of Rf), Ω. */
  readonly feedbackCurrent: Complex;
}

/** The network quantities that the transfers are made of, at one frequency, unloaded. */
interface VoltageFeedbackNode {
  readonly a: Complex;
  readonly m: Complex;
  readonly zf: Complex;
  readonly yg: Complex;
  readonly ng: Complex;
  readonly yd: Complex;
  readonly ro: number;
}

/**
 * tN = A·(m·NG + Zf·Yd)/D · tP = (A·NG + Ro·Yd)/D · tJ = −(A·Zf − m·Ro)/D · tX = −Zf·(A + Ro·(m·Yg + Yd))/D.
 * Source: node equations; textbook network theory.
 *
 * @example with A → ∞ and no parasitics tN and tP are NG, tJ and tX are −Zf
 */
export function voltageFeedbackTransfers({ a, m, zf, yg, ng, yd, ro }: VoltageFeedbackNode): NoiseTransfers {
  const d = add(add(a, multiply(m, add(ng, scale(yg, ro)))), multiply(add(zf, complex(ro)), yd));
  const noiseGain = add(multiply(m, ng), multiply(zf, yd));
  return {
    voltage: divide(multiply(a, noiseGain), d),
    plusEmf: divide(add(multiply(a, ng), scale(yd, ro)), d),
    nodeCurrent: divide(add(scale(m, ro), scale(multiply(a, zf), -1)), d),
    feedbackCurrent: divide(scale(multiply(zf, add(a, scale(add(multiply(m, yg), yd), ro))), -1), d),
  };
}

interface CurrentFeedbackNode {
  readonly z: Complex;
  readonly rb: number;
  readonly zf: Complex;
  readonly yg: Complex;
  readonly ng: Complex;
  readonly ro: number;
}

/**
 * tN = tP = (Z·NG + Ro)/D · tJ = −(Z·Zf − Rb·Ro)/D · tX = −Zf·(Z + Ro·(1 + Rb·Yg))/D.
 * Source: node equations; textbook network theory.
 *
 * @example with Z → ∞ tN and tP are NG, tJ and tX are −Zf
 */
export function currentFeedbackTransfers({ z, rb, zf, yg, ng, ro }: CurrentFeedbackNode): NoiseTransfers {
  const buffer = add(complex(1), scale(yg, rb));
  const d = add(add(z, complex(rb)), multiply(add(zf, complex(ro)), buffer));
  const plus = divide(add(multiply(z, ng), complex(ro)), d);
  return {
    voltage: plus,
    plusEmf: plus,
    nodeCurrent: divide(add(complex(rb * ro), scale(multiply(z, zf), -1)), d),
    feedbackCurrent: divide(scale(multiply(zf, add(z, scale(buffer, ro))), -1), d),
  };
}

const withCorner = (density: number, cornerHz: number, omega: number): number =>
  density * density * (1 + (cornerHz * 2 * Math.PI) / omega);

/**
 * Every noise source of a feedback stage at the EMF behind it, V²/Hz, uncorrelated; `front` is the port in front of the
 * stage, `atAmplifier` the same behind the input network. en²(f) = en²·(1 + f_corner/f), in likewise.
 * Source: superposition over the transfers; thermal noise 4kTR: H. Nyquist, Phys. Rev. 32 (1928), p. 110 (from memory).
 *
 * @example a follower's voltage noise of 2 nV/√Hz appears as 4e-18 V²/Hz, far below its bandwidth
 */
export function feedbackNoise(
  parts: FeedbackParts,
  atAmplifier: Readonly<Port>,
  front: Readonly<Port>,
  omega: number,
  noise: AmplifierNoise,
  transfers: NoiseTransfers,
): StageNoise {
  const fourKT = 4 * BOLTZMANN_J_PER_K * noise.ambientK;
  const sources: NoiseSource[] = [
    ...networkSources(parts, atAmplifier, front, omega, fourKT, transfers),
    ...resistorSources(parts, fourKT, transfers),
  ];
  const missing = new Set<string>();
  const { inverting } = parts.values;
  const device = (label: string, datum: string, density: number | null, cornerHz: number, transfer: number): void => {
    if (density === null) missing.add(datum);
    else sources.push({ label, v2PerHzAtOutput: withCorner(density, cornerHz, omega) * transfer });
  };
  device(
    'voltage noise',
    'voltage noise',
    noise.voltageVPerRtHz,
    noise.voltageCornerHz,
    magnitudeSquared(transfers.voltage),
  );
  if (!inverting) {
    const zp = complex(parts.zpRe, parts.zpIm);
    const plus = magnitudeSquared(multiply(zp, transfers.plusEmf));
    device('current noise, + input', 'current noise', noise.plusCurrentAPerRtHz, noise.currentCornerHz, plus);
  }
  const minus = magnitudeSquared(transfers.nodeCurrent);
  device('current noise, − input', noise.minusCurrentDatum, noise.minusCurrentAPerRtHz, noise.currentCornerHz, minus);
  return { sources, missing: [...missing] };
}

/** Rt and Rbias: EMFs at the network's output, which the amplifier amplifies like its signal. */
function networkSources(
  parts: FeedbackParts,
  atAmplifier: Readonly<Port>,
  front: Readonly<Port>,
  omega: number,
  fourKT: number,
  transfers: NoiseTransfers,
): NoiseSource[] {
  const gain = parts.values.inverting
    ? invertingGain(parts, transfers)
    : plusGain(parts, atAmplifier, omega, transfers);
  const squared = magnitudeSquared(gain);
  return parts.input.resistors(front).map(({ label, resistanceOhm, transimpedanceSquared }) => ({
    label,
    v2PerHzAtOutput: (fourKT / resistanceOhm) * transimpedanceSquared * squared,
  }));
}

function invertingGain(parts: FeedbackParts, transfers: NoiseTransfers): Complex {
  return multiply(complex(parts.yLegRe, parts.yLegIm), transfers.nodeCurrent);
}

function plusGain(
  parts: FeedbackParts,
  atAmplifier: Readonly<Port>,
  omega: number,
  transfers: NoiseTransfers,
): Complex {
  const z = complex(atAmplifier.impedanceRe, atAmplifier.impedanceIm);
  const yi = complex(parts.values.inputS, omega * parts.values.inputF);
  return divide(transfers.plusEmf, add(complex(1), multiply(z, yi)));
}

/** Rf, Rg and Riso. */
function resistorSources(parts: FeedbackParts, fourKT: number, transfers: NoiseTransfers): NoiseSource[] {
  const { inverting, feedbackOhm, gainS, seriesOhm, isolationOhm } = parts.values;
  const sources: NoiseSource[] = [];
  const put = (label: string, v2PerHzAtOutput: number): void => {
    if (v2PerHzAtOutput > 0) sources.push({ label, v2PerHzAtOutput });
  };
  const feedback = feedbackOhm > 0 ? magnitudeSquared(transfers.feedbackCurrent) / feedbackOhm : 0;
  put('feedback resistor', fourKT * feedback);
  if (inverting) put('gain resistor', fourKT * seriesOhm * magnitudeSquared(invertingGain(parts, transfers)));
  else put('gain resistor', fourKT * gainS * magnitudeSquared(transfers.nodeCurrent));
  put('isolation resistor', fourKT * isolationOhm);
  return sources;
}
