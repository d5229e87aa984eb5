import { describe, expect, it } from 'vitest';
import type { EntryDates } from '#shared/contracts/calendars.js';
import type { RolledEntry } from '#shared/contracts/rollovers.js';
import { rolledGroups } from '#src/features/rollovers/model/rolled-groups.js';

const dates: EntryDates = {
  starOutcome: null,
  phenomenonOutcome: null,
  marker: null,
  window: null,
  warnings: [],
};
const entry = (entryId: string, changes: Partial<RolledEntry>): RolledEntry => ({
  ...{ entryId, titleVillage: '', titleOfficer: entryId, kind: 'farm', protectiveWatch: false },
  ...{ before: dates, after: dates, outcome: 'stays', movedDays: 0, needsConsent: false },
  ...changes,
});

describe('what a new year changed', () => {
  it('begins with what needs a decision and ends with what stays', () => {
    const groups = rolledGroups([
      entry('a', {}),
      entry('b', { outcome: 'moved', movedDays: 9 }),
      entry('c', { outcome: 'lost-days', movedDays: null }),
    ]);
    expect(groups.map(({ group }) => group)).toEqual(['lost-days', 'moved', 'stays']);
  });

  it('names an entry among its moves and among the consents that are due', () => {
    const groups = rolledGroups([entry('a', { outcome: 'moved', movedDays: 9, needsConsent: true })]);
    expect(groups.map(({ group, entries }) => [group, entries.length])).toEqual([
      ['moved', 1],
      ['consent', 1],
    ]);
  });
});
