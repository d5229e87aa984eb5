import { describe, expect, it } from 'vitest';
import { markerKeysByName, tableWordsOf, type ImportLocale } from '#server/features/imports/import-words.js';
import type { TableFacts } from '#server/features/imports/table-cells.js';
import { tablePlan } from '#server/features/imports/table-plan.js';
import { en } from '#shared/locales/index.js';
import { tableTexts } from '#shared/locales/tables.js';
import { columnWordsOf, type ColumnTexts } from '#src/features/imports/model/column-words.js';
import { guessColumns, matchedLines } from '#src/features/imports/model/match-columns.js';
import { readTable } from '#src/features/imports/model/read-table.js';
import { templateCsv } from '#src/features/imports/model/template.js';

/** A language that nobody speaks: another folder of texts is all that a new language needs. */
const MADE_UP: ColumnTexts = {
  column: { when: 'zeg of dag', titleOfficer: 'nom po buro', kind: 'sort', bestFrom: 'gut ab' },
  alias: { otherSigns: 'zegnu' },
  template: {
    lines: {
      one: {
        number: '1',
        titleOfficer: 'Zuy: sarol',
        kind: 'fel',
        when: 'Zuj, urm matin',
        bestFromDays: '7',
      },
      two: {
        number: '2',
        titleOfficer: 'Zuy: wedol',
        kind: 'fel',
        when: 'farit dag vo 1',
        bestFromDays: '19',
      },
      three: { titleOfficer: 'Zuy: klozol', kind: 'hus', bestFrom: '20 Nuvu', bestTo: 'Dezu dekad 1' },
      four: { titleOfficer: 'Zuy: hakol', kind: 'fel', when: 'Zuj sudo ab 21:00', bestFromDays: '0' },
    },
  },
};
const WORDS: ImportLocale = {
  words: {
    months: 'Yanu|Febu|Marzu|Apru|Mayu|Yunu|Yulu|Augu|Septu|Oktu|Nuvu|Dezu',
    phenomena: {
      'heliacal-rising': 'urm matin',
      ...{ 'cosmical-setting': '', 'acronychal-rising': '', 'heliacal-setting': '' },
    },
    fixedDate: 'fik dag',
    days: { day: '{{day}} vo {{month}}' },
    offsets: { before: '{{count}} dagu ap {{sign}}' },
    figures: { pleiades: 'Zuj' },
    phrases: {
      'due-meridian': { south: '{{star}} sudo ab {{hour}}' },
      entry: { actual: 'farit dag vo {{entry}}' },
    },
    kinds: { ...tableTexts.en.words.kinds, farm: 'fel', household: 'hus' },
    yes: 'si',
    codes: { operations: { sow: 'sarol' } },
  },
};

const { calendars, record, sky } = en;
const ENGLISH: ImportLocale = {
  words: tableTexts.en.words,
  names: {
    codes: { repeats: record.repeats, confidences: record.confidence, bases: record.basis },
    ...{ kinds: calendars.kind, phenomena: sky.phenomenon, signs: sky.sign },
  },
};

const words = tableWordsOf([WORDS, ENGLISH]);
const facts: TableFacts = {
  ...{ kinds: words.kinds, yes: words.yes, codes: words.codes, words: words.dates },
  ...{ dayOrder: null, calendarYear: 2027, latitudeDeg: 12 },
  markerKeyOf: new Map([...markerKeysByName([], new Map()), ...words.figures]),
  ...{
    natureSigns: new Map(),
    villageKinds: new Map(),
    villageOperations: new Map(),
    listedSigns: new Map(),
  },
};
const planOf = (languages: readonly ColumnTexts[], text: string) => {
  const table = readTable(text);
  const lines = matchedLines(table, guessColumns(table.titles, columnWordsOf(languages).titles));
  return tablePlan(lines, facts, []);
};
const templateIn = (languages: readonly ColumnTexts[]) => {
  const { titleOf } = columnWordsOf(languages);
  return templateCsv(titleOf, Object.values(languages[0]?.template.lines ?? {}));
};

describe('a table in another language', () => {
  it('has a template of its own from its texts alone, every line of which comes in', () => {
    const template = templateIn([MADE_UP, tableTexts.en]);
    expect(template.split('\r\n')[0]).toMatch(/nom po buro,sort,.*zeg of dag,/u);
    const plan = planOf([MADE_UP, tableTexts.en], template);
    expect(plan.map(({ problems }) => problems)).toEqual([[], [], [], []]);
    const contents = plan.map(({ entry }) => entry?.content);
    expect(contents.map((content) => [content?.kind, content?.lead.type])).toEqual([
      ['farm', 'marker'],
      ['farm', 'entry-actual'],
      ['household', 'fixed-date'],
      ['farm', 'sky'],
    ]);
    expect(contents[1]?.lead).toEqual({ type: 'entry-actual', entryId: plan[0]?.entry?.id });
    expect(contents[2]?.lead).toMatchObject({ date: { month: 11, day: 20 } });
  });

  it('leaves the tables of every other language as they were', () => {
    const plan = planOf([MADE_UP, tableTexts.en], templateIn([tableTexts.en]));
    expect(plan.map(({ problems }) => problems)).toEqual([[], [], []]);
    expect(plan.map(({ entry }) => entry?.content.lead.type)).toEqual([
      ...['marker', 'entry-actual', 'fixed-date'],
    ]);
  });
});
