import { randomUUID } from 'node:crypto';
import { readFileSync } from 'node:fs';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { WithdrawalEntity } from '#server/db/entities/withdrawal.entity.js';
import { VillageGroupEntity } from '#server/db/entities/village-group.entity.js';
import { PLAIN_DETAILS } from '#shared/contracts/sharing.js';
import { addVariant, variantInput } from '#tests/support/variant-api.js';
import { addNote, noteInput } from '#tests/support/notes-api.js';
import { addGroup } from '#tests/support/sharing-api.js';
import { PlaceEntity } from '#server/db/entities/place.entity.js';
import { fillPath, type Endpoint } from '#shared/contracts/endpoint.js';
import { ENDPOINTS } from '#shared/contracts/index.js';
import { ROLES, type AddedPerson, type Community, type Role } from '#shared/contracts/people.js';
import type { MadeFeed } from '#shared/contracts/exports.js';
import type { Place } from '#shared/contracts/places.js';
import { DEMO_PASSWORD } from '#server/features/demo/demo-villages.data.js';
import { openTestApi, type Client, type TestApi } from '#tests/support/api.js';
import {
  addEntry,
  beginCalendar,
  entryInput,
  openVillage,
  publishDraft,
  says,
  submit,
} from '#tests/support/calendar-api.js';
import { addConsent, asked, spokenContent } from '#tests/support/consent-api.js';
import { addPicture, attachmentInput } from '#tests/support/attachment-api.js';
import { addFigure, figureInput } from '#tests/support/figure-api.js';
import { plainPicture } from '#tests/support/media.js';
import { PERMISSION_GUIDE, withPermissionTable } from '../../docker-free-scripts/lib/permission-table.js';

/**
 * Every endpoint of the contracts, called by a visitor and by somebody of each role, in their own village and in
 * another one. What must come of it follows from the access rules in the contracts alone.
 */
type Verdict = 'let in' | 'sign in first' | 'not allowed' | 'not found' | `broken: ${number}`;

/** Ids of one village that really exist, so that a call that is let in reaches the service. */
interface Village {
  community: Community;
  place: Place;
  calendarId: string;
  /** A draft that was rolled over and never submitted. */
  rolledId: string;
  entryId: string;
  /** In review, and kept by everybody who calls here. */
  ownEntryId: string;
  personId: string;
  figureId: string;
  /** A picture of the figure, added by somebody who calls nothing here. */
  attachmentId: string;
  groupId: string;
  feedKey: string;
  variantId: string;
  /** A note of somebody who calls nothing here. */
  noteId: string;
  withdrawalId: string;
  /** One about each who calls, for it is theirs to read; visitors ask for the officer's. */
  consentIds: Readonly<Record<Role, string>>;
  elderId: string;
  /** A published version, which everybody of the village sees, and one that is in review. */
  publishedNumber: number;
  reviewedNumber: number;
}

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

const OF_ITS_PEOPLE = new Set(['putOwnAnswer', 'takeBackOwnAnswer']);

function paramsOf(endpoint: Endpoint, role: Role | null, village: Village): Record<string, string> {
  const reviewed = new Set([
    'askChanges',
    'publishVersion',
    'listAnswers',
    'putAnswer',
    'putSpokenAnswer',
    'typeInMeeting',
    'printReadBack',
    'takeBackAnswer',
    'letDifferenceStand',
    'signVersion',
    'readOwnEntries',
    ...OF_ITS_PEOPLE,
  ]);
  return {
    communityId: village.community.id,
    placeId: village.place.id,
    calendarId: endpoint.id === 'readRollover' ? village.rolledId : village.calendarId,
    entryId: OF_ITS_PEOPLE.has(endpoint.id) ? village.ownEntryId : village.entryId,
    personId: village.personId,
    figureId: village.figureId,
    attachmentId: village.attachmentId,
    part: '1',
    groupId: village.groupId,
    variantId: village.variantId,
    noteId: village.noteId,
    withdrawalId: village.withdrawalId,
    consentId: village.consentIds[role ?? 'officer'],
    itemType: 'entry',
    itemId: endpoint.id === 'removeSound' ? village.attachmentId : village.entryId,
    markerKey: 'pleiades',
    feedId: randomUUID(),
    deviceId: '0'.repeat(64),
    number: String(reviewed.has(endpoint.id) ? village.reviewedNumber : village.publishedNumber),
  };
}

function queryOf(endpoint: Endpoint, { publishedNumber, figureId, feedKey }: Village): string {
  const queries: Record<string, string> = {
    findTimeZone: '?latitudeDeg=12&longitudeDeg=39',
    readFeed: `?key=${feedKey}`,
    listStars: '?year=2027',
    exportStarsCsv: '?year=2027',
    readStar: '?year=2027',
    listSkylineEffects: '?year=2027',
    findMarkers: '?year=2027&from=06-10',
    readDrift: '?from=1500&to=2027',
    exportDriftCsv: '?from=1500&to=2027',
    readLook: '?marker=pleiades&date=2027-06-10',
    printLook: '?marker=pleiades&date=2027-06-10',
    listAttachments: `?subjectType=figure&subjectId=${figureId}`,
    compareVersions: `?from=${publishedNumber}&to=${publishedNumber}`,
  };
  return queries[endpoint.id] ?? '';
}

/** Well-formed, so that only the gate can stop them; an old version number keeps most from changing anything. */
function bodyOf(endpoint: Endpoint, role: Role | null, village: Village): object {
  const { id: _id, version: _version, ...settings } = village.community;
  const { id: _placeId, communityId: _communityId, version: _placeVersion, ...place } = village.place;
  const stale = { version: 999 };
  const speaksForAnElder = role === 'officer' || role === 'steward';
  const bodies: Record<string, () => object> = {
    signIn: () => ({ email: 'observer@dawnpeg.example', password: DEMO_PASSWORD }),
    changePassword: () => ({ currentPassword: 'not mine', newPassword: 'never comes to be' }),
    openCard: () => ({ code: 'AAABBBCCCDDDEEEFFF' }),
    chooseCardPin: () => ({ code: 'AAABBBCCCDDDEEEFFF', pin: '4711' }),
    signInByCard: () => ({ code: 'AAABBBCCCDDDEEEFFF', pin: '4711' }),
    printCard: () => ({ code: 'AAABBBCCCDDDEEEFFF', name: '', size: 'a7' }),
    redeemCode: () => ({ email: 'a@example.org', code: 'ABCD-EFGH-JKMN', newPassword: 'never comes to be' }),
    resetPassword: () => ({
      token: `${village.personId}.${'0'.repeat(64)}`,
      newPassword: 'never comes to be',
    }),
    leaveForGood: () => ({ password: 'not mine', takeBackGiven: false }),
    askForResetLetter: () => ({ email: 'a@example.org' }),
    saveLetterChoice: () => ({
      channel: 'none',
      rhythm: 'each',
      visitMe: false,
      quietHours: null,
      ...stale,
    }),
    setUpFirstSteward: () => ({
      token: 'there is no such token',
      email: 'a@example.org',
      displayName: 'A',
      newPassword: 'never comes to be',
      communityName: 'Nowhere',
    }),
    updateCommunity: () => ({ ...settings, ...stale }),
    addPerson: () => ({ email: 'new@example.org', displayName: 'New', roles: ['observer'] }),
    updatePerson: () => ({ roles: ['observer'], ...stale }),
    createPlace: () => place,
    updatePlace: () => ({ ...place, ...stale }),
    createFigure: () => figureInput(),
    updateFigure: () => ({ ...figureInput(), ...stale }),
    createAttachment: () => attachmentInput({ subjectId: village.figureId }),
    addAttachmentPart: () => ({ part: 1, seconds: 2 }),
    saveAttachmentWords: () => ({
      kind: 'words',
      language: 'en',
      text: 'As told',
      checkedBySpeaker: false,
      ...stale,
    }),
    previewSkylineEffects: () => ({ place, year: 2027 }),
    compareMarkerYears: () => ({
      years: [2027],
      markers: [{ markerKey: 'pleiades', phenomenon: 'heliacal-rising' }],
    }),
    computeSkyMarker: () => ({ year: 2027, spec: { kind: 'zenith-sun' } }),
    createCalendar: () => ({ placeId: village.place.id, year: 2031 }),
    // An elder writes what is kept; the village's entries are the officer's.
    addEntry: () => entryInput(role === 'elder' ? { sharingLevel: 'elders' } : {}),
    updateEntry: () => ({ content: entryInput(), ...stale }),
    putActualDays: () => ({ from: '2027-06-24', to: null, saidBy: 'Elder A-1', plots: '' }),
    addVariant: () => variantInput(),
    updateVariant: () => ({ content: variantInput(), ...stale }),
    addNote: () => noteInput({ subjectType: 'figure', subjectId: village.figureId }),
    answerNote: () => ({ text: 'So it is told here, too' }),
    addGroup: () => ({ name: `Menders ${role ?? ''}`, memberIds: [village.elderId] }),
    updateGroup: () => ({ name: 'Menders', memberIds: [village.elderId], ...stale }),
    // Nobody of these gave it or is asked for it: the thing stays.
    withdrawItem: () => ({ leavesTrace: true, askedById: village.place.id }),
    noteDeath: () => ({ diedOn: '2026-11-01', removesForGood: false }),
    pauseItem: () => ({ askedById: village.place.id }),
    removeSound: () => ({ askedById: village.place.id }),
    // Without a card there is no PIN: nobody begins to be helped in the middle of this.
    startHelping: () => ({ personId: village.elderId, pin: '9025' }),
    addConsent: () => ({ ...asked(), itemType: 'entry', itemId: village.entryId }),
    changeConsent: () => ({ content: asked(), ...stale }),
    withdrawConsent: () => stale,
    addSpokenConsent: () => ({ ...spokenContent(), itemType: 'entry', itemId: village.entryId }),
    changeSpokenConsent: () => ({ content: spokenContent(), ...stale }),
    changeSharing: () => ({ sharing: { level: 'village', ...PLAIN_DETAILS }, ...stale }),
    reorderEntries: () => ({ entryIds: [village.entryId] }),
    askChanges: () => ({ reason: 'taken-back', note: '' }),
    recallVersion: () => ({ note: 'A wrong date' }),
    putAnswer: () => (speaksForAnElder ? says({ onBehalfOf: village.elderId, witness: 'Tirel' }) : says()),
    putSpokenAnswer: () => ({ answer: 'agree', note: '', onBehalfOf: village.elderId }),
    putOwnAnswer: () => ({ answer: 'agree', note: '' }),
    typeInMeeting: () => ({
      heldOn: '2026-12-01',
      witness: 'Tirel',
      answers: [{ elderId: village.elderId, entryId: village.entryId, answer: 'agree', note: '' }],
    }),
    signVersion: () => ({ role: role === 'steward' ? 'steward' : 'elder' }),
  };
  const make = bodies[endpoint.id];
  if (!make) throw new Error(`Say in this test what ${endpoint.id} is sent.`);
  return make();
}

/** Version 1 published, version 2 in review with an elder's answer, and a guest who may be sent away. */
async function furnishOwn(): Promise<Village> {
  const village = await openVillage(api);
  const calendar = await beginCalendar(village);
  const entry = await addEntry(village.officer, calendar.id);
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
    entryId: entry.id,
    ownEntryId: kept.id,
    personId: added.person.id,
    figureId,
    attachmentId: (await addPicture(village.elder, figureId)).id,
    feedKey: feed.key,
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
    entryId: entry.id,
    ownEntryId: entry.id,
    personId: officer.personId,
    figureId,
    attachmentId: (await addPicture(officer, figureId)).id,
    feedKey: '',
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
