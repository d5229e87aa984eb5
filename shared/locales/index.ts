import { texts as air } from './en/air.js';
import { texts as anchors } from './en/anchors.js';
import { texts as attachments } from './en/attachments.js';
import { texts as audit } from './en/audit.js';
import { texts as calendars } from './en/calendars.js';
import { texts as cards } from './en/cards.js';
import { texts as common } from './en/common.js';
import { texts as consents } from './en/consents.js';
import { texts as decades } from './en/decades.js';
import { texts as drift } from './en/drift.js';
import { texts as exports } from './en/exports.js';
import { texts as figures } from './en/figures.js';
import { texts as files } from './en/files.js';
import { texts as finder } from './en/finder.js';
import { texts as helping } from './en/helping.js';
import { texts as moves } from './en/moves.js';
import { texts as imports } from './en/imports.js';
import { texts as open } from './en/open.js';
import { texts as moons } from './en/moons.js';
import { texts as letters } from './en/letters.js';
import { texts as look } from './en/look.js';
import { texts as notes } from './en/notes.js';
import { texts as people } from './en/people.js';
import { texts as places } from './en/places.js';
import { texts as print } from './en/print.js';
import { texts as privacy } from './en/privacy.js';
import { texts as problems } from './en/problems.js';
import { texts as record } from './en/record.js';
import { texts as reviews } from './en/reviews.js';
import { texts as rollovers } from './en/rollovers.js';
import { texts as session } from './en/session.js';
import { texts as sharing } from './en/sharing.js';
import { texts as season } from './en/season.js';
import { texts as sheets } from './en/sheets.js';
import { texts as signs } from './en/signs.js';
import { texts as sky } from './en/sky.js';
import { texts as stars } from './en/stars.js';
import { texts as strip } from './en/strip.js';
import { texts as today } from './en/today.js';
import { texts as variants } from './en/variants.js';
import { texts as versions } from './en/versions.js';
import { texts as weather } from './en/weather.js';
import { texts as words } from './en/words.js';
import { texts as withdrawals } from './en/withdrawals.js';

/**
 * English is complete and the measure for every other language: another language is a folder with the same
 * files, and what it lacks falls back to English.
 */
export const en = {
  common,
  cards,
  session,
  files,
  helping,
  letters,
  look,
  notes,
  people,
  places,
  stars,
  strip,
  finder,
  decades,
  drift,
  exports,
  imports,
  open,
  moons,
  moves,
  air,
  figures,
  calendars,
  record,
  signs,
  weather,
  words,
  reviews,
  rollovers,
  season,
  sharing,
  consents,
  sheets,
  anchors,
  attachments,
  audit,
  print,
  privacy,
  problems,
  sky,
  today,
  variants,
  versions,
  withdrawals,
} as const;

export type Namespace = keyof typeof en;

/** Every text of every language: what a server or a test hands to i18next. */
export const resources = { en } as const;
