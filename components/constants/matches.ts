/** Whether every word of a search stands somewhere in the texts of an entry. */
export function matches(search: string, texts: readonly string[]): boolean {
  const heap = texts.join(" ").toLowerCase();
  return search
    .toLowerCase()
    .split(/\s+/)
    .every((word) => heap.includes(word));
}
