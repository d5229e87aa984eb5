import type { Endpoint } from './endpoint.js';
import { afterDeathEndpoints } from './after-death.js';
import { airEndpoints } from './air.js';
import { attachmentsEndpoints } from './attachments.js';
import { auditEndpoints } from './audit.js';
import { calendarsEndpoints } from './calendars.js';
import { consentsEndpoints } from './consents.js';
import { cardsEndpoints } from './cards.js';
import { draftChangesEndpoints } from './draft-changes.js';
import { decadesEndpoints } from './decades.js';
import { driftEndpoints } from './drift.js';
import { exportsEndpoints } from './exports.js';
import { finderEndpoints } from './finder.js';
import { figuresEndpoints } from './figures.js';
import { healthEndpoints } from './health.js';
import { helpingEndpoints } from './helping.js';
import { meetingsEndpoints } from './meetings.js';
import { lookEndpoints } from './look.js';
import { moonsEndpoints } from './moons.js';
import { lettersEndpoints } from './letters.js';
import { notesEndpoints } from './notes.js';
import { peopleEndpoints } from './people.js';
import { placesEndpoints } from './places.js';
import { privacyEndpoints } from './privacy.js';
import { reviewsEndpoints } from './reviews.js';
import { rolloversEndpoints } from './rollovers.js';
import { seasonReviewsEndpoints } from './season-reviews.js';
import { sessionEndpoints } from './session.js';
import { openPageEndpoints } from './open-page.js';
import { importsEndpoints } from './imports.js';
import { sharingEndpoints } from './sharing.js';
import { sheetsEndpoints } from './sheets.js';
import { signsEndpoints } from './signs.js';
import { skyMarkersEndpoints } from './sky-markers.js';
import { starsEndpoints } from './stars.js';
import { todayEndpoints } from './today.js';
import { actualDaysEndpoints } from './actual-days.js';
import { variantsEndpoints } from './variants.js';
import { withdrawalsEndpoints } from './withdrawals.js';
import { weatherEndpoints } from './weather.js';
import { wordListsEndpoints } from './word-lists.js';
import { versionsEndpoints } from './versions.js';

/** Every operation of the API. The server mounts exactly these; OpenAPI and the permission table list them. */
export const ENDPOINTS: readonly Endpoint[] = [
  healthEndpoints,
  sessionEndpoints,
  privacyEndpoints,
  cardsEndpoints,
  helpingEndpoints,
  lettersEndpoints,
  afterDeathEndpoints,
  peopleEndpoints,
  placesEndpoints,
  starsEndpoints,
  skyMarkersEndpoints,
  finderEndpoints,
  driftEndpoints,
  moonsEndpoints,
  airEndpoints,
  figuresEndpoints,
  signsEndpoints,
  calendarsEndpoints,
  draftChangesEndpoints,
  actualDaysEndpoints,
  decadesEndpoints,
  rolloversEndpoints,
  seasonReviewsEndpoints,
  variantsEndpoints,
  versionsEndpoints,
  reviewsEndpoints,
  meetingsEndpoints,
  attachmentsEndpoints,
  sheetsEndpoints,
  exportsEndpoints,
  importsEndpoints,
  openPageEndpoints,
  sharingEndpoints,
  notesEndpoints,
  withdrawalsEndpoints,
  consentsEndpoints,
  auditEndpoints,
  todayEndpoints,
  weatherEndpoints,
  wordListsEndpoints,
  lookEndpoints,
].flatMap((group) => Object.values(group) as Endpoint[]);
