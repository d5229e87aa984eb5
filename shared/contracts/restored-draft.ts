import { z } from 'zod';
import { id } from './common.js';

export const RESTORE_OUTCOMES = ['set-back', 'brought-back', 'taken-out', 'left', 'as-it-was'] as const;
export type RestoreOutcome = (typeof RESTORE_OUTCOMES)[number];

/** What became of an entry of the draft when it was set back to a version. */
export const restoredEntry = z.strictObject({
  entryId: id,
  titleOfficer: z.string(),
  outcome: z.enum(RESTORE_OUTCOMES),
  /** Why it was left as it is today; null otherwise. */
  leftBecause: z.enum(['sign-gone', 'circle', 'not-yours']).nullable(),
  /** Who may see it, or whose it is, was different in the version; it stays as it is today. */
  sharingStays: z.boolean(),
});
export type RestoredEntry = z.infer<typeof restoredEntry>;

/** Of those that the officer sees, in the order of the draft; what was taken out last. */
export const restoredDraft = z.strictObject({
  number: z.number().int(),
  label: z.string().nullable(),
  entries: z.array(restoredEntry),
  /** Withdrawn since, where that leaves a trace: it does not come back. */
  withdrawnCount: z.number().int(),
});
export type RestoredDraft = z.infer<typeof restoredDraft>;
