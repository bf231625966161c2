import { BOLTZMANN_J_PER_K, REFERENCE_TEMPERATURE_K } from '../constants';
import type { NetworkStage, StageNoise } from './network-stage';
import type { LoadPort, Port } from './port';

/** A block matched at both ends, as numbers. */
export interface MatchedBlockValues {
  readonly impedanceOhm: number;
  /** |S21| in the flat range. */
  readonly gain: number;
  /** 0: flat down to DC. */
  readonly lowerCornerHz: number;
  /** Infinity: flat upwards. */
  readonly upperCornerHz: number;
  /** Noise factor F; 'loss': a matched passive, F = 1/|S21|²; null: not entered. */
  readonly noiseFactor: number | 'loss' | null;
}

/**
 * Matched block with flat gain and first-order corners.
 *
 *     Z_in = Z_out = Z0    V_in = E·Z0/(Zs + Z0)    E_out = 2·S21·V_in    own noise = 4·k·T0·Z0·(F − 1)·|S21|²
 *
 * Source: definition of S21 and of the noise factor (T0 = 290 K); textbook network theory.
 */
export class MatchedBlockNetwork implements NetworkStage {
  readonly loop = null;

  constructor(
    readonly stageId: string,
    private readonly values: MatchedBlockValues,
  ) {}

  advance(port: Port, omega: number): void {
    const { impedanceOhm: z0, gain, lowerCornerHz, upperCornerHz } = this.values;
    const frequencyHz = omega / (2 * Math.PI);
    // E_out = 2·g·Z0·E/[(Zs + Z0)·(1 + jf/fu)·(1 − j·fl/f)]
    const up = frequencyHz / upperCornerHz;
    const low = -lowerCornerHz / frequencyHz;
    const cRe = 1 - up * low;
    const cIm = up + low;
    const sRe = port.impedanceRe + z0;
    const sIm = port.impedanceIm;
    const dRe = sRe * cRe - sIm * cIm;
    const dIm = sRe * cIm + sIm * cRe;
    const scale = (2 * gain * z0) / (dRe * dRe + dIm * dIm);
    const { emfRe, emfIm } = port;
    port.emfRe = (emfRe * dRe + emfIm * dIm) * scale;
    port.emfIm = (emfIm * dRe - emfRe * dIm) * scale;
    port.impedanceRe = z0;
    port.impedanceIm = 0;
  }

  inputImpedance(load: LoadPort): void {
    load.admittanceRe = 1 / this.values.impedanceOhm;
    load.admittanceIm = 0;
  }

  ownNoise(_front: Readonly<Port>, omega: number): StageNoise {
    const { impedanceOhm, noiseFactor } = this.values;
    if (noiseFactor === null) return { sources: [], missing: ['noise figure'] };
    const gainSquared = this.gainSquared(omega / (2 * Math.PI));
    const excess = noiseFactor === 'loss' ? 1 - gainSquared : (noiseFactor - 1) * gainSquared;
    const v2PerHzAtOutput = 4 * BOLTZMANN_J_PER_K * REFERENCE_TEMPERATURE_K * impedanceOhm * excess;
    return { sources: [{ label: 'block', v2PerHzAtOutput }], missing: [] };
  }

  /** |S21|². */
  private gainSquared(frequencyHz: number): number {
    const { gain, lowerCornerHz, upperCornerHz } = this.values;
    const up = 1 + (frequencyHz / upperCornerHz) ** 2;
    const low = 1 + (lowerCornerHz / frequencyHz) ** 2;
    return (gain * gain) / (up * low);
  }
}
