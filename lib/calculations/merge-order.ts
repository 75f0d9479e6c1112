/** Whether two orders put the ids they share in the same sequence. */
function agreeOnOrder(a: readonly string[], b: readonly string[]): boolean {
  const inA = new Set(a);
  const inB = new Set(b);
  const shared = a.filter((id) => inB.has(id));
  return b.filter((id) => inA.has(id)).every((id, index) => id === shared[index]);
}

/** Puts `id` into `order` right behind the nearest id that stands before it in `other`. */
function insertLike(order: string[], other: readonly string[], id: string): void {
  const before = other.slice(0, other.indexOf(id)).reverse();
  const anchor = before.find((candidate) => order.includes(candidate));
  order.splice(anchor === undefined ? 0 : order.indexOf(anchor) + 1, 0, id);
}

/**
 * The order of cells after a merge: of the side that moved cells, with what only the other side has
 * put behind the neighbour it had there. When both moved cells, mine stands: the order is one of
 * reading, and no text depends on it. Every id of either side is in the answer once.
 */
export function mergeOrder(
  base: readonly string[],
  mine: readonly string[],
  theirs: readonly string[],
): string[] {
  const [first, second] = agreeOnOrder(base, mine) ? [theirs, mine] : [mine, theirs];
  const order = [...first];
  for (const id of second) if (!order.includes(id)) insertLike(order, second, id);
  return order;
}
