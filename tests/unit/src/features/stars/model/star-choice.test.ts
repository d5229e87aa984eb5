import { beforeAll, describe, expect, it } from 'vitest';
import type { MarkerRow } from '#shared/contracts/stars.js';
import {
  chooseRows,
  DOES,
  doesFit,
  hasLightNights,
  isGoodMarker,
  isInShortList,
  ownFirst,
} from '#src/features/stars/model/star-choice.js';
import { noDates } from '#src/features/stars/model/row-outcome.js';
import { starTable, TAZIMEL } from '#tests/support/stars-of-tazimel.js';

let rows: MarkerRow[];
const row = (markerKey: string) => {
  const found = rows.find((each) => each.markerKey === markerKey);
  if (!found) throw new Error(markerKey);
  return found;
};

beforeAll(async () => {
  rows = (await starTable(2027)).items;
}, 30_000);

describe('a good marker at 12° north', () => {
  it('is a bright star or a figure that hides and comes back sharply', () => {
    expect(isGoodMarker(row('pleiades'))).toBe(true);
    expect(isGoodMarker(row('hr2491'))).toBe(true);
  });

  it('is neither a star that never sets nor one that is never hidden, nor a faint one', () => {
    const polaris = row('hr424');
    expect(noDates(polaris, TAZIMEL.latitudeDeg)).toBe('never-sets-north');
    expect(isGoodMarker(polaris)).toBe(false);
    for (const each of rows) {
      if (each.notes.includes('never-disappears')) expect(isGoodMarker(each)).toBe(false);
      if (each.kind === 'star' && each.vMag > 2.5) expect(isGoodMarker(each)).toBe(false);
    }
  });
});

describe('light nights', () => {
  it('are known at 66° north and not at 12° north', async () => {
    const far = await starTable(2027, { ...TAZIMEL, latitudeDeg: 66, longitudeDeg: 23, skyline: [] });
    expect(hasLightNights(far.items)).toBe(true);
    expect(hasLightNights(rows)).toBe(false);
  });
});

describe('a figure of the village', () => {
  it('is in the short list even where it is no good marker, and stands on top of any order', () => {
    const own: MarkerRow = { ...row('hr424'), markerKey: 'f-own', kind: 'own-figure' };
    expect([isGoodMarker(own), isInShortList(own)]).toEqual([false, true]);
    const order = ownFirst([row('pleiades'), own, row('hr2491')], (each) => each);
    expect(order.map(({ markerKey }) => markerKey)).toEqual(['f-own', 'pleiades', 'hr2491']);
  });
});

describe('choosing among the stars', () => {
  const choose = (choice: Partial<Parameters<typeof chooseRows>[1]>) =>
    chooseRows(rows, { search: '', show: 'all', does: 'any', ...choice }, (each) => ({
      hr: each.hr,
      words: [each.name.toLowerCase()],
    }));

  it('shows the good ones or all', () => {
    expect(choose({})).toHaveLength(rows.length);
    const good = choose({ show: 'good' });
    expect(good.length).toBeGreaterThan(20);
    expect(good.every(isGoodMarker)).toBe(true);
  });

  it('searches all stars, also while good markers are shown', () => {
    expect(choose({ show: 'good', search: 'polaris' }).map((each) => each.hr)).toEqual([424]);
  });

  it('by what they do leaves nobody out: each star fits at least one choice', () => {
    const choices = DOES.filter((does) => does !== 'any');
    const lost = rows.filter((each) => !choices.some((does) => doesFit(each, does)));
    expect(lost.map((each) => each.markerKey)).toEqual([]);
  });

  it('by never setting shows only those', () => {
    const never = choose({ does: 'never-sets' });
    expect(never.length).toBeGreaterThan(0);
    expect(never.every((each) => each.outcome === 'never-sets')).toBe(true);
  });
});
