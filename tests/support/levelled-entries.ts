import type { EntryInput } from '#shared/contracts/calendars.js';
import { CONSENT_USES, type ConsentContent, type ConsentUse } from '#shared/contracts/consents.js';
import { PLAIN_DETAILS, type SharingDetails, type TellingSeason } from '#shared/contracts/sharing.js';
import { addDays, civilDateFromIso, daysBetween } from '#shared/kernel/iso-date.js';
import type { Combination, ConsentGiven, Season } from '../../docker-free-scripts/lib/visibility-rules.js';
import { TEST_NOW, type Client } from './api.js';
import { addConsent, consentsPath } from './consent-api.js';

/** The test's day lies inside the one and outside the other. */
export const TELLING_SEASONS: Readonly<Record<Season, TellingSeason | null>> = {
  none: null,
  inside: { from: { month: 11, day: 20 }, to: { month: 12, day: 10 } },
  outside: { from: { month: 8, day: 1 }, to: { month: 8, day: 31 } },
};

/** Whom narrow things name: their group and who comes after the giver. */
export interface Circle {
  giver: Client;
  successor: Client;
  groupId: string;
}

export function sharingOf({ level, season }: Combination, circle: Circle): SharingDetails {
  return {
    ...PLAIN_DETAILS,
    groupId: level === 'group' ? circle.groupId : null,
    successorId: circle.successor.personId,
    tellingSeason: TELLING_SEASONS[season],
  };
}

/** An entry of a combination; its word stands in everything that can be written, and its window is open today. */
export function levelledEntry(
  word: string,
  combination: Combination,
  circle: Circle,
  index: number,
): Partial<EntryInput> {
  return {
    ...{ titleOfficer: `Do ${word}`, titleVillage: word, notes: word, caution: word, otherSigns: word },
    // One word with what follows, so that a search finds it and a page for everybody takes the rest for no one's name.
    ...{ ifLate: word, giver: `${word}giver`, giverId: circle.giver.personId },
    ...openToday(index),
    sharingLevel: combination.level,
    sharing: sharingOf(combination, circle),
  };
}

const FIRST_LEAD_AFTER_DAYS = 40;
const LEADS_OVER_DAYS = 315;
const STEP_DAYS = 11;

/** Led by days all over the year, so that no page of a board is too full. */
function openToday(index: number): Pick<EntryInput, 'lead' | 'offsets'> {
  const today = TEST_NOW.toISOString().slice(0, 10);
  const lead = addDays(today, FIRST_LEAD_AFTER_DAYS + ((index * STEP_DAYS) % LEADS_OVER_DAYS));
  const { month, day } = civilDateFromIso(lead);
  return {
    lead: { type: 'fixed-date', date: { month, day }, source: 'As it was always done' },
    offsets: { earliestDays: -daysBetween(today, lead), bestFromDays: 0, bestToDays: 1, lastAdvisedDays: 2 },
  };
}

const USES: Readonly<Partial<Record<ConsentGiven, readonly ConsentUse[]>>> = {
  yes: CONSENT_USES,
  'only to be shown': ['keep', 'show'],
  'only to be kept': ['keep'],
  'no answer yet': [],
  refused: [],
  lapsed: CONSENT_USES,
  'taken back': CONSENT_USES,
};

const SAID: Readonly<Partial<Record<ConsentGiven, Partial<ConsentContent>>>> = {
  'no answer yet': { answer: 'asked', proof: null, naming: null },
  refused: { answer: 'refused', naming: null },
  lapsed: { askedOn: '2026-06-01', until: '2026-11-30' },
};

/** Brings a thing from "nobody asked" to what the combination says; answers with the consent's id, if there is one. */
export async function settleConsent(
  giver: Client,
  itemType: 'entry' | 'figure',
  itemId: string,
  { consent }: Combination,
  words: Partial<ConsentContent> = {},
): Promise<string | null> {
  if (consent === 'paused') {
    const path = `/api/communities/${giver.communityId}/items/${itemType}/${itemId}/pause`;
    await giver.post(path, { askedById: null }).expect(204);
  }
  const uses = USES[consent];
  if (uses === undefined) return null;
  const given = { ...words, ...SAID[consent], giverId: giver.personId, uses: [...uses] };
  const { id, version } = await addConsent(giver, itemType, itemId, given);
  if (consent === 'taken back') {
    await giver.post(consentsPath(giver, id, '/withdrawal'), { version }).expect(200);
  }
  return id;
}
