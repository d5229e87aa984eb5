import { dateCell, type DateCell, type ImportDateFacts } from '#shared/calendar/import-dates.js';
import {
  WINDOW_DAYS,
  windowOfCells,
  type OffsetColumn,
  type WindowDay,
} from '#shared/calendar/import-window.js';
import type { NamedSign } from '#shared/calendar/import-signs.js';
import { dayOfEveryYear, usualDays } from '#shared/calendar/usual-days.js';
import { entryLead, type EntryOffsets } from '#shared/contracts/calendars.js';
import type { ImportColumn } from '#shared/contracts/imports.js';
import { fieldErrors } from '../../http/field-errors.js';
import { ownLead } from './own-lead.js';
import {
  areSwapped,
  cellOf,
  fixedDay,
  sourceOf,
  type Cells,
  type LineProblem,
  type Timing,
} from './table-cells.js';

/** By the columns of our own CSV where they are there, else by words and days. */
export function timingOf(cells: Cells, facts: ImportDateFacts): Timing {
  const numbers = numbersOf(cells);
  if (numbers.problems.length > 0) return amiss(numbers.problems);
  if (cellOf(cells, 'leadType') !== '') {
    const { earliestDays, bestFromDays, bestToDays, lastAdvisedDays } = numbers.days;
    return {
      ...ownLead(cells, facts),
      offsets: {
        ...{ earliestDays: earliestDays ?? 0, bestFromDays: bestFromDays ?? 0 },
        ...{ bestToDays: bestToDays ?? 0, lastAdvisedDays: lastAdvisedDays ?? 0 },
      },
    };
  }
  const day = (column: ImportColumn): DateCell => dateCell(cells[column] ?? '', facts);
  const days = Object.fromEntries(WINDOW_DAYS.map((name) => [name, day(name)])) as Record<
    WindowDay,
    DateCell
  >;
  const read = windowOfCells({ when: day('when'), days, offsetsDays: numbers.days });
  if (!('lead' in read))
    return amiss(read.problems.map(({ column, problem }) => ({ column, code: problem })));
  const { lead, offsets } = read;
  if (lead.type === 'day')
    return led({ type: 'fixed-date', date: lead.date, source: sourceOf(cells) }, offsets);
  if (lead.type === 'entry') {
    const { name, day: of } = lead;
    return { lead: null, hangsOn: { name, day: of, column: 'when' }, offsets, problems: [] };
  }
  if (lead.type === 'nature') return natureTiming(lead.name, cells, days, offsets, facts);
  return led(lead.type === 'star' ? starLead(lead, cells) : skyLead(lead, cells), offsets);
}

function starLead({ markerKey, phenomenon }: Extract<NamedSign, { type: 'star' }>, cells: Cells): unknown {
  return { type: 'marker', markerKey, phenomenon, occurrence: occurrenceOf(cells) ?? 1 };
}

function skyLead({ spec, occurrence }: Extract<NamedSign, { type: 'sky' }>, cells: Cells): unknown {
  return { type: 'sky', spec, occurrence: occurrenceOf(cells) ?? occurrence };
}

function occurrenceOf(cells: Cells): number | null {
  const text = cellOf(cells, 'leadOccurrence');
  return text === '' ? null : Number(text);
}

/** Its usual days are said, or are what the line's own days come to. */
function natureTiming(
  name: string,
  cells: Cells,
  days: Record<WindowDay, DateCell>,
  offsets: EntryOffsets,
  facts: ImportDateFacts,
): Timing {
  const from = fixedDay(cellOf(cells, 'usualFrom'), facts, 'first');
  const to = fixedDay(cellOf(cells, 'usualTo'), facts, 'last');
  const problems = [
    ...(from.problem === null ? [] : [{ column: 'usualFrom' as const, code: from.problem }]),
    ...(to.problem === null ? [] : [{ column: 'usualTo' as const, code: to.problem }]),
  ];
  if (problems.length > 0) return amiss(problems);
  if (areSwapped(from, to, cells)) {
    return amiss([
      { column: 'usualFrom', code: 'swapped-first' },
      { column: 'usualTo', code: 'swapped-second' },
    ]);
  }
  const best = { from: dayOfEveryYear(days.bestFrom, 'first'), to: dayOfEveryYear(days.bestTo, 'last') };
  const usual = usualDays({ from: from.date, to: to.date }, best, offsets);
  if (usual === null) return amiss([{ column: 'usualFrom', code: 'usual-days-missing' }]);
  return led({ type: 'nature-sign', name, usual, source: sourceOf(cells) }, offsets);
}

function led(raw: unknown, offsets: EntryOffsets): Timing {
  const lead = entryLead.safeParse(raw);
  if (lead.success) return { lead: lead.data, hangsOn: null, offsets, problems: [] };
  return amiss(fieldErrors(lead.error.issues).map(({ code }) => ({ column: 'when' as const, code })));
}

function amiss(problems: LineProblem[]): Timing {
  return { lead: null, hangsOn: null, offsets: null, problems };
}

function numbersOf(cells: Cells): { days: Record<OffsetColumn, number | null>; problems: LineProblem[] } {
  const problems: LineProblem[] = [];
  const number = (column: OffsetColumn): number | null => {
    const text = cellOf(cells, column).replace('−', '-');
    if (text === '') return null;
    if (/^[+-]?\d{1,3}$/u.test(text)) return Number(text);
    problems.push({ column, code: 'whole-days' });
    return null;
  };
  const days = {
    earliestDays: number('earliestDays'),
    bestFromDays: number('bestFromDays'),
    bestToDays: number('bestToDays'),
    lastAdvisedDays: number('lastAdvisedDays'),
  };
  return { days, problems };
}
