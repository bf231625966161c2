import type { MutableComplex } from '../complex';
import { LoadPort, Port, copyPort, createLoadPort, createPort } from '../stages/port';
import { PreparedStage, prepareStage } from '../stages/prepare-stage';
import type { NetworkStage } from '../stages/network-stage';
import type { DeviceCorner } from '../devices/used-values';
import type { ChainInput, Device, Stage } from '../types';

/**
 * A validated chain in one corner, ready to be solved at any frequency without allocating.
 *
 * The two folds: `advance` from the source to the right gives the Thevenin equivalent behind every stage;
 * `inputImpedance` from the load to the left gives what every stage drives. Node 0 is in front of the first stage,
 * node k behind stage k (1-based). All voltages are per unit source EMF.
 * Source: Thevenin's theorem; textbook network theory.
 *
 * @example const net = new ChainNetwork(input, 'minimum'); net.solve(2 * Math.PI * 5e6); net.nodeRe[net.count]
 */
export class ChainNetwork {
  readonly prepared: readonly PreparedStage[];
  readonly stages: readonly NetworkStage[];
  readonly count: number;
  /** ports[k]: looking left from node k. */
  readonly ports: readonly Port[];
  /** loads[k]: looking right from node k. */
  readonly loads: readonly LoadPort[];
  /** Voltage of node k with everything connected; node 0 counts as the EMF itself, 1. */
  readonly nodeRe: Float64Array;
  readonly nodeIm: Float64Array;
  private readonly input: ChainInput;

  constructor(input: ChainInput, corner: DeviceCorner) {
    const { policy, specification } = input;
    const context = { policy, corner, ambientK: specification.ambientK };
    this.input = input;
    this.prepared = input.stages.map((stage) => prepareStage(stage, deviceOf(stage, input.devices), context));
    this.stages = this.prepared.map((stage) => stage.network);
    this.count = this.stages.length;
    this.ports = Array.from({ length: this.count + 1 }, createPort);
    this.loads = Array.from({ length: this.count + 1 }, createLoadPort);
    this.nodeRe = new Float64Array(this.count + 1);
    this.nodeIm = new Float64Array(this.count + 1);
  }

  /** Z of the source at an angular frequency, Ω. */
  sourceImpedance(omega: number, out: MutableComplex): void {
    const { source } = this.input.specification;
    out.re = source.resistanceOhm;
    out.im = 0;
    if (source.kind === 'voltage') return;
    const x = omega * source.resistanceOhm * source.capacitanceF;
    out.re /= 1 + x * x;
    out.im = -x * out.re;
  }

  private setSource(omega: number): void {
    const port = this.ports[0];
    const z = this.scratch;
    this.sourceImpedance(omega, z);
    port.emfRe = 1;
    port.emfIm = 0;
    port.impedanceRe = z.re;
    port.impedanceIm = z.im;
  }
  private readonly scratch: MutableComplex = { re: 0.5, im: 0.5 };

  private setLoad(omega: number): void {
    const { resistanceOhm, capacitanceF } = this.input.specification.load;
    const load = this.loads[this.count];
    load.admittanceRe = resistanceOhm === null ? 0 : 1 / resistanceOhm;
    load.admittanceIm = omega * (capacitanceF ?? 0);
  }

  /** The rightward fold: sets ports 0 to `last` (absent: all). */
  advance(omega: number, last = this.count): void {
    this.setSource(omega);
    for (let k = 0; k < last; k++) {
      const port = this.ports[k + 1];
      copyPort(port, this.ports[k]);
      this.stages[k].advance(port, omega);
    }
  }

  /** The leftward fold: sets all loads. */
  inputImpedance(omega: number): void {
    this.setLoad(omega);
    for (let k = this.count - 1; k >= 0; k--) {
      const load = this.loads[k];
      load.admittanceRe = this.loads[k + 1].admittanceRe;
      load.admittanceIm = this.loads[k + 1].admittanceIm;
      this.stages[k].inputImpedance(load, omega);
    }
  }

  /** Both folds and the node voltages V_k = E_k/(1 + Z_k·Y_k). */
  solve(omega: number): void {
    this.advance(omega);
    this.inputImpedance(omega);
    this.nodeRe[0] = 1;
    this.nodeIm[0] = 0;
    for (let k = this.count > 0 ? 1 : 0; k <= this.count; k++) this.setNode(k);
  }

  private setNode(k: number): void {
    const { emfRe, emfIm, impedanceRe, impedanceIm } = this.ports[k];
    const { admittanceRe, admittanceIm } = this.loads[k];
    const dRe = 1 + impedanceRe * admittanceRe - impedanceIm * admittanceIm;
    const dIm = impedanceRe * admittanceIm + impedanceIm * admittanceRe;
    const squared = dRe * dRe + dIm * dIm;
    this.nodeRe[k] = (emfRe * dRe + emfIm * dIm) / squared;
    this.nodeIm[k] = (emfIm * dRe - emfRe * dIm) / squared;
  }

  /** V_load/E by the rightward fold alone. */
  loadVoltage(omega: number, out: MutableComplex): void {
    this.advance(omega);
    this.setLoad(omega);
    this.setNode(this.count);
    out.re = this.nodeRe[this.count];
    out.im = this.nodeIm[this.count];
  }
}

/** The device that a stage names, null for a passive section; of a validated input. */
function deviceOf(stage: Stage, devices: readonly Device[]): Device | null {
  if (stage.kind === 'rc-section') return null;
  return devices.find((device) => device.id === stage.deviceId) ?? null;
}
