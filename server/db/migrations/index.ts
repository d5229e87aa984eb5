import { FirstSchema1796000000000 } from './1796000000000-first-schema.js';
import { Letters1796200000000 } from './1796200000000-letters.js';
import { Figures1796400000000 } from './1796400000000-figures.js';
import { Sharing1796600000000 } from './1796600000000-sharing.js';
import { RainMonths1797000000000 } from './1797000000000-rain-months.js';
import { Attachments1797200000000 } from './1797200000000-attachments.js';
import { AttachmentSharing1797300000000 } from './1797300000000-attachment-sharing.js';
import { Consents1797400000000 } from './1797400000000-consents.js';
import { Notes1797600000000 } from './1797600000000-notes.js';
import { Withdrawals1797800000000 } from './1797800000000-withdrawals.js';
import { Cards1797900000000 } from './1797900000000-cards.js';
import { Variants1798000000000 } from './1798000000000-variants.js';
import { AnswersOfItsPeople1798200000000 } from './1798200000000-answers-of-its-people.js';
import { ByEar1798300000000 } from './1798300000000-by-ear.js';
import { BeliefConsents1798400000000 } from './1798400000000-belief-consents.js';
import { Deaths1798410000000 } from './1798410000000-deaths.js';
import { ActualDates1798500000000 } from './1798500000000-actual-dates.js';
import { PeopleWithoutAddress1798510000000 } from './1798510000000-people-without-address.js';
import { CalendarFeeds1798600000000 } from './1798600000000-calendar-feeds.js';
import { Rollovers1798800000000 } from './1798800000000-rollovers.js';
import { CalendarImports1798900000000 } from './1798900000000-calendar-imports.js';
import { OpenPages1798910000000 } from './1798910000000-open-pages.js';
import { Signs1799000000000 } from './1799000000000-signs.js';
import { Weather1799000100000 } from './1799000100000-weather.js';
import { RolloverGrounds1799100000000 } from './1799100000000-rollover-grounds.js';
import { RestoredEntries1799110000000 } from './1799110000000-restored-entries.js';
import { WriteKeys1799200000000 } from './1799200000000-write-keys.js';
import { WordLists1799300000000 } from './1799300000000-word-lists.js';
import { LocalMonths1799750000000 } from './1799750000000-local-months.js';
import { OneKindOfKeys1799600000000 } from './1799600000000-one-kind-of-keys.js';
import { OlderEntries1799770000000 } from './1799770000000-older-entries.js';
import { AnswersAcrossWords1799780000000 } from './1799780000000-answers-across-words.js';
import { NoNames1799760000000 } from './1799760000000-no-names.js';
import { OwnSightings1799300100000 } from './1799300100000-own-sightings.js';
import { SeasonReviews1799400000000 } from './1799400000000-season-reviews.js';

/** In the order in which they run. */
export const MIGRATIONS = [
  FirstSchema1796000000000,
  Letters1796200000000,
  Figures1796400000000,
  Sharing1796600000000,
  RainMonths1797000000000,
  Attachments1797200000000,
  AttachmentSharing1797300000000,
  Consents1797400000000,
  Notes1797600000000,
  Withdrawals1797800000000,
  Cards1797900000000,
  Variants1798000000000,
  AnswersOfItsPeople1798200000000,
  ByEar1798300000000,
  BeliefConsents1798400000000,
  Deaths1798410000000,
  ActualDates1798500000000,
  PeopleWithoutAddress1798510000000,
  CalendarFeeds1798600000000,
  Rollovers1798800000000,
  CalendarImports1798900000000,
  OpenPages1798910000000,
  Signs1799000000000,
  Weather1799000100000,
  RolloverGrounds1799100000000,
  RestoredEntries1799110000000,
  WriteKeys1799200000000,
  WordLists1799300000000,
  OwnSightings1799300100000,
  SeasonReviews1799400000000,
  OneKindOfKeys1799600000000,
  LocalMonths1799750000000,
  NoNames1799760000000,
  OlderEntries1799770000000,
  AnswersAcrossWords1799780000000,
];
