import type { MoonRow, MoonTable } from '#shared/contracts/moons.js';
import type { Place } from '#shared/contracts/places.js';
import type { CivilDay } from '#shared/contracts/stars.js';
import { csvText, type CsvCell } from '#shared/kernel/csv.js';
import { DEFAULT_LANGUAGE } from '#shared/locales/languages.js';
import { fileNameOf } from '../../print/file-name.js';
import { translatorFor, type Translate } from '../../print/translator.js';

/** Spreadsheets read village names rightly only after this mark. */
const UTF8_MARK = '\ufeff';
const FIRST_GREGORIAN_YEAR = 1583;

type Column = [title: string, cellOf: (row: MoonRow) => CsvCell];

/**
 * The Moons as a file: one line a Moon under one line of titles. What the dates rest on, how to cite them and the
 * caution stand in columns of their own on every line, so that a line that is copied out alone keeps them.
 */
export function moonsCsv(place: Place, table: MoonTable): { text: string; fileName: string } {
  const t = translatorFor(DEFAULT_LANGUAGE, 'files');
  const columns = columnsOf(t, place, table);
  const rows = [
    columns.map(([title]) => title),
    ...table.moons.map((row) => columns.map(([, cellOf]) => cellOf(row))),
  ];
  const name = t('moonsCsv.fileName', { place: place.name, year: table.year });
  return { text: UTF8_MARK + csvText(rows), fileName: fileNameOf(name, 'csv') };
}

function columnsOf(t: Translate, place: Place, table: MoonTable): Column[] {
  const { year, rule, engineVersion } = table;
  const calendar = year >= FIRST_GREGORIAN_YEAR ? 'gregorian' : 'julian';
  const dayOf = (day: CivilDay | null): CsvCell => day && day[calendar];
  const column = (title: string, cellOf: (row: MoonRow) => CsvCell): Column => [
    t(`moonsCsv.${title}`),
    cellOf,
  ];
  const constant = (title: string, value: CsvCell): Column => column(title, () => value);
  return [
    column('month', ({ month }) => month && month.number),
    column('localYear', ({ month }) => month && month.localYear),
    column('monthBegins', ({ month }) => dayOf(month && month.begins)),
    column('monthRemark', (row) => monthRemark(t, row)),
    column('newMoon', ({ newMoon }) => dayOf(newMoon)),
    column('newMoonTime', ({ newMoon }) => newMoon.localTime),
    column('crescent', ({ firstCrescent }) => dayOf(firstCrescent.expected)),
    column('crescentEarly', ({ firstCrescent }) => dayOf(firstCrescent.early)),
    column('crescentLate', ({ firstCrescent }) => dayOf(firstCrescent.late)),
    column('crescentRemark', (row) => crescentRemark(t, row)),
    column('fullMoon', ({ fullMoon }) => dayOf(fullMoon)),
    column('fullMoonTime', ({ fullMoon }) => fullMoon.localTime),
    constant('calendar', t(`starsCsv.calendars.${calendar}`)),
    constant('timeZone', place.timeZone),
    constant('place', place.name),
    constant('year', year),
    constant('rule', rule && ruleWords(t, rule)),
    constant('cite', t('moonsCsv.citation', { engineVersion, place: place.name, year })),
    constant('caution', t('moonsCsv.cautionText')),
  ];
}

function ruleWords(t: Translate, rule: NonNullable<MoonTable['rule']>): string {
  const sky = translatorFor(DEFAULT_LANGUAGE, 'sky');
  const { marker, phenomenon, signMonth, begins } = rule;
  return t('moonsCsv.ruleWords', {
    star: marker.name === '' ? marker.designation : marker.name,
    phenomenon: sky(`phenomenon.${phenomenon}`),
    month: signMonth,
    begins: t(`moonsCsv.begins.${begins}`),
  });
}

function monthRemark(t: Translate, { month }: MoonRow): string {
  if (!month) return '';
  const codes = [
    month.thirteenth && 'thirteenth',
    month.holdsSign && 'holdsSign',
    month.signNearEdge && 'signNearEdge',
  ].filter((code) => code !== false);
  return codes.map((code) => t(`moonsCsv.monthNote.${code}`)).join('; ');
}

function crescentRemark(t: Translate, { firstCrescent: { outcome, expected, notes } }: MoonRow): string {
  if (!expected) return t(`moonsCsv.none.${outcome}`);
  return [t(`moonsCsv.word.${expected.word}`), ...notes.map((note) => t(`moonsCsv.note.${note}`))].join('; ');
}
