import { BOLTZMANN_J_PER_K } from '../constants';
import type { NetworkStage, NoiseSource, StageNoise } from './network-stage';
import { LoadPort, Port, clonePort, seriesLoad, shuntPort } from './port';

/** Parts of a passive section, left to right; 0 stands for a part that is not there (series C: shorted). */
export interface RcSectionValues {
  readonly seriesOhm: number;
  readonly seriesF: number;
  readonly shuntS: number;
  readonly shuntF: number;
  readonly ambientK: number;
}

/**
 * Passive section: series R and C, then shunt R and C to ground.
 *
 *     Z' = Zs + R + 1/(s·C)        E_out = E/(1 + Z'·Y)       Z_out = Z'/(1 + Z'·Y)       Y = 1/Rp + s·Cp
 *     own noise = 4kT·R·|1/(1 + Z'·Y)|² + (4kT/Rp)·|Z_out|²   (= 4kT·(Re Z_out − |H|²·Re Zs))
 *
 * Source: textbook network theory; thermal noise: H. Nyquist, Phys. Rev. 32 (1928), p. 110 (from memory).
 */
export class RcSectionNetwork implements NetworkStage {
  readonly loop = null;

  constructor(
    readonly stageId: string,
    private readonly values: RcSectionValues,
  ) {}

  advance(port: Port, omega: number): void {
    const { seriesOhm, seriesF, shuntS, shuntF } = this.values;
    port.impedanceRe += seriesOhm;
    if (seriesF > 0) port.impedanceIm -= 1 / (omega * seriesF);
    if (shuntS > 0 || shuntF > 0) shuntPort(port, shuntS, omega * shuntF);
  }

  inputImpedance(load: LoadPort, omega: number): void {
    const { seriesOhm, seriesF, shuntS, shuntF } = this.values;
    load.admittanceRe += shuntS;
    load.admittanceIm += omega * shuntF;
    const reactance = seriesF > 0 ? -1 / (omega * seriesF) : 0;
    if (seriesOhm > 0 || reactance < 0) seriesLoad(load, seriesOhm, reactance);
  }

  ownNoise(front: Readonly<Port>, omega: number): StageNoise {
    const { seriesOhm, shuntS, ambientK } = this.values;
    const fourKT = 4 * BOLTZMANN_J_PER_K * ambientK;
    // A unit EMF in series with R sees the same divider as the signal.
    const port = clonePort(front);
    port.emfRe = 1;
    port.emfIm = 0;
    this.advance(port, omega);
    const sources: NoiseSource[] = [];
    if (seriesOhm > 0) {
      const divider = port.emfRe ** 2 + port.emfIm ** 2;
      sources.push({ label: 'series resistor', v2PerHzAtOutput: fourKT * seriesOhm * divider });
    }
    if (shuntS > 0) {
      const impedance = port.impedanceRe ** 2 + port.impedanceIm ** 2;
      sources.push({ label: 'shunt resistor', v2PerHzAtOutput: fourKT * shuntS * impedance });
    }
    return { sources, missing: [] };
  }
}
