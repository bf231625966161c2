/**
 * What is seen looking left from a point of the chain at one frequency: an EMF behind an impedance (Thevenin).
 * Written in place by `advance`, so that a sweep allocates nothing per frequency.
 */
export interface Port {
  /** V per unit source EMF. */
  emfRe: number;
  emfIm: number;
  /** Ω. */
  impedanceRe: number;
  impedanceIm: number;
}

/**
 * What is seen looking right: the load of a stage. Held as an admittance (S), because an open end is finite in it;
 * `inputImpedance` turns the load behind a stage into the one in front of it, in place.
 */
export interface LoadPort {
  admittanceRe: number;
  admittanceIm: number;
}

/** A port of its own. */
export function createPort(): Port {
  return { emfRe: 1.5, emfIm: 0.5, impedanceRe: 0.5, impedanceIm: 0.5 };
}

/** A load port of its own. */
export function createLoadPort(): LoadPort {
  return { admittanceRe: 0.5, admittanceIm: 0.5 };
}

/** target ← source. */
export function copyPort(target: Port, source: Port): void {
  target.emfRe = source.emfRe;
  target.emfIm = source.emfIm;
  target.impedanceRe = source.impedanceRe;
  target.impedanceIm = source.impedanceIm;
}

/** Puts an admittance from the port to ground: E and Z are both divided by 1 + Z·Y. */
export function shuntPort(port: Port, yRe: number, yIm: number): void {
  const { emfRe, emfIm, impedanceRe: zRe, impedanceIm: zIm } = port;
  const dRe = 1 + zRe * yRe - zIm * yIm;
  const dIm = zRe * yIm + zIm * yRe;
  const squared = dRe * dRe + dIm * dIm;
  port.emfRe = (emfRe * dRe + emfIm * dIm) / squared;
  port.emfIm = (emfIm * dRe - emfRe * dIm) / squared;
  port.impedanceRe = (zRe * dRe + zIm * dIm) / squared;
  port.impedanceIm = (zIm * dRe - zRe * dIm) / squared;
}

/** Puts an impedance in front of a load: Y ← Y/(1 + Y·Z). Works for an open load and for Z = 0. */
export function seriesLoad(load: LoadPort, zRe: number, zIm: number): void {
  const { admittanceRe: yRe, admittanceIm: yIm } = load;
  const dRe = 1 + zRe * yRe - zIm * yIm;
  const dIm = zRe * yIm + zIm * yRe;
  const squared = dRe * dRe + dIm * dIm;
  load.admittanceRe = (yRe * dRe + yIm * dIm) / squared;
  load.admittanceIm = (yIm * dRe - yRe * dIm) / squared;
}
