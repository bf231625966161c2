const DASHES = ['6 3', '2 3', '9 3 2 3', '1 2 5 2', '12 4', '4 2 1 2 1 2'];

/** Stages are told apart by their dashes, so that the plot can be read in grey. */
export function stageStroke(index: number): { strokeDasharray: string; strokeWidth: number; stroke: string } {
  return {
    strokeDasharray: DASHES[index % DASHES.length] ?? '6 3',
    strokeWidth: 1.5,
    stroke: index % 2 === 0 ? 'var(--copper)' : 'var(--ink-soft)',
  };
}
