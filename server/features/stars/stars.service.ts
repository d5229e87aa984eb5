import type { Place } from '#shared/contracts/places.js';
import type { MarkerDetail, MarkerRow, OccurrenceDetail } from '#shared/contracts/stars.js';
import { dayNumberOf, resolveMarker, watchTimes } from '#shared/sky/index.js';
import type { MarkerYear, Occurrence, Phenomenon } from '#shared/sky/index.js';
import type { Actor } from '../../http/actor.js';
import { notFound } from '../../http/app-error.js';
import type { PlacesService } from '../places/places.service.js';
import { figuresOf, siteOf, type WatchedPlace } from '../places/watched-place.service.js';
import { flatOccurrence } from './flat-horizon.js';
import { membersOf } from './marker-names.service.js';
import type { SkyYearsService } from './sky-years.service.js';
import { starsCsv } from './stars-csv.js';
import { forEachPhenomenon, toMarkerRow, toOccurrenceDetail } from './stars.mapper.js';

export interface StarTable {
  items: MarkerRow[];
  nextCursor: null;
  year: number;
  firstDayNumber: number;
  lastDayNumber: number;
}

/** Civil years are Gregorian from here on, Julian before. */
const FIRST_GREGORIAN_YEAR = 1583;

export class StarsService {
  private readonly details = new WeakMap<Occurrence, { timeZone: string; detail: OccurrenceDetail }>();

  constructor(
    private readonly places: PlacesService,
    private readonly skyYears: SkyYearsService,
  ) {}

  async list(actor: Actor, placeId: string, year: number): Promise<StarTable> {
    return this.tableOf(await this.places.watched(actor, placeId), year);
  }

  async csv(actor: Actor, placeId: string, year: number): Promise<{ text: string; fileName: string }> {
    const place = await this.places.watched(actor, placeId);
    return starsCsv(place, await this.tableOf(place, year));
  }

  async read(actor: Actor, placeId: string, markerKey: string, year: number): Promise<MarkerDetail> {
    const place = await this.places.watched(actor, placeId);
    const figures = figuresOf(place);
    if (resolveMarker(markerKey, figures) === null) throw notFound();
    const nights = this.skyYears.nights(place, year, markerKey);
    const { markerYear } = nights;
    return {
      ...toMarkerRow(nights, figures),
      placeId,
      year,
      ...civilYearDays(year),
      details: forEachPhenomenon((phenomenon) =>
        markerYear.phenomena[phenomenon].occurrences.map((occurrence) =>
          this.occurrenceDetail(place, markerYear, phenomenon, occurrence),
        ),
      ),
      basis: { ...markerYear.basis, clarityByMonth: [...markerYear.basis.clarityByMonth] },
      members: membersOf(markerKey, figures),
      skyline: place.skyline,
    };
  }

  /** Everything that somebody needs who wants to go out and look. An occurrence belongs to one site; only its clock may differ. */
  occurrenceDetail(
    place: WatchedPlace,
    markerYear: MarkerYear,
    phenomenon: Phenomenon,
    occurrence: Occurrence,
  ): OccurrenceDetail {
    const { timeZone } = place;
    const known = this.details.get(occurrence);
    if (known?.timeZone === timeZone) return known.detail;
    const detail = this.detailOf(place, markerYear, phenomenon, occurrence);
    this.details.set(occurrence, { timeZone, detail });
    return detail;
  }

  private detailOf(
    place: WatchedPlace,
    markerYear: MarkerYear,
    phenomenon: Phenomenon,
    occurrence: Occurrence,
  ): OccurrenceDetail {
    const times = watchTimes(siteOf(place), occurrence.expected.dayNumber);
    const atDawn = phenomenon === 'heliacal-rising' || phenomenon === 'cosmical-setting';
    return toOccurrenceDetail(
      {
        occurrence,
        flat:
          place.skyline.length === 0
            ? null
            : flatOccurrence(this.skyYears, place, markerYear, phenomenon, occurrence),
        stopLookingJdUt: atDawn ? times.stopLookingJdUt : null,
        startLookingJdUt: atDawn ? null : times.startLookingJdUt,
      },
      place,
    );
  }

  private async tableOf(place: Place, year: number): Promise<StarTable> {
    const items = await this.skyYears.table(place, year);
    return { items, nextCursor: null, year, ...civilYearDays(year) };
  }
}

function civilYearDays(year: number): { firstDayNumber: number; lastDayNumber: number } {
  const calendar = year >= FIRST_GREGORIAN_YEAR ? 'gregorian' : 'julian';
  return {
    firstDayNumber: dayNumberOf({ year, month: 1, day: 1 }, calendar),
    lastDayNumber: dayNumberOf({ year, month: 12, day: 31 }, calendar),
  };
}
