import { describe, expect, it } from 'vitest';
import { contentOf, newDraft } from '#src/features/calendars/model/entry-draft.js';
import {
  groupsWithProblems,
  problemsFrom,
  problemsOf,
} from '#src/features/calendars/model/field-problems.js';
import { content } from '#tests/support/draft-of-tazimel.js';

describe('what is not accepted', () => {
  it('stands at its field with one code each', () => {
    const fixed = { date: { month: 3, day: 1 }, source: '' };
    const problems = problemsOf(contentOf({ ...newDraft(), leadType: 'fixed-date', fixed }));
    expect([...problems]).toEqual([
      ['titleOfficer', { code: 'required' }],
      ['lead.source', { code: 'required' }],
    ]);
    expect(groupsWithProblems(problems)).toEqual(['what', 'when']);
  });

  it('names the day that lies before the one in front of it', () => {
    const offsets = { earliestDays: 0, bestFromDays: 8, bestToDays: 3, lastAdvisedDays: 14 };
    expect([...problemsOf(content({ offsets }))]).toEqual([['offsets.bestToDays', { code: 'window-order' }]]);
  });

  it('is nothing for an entry that can be saved', () => {
    expect(problemsOf(content()).size).toBe(0);
  });

  it('takes the server’s refusals at the same fields, whether the body is the entry or holds it', () => {
    const error = { field: 'content.lead.markerKey', code: 'unknown-marker', message: 'Not in the table.' };
    const problems = problemsFrom([error, { ...error, field: 'lead.markerKey', code: 'later' }]);
    expect([...problems]).toEqual([
      ['lead.markerKey', { code: 'unknown-marker', message: 'Not in the table.' }],
    ]);
  });
});
