import type { Calendar, Entry, EntryInput } from '#shared/contracts/calendars.js';
import type { Role } from '#shared/contracts/people.js';
import type { Place } from '#shared/contracts/places.js';
import type { AnswerInput } from '#shared/contracts/reviews.js';
import type { Problem } from '#shared/contracts/problem.js';
import type { Version } from '#shared/contracts/versions.js';
import { MembershipEntity } from '#server/db/entities/membership.entity.js';
import { PlaceEntity } from '#server/db/entities/place.entity.js';
import { randomUUID } from 'node:crypto';
import type { Response } from 'supertest';
import type { Client, TestApi } from './api.js';
import { withoutSigns } from './event-record.js';

/** Whom the demo village needs to bring a calendar from nothing to the wall. */
export interface Village {
  officer: Client;
  steward: Client;
  elder: Client;
  elder2: Client;
  elder3: Client;
  placeId: string;
}

/** A signed-in browser for each, and the village's place. */
export async function openVillage(api: TestApi): Promise<Village> {
  const [officer, steward, elder, elder2, elder3] = await Promise.all([
    api.signIn('officer'),
    api.signIn('steward'),
    api.signIn('elder'),
    api.signIn('elder2'),
    api.signIn('elder3'),
  ]);
  const place = await api.dataSource
    .getRepository(PlaceEntity)
    .findOneByOrFail({ communityId: officer.communityId });
  return { officer, steward, elder, elder2, elder3, placeId: place.id };
}

/** Sowing by the Pleiades’ first morning; a whole entry, ready to send. */
export function entryInput(changes: Partial<EntryInput> = {}): EntryInput {
  return {
    titleVillage: 'Ŋɔ́rɛ̃ ɓèŋu',
    titleOfficer: 'Sow long millet',
    kind: 'farm',
    icon: 'sow',
    crop: 'long millet',
    notes: '',
    caution: '',
    lead: { type: 'marker', markerKey: 'pleiades', phenomenon: 'heliacal-rising', occurrence: 1 },
    offsets: { earliestDays: 3, bestFromDays: 7, bestToDays: 23, lastAdvisedDays: 28 },
    hasLastDate: false,
    lastDate: null,
    protectiveWatch: false,
    otherSigns: 'Soil wet to a hand depth',
    ifLate: '',
    giver: '',
    agreedToPrint: false,
    sharingLevel: 'open',
    ...changes,
  };
}

export async function beginCalendar(village: Village, year = 2027): Promise<Calendar> {
  const { officer, placeId } = village;
  const path = `/api/communities/${officer.communityId}/calendars`;
  return (await officer.post(path, { placeId, year }).expect(201)).body as Calendar;
}

/** A calendar of the same sky and year: a second place with all that the village's first has. */
export async function beginTwin({ dataSource }: TestApi, village: Village): Promise<Calendar> {
  const places = dataSource.getRepository(PlaceEntity);
  const placeId = randomUUID();
  const first = await places.findOneByOrFail({ id: village.placeId });
  await places.insert(Object.assign(first, { id: placeId }));
  return beginCalendar({ ...village, placeId });
}

/** Everything said that elders may want to know: such an entry keeps no submission back. */
export function wholeEntry(changes: Partial<EntryInput> = {}): EntryInput {
  return entryInput({
    ...{ giver: 'Elder A-1', ifLate: 'Ask the office.', record: withoutSigns() },
    ...changes,
  });
}

export async function addEntry(
  officer: Client,
  calendarId: string,
  changes: Partial<EntryInput> = {},
): Promise<Entry> {
  const answer = await officer.post(`/api/calendars/${calendarId}/entries`, wholeEntry(changes)).expect(201);
  return answer.body as Entry;
}

export async function entriesOf(officer: Client, calendarId: string): Promise<Entry[]> {
  return ((await officer.get(`/api/calendars/${calendarId}/entries`).expect(200)).body as { items: Entry[] })
    .items;
}

export async function submit(officer: Client, calendarId: string): Promise<Version> {
  return (await officer.post(`/api/calendars/${calendarId}/versions`).expect(201)).body as Version;
}

/** Begins anew with a calendar of two entries that is out for review. */
export async function openSubmission(
  api: TestApi,
): Promise<{ village: Village; calendar: Calendar; version: Version }> {
  await api.reset();
  const village = await openVillage(api);
  const calendar = await beginCalendar(village);
  await addEntry(village.officer, calendar.id, { titleOfficer: 'Sow long millet' });
  await addEntry(village.officer, calendar.id, { titleOfficer: 'Seed check', crop: 'all seed' });
  return { village, calendar, version: await submit(village.officer, calendar.id) };
}

export async function readVersion(client: Client, { calendarId, number }: Version): Promise<Version> {
  return (await client.get(versionPath({ calendarId, number })).expect(200)).body as Version;
}

export function versionPath({ calendarId, number }: Pick<Version, 'calendarId' | 'number'>): string {
  return `/api/calendars/${calendarId}/versions/${number}`;
}

export function says(changes: Partial<AnswerInput> = {}): AnswerInput {
  return { answer: 'agree', note: '', onBehalfOf: null, witness: null, ...changes };
}

/** One elder’s same answer to every entry. */
export async function answerAll(elder: Client, version: Version, input = says()): Promise<void> {
  for (const { entryId } of version.entries) {
    await elder.put(`${versionPath(version)}/entries/${entryId}/answer`, input).expect(200);
  }
}

export function sign(client: Client, version: Version, role: 'elder' | 'steward') {
  return client.post(`${versionPath(version)}/signatures`, { role });
}

/** Answers and signatures as the demo village’s rule asks: Elder A-2, one of the others, the steward. */
export async function signOff(village: Village, version: Version): Promise<Version> {
  for (const elder of [village.elder, village.elder2]) {
    await answerAll(elder, version);
    await sign(elder, version, 'elder').expect(200);
  }
  return (await sign(village.steward, version, 'steward').expect(200)).body as Version;
}

export async function publish(village: Village, version: Version): Promise<Version> {
  await signOff(village, version);
  return (await village.officer.post(`${versionPath(version)}/publish`).expect(200)).body as Version;
}

/** Submits the draft and publishes it. */
export async function publishDraft(village: Village, calendarId: string): Promise<Version> {
  return publish(village, await submit(village.officer, calendarId));
}

export async function takeBack(officer: Client, version: Version): Promise<Version> {
  const body = { reason: 'taken-back', note: '' };
  return (await officer.post(`${versionPath(version)}/changes-asked`, body).expect(200)).body as Version;
}

export async function setRoles(
  api: TestApi,
  { personId, communityId }: Client,
  roles: Role[],
): Promise<void> {
  await api.dataSource.getRepository(MembershipEntity).update({ personId, communityId }, { roles });
}

export async function changePlace(api: TestApi, placeId: string, changes: Partial<Place>): Promise<void> {
  await api.dataSource.getRepository(PlaceEntity).update({ id: placeId }, changes);
}

/** The narrower reason of a refusal, or its type where it has none. */
export function reasonOf(answer: Response): string {
  const { reason, type } = answer.body as Problem;
  return `${answer.status} ${reason ?? type.replace('/problems/', '')}`;
}

/** What several requests at once were answered, in a fixed order. */
export function outcomes(answers: readonly Response[]): string[] {
  return answers.map((answer) => (answer.status < 300 ? String(answer.status) : reasonOf(answer))).sort();
}
