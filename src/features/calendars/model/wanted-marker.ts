import { markerKey as markerKeySchema } from '#shared/contracts/stars.js';
import { PHENOMENA, type Phenomenon } from '#shared/sky/vocabulary.js';
import { paths } from '#src/lib/paths.js';
import { newEntryId } from './kept-edits.js';

/** What a new entry shall go by, from the star's page or the finder. */
export interface WantedMarker {
  markerKey: string;
  phenomenon: Phenomenon;
  /** Which of the year's days, where there are two. */
  occurrence: 1 | 2;
}

/** The same star asked for twice opens the same unsaved entry again. */
export function newEntryPath(calendarId: string, wanted: WantedMarker | null): string {
  if (wanted === null) return paths.calendar(calendarId);
  const { markerKey, phenomenon } = wanted;
  // The first is what an address without a number means.
  const second = wanted.occurrence === 1 ? undefined : wanted.occurrence;
  const words = [markerKey, phenomenon, ...(second === undefined ? [] : [second])];
  const entry = newEntryId(words.join('-'));
  return paths.calendar(calendarId, { entry, marker: markerKey, phenomenon, occurrence: second });
}

/** What an address asks for; null where it asks for nothing that can be read. */
export function wantedMarker(search: URLSearchParams): WantedMarker | null {
  const key = markerKeySchema.safeParse(search.get('marker'));
  if (!key.success) return null;
  return {
    markerKey: key.data,
    phenomenon: PHENOMENA.find((each) => each === search.get('phenomenon')) ?? 'heliacal-rising',
    occurrence: search.get('occurrence') === '2' ? 2 : 1,
  };
}
