import type { MutableComplex } from '../complex';
import type { LoadPort, Port } from './port';

/** A noise source of a stage, with what it gives at the open-circuit EMF behind the stage. */
export interface NoiseSource {
  readonly label: string;
  readonly v2PerHzAtOutput: number;
}

export interface StageNoise {
  readonly sources: readonly NoiseSource[];
  /** What the device's data lacks, in words: "voltage noise". Such sources are left out of `sources`. */
  readonly missing: readonly string[];
}

/** A stage made ready for one GBW case: numbers only, no look-ups left. */
export interface NetworkStage {
  readonly stageId: string;
  /** Replaces the Thevenin equivalent in front of the stage by the one behind it. */
  advance(port: Port, omega: number): void;
  /** Replaces the load behind the stage by the input impedance that the stage shows with it. */
  inputImpedance(load: LoadPort, omega: number): void;
  /** The stage's own noise at the EMF behind it, given the port in front of it. */
  ownNoise(front: Readonly<Port>, omega: number): StageNoise;
  /** Feedback stages only: the loop; null for the passive kinds and blocks. */
  readonly loop: FeedbackLoop | null;
}

/** What only a stage with feedback has. All of it refers to the frequency and the port of the last `advance`. */
export interface FeedbackLoop {
  /** T with the load of the last `inputImpedance`, which has to have been asked at the same frequency. */
  loadedLoopGain(out: MutableComplex): void;
  /** m·NG + Zf·Yd: what A has to exceed; NG for current feedback. */
  noiseGain(out: MutableComplex): void;
  /** Current that the feedback network draws per volt at the output with an ideal amplifier, S. */
  feedbackAdmittance(omega: number, out: MutableComplex): void;
  readonly isolationOhm: number;
}
