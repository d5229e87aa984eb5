import { describe, expect, it } from 'vitest';
import type { DatedSide, DayGrounds, MovedPlace } from '#shared/calendar/day-grounds.js';
import { entryDatesFromDays, entryDatesOf } from '#shared/calendar/entry-dates.js';
import { isStarLead, type EntryLead, type EntryWindow } from '#shared/calendar/entry-model.js';
import { whyMoved } from '#shared/calendar/why-moved.js';
import { dayNumberFromIso } from '#shared/kernel/iso-date.js';
import { computeSkyMarker, computeSkyYear, type Site, type VisibilitySettings } from '#shared/sky/index.js';
import { timing } from '#tests/support/calendar-facts.js';
import { settingsWith, siteAt } from '#tests/support/sky/builders.js';

type Place = MovedPlace & Site & VisibilitySettings;

const VALLEY: Place = {
  ...siteAt(31.2, -7.9),
  ...settingsWith(),
  elevationM: 1200,
  timeZone: 'Africa/Casablanca',
};
const HILLS = [
  { azimuthDeg: 0, altitudeDeg: 14 },
  { azimuthDeg: 180, altitudeDeg: 14 },
];

/** The product's own way from grounds to a window, with the real sky. */
function reckon({ place, year, timing: entry, anchor }: DayGrounds<Place>): EntryWindow | null {
  const { lead } = entry;
  const site = { ...place, skyline: place.skyline };
  if (lead.type === 'sky')
    return entryDatesOf(entry, year, computeSkyMarker(lead.spec, site, place, year, [])).window;
  if (lead.type === 'entry-planned' || lead.type === 'entry-actual') {
    return entryDatesFromDays(entry, year, null, { basis: 'planned', spell: anchor, planned: null }).window;
  }
  const [markerYear] = isStarLead(lead) ? computeSkyYear([lead.markerKey], site, place, year) : [];
  return entryDatesOf(entry, year, markerYear ?? null).window;
}

function side(changes: Partial<DatedSide<Place>> = {}): DatedSide<Place> {
  const grounds = {
    year: 2027,
    place: VALLEY,
    timing: timing(),
    anchor: null,
    engineVersion: '1.2.0',
    ...changes,
  };
  return { ...grounds, window: changes.window === undefined ? reckon(grounds) : changes.window };
}

function later(window: EntryWindow | null, days: number): EntryWindow | null {
  const move = (iso: string) => new Date(Date.parse(iso) + days * 86_400_000).toISOString().slice(0, 10);
  return (
    window && {
      ...window,
      ...{ earliest: move(window.earliest), bestFrom: move(window.bestFrom) },
      ...{ bestTo: move(window.bestTo), lastAdvised: move(window.lastAdvised) },
    }
  );
}

const withOffsets = (by: number) =>
  timing({
    offsets: { earliestDays: 3 + by, bestFromDays: 7 + by, bestToDays: 23 + by, lastAdvisedDays: 28 + by },
  });

describe('why a day moved', () => {
  it('says nothing where nothing moved, whatever else changed', () => {
    expect(whyMoved(side(), side({ timing: timing({ crop: 'sorghum' }) }), reckon)).toBeNull();
    expect(whyMoved(side({ window: null }), side({ window: null }), reckon)).toBeNull();
  });

  it('names the hand where only the days from the lead were changed', () => {
    expect(whyMoved(side(), side({ timing: withOffsets(2) }), reckon)).toEqual({
      moved: { point: 'earliest', days: 2 },
      causes: [{ cause: 'offsets', days: 2 }],
      togetherDays: 0,
    });
  });

  it('names the skyline where hills were drawn', () => {
    const why = whyMoved(side(), side({ place: { ...VALLEY, skyline: HILLS } }), reckon);
    expect(why?.causes).toEqual([{ cause: 'skyline', days: why?.moved?.days }]);
    expect(why?.moved?.days).toBeGreaterThan(0);
  });

  it('names the eye-and-air rule where the air became hazier, for shifts and clarity alike', () => {
    const hazy = { ...VALLEY, clarityByMonth: new Array<'hazy'>(12).fill('hazy') };
    expect(whyMoved(side(), side({ place: hazy }), reckon)?.causes).toMatchObject([{ cause: 'threshold' }]);
    const shifted = { ...VALLEY, sameSideShiftDeg: 2 };
    expect(whyMoved(side(), side({ place: shifted }), reckon)?.causes).toMatchObject([
      { cause: 'threshold' },
    ]);
  });

  it('names the place where it was set elsewhere', () => {
    const why = whyMoved(side(), side({ place: { ...VALLEY, latitudeDeg: 36.2 } }), reckon);
    expect(why?.causes).toMatchObject([{ cause: 'place' }]);
  });

  it('tells the year and the skyline apart where both act: each alone, and what remains', () => {
    const after = side({ year: 2028, place: { ...VALLEY, skyline: HILLS } });
    const why = whyMoved(side(), after, reckon);
    const daysOf = (cause: string) => why?.causes.find((each) => each.cause === cause)?.days ?? 0;
    const hillsAlone = whyMoved(side(), side({ place: { ...VALLEY, skyline: HILLS } }), reckon);
    const yearAlone = whyMoved(side(), side({ year: 2028 }), reckon);
    expect(daysOf('skyline')).toBe(hillsAlone?.moved?.days);
    expect(daysOf('year')).toBe(yearAlone?.moved?.days ?? 0);
    expect(daysOf('skyline') + daysOf('year') + (why?.togetherDays ?? 0)).toBe(why?.moved?.days);
  });

  it('names the year where a Moon leads, by the day of the civil year', () => {
    const lead: EntryLead = { type: 'sky', spec: { kind: 'moon-phase', event: 'new' }, occurrence: 6 };
    const before = side({ timing: timing({ lead }) });
    const why = whyMoved(before, side({ year: 2028, timing: timing({ lead }) }), reckon);
    expect(why?.causes).toEqual([{ cause: 'year', days: why?.moved?.days }]);
    expect(Math.abs(why?.moved?.days ?? 0)).toBeGreaterThan(3);
  });

  it('leaves to the engine what an older one said otherwise, on either side', () => {
    const old = side({ engineVersion: '1.0.0', window: later(side().window, -3) });
    expect(whyMoved(old, side({ timing: withOffsets(2) }), reckon)).toEqual({
      moved: { point: 'earliest', days: 5 },
      causes: [
        { cause: 'engine', days: 3 },
        { cause: 'offsets', days: 2 },
      ],
      togetherDays: 0,
    });
    const newer = side({ engineVersion: '1.0.0', window: later(side().window, -3) });
    expect(whyMoved(side({ timing: withOffsets(2) }), newer, reckon)?.causes).toEqual([
      { cause: 'engine', days: -3 },
      { cause: 'offsets', days: -2 },
    ]);
  });

  it('says what several do only together: later days and the last date that cuts them', () => {
    // Alone, ten more days move the end by ten, and the office’s last date lies behind the old end and cuts nothing.
    const end = side().window?.lastAdvised ?? '';
    const cut = later(side().window, 4)?.lastAdvised ?? '';
    const date = { month: Number(cut.slice(5, 7)), day: Number(cut.slice(8, 10)) };
    const office = { hasLastDate: true, lastDate: { date, source: 'office' } };
    const end10 = timing({
      offsets: { earliestDays: 3, bestFromDays: 7, bestToDays: 23, lastAdvisedDays: 38 },
      ...office,
    });
    const after = side({ timing: end10 });
    expect([end < cut, after.window?.lastAdvised]).toEqual([true, cut]);
    expect(whyMoved(side(), after, reckon)).toEqual({
      moved: { point: 'lastAdvised', days: 4 },
      causes: [{ cause: 'offsets', days: 10 }],
      togetherDays: -6,
    });
  });

  it('tells seeing and what other work gave from a new lead', () => {
    const star = { markerKey: 'pleiades', phenomenon: 'heliacal-rising', occurrence: 1 } as const;
    const lead = (seen: string | null): EntryLead => ({
      ...{ type: 'marker-as-seen', ...star },
      seen: seen === null ? null : { date: seen, by: 'Marrun', agreedBy: 'A-1' },
    });
    const at = (date: string) => ({ timing: timing({ lead: lead(date) }), window: later(side().window, 5) });
    const seen = whyMoved(side({ timing: timing({ lead: lead(null) }) }), side(at('2027-06-20')), reckon);
    expect(seen?.causes).toEqual([{ cause: 'seen', days: 5 }]);
    const hung = timing({ lead: { type: 'entry-planned', entryId: 'sow', day: 'bestTo' } });
    const from = (iso: string) =>
      side({ timing: hung, anchor: { first: dayNumberFromIso(iso), last: dayNumberFromIso(iso) } });
    expect(whyMoved(from('2027-06-16'), from('2027-06-20'), reckon)?.causes).toEqual([
      { cause: 'anchor', days: 4 },
    ]);
  });

  it('names what took the days away or gave them, without a number', () => {
    const closed = { hasLastDate: true, lastDate: { date: { month: 6, day: 1 }, source: 'office' } };
    const after = side({ timing: timing(closed) });
    expect(after.window).toBeNull();
    expect(whyMoved(side(), after, reckon)).toEqual({
      ...{ moved: null, togetherDays: 0 },
      causes: [{ cause: 'last-date', days: null }],
    });
    const both = side({ year: 2028, timing: timing(closed) });
    expect(whyMoved(side(), both, reckon)?.causes).toEqual([{ cause: 'last-date', days: null }]);
    expect(whyMoved(both, side(), reckon)?.causes).toEqual([{ cause: 'last-date', days: null }]);
  });
});
