import {
  Complex,
  ComplexMatrix,
  Factorisation,
  RightSide,
  add,
  complex,
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
  /** Node voltages and branch currents in the order in which they are drawn: a chain gives a narrow band matrix. */
  private unknowns = 0;
  private readonly admittances: { a: number; b: number; value: Complex }[] = [];
  private readonly branches = new Map<number, Branch>();
  readonly noise: NoiseGenerator[] = [];

  node(): number {
    return ++this.unknowns;
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
    const id = ++this.unknowns;
    this.branches.set(id, { from, to, impedance, ...plain, ...extra });
    return id;
  }

  /** Sets the controlled part of a branch to zero: the loop is opened there. */
  withoutControl(branch: number): Circuit {
    return this.withBranch(branch, { controls: [], currentControls: [] });
  }

  /** Takes a branch out. */
  withOpen(branch: number): Circuit {
    return this.withBranch(branch, { open: true });
  }

  solver(): Solver {
    const matrix = new ComplexMatrix(this.unknowns);
    for (const { a, b, value } of this.admittances) stampAdmittance(matrix, a, b, value);
    for (const [id, branch] of this.branches) stampBranch(matrix, branch, id - 1);
    return new Solver(new Factorisation(matrix));
  }

  private withBranch(branch: number, change: Partial<Branch>): Circuit {
    const copy = new Circuit();
    copy.unknowns = this.unknowns;
    copy.admittances.push(...this.admittances);
    for (const [id, drawn] of this.branches) copy.branches.set(id, id === branch ? { ...drawn, ...change } : drawn);
    copy.noise.push(...this.noise);
    return copy;
  }
}

function stampBranch(matrix: ComplexMatrix, branch: Branch, row: number): void {
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
  for (const { branch: other, gain } of branch.currentControls) matrix.add(row, other - 1, scale(gain, -1));
}

function stampAdmittance(matrix: ComplexMatrix, a: number, b: number, value: Complex): void {
  if (a !== GROUND) matrix.add(a - 1, a - 1, value);
  if (b !== GROUND) matrix.add(b - 1, b - 1, value);
  if (a === GROUND || b === GROUND) return;
  matrix.add(a - 1, b - 1, scale(value, -1));
  matrix.add(b - 1, a - 1, scale(value, -1));
}

export class Solution {
  constructor(private readonly values: readonly Complex[]) {}

  voltage(node: number): Complex {
    return node === GROUND ? complex(0) : this.values[node - 1];
  }

  current(branch: number): Complex {
    return this.values[branch - 1];
  }
}

export class Solver {
  constructor(private readonly factorisation: Factorisation) {}

  solve(injection: Injection): Solution {
    return new Solution(this.factorisation.solve(rightSide(injection)));
  }
}

function rightSide(injection: Injection): RightSide[] {
  if (injection.kind === 'emf') return [{ row: injection.branch - 1, value: injection.factor }];
  const entries: RightSide[] = [];
  if (injection.from !== GROUND) entries.push({ row: injection.from - 1, value: complex(-1) });
  if (injection.to !== GROUND) entries.push({ row: injection.to - 1, value: complex(1) });
  return entries;
}

/** R ∥ C; 0 Ω stays 0 Ω. */
export function parallelRc(ohm: number, farad: number, omega: number): Complex {
  return ohm === 0 ? complex(0) : reciprocal(add(complex(1 / ohm), complex(0, omega * farad)));
}
