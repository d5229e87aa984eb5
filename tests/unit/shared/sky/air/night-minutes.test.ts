import { describe, expect, it } from 'vitest';

import { nightsAround } from '#shared/sky/air/night-minutes.js';
import { placeAirOf } from '#shared/sky/air/place-air.js';
import { watched } from '#shared/sky/air/sighting.js';
import { dayNumberOf, type Phenomenon } from '#shared/sky/index.js';
import { PHENOMENON_FACTS } from '#shared/sky/phenomena/phenomenon-facts.js';
import { siteAt } from '#tests/support/sky/builders.js';
import { markerAt } from '#tests/support/sky/marker.js';

const site = siteAt(30);

function nights(phenomenon: Phenomenon, ...days: number[]) {
  const marker = markerAt('hr2491', site, 2027);
  const facts = PHENOMENON_FACTS[phenomenon];
  const crossing = marker.star.crossings?.[facts.crossing];
  if (!crossing) throw new Error('Sirius rises and sets at 30° N');
  return nightsAround(watched(marker, facts, crossing), site, placeAirOf(site), days);
}
const july = (day: number): number => dayNumberOf({ year: 2027, month: 7, day: 1 }, 'gregorian') + day - 1;

describe('the nights around a date', () => {
  it('run from three days on the hidden side to six on the seen side, each day once', () => {
    const around = nights('heliacal-rising', july(30), july(33)).map(({ dayNumber }) => dayNumber);
    expect(around).toEqual(Array.from({ length: 13 }, (_, index) => july(27 + index)));
    const evening = nights('heliacal-setting', july(1)).map(({ dayNumber }) => dayNumber);
    expect([evening[0], evening.at(-1)]).toEqual([july(-5), july(4)]);
  });

  it('count at least as many minutes in clear air as in haze, and never more with the Moon than without', () => {
    const around = nights('heliacal-rising', july(36));
    expect(around.some(({ byClarity }) => byClarity.ordinary > 0)).toBe(true);
    expect(around.some(({ byClarity }) => byClarity.ordinary === 0)).toBe(true);
    for (const { byClarity, underMoon } of around) {
      expect(byClarity.clear).toBeGreaterThanOrEqual(byClarity.ordinary);
      expect(byClarity.ordinary).toBeGreaterThanOrEqual(byClarity.hazy);
      expect(underMoon).toBeLessThanOrEqual(byClarity.ordinary);
    }
  });

  it('are at most sixty, kept at the hidden end', () => {
    const around = nights('heliacal-rising', july(1), july(120));
    expect(around).toHaveLength(60);
    expect(around[0]?.dayNumber).toBe(july(-2));
    const evening = nights('heliacal-setting', july(1), july(120));
    expect(evening).toHaveLength(60);
    expect(evening.at(-1)?.dayNumber).toBe(july(123));
  });
});
