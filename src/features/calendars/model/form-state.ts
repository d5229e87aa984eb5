import { goesAsSeen } from '#shared/calendar/as-seen.js';
import type { EntryDates, EntryInput } from '#shared/contracts/calendars.js';
import type { Language } from '#shared/contracts/people.js';
import type { SkyMarkerYear } from '#shared/contracts/sky-markers.js';
import type { MarkerRow } from '#shared/contracts/stars.js';
import { dayNumberFromIso, dayNumberOf } from '#shared/kernel/iso-date.js';
import { monthDay } from '#shared/contracts/common.js';
import type { EntryDraft } from './entry-draft.js';
import type { Markers } from './preview-dates.js';
import type { DraftChange } from './use-entry-edits.js';

/** What the groups of the entry's form share. */
export interface FormState {
  calendarId: string;
  entryId: string;
  placeId: string;
  draft: EntryDraft;
  content: EntryInput;
  dates: EntryDates | null;
  year: number;
  change: (change: DraftChange) => void;
  /** The sentence for a field, or undefined while all is well. */
  at: (field: string) => string | undefined;
  markers: Markers | null;
  /** The year of the sign of the sky that leads; null while another thing leads or it is on its way. */
  sign: SkyMarkerYear | null;
  /** Keys of the stars and figures that the calendar goes by already. */
  inUse: ReadonlySet<string>;
  villageLanguage: Language | null;
  officerLanguage: Language | null;
  /** An elder's own entry: its first fields are few, and it is kept. */
  isKeepers: boolean;
  /** Saved entries from whose days this one can be counted. */
  others: readonly OtherEntry[];
  /** Titles along the circle in which it would wait for itself. */
  circle: readonly string[] | null;
}

export interface OtherEntry {
  id: string;
  title: string;
}

/** The star or figure that the entry goes by; null for a fixed date, or while none is chosen or known. */
export function leadingRow({ draft, markers }: Pick<FormState, 'draft' | 'markers'>): MarkerRow | null {
  return isByStar(draft) ? (markers?.get(draft.marker.markerKey) ?? null) : null;
}

/** Does the first or last day of a star lead, as computed or as seen? */
export function isByStar({ leadType }: Pick<EntryDraft, 'leadType'>): boolean {
  return leadType === 'marker' || leadType === 'marker-as-seen';
}

/** The day from which the four days are counted; null while there is none. */
export function leadDayNumber(
  form: Pick<FormState, 'draft' | 'content' | 'sign' | 'markers' | 'year' | 'dates'>,
): number | null {
  const { draft, year } = form;
  if (draft.leadType === 'fixed-date') {
    const { month, day } = draft.fixed.date;
    return monthDay.safeParse(draft.fixed.date).success ? dayNumberOf(year, month, day) : null;
  }
  const isSeen = draft.seen !== null && goesAsSeen(form.content.lead);
  if (draft.leadType === 'sky' && !isSeen) {
    return form.sign?.occurrences[draft.sky.occurrence - 1]?.expected.dayNumber ?? null;
  }
  if (!isByStar(draft) || isSeen) {
    const from = form.dates?.counted?.from ?? null;
    return from === null ? null : dayNumberFromIso(from);
  }
  const row = leadingRow(form);
  if (row?.outcome !== 'rises-and-sets') return null;
  const occurrence = row.phenomena[draft.marker.phenomenon].occurrences[draft.marker.occurrence - 1];
  return occurrence?.expected.dayNumber ?? null;
}
