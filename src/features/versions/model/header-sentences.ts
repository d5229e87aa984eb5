import type { FieldChange } from '#shared/contracts/versions.js';
import type { Sentence } from './entry-sentences.js';

/** Several fields of a place are one thing to people. */
const SAID_AS: Readonly<Record<string, Sentence['key']>> = {
  order: 'sentence.header.order',
  weatherContact: 'sentence.header.weatherContact',
  agricultureContact: 'sentence.header.agricultureContact',
  communityName: 'sentence.header.communityName',
  villageLanguage: 'sentence.header.languages',
  officerLanguage: 'sentence.header.languages',
  engineVersion: 'sentence.header.engineVersion',
  'place.name': 'sentence.header.place.name',
  'place.skyline': 'sentence.header.place.skyline',
  'place.clarityByMonth': 'sentence.header.place.clarityByMonth',
  'place.thresholdSet': 'sentence.header.place.thresholds',
  'place.sameSideShiftDeg': 'sentence.header.place.thresholds',
  'place.oppositeSideShiftDeg': 'sentence.header.place.thresholds',
  'place.figures': 'sentence.header.place.figures',
  'place.skylineRule': 'sentence.header.place.skylineRule',
  'place.latitudeDeg': 'sentence.header.place.where',
  'place.longitudeDeg': 'sentence.header.place.where',
  'place.elevationM': 'sentence.header.place.where',
  'place.timeZone': 'sentence.header.place.where',
};

/** What the two versions rest on and how it differs, each thing once. */
export function headerSentences(changes: readonly FieldChange[]): Sentence[] {
  const found = new Map<string, Sentence>();
  for (const { field, before, after } of changes) {
    const key = SAID_AS[field] ?? 'sentence.header.other';
    if (!found.has(key)) found.set(key, { key, values: { before: plain(before), after: plain(after) } });
  }
  return [...found.values()];
}

/** Those that can move the day of a star: the reason beside a sentence about a moved sign. */
export function skyReasons(changes: readonly FieldChange[]): Sentence[] {
  return headerSentences(
    changes.filter(({ field }) => field === 'engineVersion' || /^place\.(?!name)/u.test(field)),
  );
}

function plain(value: unknown): string {
  return typeof value === 'string' || typeof value === 'number' ? String(value) : '';
}
