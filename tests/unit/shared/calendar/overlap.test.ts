import { describe, expect, it } from 'vitest';
import { overlappingEntryIds, type OverlapCandidate } from '#shared/calendar/overlap.js';

function work(
  id: string,
  bestFrom: string,
  bestTo: string,
  crop = 'millet',
  kind = 'farm',
): OverlapCandidate {
  return {
    id,
    timing: { kind, crop },
    window: { earliest: bestFrom, bestFrom, bestTo, lastAdvised: bestTo, lastAdvisedBy: 'offset' },
  };
}

function warned(...entries: OverlapCandidate[]): string[] {
  return [...overlappingEntryIds(entries)].sort();
}

describe('windows that collide', () => {
  it('are two pieces of farm work on one crop whose best days lie within each other', () => {
    expect(warned(work('a', '2027-07-01', '2027-07-20'), work('b', '2027-07-05', '2027-07-10'))).toEqual([
      'a',
      'b',
    ]);
    expect(warned(work('a', '2027-07-05', '2027-07-10'), work('b', '2027-07-01', '2027-07-20'))).toEqual([
      'a',
      'b',
    ]);
    expect(warned(work('a', '2027-07-01', '2027-07-20'), work('copy', '2027-07-01', '2027-07-20'))).toEqual([
      'a',
      'copy',
    ]);
  });

  it('are found whatever the case, the spaces and the spelling of the letters', () => {
    expect(
      warned(
        work('a', '2027-07-01', '2027-07-20', 'Ɓɛ́la'),
        work('b', '2027-07-01', '2027-07-20', ' ɓɛ\u0301la '),
      ),
    ).toEqual(['a', 'b']);
  });

  it('are not windows that overlap in part, as most of a year’s windows do', () => {
    expect(warned(work('a', '2027-07-01', '2027-07-20'), work('b', '2027-07-10', '2027-07-30'))).toEqual([]);
  });

  it('are not work on different crops, work without a crop, or anything but farm work', () => {
    const same = ['2027-07-01', '2027-07-20'] as const;
    expect(warned(work('a', ...same, 'millet'), work('b', ...same, 'oats'))).toEqual([]);
    expect(warned(work('a', ...same, ''), work('b', ...same, ''))).toEqual([]);
    expect(warned(work('a', ...same), work('b', ...same, 'millet', 'safety'))).toEqual([]);
  });

  it('are never entries without a window', () => {
    expect(warned(work('a', '2027-07-01', '2027-07-20'), { ...work('b', '', ''), window: null })).toEqual([]);
  });
});
