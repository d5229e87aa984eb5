import type { CalendarCsvColumn } from '#shared/calendar/csv-columns.js';
import type { MonthDay } from '#shared/contracts/common.js';
import type { EventRecord, RecordSign, TextCheck } from '#shared/contracts/event-record.js';
import type { CsvCell } from '#shared/kernel/csv.js';
import { partsCell } from '#shared/kernel/cell-parts.js';

/** What an event says beside its name and its days, in the columns of its table. */
export function recordCells(record: EventRecord): Partial<Record<CalendarCsvColumn, CsvCell>> {
  const { what, when, signs, work, trust, heard, checked } = record;
  const { responsible, helpers, decides, owns, inputs, ifEarly, ifLaterStill, stop, askWhom } = work;
  return {
    operation: what.operationWord?.word ?? what.operation,
    ...{ ownOperation: what.ownOperation, land: what.land },
    variety: what.variety.name,
    varietyFromDays: what.variety.fromDays,
    varietyToDays: what.variety.toDays,
    ...{ readyDays: when.leadDays, graceDays: when.graceDays },
    ...{ repeats: when.repeats, everyYears: when.everyYears, repeatRule: when.rule },
    signs: partsCell(signs.list.map(signParts)),
    signsNeeded: signs.needed,
    mustHaveSign: signs.mustHave === null ? null : signs.mustHave + 1,
    ...{ responsible, helpers, decides, owns, inputs, ifEarly, ifLaterStill, askWhom },
    stopDate: stop && monthDay(stop.date),
    stopSource: stop && stop.source,
    ...{ confidence: trust.confidence, confidenceBy: trust.by, basis: trust.basis },
    sinceYear: trust.sinceYear ?? null,
    ...{ heardWhere: heard.where, heardDay: heard.day, heardLanguage: heard.language },
    checkedWork: checkCell(checked.work),
    checkedSafety: checkCell(checked.safety),
    checkedLate: checkCell(checked.late),
  };
}

export function monthDay({ month, day }: MonthDay): string {
  return [month, day].map((part) => String(part).padStart(2, '0')).join('-');
}

function signParts({ type, name, look, where, usual, stillSeen }: RecordSign): string[] {
  const days = usual === null ? ['', ''] : [monthDay(usual.from), monthDay(usual.to)];
  return [type, name, look, where, ...days, stillSeen ?? ''];
}

function checkCell(check: TextCheck | null): string | null {
  return check && partsCell([[check.name, check.office, check.day]]);
}
