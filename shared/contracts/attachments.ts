import { z } from 'zod';
import { id, instant, line, listOf, rowVersion, text } from './common.js';
import { defineEndpoint, member } from './endpoint.js';
import { languageTag, ROLES } from './people.js';
import {
  groupFitsLevel,
  NAMINGS,
  PLAIN_DETAILS,
  sharingDetails,
  sharingLevel,
  type SharingDetails,
  type SharingLevel,
} from './sharing.js';
import { markerKey } from './stars.js';

const MIB = 1024 * 1024;
export const PICTURE_MAX_BYTES = 12 * MIB;
export const AUDIO_PART_MAX_BYTES = 60 * MIB;
/** A recording is cut into parts of this length while the speaker goes on. */
export const PART_SECONDS = 300;
/** Two hours of voice. */
export const PARTS_MAX = 24;
export const PICTURE_SIDE_MAX_PX = 2048;
export const THUMBNAIL_SIDE_MAX_PX = 320;
export const ATTACHMENTS_PER_SUBJECT_MAX = 60;
export const WORDS_MAX = 20_000;

export const ATTACHMENT_KINDS = ['recording', 'picture'] as const;
export type AttachmentKind = (typeof ATTACHMENT_KINDS)[number];

/** What a recording or a picture belongs to. It is never shown to anybody who may not see that. */
export const ATTACHMENT_SUBJECTS = [
  'entry',
  'figure',
  'answer',
  'marker',
  'consent',
  'meeting',
  'note',
] as const;
export type AttachmentSubjectType = (typeof ATTACHMENT_SUBJECTS)[number];

/** Before anybody chooses: what was spoken is for the elders and leaves no trace, what was photographed for the village. */
export const DEFAULT_SHARING = {
  recording: { level: 'elders', details: { ...PLAIN_DETAILS, trace: 'none' } },
  picture: { level: 'village', details: PLAIN_DETAILS },
} as const satisfies Record<AttachmentKind, { level: SharingLevel; details: SharingDetails }>;

/**
 * How the people who are heard or seen agreed: by a clip of their own voice (always so for a recording), because
 * they were asked, or because nobody can be made out.
 */
export const CONSENT_WAYS = ['clip', 'asked', 'nobody-shown'] as const;
export type ConsentWay = (typeof CONSENT_WAYS)[number];

const subjectFields = z.strictObject({
  subjectType: z.enum(ATTACHMENT_SUBJECTS),
  /** The id of an entry, a figure, an answer, a consent or a note, or the key of a marker. */
  subjectId: z.string().max(64, 'too-long'),
});

function subjectIsNamed(
  { subjectType, subjectId }: z.infer<typeof subjectFields>,
  context: z.RefinementCtx,
): void {
  const fits = (subjectType === 'marker' ? markerKey : id).safeParse(subjectId).success;
  if (!fits) context.addIssue({ code: 'custom', path: ['subjectId'], message: 'unknown' });
}

export const attachmentSubject = subjectFields.superRefine(subjectIsNamed);
export type AttachmentSubject = z.infer<typeof attachmentSubject>;

export const attachmentInput = subjectFields
  .extend({
    /** Chosen by the sender: the same one again is the same attachment, so a cut upload can be sent once more. */
    clientId: id,
    kind: z.enum(ATTACHMENT_KINDS),
    title: line(120),
    /** Who speaks, as they wish to be called. */
    speaker: line(80),
    language: languageTag.nullable(),
    consent: z.enum(CONSENT_WAYS),
    sharingLevel,
    sharing: sharingDetails,
    /** Whose it is, where they are one of the village's people here; null: whoever sends it. */
    giverId: id.nullable(),
  })
  .superRefine(subjectIsNamed)
  .superRefine(({ kind, speaker, language, consent, sharingLevel: level, sharing }, context) => {
    const refuse = (field: string, message: string) => {
      context.addIssue({ code: 'custom', path: field.split('.'), message });
    };
    groupFitsLevel({ level, groupId: sharing.groupId }, (code) => {
      refuse('sharing.groupId', code);
    });
    if (kind === 'picture') {
      if (consent === 'clip') refuse('consent', 'not-in-list');
      return;
    }
    if (consent !== 'clip') refuse('consent', 'consent-clip-first');
    if (speaker === '') refuse('speaker', 'required');
    if (language === null) refuse('language', 'required');
  });
export type AttachmentInput = z.infer<typeof attachmentInput>;

/** One more part of a recording. Part 0 is the spoken consent, which came with the recording itself. */
export const partInput = z.strictObject({
  part: z.number().int().min(1).max(PARTS_MAX),
  /** As the recorder measured it. */
  seconds: z
    .number()
    .min(0)
    .max(24 * 3600),
});
export type PartInput = z.infer<typeof partInput>;

export const attachmentPart = z.strictObject({
  part: z.number().int(),
  contentType: z.string(),
  bytes: z.number().int(),
  /** Null for a picture. */
  seconds: z.number().nullable(),
});
export type AttachmentPart = z.infer<typeof attachmentPart>;

export const WORDS_KINDS = ['words', 'translation'] as const;

/** What was said, written out, or the same in another language; each with its own author. */
export const attachmentWords = z.strictObject({
  kind: z.enum(WORDS_KINDS),
  language: languageTag,
  text: z.string(),
  authorName: z.string(),
  checkedBySpeaker: z.boolean(),
  updatedAt: instant,
  version: rowVersion,
});
export type AttachmentWords = z.infer<typeof attachmentWords>;

export const wordsInput = z.strictObject({
  kind: z.enum(WORDS_KINDS),
  language: languageTag,
  text: text(WORDS_MAX).pipe(z.string().min(1, 'required')),
  checkedBySpeaker: z.boolean(),
  /** The state that was written over; null where nobody has written yet. */
  version: rowVersion.nullable(),
});
export type WordsInput = z.infer<typeof wordsInput>;

export const attachment = z.strictObject({
  id,
  communityId: id,
  clientId: id,
  kind: z.enum(ATTACHMENT_KINDS),
  subjectType: z.enum(ATTACHMENT_SUBJECTS),
  subjectId: z.string(),
  title: z.string(),
  /** Empty where its giver is not to be named to the reader. */
  speaker: z.string(),
  naming: z.enum(NAMINGS),
  language: z.string().nullable(),
  consent: z.enum(CONSENT_WAYS),
  sharingLevel,
  /** Empty where its giver is not to be named to the reader. */
  addedBy: z.string(),
  addedAt: instant,
  /** A recording whose sound was removed, while what was written out from it stayed. */
  hasWordsAlone: z.boolean(),
  /** By number; the spoken consent first. */
  parts: z.array(attachmentPart),
  /** Null for a recording. */
  picture: z.strictObject({ widthPx: z.number().int(), heightPx: z.number().int() }).nullable(),
  words: z.array(attachmentWords),
  may: z.strictObject({ writeWords: z.boolean(), remove: z.boolean() }),
});
export type Attachment = z.infer<typeof attachment>;

const attachmentParams = z.strictObject({ attachmentId: id });

export const attachmentsEndpoints = {
  list: defineEndpoint({
    id: 'listAttachments',
    method: 'GET',
    path: '/api/communities/:communityId/attachments',
    summary: 'Recordings and pictures of one thing, as far as the person may see them, oldest first',
    access: member('community', ...ROLES),
    params: z.strictObject({ communityId: id }),
    query: attachmentSubject,
    response: listOf(attachment),
  }),
  create: defineEndpoint({
    id: 'createAttachment',
    method: 'POST',
    path: '/api/communities/:communityId/attachments',
    summary:
      'Add a picture, or begin a recording with the spoken consent, staff and observers to what they keep; sent again it is the same one',
    access: member('community', ...ROLES),
    params: z.strictObject({ communityId: id }),
    body: attachmentInput,
    upload: { maxBytes: AUDIO_PART_MAX_BYTES },
    response: attachment,
    status: 201,
  }),
  addPart: defineEndpoint({
    id: 'addAttachmentPart',
    method: 'POST',
    path: '/api/attachments/:attachmentId/parts',
    summary: 'Add the next part to the own recording; the same part sent again is kept once',
    access: member('attachment', ...ROLES),
    params: attachmentParams,
    body: partInput,
    upload: { maxBytes: AUDIO_PART_MAX_BYTES },
    response: attachment,
    status: 201,
  }),
  read: defineEndpoint({
    id: 'readAttachment',
    method: 'GET',
    path: '/api/attachments/:attachmentId',
    summary: 'What is known about a recording or a picture, and its written-out words',
    access: member('attachment', ...ROLES),
    params: attachmentParams,
    response: attachment,
  }),
  readPart: defineEndpoint({
    id: 'readAttachmentPart',
    method: 'GET',
    path: '/api/attachments/:attachmentId/parts/:part',
    summary: 'The sound or the picture itself, whole or one range of its bytes; part 0 is the spoken consent',
    access: member('attachment', ...ROLES),
    // What is no number names no part: it must be answered like any other part that is not there.
    params: attachmentParams.extend({ part: z.coerce.number().catch(-1) }),
    fileType: 'application/octet-stream',
  }),
  readThumbnail: defineEndpoint({
    id: 'readAttachmentThumbnail',
    method: 'GET',
    path: '/api/attachments/:attachmentId/thumbnail',
    summary: 'A small picture; a recording has none',
    access: member('attachment', ...ROLES),
    params: attachmentParams,
    fileType: 'image/jpeg',
  }),
  saveWords: defineEndpoint({
    id: 'saveAttachmentWords',
    method: 'PUT',
    path: '/api/attachments/:attachmentId/words',
    summary:
      'Write out what was said, translate it, or correct it as its giver; 409 with both texts when somebody wrote meanwhile',
    access: member('attachment', ...ROLES),
    params: attachmentParams,
    body: wordsInput,
    response: attachment,
  }),
  remove: defineEndpoint({
    id: 'removeAttachment',
    method: 'DELETE',
    path: '/api/attachments/:attachmentId',
    summary: 'Remove what one has added, with its files, at once and for good',
    access: member('attachment', ...ROLES),
    params: attachmentParams,
  }),
} as const;
