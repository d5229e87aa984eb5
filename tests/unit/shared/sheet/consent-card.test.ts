import { describe, expect, it } from 'vitest';
import { fontMeasurer } from '#server/print/font-measurer.js';
import { layoutConsentCard, type ConsentCardModel } from '#shared/sheet/consent-card.js';
import { allWords, faultsOf } from '#tests/support/sheet/page-checks.js';

function model(more: Partial<ConsentCardModel> = {}): ConsentCardModel {
  return {
    title: 'What was agreed',
    under: ['A copy for Old Marrun', 'About: Entry: Feast of lamps'],
    asked: ['Asked on 3 May 2027, Upper terraces.', 'Answer: Given.'],
    uses: [
      { words: 'Yes: Print it', isYes: true },
      { words: 'No: Say it on the radio', isYes: false },
    ],
    rules: ['Named: by role only.', 'Holds until it is taken back.'],
    withdraw: ['You can take this back on any day.'],
    lines: ['Mark or signature', 'Witness'],
    foot: 'Register of Upper Tazimel.',
    ...more,
  };
}
const layout = (more: Partial<ConsentCardModel> = {}) => layoutConsentCard(model(more), fontMeasurer);

describe('a consent card', () => {
  it('is one upright page of A5 on which no word meets another and nothing leaves the margin', () => {
    const pages = layout();
    expect(pages.map(({ width, height }) => [width, height])).toEqual([[148, 210]]);
    expect(pages.flatMap(faultsOf)).toEqual([]);
  });

  it('shows each use with a full round for yes and an empty one for no', () => {
    const discs = layout()[0]?.primitives.filter(({ type }) => type === 'disc') ?? [];
    expect(discs).toMatchObject([{ fill: 'solid' }, { fill: 'open' }]);
  });

  it('goes over to further pages rather than leave out a word that was agreed', () => {
    const conditions = Array.from({ length: 220 }, (_, index) => `word${index}`);
    const pages = layout({ rules: [conditions.join(' ')] });
    expect(pages.length).toBeGreaterThan(1);
    expect(pages.flatMap(faultsOf)).toEqual([]);
    const words = allWords(pages);
    expect(conditions.filter((word) => !words.includes(word))).toEqual([]);
    expect(words).toContain('You can take this back on any day.');
  });
});
