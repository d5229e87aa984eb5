import { SEEN_DAYS_BEFORE } from '#shared/calendar/signs-in.js';
import type { Sighting, Sign } from '#shared/contracts/signs.js';
import { addDays } from '#shared/kernel/iso-date.js';

export interface LatelySeen {
  sign: Sign;
  seen: Sighting;
}

/** Signs that came in the last sixty days, each with the last time it was seen, newest first. */
export function latelySeen(signs: readonly Sign[], today: string): LatelySeen[] {
  const since = addDays(today, -SEEN_DAYS_BEFORE);
  return signs
    .flatMap((sign): LatelySeen[] => {
      const [seen] = sign.seen;
      return seen !== undefined && seen.day >= since ? [{ sign, seen }] : [];
    })
    .sort((a, b) => b.seen.day.localeCompare(a.seen.day) || a.sign.name.localeCompare(b.sign.name));
}
