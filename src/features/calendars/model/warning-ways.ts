import type { EntryWarning } from '#shared/contracts/calendars.js';
import type { MarkerRow } from '#shared/contracts/stars.js';
import { overlappingEntryIds } from '#shared/calendar/overlap.js';
import { PHENOMENA, type Phenomenon } from '#shared/sky/vocabulary.js';
import type { EntryDraft } from './entry-draft.js';
import type { ShownEntry } from './preview-dates.js';

/** A way out of a warning: something that the form does when it is pressed. */
export type Way =
  | {
      kind:
        | 'byPlanned'
        | 'otherStar'
        | 'otherSign'
        | 'useFirst'
        | 'changeDays'
        | 'changeLastDate'
        | 'writeSigns'
        | 'fixedDate'
        | 'otherPeople'
        | 'writeCaution';
    }
  | { kind: 'otherDay'; phenomenon: Phenomenon };

const OTHER_DAYS_MAX = 2;

/** @param row of the leading star; null where none is known */
export function waysOut(warning: EntryWarning, draft: EntryDraft, row: MarkerRow | null): Way[] {
  switch (warning) {
    case 'no-lead-yet':
      return [{ kind: 'otherStar' }, { kind: 'otherSign' }, { kind: 'fixedDate' }];
    case 'sign-not-here':
      return [{ kind: 'otherSign' }, { kind: 'fixedDate' }];
    case 'no-date-this-year':
    case 'star-does-not-serve':
      return [...otherDays(draft, row), another(draft), { kind: 'fixedDate' }];
    case 'one-occurrence-only':
      return [{ kind: 'useFirst' }, another(draft)];
    case 'weak-marker':
    case 'never-disappears':
    case 'lost-in-light-nights':
      return [{ kind: 'writeSigns' }, another(draft)];
    case 'window-closed-by-last-date':
    case 'window-shortened-by-last-date':
      return [{ kind: 'changeDays' }, { kind: 'changeLastDate' }];
    case 'belief-not-agreed-to-print':
      return [];
    case 'windows-overlap':
    case 'anchor-without-days':
      return [{ kind: 'changeDays' }];
    case 'anchor-gone':
      return [{ kind: 'changeDays' }, { kind: 'fixedDate' }];
    case 'waits-for-actual-day':
      return [{ kind: 'byPlanned' }];
  }
}

function another({ leadType }: EntryDraft): Way {
  return { kind: leadType === 'sky' ? 'otherSign' : 'otherStar' };
}

/** Days of the same star that do come this year. */
function otherDays(draft: EntryDraft, row: MarkerRow | null): Way[] {
  if (row === null) return [];
  return PHENOMENA.filter(
    (phenomenon) => phenomenon !== draft.marker.phenomenon && row.phenomena[phenomenon].outcome === 'dated',
  )
    .slice(0, OTHER_DAYS_MAX)
    .map((phenomenon) => ({ kind: 'otherDay', phenomenon }));
}

/** The entries whose best days collide with those of this one. */
export function collidingWith(entry: ShownEntry, all: readonly ShownEntry[]): ShownEntry[] {
  const candidate = ({ id, content, dates }: ShownEntry) => ({
    id,
    timing: content,
    window: dates?.window ?? null,
  });
  return all.filter(
    (other) => other.id !== entry.id && overlappingEntryIds([candidate(entry), candidate(other)]).size > 0,
  );
}
