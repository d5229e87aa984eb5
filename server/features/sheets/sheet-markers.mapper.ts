import type { EntryDates, EntryInput } from '#shared/contracts/calendars.js';
import type { FrozenMarker, VersionEntryBody } from '#shared/contracts/versions.js';
import type { IconKey } from '#shared/sheet/icons.js';
import type { Label, SheetMarker } from '#shared/sheet/sheet-model.js';
import type { Translate } from '../../print/translator.js';
import { whyNoDate } from './why-no-date.js';

type MarkerLead = Extract<EntryInput['lead'], { type: 'marker' }>;

export interface MarkerTexts {
  files: Translate;
  sky: Translate;
}

/** Figures that have a drawing of their own. */
const FIGURE_ICONS: Readonly<Record<string, IconKey>> = { pleiades: 'cluster', 'orion-belt': 'row' };

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
  const found = new Map<string, { lead: MarkerLead; dates: EntryDates; titles: Label | null }>();
  for (const { content, dates } of bodies) {
    const { lead } = content;
    if (lead.type !== 'marker') continue;
    const key = `${lead.markerKey} ${lead.phenomenon} ${lead.occurrence}`;
    const titles =
      content.kind === 'marker-only'
        ? { village: content.titleVillage, officer: content.titleOfficer }
        : null;
    const known = found.get(key);
    found.set(key, { lead, dates, titles: known?.titles ?? titles });
  }
  return [...found.values()]
    .sort((a, b) => dayOf(a.dates) - dayOf(b.dates))
    .map(({ lead, dates, titles }, index) => {
      const marker = names.get(lead.markerKey);
      return {
        letter: letterOf(index),
        key: lead.markerKey,
        icon: FIGURE_ICONS[lead.markerKey] ?? 'star',
        titles: titles ?? { village: '', officer: titleOf(lead, dates, marker, texts) },
        phenomenon: texts.sky(`phenomenonTitle.${lead.phenomenon}`),
        light:
          lead.phenomenon === 'heliacal-rising' || lead.phenomenon === 'cosmical-setting' ? 'dawn' : 'dusk',
        expected: dates.marker?.expected.gregorian ?? null,
        early: dates.marker?.early?.gregorian ?? null,
        late: dates.marker?.late?.gregorian ?? null,
        whyNoDate: dates.marker ? null : whyNoDate(dates, year, texts.files),
      };
    });
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
