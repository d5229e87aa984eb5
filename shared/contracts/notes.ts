import { z } from 'zod';
import { id, instant, line, listOf, text } from './common.js';
import { defineEndpoint, member } from './endpoint.js';
import { ROLES } from './people.js';
import { sharingLevel } from './sharing.js';
import { markerKey } from './stars.js';

export const NOTES_PER_SUBJECT_MAX = 200;
export const NOTE_ANSWERS_MAX = 100;
const NOTE_MAX = 1000;

/** What a note is about. It is never shown to anybody who may not see that. */
export const NOTE_SUBJECTS = ['entry', 'figure', 'marker'] as const;
export type NoteSubjectType = (typeof NOTE_SUBJECTS)[number];

/** Texts in which a note can be pinned to a word. */
export const NOTE_FIELDS = [
  'titleOfficer',
  'titleVillage',
  'crop',
  'notes',
  'caution',
  'otherSigns',
  'ifLate',
  'names',
  'story',
] as const;
export type NoteField = (typeof NOTE_FIELDS)[number];

/** Where on its subject a note is pinned. */
export const notePin = z.discriminatedUnion('at', [
  z.strictObject({ at: z.literal('whole') }),
  z.strictObject({ at: z.literal('window') }),
  z.strictObject({ at: z.literal('marker') }),
  z.strictObject({ at: z.literal('words'), field: z.enum(NOTE_FIELDS), quote: line(200, 1) }),
]);
export type NotePin = z.infer<typeof notePin>;

const subjectFields = z.strictObject({
  subjectType: z.enum(NOTE_SUBJECTS),
  /** The id of an entry or a figure, or the key of a marker. */
  subjectId: z.string().max(64, 'too-long'),
});

function subjectIsNamed({ subjectType, subjectId }: NoteSubject, context: z.RefinementCtx): void {
  const fits = (subjectType === 'marker' ? markerKey : id).safeParse(subjectId).success;
  if (!fits) context.addIssue({ code: 'custom', path: ['subjectId'], message: 'unknown' });
}

export type NoteSubject = z.infer<typeof subjectFields>;
export const noteSubject = subjectFields.superRefine(subjectIsNamed);

/** As its subject is shared, or for the elders alone. */
export const NOTE_LEVELS = ['village', 'elders'] as const;
export const noteLevel = z.enum(NOTE_LEVELS);
export type NoteLevel = (typeof NOTE_LEVELS)[number];

const words = text(NOTE_MAX).refine((said) => said !== '', 'required');

export const noteInput = subjectFields
  .extend({
    pin: notePin,
    text: text(NOTE_MAX),
    /** Said instead of written: without words until its recording comes, and then for whoever reads the note. */
    isSpoken: z.boolean(),
    /** `village`: whoever sees its subject; `elders`: the elders among them. */
    level: noteLevel,
  })
  .superRefine(subjectIsNamed)
  .superRefine(({ subjectType, pin }, context) => {
    const fits = pin.at === 'whole' || subjectType === 'entry' || pin.at === 'words';
    if (!fits) context.addIssue({ code: 'custom', path: ['pin'], message: 'not-in-list' });
  })
  .superRefine(({ text: said, isSpoken }, context) => {
    if (said === '' && !isSpoken) context.addIssue({ code: 'custom', path: ['text'], message: 'required' });
  });
export type NoteInput = z.infer<typeof noteInput>;

export const noteAnswerInput = z.strictObject({ text: words });
export type NoteAnswerInput = z.infer<typeof noteAnswerInput>;

export const noteAnswer = z.strictObject({
  id,
  authorName: z.string(),
  /** Whose hand wrote it down, where it was not its author's. */
  typedByName: z.string().optional(),
  text: z.string(),
  writtenAt: instant,
  mine: z.boolean(),
});
export type NoteAnswer = z.infer<typeof noteAnswer>;

export const note = subjectFields.extend({
  id,
  pin: notePin,
  /** False where the words that it is pinned to no longer stand in the text: it was changed since. */
  wordsStand: z.boolean(),
  /** Empty where it was spoken. */
  text: z.string(),
  /** Recordings that belong to it, as far as the person may hear of them. */
  voices: z.number().int().min(0),
  level: sharingLevel,
  authorName: z.string(),
  /** Whose hand wrote it down, where it was not its author's. */
  typedByName: z.string().optional(),
  writtenAt: instant,
  /** Set while it is closed; whoever wrote it closes and opens it, and nobody else. */
  closedAt: instant.nullable(),
  answers: z.array(noteAnswer),
  mine: z.boolean(),
});
export type Note = z.infer<typeof note>;

const communityParams = z.strictObject({ communityId: id });
const noteParams = z.strictObject({ communityId: id, noteId: id });

export const notesEndpoints = {
  list: defineEndpoint({
    id: 'listNotes',
    method: 'GET',
    path: '/api/communities/:communityId/notes',
    summary: 'Notes on an entry, a figure or a marker, oldest first, with their answers',
    access: member('community', ...ROLES),
    params: communityParams,
    query: noteSubject,
    response: listOf(note),
  }),
  add: defineEndpoint({
    id: 'addNote',
    method: 'POST',
    path: '/api/communities/:communityId/notes',
    summary: 'Pin a note to something that one sees',
    access: member('community', ...ROLES),
    params: communityParams,
    body: noteInput,
    response: note,
    status: 201,
  }),
  answer: defineEndpoint({
    id: 'answerNote',
    method: 'POST',
    path: '/api/communities/:communityId/notes/:noteId/answers',
    summary: 'Answer a note that is open',
    access: member('community', ...ROLES),
    params: noteParams,
    body: noteAnswerInput,
    response: note,
    status: 201,
  }),
  close: defineEndpoint({
    id: 'closeNote',
    method: 'PUT',
    path: '/api/communities/:communityId/notes/:noteId/closed',
    summary: 'Close the own note: what it was about is settled',
    access: member('community', ...ROLES),
    params: noteParams,
    response: note,
  }),
  reopen: defineEndpoint({
    id: 'reopenNote',
    method: 'DELETE',
    path: '/api/communities/:communityId/notes/:noteId/closed',
    summary: 'Open the own note again',
    access: member('community', ...ROLES),
    params: noteParams,
    response: note,
  }),
} as const;
