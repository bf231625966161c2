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

/** One class, so that all ports have one shape for the compiler: a second one would make every store allocate. */
class PortFields implements Port {
  emfRe = 0.5;
  emfIm = 0.5;
  impedanceRe = 0.5;
  impedanceIm = 0.5;
}

class LoadFields implements LoadPort {
  admittanceRe = 0.5;
  admittanceIm = 0.5;
}

/** A port of its own. */
export function createPort(): Port {
  return new PortFields();
}

/** A load port of its own. */
export function createLoadPort(): LoadPort {
  return new LoadFields();
}

/** A copy that may be changed. */
export function clonePort(source: Readonly<Port>): Port {
  const port = createPort();
  copyPort(port, source);
  return port;
}

/** target ← source. */
export function copyPort(target: Port, source: Readonly<Port>): void {
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
