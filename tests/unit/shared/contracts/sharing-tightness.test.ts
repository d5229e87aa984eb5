import { describe, expect, it } from 'vitest';
import { isTighterOrSame, tightest, type Sharing } from '#shared/contracts/sharing-tightness.js';
import {
  PLAIN_DETAILS,
  SHARING_LEVELS,
  type SharingDetails,
  type SharingLevel,
} from '#shared/contracts/sharing.js';

const season = (fromMonth: number, toMonth: number) => ({
  from: { month: fromMonth, day: 1 },
  to: { month: toMonth, day: 28 },
});
const at = (level: SharingLevel, changes: Partial<SharingDetails> = {}): Sharing => ({
  level,
  details: { ...PLAIN_DETAILS, ...changes },
});

describe('what may hold at once', () => {
  it('is every narrower level, and never a wider one', () => {
    SHARING_LEVELS.forEach((before, from) => {
      SHARING_LEVELS.forEach((after, to) => {
        expect(isTighterOrSame(at(before), at(after))).toBe(to >= from);
      });
    });
  });

  it.each([
    ['a season where there was none', at('village'), at('village', { tellingSeason: season(6, 8) }), true],
    ['no season where there was one', at('village', { tellingSeason: season(6, 8) }), at('village'), false],
    [
      'a shorter season',
      at('elders', { tellingSeason: season(6, 8) }),
      at('elders', { tellingSeason: season(7, 8) }),
      true,
    ],
    [
      'a longer season',
      at('elders', { tellingSeason: season(7, 8) }),
      at('elders', { tellingSeason: season(6, 8) }),
      false,
    ],
    [
      'a part of a season over New Year',
      at('elders', { tellingSeason: season(11, 2) }),
      at('elders', { tellingSeason: season(12, 1) }),
      true,
    ],
    [
      'the rest of the year',
      at('elders', { tellingSeason: season(11, 2) }),
      at('elders', { tellingSeason: season(3, 10) }),
      false,
    ],
    ['no trace instead of a slot', at('elders'), at('elders', { trace: 'none' }), true],
    ['a slot instead of no trace', at('elders', { trace: 'none' }), at('elders'), false],
    ['a name that goes', at('village'), at('village', { naming: 'not-named' }), true],
    ['a name that comes', at('village', { naming: 'role' }), at('village'), false],
    ['another group', at('group', { groupId: 'a' }), at('group', { groupId: 'b' }), false],
    ['a successor who is new', at('sealed'), at('sealed', { successorId: 'heir' }), false],
    ['a successor who goes', at('sealed', { successorId: 'heir' }), at('sealed'), true],
  ])('%s', (_, before, after, expected) => {
    expect(isTighterOrSame(before, after)).toBe(expected);
  });
});

describe('what holds where two sharings must', () => {
  const some = SHARING_LEVELS.flatMap((level) => [
    at(level, { groupId: level === 'group' ? 'a' : null }),
    at(level, { groupId: level === 'group' ? 'b' : null, naming: 'role', successorId: 'heir' }),
    at(level, { groupId: level === 'group' ? 'a' : null, tellingSeason: season(6, 8), trace: 'none' }),
    at(level, { groupId: level === 'group' ? 'a' : null, tellingSeason: season(6, 7) }),
  ]);

  it('shows nobody more than either of them', () => {
    for (const mine of some) {
      for (const other of some) {
        const both = tightest(mine, other);
        expect([mine, other].every((each) => isTighterOrSame(each, both))).toBe(true);
      }
    }
  });

  it('takes the tighter of the two as it is, and seals what names other groups or seasons', () => {
    expect(tightest(at('village'), at('elders'))).toEqual(at('elders'));
    expect(tightest(at('elders'), at('village')).level).toBe('elders');
    expect(tightest(at('group', { groupId: 'a' }), at('group', { groupId: 'b' })).level).toBe('sealed');
    const [summer, winter] = [
      at('village', { tellingSeason: season(6, 8) }),
      at('village', { tellingSeason: season(11, 2) }),
    ];
    expect(tightest(summer, winter).level).toBe('sealed');
  });
});
