import { describe, expect, it } from 'vitest';
import {
  askedAgain,
  blankConsent,
  isDraft,
  problemsOf,
  toSend,
  yearAfter,
} from '#src/features/consents/model/consent-draft.js';
import { consentContent } from '#tests/support/consent-api.js';

const THING = { giverId: null, giverName: 'Old Marrun' };

describe('a consent form', () => {
  it('begins with nothing ticked and nothing chosen', () => {
    const draft = blankConsent(THING, '2026-12-01');
    expect(draft).toMatchObject({
      ...{
        answer: null,
        uses: [],
        naming: null,
        askedHow: [],
        mayWithdraw: [],
        afterDeath: null,
        proof: null,
      },
      reviewBy: '2027-12-01',
    });
  });

  it('has nothing ticked either when somebody is asked again', () => {
    const before = consentContent({ uses: ['keep', 'show', 'print'], naming: 'named', until: '2027-06-01' });
    expect(askedAgain(before, '2027-11-20')).toMatchObject({
      ...{ answer: null, uses: [], naming: null, proof: null, until: null },
      ...{ giverName: before.giverName, askedOn: '2027-11-20', reviewBy: '2028-11-20' },
    });
  });

  it('asks for an answer, and sends ticks with a yes alone', () => {
    const draft = { ...blankConsent(THING, '2026-12-01'), uses: ['print', 'keep'] as const };
    expect(problemsOf({ ...draft, uses: [...draft.uses] })).toEqual(new Map([['answer', 'required']]));
    expect(toSend({ ...draft, uses: [...draft.uses], answer: 'refused' }).uses).toEqual([]);
    expect(toSend({ ...draft, uses: [...draft.uses], answer: 'given' }).uses).toEqual(['keep', 'print']);
  });

  it('asks again after a year, at the end of February after the 29th, too', () => {
    expect(yearAfter('2028-02-29')).toBe('2029-02-28');
  });

  it('takes up only drafts of its own shape', () => {
    expect(isDraft(JSON.parse(JSON.stringify(blankConsent(THING, '2026-12-01'))))).toBe(true);
    for (const other of [null, 'text', {}, { uses: 'print', giverName: '' }])
      expect(isDraft(other)).toBe(false);
  });
});
