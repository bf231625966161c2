import { LoadPort, Port, clonePort, seriesLoad, shuntPort } from './port';

/** Thermal noise of a resistor at the network's output: |transfer from its noise current|² (V²/A²) and the resistor. */
export interface NetworkResistor {
  readonly label: string;
  readonly resistanceOhm: number;
  /** |V_out/I_noise|² at the network's open output, Ω². */
  readonly transimpedanceSquared: number;
}

/**
 * The parts in front of an amplifier, left to right: shunt termination Rt, series coupling Cc, and (non-inverting only)
 * a bias resistor to ground. Null or absent parts are left out.
 */
export class InputNetwork {
  private readonly terminationS: number;
  private readonly couplingF: number;
  private readonly biasS: number;
  /** Set before use. A field and not an argument: numbers handed to calls in a hot loop are allocated. */
  omega = 0.5;

  constructor(
    terminationOhm: number | null | undefined,
    couplingF: number | null | undefined,
    biasOhm: number | null | undefined,
  ) {
    this.terminationS = terminationOhm ? 1 / terminationOhm : 0;
    this.couplingF = couplingF ?? 0;
    this.biasS = biasOhm ? 1 / biasOhm : 0;
  }

  /** Left to right: the port in front becomes the port at the amplifier. */
  advance(port: Port): void {
    if (this.terminationS > 0) shuntPort(port, this.terminationS, 0);
    if (this.couplingF > 0) port.impedanceIm -= 1 / (this.omega * this.couplingF);
    if (this.biasS > 0) shuntPort(port, this.biasS, 0);
  }

  /** Right to left: the amplifier's input admittance becomes that of the stage. */
  inputImpedance(load: LoadPort): void {
    load.admittanceRe += this.biasS;
    if (this.couplingF > 0) seriesLoad(load, 0, -1 / (this.omega * this.couplingF));
    load.admittanceRe += this.terminationS;
  }

  /** The resistors with what their noise currents become at the network's open output. `front` is not changed. */
  resistors(front: Readonly<Port>): NetworkResistor[] {
    const found: NetworkResistor[] = [];
    const port = clonePort(front);
    if (this.terminationS > 0) {
      // A unit current into Rt's node is an EMF of Z there; the rest of the network then acts on it as on any EMF.
      shuntPort(port, this.terminationS, 0);
      port.emfRe = port.impedanceRe;
      port.emfIm = port.impedanceIm;
      if (this.couplingF > 0) port.impedanceIm -= 1 / (this.omega * this.couplingF);
      if (this.biasS > 0) shuntPort(port, this.biasS, 0);
      found.push(resistor('termination resistor', this.terminationS, port.emfRe, port.emfIm));
    } else if (this.couplingF > 0 || this.biasS > 0) {
      this.advance(port);
    }
    if (this.biasS > 0) found.push(resistor('bias resistor', this.biasS, port.impedanceRe, port.impedanceIm));
    return found;
  }
}

function resistor(label: string, conductanceS: number, re: number, im: number): NetworkResistor {
  return { label, resistanceOhm: 1 / conductanceS, transimpedanceSquared: re * re + im * im };
}
