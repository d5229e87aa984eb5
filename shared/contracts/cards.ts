import { z } from 'zod';
import { id, instant, line, listOf } from './common.js';
import { anybody, defineEndpoint, member } from './endpoint.js';
import { role } from './people.js';
import { sessionState } from './session.js';

export const PIN_MAX = 6;
/** A card nobody has used by then opens nothing: whoever finds it could choose its PIN. */
export const CARD_FIRST_USE_DAYS = 14;
export const CARD_CODE_LENGTH = 18;

/** Eighteen letters and digits in groups of three; hyphens, spaces and case do not matter. */
export const cardCode = z
  .string()
  .max(200, 'too-long')
  .transform((value) => value.toUpperCase().replace(/[^A-Z0-9]/gu, ''))
  .pipe(z.string().length(CARD_CODE_LENGTH, 'card-code-length'));

export const pin = z.string().regex(/^\d{4,6}$/u, 'pin-digits');

/** Not all the same, not counting up or down by one. */
export const newPin = pin.refine((digits) => !isEasy(digits), 'pin-too-easy');

export const CARD_ENDS = ['revoked', 'replaced', 'guessed', 'left', 'roles'] as const;
export type CardEnd = (typeof CARD_ENDS)[number];

/** The latest card of a person. What opens it is shown once, when it is made. */
export const card = z.strictObject({
  madeAt: instant,
  madeByName: z.string(),
  state: z.enum(['waiting', 'in-use', 'run-out', 'ended']),
  /** Until when its first use has to be; null once it was used. */
  firstUseUntil: instant.nullable(),
  lastUsedAt: instant.nullable(),
  lockedUntil: instant.nullable(),
  endedWhy: z.enum(CARD_ENDS).nullable(),
});
export type Card = z.infer<typeof card>;

export const cardHolder = z.strictObject({
  personId: id,
  displayName: z.string(),
  roles: z.array(role),
  /** False for whoever holds a role that a card is too weak for. */
  mayHaveCard: z.boolean(),
  card: card.nullable(),
});
export type CardHolder = z.infer<typeof cardHolder>;

export const madeCard = z.strictObject({ holder: cardHolder, code: z.string() });
export type MadeCard = z.infer<typeof madeCard>;

export const CARD_SIZES = ['a6', 'a7'] as const;
export type CardSize = (typeof CARD_SIZES)[number];

export const cardPrint = z.strictObject({
  code: cardCode,
  /** As the person wishes to be called on paper; may stay empty. */
  name: line(60),
  size: z.enum(CARD_SIZES),
});
export type CardPrint = z.infer<typeof cardPrint>;

export const cardOpening = z.strictObject({ code: cardCode });
/** What comes next. Nothing tells whose card it is. */
export const openedCard = z.strictObject({ next: z.enum(['choose-pin', 'enter-pin']) });
export type OpenedCard = z.infer<typeof openedCard>;

export const cardSignIn = z.strictObject({ code: cardCode, pin });
export const cardFirstUse = z.strictObject({ code: cardCode, pin: newPin });

const personParams = z.strictObject({ communityId: id, personId: id });

export const cardsEndpoints = {
  list: defineEndpoint({
    id: 'listCards',
    method: 'GET',
    path: '/api/communities/:communityId/cards',
    summary: 'Sign-in cards: the steward sees everybody’s, elders and observers their own',
    access: member('community', 'steward', 'elder', 'observer'),
    params: z.strictObject({ communityId: id }),
    response: listOf(cardHolder),
  }),
  make: defineEndpoint({
    id: 'makeCard',
    method: 'POST',
    path: '/api/communities/:communityId/people/:personId/card',
    summary: 'Make a sign-in card; the one before opens nothing any more',
    access: member('community', 'steward'),
    params: personParams,
    response: madeCard,
    status: 201,
  }),
  print: defineEndpoint({
    id: 'printCard',
    method: 'POST',
    path: '/api/communities/:communityId/people/:personId/card/print',
    summary: 'The card as a PDF, for whoever has its code',
    access: member('community', 'steward'),
    params: personParams,
    body: cardPrint,
    fileType: 'application/pdf',
  }),
  end: defineEndpoint({
    id: 'endCard',
    method: 'DELETE',
    path: '/api/communities/:communityId/people/:personId/card',
    summary: 'End a card and every session it opened: the steward anybody’s, elders and observers their own',
    access: member('community', 'steward', 'elder', 'observer'),
    params: personParams,
  }),
  open: defineEndpoint({
    id: 'openCard',
    method: 'POST',
    path: '/api/session/card/open',
    summary: 'Whether the PIN of a card is still to be chosen',
    access: anybody,
    body: cardOpening,
    response: openedCard,
  }),
  choosePin: defineEndpoint({
    id: 'chooseCardPin',
    method: 'POST',
    path: '/api/session/card/pin',
    summary: 'Choose the PIN at the first use of a card, and sign in',
    access: anybody,
    body: cardFirstUse,
    response: sessionState,
  }),
  signIn: defineEndpoint({
    id: 'signInByCard',
    method: 'POST',
    path: '/api/session/card',
    summary: 'Sign in with a card and its PIN',
    access: anybody,
    body: cardSignIn,
    response: sessionState,
  }),
} as const;

function isEasy(digits: string): boolean {
  const steps = new Set(
    Array.from(digits)
      .slice(1)
      .map((digit, index) => Number(digit) - Number(digits[index])),
  );
  const [step = 9] = steps;
  return steps.size === 1 && Math.abs(step) <= 1;
}
