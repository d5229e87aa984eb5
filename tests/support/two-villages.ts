import type { Place } from '#shared/contracts/places.js';
import { addPicture } from './attachment-api.js';
import type { Client, TestApi } from './api.js';
import { addEntry, beginCalendar, openVillage, submit, type Village } from './calendar-api.js';
import { addFigure } from './figure-api.js';
import { firstPlace } from './place-api.js';
import { addGroup } from './sharing-api.js';

/** Ids of one village that really exist, under the names that paths give them. */
export interface VillageIds {
  communityId: string;
  placeId: string;
  calendarId: string;
  entryId: string;
  figureId: string;
  attachmentId: string;
  groupId: string;
  personId: string;
}

export interface TwoVillages {
  village: Village;
  /** Officer of the other village; nobody at home. */
  stranger: Client;
  home: VillageIds;
  away: VillageIds;
  place: Place;
}

/** Two villages, each with a calendar whose first version is in review, a figure and a picture of it. */
export async function openTwoVillages(api: TestApi): Promise<TwoVillages> {
  const village = await openVillage(api);
  const stranger = await api.signIn('officer2');
  const awayPlace = await firstPlace(stranger);
  const home = await furnish(village.officer, village);
  const away = await furnish(stranger, { ...village, officer: stranger, placeId: awayPlace.id });
  const group = await addGroup(village.steward, 'Weavers', [village.elder]);
  const steward = await api.signIn('steward2');
  const theirs = await addGroup(steward, 'Weavers', [stranger]);
  return {
    ...{ village, stranger },
    home: { ...home, groupId: group.id, personId: village.elder.personId },
    away: { ...away, groupId: theirs.id, personId: stranger.personId },
    place: await firstPlace(village.officer),
  };
}

async function furnish(officer: Client, village: Village): Promise<Omit<VillageIds, 'groupId' | 'personId'>> {
  const calendar = await beginCalendar(village);
  const entry = await addEntry(officer, calendar.id);
  await submit(officer, calendar.id);
  const figureId = (await addFigure(officer)).id;
  return {
    communityId: officer.communityId,
    placeId: village.placeId,
    calendarId: calendar.id,
    entryId: entry.id,
    figureId,
    attachmentId: (await addPicture(officer, figureId)).id,
  };
}
