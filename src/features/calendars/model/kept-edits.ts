import { z } from 'zod';
import { WRITE_KEY } from '#shared/contracts/write-key.js';
import { entryInput, entryLead, type EntryInput } from '#shared/contracts/calendars.js';
import { EMPTY_RECORD } from '#shared/contracts/event-record.js';
import { sharingDetails } from '#shared/contracts/sharing.js';
import { forget, keep, readAllKept } from '#src/lib/device-storage.js';
import { draftPrefix } from '#src/lib/kept-draft.js';
import { hasSign, newDraft, NEWER_LEADS, type EntryDraft } from './entry-draft.js';

/** Unsaved writing of one entry, and over which saved state of it. Both are null for a new entry. */
export interface EntryEdit {
  draft: EntryDraft;
  base: EntryInput | null;
  baseVersion: number | null;
  keptAt: string;
  /** What is on its way to the server while no answer has come; it may have been saved. */
  sending?: Sending | undefined;
}

/** A text with the key under which it counts once; `version` is null for a new entry. */
export interface Sending {
  key: string;
  content: EntryInput;
  version: number | null;
}

const sendingShape = z.strictObject({
  key: z.string().regex(WRITE_KEY),
  content: entryInput,
  version: z.number().nullable(),
});

export type Edits = ReadonlyMap<string, EntryEdit>;

/** A new entry has no id yet; it goes by a word of its own until it is saved. */
const NEW = 'new';

export function isNewId(entryId: string): boolean {
  return entryId === NEW || entryId.startsWith(`${NEW}-`);
}

export function newEntryId(word: string): string {
  return `${NEW}-${word}`;
}

/** Each entry is kept by itself, so two windows on the same calendar do not write over each other. */
function prefixOf(personId: string, calendarId: string): string {
  return `${draftPrefix(personId)}entry.${calendarId}.`;
}

export function readEdits(personId: string, calendarId: string): Edits {
  const edits = new Map<string, EntryEdit>();
  for (const [entryId, kept] of readAllKept(prefixOf(personId, calendarId))) {
    const edit = readEdit(kept);
    if (edit) edits.set(entryId, edit);
  }
  return edits;
}

export function keepEdit(personId: string, calendarId: string, entryId: string, edit: EntryEdit): boolean {
  return keep(prefixOf(personId, calendarId) + entryId, edit);
}

export function forgetEdit(personId: string, calendarId: string, entryId: string): void {
  forget(prefixOf(personId, calendarId) + entryId);
}

/** What another release kept may have another shape; it is then left alone rather than half read. */
function readEdit(kept: unknown): EntryEdit | null {
  if (typeof kept !== 'object' || kept === null) return null;
  const {
    draft: written,
    base,
    baseVersion,
    keptAt,
    sending,
  } = kept as Partial<Record<keyof EntryEdit, unknown>>;
  // What was kept before there were these parts goes on with empty ones.
  const draft = typeof written === 'object' ? { record: EMPTY_RECORD, ...NEWER_LEADS, ...written } : null;
  if (typeof keptAt !== 'string' || !(baseVersion === null || typeof baseVersion === 'number')) return null;
  if (!isDraft(draft)) return null;
  if (base !== null && !entryInput.safeParse(base).success) return null;
  const underway = sendingShape.safeParse(sending);
  const edit = { draft, base: base as EntryInput | null, baseVersion, keptAt };
  return underway.success ? { ...edit, sending: underway.data } : edit;
}

function isDraft(draft: unknown): draft is EntryDraft {
  if (typeof draft !== 'object' || draft === null || !('sky' in draft)) return false;
  const start = newDraft();
  // A sign of the sky has as many shapes as there are kinds, and a level as many details: the contract knows them.
  const { sky, sharing, giverId, record, seen } = start;
  if (!sameShape({ ...draft, sky, sharing, giverId, record, seen }, start)) return false;
  if (!isSharingDraft(draft) || !isRecordDraft(draft) || !isSeenDraft(draft)) return false;
  if (sameShape(draft.sky, start.sky) && !hasSign(draft.sky as EntryDraft['sky'])) return true;
  return entryLead.safeParse({ type: 'sky', ...(draft.sky as object) }).success;
}

function isSharingDraft(draft: object): boolean {
  const { sharing, giverId } = draft as { sharing?: unknown; giverId?: unknown };
  return sharingDetails.safeParse(sharing).success && (giverId === null || typeof giverId === 'string');
}

function isSeenDraft(draft: object): boolean {
  const { seen } = draft as { seen?: unknown };
  return seen === null || sameShape(seen, { date: '', by: '', agreedBy: '' });
}

/** Half-written members are the form's to name; only its groups must be there. */
function isRecordDraft(draft: object): boolean {
  const { record } = draft as { record?: unknown };
  if (typeof record !== 'object' || record === null) return false;
  const groups = Object.keys(EMPTY_RECORD);
  return Object.keys(record).length === groups.length && groups.every((group) => group in record);
}

/** The same members of the same types, all the way down. */
function sameShape(value: unknown, pattern: unknown): boolean {
  if (typeof pattern !== 'object' || pattern === null) return typeof value === typeof pattern;
  if (typeof value !== 'object' || value === null) return false;
  const members = Object.entries(pattern);
  const own = new Map<string, unknown>(Object.entries(value));
  return own.size === members.length && members.every(([name, member]) => sameShape(own.get(name), member));
}
