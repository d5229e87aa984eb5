import { randomUUID } from 'node:crypto';
import { readFileSync } from 'node:fs';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { WithdrawalEntity } from '#server/db/entities/withdrawal.entity.js';
import { VillageGroupEntity } from '#server/db/entities/village-group.entity.js';
import { PLAIN_DETAILS } from '#shared/contracts/sharing.js';
import { addVariant } from '#tests/support/variant-api.js';
import { addNote } from '#tests/support/notes-api.js';
import { addGroup } from '#tests/support/sharing-api.js';
import { PlaceEntity } from '#server/db/entities/place.entity.js';
import { fillPath, type Endpoint } from '#shared/contracts/endpoint.js';
import { ENDPOINTS } from '#shared/contracts/index.js';
import { ROLES, type AddedPerson, type Community, type Role } from '#shared/contracts/people.js';
import type { MadeFeed } from '#shared/contracts/exports.js';
import type { Entry } from '#shared/contracts/calendars.js';
import type { Place } from '#shared/contracts/places.js';
import type { OwnSeen } from '#shared/contracts/signs.js';
import { openTestApi, type Client, type TestApi } from '#tests/support/api.js';
import {
  addEntry,
  beginCalendar,
  openVillage,
  publishDraft,
  says,
  submit,
} from '#tests/support/calendar-api.js';
import { addConsent, asked } from '#tests/support/consent-api.js';
import { switchOpenPageOn } from '#tests/support/open-page-api.js';
import { addPicture } from '#tests/support/attachment-api.js';
import { addSign, markSeen, waitingForOwn } from '#tests/support/sign-api.js';
import { addFigure } from '#tests/support/figure-api.js';
import { plainPicture } from '#tests/support/media.js';
import { PERMISSION_GUIDE, withPermissionTable } from '../../docker-free-scripts/lib/permission-table.js';
import { bodyOf, paramsOf, queryOf, type Village } from '#tests/support/calls-of-endpoints.js';

/**
 * Every endpoint of the contracts, called by a visitor and by somebody of each role, in their own village and in
 * another one. What must come of it follows from the access rules in the contracts alone.
 */
type Verdict = 'let in' | 'sign in first' | 'not allowed' | 'not found' | `broken: ${number}`;

let api: TestApi;
let own: Village;
let other: Village;
let clients: Record<Role, Client>;
beforeAll(async () => {
  api = await openTestApi();
  clients = {
    steward: await api.signIn('steward'),
    officer: await api.signIn('officer'),
    elder: await api.signIn('elder3'),
    staff: await api.signIn('staff'),
    observer: await api.signIn('observer'),
  };
  own = await furnishOwn();
  other = await furnishOther();
}, 60_000);
afterAll(() => api.close());

describe('who may call what', () => {
  it.each(ENDPOINTS.map((endpoint) => [`${endpoint.method} ${endpoint.path}`, endpoint] as const))(
    '%s lets in whom the contracts name, in the own village',
    async (_name, endpoint) => {
      const verdicts: Record<string, Verdict> = { visitor: await call(endpoint, null, own) };
      for (const role of ROLES) verdicts[role] = await call(endpoint, role, own);
      expect(verdicts).toEqual(expectedVerdicts(endpoint));
    },
  );

  it.each(
    ENDPOINTS.filter(({ access }) => access.kind === 'member').map(
      (endpoint) => [`${endpoint.method} ${endpoint.path}`, endpoint] as const,
    ),
  )('%s is not there in another village, whatever the role', async (_name, endpoint) => {
    const verdicts: Record<string, Verdict> = { visitor: await call(endpoint, null, other) };
    for (const role of ROLES) verdicts[role] = await call(endpoint, role, other);
    expect(verdicts).toEqual({
      visitor: 'sign in first',
      ...Object.fromEntries(ROLES.map((role) => [role, 'not found'])),
    });
  });

  it('is shown in the guide exactly as the contracts say it (npm run permissions -- --write)', () => {
    const guide = readFileSync(PERMISSION_GUIDE, 'utf8');
    expect(guide === withPermissionTable(guide)).toBe(true);
  });
});

function expectedVerdicts({ access }: Endpoint): Record<string, Verdict> {
  const admits = (role: Role) => access.kind !== 'member' || access.roles.includes(role);
  return {
    visitor: access.kind === 'public' ? 'let in' : 'sign in first',
    ...Object.fromEntries(ROLES.map((role) => [role, admits(role) ? 'let in' : 'not allowed'])),
  };
}

async function call(endpoint: Endpoint, role: Role | null, village: Village): Promise<Verdict> {
  const client = await clientFor(endpoint, role);
  const path = fillPath(endpoint.path, paramsOf(endpoint, role, village)) + queryOf(endpoint, village);
  const body = endpoint.body === undefined ? undefined : bodyOf(endpoint, role, village);
  const answer = await {
    GET: () => client.get(path),
    POST: async () =>
      endpoint.upload === null ? client.post(path, body) : client.upload(path, body, await plainPicture()),
    PUT: () => client.put(path, body),
    DELETE: () => client.delete(path),
    PATCH: () => Promise.reject(new Error('no endpoint patches')),
  }[endpoint.method]();
  const { type } = answer.body as { type?: string };
  if (type === '/problems/not-signed-in') return 'sign in first';
  if (type === '/problems/not-allowed') return 'not allowed';
  if (answer.status === 404) return 'not found';
  return answer.status >= 500 || answer.status === 403 ? `broken: ${answer.status}` : 'let in';
}

/** Signing in and out changes a browser for good, so whoever may be anybody calls from a fresh one. */
async function clientFor({ access }: Endpoint, role: Role | null): Promise<Client> {
  if (role === null) return api.visitor();
  return access.kind === 'public' ? api.signIn(role) : clients[role];
}

/** Version 1 published, version 2 in review with an elder's answer, and a guest who may be sent away. */
async function furnishOwn(): Promise<Village> {
  const village = await openVillage(api);
  const calendar = await beginCalendar(village);
  const entry = await addEntry(village.officer, calendar.id, {
    ...{ record: waitingForOwn(), giver: 'Elder A-1', ifLate: 'Sow beans.' },
  });
  const { variantId } = await addVariant(village.officer, calendar.id, entry.id);
  const published = await publishDraft(village, calendar.id);
  await addEntry(village.officer, calendar.id, { titleOfficer: 'Weed' });
  const keepers = await addGroup(village.elder, 'Keepers', [village.elder, ...Object.values(clients)]);
  const kept = await addEntry(village.elder, calendar.id, {
    ...{ sharingLevel: 'group', sharing: { ...PLAIN_DETAILS, groupId: keepers.id } },
  });
  const reviewed = await submit(village.officer, calendar.id);
  const answered = `/api/calendars/${calendar.id}/versions/2/entries/${entry.id}/answer`;
  await clients.elder.put(answered, says({ answer: 'change-this', note: 'Later' })).expect(200);
  const guest = { email: 'guest@example.org', displayName: 'Guest', roles: ['observer'] };
  const people = `/api/communities/${village.steward.communityId}/people`;
  const added = (await village.steward.post(people, guest).expect(201)).body as AddedPerson;
  const figureId = (await addFigure(village.officer)).id;
  const feeds = `/api/communities/${village.officer.communityId}/feeds`;
  const feed = (await village.officer.post(feeds).expect(201)).body as MadeFeed;
  return {
    ...(await homeOf(village.officer)),
    calendarId: calendar.id,
    rolledId: await rolledFrom(village.officer, calendar.id),
    taskId: await aTask(village.officer, calendar.id),
    entryId: entry.id,
    ownEntryId: kept.id,
    personId: added.person.id,
    figureId,
    ...(await aSeenSign(village.officer, village.elder)),
    elderSignId: (await addSign(clients.elder, { name: 'Reed caller' })).id,
    ...(await aSeenOwnSign(village.elder, entry)),
    attachmentId: (await addPicture(village.elder, figureId)).id,
    feedKey: feed.key,
    openKey: await switchOpenPageOn(clients.officer),
    withdrawalId: await aWithdrawal(village.officer.communityId),
    variantId,
    noteId: await aNote(village.officer, figureId),
    groupId: (await addGroup(village.steward, 'Weavers', [village.elder])).id,
    consentIds: await consentsOf(village.officer, entry.id, clients),
    elderId: village.elder.personId,
    publishedNumber: published.number,
    reviewedNumber: reviewed.number,
  };
}

/** The second village; its officer alone can sign in, so its version stays in review. */
async function furnishOther(): Promise<Village> {
  const officer = await api.signIn('officer2');
  const home = await homeOf(officer);
  const calendar = await beginCalendar({ ...(await openVillage(api)), officer, placeId: home.place.id });
  const entry = await addEntry(officer, calendar.id);
  const { variantId } = await addVariant(officer, calendar.id, entry.id);
  const { number } = await submit(officer, calendar.id);
  const figureId = (await addFigure(officer)).id;
  return {
    ...home,
    calendarId: calendar.id,
    rolledId: await rolledFrom(officer, calendar.id),
    taskId: await aTask(officer, calendar.id),
    entryId: entry.id,
    ownEntryId: entry.id,
    personId: officer.personId,
    figureId,
    ...(await aSeenSign(officer, officer)),
    ...{ elderSignId: randomUUID(), ownId: randomUUID(), ownSeenId: randomUUID() },
    attachmentId: (await addPicture(officer, figureId)).id,
    feedKey: '',
    openKey: '',
    withdrawalId: await aWithdrawal(home.community.id),
    variantId,
    noteId: await aNote(officer, figureId),
    groupId: await firstGroup(home.community.id),
    consentIds: await consentsOf(officer, entry.id, {}),
    elderId: home.community.signOffRule.mustSign[0] ?? '',
    publishedNumber: number,
    reviewedNumber: number,
  };
}

async function rolledFrom(officer: Client, calendarId: string): Promise<string> {
  const answer = await officer.post(`/api/calendars/${calendarId}/next-year`).expect(200);
  return (answer.body as { calendarId: string }).calendarId;
}

async function aTask(officer: Client, calendarId: string): Promise<string> {
  const body = { entryId: null, kind: 'own-words', text: 'Two at the rain gauge' };
  const answer = await officer.post(`/api/calendars/${calendarId}/season-review/decisions`, body).expect(201);
  return (answer.body as { id: string }).id;
}

async function aSeenSign(officer: Client, marker: Client): Promise<{ signId: string; seenId: string }> {
  const { id, seen } = await markSeen(marker, await addSign(officer));
  return { signId: id, seenId: seen[0]?.id ?? '' };
}

async function aSeenOwnSign(
  marker: Client,
  { calendarId, id, content }: Entry,
): Promise<{ ownId: string; ownSeenId: string }> {
  const ownId = content.record?.signs.list[0]?.ownId ?? '';
  const path = `/api/calendars/${calendarId}/entries/${id}/signs/${ownId}/seen`;
  const said = { day: '2026-11-29', who: 'Tirel' };
  const { seen } = (await marker.post(path, said).expect(201)).body as OwnSeen;
  return { ownId, ownSeenId: seen[0]?.id ?? '' };
}

async function aNote(officer: Client, figureId: string): Promise<string> {
  return (await addNote(officer, { subjectType: 'figure', subjectId: figureId })).id;
}

/** Of something that is on no sheet. */
async function aWithdrawal(communityId: string): Promise<string> {
  const id = randomUUID();
  await api.dataSource.getRepository(WithdrawalEntity).insert({
    ...{ id, communityId, itemType: 'entry', itemId: randomUUID(), at: api.clock.now() },
    ...{ askedBy: null, doneBy: null, published: [], sheetsReplacedAt: null },
  });
  return id;
}

/** A consent about an entry for the person of each role; the same one for all where they are not of the village. */
async function consentsOf(
  officer: Client,
  entryId: string,
  givers: Partial<Record<Role, Client>>,
): Promise<Record<Role, string>> {
  const ids: Partial<Record<Role, string>> = {};
  const { id: first } = await addConsent(officer, 'entry', entryId, asked());
  for (const role of ROLES) {
    const giverId = givers[role]?.personId;
    ids[role] =
      giverId === undefined ? first : (await addConsent(officer, 'entry', entryId, asked({ giverId }))).id;
  }
  return { steward: first, officer: first, elder: first, staff: first, observer: first, ...ids };
}

/** Groups are founded by stewards and elders, who cannot sign in there. */
async function firstGroup(communityId: string): Promise<string> {
  const id = randomUUID();
  await api.dataSource.getRepository(VillageGroupEntity).insert({ id, communityId, name: 'Lamp-makers' });
  return id;
}

async function homeOf(officer: Client): Promise<{ community: Community; place: Place }> {
  const { communityId } = officer;
  const row = await api.dataSource.getRepository(PlaceEntity).findOneByOrFail({ communityId });
  return {
    community: (await officer.get(`/api/communities/${communityId}`).expect(200)).body as Community,
    place: (await officer.get(`/api/places/${row.id}`).expect(200)).body as Place,
  };
}
