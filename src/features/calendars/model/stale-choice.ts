import type { EntryInput } from '#shared/contracts/calendars.js';
import { PLAIN_DETAILS } from '#shared/contracts/sharing.js';
import { sameJson } from '#shared/kernel/canonical-json.js';
import { RECORD_PART_NAMES, sameRecordPart, withRecordPart, type RecordPart } from './record-parts.js';

/**
 * What is chosen together when two people wrote the same entry. The four days belong together, and so do a last
 * date and its mark: half of the one and half of the other would be an entry that nobody wrote.
 */
export const UNITS = {
  titleOfficer: ['titleOfficer'],
  titleVillage: ['titleVillage'],
  kind: ['kind', 'kindWord'],
  icon: ['icon'],
  crop: ['crop'],
  notes: ['notes'],
  caution: ['caution'],
  lead: ['lead'],
  offsets: ['offsets'],
  lastDate: ['hasLastDate', 'lastDate', 'protectiveWatch'],
  otherSigns: ['otherSigns'],
  ifLate: ['ifLate'],
  giver: ['giver'],
  agreedToPrint: ['agreedToPrint'],
  board: ['board'],
  sharingLevel: ['sharingLevel', 'sharing', 'giverId'],
} as const satisfies Record<string, readonly (keyof EntryInput)[]>;

export type PlainUnit = keyof typeof UNITS;
export type RecordUnit = `record.${RecordPart}`;
/** The record is long: it is chosen part by part, as everything else. */
export type Unit = PlainUnit | RecordUnit;

const PLAIN_UNITS = Object.keys(UNITS) as PlainUnit[];
const ALL_UNITS: readonly Unit[] = [
  ...PLAIN_UNITS,
  ...RECORD_PART_NAMES.map((part): RecordUnit => `record.${part}`),
];

export type Side = 'theirs' | 'mine';
export type Choices = Partial<Record<Unit, Side>>;

/** One part in which the newer saved text and mine differ. */
export interface Clash {
  unit: Unit;
  /** Chosen already where only one of us changed it; null where only the person can say. */
  first: Side | null;
}

/** @param base what I began to write over; null where it is not known any more */
export function clashesOf(base: EntryInput | null, theirs: EntryInput, mine: EntryInput): Clash[] {
  return ALL_UNITS.filter((unit) => !sameUnit(unit, theirs, mine)).map((unit) => {
    if (base === null) return { unit, first: null };
    if (sameUnit(unit, base, mine)) return { unit, first: 'theirs' };
    if (sameUnit(unit, base, theirs)) return { unit, first: 'mine' };
    return { unit, first: null };
  });
}

/** The text that the choices make; null while one is missing. */
export function joined(
  clashes: readonly Clash[],
  choices: Choices,
  theirs: EntryInput,
  mine: EntryInput,
): EntryInput | null {
  let result = theirs;
  for (const { unit, first } of clashes) {
    const side = choices[unit] ?? first;
    if (side === null) return null;
    if (side === 'mine') result = withUnit(unit, result, mine);
  }
  return result;
}

/** Choices that still stand after the other side saved again: what changed in theirs since is chosen anew. */
export function stillStanding(choices: Choices, before: EntryInput, now: EntryInput): Choices {
  const standing = (Object.entries(choices) as [Unit, Side][]).filter(([unit]) =>
    sameUnit(unit, before, now),
  );
  return Object.fromEntries(standing);
}

export function isOfRecord(unit: Unit): unit is RecordUnit {
  return unit.startsWith('record.');
}

export function recordPartOf(unit: RecordUnit): RecordPart {
  return unit.slice('record.'.length) as RecordPart;
}

function sameUnit(unit: Unit, a: EntryInput, b: EntryInput): boolean {
  if (isOfRecord(unit)) return sameRecordPart(recordPartOf(unit), a.record, b.record);
  return UNITS[unit].every((field) => sameJson(said(a, field), said(b, field)));
}

/** What a text says in a field, also where it leaves it out because there is nothing to say. */
function said(content: EntryInput, field: keyof EntryInput): unknown {
  if (field === 'sharing') return content.sharing ?? PLAIN_DETAILS;
  return content[field] ?? null;
}

function withUnit(unit: Unit, into: EntryInput, from: EntryInput): EntryInput {
  if (isOfRecord(unit)) {
    const { record: _before, ...others } = into;
    const record = withRecordPart(recordPartOf(unit), into.record, from.record);
    return record === undefined ? others : { ...others, record };
  }
  const fields: readonly (keyof EntryInput)[] = UNITS[unit];
  const others = Object.entries(into).filter(([field]) => !fields.some((one) => one === field));
  const taken = fields.filter((field) => field in from).map((field) => [field, from[field]]);
  return Object.fromEntries([...others, ...taken]) as EntryInput;
}
