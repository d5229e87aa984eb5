import { z } from 'zod';
import { id, isoDate, line, text } from './common.js';
import { defineEndpoint, member } from './endpoint.js';
import { answerWord } from './reviews.js';
import { submissionNumber } from './versions.js';
import { PICTURE_MAX_BYTES } from './attachments.js';

const ANSWERS_MAX = 300;

export const paperAnswer = z.strictObject({ elderId: id, entryId: id, answer: answerWord, note: text(1000) });
export type PaperAnswer = z.infer<typeof paperAnswer>;

/** What stands on a paper that was marked at a meeting; its picture comes with it. */
export const meetingInput = z
  .strictObject({
    heldOn: isoDate,
    /** Who was there and saw thumbs and marks being made. */
    witness: line(120, 1),
    answers: z.array(paperAnswer).min(1, 'choose-one').max(ANSWERS_MAX, 'too-long'),
  })
  .superRefine(({ answers }, context) => {
    const seen = new Set<string>();
    for (const [index, { elderId, entryId, answer, note }] of answers.entries()) {
      const key = `${elderId} ${entryId}`;
      const refuse = (field: string, message: string) => {
        context.addIssue({ code: 'custom', path: ['answers', index, field], message });
      };
      if (seen.has(key)) refuse('entryId', 'no-duplicates');
      seen.add(key);
      if (answer === 'change-this' && note === '') refuse('note', 'say-what-to-change');
    }
  });
export type MeetingInput = z.infer<typeof meetingInput>;

const place = z.strictObject({ elderId: id, entryId: id });

export const typedMeeting = z.strictObject({
  id,
  written: z.number().int(),
  /** Answers that elders gave with their own hand, or signed: they stay as they are. */
  stood: z.array(place),
});
export type TypedMeeting = z.infer<typeof typedMeeting>;

const params = z.strictObject({ calendarId: id, number: submissionNumber });

export const meetingsEndpoints = {
  type: defineEndpoint({
    id: 'typeInMeeting',
    method: 'POST',
    path: '/api/calendars/:calendarId/versions/:number/meetings',
    summary:
      'Type in what elders marked on paper at a meeting, all or nothing, with the picture of the paper',
    access: member('calendar', 'officer', 'steward'),
    params,
    body: meetingInput,
    upload: { maxBytes: PICTURE_MAX_BYTES },
    response: typedMeeting,
    status: 201,
  }),
  sheet: defineEndpoint({
    id: 'printReadBack',
    method: 'GET',
    path: '/api/calendars/:calendarId/versions/:number/read-back.pdf',
    summary: 'A submission in review in short sentences, to be read to a meeting and marked by its elders',
    access: member('calendar', 'officer', 'elder', 'steward'),
    params,
    fileType: 'application/pdf',
  }),
} as const;
