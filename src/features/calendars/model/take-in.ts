import { EMPTY_RECORD } from '#shared/contracts/event-record.js';
import type { Entry } from '#shared/contracts/calendars.js';
import { contentOf, draftOf, type EntryDraft } from './entry-draft.js';
import type { EntryEdit } from './kept-edits.js';
import { withRecordPart } from './record-parts.js';
import { clashesOf, isOfRecord, recordPartOf, UNITS, type PlainUnit } from './stale-choice.js';

/** A draft keeps every way to lead an entry; they belong to one choice. */
const LEAD_PARTS = ['leadType', 'marker', 'sky', 'fixed', 'seen', 'nature', 'anchor'] as const;

/**
 * My writing over the state that somebody else saved meanwhile: what only they changed is taken in, what I write stays.
 * Null where both changed the same part, or nobody knows what I began from: that is a person's to decide.
 */
export function takenIn(edit: EntryEdit, theirs: Entry): EntryEdit | null {
  if (edit.base === null) return null;
  const clashes = clashesOf(edit.base, theirs.content, contentOf(edit.draft));
  if (clashes.some(({ first }) => first === null)) return null;
  const saved = draftOf(theirs.content);
  const units = clashes.filter(({ first }) => first === 'theirs').map(({ unit }) => unit);
  const taken = units.flatMap((unit) => (isOfRecord(unit) ? [] : partsOf(unit)));
  const record = units
    .filter(isOfRecord)
    .reduce(
      (own, unit) => withRecordPart(recordPartOf(unit), own, saved.record) ?? EMPTY_RECORD,
      edit.draft.record,
    );
  const draft = Object.fromEntries(
    (Object.keys({ ...edit.draft, ...saved }) as (keyof EntryDraft)[])
      .map((part) => [part, taken.includes(part) ? saved[part] : edit.draft[part]] as const)
      .filter(([, value]) => value !== undefined),
  ) as unknown as EntryDraft;
  return { ...edit, draft: { ...draft, record }, base: theirs.content, baseVersion: theirs.version };
}

function partsOf(unit: PlainUnit): readonly (keyof EntryDraft)[] {
  return unit === 'lead' ? LEAD_PARTS : UNITS[unit];
}
