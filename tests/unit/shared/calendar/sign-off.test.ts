import { describe, expect, it } from 'vitest';
import {
  answeredCount,
  entryOutcome,
  signingObstacle,
  signOffGaps,
  type AnswerFact,
  type ReviewState,
  type SignatureFact,
} from '#shared/calendar/sign-off.js';

const entries = [
  { entryId: 'sow', hash: 'h1' },
  { entryId: 'reap', hash: 'h2' },
];
const says = (
  elderId: string,
  entryId: string,
  answer: AnswerFact['answer'] = 'agree',
  changes: Partial<AnswerFact> = {},
): AnswerFact => ({
  elderId,
  entryId,
  entryHash: entryId === 'sow' ? 'h1' : 'h2',
  answer,
  letStand: false,
  ...changes,
});
const agreesToAll = (elderId: string) => [says(elderId, 'sow'), says(elderId, 'reap')];
const elder = (personId: string): SignatureFact => ({ personId, role: 'elder' });
const steward = (personId: string): SignatureFact => ({ personId, role: 'steward' });

function review(changes: Partial<ReviewState> = {}): ReviewState {
  return {
    rule: { minElders: 1, mustSign: [], oneOf: [], steward: false },
    entries,
    answers: agreesToAll('e1'),
    signatures: [elder('e1')],
    writerIds: new Set(['officer']),
    ...changes,
  };
}

const codes = (state: ReviewState) => signOffGaps(state).map(({ code }) => code);

describe('whose signatures the rule asks for', () => {
  it('is a number of elders; a steward is none of them, and nobody counts twice', () => {
    const rule = { minElders: 2, mustSign: [], oneOf: [], steward: false };
    expect(codes(review({ rule }))).toEqual(['needs-elders']);
    expect(codes(review({ rule, signatures: [elder('e1'), steward('s')] }))).toEqual(['needs-elders']);
    expect(codes(review({ rule, signatures: [elder('e1'), elder('e1')] }))).toEqual(['needs-elders']);
    expect(signOffGaps(review({ rule, signatures: [] }))[0]?.count).toBe(2);
    expect(codes(review({ rule, signatures: [elder('e1'), elder('e2')] }))).toEqual([]);
  });

  it('is everybody of a list', () => {
    const rule = { minElders: 1, mustSign: ['e1', 'e2', 'e3'], oneOf: [], steward: false };
    expect(signOffGaps(review({ rule }))).toEqual([
      { code: 'needs-person', personIds: ['e2', 'e3'], entryIds: [], count: 2 },
    ]);
  });

  it('is one of a list, where it names anybody', () => {
    const rule = { minElders: 1, mustSign: [], oneOf: ['e2', 'e3'], steward: false };
    expect(signOffGaps(review({ rule }))).toEqual([
      { code: 'needs-one-of', personIds: ['e2', 'e3'], entryIds: [], count: 1 },
    ]);
    expect(codes(review({ rule, signatures: [elder('e3')] }))).toEqual([]);
  });

  it('is the steward, signing as steward', () => {
    const rule = { minElders: 1, mustSign: [], oneOf: [], steward: true };
    expect(codes(review({ rule }))).toEqual(['needs-steward']);
    expect(codes(review({ rule, signatures: [elder('e1'), steward('s')] }))).toEqual([]);
  });
});

describe('what entries need', () => {
  it('is at least one agree each: silence and "not mine to say" are none', () => {
    expect(signOffGaps(review({ answers: [says('e1', 'sow')] }))).toEqual([
      { code: 'entry-without-agree', personIds: [], entryIds: ['reap'], count: 1 },
    ]);
    const notMine = [says('e1', 'sow'), says('e1', 'reap', 'not-mine-to-say')];
    expect(codes(review({ answers: notMine }))).toEqual(['entry-without-agree']);
  });

  it('is an agree to exactly this content', () => {
    const older = [says('e1', 'sow'), says('e1', 'reap', 'agree', { entryHash: 'before' })];
    expect(codes(review({ answers: older }))).toEqual(['entry-without-agree']);
  });

  it('is an agree of somebody who did not write to the draft', () => {
    expect(codes(review({ writerIds: new Set(['e1']) }))).toEqual(['entry-without-agree']);
    const answers = [...agreesToAll('e1'), ...agreesToAll('e2')];
    expect(codes(review({ writerIds: new Set(['e1']), answers }))).toEqual([]);
  });

  it('is that no "change this" stands, unless its elder let it stand beside the entry', () => {
    const asked = (letStand: boolean) => [
      ...agreesToAll('e1'),
      says('e2', 'sow', 'change-this', { letStand }),
    ];
    expect(signOffGaps(review({ answers: asked(false) }))).toEqual([
      { code: 'change-stands', personIds: [], entryIds: ['sow'], count: 1 },
    ]);
    expect(codes(review({ answers: asked(true) }))).toEqual([]);
  });

  it('is that no "not for the board" stands, which nobody can let stand', () => {
    const refused = [...agreesToAll('e1'), says('e2', 'reap', 'not-for-the-board', { letStand: true })];
    expect(codes(review({ answers: refused }))).toEqual(['not-for-board-stands']);
  });

  it('counts an objection of somebody who wrote to the draft', () => {
    const answers = [...agreesToAll('e1'), says('e2', 'sow', 'not-for-the-board')];
    expect(codes(review({ answers, writerIds: new Set(['e2']) }))).toEqual(['not-for-board-stands']);
  });

  it('leaves objections to earlier content behind', () => {
    const answers = [...agreesToAll('e1'), says('e2', 'sow', 'change-this', { entryHash: 'before' })];
    expect(codes(review({ answers }))).toEqual([]);
  });
});

describe('signing', () => {
  const rule = { minElders: 2, mustSign: [], oneOf: [], steward: true };
  const open = (changes: Partial<ReviewState> = {}) =>
    review({ rule, signatures: [], answers: [...agreesToAll('e1'), ...agreesToAll('e2')], ...changes });

  it('is open to an elder who answered every entry, and to the steward without answers', () => {
    expect(signingObstacle(elder('e1'), open(), true)).toBeNull();
    expect(signingObstacle(steward('s'), open(), true)).toBeNull();
  });

  it('is closed to an elder until every entry has their answer, whatever it says', () => {
    const missing = open({ answers: [says('e1', 'sow')] });
    expect(signingObstacle(elder('e1'), missing, true)).toBe('answers-missing');
    const notMine = open({
      answers: [says('e1', 'sow', 'not-mine-to-say'), says('e1', 'reap', 'change-this')],
    });
    expect(signingObstacle(elder('e1'), notMine, true)).toBeNull();
  });

  it('is closed to an elder whose answers are to earlier content', () => {
    const older = open({
      answers: [says('e1', 'sow'), says('e1', 'reap', 'agree', { entryHash: 'before' })],
    });
    expect(signingObstacle(elder('e1'), older, true)).toBe('answers-missing');
  });

  it('is closed to whoever wrote to the draft, in either role', () => {
    const wrote = open({ writerIds: new Set(['e1', 's']) });
    expect(signingObstacle(elder('e1'), wrote, true)).toBe('wrote-the-draft');
    expect(signingObstacle(steward('s'), wrote, true)).toBe('wrote-the-draft');
  });

  it('happens once in each role', () => {
    const signed = open({ signatures: [elder('e1')] });
    expect(signingObstacle(elder('e1'), signed, true)).toBe('already-signed');
    expect(signingObstacle(steward('e1'), signed, true)).toBeNull();
  });

  it('is closed outside a review', () => {
    expect(signingObstacle(elder('e1'), open(), false)).toBe('not-in-review');
  });

  it('may begin while something stands, but the signature that completes the rule waits until nothing does', () => {
    const answers = [...agreesToAll('e1'), says('e2', 'sow', 'change-this'), says('e2', 'reap')];
    const disputed = (signatures: SignatureFact[]) => open({ answers, signatures });
    expect(signingObstacle(elder('e2'), disputed([elder('e1')]), true)).toBeNull();
    expect(signingObstacle(steward('s'), disputed([elder('e1'), elder('e2')]), true)).toBe(
      'something-stands',
    );
    expect(signingObstacle(elder('e2'), disputed([elder('e1'), steward('s')]), true)).toBe(
      'something-stands',
    );
    const settled = answers.map((answer) => ({ ...answer, letStand: answer.answer === 'change-this' }));
    expect(
      signingObstacle(steward('s'), open({ answers: settled, signatures: [elder('e1'), elder('e2')] }), true),
    ).toBeNull();
  });
});

describe('an elder’s progress', () => {
  it('counts entries of this submission once each', () => {
    const answers = [
      says('e1', 'sow'),
      says('e1', 'sow', 'not-mine-to-say'),
      says('e1', 'reap', 'agree', { entryHash: 'before' }),
      says('e2', 'reap'),
    ];
    expect(answeredCount('e1', entries, answers)).toBe(1);
    expect(answeredCount('e3', entries, answers)).toBe(0);
  });
});

describe('where an entry stands', () => {
  const entry = { entryId: 'e', hash: 'h' };
  const said = (elderId: string, answer: AnswerFact['answer'], letStand = false): AnswerFact => ({
    ...{ entryId: 'e', entryHash: 'h', elderId, answer, letStand },
  });
  const outcome = (answers: AnswerFact[], hasVariants = false) =>
    entryOutcome(entry, answers, new Set(['writer']), hasVariants);

  it('is agreed by one who did not write it, and by nobody’s silence', () => {
    expect(outcome([])).toBe('with-reviewers');
    expect(outcome([said('writer', 'agree')])).toBe('with-reviewers');
    expect(outcome([said('a', 'agree')])).toBe('agreed');
  });

  it('is agreed with differences, a full outcome, where one is let stand or a variant stands beside it', () => {
    expect(outcome([said('a', 'agree'), said('b', 'change-this', true)])).toBe('agreed-with-differences');
    expect(outcome([said('a', 'agree')], true)).toBe('agreed-with-differences');
  });

  it('is held back or open to change as long as one person says so, however many agree', () => {
    const agreed = ['a', 'b', 'c', 'd'].map((elder) => said(elder, 'agree'));
    expect(outcome([...agreed, said('e', 'change-this')])).toBe('changes-asked');
    expect(outcome([...agreed, said('e', 'not-for-the-board')])).toBe('held-back');
  });
});
