import { describe, expect, it } from 'vitest';
import type { Answer } from '#shared/contracts/reviews.js';
import type { Version } from '#shared/contracts/versions.js';
import { answersByEntry } from '#src/features/calendars/model/elder-requests.js';
import { content } from '#tests/support/draft-of-tazimel.js';

function version(state: Version['state']): Version {
  const entries = ['e1', 'e2'].map((entryId) => ({ entryId, content: content(), hash: `hash-${entryId}` }));
  return { state, entries } as unknown as Version;
}

function answer(changes: Partial<Answer>): Answer {
  return {
    id: 'a1',
    entryId: 'e1',
    entryHash: 'hash-e1',
    elderId: 'p1',
    elderName: 'Elder A-2',
    answer: 'change-this',
    note: 'Start three days later.',
    letStand: false,
    recordedByName: null,
    witness: null,
    proof: null,
    spoken: null,
    answeredAt: '2027-06-01T06:00:00Z',
    mine: false,
    ...changes,
  };
}

const drafts = new Map([
  ['e1', content()],
  ['e2', content({ notes: 'changed since' })],
]);

describe('what elders asked about the newest submission', () => {
  it('stands at its entry until it is settled', () => {
    const found = answersByEntry(version('changes-asked'), [answer({})], drafts);
    expect(found.get('e1')?.requests).toEqual([{ answer: answer({}), changedSince: false }]);
    expect(found.has('e2')).toBe(false);
  });

  it('says where the entry was changed since', () => {
    const other = answer({ entryId: 'e2', entryHash: 'hash-e2', answer: 'not-for-the-board' });
    expect(answersByEntry(version('in-review'), [other], drafts).get('e2')?.requests[0]?.changedSince).toBe(
      true,
    );
  });

  it('says no change where the village only calls the kind otherwise', () => {
    const renamed = new Map([['e1', content({ kindWord: { word: 'Work of the terraces' } })]]);
    const found = answersByEntry(version('changes-asked'), [answer({})], renamed);
    expect(found.get('e1')?.requests[0]?.changedSince).toBe(false);
  });

  it('is kept beside the entry where the elder lets it stand', () => {
    const kept = answer({ letStand: true });
    expect(answersByEntry(version('published'), [kept], drafts).get('e1')).toEqual({
      requests: [],
      kept: [kept],
    });
  });

  it('is nothing after signing off, for other content, and for agreement', () => {
    expect(answersByEntry(version('signed-off'), [answer({})], drafts).size).toBe(0);
    expect(answersByEntry(version('in-review'), [answer({ entryHash: 'older' })], drafts).size).toBe(0);
    expect(answersByEntry(version('in-review'), [answer({ answer: 'agree' })], drafts).size).toBe(0);
  });
});
