import { markerKey as markerKeySchema } from '#shared/contracts/stars.js';
import { PHENOMENA, type Phenomenon } from '#shared/sky/vocabulary.js';
import { paths } from '#src/lib/paths.js';
import { newEntryId } from './kept-edits.js';

/** What a new entry shall go by, from the star's page. */
export interface WantedMarker {
  markerKey: string;
  phenomenon: Phenomenon;
}

/** The same star asked for twice opens the same unsaved entry again. */
export function newEntryPath(calendarId: string, wanted: WantedMarker | null): string {
  if (wanted === null) return paths.calendar(calendarId);
  const { markerKey, phenomenon } = wanted;
  const entry = newEntryId(`${markerKey}-${phenomenon}`);
  return paths.calendar(calendarId, { entry, marker: markerKey, phenomenon });
}

/** What an address asks for; null where it asks for nothing that can be read. */
export function wantedMarker(marker: string | null, phenomenon: string | null): WantedMarker | null {
  const key = markerKeySchema.safeParse(marker);
  if (!key.success) return null;
  return {
    markerKey: key.data,
    phenomenon: PHENOMENA.find((each) => each === phenomenon) ?? 'heliacal-rising',
  };
}
