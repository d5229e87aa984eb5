import type { ImportDateFacts } from '#shared/calendar/import-dates.js';
import { entryLead, PLANNED_DAYS, type EntryLead } from '#shared/contracts/entry-lead.js';
import type { ImportColumn } from '#shared/contracts/imports.js';
import { fieldErrors } from '../../http/field-errors.js';
import { cellOf, fixedDay, sourceOf, type Cells, type LineProblem, type Timing } from './table-cells.js';

type OwnLead = Omit<Timing, 'offsets'>;

/** What leads a line of a table that the product itself wrote: each kind in the columns of `csv-columns.ts`. */
export function ownLead(cells: Cells, facts: ImportDateFacts): OwnLead {
  const type = cellOf(cells, 'leadType');
  if (type === 'entry-planned' || type === 'entry-actual') return hanging(type, cells);
  const raw = rawLead(type, cells, facts);
  if ('problems' in raw) return amiss(raw.problems);
  const lead = entryLead.safeParse(raw.lead);
  if (!lead.success) {
    return amiss(
      fieldErrors(lead.error.issues).map(({ field, code }) => ({
        column: LEAD_COLUMNS[field.split('.')[0] ?? ''] ?? ('leadType' as const),
        code,
      })),
    );
  }
  // Ids mean nothing in a table: another entry is named by its number.
  if ('entryId' in lead.data) return amiss([{ column: 'leadEntry', code: 'which-entry' }]);
  return led(lead.data);
}

function hanging(type: 'entry-planned' | 'entry-actual', cells: Cells): OwnLead {
  const name = cellOf(cells, 'leadEntry');
  if (name === '') return amiss([{ column: 'leadEntry', code: 'which-entry' }]);
  const day =
    type === 'entry-actual' ? 'actual' : PLANNED_DAYS.find((each) => each === cellOf(cells, 'leadDay'));
  if (day === undefined) return amiss([{ column: 'leadDay', code: 'not-in-list' }]);
  return { lead: null, hangsOn: { name, day, column: 'leadEntry' }, problems: [] };
}

function rawLead(
  type: string,
  cells: Cells,
  facts: ImportDateFacts,
): { lead: unknown } | { problems: LineProblem[] } {
  const cell = (column: ImportColumn) => cellOf(cells, column);
  const day = (column: ImportColumn) => {
    const { date, problem } = fixedDay(cell(column), facts);
    return { date: date ?? undefined, problems: problem === null ? [] : [{ column, code: problem }] };
  };
  if (type === 'marker') {
    const occurrence = Number(cell('leadOccurrence') || 1);
    return {
      lead: { type, markerKey: cell('leadMarker'), phenomenon: cell('leadPhenomenon'), occurrence },
    };
  }
  if (type === 'fixed-date') {
    const { date, problems } = day('leadDate');
    return problems.length > 0 ? { problems } : { lead: { type, date, source: sourceOf(cells) } };
  }
  if (type === 'nature-sign' && cell('leadOther') !== '' && !cell('leadOther').startsWith('{')) {
    const from = day('usualFrom');
    const to = day('usualTo');
    const problems = [...from.problems, ...to.problems];
    const usual = { from: from.date, to: to.date };
    return problems.length > 0
      ? { problems }
      : { lead: { type, name: cell('leadOther'), usual, source: sourceOf(cells) } };
  }
  try {
    return { lead: JSON.parse(cell('leadOther')) as unknown };
  } catch {
    return { problems: [{ column: 'leadOther', code: 'not-in-list' }] };
  }
}

const LEAD_COLUMNS: Readonly<Record<string, ImportColumn>> = {
  markerKey: 'leadMarker',
  phenomenon: 'leadPhenomenon',
  occurrence: 'leadOccurrence',
  date: 'leadDate',
  source: 'leadSource',
  usual: 'usualFrom',
  name: 'leadOther',
};

function led(lead: EntryLead): OwnLead {
  return { lead, hangsOn: null, problems: [] };
}

function amiss(problems: LineProblem[]): OwnLead {
  return { lead: null, hangsOn: null, problems };
}
