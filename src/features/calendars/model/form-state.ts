import type { EntryDates, EntryInput } from '#shared/contracts/calendars.js';
import type { Language } from '#shared/contracts/people.js';
import type { SkyMarkerYear } from '#shared/contracts/sky-markers.js';
import type { MarkerRow } from '#shared/contracts/stars.js';
import { dayNumberOf } from '#shared/kernel/iso-date.js';
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
}

/** The star or figure that the entry goes by; null for a fixed date, or while none is chosen or known. */
export function leadingRow({ draft, markers }: Pick<FormState, 'draft' | 'markers'>): MarkerRow | null {
  return draft.leadType === 'marker' ? (markers?.get(draft.marker.markerKey) ?? null) : null;
}

/** The day from which the four days are counted; null while there is none. */
export function leadDayNumber(form: Pick<FormState, 'draft' | 'sign' | 'markers' | 'year'>): number | null {
  const { draft, year } = form;
  if (draft.leadType === 'fixed-date') {
    const { month, day } = draft.fixed.date;
    return monthDay.safeParse(draft.fixed.date).success ? dayNumberOf(year, month, day) : null;
  }
  if (draft.leadType === 'sky') {
    return form.sign?.occurrences[draft.sky.occurrence - 1]?.expected.dayNumber ?? null;
  }
  const row = leadingRow(form);
  if (row?.outcome !== 'rises-and-sets') return null;
  const occurrence = row.phenomena[draft.marker.phenomenon].occurrences[draft.marker.occurrence - 1];
  return occurrence?.expected.dayNumber ?? null;
}
