import { isEasyToFind } from '#shared/calendar/marker-candidates.js';
import {
  nearestServing,
  rankMarkers,
  type RankedMarker,
  type WantedDays,
} from '#shared/calendar/marker-ranking.js';
import {
  FOUND_MAX,
  LATER_YEARS,
  type ComparisonInput,
  type FinderAnswer,
  type FinderQuery,
  type FoundMarker,
  type OldMarkerNow,
  type YearsAnswer,
} from '#shared/contracts/finder.js';
import type { MarkerNames } from '#shared/contracts/stars.js';
import { occurrenceDaysOf } from '#shared/calendar/entry-dates.js';
import { civilDateFromIso, dayNumberOf } from '#shared/kernel/iso-date.js';
import {
  darkestOfNightDeg,
  driftOf,
  moonOverPlace,
  resolveMarker,
  type MarkerDrift,
} from '#shared/sky/index.js';
import { setImmediate } from 'node:timers/promises';
import type { Actor } from '../../http/actor.js';
import { invalidField } from '../../http/app-error.js';
import type { PlacesService, VillagePlace } from '../places/places.service.js';
import { settingsOf, siteOf } from '../places/watched-place.service.js';
import { allMarkerKeys, markerNamesOf } from '../stars/marker-names.service.js';
import { toCivilDay, toFoundMarker, toNearestMarker, toOldMarkerNow } from './finder.mapper.js';
import { PlaceCandidatesService } from './place-candidates.service.js';
import { askedDays, yearsAround } from './wanted-days.js';

/** How far to look for the next season in which a marker serves; half a year lies beyond it on either side. */
const NEXT_SEASON_DAYS = 120;
/** Markers between which other requests get their turn. */
const MARKERS_AT_A_TIME = 16;
const DEFAULT_OLD_PHENOMENON = 'heliacal-rising';

/** Which marker falls near a wanted day at a place, and what an old one has become. */
export class FinderService {
  constructor(
    private readonly places: PlacesService,
    private readonly candidates = new PlaceCandidatesService(),
  ) {}

  async find(actor: Actor, placeId: string, query: FinderQuery): Promise<FinderAnswer> {
    const place = await this.places.watched(actor, placeId);
    const old = oldMarkerOf(place, query);
    const wanted = askedDays(query) ?? oldDays(old, query.year);
    const ofYear = await this.candidates.inYear(place, query.year);
    const { searched, without } = ofYear;
    const frame = { year: query.year, old, searched, without };
    if (wanted === null) {
      const nearest = { before: null, after: null };
      return { ...frame, wanted: null, items: [], total: 0, nearest, darkestDeg: null };
    }
    const years = yearsAround(wanted, NEXT_SEASON_DAYS);
    const all = (await Promise.all(years.map((year) => this.candidates.inYear(place, year)))).flatMap(
      ({ candidates }) => candidates,
    );
    const ranked = rankMarkers(all, wanted).filter((each) => query.show === 'all' || isEasyToFind(each));
    const { before, after } = nearestServing(all, wanted);
    return {
      ...frame,
      wanted: { from: toCivilDay(wanted.from), to: toCivilDay(wanted.to) },
      items: await this.described(place, query.year, ranked.slice(0, FOUND_MAX)),
      total: ranked.length,
      nearest: {
        before: before && toNearestMarker(before, wanted, place.figures),
        after: after && toNearestMarker(after, wanted, place.figures),
      },
      darkestDeg: darkestOfNightDeg(siteOf(place), Math.floor((wanted.from + wanted.to) / 2)),
    };
  }

  /** Every marker that a place's village can name. */
  async names(actor: Actor, placeId: string): Promise<MarkerNames[]> {
    const { figures } = await this.places.watched(actor, placeId);
    return allMarkerKeys(figures).map((markerKey) => markerNamesOf(markerKey, figures));
  }

  /** Days of some markers in some years; a screen asks a few years at a time, shows how far it is and may stop. */
  async compareYears(actor: Actor, placeId: string, input: ComparisonInput): Promise<YearsAnswer> {
    const place = await this.places.watched(actor, placeId);
    const years = [...new Set(input.years)].sort((a, b) => a - b);
    const items: YearsAnswer['items'] = [];
    for (const [index, { markerKey, phenomenon }] of input.markers.entries()) {
      if (resolveMarker(markerKey, place.figures) === null) {
        throw invalidField(`markers.${index}.markerKey`, 'unknown-marker');
      }
      for (const { year, phenomena } of driftAt(place, markerKey, years).epochs) {
        const [day] = phenomena[phenomenon].occurrences;
        items.push({ markerKey, phenomenon, year, days: day ? occurrenceDaysOf(day) : null });
      }
      await setImmediate();
    }
    return { items };
  }

  private async described(
    place: VillagePlace,
    year: number,
    ranked: readonly RankedMarker[],
  ): Promise<FoundMarker[]> {
    const site = siteOf(place);
    const { figures, rainMonths } = place;
    const years = [year, ...LATER_YEARS.map((later) => year + later)];
    const drifts = new Map<string, MarkerDrift>();
    const items: FoundMarker[] = [];
    for (const [index, found] of ranked.entries()) {
      const drift = drifts.get(found.markerKey) ?? driftAt(place, found.markerKey, years);
      drifts.set(found.markerKey, drift);
      const moon = moonOverPlace(site, found.occurrence.expected.jdUt);
      items.push(toFoundMarker({ found, drift, moon, figures, rainMonths }));
      if (index % MARKERS_AT_A_TIME === 0) await setImmediate();
    }
    return items;
  }
}

function driftAt(place: VillagePlace, markerKey: string, years: readonly number[]): MarkerDrift {
  return driftOf(markerKey, siteOf(place), settingsOf(place), years, place.figures);
}

function oldMarkerOf(place: VillagePlace, query: FinderQuery): OldMarkerNow | null {
  const { oldMarker, since, year, oldPhenomenon = DEFAULT_OLD_PHENOMENON } = query;
  if (oldMarker === undefined || since === undefined) return null;
  if (resolveMarker(oldMarker, place.figures) === null) throw invalidField('oldMarker', 'unknown-marker');
  return toOldMarkerNow(driftAt(place, oldMarker, [since, year]), oldPhenomenon, place.figures);
}

/** The old marker's day of old, in the year asked for: the same place in the seasons, by the Gregorian calendar. */
function oldDays(old: OldMarkerNow | null, year: number): WantedDays | null {
  const then = old?.then.days?.expected;
  if (then === undefined) return null;
  const { month, day } = monthAndDay(then.gregorian);
  const dayNumber = dayNumberOf(year, month, month === 2 ? Math.min(day, 28) : day);
  return { from: dayNumber, to: dayNumber };
}

/** Of `YYYY-MM-DD`, also with a year before 0. */
function monthAndDay(date: string): { month: number; day: number } {
  return civilDateFromIso(`2000${date.slice(-6)}`);
}
