import { describe, expect, it } from 'vitest';
import { appearance, isForVillage, isInSeason, isKept, type Shared } from '#server/policy/policy.js';
import type { Viewer } from '#server/policy/viewer.js';
import {
  PLAIN_DETAILS,
  SHARING_LEVELS,
  type SharingDetails,
  type SharingLevel,
} from '#shared/contracts/sharing.js';
import { ROLES } from '#shared/contracts/people.js';

const AUGUST = { from: { month: 8, day: 1 }, to: { month: 8, day: 31 } };

function viewer(changes: Partial<Viewer> = {}): Viewer {
  const nobody: Viewer = {
    personId: 'somebody',
    communityId: 'village',
    roles: ['observer'],
    groupIds: new Set(),
    today: '2026-08-15',
  };
  return { ...nobody, ...changes };
}

function shared(
  level: SharingLevel,
  details: Partial<SharingDetails> = {},
  changes: Partial<Shared> = {},
): Shared {
  const thing: Shared = {
    communityId: 'village',
    level,
    details: { ...PLAIN_DETAILS, ...details },
    giverId: 'giver',
    state: 'shared',
    leavesTrace: false,
  };
  return { ...thing, ...changes };
}

describe('who sees a thing', () => {
  it('is nobody where nothing is known about it, in another village, or when it is paused or withdrawn', () => {
    const giver = viewer({ personId: 'giver', roles: [...ROLES] });
    expect(appearance(giver, undefined)).toBe('none');
    expect(appearance(viewer({ communityId: 'elsewhere' }), shared('open'))).toBe('none');
    expect(appearance(giver, shared('open', {}, { state: 'paused' }))).toBe('none');
    expect(appearance(giver, shared('open', {}, { state: 'withdrawn' }))).toBe('none');
  });

  it('is everybody of the village at the levels Open and Village, in season', () => {
    for (const level of ['open', 'village'] as const) {
      for (const role of ROLES) expect(appearance(viewer({ roles: [role] }), shared(level))).toBe('full');
    }
  });

  it('is its group, and no role beside it', () => {
    const kept = shared('group', { groupId: 'weavers' });
    expect(appearance(viewer({ groupIds: new Set(['weavers']) }), kept)).toBe('full');
    expect(appearance(viewer({ groupIds: new Set(['herders']), roles: [...ROLES] }), kept)).toBe('blank');
    expect(appearance(viewer({ personId: 'giver' }), kept)).toBe('full');
  });

  it('is giver and elders at the level Elders; steward, officer and staff stand below it', () => {
    const kept = shared('elders', { trace: 'none' });
    expect(appearance(viewer({ roles: ['elder'] }), kept)).toBe('full');
    expect(appearance(viewer({ roles: ['steward', 'officer', 'staff', 'observer'] }), kept)).toBe('none');
  });

  it('is giver and one successor of what is sealed, which leaves no trace whatever was chosen', () => {
    const sealed = shared('sealed', { successorId: 'heir', trace: 'blank' });
    expect(appearance(viewer({ personId: 'giver' }), sealed)).toBe('full');
    expect(appearance(viewer({ personId: 'heir' }), sealed)).toBe('full');
    expect(appearance(viewer({ roles: [...ROLES] }), sealed)).toBe('none');
  });

  it.each([
    ['2026-07-31', 'none'],
    ['2026-08-01', 'full'],
    ['2026-08-31', 'full'],
    ['2026-09-01', 'none'],
  ] as const)('follows the telling season to the day: on %s an elder sees it as %s', (today, expected) => {
    const told = shared('elders', { tellingSeason: AUGUST, trace: 'blank' });
    expect(appearance(viewer({ roles: ['elder'], today }), told)).toBe(expected);
    expect(appearance(viewer({ personId: 'giver', today }), told)).toBe('full');
  });

  it('counts both days of a season, over New Year and to the end of February in leap years', () => {
    const winter = { from: { month: 12, day: 20 }, to: { month: 2, day: 28 } };
    const days = ['2027-12-19', '2027-12-20', '2028-01-01', '2028-02-29', '2028-03-01'];
    expect(days.map((day) => isInSeason(winter, day))).toEqual([false, true, true, true, false]);
  });

  it('puts on the board what is open or the village’s on that day, and nothing else', () => {
    expect(SHARING_LEVELS.filter((level) => isForVillage(shared(level), '2026-08-15'))).toEqual([
      'open',
      'village',
    ]);
    expect(isForVillage(shared('open', { tellingSeason: AUGUST }), '2026-12-01')).toBe(false);
    expect(isForVillage(undefined, '2026-08-15')).toBe(false);
  });

  it('leaves to its own people what the village does not see all year', () => {
    expect(SHARING_LEVELS.filter((level) => isKept(shared(level)))).toEqual(['group', 'elders', 'sealed']);
    expect(isKept(shared('village', { tellingSeason: AUGUST }))).toBe(true);
  });
});
