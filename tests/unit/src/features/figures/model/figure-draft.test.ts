import { describe, expect, it } from 'vitest';
import {
  differingParts,
  draftOf,
  emptyDraft,
  inputOf,
  joinParts,
  readDraft,
  toggleStar,
  type FigureDraft,
} from '#src/features/figures/model/figure-draft.js';
import { DARK_CLOUD, figureInput } from '#tests/support/figure-api.js';

const problemsOf = (draft: FigureDraft) => {
  const reading = readDraft(draft);
  return reading.ok ? {} : reading.problems;
};

describe('a figure as it is written', () => {
  it('comes back from the form as it went in', () => {
    for (const input of [figureInput(), figureInput(DARK_CLOUD)]) {
      expect(readDraft(draftOf(input))).toEqual({ ok: true, input: inputOf(input) });
    }
  });

  it('leaves out names and tellings that say nothing', () => {
    const draft = draftOf(figureInput());
    draft.names.push({ tag: 'fr', name: ' ' });
    draft.variants.push({ toldBy: '', text: '' });
    expect(readDraft(draft)).toEqual({ ok: true, input: inputOf(figureInput()) });
  });

  it('asks for the village’s own name and for stars', () => {
    expect(problemsOf(emptyDraft(['art-x-tazimel', 'en']))).toEqual({
      'names.0': 'required',
      memberHrs: 'choose-stars',
    });
  });

  it('says a problem at the row of the screen, past rows that are left empty', () => {
    const draft = draftOf(figureInput());
    draft.names = [
      { tag: 'en', name: 'Bowl' },
      { tag: 'fr', name: '' },
      { tag: '!', name: 'Third' },
    ];
    expect(problemsOf(draft)).toEqual({ 'names.2': 'language-tag' });
  });

  it('asks for a place that can be read, and for depths', () => {
    const draft = {
      ...draftOf(figureInput(DARK_CLOUD)),
      declination: 'south',
      hasOwnDepths: true,
      sameSide: '40',
    };
    expect(problemsOf(draft)).toEqual({
      'patch.declinationDeg': 'not-a-number',
      'ownDepths.sameSideDeg': 'depth-range',
      'ownDepths.oppositeSideDeg': 'not-a-number',
    });
  });
});

describe('putting stars in and out', () => {
  const vMag = (hr: number) => ({ 1346: 3.65, 1409: 3.53, 1457: 0.85 })[hr] ?? 9;
  const empty = emptyDraft(['en']);
  const toggled = (draft: FigureDraft, hr: number) => ({ ...draft, ...toggleStar(draft, hr, vMag) });

  it('lets the brightest one lead as long as nobody chose another', () => {
    let draft = toggled(toggled(empty, 1346), 1457);
    expect(draft).toMatchObject({ memberHrs: [1346, 1457], indicatorHr: 1457 });
    draft = toggled(draft, 1457);
    expect(draft).toMatchObject({ memberHrs: [1346], indicatorHr: 1346 });
    expect(toggled(draft, 1346)).toMatchObject({ memberHrs: [], indicatorHr: null });
  });

  it('keeps a leader that somebody chose', () => {
    const chosen = { ...toggled(toggled(empty, 1346), 1457), indicatorHr: 1346 };
    expect(toggled(chosen, 1409).indicatorHr).toBe(1346);
  });
});

describe('two people’s states', () => {
  it('differ in whole parts: stars, leader and patch come from one side', () => {
    const theirs = figureInput({ story: 'Theirs.' });
    const mine = figureInput({ memberHrs: [2491], indicatorHr: 2491 });
    expect(differingParts(theirs, mine)).toEqual(['story', 'sky']);
    expect(joinParts(theirs, mine, ['sky'])).toEqual({ ...mine, story: 'Theirs.' });
  });
});
