import { describe, expect, it } from 'vitest';

import {
  computeMarkerYear,
  FIGURES,
  markerKeyOf,
  type Phenomenon,
  PHENOMENA,
  type Site,
  STARS,
  whereToLook,
} from '#shared/sky/index.js';
import { calibrationOf, LARGEST_OFFSET_MAG } from '#shared/sky/look/calibration.js';
import { PHENOMENON_FACTS } from '#shared/sky/phenomena/phenomenon-facts.js';
import { settingsWith, siteAt } from '#tests/support/sky/builders.js';
import { markerAt } from '#tests/support/sky/marker.js';

const BRIGHT = [
  ...FIGURES.map(({ key }) => key),
  ...STARS.filter(({ vMag }) => vMag < 1.3).map(({ hr }) => markerKeyOf(hr)),
];
const ridge = (altitudeDeg: number) => [{ azimuthDeg: 0, altitudeDeg }];
/** The hills at 3800 m are where a model set on flat ground called first mornings too light. */
const PLACES: readonly (readonly [string, Site])[] = [
  ['a highland at 12° N behind a low ridge', siteAt(12, 39, { elevationM: 1950, skyline: ridge(3) })],
  ['high hills at 14° S', siteAt(-14, -70, { elevationM: 3800, skyline: ridge(7.5) })],
  ['flat lowland at 30° N', siteAt(30)],
  ['the arctic circle', siteAt(66, 23, { skyline: ridge(2) })],
];

/** Expected days of stars that go and come back, with the look one step into the hidden side (−) or the seen side (+). */
function looksOn(site: Site, phenomenon: Phenomenon, stepDays: number) {
  const { end } = PHENOMENON_FACTS[phenomenon];
  return BRIGHT.flatMap((key) => {
    const year = computeMarkerYear(key, site, settingsWith(), 2027);
    const [occurrence] = year.phenomena[phenomenon].occurrences;
    if (!occurrence || year.notes.includes('never-disappears')) return [];
    const day = occurrence.expected.dayNumber + (end === 'dawn' ? stepDays : -stepDays);
    const look = whereToLook(key, site, settingsWith(), day, end);
    return look.sight.by === 'model' ? [{ key, day, look }] : [];
  });
}
const minutesOf = ({ seenFromJdUt, seenToJdUt }: ReturnType<typeof whereToLook>): number =>
  seenFromJdUt === null || seenToJdUt === null ? 0 : (seenToJdUt - seenFromJdUt) * 1440;

describe.each(PLACES)('the model of visibility set by the expected day, %s', (_, site) => {
  it.each(['heliacal-rising', 'heliacal-setting'] as const)(
    'shows the star for some minutes on that day and not two days before it, %s',
    (phenomenon) => {
      const onDay = looksOn(site, phenomenon, 0);
      expect(onDay.length).toBeGreaterThan(5);
      for (const { key, look } of onDay) {
        expect(look.outcome, key).toBe('seen');
        expect(minutesOf(look), key).toBeGreaterThan(0.5);
        expect(look.sight.phenomenon, key).toBe(phenomenon);
        expect(Math.abs(look.sight.offsetMag ?? NaN)).toBeLessThanOrEqual(LARGEST_OFFSET_MAG);
      }
      for (const { key, look } of looksOn(site, phenomenon, -2)) expect(look.outcome, key).not.toBe('seen');
    },
  );

  it.each(['heliacal-rising', 'heliacal-setting'] as const)(
    'shows it longer from day to day, %s',
    (phenomenon) => {
      const [onDay, later] = [looksOn(site, phenomenon, 0), looksOn(site, phenomenon, 4)];
      for (const { key, look } of onDay) {
        const after = later.find((one) => one.key === key);
        if (after) expect(minutesOf(after.look), key).toBeGreaterThan(minutesOf(look) + 3);
      }
    },
  );

  it('shows a star that comes or goes against the Sun on its expected day', () => {
    for (const phenomenon of ['cosmical-setting', 'acronychal-rising'] as const)
      for (const { key, look } of looksOn(site, phenomenon, 0)) expect(look.outcome, key).toBe('seen');
  });
});

describe('what the model is set by', () => {
  const site = siteAt(12, 39);
  const dayOf = (key: string, phenomenon: Phenomenon): number =>
    computeMarkerYear(key, site, settingsWith(), 2027).phenomena[phenomenon].occurrences[0]?.expected
      .dayNumber ?? NaN;

  it('is the nearest of the two days on that side of the night, also over New Year', () => {
    const marker = markerAt('hr2491', site, 2027);
    for (const phenomenon of PHENOMENA) {
      const { end } = PHENOMENON_FACTS[phenomenon];
      const day = dayOf('hr2491', phenomenon);
      expect(calibrationOf(marker, site, day + 5, end)).toMatchObject({
        by: 'model',
        phenomenon,
        expectedDayNumber: day,
      });
    }
    const rising = dayOf('hr2491', 'acronychal-rising');
    const nextYears = calibrationOf(marker, site, rising + 360, 'dusk');
    expect(nextYears).toMatchObject({ by: 'model', phenomenon: 'acronychal-rising' });
    if (nextYears.by === 'model') expect(nextYears.expectedDayNumber).toBeGreaterThan(rising + 363);
  });

  it('follows the village’s own shift: a village that sees the star sooner has keener eyes', () => {
    const offset = (sameSideShiftDeg: number): number => {
      const marker = markerAt('hr2491', site, 2027, { sameSideShiftDeg });
      const calibration = calibrationOf(marker, site, dayOf('hr2491', 'heliacal-rising'), 'dawn');
      return calibration.by === 'model' ? calibration.offsetMag : NaN;
    };
    // The needed light grows by about a magnitude for a degree of the Sun.
    expect(offset(-1) - offset(0)).toBeGreaterThan(0.4);
    expect(offset(0) - offset(1)).toBeGreaterThan(0.4);
  });

  it('is nothing for a star without such days: the rule of the dates stands in, and says why', () => {
    const north = siteAt(66, 23);
    expect(calibrationOf(markerAt('hr7001', north, 2027), north, 2_461_700, 'dawn')).toEqual({
      by: 'dates',
      because: 'no-day',
    });
    const look = whereToLook('hr7001', north, settingsWith(), 2_461_700, 'dawn');
    expect(look.sight).toEqual({
      by: 'dates',
      because: 'no-day',
      offsetMag: null,
      phenomenon: null,
      expectedDayNumber: null,
      plainFromJdUt: null,
      plainToJdUt: null,
    });
  });

  it('is not stretched over more than eyes and air can differ', () => {
    // Achernar at 30° N climbs no higher than three degrees: the rule has a date, the model a star deep in thick air.
    const low = siteAt(30);
    const day = computeMarkerYear('hr472', low, settingsWith(), 2027).phenomena['heliacal-setting']
      .occurrences[0]?.expected.dayNumber;
    expect(calibrationOf(markerAt('hr472', low, 2027), low, day ?? NaN, 'dusk')).toEqual({
      by: 'dates',
      because: 'too-far',
    });
  });

  it('leaves the model’s own opinion beside it', () => {
    const day = dayOf('hr5056', 'heliacal-rising');
    // For Spica the model asks for more than the rule: by itself it shows the star some mornings later.
    const first = whereToLook('hr5056', site, settingsWith(), day, 'dawn');
    expect(first.sight.offsetMag).toBeGreaterThan(0);
    expect(first.sight.plainFromJdUt).toBeNull();
    const later = whereToLook('hr5056', site, settingsWith(), day + 12, 'dawn');
    expect(later.sight.plainFromJdUt).not.toBeNull();
    expect(later.sight.plainToJdUt).toBeLessThan(later.seenToJdUt ?? 0);
  });
});
