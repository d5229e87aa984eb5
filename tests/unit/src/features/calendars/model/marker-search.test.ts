import { describe, expect, it } from 'vitest';
import { FIGURES } from '#shared/sky/index.js';
import { findMarkers } from '#src/features/calendars/model/marker-search.js';
import { tazimelMarkers } from '#tests/support/draft-of-tazimel.js';

const rows = [...(await tazimelMarkers()).values()];
const found = (typed: string, inUse: string[] = [], chosen = '') =>
  findMarkers(rows, typed, new Set(inUse), chosen).map(({ markerKey }) => markerKey);

describe('choosing what an entry goes by', () => {
  it('finds a star by name whatever the capitals, by letter and by number', () => {
    expect(found('SIRI')[0]).toBe('hr2491');
    expect(found('α CMa')).toContain('hr2491');
    expect(found('hr 2491')[0]).toBe('hr2491');
    expect(found('2491')[0]).toBe('hr2491');
    expect(found('no such star')).toEqual([]);
  });

  it('brings the chosen one first, then what is in use, then figures, then the brighter stars', () => {
    const keys = found('', ['hr5056'], 'hr6134');
    expect(keys.slice(0, 2)).toEqual(['hr6134', 'hr5056']);
    const figures = FIGURES.map(({ key }) => key);
    expect(keys.slice(2, 2 + figures.length).sort()).toEqual([...figures].sort());
    expect(keys[2 + figures.length]).toBe('hr2491');
  });
});
