import type { EntryInput, EntryLead } from '#shared/contracts/calendars.js';
import type { VariantInput } from '#shared/contracts/variants.js';

export interface DemoEntry {
  code: string;
  content: EntryInput;
}

/** A timing beside the entry of that code, and the mailbox of whose it is; null where they are not of the village's people. */
export interface DemoVariant {
  code: string;
  by: string | null;
  content: Omit<VariantInput, 'giverId'>;
}

/** Everything that most entries of the event list have in common; the rest is said with each. */
export function demoEntry(
  code: string,
  said: Pick<EntryInput, 'titleVillage' | 'titleOfficer' | 'kind' | 'icon' | 'lead' | 'offsets' | 'giver'> &
    Partial<EntryInput>,
): DemoEntry {
  return {
    code,
    content: {
      crop: '',
      notes: '',
      caution: '',
      hasLastDate: false,
      lastDate: null,
      protectiveWatch: false,
      otherSigns: '',
      ifLate: '',
      agreedToPrint: true,
      sharingLevel: 'open',
      ...said,
    },
  };
}

/** Days before and after the leading day: early, best from, best to, last. */
export function days(
  earliest: number,
  bestFrom: number,
  bestTo: number,
  last: number,
): EntryInput['offsets'] {
  return { earliestDays: earliest, bestFromDays: bestFrom, bestToDays: bestTo, lastAdvisedDays: last };
}

export function byStar(
  markerKey: string,
  phenomenon: Extract<EntryLead, { type: 'marker' }>['phenomenon'],
): EntryLead {
  return { type: 'marker', markerKey, phenomenon, occurrence: 1 };
}

/** The day on which the work of that code is really done. */
export function onTheDayOf(code: string): EntryLead {
  return { type: 'entry-actual', entryId: code };
}

/** What goes by the work of a code, once that work has its id. */
export function withKnownWork(content: EntryInput, idByCode: ReadonlyMap<string, string>): EntryInput {
  const { lead } = content;
  if (lead.type !== 'entry-actual') return content;
  const entryId = idByCode.get(lead.entryId);
  if (entryId === undefined)
    throw new Error(`The demo has no entry ${lead.entryId} before ${content.titleOfficer}`);
  return { ...content, lead: { ...lead, entryId } };
}

export function bySign(spec: Extract<EntryLead, { type: 'sky' }>['spec']): EntryLead {
  return { type: 'sky', spec, occurrence: 1 };
}

/** A sign of nature with its usual days, as month and day. */
export function byNature(
  name: string,
  [fromMonth, fromDay]: [number, number],
  [toMonth, toDay]: [number, number],
  source: string,
): EntryLead {
  const usual = { from: { month: fromMonth, day: fromDay }, to: { month: toMonth, day: toDay } };
  return { type: 'nature-sign', name, usual, source };
}

/** The office's last day for what is planted. */
export function lastDay(
  month: number,
  day: number,
  source: string,
): Pick<EntryInput, 'hasLastDate' | 'lastDate'> {
  return { hasLastDate: true, lastDate: { date: { month, day }, source } };
}
