import { describe, expect, it } from 'vitest';

import { seenHighUp, nightsWithoutDarkMoment, sameSideNeeded } from '#shared/sky/markers/night-crossings.js';
import { siteAt } from '#tests/support/sky/builders.js';
import { markerAt } from '#tests/support/sky/marker.js';

const { firstDay, lastDay } = markerAt('hr2491', siteAt(30), 2027).year.civil;

describe('night by night', () => {
  it('a star stands high in the dark for about half the year', () => {
    const dark = seenHighUp(markerAt('hr2491', siteAt(30), 2027), firstDay, lastDay);
    const nights = dark.reduce((sum, one) => sum + one, 0);
    expect(nights).toBeGreaterThan(140);
    expect(nights).toBeLessThan(185);
    // Sirius stands in the south at midnight at the turn of the year and at noon in summer.
    expect([dark[0], dark[182]]).toEqual([1, 0]);
  });

  it('a star that culminates in bright dusk and sets in bright dawn is seen in between', () => {
    // Arcturus at 45° N about midsummer.
    const seen = seenHighUp(markerAt('hr5340', siteAt(45), 2027), firstDay + 165, firstDay + 185);
    expect([...seen]).toEqual(new Array(21).fill(1));
  });

  it('the nights without a dark moment are the disappearance, where the star has one', () => {
    const marker = markerAt('hr2491', siteAt(30), 2027);
    const nights = nightsWithoutDarkMoment(marker, firstDay, lastDay);
    expect((nights.at(-1) ?? 0) - (nights[0] ?? 0) + 1).toBe(nights.length);
    expect(nights.length).toBeGreaterThan(60);
    expect(nights.length).toBeLessThan(75);
  });

  it('haze in a month asks for more in its nights', () => {
    const clarityByMonth = new Array<'ordinary' | 'hazy'>(12).fill('ordinary');
    clarityByMonth[1] = 'hazy';
    const marker = markerAt('hr2491', siteAt(30), 2027, { clarityByMonth });
    const crossings = marker.star.crossings;
    if (!crossings) throw new Error('Sirius rises and sets at 30° N');
    const needed = sameSideNeeded(marker, crossings.rising);
    const degOf = (night: number): number => (Math.asin(needed(night, 0)) * 180) / Math.PI;
    expect(degOf(firstDay + 10)).toBeCloseTo(11, 9);
    expect(degOf(firstDay + 40)).toBeCloseTo(12, 9);
  });
});
