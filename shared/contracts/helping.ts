import { z } from 'zod';
import { cardSignIn } from './cards.js';
import { id, listOf } from './common.js';
import { defineEndpoint, member } from './endpoint.js';
import { ROLES } from './people.js';
import { sessionState } from './session.js';

/** Helping is over by itself after so long: whoever was helped may have gone home. */
export const HELPING_MINUTES = 30;

/** Somebody who may be helped. */
export const helpable = z.strictObject({
  personId: id,
  displayName: z.string(),
  /** They have a card with a PIN that they can show. */
  hasPin: z.boolean(),
});
export type Helpable = z.infer<typeof helpable>;

export const helpingInput = z.strictObject({
  personId: id,
  /** Their card lies there and they type its PIN: their helper then sees what they see. Null without. */
  card: cardSignIn.nullable(),
});
export type HelpingInput = z.infer<typeof helpingInput>;

const communityParams = z.strictObject({ communityId: id });

export const helpingEndpoints = {
  list: defineEndpoint({
    id: 'listHelpable',
    method: 'GET',
    path: '/api/communities/:communityId/helping',
    summary: 'Whom somebody may help: elders, and observers for those who compile, review and sign',
    access: member('community', ...ROLES),
    params: communityParams,
    response: listOf(helpable),
  }),
  start: defineEndpoint({
    id: 'startHelping',
    method: 'POST',
    path: '/api/communities/:communityId/helping',
    summary:
      'Write for an elder or observer on this device for half an hour; with their card and PIN one sees what they see',
    access: member('community', ...ROLES),
    params: communityParams,
    body: helpingInput,
    response: sessionState,
  }),
  end: defineEndpoint({
    id: 'endHelping',
    method: 'DELETE',
    path: '/api/communities/:communityId/helping',
    summary: 'Write for oneself again',
    access: member('community', ...ROLES),
    params: communityParams,
    response: sessionState,
  }),
} as const;
