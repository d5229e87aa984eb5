import { OPEN_PAGE_PATH } from '#shared/contracts/open-page-path.js';
import type { SharedItemType } from '#shared/contracts/sharing.js';

/** Every address of the application, in one place. `pattern` is for the router, the rest for links. */
export const PATTERNS = {
  today: '/',
  look: '/look',
  signIn: '/sign-in',
  card: '/card',
  welcome: '/welcome',
  reset: '/reset',
  account: '/account',
  privacy: '/privacy',
  /** A village's page for whoever has its address. */
  openPage: OPEN_PAGE_PATH,
  stars: '/stars',
  moons: '/stars/moons',
  star: '/stars/:markerKey',
  drift: '/stars/:markerKey/drift',
  finder: '/finder',
  air: '/stars/:markerKey/air',
  newPlace: '/places/new',
  place: '/places/:placeId',
  village: '/village',
  villagePeople: '/village/people',
  villagePlaces: '/village/places',
  villageFigures: '/village/figures',
  villageSigns: '/village/signs',
  villageWords: '/village/words',
  newFigure: '/figures/new',
  figure: '/figures/:figureId',
  changeFigure: '/figures/:figureId/change',
  villageSettings: '/village/settings',
  villageRecords: '/village/records',
  villageCards: '/village/cards',
  villageAsking: '/village/asking',
  villageGroups: '/village/groups',
  villageConsents: '/village/consents',
  itemConsents: '/village/consents/:itemType/:itemId',
  calendars: '/calendars',
  calendar: '/calendars/:calendarId',
  versions: '/calendars/:calendarId/versions',
  version: '/calendars/:calendarId/versions/:number',
  review: '/calendars/:calendarId/versions/:number/review',
  ownEntries: '/calendars/:calendarId/versions/:number/own',
  meeting: '/calendars/:calendarId/versions/:number/meeting',
  compare: '/calendars/:calendarId/compare',
  rollover: '/calendars/:calendarId/rollover',
  seasonReview: '/calendars/:calendarId/season-review',
  longLook: '/calendars/:calendarId/long-look',
  moves: '/calendars/:calendarId/moves',
  sheet: '/calendars/:calendarId/sheet',
  takeBack: '/take-back/:communityId/:itemType/:itemId',
} as const;

type VersionNumber = number | 'draft';

/** What a new entry shall go by. */
interface MarkerQuery {
  marker?: string | undefined;
  phenomenon?: string | undefined;
  /** A sign of the sky instead, as JSON. */
  sky?: string | undefined;
  /** Which of such days in the year; left out for the first. */
  occurrence?: number | undefined;
}

/** What the finder is asked, as its address has it. */
interface FinderQuery {
  placeId?: string;
  year?: number;
  /** `MM-DD`. */
  from?: string;
  by?: 'old';
  old?: string;
  its?: string;
  since?: number;
  calendar?: string;
  entry?: string;
}

export const paths = {
  today: () => PATTERNS.today,
  /** Where to look for a star; without a date on the next day that serves. */
  look: (query: { marker: string; phenomenon?: string; date?: string; placeId?: string }) =>
    withQuery(PATTERNS.look, query),
  signIn: (next?: string) => withQuery(PATTERNS.signIn, { next }),
  /** The code travels behind the hash: it never reaches a server's log. */
  welcome: (code?: string) =>
    code === undefined ? PATTERNS.welcome : `${PATTERNS.welcome}#code=${encodeURIComponent(code)}`,
  /** Printed cards carry their code behind the hash. */
  card: () => PATTERNS.card,
  reset: () => PATTERNS.reset,
  account: () => PATTERNS.account,
  privacy: () => PATTERNS.privacy,
  openPage: (page: string) => withQuery(PATTERNS.openPage, { page }),
  stars: (query: { placeId?: string; year?: number } = {}) => withQuery(PATTERNS.stars, query),
  moons: (query: { year?: number } = {}) => withQuery(PATTERNS.moons, query),
  star: (markerKey: string, query: { placeId?: string; year?: number } = {}) =>
    withQuery(`/stars/${encodeURIComponent(markerKey)}`, query),
  /** How a marker moved through the centuries; `year` is the one on screen. */
  drift: (markerKey: string, query: { placeId?: string; year?: number } = {}) =>
    withQuery(`/stars/${encodeURIComponent(markerKey)}/drift`, query),
  /** Which marker falls near a day. With a calendar, its entry waits for the answer. */
  finder: (query: FinderQuery = {}) => withQuery(PATTERNS.finder, { ...query }),
  /** The same star in clear, ordinary and hazy air. */
  air: (markerKey: string, query: { placeId?: string; year?: number } = {}) =>
    withQuery(`/stars/${encodeURIComponent(markerKey)}/air`, query),
  newPlace: () => PATTERNS.newPlace,
  place: (placeId: string) => `/places/${encodeURIComponent(placeId)}`,
  village: () => PATTERNS.village,
  villagePeople: () => PATTERNS.villagePeople,
  villagePlaces: () => PATTERNS.villagePlaces,
  villageFigures: () => PATTERNS.villageFigures,
  villageSigns: () => PATTERNS.villageSigns,
  villageWords: () => PATTERNS.villageWords,
  newFigure: () => PATTERNS.newFigure,
  figure: (figureId: string) => `/figures/${encodeURIComponent(figureId)}`,
  changeFigure: (figureId: string) => `/figures/${encodeURIComponent(figureId)}/change`,
  villageSettings: () => PATTERNS.villageSettings,
  villageRecords: () => PATTERNS.villageRecords,
  villageCards: () => PATTERNS.villageCards,
  villageAsking: () => PATTERNS.villageAsking,
  villageGroups: () => PATTERNS.villageGroups,
  villageConsents: () => PATTERNS.villageConsents,
  /** What was agreed about one thing. */
  itemConsents: (itemType: string, itemId: string) =>
    `/village/consents/${encodeURIComponent(itemType)}/${encodeURIComponent(itemId)}`,
  /** With a marker, the person chooses a calendar and a new entry then goes by it. */
  calendars: (query: MarkerQuery = {}) => withQuery(PATTERNS.calendars, { ...query }),
  calendar: (calendarId: string, query: { entry?: string } & MarkerQuery = {}) =>
    withQuery(calendarPath(calendarId), { ...query }),
  versions: (calendarId: string) => `${calendarPath(calendarId)}/versions`,
  version: (calendarId: string, number: VersionNumber) => versionPath(calendarId, number),
  meeting: (calendarId: string, number: VersionNumber) => `${versionPath(calendarId, number)}/meeting`,
  review: (calendarId: string, number: VersionNumber, query: { entry?: string } = {}) =>
    withQuery(`${versionPath(calendarId, number)}/review`, query),
  /** What the person keeps with others of a submission. */
  ownEntries: (calendarId: string, number: VersionNumber) => `${versionPath(calendarId, number)}/own`,
  compare: (calendarId: string, query: { from?: VersionNumber; to?: VersionNumber } = {}) =>
    withQuery(`${calendarPath(calendarId)}/compare`, query),
  /** What the new year changed in a draft that was rolled over. */
  rollover: (calendarId: string) => `${calendarPath(calendarId)}/rollover`,
  /** What is taken along of a draft and brought into it. */
  moves: (calendarId: string) => `${calendarPath(calendarId)}/moves`,
  /** The year looked back at. */
  seasonReview: (calendarId: string) => `${calendarPath(calendarId)}/season-review`,
  /** Ten years of it in one view. */
  longLook: (calendarId: string, query: { from?: number; number?: string } = {}) =>
    withQuery(`${calendarPath(calendarId)}/long-look`, query),
  sheet: (calendarId: string, query: { number?: VersionNumber } = {}) =>
    withQuery(`${calendarPath(calendarId)}/sheet`, query),
  takeBack: (communityId: string, itemType: SharedItemType, itemId: string) =>
    `/take-back/${encodeURIComponent(communityId)}/${itemType}/${encodeURIComponent(itemId)}`,
} as const;

/** Where a person goes after signing in: a page of ours, never another site's address. */
export function safeNext(next: string | null): string {
  const isOurs = next !== null && /^\/(?![/\\])/u.test(next) && !next.startsWith(PATTERNS.signIn);
  return isOurs ? next : PATTERNS.today;
}

function calendarPath(calendarId: string): string {
  return `/calendars/${encodeURIComponent(calendarId)}`;
}

function versionPath(calendarId: string, number: VersionNumber): string {
  return `${calendarPath(calendarId)}/versions/${String(number)}`;
}

function withQuery(path: string, query: Record<string, string | number | undefined>): string {
  const search = new URLSearchParams();
  for (const [key, value] of Object.entries(query)) if (value !== undefined) search.set(key, String(value));
  return search.size === 0 ? path : `${path}?${search.toString()}`;
}
