/** The row of a stage among what is drawn. */
export function rowOf(container: ParentNode | null, stageId: string): HTMLElement | null {
  const rows = [...(container?.querySelectorAll<HTMLElement>('[data-stage]') ?? [])];
  return rows.find((row) => row.dataset['stage'] === stageId) ?? null;
}
