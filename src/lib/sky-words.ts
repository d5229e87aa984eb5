import { isStarLead } from '#shared/calendar/entry-model.js';
import type { EntryLead } from '#shared/contracts/calendars.js';
import {
  COMPASS_POINTS,
  skyMarkerTimeOf,
  type CompassPoint,
  type Phenomenon,
} from '#shared/sky/vocabulary.js';

/** Which end of the night a phenomenon belongs to: its dates say "morning of" or "evening of". */
export function endOfNight(phenomenon: Phenomenon): 'dawn' | 'dusk' {
  return phenomenon === 'heliacal-rising' || phenomenon === 'cosmical-setting' ? 'dawn' : 'dusk';
}

/** The same for whatever leads an entry; noon and the day as a whole go with the morning's light. */
export function endOfLead(lead: EntryLead): 'dawn' | 'dusk' {
  if (isStarLead(lead)) return endOfNight(lead.phenomenon);
  if (lead.type !== 'sky') return 'dawn';
  const time = skyMarkerTimeOf(lead.spec);
  return time === 'evening' || time === 'night' ? 'dusk' : 'dawn';
}

/** The nearest of sixteen compass points; azimuth from north through east. Words: `sky:compass.<point>`. */
export function compassPoint(azimuthDeg: number): CompassPoint {
  const turned = ((azimuthDeg % 360) + 360) % 360;
  return COMPASS_POINTS[Math.round(turned / 22.5) % 16] ?? 'n';
}
