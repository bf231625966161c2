import { readFileSync } from 'node:fs';
import path from 'node:path';

/** One row of a table in docs/permissions.md: the action, and yes or no by column. */
export interface Permission {
  readonly action: string;
  readonly column: string;
  readonly allowed: boolean;
}

const FILE = path.resolve(__dirname, '../../docs/permissions.md');

const cellsOf = (line: string) =>
  line
    .split('|')
    .slice(1, -1)
    .map((cell) => cell.trim());

function allowed(cell: string | undefined, action: string, column: string): boolean {
  if (cell !== 'yes' && cell !== 'no') throw new Error(`${action} × ${column} in docs/permissions.md is "${cell}".`);
  return cell === 'yes';
}

/** Every cell of the table under the heading `## <feature>`, so that one test can be made of each. */
export function readPermissions(feature: string): Permission[] {
  const section = readFileSync(FILE, 'utf8')
    .split(/^## /m)
    .find((part) => part.startsWith(`${feature}\n`));
  const lines = section?.split('\n').filter((line) => line.startsWith('|')) ?? [];
  const [header, , ...rows] = lines.map(cellsOf);
  if (header === undefined || rows.length === 0) throw new Error(`docs/permissions.md has no table "${feature}".`);
  return rows.flatMap(([action = '', ...cells]) =>
    header.slice(1).map((column, index) => ({ action, column, allowed: allowed(cells[index], action, column) })),
  );
}
