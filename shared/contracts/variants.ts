import { z } from 'zod';
import { entryDates, entryLead, entryOffsets } from './calendars.js';
import { id, instant, line, listOf, rowVersion, text } from './common.js';
import { defineEndpoint, member } from './endpoint.js';
import { BASES, CONFIDENCES } from './event-record.js';
import { groupFitsLevel, PLAIN_DETAILS, sharingDetails, sharingLevel } from './sharing.js';

export const VARIANTS_MAX = 12;

/** In what a variant differs; the last is an objection: it should not be on a board at all. */
export const VARIANT_DIFFERENCES = [
  'other-marker',
  'other-offset',
  'other-sign',
  'other-rule',
  'not-on-a-board',
] as const;

const variantFields = z.strictObject({
  difference: z.enum(VARIANT_DIFFERENCES),
  lead: entryLead,
  offsets: entryOffsets,
  otherSigns: text(500),
  ifLate: text(500),
  /** Who goes by it, as they wish to be called (empty where their name was taken off), and who of the village's people here that is. */
  giver: line(120),
  giverId: id.nullable(),
  confidence: z.enum(CONFIDENCES),
  basis: z.enum(BASES),
  /** What its people say about the difference. */
  note: text(1000),
  sharingLevel,
  sharing: sharingDetails.optional(),
});

/** Another keeper's timing of the same work or rite: a full copy, beside the entry and never joined with it. */
export const variantInput = variantFields.superRefine((variant, context) => {
  const { groupId } = variant.sharing ?? PLAIN_DETAILS;
  if (['entry-planned', 'entry-actual', 'none'].includes(variant.lead.type)) {
    context.addIssue({ code: 'custom', path: ['lead'], message: 'not-in-list' });
  }
  groupFitsLevel({ level: variant.sharingLevel, groupId }, (message) => {
    context.addIssue({ code: 'custom', path: ['sharing', 'groupId'], message });
  });
});
export type VariantInput = z.infer<typeof variantInput>;
export const variantUpdate = z.strictObject({ content: variantInput, version: rowVersion });
export type VariantUpdate = z.infer<typeof variantUpdate>;

/** A variant as it was frozen with a version. */
export const frozenVariant = z.strictObject({ variantId: id, content: variantInput, dates: entryDates });
export type FrozenVariant = z.infer<typeof frozenVariant>;

export const variant = frozenVariant.extend({
  entryId: id,
  updatedBy: z.string(),
  updatedAt: instant,
  mine: z.boolean(),
  version: rowVersion,
});
export type Variant = z.infer<typeof variant>;

const entryParams = z.strictObject({ calendarId: id, entryId: id });
const variantParams = entryParams.extend({ variantId: id });
const path = '/api/calendars/:calendarId/entries/:entryId/variants';

export const variantsEndpoints = {
  list: defineEndpoint({
    id: 'listVariants',
    method: 'GET',
    path,
    summary: 'Other keepers’ timings of an entry of the draft, as far as the person may see them',
    access: member('calendar', 'officer', 'elder', 'steward'),
    params: entryParams,
    response: listOf(variant),
  }),
  add: defineEndpoint({
    id: 'addVariant',
    method: 'POST',
    path,
    summary: 'Put another keeper’s timing beside an entry of the draft',
    access: member('calendar', 'officer', 'elder'),
    params: entryParams,
    body: variantInput,
    response: variant,
    status: 201,
    countsOnce: true,
  }),
  update: defineEndpoint({
    id: 'updateVariant',
    method: 'PUT',
    path: `${path}/:variantId`,
    summary: 'Save a variant; 409 with both states when somebody saved a newer one',
    access: member('calendar', 'officer', 'elder'),
    params: variantParams,
    body: variantUpdate,
    response: variant,
    countsOnce: true,
  }),
  remove: defineEndpoint({
    id: 'removeVariant',
    method: 'DELETE',
    path: `${path}/:variantId`,
    summary: 'Take a variant out of the draft; published versions keep it',
    access: member('calendar', 'officer', 'elder'),
    params: variantParams,
    countsOnce: true,
  }),
} as const;
