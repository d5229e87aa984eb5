import type { EntryInput } from '#shared/contracts/calendars.js';
import { PLAIN_DETAILS } from '#shared/contracts/sharing.js';
import { sameJson } from '#shared/kernel/canonical-json.js';

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
  record: ['record'],
  agreedToPrint: ['agreedToPrint'],
  board: ['board'],
  sharingLevel: ['sharingLevel', 'sharing', 'giverId'],
} as const satisfies Record<string, readonly (keyof EntryInput)[]>;

export type Unit = keyof typeof UNITS;
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
  return (Object.keys(UNITS) as Unit[])
    .filter((unit) => !sameUnit(unit, theirs, mine))
    .map((unit) => {
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

function sameUnit(unit: Unit, a: EntryInput, b: EntryInput): boolean {
  return UNITS[unit].every((field) => sameJson(said(a, field), said(b, field)));
}

/** What a text says in a field, also where it leaves it out because there is nothing to say. */
function said(content: EntryInput, field: keyof EntryInput): unknown {
  if (field === 'sharing') return content.sharing ?? PLAIN_DETAILS;
  return content[field] ?? null;
}

function withUnit(unit: Unit, into: EntryInput, from: EntryInput): EntryInput {
  const fields: readonly (keyof EntryInput)[] = UNITS[unit];
  const others = Object.entries(into).filter(([field]) => !fields.some((one) => one === field));
  const taken = fields.filter((field) => field in from).map((field) => [field, from[field]]);
  return Object.fromEntries([...others, ...taken]) as EntryInput;
}
