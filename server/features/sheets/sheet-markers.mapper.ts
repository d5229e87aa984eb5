import type { EntryDates, EntryInput } from '#shared/contracts/calendars.js';
import type { FrozenMarker, VersionEntryBody } from '#shared/contracts/versions.js';
import { canonicalJson } from '#shared/kernel/canonical-json.js';
import { skySign } from '#shared/calendar/sky-sign.js';
import { isStarLead } from '#shared/calendar/entry-model.js';
import { compassPoint } from '#shared/sky/index.js';
import { markerIconKey, skySignIconKey } from '#shared/sheet/lead-icons.js';
import type { Label, SheetMarker } from '#shared/sheet/sheet-model.js';
import { skyMarkerTimeOf } from '#shared/sky/vocabulary.js';
import type { Translate } from '../../print/translator.js';
import { whyNoDate } from './why-no-date.js';

type SkyLed = Extract<EntryInput['lead'], { type: 'marker' | 'marker-as-seen' | 'sky' }>;
type MarkerLead = Exclude<SkyLed, { type: 'sky' }>;

export interface MarkerTexts {
  files: Translate;
  sky: Translate;
}

/**
 * What the printed entries go by, each once, by date and lettered in that order. An entry that is nothing but a
 * marker lends it the village's words.
 */
export function toSheetMarkers(
  bodies: readonly VersionEntryBody[],
  frozen: readonly FrozenMarker[],
  year: number,
  texts: MarkerTexts,
): SheetMarker[] {
  const names = new Map(frozen.map((marker) => [marker.markerKey, marker]));
  const found = new Map<string, { lead: SkyLed; dates: EntryDates; titles: Label | null }>();
  for (const { content, dates } of bodies) {
    const { lead } = content;
    if (lead.type !== 'sky' && !isStarLead(lead)) continue;
    const key = markKeyOf(lead);
    const titles =
      content.kind === 'marker-only'
        ? { village: content.titleVillage, officer: content.titleOfficer }
        : null;
    const known = found.get(key);
    found.set(key, { lead, dates, titles: known?.titles ?? titles });
  }
  return [...found.values()]
    .sort((a, b) => dayOf(a.dates) - dayOf(b.dates))
    .map(({ lead, dates, titles }, index) => ({
      letter: letterOf(index),
      ...(lead.type === 'sky'
        ? signWords(lead.spec, titles, names, texts)
        : starWords(lead, dates, titles, names.get(lead.markerKey), texts)),
      expected: dates.marker?.expected.gregorian ?? null,
      early: dates.marker?.early?.gregorian ?? null,
      late: dates.marker?.late?.gregorian ?? null,
      whyNoDate: dates.marker ? null : whyNoDate(dates, year, texts),
    }));
}

/** What leads as computed and as seen is one mark, by its computed day. */
function markKeyOf(lead: SkyLed): string {
  if (lead.type === 'sky')
    return canonicalJson({ type: 'sky', spec: lead.spec, occurrence: lead.occurrence });
  const { markerKey, phenomenon, occurrence } = lead;
  return canonicalJson({ type: 'marker', markerKey, phenomenon, occurrence });
}

type MarkerWords = Pick<SheetMarker, 'key' | 'isStar' | 'icon' | 'titles' | 'phenomenon' | 'light'>;

function starWords(
  lead: MarkerLead,
  dates: EntryDates,
  titles: Label | null,
  marker: FrozenMarker | undefined,
  texts: MarkerTexts,
): MarkerWords {
  const isMorning = lead.phenomenon === 'heliacal-rising' || lead.phenomenon === 'cosmical-setting';
  return {
    key: lead.markerKey,
    isStar: true,
    icon: markerIconKey(lead.markerKey),
    titles: titles ?? { village: '', officer: titleOf(lead, dates, marker, texts) },
    phenomenon: texts.sky(`phenomenonTitle.${lead.phenomenon}`),
    light: isMorning ? 'dawn' : 'dusk',
  };
}

/** A sign's name says everything; where the village's words stand in its place, it goes beside the date. */
function signWords(
  spec: Extract<SkyLed, { type: 'sky' }>['spec'],
  titles: Label | null,
  names: ReadonlyMap<string, FrozenMarker>,
  { sky }: MarkerTexts,
): MarkerWords {
  const marker = 'markerKey' in spec ? names.get(spec.markerKey) : undefined;
  const starName = marker?.name === '' ? marker.designation : (marker?.name ?? '');
  const sign = skySign(spec, starName, { t: sky, compassPoint });
  const time = skyMarkerTimeOf(spec);
  return {
    key: spec.kind,
    isStar: false,
    icon: skySignIconKey(spec),
    titles: titles ?? { village: '', officer: sign },
    phenomenon: titles ? sign : sky(`signTimeTitle.${time}`),
    light: time === 'evening' || time === 'night' ? 'dusk' : 'dawn',
  };
}

/** A star that is never hidden comes back from nowhere, so "returns" would not be true of it. */
function titleOf(
  { phenomenon, markerKey }: MarkerLead,
  { marker: days, warnings }: EntryDates,
  marker: FrozenMarker | undefined,
  { files, sky }: MarkerTexts,
): string {
  const name = marker?.name === '' ? marker.designation : (marker?.name ?? markerKey);
  const disappears =
    !warnings.includes('never-disappears') && days?.notes.includes('never-disappears') !== true;
  if (phenomenon === 'heliacal-rising' && disappears) return files('sheet.returns', { name });
  if (phenomenon === 'heliacal-setting' && disappears) return files('sheet.leaves', { name });
  return files('sheet.shows', { name, phenomenon: sky(`phenomenon.${phenomenon}`) });
}

/** Those without a date come last. */
function dayOf({ marker }: EntryDates): number {
  return marker?.expected.dayNumber ?? Number.MAX_SAFE_INTEGER;
}

/** A, B … Z, AA, AB … */
export function letterOf(index: number): string {
  const last = String.fromCharCode(65 + (index % 26));
  return index < 26 ? last : letterOf(Math.floor(index / 26) - 1) + last;
}
