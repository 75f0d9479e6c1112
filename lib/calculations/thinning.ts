/** So many of the latest revisions are all kept. */
export const keptRevisions = 200;
/** Older than that, every tenth is kept; older than ten times that, every hundredth. */
const thinner = 10;

/**
 * The revisions that go when revision `current` is saved. Each save makes one revision old and one
 * very old, so there are at most two; saved one by one, exactly the thinned history remains.
 */
export function revisionsToThin(current: number): number[] {
  const old = current - keptRevisions;
  const veryOld = current - keptRevisions * thinner;
  const gone: number[] = [];
  if (old > 0 && old % thinner !== 0) gone.push(old);
  if (veryOld > 0 && veryOld % thinner === 0 && veryOld % (thinner * thinner) !== 0)
    gone.push(veryOld);
  return gone;
}
