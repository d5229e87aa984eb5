import { DRIFT_DAYS_TOLD, driftedDays, type EntryAdvice } from '#shared/calendar/advice.js';
import { occurrenceDaysOf } from '#shared/calendar/entry-dates.js';
import { isStarLead } from '#shared/calendar/entry-model.js';
import type { EntryInput } from '#shared/contracts/calendars.js';
import { canonicalJson } from '#shared/kernel/canonical-json.js';
import { driftOf, moonlightBeside, type Phenomenon } from '#shared/sky/index.js';
import { figuresOf, settingsOf, siteOf, type WatchedPlace } from '../places/watched-place.service.js';
import type { SkyYearsService } from '../stars/sky-years.service.js';

/** Answers that are kept, a few bytes each: the stars of a few large calendars. */
const KEPT_ANSWERS = 5000;

/** What the sky says beside an entry's dates: a bright Moon near its star, and how far the star moved since long ago. */
export class SkyAdvice {
  private readonly known = new Map<string, boolean>();

  constructor(private readonly years: SkyYearsService) {}

  of(place: WatchedPlace, year: number, contents: readonly EntryInput[]): EntryAdvice[][] {
    const placeKey = canonicalJson([year, siteOf(place), settingsOf(place), figuresOf(place)]);
    return contents.map(({ lead, record }) => {
      if (!isStarLead(lead)) return [];
      const { markerKey, phenomenon, occurrence } = lead;
      const since = record?.trust.sinceYear ?? year;
      const key = [placeKey, markerKey, phenomenon].join(' ');
      const isMoonlit = this.once(`${key} moon ${String(occurrence)}`, () =>
        this.moonlit(place, year, markerKey, phenomenon, occurrence),
      );
      const isDrifted =
        since < year &&
        this.once(`${key} since ${String(since)}`, () => drifted(place, year, markerKey, phenomenon, since));
      return [...(isMoonlit ? ['moonlit' as const] : []), ...(isDrifted ? ['drifted' as const] : [])];
    });
  }

  private moonlit(
    place: WatchedPlace,
    year: number,
    markerKey: string,
    phenomenon: Phenomenon,
    occurrence: number,
  ): boolean {
    const [markerYear] = this.years.markerYears(place, year, [markerKey]);
    const found = markerYear?.phenomena[phenomenon].occurrences[occurrence - 1];
    if (!found) return false;
    return moonlightBeside(markerKey, siteOf(place), found.expected.jdUt, figuresOf(place)) === 'strong';
  }

  private once(key: string, compute: () => boolean): boolean {
    const known = this.known.get(key);
    if (known !== undefined) return known;
    const answer = compute();
    if (this.known.size >= KEPT_ANSWERS) this.known.clear();
    this.known.set(key, answer);
    return answer;
  }
}

function drifted(
  place: WatchedPlace,
  year: number,
  markerKey: string,
  phenomenon: Phenomenon,
  since: number,
): boolean {
  const { epochs } = driftOf(markerKey, siteOf(place), settingsOf(place), [since, year], figuresOf(place));
  const [then, now] = epochs.map((epoch) => epoch.phenomena[phenomenon].occurrences[0]);
  if (then === undefined || now === undefined) return false;
  const dayOf = (day: typeof now) => occurrenceDaysOf(day).expected.gregorian;
  return Math.abs(driftedDays(dayOf(then), dayOf(now))) > DRIFT_DAYS_TOLD;
}
