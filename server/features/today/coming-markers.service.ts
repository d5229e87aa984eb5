import { isStarLead } from '#shared/calendar/entry-model.js';
import type { ComingMarker } from '#shared/contracts/today.js';
import type { VersionEntryBody, VersionHeader } from '#shared/contracts/versions.js';
import { civilDateFromIso, dayNumberFromIso, dayNumberOf } from '#shared/kernel/iso-date.js';
import type { MarkerYear, Occurrence, Phenomenon } from '#shared/sky/index.js';
import { figuresOf, type WatchedPlace } from '../places/watched-place.service.js';
import { markerNamesOf, WELL_KNOWN_KEYS } from '../stars/marker-names.service.js';
import type { SkyYearsService } from '../stars/sky-years.service.js';
import type { StarsService } from '../stars/stars.service.js';

/** A published calendar: what the village goes by. */
export interface PublishedCalendar {
  header: VersionHeader;
  entries: readonly VersionEntryBody[];
}

const DAYS_AHEAD = 14;
/** Ranges of good markers are at most three weeks, so one that is open now is expected within this many days. */
const YEAR_EDGE_DAYS = 60;
/** How many stand there when nothing is near. */
const LATER_COUNT = 3;

/** A star that goes and comes back is news; its other two days matter to whoever goes by them. */
const NEWS = ['heliacal-rising', 'heliacal-setting'] as const;

interface Candidate {
  place: WatchedPlace;
  markerYear: MarkerYear;
  phenomenon: Phenomenon;
  occurrence: Occurrence;
  leads: string[];
}

/** Which stars come and go around a day at a place. */
export class ComingMarkersService {
  constructor(
    private readonly skyYears: SkyYearsService,
    private readonly stars: StarsService,
  ) {}

  /** What can be seen coming or going now or soon; where there is nothing, the next ones (`isLater`). */
  around(
    place: WatchedPlace,
    date: string,
    published: readonly PublishedCalendar[],
  ): { items: ComingMarker[]; isLater: boolean } {
    const today = dayNumberFromIso(date);
    const { year } = civilDateFromIso(date);
    const near = this.candidates(place, yearsAround(date), published).filter((one) => isNear(one, today));
    if (near.length > 0) return { items: this.describe(near, today), isLater: false };
    const later = this.candidates(place, [year, year + 1], published)
      .filter((one) => one.occurrence.expected.dayNumber > today)
      .sort((a, b) => a.occurrence.expected.dayNumber - b.occurrence.expected.dayNumber);
    return { items: this.describe(later.slice(0, LATER_COUNT), today), isLater: true };
  }

  private candidates(
    place: WatchedPlace,
    years: readonly number[],
    published: readonly PublishedCalendar[],
  ): Candidate[] {
    // Besides what the village's own calendar goes by, which is added below.
    const keys = [...figuresOf(place).map((figure) => figure.key), ...WELL_KNOWN_KEYS];
    const found = new Map<string, Candidate>();
    for (const year of years) {
      for (const markerYear of this.skyYears.markerYears(place, year, keys)) {
        for (const phenomenon of NEWS) {
          markerYear.phenomena[phenomenon].occurrences.forEach((occurrence, index) => {
            if (!servesWell(markerYear, occurrence)) return;
            const candidate = { place, markerYear, phenomenon, occurrence, leads: [] };
            found.set(keyOf(markerYear, phenomenon, index), candidate);
          });
        }
      }
    }
    for (const calendar of published) this.addLeads(found, calendar);
    return [...found.values()];
  }

  /** At the place as it was when the calendar was frozen, so that Today and the wall say the same. */
  private addLeads(found: Map<string, Candidate>, { header, entries }: PublishedCalendar): void {
    for (const { content } of entries) {
      const { lead } = content;
      if (!isStarLead(lead)) continue;
      const [markerYear] = this.skyYears.markerYears(header.place, header.year, [lead.markerKey]);
      const index = lead.occurrence - 1;
      const occurrence = markerYear?.phenomena[lead.phenomenon].occurrences[index];
      if (!markerYear || !occurrence) continue;
      const key = keyOf(markerYear, lead.phenomenon, index);
      const leads = [...(found.get(key)?.leads ?? []), content.titleOfficer];
      found.set(key, {
        place: header.place,
        markerYear,
        phenomenon: lead.phenomenon,
        occurrence,
        leads,
      });
    }
  }

  /** In the order in which people look for them; among those that may come any day, the village's own first. */
  private describe(candidates: readonly Candidate[], today: number): ComingMarker[] {
    const expected = (one: Candidate) => one.occurrence.expected.dayNumber;
    const lookFrom = (one: Candidate) => Math.max(expected(one), today);
    return [...candidates]
      .sort(
        (a, b) =>
          lookFrom(a) - lookFrom(b) ||
          Number(b.leads.length > 0) - Number(a.leads.length > 0) ||
          expected(b) - expected(a) ||
          vMagOf(a) - vMagOf(b),
      )
      .map(({ place, markerYear, phenomenon, occurrence, leads }) => ({
        marker: markerNamesOf(markerYear.markerKey, figuresOf(place)),
        phenomenon,
        occurrence: this.stars.occurrenceDetail(place, markerYear, phenomenon, occurrence),
        daysAway: occurrence.expected.dayNumber - today,
        leads,
      }));
  }
}

/** Civil years that may hold the expected day of a range that is open now or of a day soon. */
function yearsAround(date: string): number[] {
  const today = dayNumberFromIso(date);
  const { year } = civilDateFromIso(date);
  return [
    ...(today - dayNumberOf(year, 1, 1) < YEAR_EDGE_DAYS ? [year - 1] : []),
    year,
    ...(dayNumberOf(year, 12, 31) - today < YEAR_EDGE_DAYS ? [year + 1] : []),
  ];
}

/** A marker that is never hidden announces no return, and one whose range is over three weeks announces no day. */
function servesWell(markerYear: MarkerYear, occurrence: Occurrence): boolean {
  const notes = [...markerYear.notes, ...occurrence.notes];
  return !notes.includes('never-disappears') && !notes.includes('weak-marker');
}

function isNear({ occurrence: { early, expected, late } }: Candidate, today: number): boolean {
  const open = (early ?? expected).dayNumber <= today && today <= (late ?? expected).dayNumber;
  return open || (expected.dayNumber >= today && expected.dayNumber <= today + DAYS_AHEAD);
}

function keyOf({ markerKey, year }: MarkerYear, phenomenon: Phenomenon, index: number): string {
  return `${markerKey} ${phenomenon} ${year} ${index}`;
}

function vMagOf({ place, markerYear }: Candidate): number {
  return markerNamesOf(markerYear.markerKey, figuresOf(place)).vMag;
}
