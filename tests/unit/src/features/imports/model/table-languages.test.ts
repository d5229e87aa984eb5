import { describe, expect, it } from 'vitest';
import { markerKeysByName, TABLE_WORDS } from '#server/features/imports/import-words.js';
import type { TableFacts } from '#server/features/imports/table-cells.js';
import { tablePlan } from '#server/features/imports/table-plan.js';
import { CALENDAR_CSV_COLUMNS } from '#shared/calendar/csv-columns.js';
import { dateCell, plainWords } from '#shared/calendar/import-dates.js';
import { IMPORT_COLUMNS } from '#shared/contracts/imports.js';
import { TABLE_LANGUAGES, type TableLanguage } from '#shared/locales/table-languages.js';
import { tableTexts } from '#shared/locales/tables.js';
import { plainTitle } from '#src/features/imports/model/column-words.js';
import { guessColumns, matchedLines } from '#src/features/imports/model/match-columns.js';
import { readTable } from '#src/features/imports/model/read-table.js';
import { tableLanguageOf, wordsOfTables } from '#src/features/imports/model/table-languages.js';
import { isExample, TEMPLATE_COLUMNS, templateCsv } from '#src/features/imports/model/template.js';

/** Tables in every language that has texts for them: nothing is matched by hand. */
const facts: TableFacts = {
  ...{ kinds: TABLE_WORDS.kinds, yes: TABLE_WORDS.yes, codes: TABLE_WORDS.codes, words: TABLE_WORDS.dates },
  ...{ dayOrder: null, calendarYear: 2027, latitudeDeg: 12 },
  markerKeyOf: markerKeysByName([], new Map()),
  ...{ natureSigns: new Map(), listedSigns: new Map() },
  ...{ villageKinds: new Map(), villageOperations: new Map() },
};
const templateIn = (language: TableLanguage) =>
  templateCsv(wordsOfTables(language).titleOf, Object.values(tableTexts[language].template.lines));
const readIn = (text: string, own = 'en') => {
  const table = readTable(text);
  const { titles } = wordsOfTables(tableLanguageOf(table.titles, own));
  const matching = guessColumns(table.titles, titles);
  return { matching, lines: matchedLines(table, matching) };
};
const withoutAccents = (text: string) => text.normalize('NFD').replace(/\p{Mn}/gu, '');

describe.each(TABLE_LANGUAGES)('a table in %s', (language) => {
  it('has a title of its own for every column of the template, and each is known again, also without accents', () => {
    const { column, alias } = tableTexts[language];
    expect(TEMPLATE_COLUMNS.filter((each) => (column[each] as string | undefined) === undefined)).toEqual([]);
    const own = IMPORT_COLUMNS.filter((each) => each in column);
    const titles = own.map((each) => (column as Record<string, string>)[each] ?? '');
    expect(new Set(titles.map(plainTitle)).size).toBe(titles.length);
    const { titles: known } = wordsOfTables(tableLanguageOf(titles, 'en'));
    expect(tableLanguageOf(titles, 'en')).toBe(language);
    expect(guessColumns(titles, known)).toEqual(own);
    expect(guessColumns(titles.map(withoutAccents), known)).toEqual(own);
    for (const [each, others] of Object.entries(alias)) {
      for (const title of others.split('|')) expect(guessColumns([title], known)).toEqual([each]);
    }
  });

  it('has a title for every column of the product’s own table, by which each is known again', () => {
    const { column } = tableTexts[language];
    const titles = CALENDAR_CSV_COLUMNS.map(({ id }) => column[id]);
    expect(new Set(titles.map(plainTitle)).size).toBe(titles.length);
    const { titles: known } = wordsOfTables(tableLanguageOf(titles, 'en'));
    const given = IMPORT_COLUMNS.filter((each) => CALENDAR_CSV_COLUMNS.some(({ id }) => id === each));
    const matched = guessColumns(titles, known);
    expect(CALENDAR_CSV_COLUMNS.flatMap(({ id }, index) => (matched[index] === id ? [id] : []))).toEqual(
      CALENDAR_CSV_COLUMNS.map(({ id }) => id).filter((id) => given.some((each) => each === id)),
    );
    expect(matched.filter((each) => each !== null)).toHaveLength(given.length);
  });

  it('comes in as its own examples say, which are the same work in every language', () => {
    const { matching, lines } = readIn(templateIn(language));
    expect(matching).toEqual([...TEMPLATE_COLUMNS]);
    const plan = tablePlan(lines, facts, []);
    expect(plan.map(({ problems }) => problems)).toEqual([[], [], []]);
    const [sow, weed, close] = plan.map(({ entry }) => entry?.content);
    expect(sow).toMatchObject({
      kind: 'farm',
      lead: { type: 'marker', markerKey: 'pleiades', phenomenon: 'heliacal-rising' },
      offsets: { bestFromDays: 7, bestToDays: 23 },
      record: {
        what: { operation: 'sow' },
        when: { leadDays: 10, graceDays: 5, repeats: 'yearly' },
        signs: {
          list: [
            { type: 'bird', usual: { from: { month: 5, day: 20 }, to: { month: 6, day: 5 } } },
            { type: 'soil' },
          ],
          ...{ needed: 1, mustHave: 1 },
        },
        trust: { confidence: 'strong', basis: 'handed-down' },
      },
    });
    expect(weed?.lead).toEqual({ type: 'entry-actual', entryId: plan[0]?.entry?.id });
    expect(close).toMatchObject({
      kind: 'household',
      lead: { type: 'fixed-date', date: { month: 11, day: 20 } },
      // To the end of the first ten days of December.
      offsets: { bestFromDays: 0, bestToDays: 20 },
    });
  });

  it('is read the same without its accents', () => {
    const plan = tablePlan(readIn(withoutAccents(templateIn(language))).lines, facts, []);
    expect(plan.map(({ problems }) => problems)).toEqual([[], [], []]);
  });

  it('has its examples passed over as long as nobody changed them, whichever language the person reads', () => {
    const { lines } = readIn(templateIn(language), 'fr');
    const { examples } = wordsOfTables('fr');
    expect(lines.map((line) => isExample(line, examples))).toEqual([true, true, true]);
    const [, , close] = lines;
    if (!close) throw new Error('no third example');
    const changed = { ...close, cells: { ...close.cells, bestTo: '2027-12-03' } };
    expect(isExample(changed, examples)).toBe(false);
    expect(isExample({ ...close, cells: { ...close.cells, titleOfficer: 'Close' } }, examples)).toBe(false);
    // Templates of before had other words there.
    const { bestTo } = tableTexts[language].template.before.byTenDays;
    expect(isExample({ ...close, cells: { ...close.cells, bestTo } }, examples)).toBe(true);
  });

  it('names all kinds of events, of work and of signs', () => {
    const { kinds, codes } = tableTexts[language].words;
    for (const [kind, names] of Object.entries(kinds)) {
      for (const name of names.split(',')) expect(TABLE_WORDS.kinds.get(plainWords(name)), name).toBe(kind);
    }
    for (const [list, words] of Object.entries(codes)) {
      const known = TABLE_WORDS.codes[list as keyof typeof codes];
      for (const [code, names] of Object.entries(words as Record<string, string>)) {
        for (const name of names.split(',')) expect(known.get(plainWords(name)), name).toBe(code);
      }
    }
  });
});

describe('words of all languages together', () => {
  it('give every month one number', () => {
    const { months } = TABLE_WORDS.dates;
    const all = months.flatMap((names) => [...new Set(names)]);
    expect(new Set(all).size).toBe(all.length);
  });

  it('give every day of a star one meaning', () => {
    const all = Object.values(TABLE_WORDS.dates.phenomena).flatMap((names) => [...new Set(names)]);
    expect(new Set(all).size).toBe(all.length);
  });
});

describe('a month with 1, 2 or 3 behind it', () => {
  const days = (text: string) => {
    const cell = dateCell(text, facts);
    return cell.kind === 'day' ? [cell.first, cell.last] : cell;
  };

  it.each(TABLE_LANGUAGES)('is asked about in %s, and has ways to say the ten days', (language) => {
    const { months, days: said } = tableTexts[language].words;
    for (const [index, names] of months.split('|').entries()) {
      const [name = ''] = names.split(',').map((each) => each.trim());
      for (const [at, part] of (['first', 'second', 'third'] as const).entries()) {
        const number = at + 1;
        expect(days(`${name} ${String(number)}`)).toEqual({ kind: 'problem', problem: 'day-or-ten-days' });
        const ways = said.tenDays[part].split('|').map((way) => way.trim().replace('{{month}}', name));
        expect(ways.filter((way) => way.includes(String(number))).length).toBeGreaterThan(1);
        for (const way of ways) {
          expect(days(way), way).toMatchObject([
            { month: index + 1, day: at * 10 + 1 },
            { month: index + 1 },
          ]);
        }
      }
    }
  });
});

describe('a day in words', () => {
  const day = (month: number, first: number, last = first, year: number | null = null) => ({
    ...{ kind: 'day', year, first: { month, day: first }, last: { month, day: last } },
  });
  it.each([
    ['14 de junio', day(6, 14)],
    ['14 de junio de 2027', day(6, 14, 14, 2027)],
    ['1.º de septiembre', day(9, 1)],
    ['junio década 2', day(6, 11, 20)],
    ['1.ª década de mayo', day(5, 1, 10)],
    ['mediados de Junio', day(6, 11, 20)],
    ['últimos diez días de febrero', day(2, 21, 28)],
    ['1er août', day(8, 1)],
    ["première décade d'août", day(8, 1, 10)],
    ['mi-juin', day(6, 11, 20)],
    ["1ere decade d'avril", day(4, 1, 10)],
    ['mai décade 3', day(5, 21, 31)],
    ['fin févr.', day(2, 21, 28)],
    ['5 de março de 2028', day(3, 5, 5, 2028)],
    ['meados de setembro', day(9, 11, 20)],
    ['1.ª dezena de março', day(3, 1, 10)],
    ['março dezena 1', day(3, 1, 10)],
    ['tarehe 14 Juni', day(6, 14)],
    ['mwishoni mwa Desemba', day(12, 21, 31)],
    ['Desemba dekadi 1', day(12, 1, 10)],
    ['14th of June', day(6, 14)],
    ['14th in June', { kind: 'problem', problem: 'unknown-sign-words' }],
    ['3rd June', day(6, 3)],
    ['late June', day(6, 21, 30)],
    ['31 de junio', { kind: 'problem', problem: 'no-such-day-6' }],
  ])('%j', (text, meant) => {
    expect(dateCell(text, facts)).toEqual(meant);
  });

  const JUNE = { type: 'sky', spec: { kind: 'sun-season', season: 'june-solstice' }, occurrence: 1 };
  const CLUSTER = { type: 'star', markerKey: 'pleiades', phenomenon: 'heliacal-rising' };
  it.each([
    ['10 days before the June solstice', JUNE, -10],
    ['7 days after Pleiades, first morning', CLUSTER, 7],
    ['10 días antes del solsticio de junio', JUNE, -10],
    ['7 días después de las Cabrillas, primera mañana', CLUSTER, 7],
    ['10 jours avant le solstice de juin', JUNE, -10],
    ['1 jour après les Pléiades, premier matin', CLUSTER, 1],
    ['10 dias antes do solstício de junho', JUNE, -10],
    ['7 dias depois das Plêiades, primeira manhã', CLUSTER, 7],
    ['siku 10 kabla ya solstisi ya Juni', JUNE, -10],
    ['siku 7 baada ya Kilimia, asubuhi ya kwanza', CLUSTER, 7],
  ])('counted from a sign: %j', (text, sign, offsetDays) => {
    expect(dateCell(text, facts)).toEqual({ kind: 'sign', sign, offsetDays });
  });

  it('is no day after something that no list knows', () => {
    expect(dateCell('7 days after the feast', facts)).toEqual({
      ...{ kind: 'problem', problem: 'unknown-sign-words' },
    });
  });
});
