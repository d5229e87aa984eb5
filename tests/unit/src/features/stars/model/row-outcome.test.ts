import { beforeAll, describe, expect, it } from 'vitest';
import type { MarkerRow } from '#shared/contracts/stars.js';
import { brightnessWord, magnitudeText, noDates } from '#src/features/stars/model/row-outcome.js';
import { starTable, TAZIMEL } from '#tests/support/stars-of-tazimel.js';

let north: MarkerRow[];
beforeAll(async () => {
  north = (await starTable(2027)).items;
}, 30_000);

describe('a star without dates', () => {
  it('says why, and only then', () => {
    for (const row of north) {
      const dated = Object.values(row.phenomena).some((one) => one.outcome === 'dated');
      expect(noDates(row, TAZIMEL.latitudeDeg) === null, row.markerKey).toBe(dated);
    }
  });

  it('turns round the pole on the side of the place', () => {
    const polaris = north.find((row) => row.hr === 424);
    expect(polaris && noDates(polaris, 12)).toBe('never-sets-north');
    expect(polaris && noDates(polaris, -12)).toBe('never-sets-south');
  });

  it('never rises, or does not clear the hills: two different sentences', () => {
    const why = new Set(north.map((row) => noDates(row, TAZIMEL.latitudeDeg)));
    expect(why).toContain('never-rises');
    expect(why).toContain('below-skyline');
  });
});

describe('brightness', () => {
  it('has a word by the classes of the thresholds', () => {
    expect([-1.46, 0.45, 1.64, 2.5, 2.6].map(brightnessWord)).toEqual([
      'very-bright',
      'very-bright',
      'bright',
      'middling',
      'faint',
    ]);
  });

  it('reads with one decimal and a real minus', () => {
    expect([-1.46, -0.04, 0.87].map((vMag) => magnitudeText(vMag, 'en'))).toEqual(['−1.5', '0.0', '0.9']);
  });
});
