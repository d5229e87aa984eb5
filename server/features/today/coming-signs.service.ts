import type { ComingSign } from '#shared/contracts/today.js';
import { dayNumberFromIso } from '#shared/kernel/iso-date.js';
import { canonicalJson } from '#shared/kernel/canonical-json.js';
import { figuresOf } from '../places/watched-place.service.js';
import { markerNamesOf } from '../stars/marker-names.service.js';
import type { PublishedCalendar } from './coming-markers.service.js';

const DAYS_AHEAD = 14;

/**
 * Signs of the sky beyond a star's first and last days that the village's published calendars go by, open now or
 * expected soon. With the days that hang on the wall; several entries with one sign are told together.
 */
export function comingSigns(published: readonly PublishedCalendar[], date: string): ComingSign[] {
  const today = dayNumberFromIso(date);
  const found = new Map<string, ComingSign>();
  for (const { header, entries } of published) {
    for (const { content, dates } of entries) {
      if (content.lead.type !== 'sky' || dates.marker === null) continue;
      const { spec } = content.lead;
      const { expected, early, late } = dates.marker;
      const isOpen = (early ?? expected).dayNumber <= today && today <= (late ?? expected).dayNumber;
      const daysAway = expected.dayNumber - today;
      if (!isOpen && (daysAway < 0 || daysAway > DAYS_AHEAD)) continue;
      const key = `${canonicalJson(spec)} ${expected.dayNumber}`;
      const leads = [...(found.get(key)?.leads ?? []), content.titleOfficer];
      const marker = 'markerKey' in spec ? markerNamesOf(spec.markerKey, figuresOf(header.place)) : null;
      found.set(key, { spec, marker, occurrence: dates.marker, daysAway, leads });
    }
  }
  return [...found.values()].sort((a, b) => a.daysAway - b.daysAway);
}
