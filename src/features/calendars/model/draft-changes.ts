import type { Calendar, Entry } from '#shared/contracts/calendars.js';
import type { DraftGlance } from '#shared/contracts/draft-changes.js';

/** What a page holds of a draft. */
export interface HeldDraft {
  entries: readonly Pick<Entry, 'id' | 'version'>[];
  calendar: Pick<Calendar, 'locked'> & { published: { number: number } | null };
}

export interface DraftNews {
  /** The page holds an older state. */
  isOlder: boolean;
  /** Entries that somebody else added or saved. */
  added: string[];
  saved: string[];
  /** Entries that are not there for this person any more. */
  gone: string[];
}

/**
 * What became of a draft since the page read it. What was done on this very page stands in it already, so it is no news.
 * @param before the glance before, for what a page cannot tell by itself
 */
export function newsOf(held: HeldDraft, before: DraftGlance | null, now: DraftGlance): DraftNews {
  const versions = new Map(held.entries.map(({ id, version }) => [id, version]));
  const others = now.entries.filter(({ byMe }) => !byMe);
  const added = others.filter(({ entryId }) => !versions.has(entryId)).map(({ entryId }) => entryId);
  const saved = others
    .filter(({ entryId, version }) => version > (versions.get(entryId) ?? version))
    .map(({ entryId }) => entryId);
  const there = new Set(now.entries.map(({ entryId }) => entryId));
  const gone = held.entries.filter(({ id }) => !there.has(id)).map(({ id }) => id);
  const isOlder =
    !sameOrder(held, now) ||
    now.entries.some(({ entryId, version }) => version > (versions.get(entryId) ?? 0)) ||
    held.calendar.locked !== now.locked ||
    (held.calendar.published?.number ?? null) !== now.publishedNumber ||
    (before !== null && besideEntries(before) !== besideEntries(now));
  return { isOlder, added, saved, gone };
}

function sameOrder({ entries }: HeldDraft, now: DraftGlance): boolean {
  return (
    entries.length === now.entries.length &&
    entries.every(({ id }, index) => now.entries[index]?.entryId === id)
  );
}

/** What hangs on entries and is asked for by itself: days on which they were really done, and other timings. */
function besideEntries({ entries }: DraftGlance): string {
  return entries
    .flatMap(({ entryId, doneTypedAt, variants }) => [
      ...(doneTypedAt === null ? [] : [`${entryId} ${doneTypedAt}`]),
      ...variants.map(({ variantId, version }) => `${entryId} ${variantId} ${version}`),
    ])
    .sort()
    .join('\n');
}
