import { describe, expect, it } from 'vitest';
import { fontMeasurer } from '#server/print/font-measurer.js';
import { layoutReadBack, type ReadBackModel } from '#shared/sheet/read-back.js';
import { allWords, faultsOf } from '#tests/support/sheet/page-checks.js';

function model(entries: number, elders = 3): ReadBackModel {
  return {
    title: 'Upper terraces 2027',
    lead: 'Read each entry aloud.',
    entries: Array.from({ length: entries }, (_, index) => ({
      title: `Work number ${index + 1}`,
      sentences: ['Best days: 17 to 30 June.', 'If it is late: change to short millet.'],
    })),
    answers: ['Agree', 'Change this', 'Not for the board', 'Not mine to say'],
    elders: Array.from({ length: elders }, (_, index) => `Elder A-${index + 1}`),
    lineForWords: 'What was said',
    foot: ['Submission 2', '6522 4435 0358'],
  };
}

describe('the sheet that is read to a meeting', () => {
  it('is upright A4 on which nothing leaves the margin, with number and hash on every page', () => {
    const pages = layoutReadBack(model(7), fontMeasurer);
    expect(pages.length).toBeGreaterThan(1);
    expect(new Set(pages.map(({ width, height }) => `${width} × ${height}`))).toEqual(new Set(['210 × 297']));
    expect(pages.flatMap(faultsOf)).toEqual([]);
    for (const page of pages) expect(allWords([page])).toEqual(expect.stringContaining('6522 4435 0358'));
  });

  it('has four boxes for every elder at every entry, and leaves no entry out', () => {
    const pages = layoutReadBack(model(7), fontMeasurer);
    const boxes = pages.flatMap(({ primitives }) => primitives.filter(({ type }) => type === 'rect'));
    expect(boxes).toHaveLength(7 * 3 * 4);
    for (let entry = 1; entry <= 7; entry += 1) expect(allWords(pages)).toContain(`Work number ${entry}`);
  });

  it('keeps an entry together with its boxes where a page can hold it', () => {
    for (const page of layoutReadBack(model(7), fontMeasurer)) {
      const titles = allWords([page]).match(/Work number/gu) ?? [];
      const boxes = page.primitives.filter(({ type }) => type === 'rect');
      expect(boxes).toHaveLength(titles.length * 12);
    }
  });

  it('goes on over pages where more elders answer than one can hold', () => {
    const pages = layoutReadBack(model(1, 30), fontMeasurer);
    expect(pages.length).toBeGreaterThan(1);
    expect(pages.flatMap(faultsOf)).toEqual([]);
  });
});
