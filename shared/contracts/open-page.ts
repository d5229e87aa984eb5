import { z } from 'zod';
import { entryIcon, entryKind, entryWindow } from './calendars.js';
import { id, instant, listOf } from './common.js';
import { defineEndpoint, member, anybody } from './endpoint.js';
import { markerKey, markerNames, phenomenon } from './stars.js';

/** How much of the place the page tells, from nothing to its name with a tenth of a degree (about eleven kilometres). */
export const PLACES_SHOWN = ['nothing', 'name', 'degree', 'tenth'] as const;
export const placeShown = z.enum(PLACES_SHOWN);
export type PlaceShown = (typeof PLACES_SHOWN)[number];

/** The village's page for everybody; off while there is no key. */
export const openPageState = z.strictObject({
  key: z.string().nullable(),
  placeShown,
  switchedOnAt: instant.nullable(),
});
export type OpenPageState = z.infer<typeof openPageState>;

/** One entry for everybody: what, when and by which star; no person, no office, no source. */
const openEntry = z.strictObject({
  entryId: id,
  titleVillage: z.string(),
  titleOfficer: z.string(),
  kind: entryKind,
  icon: entryIcon,
  /** What the village calls its kind, where it has a word of its own; else empty. */
  kindWord: z.string(),
  crop: z.string(),
  otherSigns: z.string(),
  ifLate: z.string(),
  caution: z.string(),
  protectiveWatch: z.boolean(),
  window: entryWindow.nullable(),
  /** The star that it goes by; null for everything else. */
  star: z.strictObject({ markerKey, phenomenon }).nullable(),
});
export type OpenEntry = z.infer<typeof openEntry>;

export const openPage = z.strictObject({
  communityName: z.string(),
  placeName: z.string().nullable(),
  /** Rounded as the village chose. */
  place: z
    .strictObject({ latitudeDeg: z.number(), longitudeDeg: z.number(), roundedToDeg: z.number() })
    .nullable(),
  /** Null while nothing is published. */
  version: z.strictObject({ year: z.number().int(), label: z.string(), publishedAt: instant }).nullable(),
  markers: z.array(markerNames),
  entries: z.array(openEntry),
});
export type OpenPage = z.infer<typeof openPage>;

/** Words of an open entry that are searched for names. */
export const OPEN_WORDS = [
  'titleVillage',
  'titleOfficer',
  'kindWord',
  'crop',
  'otherSigns',
  'ifLate',
  'caution',
] as const satisfies readonly (keyof z.infer<typeof openEntry>)[];
export type OpenWord = (typeof OPEN_WORDS)[number];

/** What the page still waits for: a yes of those who gave the entry or the figure that it goes by, or the figure being open. */
export const AWAITED_OF_OPEN_PAGE = ['nobody-asked', 'no-answer', 'not-agreed', 'not-open'] as const;

const awaitedOfOpenPage = z.strictObject({
  itemType: z.enum(['entry', 'figure']),
  itemId: id,
  what: z.enum(AWAITED_OF_OPEN_PAGE),
});
export type AwaitedOfOpenPage = z.infer<typeof awaitedOfOpenPage>;

/** Stands for the words, the name and who is called so, as they were when it was read. */
const foundKey = z.string().regex(/^[0-9a-f]{64}$/u);

/** That a name which was found in words of an entry is none there. */
export const noNameInput = z.strictObject({ entryId: id, word: z.enum(OPEN_WORDS), key: foundKey });
export type NoNameInput = z.infer<typeof noNameInput>;

/** What the page leaves out of what is open in the newest published version, for whoever keeps the page. */
export const leftOutOfOpenPage = z.strictObject({
  entryId: id,
  title: z.string(),
  /** Empty where it stands there, save some of its words. */
  awaited: z.array(awaitedOfOpenPage),
  /** Where names were found, and whose; these words stay out, of a title the whole entry. */
  found: z.array(
    z.strictObject({
      word: z.enum(OPEN_WORDS),
      text: z.string(),
      names: z.array(z.strictObject({ name: z.string(), key: foundKey })),
    }),
  ),
  /** What would be taken for a name, had nobody said that it is none there. */
  noNames: z.array(
    z.strictObject({
      ...{ id, word: z.enum(OPEN_WORDS), text: z.string(), name: z.string() },
      ...{ saidByName: z.string(), saidAt: instant },
    }),
  ),
});
export type LeftOutOfOpenPage = z.infer<typeof leftOutOfOpenPage>;

const params = z.strictObject({ communityId: id });
const keepers = member('community', 'officer', 'steward');

export const openPageEndpoints = {
  state: defineEndpoint({
    id: 'readOpenPageState',
    method: 'GET',
    path: '/api/communities/:communityId/open-page',
    summary: 'Whether the village has a page for everybody, and its key',
    access: keepers,
    params,
    response: openPageState,
  }),
  leftOut: defineEndpoint({
    id: 'listLeftOutOfOpenPage',
    method: 'GET',
    path: '/api/communities/:communityId/open-page/left-out',
    summary:
      'What is open and yet not on the page for everybody: a yes is missing, or a name was found in its words',
    access: keepers,
    params,
    response: listOf(leftOutOfOpenPage),
  }),
  sayNoName: defineEndpoint({
    id: 'sayNoName',
    method: 'POST',
    path: '/api/communities/:communityId/open-page/no-names',
    summary:
      'Say that what was found in words of an entry is nobody’s name there; asked anew when the words or the people change',
    access: keepers,
    params,
    body: noNameInput,
  }),
  takeBackNoName: defineEndpoint({
    id: 'takeBackNoName',
    method: 'DELETE',
    path: '/api/communities/:communityId/open-page/no-names/:noNameId',
    summary: 'Take back that something is nobody’s name; what is taken back already stays so',
    access: keepers,
    params: params.extend({ noNameId: id }),
  }),
  code: defineEndpoint({
    id: 'drawOpenPageCode',
    method: 'GET',
    path: '/api/communities/:communityId/open-page/code.svg',
    summary: 'The address of the page as a QR code, to print',
    access: keepers,
    params,
    fileType: 'image/svg+xml',
  }),
  card: defineEndpoint({
    id: 'printOpenPageCard',
    method: 'GET',
    path: '/api/communities/:communityId/open-page/card.pdf',
    summary: 'A card to hang up, with the address of the page to scan and to type',
    access: keepers,
    params,
    fileType: 'application/pdf',
  }),
  read: defineEndpoint({
    id: 'readOpenPage',
    method: 'GET',
    // The key stands in the query, because paths are written into logs.
    path: '/api/open-page',
    summary: 'The open entries of what the village published last, for whoever has the address',
    access: anybody,
    query: z.strictObject({ key: z.string().max(200) }),
    response: openPage,
  }),
  switchOn: defineEndpoint({
    id: 'switchOpenPageOn',
    method: 'PUT',
    path: '/api/communities/:communityId/open-page',
    summary: 'Switch the page for everybody on, or say how much of the place it tells; its address stays',
    access: keepers,
    params,
    body: z.strictObject({ placeShown }),
    response: openPageState,
  }),
  switchOff: defineEndpoint({
    id: 'switchOpenPageOff',
    method: 'DELETE',
    path: '/api/communities/:communityId/open-page',
    summary: 'Switch the page for everybody off; its address is never used again',
    access: keepers,
    params,
  }),
} as const;
