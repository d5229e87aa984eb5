import { describe, expect, it } from 'vitest';
import { mayHangOn } from '#server/policy/anchor-sight.js';
import type { Shared } from '#server/policy/policy.js';
import { PLAIN_DETAILS, type SharingDetails, type SharingLevel } from '#shared/contracts/sharing.js';

function shared(
  level: SharingLevel,
  details: Partial<SharingDetails> = {},
  changes: Partial<Shared> = {},
): Shared {
  const thing: Shared = {
    ...{ communityId: 'village', level, giverId: 'giver', state: 'shared', leavesTrace: false },
    details: { ...PLAIN_DETAILS, ...details },
  };
  return { ...thing, ...changes };
}

describe('what an entry may be counted from', () => {
  it('is whatever the village sees, for entries of every level', () => {
    for (const level of ['open', 'village', 'group', 'elders', 'sealed'] as const) {
      expect([level, mayHangOn(shared(level, {}, { giverId: 'another' }), shared('village'))]).toEqual([
        ...[level, true],
      ]);
    }
  });

  it('is never what fewer people see', () => {
    expect(mayHangOn(shared('village'), shared('elders'))).toBe(false);
    expect(mayHangOn(shared('elders'), shared('sealed'))).toBe(false);
    expect(mayHangOn(shared('group', { groupId: 'a' }), shared('group', { groupId: 'b' }))).toBe(false);
  });

  it('is what the same giver keeps as close, whatever is said about names and empty slots', () => {
    expect(mayHangOn(shared('elders'), shared('elders', { naming: 'not-named', trace: 'none' }))).toBe(true);
    expect(mayHangOn(shared('elders'), shared('elders', {}, { giverId: 'another' }))).toBe(false);
  });

  it('is only told in the season in which the other is told', () => {
    const tellingSeason = { from: { month: 8, day: 1 }, to: { month: 8, day: 31 } };
    expect(mayHangOn(shared('village'), shared('village', { tellingSeason }))).toBe(false);
    expect(mayHangOn(shared('village', { tellingSeason }), shared('village', { tellingSeason }))).toBe(true);
  });

  it('is nothing that is paused, taken back or not known', () => {
    expect(mayHangOn(shared('village'), shared('village', {}, { state: 'paused' }))).toBe(false);
    expect(mayHangOn(shared('village'), undefined)).toBe(false);
  });
});
