import { createInstance } from 'i18next';
import { describe, expect, it } from 'vitest';
import { hourText, skySign } from '#shared/calendar/sky-sign.js';
import { resources } from '#shared/locales/index.js';
import { compassPoint, type SkyMarkerSpec } from '#shared/sky/index.js';
import * as words from '#shared/sky/vocabulary.js';

const i18n = createInstance({
  resources,
  lng: 'en',
  initAsync: false,
  interpolation: { escapeValue: false },
});
void i18n.init();
const translate = i18n.getFixedT('en', 'sky') as (key: string, values?: object) => string;
const say = (spec: SkyMarkerSpec, star = 'Sirius') => skySign(spec, star, { t: translate, compassPoint });

/** Every spec that has words of its own. */
function* everySpec(): Generator<SkyMarkerSpec> {
  const markerKey = 'hr2491';
  for (const twilight of words.TWILIGHTS) yield { kind: 'culmination', markerKey, twilight, depthDeg: 12 };
  for (const side of words.SKY_SIDES) {
    const altitude = { kind: 'star-altitude', markerKey, altitudeDeg: 30, side } as const;
    yield { ...altitude, at: { clock: 'after-sunset', minutes: 45 } };
    yield { ...altitude, at: { clock: 'before-sunrise', minutes: 45 } };
    yield { ...altitude, at: { clock: 'solar-hour', solarHour: 20.5 } };
  }
  for (const facing of words.FACINGS) yield { kind: 'due-meridian', markerKey, facing, solarHour: 21 };
  for (const position of words.POLE_POSITIONS)
    yield { kind: 'about-pole', markerKey, position, solarHour: 21 };
  for (const season of words.SUN_SEASONS) yield { kind: 'sun-season', season };
  for (const event of words.SUN_EVENTS) {
    yield { kind: 'sun-azimuth', event, azimuthDeg: 112.5, pointName: '' };
    yield { kind: 'sun-azimuth', event, azimuthDeg: 112.5, pointName: 'the notch' };
  }
  for (const passage of words.NOON_SUN_PASSAGES) {
    yield { kind: 'noon-sun', passage, ridgeName: '' };
    yield { kind: 'noon-sun', passage, ridgeName: 'the south ridge' };
  }
  for (const event of words.MOON_EVENTS) {
    yield { kind: 'moon-phase', event };
    for (const phenomenon of words.PHENOMENA)
      yield { kind: 'moon-counted', markerKey, phenomenon, event, count: 3 };
  }
  for (const appearance of words.VENUS_APPEARANCES) yield { kind: 'venus-appearance', appearance };
  yield { kind: 'zenith-sun' };
  for (const end of words.DARK_NIGHT_ENDS) {
    for (const depthDeg of words.NIGHT_DEPTHS_DEG) yield { kind: 'dark-night', end, depthDeg };
  }
}

describe('the name of a sign of the sky', () => {
  it('is a text of its own for every sign, with nothing left open in it', () => {
    const names = [...everySpec()].map((spec) => say(spec));
    expect(new Set(names).size).toBe(names.length);
    expect(names.filter((name) => /^sign\.|\{\{|undefined/u.test(name))).toEqual([]);
  });

  it('names the star, the hour and the village’s own words', () => {
    const due = { kind: 'due-meridian', markerKey: 'orion-belt', facing: 'south', solarHour: 21 } as const;
    expect(say(due, 'Belt of Orion')).toBe('Belt of Orion due south at 21:00 by the Sun');
    expect(say({ kind: 'noon-sun', passage: 'back', ridgeName: 'the south ridge' })).toBe(
      'Noon Sun back over the south ridge',
    );
    expect(say({ kind: 'sun-azimuth', event: 'sunset', azimuthDeg: 247.5, pointName: '' })).toBe(
      'Sunset in the west-south-west, at 247.5°',
    );
  });

  it('says from which day of which star a Moon is counted', () => {
    const spec = {
      kind: 'moon-counted',
      markerKey: 'pleiades',
      phenomenon: 'heliacal-rising',
      event: 'full',
      count: 2,
    } as const;
    expect(say(spec, 'Pleiades')).toBe('Full Moon number 2 from Pleiades, first morning seen');
  });

  it('says hours as a clock does', () => {
    expect([4.25, 21, 0].map(hourText)).toEqual(['4:15', '21:00', '0:00']);
  });

  it('has a sentence for every reason why there is no day', () => {
    for (const reason of words.SKY_MARKER_REASONS) expect(translate(`noSign.${reason}`)).toMatch(/\.$/u);
  });
});
