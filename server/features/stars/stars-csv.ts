import type { MarkerRow, OccurrenceDays } from '#shared/contracts/stars.js';
import type { Place } from '#shared/contracts/places.js';
import { csvText, type CsvCell } from '#shared/kernel/csv.js';
import { DEFAULT_LANGUAGE } from '#shared/locales/languages.js';
import { ENGINE_VERSION, PHENOMENA, THRESHOLD_SET_FACTS, type Phenomenon } from '#shared/sky/index.js';
import { fileNameOf } from '../../print/file-name.js';
import { translatorFor, type Translate } from '../../print/translator.js';

/** Spreadsheets read Greek letters and village names rightly only after this mark. */
const UTF8_MARK = '\ufeff';
/** Years before it are Julian ones, and so are their dates in the table. */
const FIRST_GREGORIAN_YEAR = 1583;

interface Table {
  year: number;
  items: readonly MarkerRow[];
}

type Column = [title: string, cellOf: (row: MarkerRow) => CsvCell];

/**
 * The star table as a file: one line a marker under one line of titles, always the same columns. What the dates rest
 * on and the caution stand in columns of their own on every line: there they survive sorting, filtering and a line
 * that is copied out alone, and a program reads the file without skipping anything.
 */
export function starsCsv(place: Place, table: Table): { text: string; fileName: string } {
  const columns = columnsOf(place, table);
  const rows = [
    columns.map(([title]) => title),
    ...table.items.map((row) => columns.map(([, cellOf]) => cellOf(row))),
  ];
  const name = translatorFor(DEFAULT_LANGUAGE, 'files')('starsCsv.fileName', {
    place: place.name,
    year: table.year,
  });
  return { text: UTF8_MARK + csvText(rows), fileName: fileNameOf(name, 'csv') };
}

function columnsOf(place: Place, { year }: Table): Column[] {
  const t = translatorFor(DEFAULT_LANGUAGE, 'files');
  const sky = translatorFor(DEFAULT_LANGUAGE, 'sky');
  const calendar = year >= FIRST_GREGORIAN_YEAR ? 'gregorian' : 'julian';
  const ofPhenomenon = (phenomenon: Phenomenon) => ({ phenomenon: sky(`phenomenon.${phenomenon}`) });
  const constant = (title: string, value: CsvCell): Column => [t(title), () => value];
  return [
    [t('starsCsv.kind'), (row) => t(`starsCsv.kinds.${row.kind}`)],
    [t('starsCsv.name'), (row) => row.name],
    [t('starsCsv.designation'), (row) => row.designation],
    [t('starsCsv.hr'), (row) => row.hr],
    [t('starsCsv.magnitude'), (row) => row.vMag],
    [t('starsCsv.does'), (row) => t(`starsCsv.outcome.${row.outcomeDetail ?? row.outcome}`)],
    [t('starsCsv.nightsHidden'), (row) => row.nightsHidden],
    [t('starsCsv.notes'), (row) => notes(t, row.notes)],
    constant('starsCsv.calendar', t(`starsCsv.calendars.${calendar}`)),
    ...PHENOMENA.flatMap((phenomenon): Column[] => {
      const first = (row: MarkerRow) => row.phenomena[phenomenon].occurrences[0];
      return [
        ...rangeColumns(t, ['expected', 'early', 'late'], ofPhenomenon(phenomenon), calendar, first),
        [t('starsCsv.dayNumber', ofPhenomenon(phenomenon)), (row) => first(row)?.expected.dayNumber ?? null],
        [t('starsCsv.remark', ofPhenomenon(phenomenon)), (row) => remark(t, row, phenomenon)],
      ];
    }),
    ...PHENOMENA.flatMap((phenomenon) =>
      rangeColumns(
        t,
        ['secondExpected', 'secondEarly', 'secondLate'],
        ofPhenomenon(phenomenon),
        calendar,
        (row) => row.phenomena[phenomenon].occurrences[1],
      ),
    ),
    constant('starsCsv.place', place.name),
    constant('starsCsv.year', year),
    constant('starsCsv.basis', basis(t, place)),
    constant('starsCsv.cite', `${t('starsCsv.citation', { place: place.name, year })} ${basis(t, place)}`),
    constant('starsCsv.caution', t('caution')),
  ];
}

function rangeColumns(
  t: Translate,
  [expected, early, late]: readonly [string, string, string],
  values: { phenomenon: string },
  calendar: 'gregorian' | 'julian',
  occurrenceOf: (row: MarkerRow) => OccurrenceDays | undefined,
): Column[] {
  return [
    [t(`starsCsv.${expected}`, values), (row) => occurrenceOf(row)?.expected[calendar] ?? null],
    [t(`starsCsv.${early}`, values), (row) => occurrenceOf(row)?.early?.[calendar] ?? null],
    [t(`starsCsv.${late}`, values), (row) => occurrenceOf(row)?.late?.[calendar] ?? null],
  ];
}

/** Why there is no date, or what stands beside it. */
function remark(t: Translate, row: MarkerRow, phenomenon: Phenomenon): string {
  if (row.outcome !== 'rises-and-sets') return t(`starsCsv.outcome.${row.outcomeDetail ?? row.outcome}`);
  const { outcome, occurrences } = row.phenomena[phenomenon];
  if (outcome !== 'dated') return t(`starsCsv.none.${outcome}`);
  return notes(t, occurrences[0]?.notes ?? []);
}

function notes(t: Translate, codes: readonly string[]): string {
  return codes.map((code) => t(`starsCsv.note.${code}`)).join('; ');
}

function basis(t: Translate, place: Place): string {
  const { sameSideShiftDeg, oppositeSideShiftDeg, skyline, skylineRule, thresholdSet } = place;
  return t('basis', {
    engineVersion: ENGINE_VERSION,
    rule: THRESHOLD_SET_FACTS[thresholdSet].source,
    sameSideShiftDeg,
    oppositeSideShiftDeg,
    skylineRule: t(`skylineRule.${skyline.length === 0 ? 'flat' : skylineRule}`),
  });
}
