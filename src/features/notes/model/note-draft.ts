import { z } from 'zod';
import { NOTE_FIELDS, noteLevel, type NoteLevel, type NotePin } from '#shared/contracts/notes.js';
import type { NotedThing } from '../api/notes-api.js';

/** A note that has not been pinned yet, as it stands on this device. */
export interface NoteDraft {
  pin: NotePin;
  text: string;
  level: NoteLevel;
}

export const EMPTY_NOTE: NoteDraft = { pin: { at: 'whole' }, text: '', level: 'village' };

/** Quotes may still be empty: what is half written is kept, too. */
const draft = z.strictObject({
  pin: z.union([
    z.strictObject({ at: z.enum(['whole', 'window', 'marker']) }),
    z.strictObject({ at: z.literal('words'), field: z.enum(NOTE_FIELDS), quote: z.string() }),
  ]),
  text: z.string(),
  level: noteLevel,
});

export function isNoteDraft(value: unknown): value is NoteDraft {
  return draft.safeParse(value).success;
}

export const isText = (value: unknown): value is string => typeof value === 'string';

/** It goes with the thing: a device forgets it when the thing is taken back. */
export function answerDraft({ subjectId }: NotedThing, noteId: string): string {
  return `note-answer.${subjectId}.${noteId}`;
}
