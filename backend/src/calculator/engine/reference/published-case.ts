/** A number or a row of numbers; what it stands for is in its name, with the unit. */
export type CaseValue = number | string | readonly number[];

/**
 * One published or derived case that the calculator is held to. The specs in `verification/` drive the calculator with
 * `inputs` and compare with `expected`; every expected value has its absolute tolerance, which is half of the last
 * printed digit unless `note` says why not.
 */
export interface PublishedCase {
  /** Topic letter and running number; `CASES` are named by it in the specs. */
  readonly id: string;
  readonly what: string;
  readonly inputs: Readonly<Record<string, CaseValue>>;
  readonly expected: Readonly<Record<string, number>>;
  readonly tolerance: Readonly<Record<string, number>>;
  /** Publication, edition, section, example; or "definition" / "common practice". */
  readonly source: string;
  readonly provenance: Provenance;
  /** Where a printed value is held differently, and why. */
  readonly note?: string;
}

export type Provenance =
  | 'read in the source'
  | 'read in a published solution companion to the book'
  | 'formula or inputs read in the source, result recomputed'
  | 'result read in the source, an input from memory'
  | 'from memory'
  | 'derived from the definition'
  | 'common practice';
