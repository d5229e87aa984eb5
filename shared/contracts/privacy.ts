import { z } from 'zod';
import { pin } from './cards.js';
import { instant } from './common.js';
import { anybody, defineEndpoint, signedIn } from './endpoint.js';
import { PASSWORD_MAX } from './people.js';

/** Why something about people is kept; every table belongs to one. */
export const PURPOSES = [
  'account',
  'membership',
  'signing-in',
  'letters',
  'places',
  'knowledge',
  'review',
  'voices',
  'agreement',
  'records',
  'taking-back',
  'sending-again',
] as const;
export type Purpose = (typeof PURPOSES)[number];

/** How many days that is kept which has done its service; the page says it and the server keeps to it. */
export const KEPT_DAYS = {
  /** Without use. */
  session: 14,
  /** A code, a link or a card, after its end. */
  endedWayIn: 30,
  letter: 400,
  /** That a write was done, in case a device that was without a network sends it again. */
  writeKey: 14,
} as const;

/** Who stands behind the machine and the post, as the operator said it; null where nothing was said. */
export const privacy = z.strictObject({
  purposes: z.array(z.strictObject({ purpose: z.enum(PURPOSES), tables: z.array(z.string()) })),
  hosting: z.string().nullable(),
  sendsLetters: z.boolean(),
});
export type Privacy = z.infer<typeof privacy>;

/** Everything that the tables hold about one person, table by table; secrets and what belongs to others left out. */
export const ownData = z.strictObject({
  exportedAt: instant,
  tables: z.record(z.string(), z.array(z.record(z.string(), z.unknown()))),
});
export type OwnData = z.infer<typeof ownData>;

export const leavingInput = z.strictObject({
  /** Proves who leaves; a session that a card opened is proved by the card's PIN instead. */
  password: z.string().min(1, 'required').max(PASSWORD_MAX, 'too-long').optional(),
  pin: pin.optional(),
  /** Whether everything that the person gave goes with them; otherwise it stays, without their name. */
  takeBackGiven: z.boolean(),
});
export type LeavingInput = z.infer<typeof leavingInput>;

export const privacyEndpoints = {
  read: defineEndpoint({
    id: 'readPrivacy',
    method: 'GET',
    path: '/api/privacy',
    summary: 'What is kept about people and why, where, and who else is involved',
    access: anybody,
    response: privacy,
  }),
  exportOwn: defineEndpoint({
    id: 'exportOwnData',
    method: 'GET',
    path: '/api/privacy/own-data',
    summary: 'Everything that is kept about the person who asks',
    access: signedIn,
    response: ownData,
  }),
  leave: defineEndpoint({
    id: 'leaveForGood',
    method: 'POST',
    path: '/api/privacy/leaving',
    summary: 'Leave every village for good: name, address, letters and ways in are erased',
    access: signedIn,
    body: leavingInput,
  }),
} as const;
