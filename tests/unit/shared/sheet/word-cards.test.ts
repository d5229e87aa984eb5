import { describe, expect, it } from 'vitest';
import { fontMeasurer } from '#server/print/font-measurer.js';
import { layoutSheet } from '#shared/sheet/layout-sheet.js';
import type { SheetPage } from '#shared/sheet/primitives.js';
import type { SheetModel } from '#shared/sheet/sheet-model.js';
import { allWords, faultsOf } from '#tests/support/sheet/page-checks.js';
import { entry, upperTazimel } from '#tests/support/sheet/upper-tazimel-sheet.js';

const title = 'Changed since 2027-1';
const lines = ['Sow long millet: best 16 to 30 June; before, 14 to 30 June', 'Burn: taken off the board'];

function cards(change: Partial<SheetModel>): SheetPage[] {
  return layoutSheet(upperTazimel({ label: '2027-2', ...change }), fontMeasurer);
}

describe('the cards of a mended year', () => {
  it('end with one that names what changed, line by line, and no month says it', () => {
    const pages = cards({ changes: { title, lines } });
    const last = pages.at(-1);
    expect(last).toMatchObject({ kind: 'words-card', month: null, name: title });
    expect(pages.filter(({ kind }) => kind === 'words-card')).toHaveLength(1);
    const said = allWords(last ? [last] : []);
    for (const line of [title, ...lines]) expect(said).toContain(line);
    expect(allWords(pages.slice(0, -1))).not.toContain(title);
    expect(last && faultsOf(last)).toEqual([]);
  });

  it('have none where nothing changed or nothing hung before', () => {
    expect(cards({}).some(({ kind }) => kind === 'words-card')).toBe(false);
  });

  it('go on over further cards where one does not hold them, each counted, no line lost or parted from its rest', () => {
    const many = Array.from(
      { length: 120 },
      (_, index) =>
        `Work number ${String(index + 1)} of the upper terraces and of the fields by the river: best 16 to 30 June; before, 14 to 30 June`,
    );
    const pages = cards({ changes: { title, lines: many } }).filter(({ kind }) => kind === 'words-card');
    expect(pages.length).toBeGreaterThan(2);
    expect(pages.map(({ name }) => name)).toEqual(
      pages.map((_, index) => `${title}, card ${String(index + 1)} of ${String(pages.length)}`),
    );
    const said = pages.map((page) => allWords([page]).replaceAll('\n', ' '));
    for (const line of many) expect(said.filter((words) => words.includes(line))).toHaveLength(1);
    expect(pages.flatMap(faultsOf)).toEqual([]);
  });

  it('keep what has no date on a card of its own before it', () => {
    const window = { earliest: null, bestFrom: null, bestTo: null, latest: null };
    const undated = entry({ window, whyNoDate: 'its star has no date.' });
    const pages = cards({ changes: { title, lines }, entries: [undated], markers: [] });
    expect(pages.slice(-2).map(({ kind, name }) => [kind, name])).toEqual([
      ['words-card', 'Without a date in 2027'],
      ['words-card', title],
    ]);
  });

  it('bear its state across where the mended version is not published yet', () => {
    const pages = cards({ label: null, stateWatermark: 'Recalled', changes: { title, lines } });
    expect(pages.at(-1)?.primitives[0]).toMatchObject({ role: 'watermark', lines: [{ text: 'Recalled' }] });
  });

  it('warn for the eyes where a star or sign leads, as the sheet beside the year board does', () => {
    const said = (change: Partial<SheetModel>) =>
      allWords(cards({ changes: { title, lines }, ...change }).slice(-1)).replaceAll('\n', ' ');
    expect(said({})).toContain('stop before the Sun shows');
    expect(said({ markers: [] })).not.toContain('stop before the Sun shows');
  });
});
