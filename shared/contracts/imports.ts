import { z } from 'zod';
import { CALENDAR_FILE_MAX_BYTES } from './calendar-file.js';
import { id } from './common.js';
import { defineEndpoint, member } from './endpoint.js';

/** Made by whoever sends: what is sent twice under one key is brought in once. */
const key = z.uuid();

/** What a calendar's own file brought in, or would bring in. */
export const fileImport = z.strictObject({
  added: z.number().int(),
  /** Taken back since, or kept by their people today, and what hangs on these; how many, and never which. */
  refused: z.number().int(),
  /** Where the file comes from. */
  from: z.strictObject({ year: z.number().int(), placeName: z.string(), label: z.string().nullable() }),
});
export type FileImport = z.infer<typeof fileImport>;

const params = z.strictObject({ calendarId: id });

/** What is brought into a draft. All of it lands as a draft, or nothing does. */
export const importsEndpoints = {
  file: defineEndpoint({
    id: 'importCalendarFile',
    method: 'POST',
    path: '/api/calendars/:calendarId/imports/file',
    summary: 'Bring a calendar’s JSON file back into a draft of its village; with dryRun nothing is kept',
    access: member('calendar', 'officer'),
    params,
    body: z.strictObject({ key, dryRun: z.boolean() }),
    upload: { maxBytes: CALENDAR_FILE_MAX_BYTES },
    response: fileImport,
  }),
} as const;
