import { z } from 'zod';
import { id, instant, queryNumber, rowVersion } from './common.js';
import { defineEndpoint, member } from './endpoint.js';

/** The longest that a stream stays open, seconds; whoever listens on opens the next one. */
export const STREAM_MAX_S = 3600;
/** Something is heard of a stream at least this often, seconds, so that nobody between the two ends takes it for dead. */
export const HEARTBEAT_S = 15;

/**
 * What somebody sees of a draft, as ids and numbers alone: never a word. It is sent when a stream opens and whenever it has
 * become another one; what changed follows from the one before.
 */
export const draftGlance = z.strictObject({
  /** In their order. */
  entries: z.array(
    z.strictObject({
      entryId: id,
      version: rowVersion,
      /** The asking person saved it last. */
      byMe: z.boolean(),
      /** When the day on which it was really done was typed. */
      doneTypedAt: instant.nullable(),
      /** Other timings of it that they see. */
      variants: z.array(z.strictObject({ variantId: id, version: rowVersion })),
    }),
  ),
  /** A submission is out. */
  locked: z.boolean(),
  publishedNumber: z.number().int().nullable(),
});
export type DraftGlance = z.infer<typeof draftGlance>;

export const draftChangesEndpoints = {
  watch: defineEndpoint({
    id: 'watchDraft',
    method: 'GET',
    path: '/api/calendars/:calendarId/changes',
    summary:
      'Server-sent events: which entries of the draft the person sees, anew whenever that changes; ids only',
    access: member('calendar', 'officer', 'elder', 'steward'),
    params: z.strictObject({ calendarId: id }),
    query: z.strictObject({
      /** How long it stays open. Without it the present state comes alone: for whoever cannot hold a stream open. */
      seconds: queryNumber((number) => number.int().min(0).max(STREAM_MAX_S)).optional(),
    }),
    fileType: 'text/event-stream',
  }),
} as const;
