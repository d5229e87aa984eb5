import type { EntryComparison } from '#shared/contracts/versions.js';
import { dayNumberFromIso, dayNumberOf, civilDateOf, daysInMonth } from '#shared/kernel/iso-date.js';

export type ChangeWord = EntryComparison['change'] | 'words';

/** Fields on which no day rests. */
const WORD_FIELDS = new Set([
  'titleVillage',
  'titleOfficer',
  'kind',
  'kindWord',
  'icon',
  'crop',
  'notes',
  'caution',
  'otherSigns',
  'ifLate',
  'giver',
  'agreedToPrint',
  'sharingLevel',
  'dates.warnings',
]);

/** What became of an entry; `words` where only words differ and no day can move. */
export function changeWord({ change, fields }: EntryComparison): ChangeWord {
  return change === 'changed' && fields.every(({ field }) => WORD_FIELDS.has(field)) ? 'words' : change;
}

/** Whole months that hold both windows, for bars before and now; null unless both sides have one and they differ. */
export function barsSpan(entry: EntryComparison): { first: number; last: number } | null {
  const before = entry.before?.dates.window;
  const after = entry.after?.dates.window;
  if (!before || !after || !entry.fields.some(({ field }) => field === 'dates.window')) return null;
  const first = Math.min(dayNumberFromIso(before.earliest), dayNumberFromIso(after.earliest));
  const last = Math.max(dayNumberFromIso(before.lastAdvised), dayNumberFromIso(after.lastAdvised));
  const from = civilDateOf(first);
  const to = civilDateOf(last);
  return {
    first: dayNumberOf(from.year, from.month, 1),
    last: dayNumberOf(to.year, to.month, daysInMonth(to.year, to.month)),
  };
}

/** Entries that differ, in the order of the newer side; those that were taken out last. */
export function differing(entries: readonly EntryComparison[]): EntryComparison[] {
  return entries.filter(({ change }) => change !== 'same');
}
