import type { DatasheetValue } from '../../calculator/engine';

/** The cells of one line of a table, read one after the other. */
export class TableCells {
  private index = 0;

  constructor(private readonly cells: readonly string[]) {}

  text(): string {
    const cell = this.cells[this.index];
    this.index += 1;
    if (cell === undefined) throw new Error(`The line ${this.cells.join(' | ')} is too short.`);
    return cell;
  }

  /** A number; undefined where the datasheet is silent. The exponent keeps 0.9 nano exactly 9e-10. */
  number(exponent = 0): number | undefined {
    return parse(this.text(), exponent);
  }

  required(exponent = 0): number {
    const value = this.number(exponent);
    if (value === undefined) throw new Error(`The line ${this.cells.join(' | ')} lacks a value that it needs.`);
    return value;
  }

  typical(page: number, exponent = 0, condition?: string): DatasheetValue | undefined {
    const typ = this.number(exponent);
    return typ === undefined ? undefined : { typ, ...place(page, condition) };
  }

  minTyp(page: number, exponent = 0, condition?: string): DatasheetValue | undefined {
    return this.pair('min', 'typ', page, exponent, condition);
  }

  typMax(page: number, exponent = 0, condition?: string): DatasheetValue | undefined {
    return this.pair('typ', 'max', page, exponent, condition);
  }

  minMax(page: number): DatasheetValue | undefined {
    return this.pair('min', 'max', page, 0);
  }

  private pair(
    left: 'min' | 'typ',
    right: 'typ' | 'max',
    page: number,
    exponent: number,
    condition?: string,
  ): DatasheetValue | undefined {
    const [first, second] = this.text()
      .split(' ')
      .map((cell) => parse(cell, exponent));
    if (first === undefined && second === undefined) return undefined;
    return {
      ...(first === undefined ? {} : { [left]: first }),
      ...(second === undefined ? {} : { [right]: second }),
      ...place(page, condition),
    };
  }
}

function parse(cell: string, exponent: number): number | undefined {
  return cell === '-' ? undefined : Number(`${cell}e${exponent}`);
}

function place(page: number, condition?: string): Pick<DatasheetValue, 'page' | 'condition'> {
  return { page: String(page), ...(condition ? { condition } : {}) };
}

export function linesOf(table: string): TableCells[] {
  const lines = table.split('\n').filter((line) => line.trim() !== '');
  return lines.map((line) => new TableCells(line.split('|').map((cell) => cell.trim().replace(/\s+/g, ' '))));
}

/** Leaves out what is undefined: absent means that the datasheet is silent. */
export function withoutAbsent(fields: Readonly<Record<string, unknown>>): Record<string, unknown> {
  return Object.fromEntries(Object.entries(fields).filter(([, value]) => value !== undefined));
}
