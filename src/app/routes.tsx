import type { QueryClient } from '@tanstack/react-query';
import type { ComponentType } from 'react';
import type { Params } from 'react-router-dom';
import type { Namespace } from '#shared/locales/index.js';
import { PATTERNS } from '#src/lib/paths.js';

/** One address of the application. Its code and its texts are fetched together, when it is first opened. */
export interface AppRoute {
  path: string;
  /** Text files the screen reads besides `common` and `problems`. */
  /** All that its first look says: a text that is missing then draws the whole page once more, for each one anew. */
  texts: readonly Namespace[];
  load: () => Promise<{ Component: ComponentType }>;
  /** Begins to read what the screen shows first, while its code is fetched. */
  askEarly?: (client: QueryClient, params: Params) => Promise<void>;
  /** False for a screen that needs the whole height: no rail. */
  rail?: boolean;
}

/** Screens before the door: anybody may open them. */
export const doorRoutes: readonly AppRoute[] = [
  { path: PATTERNS.signIn, texts: ['session'], load: () => import('./routes/sign-in.js') },
  { path: PATTERNS.card, texts: ['cards', 'session'], load: () => import('./routes/card.js') },
  { path: PATTERNS.reset, texts: ['session', 'letters'], load: () => import('./routes/reset.js') },
  { path: PATTERNS.privacy, texts: ['privacy'], load: () => import('./routes/privacy.js') },
  {
    path: PATTERNS.openPage,
    texts: ['open', 'calendars', 'sky', 'anchors'],
    load: () => import('./routes/open.js'),
  },
  { path: PATTERNS.welcome, texts: ['session'], load: () => import('./routes/welcome.js') },
];

/** Screens that work for a signed-in person without any village. */
export const personRoutes: readonly AppRoute[] = [
  {
    path: PATTERNS.account,
    texts: ['session', 'letters', 'withdrawals', 'privacy', 'helping'],
    load: () => import('./routes/account.js'),
  },
];

/** Screens of the village on screen. A feature adds one line for each of its screens. */
export const villageRoutes: readonly AppRoute[] = [
  {
    path: PATTERNS.today,
    texts: ['today', 'sky', 'withdrawals', 'weather'],
    load: () => import('./routes/today.js'),
  },
  { path: PATTERNS.look, texts: ['look', 'sky'], load: () => import('./routes/look.js') },
  { path: PATTERNS.stars, texts: ['stars', 'sky'], load: () => import('./routes/stars.js') },
  { path: PATTERNS.moons, texts: ['moons', 'sky'], load: () => import('./routes/moons.js') },
  { path: PATTERNS.star, texts: ['stars', 'sky', 'notes'], load: () => import('./routes/star.js') },
  { path: PATTERNS.drift, texts: ['drift', 'sky'], load: () => import('./routes/drift.js') },
  { path: PATTERNS.finder, texts: ['finder', 'sky'], load: () => import('./routes/finder.js') },
  { path: PATTERNS.air, texts: ['air', 'stars', 'sky'], load: () => import('./routes/air.js') },
  { path: PATTERNS.newPlace, texts: ['places', 'sky'], load: () => import('./routes/place-new.js') },
  { path: PATTERNS.place, texts: ['places', 'sky'], load: () => import('./routes/place.js') },
  { path: PATTERNS.village, texts: [], load: () => import('./routes/village.js') },
  {
    path: PATTERNS.villagePlaces,
    texts: ['people', 'places'],
    load: () => import('./routes/village-places.js'),
  },
  {
    path: PATTERNS.villageFigures,
    texts: ['people', 'figures'],
    load: () => import('./routes/village-figures.js'),
  },
  {
    path: PATTERNS.villageSigns,
    texts: ['people', 'signs', 'record', 'sharing'],
    load: () => import('./routes/village-signs.js'),
  },
  {
    path: PATTERNS.villageWords,
    texts: ['people', 'words', 'calendars', 'record'],
    load: () => import('./routes/village-words.js'),
  },
  { path: PATTERNS.newFigure, texts: ['figures'], load: () => import('./routes/figure-new.js') },
  {
    path: PATTERNS.figure,
    texts: ['figures', 'stars', 'sky', 'attachments', 'notes', 'sharing', 'consents'],
    load: () => import('./routes/figure.js'),
  },
  { path: PATTERNS.changeFigure, texts: ['figures'], load: () => import('./routes/figure-change.js') },
  { path: PATTERNS.villagePeople, texts: ['people'], load: () => import('./routes/village-people.js') },
  {
    path: PATTERNS.villageGroups,
    texts: ['people', 'sharing'],
    load: () => import('./routes/village-groups.js'),
  },
  {
    path: PATTERNS.villageAsking,
    texts: ['people', 'letters'],
    load: () => import('./routes/village-asking.js'),
  },
  {
    path: PATTERNS.villageConsents,
    texts: ['people', 'consents', 'sharing'],
    load: () => import('./routes/village-consents.js'),
  },
  {
    path: PATTERNS.itemConsents,
    texts: ['consents', 'sharing', 'attachments'],
    load: () => import('./routes/item-consents.js'),
  },
  {
    path: PATTERNS.calendars,
    texts: ['calendars', 'sky', 'rollovers', 'season'],
    load: () => import('./routes/calendars.js'),
  },
  {
    path: PATTERNS.calendar,
    texts: [
      'calendars',
      'anchors',
      'strip',
      'record',
      'words',
      'signs',
      'variants',
      'versions',
      'season',
      'sky',
      'attachments',
      'notes',
      'sharing',
      'consents',
    ],
    load: () => import('./routes/calendar.js'),
    askEarly: async (client, { calendarId = '' }) => {
      const { askEarly } = await import('#src/features/calendars/api/ask-early.js');
      await askEarly(client, calendarId);
    },
  },
  {
    path: PATTERNS.versions,
    texts: ['versions'],
    load: () => import('./routes/versions.js'),
  },
  {
    path: PATTERNS.version,
    texts: [
      'versions',
      'calendars',
      'anchors',
      'reviews',
      'places',
      'sky',
      'notes',
      'sharing',
      'exports',
      'open',
      'consents',
      'moves',
    ],
    load: () => import('./routes/version.js'),
  },
  {
    path: PATTERNS.compare,
    texts: ['versions', 'calendars', 'anchors', 'sky', 'moves'],
    load: () => import('./routes/compare.js'),
  },
  {
    path: PATTERNS.rollover,
    texts: ['rollovers', 'calendars', 'anchors', 'sky', 'moves'],
    load: () => import('./routes/rollover.js'),
  },
  {
    path: PATTERNS.seasonReview,
    texts: ['season', 'calendars', 'anchors', 'sky'],
    load: () => import('./routes/season-review.js'),
  },
  {
    path: PATTERNS.moves,
    texts: ['imports', 'exports', 'files', 'calendars', 'anchors', 'sky'],
    load: () => import('./routes/moves.js'),
  },
  {
    path: PATTERNS.longLook,
    texts: ['decades', 'calendars', 'anchors', 'sky'],
    load: () => import('./routes/long-look.js'),
  },
  { path: PATTERNS.sheet, texts: ['sheets'], load: () => import('./routes/sheet.js') },
  {
    path: PATTERNS.review,
    texts: ['reviews', 'sky', 'attachments', 'notes', 'sharing', 'consents'],
    load: () => import('./routes/review.js'),
    rail: false,
  },
  { path: PATTERNS.meeting, texts: ['reviews'], load: () => import('./routes/meeting.js') },
  {
    path: PATTERNS.ownEntries,
    texts: ['reviews', 'sky', 'sharing'],
    load: () => import('./routes/own-entries.js'),
    rail: false,
  },
  {
    path: PATTERNS.villageRecords,
    texts: ['audit', 'people'],
    load: () => import('./routes/village-records.js'),
  },
  {
    path: PATTERNS.takeBack,
    texts: ['withdrawals', 'sharing'],
    load: () => import('./routes/take-back.js'),
  },
  {
    path: PATTERNS.villageCards,
    texts: ['cards', 'people'],
    load: () => import('./routes/village-cards.js'),
  },
  { path: PATTERNS.villageSettings, texts: ['people'], load: () => import('./routes/village-settings.js') },
];
