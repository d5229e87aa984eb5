import { z } from 'zod';
import { id, instant, isoDate, line } from './common.js';
import { defineEndpoint, member } from './endpoint.js';

/** When the work of an entry was really done this year, and who said so. */
export const actualDaysInput = z
  .strictObject({
    from: z.iso.date('date-form'),
    /** Null for a single day. */
    to: z.iso.date('date-form').nullable(),
    saidBy: line(120, 1),
    /** Whose or which plots it was, where not all did it at once. */
    plots: line(120),
  })
  .superRefine(({ from, to }, context) => {
    if (to !== null && to < from) context.addIssue({ code: 'custom', path: ['to'], message: 'before-first' });
  });
export type ActualDaysInput = z.infer<typeof actualDaysInput>;

export const actualDays = z.strictObject({
  from: isoDate,
  to: isoDate.nullable(),
  saidBy: z.string(),
  plots: z.string(),
  typedBy: z.string(),
  typedAt: instant,
});
export type ActualDays = z.infer<typeof actualDays>;

const params = z.strictObject({ calendarId: id, entryId: id });
const path = '/api/calendars/:calendarId/entries/:entryId/actual-days';

export const actualDaysEndpoints = {
  put: defineEndpoint({
    id: 'putActualDays',
    method: 'PUT',
    path,
    summary: 'Write down when the work of an entry was really done this year',
    access: member('calendar', 'officer', 'elder'),
    params,
    body: actualDaysInput,
    response: actualDays,
    countsOnce: true,
  }),
  remove: defineEndpoint({
    id: 'removeActualDays',
    method: 'DELETE',
    path,
    summary: 'Take back what was written down about when it was done; what hangs on it waits again',
    access: member('calendar', 'officer', 'elder'),
    params,
    countsOnce: true,
  }),
} as const;
