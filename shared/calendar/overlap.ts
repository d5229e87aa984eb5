import type { EntryTiming, EntryWindow } from './entry-model.js';

export interface OverlapCandidate {
  id: string;
  timing: Pick<EntryTiming, 'kind' | 'crop'>;
  window: EntryWindow | null;
}

/**
 * Ids of entries to warn about with `windows-overlap`.
 *
 * In a village's year almost every window overlaps some other one, and that is how it should be; a warning at each
 * would be read by nobody. It is given only where it nearly always points at a slip: two pieces of farm work on
 * the same crop, and the best days of the one lie wholly within the best days of the other, so that there is no
 * best day on which only the narrower one is due. That is what a copy looks like whose offsets were not changed
 * yet, or a second step that was counted from the wrong star.
 *
 * The warning concerns two entries. It is therefore not frozen into a version: an entry must not count as changed,
 * and be asked about again, because its neighbour was.
 */
export function overlappingEntryIds(entries: readonly OverlapCandidate[]): Set<string> {
  const byCrop = new Map<string, { id: string; window: EntryWindow }[]>();
  for (const { id, timing, window } of entries) {
    const crop = timing.crop.normalize('NFC').trim().toLowerCase();
    if (timing.kind !== 'farm' || crop === '' || window === null) continue;
    const group = byCrop.get(crop);
    if (group) group.push({ id, window });
    else byCrop.set(crop, [{ id, window }]);
  }
  return new Set([...byCrop.values()].flatMap((group) => [...idsOfNested(group)]));
}

/**
 * Ids of those whose best days lie wholly within another one's, or another one's within theirs. Of two windows the one
 * that begins later lies within the other one if it ends no later: in that order one look from each side is enough.
 */
export function idsOfNested(entries: readonly { id: string; window: EntryWindow }[]): Set<string> {
  const found = new Set<string>();
  const inOrder = entries.toSorted(
    (a, b) => compare(a.window.bestFrom, b.window.bestFrom) || compare(b.window.bestTo, a.window.bestTo),
  );
  let latestEnd: string | null = null;
  for (const { id, window } of inOrder) {
    if (latestEnd !== null && window.bestTo <= latestEnd) found.add(id);
    if (latestEnd === null || window.bestTo > latestEnd) latestEnd = window.bestTo;
  }
  let earliestEnd: string | null = null;
  for (const { id, window } of inOrder.toReversed()) {
    if (earliestEnd !== null && window.bestTo >= earliestEnd) found.add(id);
    if (earliestEnd === null || window.bestTo < earliestEnd) earliestEnd = window.bestTo;
  }
  return found;
}

function compare(a: string, b: string): number {
  if (a === b) return 0;
  return a < b ? -1 : 1;
}

/** ISO dates of four-digit years sort as text. */
export function bestDaysWithin(inner: EntryWindow, outer: EntryWindow): boolean {
  return inner.bestFrom >= outer.bestFrom && inner.bestTo <= outer.bestTo;
}
