/** Puts the focus on a cell once the change that made or moved it has been drawn. */
export function focusCell(id: string | undefined): void {
  if (id === undefined) return;
  requestAnimationFrame(() => document.getElementById(`cell-${id}`)?.focus());
}
