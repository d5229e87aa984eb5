import { z } from 'zod';
import { id, instant, line, listOf, monthDay, rowVersion } from './common.js';
import { defineEndpoint, member, signedIn } from './endpoint.js';
import { localMonths, moonNames } from './local-months.js';

export const ROLES = ['steward', 'officer', 'elder', 'staff', 'observer'] as const;
export type Role = (typeof ROLES)[number];
export const role = z.enum(ROLES);
/** A card is weaker than a password, so it is for people who compile, print and administer nothing. */
export const CARD_ROLES = ['elder', 'observer'] as const;
export const isCardRole = (one: Role): boolean => CARD_ROLES.some((each) => each === one);
export const roles = z
  .array(role)
  .min(1, 'choose-one')
  .max(ROLES.length)
  .refine((list) => new Set(list).size === list.length, 'no-duplicates');

export const EMAIL_MAX = 190;
export const PASSWORD_MIN = 12;
export const PASSWORD_MAX = 200;

export const email = z
  .string()
  .transform((value) => value.trim().toLowerCase())
  .pipe(z.email('not-an-email').max(EMAIL_MAX, 'too-long'));

/** Empty for somebody who has none. */
const emailOrNone = z
  .string()
  .transform((value) => value.trim().toLowerCase())
  .pipe(
    z
      .string()
      .max(EMAIL_MAX, 'too-long')
      .refine((value) => value === '' || z.email().safeParse(value).success, 'not-an-email'),
  );

/** Twelve characters in three groups; hyphens and case do not matter. */
export const oneTimeCode = z
  .string()
  .transform((value) => value.toUpperCase().replace(/[^A-Z0-9]/gu, ''))
  .pipe(z.string().length(12, 'code-length'));

export const languageTag = z
  .string()
  .regex(/^[A-Za-z]{2,8}(-[A-Za-z0-9]{1,8})*$/u, 'language-tag')
  .max(35);
export const language = z.strictObject({ tag: languageTag, name: line(60, 1) });
export type Language = z.infer<typeof language>;

/**
 * Who must sign before a submission counts as signed off: at least `minElders` elders, everybody of `mustSign`,
 * at least one of `oneOf` (where it names anybody), and the steward where `steward` is set.
 */
export const signOffRule = z.strictObject({
  minElders: z.number().int().min(1, 'at-least-one-elder').max(20),
  mustSign: z.array(id).max(20),
  oneOf: z.array(id).max(20),
  steward: z.boolean(),
});
export type SignOffRule = z.infer<typeof signOffRule>;

export const communityInput = z.strictObject({
  name: line(120, 1),
  villageLanguage: language,
  officerLanguage: language,
  /** When the local year begins; the note says it in the village's own terms. */
  yearStart: z.strictObject({ date: monthDay, note: line(200) }),
  /** What the village calls parts of its year, if it names any. */
  localMonths,
  moonNames,
  weatherContact: line(200),
  agricultureContact: line(200),
  signOffRule,
});
export type CommunityInput = z.infer<typeof communityInput>;

export const community = communityInput.extend({ id, version: rowVersion });
export type Community = z.infer<typeof community>;

export const membership = z.strictObject({
  communityId: id,
  communityName: z.string(),
  roles: z.array(role),
});
export type Membership = z.infer<typeof membership>;

export const communityUpdate = communityInput.extend({ version: rowVersion });
export type CommunityUpdate = z.infer<typeof communityUpdate>;

export const communityPerson = z.strictObject({
  id,
  /** Empty where they have none, and for everybody but the steward. */
  email: z.string(),
  displayName: z.string(),
  roles: z.array(role),
  /** False until the one-time code has been used; whoever has no address needs none. */
  active: z.boolean(),
  codeExpiresAt: instant.nullable(),
  version: rowVersion,
});
export type CommunityPerson = z.infer<typeof communityPerson>;

export const personInput = z
  .strictObject({
    email: emailOrNone,
    displayName: line(80, 1),
    roles,
    /** Somebody without an address who belonged to this village before. */
    personId: id.optional(),
  })
  .refine(({ email, roles }) => email !== '' || roles.every(isCardRole), {
    path: ['email'],
    error: 'address-needed',
  });
export type PersonInput = z.infer<typeof personInput>;

/** `email` gives an address to somebody who has none. */
export const personUpdate = z.strictObject({ roles, email: emailOrNone.optional(), version: rowVersion });
export type PersonUpdate = z.infer<typeof personUpdate>;

/** Shown once. Null when the person already had an account and needs no code, or has no address. */
export const addedPerson = z.strictObject({ person: communityPerson, oneTimeCode: z.string().nullable() });
export type AddedPerson = z.infer<typeof addedPerson>;

const communityParams = z.strictObject({ communityId: id });
const personParams = z.strictObject({ communityId: id, personId: id });

export const peopleEndpoints = {
  listCommunities: defineEndpoint({
    id: 'listCommunities',
    method: 'GET',
    path: '/api/communities',
    summary: 'The communities of the person',
    access: signedIn,
    response: listOf(community),
  }),
  readCommunity: defineEndpoint({
    id: 'readCommunity',
    method: 'GET',
    path: '/api/communities/:communityId',
    summary: 'Settings of a community',
    access: member('community', ...ROLES),
    params: communityParams,
    response: community,
  }),
  updateCommunity: defineEndpoint({
    id: 'updateCommunity',
    method: 'PUT',
    path: '/api/communities/:communityId',
    summary: 'Change languages, year start, names of months and Moons, contacts and the sign-off rule',
    access: member('community', 'steward'),
    params: communityParams,
    body: communityUpdate,
    response: community,
  }),
  listPeople: defineEndpoint({
    id: 'listPeople',
    method: 'GET',
    path: '/api/communities/:communityId/people',
    summary: 'Who belongs to the community, with roles',
    access: member('community', 'steward', 'officer', 'elder'),
    params: communityParams,
    response: listOf(communityPerson),
  }),
  addPerson: defineEndpoint({
    id: 'addPerson',
    method: 'POST',
    path: '/api/communities/:communityId/people',
    summary: 'Add a person with a one-time code',
    access: member('community', 'steward'),
    params: communityParams,
    body: personInput,
    response: addedPerson,
    status: 201,
  }),
  updatePerson: defineEndpoint({
    id: 'updatePerson',
    method: 'PUT',
    path: '/api/communities/:communityId/people/:personId',
    summary: 'Set the roles of a person',
    access: member('community', 'steward'),
    params: personParams,
    body: personUpdate,
    response: communityPerson,
  }),
  renewCode: defineEndpoint({
    id: 'renewCode',
    method: 'POST',
    path: '/api/communities/:communityId/people/:personId/code',
    summary: 'A new one-time code for somebody who has not signed in yet',
    access: member('community', 'steward'),
    params: personParams,
    response: addedPerson,
    status: 201,
  }),
  removePerson: defineEndpoint({
    id: 'removePerson',
    method: 'DELETE',
    path: '/api/communities/:communityId/people/:personId',
    summary: 'End a membership; what the person wrote stays',
    access: member('community', 'steward'),
    params: personParams,
  }),
} as const;
