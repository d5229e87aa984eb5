import { occurrenceDaysOf } from '#shared/calendar/entry-dates.js';
import type { MoonQuestion, MoonRule, MoonTable } from '#shared/contracts/moons.js';
import { canonicalJson } from '#shared/kernel/canonical-json.js';
import {
  type LocalMonth,
  localMonths,
  type Lunation,
  type MonthSign,
  moonDayOf,
  type MoonEvent,
  moonsBetween,
  moonYear,
  type Occurrence,
  type Phenomenon,
  resolveMarker,
  venusYear,
} from '#shared/sky/index.js';
import { setImmediate } from 'node:timers/promises';
import type { Actor } from '../../http/actor.js';
import { invalidField } from '../../http/app-error.js';
import type { PlacesService, VillagePlace } from '../places/places.service.js';
import { settingsOf, siteOf } from '../places/watched-place.service.js';
import { markerNamesOf } from '../stars/marker-names.service.js';
import type { SkyYearsService } from '../stars/sky-years.service.js';
import { OFFERED_SIGNS } from './offered-signs.js';
import { moonsCsv } from './moons-csv.js';
import { toMoonRow, toVenus } from './moons.mapper.js';

interface Rule {
  markerKey: string;
  phenomenon: Phenomenon;
  signMonth: number;
  begins: MoonEvent;
}

/** A month may begin so long before the sign that it holds. */
const MONTH_DAYS = 35;
/** Days of Moons that are computed between two turns of other requests. */
const DAYS_AT_A_TIME = 120;
const KEPT_ANSWERS = 24;

/** The Moons of a year at a place, numbered by a star's sign where one is given. */
export class MoonsService {
  private readonly kept = new Map<string, Promise<MoonTable>>();

  constructor(
    private readonly places: PlacesService,
    private readonly skyYears: SkyYearsService,
  ) {}

  async read(actor: Actor, placeId: string, question: MoonQuestion): Promise<MoonTable> {
    return this.tableOf(await this.places.watched(actor, placeId), question);
  }

  async csv(
    actor: Actor,
    placeId: string,
    question: MoonQuestion,
  ): Promise<{ text: string; fileName: string }> {
    const place = await this.places.watched(actor, placeId);
    return moonsCsv(place, await this.tableOf(place, question));
  }

  /** The same question to the same place is computed once. */
  private async tableOf(place: VillagePlace, question: MoonQuestion): Promise<MoonTable> {
    const key = canonicalJson([place.id, place.version, place.figures, { ...question }]);
    const table = this.kept.get(key) ?? this.compute(place, question);
    this.kept.delete(key);
    this.kept.set(key, table);
    const [oldest] = this.kept.keys();
    if (this.kept.size > KEPT_ANSWERS && oldest !== undefined) this.kept.delete(oldest);
    // A failed one must not stay.
    table.catch(() => this.kept.delete(key));
    return table;
  }

  private async compute(place: VillagePlace, question: MoonQuestion): Promise<MoonTable> {
    const { year } = question;
    const [site, settings] = [siteOf(place), settingsOf(place)];
    const { lunations, firstDayNumber, lastDayNumber, sourceKeys, engineVersion } = moonYear(
      site,
      settings,
      year,
    );
    await setImmediate();
    const rule = ruleOf(place, question);
    const months = rule === null ? [] : await this.monthsAround(place, year, rule);
    const venus = venusYear(site, settings, year);
    return {
      year,
      firstDayNumber,
      lastDayNumber,
      moons: lunations.map((lunation) => toMoonRow(lunation, monthOf(lunation, months), place)),
      rule: rule && this.describe(place, year, rule),
      markers: [...place.figures.map(({ key }) => key), ...OFFERED_SIGNS].map((key) =>
        markerNamesOf(key, place.figures),
      ),
      venus: toVenus(venus),
      sourceKeys: [...sourceKeys, ...venus.sourceKeys],
      engineVersion,
    };
  }

  private describe(place: VillagePlace, year: number, rule: Rule): MoonRule {
    const [markerYear] = this.skyYears.markerYears(place, year, [rule.markerKey]);
    if (!markerYear) throw new RangeError(`${rule.markerKey} is no marker.`);
    return {
      marker: markerNamesOf(rule.markerKey, place.figures),
      phenomenon: rule.phenomenon,
      signMonth: rule.signMonth,
      begins: rule.begins,
      starOutcome: markerYear.outcome,
      signs: markerYear.phenomena[rule.phenomenon].occurrences.map(occurrenceDaysOf),
    };
  }

  private signsIn(place: VillagePlace, year: number, { markerKey, phenomenon }: Rule): Occurrence[] {
    const [markerYear] = this.skyYears.markerYears(place, year, [markerKey]);
    return [...(markerYear?.phenomena[phenomenon].occurrences ?? [])];
  }

  /** Months from the last sign that is surely before the year to the first that is surely after it. */
  private async monthsAround(place: VillagePlace, year: number, rule: Rule): Promise<LocalMonth[]> {
    const atDawn = rule.phenomenon === 'heliacal-rising' || rule.phenomenon === 'cosmical-setting';
    const years = [year - 2, year - 1, year, year + 1, year + 2].filter((each) => Math.abs(each) <= 3000);
    const signs: MonthSign[] = years
      .flatMap((each) => this.signsIn(place, each, rule))
      .map(({ expected, early, late }) => ({ expected, early, late, atDawn }));
    const [first, last] = [signs[0], signs.at(-1)];
    if (!first || !last) return [];
    const lunations = await this.lunations(
      place,
      first.expected.dayNumber - MONTH_DAYS,
      last.expected.dayNumber + MONTH_DAYS,
    );
    // Where the crescent is not seen the month is counted from its new Moon: people do not stop counting.
    const begins = lunations
      .map((lunation) => moonDayOf(lunation, rule.begins) ?? moonDayOf(lunation, 'new'))
      .filter((moon) => moon !== null);
    return localMonths(begins, signs, rule.signMonth);
  }

  private async lunations(place: VillagePlace, fromDay: number, toDay: number): Promise<Lunation[]> {
    const [site, settings] = [siteOf(place), settingsOf(place)];
    const found = new Map<number, Lunation>();
    for (let day = fromDay; day <= toDay; day += DAYS_AT_A_TIME) {
      const until = Math.min(toDay, day + DAYS_AT_A_TIME - 1);
      for (const lunation of moonsBetween(site, settings, day, until)) {
        found.set(Math.round(lunation.newMoon.jdUt), lunation);
      }
      await setImmediate();
    }
    return [...found.values()];
  }
}

function ruleOf(place: VillagePlace, { marker, phenomenon, month, begins }: MoonQuestion): Rule | null {
  if (marker === undefined) return null;
  if (resolveMarker(marker, place.figures) === null) throw invalidField('marker', 'unknown-marker');
  return {
    markerKey: marker,
    phenomenon: phenomenon ?? 'heliacal-rising',
    signMonth: month ?? 1,
    begins: begins ?? 'first-crescent',
  };
}

/** The month that begins with one of the lunation's days. */
function monthOf(
  { newMoon, firstCrescent, fullMoon }: Lunation,
  months: readonly LocalMonth[],
): LocalMonth | null {
  const days = [newMoon.dayNumber, firstCrescent.expected?.dayNumber, fullMoon.dayNumber];
  return months.find(({ begins }) => days.includes(begins.expected.dayNumber)) ?? null;
}
