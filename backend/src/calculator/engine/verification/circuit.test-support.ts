import {
  Complex,
  ComplexMatrix,
  Factorisation,
  RightSide,
  add,
  complex,
  magnitudeSquared,
  reciprocal,
  scale,
} from './complex-matrix.test-support';

/** Node 0 is ground. */
export const GROUND = 0;

interface Control {
  readonly node: number;
  readonly gain: Complex;
}

interface Branch {
  readonly from: number;
  readonly to: number;
  readonly impedance: Complex;
  readonly controls: readonly Control[];
  /** Branches whose current is part of this one's EMF. */
  readonly currentControls: readonly { readonly branch: number; readonly gain: Complex }[];
  /** The buffer of a current-feedback amplifier takes no current from the node that it follows. */
  readonly drawsFrom: boolean;
  /** No current flows: the branch is taken out. */
  readonly open: boolean;
}

/** One noise generator: where it is injected, and its power density (V²/Hz of an EMF, A²/Hz of a current). */
export interface NoiseGenerator {
  readonly name: string;
  readonly owner: string;
  readonly injection: Injection;
  readonly density: number;
}

export type Injection =
  | { readonly kind: 'emf'; readonly branch: number; readonly factor: Complex }
  | { readonly kind: 'current'; readonly from: number; readonly to: number };

/**
 * A linear circuit at one frequency for modified nodal analysis: admittances between nodes, and branches with an
 * impedance and an EMF, which get a row for their current so that 0 Ω is exact.
 */
export class Circuit {
  private nodes = 1;
  private readonly admittances: { a: number; b: number; value: Complex }[] = [];
  private readonly branches: Branch[] = [];
  readonly noise: NoiseGenerator[] = [];

  node(): number {
    return this.nodes++;
  }

  admittance(a: number, b: number, value: Complex): void {
    this.admittances.push({ a, b, value });
  }

  capacitor(a: number, b: number, farad: number, omega: number): void {
    if (farad > 0) this.admittance(a, b, complex(0, omega * farad));
  }

  /** V(from) − V(to) = Z·I + EMF + Σ gain·V(node) + Σ gain·I(branch); I flows into the branch at `from`. */
  branch(from: number, to: number, impedance: Complex, extra: Partial<Branch> = {}): number {
    const plain = { controls: [], currentControls: [], drawsFrom: true, open: false };
    this.branches.push({ from, to, impedance, ...plain, ...extra });
    return this.branches.length - 1;
  }

  /** Sets the controlled part of a branch to zero: the loop is opened there. */
  withoutControl(branch: number): Circuit {
    return this.withBranch(branch, { controls: [], currentControls: [] });
  }

  /** Takes a branch out. */
  withOpen(branch: number): Circuit {
    return this.withBranch(branch, { open: true });
  }

  private withBranch(branch: number, change: Partial<Branch>): Circuit {
    const copy = new Circuit();
    copy.nodes = this.nodes;
    copy.admittances.push(...this.admittances);
    copy.branches.push(...this.branches);
    copy.branches[branch] = { ...this.branches[branch], ...change };
    copy.noise.push(...this.noise);
    return copy;
  }

  solver(): Solver {
    const matrix = new ComplexMatrix(this.nodes - 1 + this.branches.length);
    for (const { a, b, value } of this.admittances) stampAdmittance(matrix, a, b, value);
    this.branches.forEach((branch, index) => this.stampBranch(matrix, branch, this.rowOf(index)));
    return new Solver(new Factorisation(matrix), (index) => this.rowOf(index));
  }

  private rowOf(branch: number): number {
    return this.nodes - 1 + branch;
  }

  private stampBranch(matrix: ComplexMatrix, branch: Branch, row: number): void {
    const one = complex(1);
    if (branch.open) {
      matrix.add(row, row, one);
      return;
    }
    if (branch.from !== GROUND) {
      matrix.add(row, branch.from - 1, one);
      if (branch.drawsFrom) matrix.add(branch.from - 1, row, one);
    }
    if (branch.to !== GROUND) {
      matrix.add(row, branch.to - 1, complex(-1));
      matrix.add(branch.to - 1, row, complex(-1));
    }
    matrix.add(row, row, scale(branch.impedance, -1));
    for (const { node, gain } of branch.controls) {
      if (node !== GROUND) matrix.add(row, node - 1, scale(gain, -1));
    }
    for (const { branch: other, gain } of branch.currentControls) matrix.add(row, this.rowOf(other), scale(gain, -1));
  }
}

function stampAdmittance(matrix: ComplexMatrix, a: number, b: number, value: Complex): void {
  if (a !== GROUND) matrix.add(a - 1, a - 1, value);
  if (b !== GROUND) matrix.add(b - 1, b - 1, value);
  if (a === GROUND || b === GROUND) return;
  matrix.add(a - 1, b - 1, scale(value, -1));
  matrix.add(b - 1, a - 1, scale(value, -1));
}

export class Solution {
  constructor(
    private readonly values: readonly Complex[],
    private readonly rowOf: (branch: number) => number,
  ) {}

  voltage(node: number): Complex {
    return node === GROUND ? complex(0) : this.values[node - 1];
  }

  current(branch: number): Complex {
    return this.values[this.rowOf(branch)];
  }
}

export class Solver {
  constructor(
    private readonly factorisation: Factorisation,
    private readonly rowOf: (branch: number) => number,
  ) {}

  solve(injection: Injection): Solution {
    return new Solution(this.factorisation.solve(this.rightSide(injection)), this.rowOf);
  }

  /** Σ |transfer|²·density at a node over the generators that pass the filter. */
  noiseAt(node: number, generators: readonly NoiseGenerator[]): number {
    return generators.reduce(
      (sum, generator) => sum + magnitudeSquared(this.solve(generator.injection).voltage(node)) * generator.density,
      0,
    );
  }

  private rightSide(injection: Injection): RightSide[] {
    if (injection.kind === 'emf') return [{ row: this.rowOf(injection.branch), value: injection.factor }];
    const entries: RightSide[] = [];
    if (injection.from !== GROUND) entries.push({ row: injection.from - 1, value: complex(-1) });
    if (injection.to !== GROUND) entries.push({ row: injection.to - 1, value: complex(1) });
    return entries;
  }
}

/** R ∥ C; 0 Ω stays 0 Ω. */
export function parallelRc(ohm: number, farad: number, omega: number): Complex {
  return ohm === 0 ? complex(0) : reciprocal(add(complex(1 / ohm), complex(0, omega * farad)));
}
