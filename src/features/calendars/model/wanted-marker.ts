import { entryLead, type EntryLead } from '#shared/contracts/calendars.js';
import { markerKey as markerKeySchema } from '#shared/contracts/stars.js';
import { canonicalJson } from '#shared/kernel/canonical-json.js';
import { PHENOMENA } from '#shared/sky/vocabulary.js';
import { paths } from '#src/lib/paths.js';
import { newEntryId } from './kept-edits.js';

/** What an entry shall go by, from the star's page or the finder: a star's day, or a sign of the sky. */
export type WantedMarker = Extract<EntryLead, { type: 'marker' | 'sky' }>;

/** The same marker asked for twice opens the same unsaved entry again. */
export function newEntryPath(calendarId: string, wanted: WantedMarker | null): string {
  if (wanted === null) return paths.calendar(calendarId);
  // The first is what an address without a number means.
  const occurrence = wanted.occurrence === 1 ? undefined : wanted.occurrence;
  const query =
    wanted.type === 'sky'
      ? { sky: canonicalJson(wanted.spec), occurrence }
      : { marker: wanted.markerKey, phenomenon: wanted.phenomenon, occurrence };
  const words = Object.values(query).filter((word) => word !== undefined);
  const entry = newEntryId(words.join('-').replaceAll(/[^\w.-]+/gu, '-'));
  return paths.calendar(calendarId, { entry, ...query });
}

/** What an address asks for; null where it asks for nothing that can be read. */
export function wantedMarker(search: URLSearchParams): WantedMarker | null {
  return wantedSign(search) ?? wantedStar(search);
}

function wantedStar(search: URLSearchParams): WantedMarker | null {
  const key = markerKeySchema.safeParse(search.get('marker'));
  if (!key.success) return null;
  return {
    type: 'marker',
    markerKey: key.data,
    phenomenon: PHENOMENA.find((each) => each === search.get('phenomenon')) ?? 'heliacal-rising',
    occurrence: search.get('occurrence') === '2' ? 2 : 1,
  };
}

function wantedSign(search: URLSearchParams): WantedMarker | null {
  const text = search.get('sky');
  if (text === null) return null;
  const occurrence = Number(search.get('occurrence') ?? 1);
  const lead = entryLead.safeParse({ type: 'sky', spec: readJson(text), occurrence });
  return lead.success && lead.data.type === 'sky' ? lead.data : null;
}

function readJson(text: string): unknown {
  try {
    return JSON.parse(text) as unknown;
  } catch {
    return null;
  }
}
