import { addMinutes } from 'date-fns';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { AuditEvent } from '#shared/contracts/audit.js';
import { ENDPOINTS } from '#shared/contracts/index.js';
import { ELDER_PIN_HEADER, ON_BEHALF } from '#shared/contracts/on-behalf.js';
import type { Helpable } from '#shared/contracts/helping.js';
import type { Note } from '#shared/contracts/notes.js';
import type { Answer } from '#shared/contracts/reviews.js';
import type { SessionState } from '#shared/contracts/session.js';
import type { Version } from '#shared/contracts/versions.js';
import { openTestApi, TEST_NOW, type Client, type TestApi } from '#tests/support/api.js';
import { addRecording } from '#tests/support/attachment-api.js';
import { openSubmission, reasonOf, says, versionPath, type Village } from '#tests/support/calendar-api.js';
import { asked, consentsPath, spokenContent } from '#tests/support/consent-api.js';
import { webm } from '#tests/support/media.js';
import { noteInput } from '#tests/support/notes-api.js';
import { givePin, PIN, WRONG_PIN } from '#tests/support/pin-cards.js';

let api: TestApi;
let village: Village;
let version: Version;
let observer: Client;
/** What stands on the elder's card. */
let code: string;
beforeAll(async () => {
  api = await openTestApi();
});
beforeEach(async () => {
  ({ village, version } = await openSubmission(api));
  observer = await api.signIn('observer');
  code = await givePin(api, village.steward, village.elder.personId);
});
afterAll(() => api.close());

const home = (client: Client, more = '') => `/api/communities/${client.communityId}${more}`;
const help = (client: Client, pin: string | null = PIN, personId = village.elder.personId) =>
  client.post(home(client, '/helping'), { personId, card: pin === null ? null : { code, pin } });
const answerPath = () => `${versionPath(version)}/entries/${version.entries[0]?.entryId ?? ''}/answer`;
const readSession = async (client: Client) => (await client.get('/api/session')).body as SessionState;
const given = async () =>
  ((await village.officer.get(`${versionPath(version)}/answers`)).body as { items: Answer[] }).items;
const records = async () =>
  ((await village.steward.get(home(village.steward, '/audit'))).body as { items: AuditEvent[] }).items;

describe('helping an elder', () => {
  it('is begun by anybody of the village with the elder’s card and PIN, told by the session, and ended by Done', async () => {
    const began = (await help(observer).expect(200)).body as SessionState;
    expect(began).toMatchObject({
      person: { id: observer.personId },
      helping: { personId: village.elder.personId, roles: ['elder'], shownPin: true },
    });
    const ended = (await observer.delete(home(observer, '/helping')).expect(200)).body as SessionState;
    expect(ended.helping).toBeUndefined();
    await observer.get(`${versionPath(version)}/answers`).expect(403);
    expect((await records()).map(({ action }) => action).slice(0, 2)).toEqual([
      'helping-ended',
      'helping-began',
    ]);
  });

  it('lists elders for everybody, and observers for those who compile, review and sign', async () => {
    const list = async (client: Client) =>
      ((await client.get(home(client, '/helping')).expect(200)).body as { items: Helpable[] }).items;
    expect(await list(observer)).toMatchObject([
      { displayName: 'Elder A-1', hasPin: true },
      { displayName: 'Elder A-2', hasPin: false },
      { displayName: 'Elder A-3', hasPin: false },
    ]);
    expect((await list(village.officer)).map(({ personId }) => personId)).toContain(observer.personId);
  });

  it('needs the card itself: without it nobody has a try at the PIN, nor can end the card by wrong ones', async () => {
    const theirs = code;
    code = await givePin(api, village.steward, village.elder2.personId);
    for (let tries = 0; tries < 6; tries += 1) {
      expect((await help(observer)).body).toMatchObject({
        errors: [{ field: 'card.code', code: 'card-of-another' }],
      });
    }
    code = theirs;
    await help(observer).expect(200);
  });

  it('needs the right PIN, counted on the card; without one it is for those who review', async () => {
    expect((await help(observer, WRONG_PIN)).status).toBe(422);
    expect(reasonOf(await help(observer, null))).toBe('403 pin-not-shown');
    expect((await help(observer, PIN, village.elder2.personId)).status).toBe(422);
    expect((await help(observer, PIN, village.officer.personId)).status).toBe(404);
    expect((await help(observer, PIN, observer.personId)).status).toBe(404);
    expect((await readSession(observer)).helping).toBeUndefined();
    for (let tries = 0; tries < 4; tries += 1) await help(observer, WRONG_PIN);
    expect((await help(observer)).status).toBe(429);
  });

  it('shows the helper what the elder sees, and no more than a card opens', async () => {
    const entryId = version.entries[0]?.entryId ?? '';
    const { id } = await addRecording(village.elder2, entryId, { subjectType: 'entry' });
    await observer.get(`/api/attachments/${id}`).expect(404);
    await observer.get(versionPath(version)).expect(404);
    await help(observer).expect(200);
    await observer.get(versionPath(version)).expect(200);
    await observer.get(`/api/attachments/${id}`).expect(200);
    expect(reasonOf(await observer.get(home(observer, '/audit')))).toBe('403 needs-password');
    await observer.get(`/api/communities/${(await api.signIn('officer2')).communityId}`).expect(404);
  });

  it('is over after half an hour, with the card, and on no other device', async () => {
    await help(observer).expect(200);
    const elsewhere = await api.signIn('observer');
    expect((await readSession(elsewhere)).helping).toBeUndefined();
    api.clock.set(addMinutes(TEST_NOW, 31));
    expect((await readSession(observer)).helping).toBeUndefined();
    await observer.get(versionPath(version)).expect(404);
    await help(observer).expect(200);
    await village.steward.delete(home(observer, `/people/${village.elder.personId}/card`)).expect(204);
    expect((await readSession(observer)).helping).toBeUndefined();
  });
});

describe('what is written while helping', () => {
  it('is an answer of the elder, typed by the helper; "agree" is proved by itself', async () => {
    await help(observer).expect(200);
    expect(reasonOf(await observer.put(answerPath(), says()))).toBe('403 proof-needed');
    const change = says({ answer: 'change-this', note: 'Later' });
    expect((await observer.put(answerPath(), change).expect(200)).body).toMatchObject({
      elderName: 'Elder A-1',
      recordedByName: observer.session.person?.displayName,
      proof: { kind: 'shown-pin' },
    });
    await observer.put(answerPath(), { ...says(), pin: WRONG_PIN }).expect(422);
    await observer.put(answerPath(), { ...says(), pin: PIN }).expect(200);
    expect(await given()).toMatchObject([{ answer: 'agree', proof: { kind: 'pin' } }]);
    const spoken = { answer: 'agree', note: '', onBehalfOf: null };
    await observer.upload(`${answerPath()}/spoken`, spoken, webm({ note: 'I agree' })).expect(201);
    expect(await given()).toMatchObject([{ answer: 'agree', proof: { kind: 'voice' } }]);
    expect((await records())[0]).toMatchObject({
      action: 'answered-on-behalf',
      actorName: observer.session.person?.displayName,
      onBehalfOfName: 'Elder A-1',
    });
  });

  it('is for this elder alone, and never over their own hand', async () => {
    await help(observer).expect(200);
    const other = says({ answer: 'not-mine-to-say', onBehalfOf: village.elder2.personId, witness: 'Irvel' });
    await observer.put(answerPath(), other).expect(403);
    await village.elder.put(answerPath(), says()).expect(200);
    const over = { ...says({ answer: 'not-mine-to-say' }), pin: PIN };
    expect(reasonOf(await observer.put(answerPath(), over))).toBe('409 own-answer-stands');
    expect(reasonOf(await observer.delete(answerPath()))).toBe('409 own-answer-stands');
  });

  it('carries a recording of the elder as a change, and a note that says who typed it', async () => {
    await help(observer).expect(200);
    const entryId = version.entries[0]?.entryId ?? '';
    const { id } = await addRecording(observer, entryId, { subjectType: 'entry' });
    const spoken = says({ answer: 'change-this', note: '', recordingId: id });
    await observer.put(answerPath(), spoken).expect(200);
    expect((await given())[0]?.spoken).toEqual({ state: 'kept-apart', attachmentId: null });
    const input = noteInput({ subjectType: 'entry', subjectId: entryId });
    const note = (await observer.post(home(observer, '/notes'), input).expect(201)).body as Note;
    expect(note).toMatchObject({
      authorName: 'Elder A-1',
      typedByName: observer.session.person?.displayName,
      mine: true,
    });
    const row = (await records()).find(({ action }) => action === 'note-added');
    expect(row).toMatchObject({ onBehalfOfName: 'Elder A-1' });
    await observer.delete(home(observer, '/helping')).expect(200);
    expect(reasonOf(await observer.put(home(observer, `/notes/${note.id}/closed`)))).toMatch(/^404/u);
    await village.elder.put(home(observer, `/notes/${note.id}/closed`)).expect(200);
  });

  it('is a consent only with the elder’s PIN once more', async () => {
    await help(observer).expect(200);
    const itemId = version.entries[0]?.entryId ?? '';
    const yes = asked({ answer: 'given', uses: ['keep', 'show'], giverId: village.elder.personId });
    const witness = { kind: 'witness', witness: 'Irvel', attachmentId: null };
    const body = { ...yes, proof: witness, itemType: 'entry', itemId };
    const send = () => observer.post(home(observer, '/consents'), body);
    expect(reasonOf(await send())).toBe('403 proof-needed');
    expect((await send().set(ELDER_PIN_HEADER, WRONG_PIN)).status).toBe(422);
    await send().set(ELDER_PIN_HEADER, PIN).expect(201);
    expect((await records())[0]).toMatchObject({
      action: 'consent-written',
      actorName: observer.session.person?.displayName,
      onBehalfOfName: 'Elder A-1',
    });
  });

  it('is a consent by the elder’s voice as well, recorded with it', async () => {
    await help(observer).expect(200);
    const itemId = version.entries[0]?.entryId ?? '';
    const said = spokenContent({ answer: 'given', uses: ['keep', 'show'], giverId: village.elder.personId });
    const sent = await observer.upload(
      consentsPath(observer, '', '/spoken'),
      { ...said, itemType: 'entry', itemId },
      webm({ note: 'I agree' }),
    );
    expect([sent.status, sent.body]).toMatchObject([201, { content: { proof: { kind: 'voice' } } }]);
    expect((await records()).find(({ action }) => action === 'consent-written')).toMatchObject({
      onBehalfOfName: 'Elder A-1',
    });
  });

  it('is nothing that the list does not name: no signing, no compiling, nothing of one’s own', async () => {
    for (const endpoint of ENDPOINTS) {
      if (endpoint.id in ON_BEHALF) expect(endpoint.access.kind, endpoint.id).toBe('member');
    }
    expect(Object.keys(ON_BEHALF).every((id) => ENDPOINTS.some((each) => each.id === id))).toBe(true);
    await help(village.elder2).expect(200);
    const { elder2 } = village;
    const closed = '403 not-while-helping';
    expect(reasonOf(await elder2.post(`${versionPath(version)}/signatures`, { role: 'elder' }))).toBe(closed);
    const own = { currentPassword: 'not mine at all', newPassword: 'never comes to be' };
    expect(reasonOf(await elder2.put('/api/session/password', own))).toBe(closed);
    await elder2.delete('/api/session').expect(200);
  });
});

describe('helping without a PIN', () => {
  it('sees what the helper sees, and proves every answer', async () => {
    await help(village.officer, null).expect(200);
    const entryId = version.entries[0]?.entryId ?? '';
    const sealed = await addRecording(village.elder, entryId, {
      subjectType: 'entry',
      sharingLevel: 'sealed',
    });
    await village.officer.get(`/api/attachments/${sealed.id}`).expect(404);
    const no = says({ answer: 'not-mine-to-say' });
    expect(reasonOf(await village.officer.put(answerPath(), no))).toBe('403 proof-needed');
    await village.officer.put(answerPath(), { ...no, pin: PIN }).expect(200);
    const input = noteInput({ subjectType: 'entry', subjectId: entryId });
    const note = (await village.officer.post(home(observer, '/notes'), input).expect(201)).body as Note;
    expect(note).toMatchObject({ authorName: 'Elder A-1', typedByName: 'Beyno' });
    const close = await village.officer.put(home(observer, `/notes/${note.id}/closed`));
    expect(reasonOf(close)).toBe('403 pin-not-shown');
  });
});
