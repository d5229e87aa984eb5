import { describe, expect, it } from 'vitest';

import { isSighted, sightingAt, watched } from '#shared/sky/air/sighting.js';
import { PHENOMENON_FACTS } from '#shared/sky/phenomena/phenomenon-facts.js';
import { plainAir } from '#shared/sky/visibility/air.js';
import type { Phenomenon } from '#shared/sky/vocabulary.js';
import { siteAt } from '#tests/support/sky/builders.js';
import { markerAt } from '#tests/support/sky/marker.js';

const air = plainAir(0.25);

/** Sirius at 30° N in 2027: first morning in early August, last evening at the end of May. */
function watchOf(phenomenon: Phenomenon, skylineDeg = 0) {
  const site = siteAt(30, 0, {
    skyline: skylineDeg === 0 ? [] : [{ azimuthDeg: 0, altitudeDeg: skylineDeg }],
  });
  const marker = markerAt('hr2491', site, 2027);
  const facts = PHENOMENON_FACTS[phenomenon];
  const crossing = marker.star.crossings?.[facts.crossing];
  if (!crossing) throw new Error('Sirius rises and sets at 30° N');
  const watch = watched(marker, facts, crossing);
  /** The return of the crossing on the n-th day of the year. */
  const turnOn = (day: number): number =>
    Math.round(
      (marker.year.civil.firstDay + day - 1 - crossing.anInstantJdUt) / marker.year.sidereal.periodDays,
    );
  return { watch, crossing, marker, turnOn };
}

describe('what the model lets a person see', () => {
  it('is nothing of a rising before the first morning, then more minutes from day to day', () => {
    const { watch, turnOn } = watchOf('heliacal-rising');
    expect(isSighted(watch, turnOn(205), air)).toBe(false);
    expect(sightingAt(watch, turnOn(205), air)).toBeNull();
    let before = 0;
    for (const day of [222, 225, 230, 240]) {
      const { minutes } = sightingAt(watch, turnOn(day), air) ?? { minutes: 0 };
      expect(minutes).toBeGreaterThan(before);
      expect(isSighted(watch, turnOn(day), air)).toBe(true);
      before = minutes;
    }
  });

  it('begins after the rising and ends before the setting', () => {
    const rising = watchOf('heliacal-rising');
    const setting = watchOf('heliacal-setting');
    const up = sightingAt(rising.watch, rising.turnOn(225), air);
    const down = sightingAt(setting.watch, setting.turnOn(140), air);
    const at = ({ crossing, marker }: typeof rising, turn: number): number =>
      crossing.anInstantJdUt + turn * marker.year.sidereal.periodDays;
    expect(up?.fromJdUt).toBeGreaterThan(at(rising, rising.turnOn(225)));
    expect(down?.toJdUt).toBeLessThan(at(setting, setting.turnOn(140)));
    expect(down?.fromJdUt).toBeLessThan(down?.toJdUt ?? NaN);
  });

  it('is less in haze and under a Moon', () => {
    const { watch, turnOn } = watchOf('heliacal-rising');
    const minutes = (magPerAirmass: number, moonNl = 0): number =>
      sightingAt(watch, turnOn(222), plainAir(magPerAirmass), () => moonNl)?.minutes ?? 0;
    expect(minutes(0.35)).toBeLessThan(minutes(0.2));
    expect(minutes(0.25, 1e9)).toBe(0);
  });

  it('counts a rising against the Sun only near the skyline, or just over a hill that is higher', () => {
    expect(watchOf('acronychal-rising').watch.upToDeg).toBeCloseTo(1.75, 0);
    expect(watchOf('acronychal-rising', 8).watch.upToDeg).toBeCloseTo(8, 9);
    expect(watchOf('heliacal-rising').watch.upToDeg).toBe(90);
    const { watch, turnOn } = watchOf('acronychal-rising', 8);
    // On the hill it is the very minute of the crossing that counts.
    expect(sightingAt(watch, turnOn(1), air)?.minutes).toBe(1);
    expect(isSighted(watch, turnOn(60), air)).toBe(false);
  });
});
