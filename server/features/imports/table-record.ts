import { plainWords } from '#shared/calendar/import-dates.js';
import { EMPTY_RECORD, type EventRecord, type TextCheck } from '#shared/contracts/event-record.js';
import type { ImportColumn } from '#shared/contracts/imports.js';
import { sameJson } from '#shared/kernel/canonical-json.js';
import { partsOfCell } from '#shared/kernel/cell-parts.js';
import { cellOf, fixedDay, pastDay, type Cells, type LineProblem, type TableFacts } from './table-cells.js';
import { mustHaveOf, signsOfCell } from './table-signs.js';

/** What a line says beside its name and its days, still to be held against the contract; undefined where it says nothing. */
export function recordOfLine(
  cells: Cells,
  facts: TableFacts,
): { record: EventRecord | undefined; problems: LineProblem[] } {
  const problems: LineProblem[] = [];
  const amiss = (column: ImportColumn, code: string) => {
    problems.push({ column, code });
    return null;
  };
  const cell = (column: ImportColumn) => cellOf(cells, column);
  const number = (column: ImportColumn, code: string): number | null => {
    const text = cell(column).replace('−', '-');
    if (text === '') return null;
    return /^[+-]?\d{1,5}$/u.test(text) ? Number(text) : amiss(column, code);
  };
  const days = (column: ImportColumn) => number(column, 'whole-days');
  const code = <C extends string>(column: ImportColumn, words: ReadonlyMap<string, C>, problem: string) => {
    const text = plainWords(cell(column));
    return text === '' ? null : (words.get(text) ?? amiss(column, problem));
  };
  const { codes } = facts;
  const { list, problem: signProblem } = signsOfCell(cells, facts);
  if (signProblem !== null) amiss('signs', signProblem);
  const mustHave = mustHaveOf(cell('mustHaveSign'), list);
  if (mustHave === 'unknown') amiss('mustHaveSign', 'which-sign');
  const heard = pastDay(cell('heardDay'), facts);
  if (heard.problem !== null) amiss('heardDay', heard.problem);
  const stop = stopOf(cells, facts, amiss);
  const everyYears = number('everyYears', 'years-apart');
  const sinceYear = number('sinceYear', 'not-a-number');
  const repeats = code('repeats', codes.repeats, 'unknown-repeats');
  const record: EventRecord = {
    what: {
      ...workOf(cells, facts, amiss),
      variety: {
        ...{ name: cell('variety'), fromDays: days('varietyFromDays'), toDays: days('varietyToDays') },
      },
      land: cell('land'),
    },
    when: {
      ...{ leadDays: days('readyDays'), graceDays: days('graceDays') },
      repeats: repeats ?? repeatsBy(everyYears, cell('repeatRule')),
      ...{ everyYears, rule: cell('repeatRule') },
    },
    signs: {
      list,
      needed: number('signsNeeded', 'signs-needed'),
      mustHave: mustHave === 'unknown' ? null : mustHave,
    },
    work: {
      ...{ responsible: cell('responsible'), helpers: cell('helpers') },
      ...{ decides: cell('decides'), owns: cell('owns'), inputs: cell('inputs') },
      ...{ ifEarly: cell('ifEarly'), ifLaterStill: cell('ifLaterStill'), stop, askWhom: cell('askWhom') },
    },
    trust: {
      confidence: code('confidence', codes.confidences, 'unknown-confidence'),
      by: cell('confidenceBy'),
      basis: code('basis', codes.bases, 'unknown-basis'),
      ...(sinceYear !== null && { sinceYear }),
    },
    heard: { where: cell('heardWhere'), day: heard.day, language: cell('heardLanguage') },
    checked: {
      work: checkOf('checkedWork', cells, facts, amiss),
      safety: checkOf('checkedSafety', cells, facts, amiss),
      late: checkOf('checkedLate', cells, facts, amiss),
    },
  };
  return { record: sameJson(record, EMPTY_RECORD) ? undefined : record, problems };
}

type Amiss = (column: ImportColumn, code: string) => null;

/** A word of the village comes before those of every language; words of its own alone are something else. */
function workOf(
  cells: Cells,
  { codes, villageOperations }: TableFacts,
  amiss: Amiss,
): Pick<EventRecord['what'], 'operation' | 'ownOperation' | 'operationWord'> {
  const said = plainWords(cellOf(cells, 'operation'));
  const ownOperation = cellOf(cells, 'ownOperation');
  if (said === '') return { operation: ownOperation === '' ? null : 'other', ownOperation };
  const ofVillage = villageOperations.get(said);
  // "Something else" is always said in words.
  if (ofVillage?.operation === 'other') return { ownOperation: ofVillage.operationWord.word, ...ofVillage };
  if (ofVillage !== undefined) return { ownOperation, ...ofVillage };
  return { operation: codes.operations.get(said) ?? amiss('operation', 'unknown-operation'), ownOperation };
}

function repeatsBy(everyYears: number | null, rule: string): EventRecord['when']['repeats'] {
  if (everyYears !== null) return 'every-n-years';
  return rule === '' ? 'yearly' : 'some-years';
}

function stopOf(cells: Cells, facts: TableFacts, amiss: Amiss): EventRecord['work']['stop'] {
  const { date, problem } = fixedDay(cellOf(cells, 'stopDate'), facts);
  const source = cellOf(cells, 'stopSource');
  if (problem !== null) return amiss('stopDate', problem);
  if (date === null) return source === '' ? null : amiss('stopDate', 'stop-needs-date');
  return source === '' ? amiss('stopSource', 'stop-needs-source') : { date, source };
}

function checkOf(column: ImportColumn, cells: Cells, facts: TableFacts, amiss: Amiss): TextCheck | null {
  const [parts, ...more] = partsOfCell(cellOf(cells, column));
  if (parts === undefined) return null;
  const [name = '', office = '', day = '', ...rest] = parts;
  const read = pastDay(day, facts);
  if (more.length > 0 || rest.length > 0 || name === '' || office === '' || read.day === null) {
    return amiss(column, 'check-parts');
  }
  return { office, name, day: read.day };
}

/** Columns by where a record keeps what they say; what is longest counts. */
const COLUMNS: readonly (readonly [path: string, column: ImportColumn])[] = [
  ['what.operation', 'operation'],
  ['what.ownOperation', 'ownOperation'],
  ['what.variety.fromDays', 'varietyFromDays'],
  ['what.variety.toDays', 'varietyToDays'],
  ['what.variety', 'variety'],
  ['what.land', 'land'],
  ['when.leadDays', 'readyDays'],
  ['when.graceDays', 'graceDays'],
  ['when.everyYears', 'everyYears'],
  ['when.rule', 'repeatRule'],
  ['when', 'repeats'],
  ['signs.needed', 'signsNeeded'],
  ['signs.mustHave', 'mustHaveSign'],
  ['signs', 'signs'],
  ['work.helpers', 'helpers'],
  ['work.decides', 'decides'],
  ['work.owns', 'owns'],
  ['work.inputs', 'inputs'],
  ['work.ifEarly', 'ifEarly'],
  ['work.ifLaterStill', 'ifLaterStill'],
  ['work.stop.source', 'stopSource'],
  ['work.stop', 'stopDate'],
  ['work.askWhom', 'askWhom'],
  ['work', 'responsible'],
  ['trust.by', 'confidenceBy'],
  ['trust.basis', 'basis'],
  ['trust.sinceYear', 'sinceYear'],
  ['trust', 'confidence'],
  ['heard.day', 'heardDay'],
  ['heard.language', 'heardLanguage'],
  ['heard', 'heardWhere'],
  ['checked.safety', 'checkedSafety'],
  ['checked.late', 'checkedLate'],
  ['checked', 'checkedWork'],
];

/** The column of a field of a record, such as `what.variety.toDays`. */
export function recordColumn(field: string): ImportColumn {
  return COLUMNS.find(([path]) => field === path || field.startsWith(`${path}.`))?.[1] ?? 'operation';
}
