import { plainWords } from '#shared/calendar/import-dates.js';
import type { RecordSign } from '#shared/contracts/event-record.js';
import { sameJson } from '#shared/kernel/canonical-json.js';
import { partsOfCell } from '#shared/kernel/cell-parts.js';
import { areSwapped, cellOf, fixedDay, type Cells, type TableFacts } from './table-cells.js';

const SIGN_PARTS = 7;

/**
 * Signs of one cell: kind, name, what to look for, where, usual from, usual to, still seen. One whose name stands in the
 * village's list is that one, unless the line says something else of it.
 */
export function signsOfCell(cells: Cells, facts: TableFacts): { list: RecordSign[]; problem: string | null } {
  const read = partsOfCell(cellOf(cells, 'signs')).map((parts) => signOf(parts, cells, facts));
  const [problem = null] = read.filter((each) => typeof each === 'string');
  return { list: read.filter((each) => typeof each !== 'string'), problem };
}

/** The sign's place in the list, by its number in the cell or by its name. */
export function mustHaveOf(cell: string, list: readonly RecordSign[]): number | null | 'unknown' {
  if (cell === '') return null;
  const isNumber = /^\d{1,2}$/u.test(cell);
  const index = isNumber
    ? Number(cell) - 1
    : list.findIndex(({ name }) => plainWords(name) === plainWords(cell));
  return list[index] === undefined ? 'unknown' : index;
}

function signOf(parts: readonly string[], cells: Cells, facts: TableFacts): RecordSign | string {
  const [kind = '', name = '', look = '', where = '', usualFrom = '', usualTo = '', still = ''] = parts;
  const { signTypes, stillSeen: seenWords } = facts.codes;
  if (name === '' || parts.length > SIGN_PARTS) return 'sign-parts';
  const type = signTypes.get(plainWords(kind));
  if (type === undefined) return 'unknown-sign-kind';
  const from = fixedDay(usualFrom, facts, 'first');
  const to = fixedDay(usualTo, facts, 'last');
  const problem = from.problem ?? to.problem;
  if (problem !== null) return problem;
  if ((from.date === null) !== (to.date === null)) return 'sign-parts';
  if (areSwapped(from, to, cells)) return 'swapped-usual';
  const usual = from.date && to.date && { from: from.date, to: to.date };
  const stillSeen = still === '' ? null : seenWords.get(plainWords(still));
  if (stillSeen === undefined) return 'unknown-still-seen';
  const own: RecordSign = { type, name, look, where, usual, stillSeen };
  const listed = facts.listedSigns.get(plainWords(name));
  return listed !== undefined && saysNoOther(own, listed) ? listed : own;
}

function saysNoOther(own: RecordSign, listed: RecordSign): boolean {
  const same = (said: string, there: string) => said === '' || said === there;
  return (
    own.type === listed.type &&
    same(own.look, listed.look) &&
    same(own.where, listed.where) &&
    (own.usual === null || sameJson(own.usual, listed.usual)) &&
    (own.stillSeen === null || own.stillSeen === listed.stillSeen)
  );
}
