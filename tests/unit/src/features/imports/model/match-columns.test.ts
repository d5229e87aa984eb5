import { describe, expect, it } from 'vitest';
import { wordsOfTables } from '#src/features/imports/model/table-languages.js';
import {
  guessColumns,
  keptMatching,
  matchAnew,
  matchedLines,
} from '#src/features/imports/model/match-columns.js';
import { readTable, utf8TextOf } from '#src/features/imports/model/read-table.js';
import { isExample, TEMPLATE_COLUMNS, templateCsv } from '#src/features/imports/model/template.js';
import { CALENDAR_CSV_COLUMNS } from '#shared/calendar/csv-columns.js';
import { IMPORT_COLUMNS } from '#shared/contracts/imports.js';

const { titles: known, titleOf } = wordsOfTables('en');

describe('columns that a table may have', () => {
  it('are those of our own CSV that make an entry, its days, and one for words', () => {
    const given = CALENDAR_CSV_COLUMNS.filter(({ part }) => part === 'given').map(({ id }) => id);
    const days = ['earliest', 'bestFrom', 'bestTo', 'lastAdvised'];
    expect([...IMPORT_COLUMNS].sort()).toEqual([...given, ...days, 'when'].sort());
  });

  it('are known by their titles in the person’s language, by other usual ones and by their ids', () => {
    const titles = ['Name for the office', 'window_early', 'bestTo', 'Anchor', 'shoe size', 'TITLE'];
    expect(guessColumns(titles, known)).toEqual([
      ...['titleOfficer', 'earliest', 'bestTo', 'when', null],
      // The same a second time counts no more.
      null,
    ]);
  });

  it('have titles that are each one column’s alone', () => {
    const all = IMPORT_COLUMNS.map((column) => titleOf(column));
    expect(guessColumns(all, known)).toEqual([...IMPORT_COLUMNS]);
  });

  it('are chosen by hand one at a time, and kept for the same titles', () => {
    const matching = matchAnew(['titleOfficer', null, 'kind'], 1, 'titleOfficer');
    expect(matching).toEqual([null, 'titleOfficer', 'kind']);
    expect(keptMatching(JSON.parse(JSON.stringify(matching)), ['a', 'b', 'c'])).toEqual(matching);
    expect(keptMatching(matching, ['a', 'b'])).toBeNull();
    expect(keptMatching(['of an older release', 1, {}], ['a', 'b', 'c'])).toEqual([null, null, null]);
  });
});

describe('a table as it was saved', () => {
  it.each([',', ';', '\t'])('is read with %j between its cells', (mark) => {
    const text = `\ufefftitle${mark}kind\r\n\r\n"Sow ""long""${mark} millet"${mark}farm\r\n`;
    expect(readTable(text)).toEqual({
      titles: ['title', 'kind'],
      lines: [{ line: 3, cells: [`Sow "long"${mark} millet`.trim(), 'farm'] }],
    });
  });

  it('gives back words that stood behind an apostrophe, and leaves empty cells out', () => {
    const table = readTable("title,notes,kind\n'=Sow,-5,\n");
    expect(matchedLines(table, ['titleOfficer', 'notes', 'kind'])).toEqual([
      { line: 2, cells: { titleOfficer: '=Sow', notes: '-5' } },
    ]);
  });

  it('is not guessed where its letters are no UTF-8', () => {
    expect(utf8TextOf(new Uint8Array([0xe9, 0x74, 0xe9]).buffer)).toBeNull();
    expect(utf8TextOf(new Uint8Array([0xc3, 0xa9]).buffer)).toBe('é');
  });
});

describe('the empty table', () => {
  const examples = [{ titleOfficer: 'Example', kind: 'farm' }];

  it('is matched by itself, and its examples are known as long as nobody changed them', () => {
    const table = readTable(templateCsv(titleOf, examples));
    const matching = guessColumns(table.titles, known);
    expect(matching).toEqual([...TEMPLATE_COLUMNS]);
    const [example] = matchedLines(table, matching);
    if (example === undefined) throw new Error('The template has no example.');
    expect(isExample(example, examples)).toBe(true);
    const changed = { ...example, cells: { ...example.cells, titleOfficer: 'Sow' } };
    expect(isExample(changed, examples)).toBe(false);
    expect(isExample({ ...example, cells: { titleOfficer: 'Example' } }, examples)).toBe(false);
  });
});
