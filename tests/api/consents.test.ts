import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { Consent, ConsentContent, ConsentLine, ItemConsents } from '#shared/contracts/consents.js';
import type { Problem } from '#shared/contracts/problem.js';
import type { ItemSharing } from '#shared/contracts/sharing.js';
import type { Today } from '#shared/contracts/today.js';
import { openTestApi, TEST_NOW, type Client, type TestApi } from '#tests/support/api.js';
import { addRecording } from '#tests/support/attachment-api.js';
import {
  changeConsent,
  furnishAskedVillage,
  refusedFields,
  registerOf,
  withdrawConsent,
  wordsOfPdf,
  type AskedVillage,
} from '#tests/support/asked-village.js';
import { addEntry, entriesOf } from '#tests/support/calendar-api.js';
import {
  addConsent,
  asked,
  consentContent,
  consentsPath,
  spokenContent,
} from '#tests/support/consent-api.js';
import { webm } from '#tests/support/media.js';
import { filesWith } from '#tests/support/search-everything.js';
import { addGroup, sharingPath } from '#tests/support/sharing-api.js';

let api: TestApi;
let village: AskedVillage;
beforeAll(async () => {
  api = await openTestApi();
});
afterAll(() => api.close());
beforeEach(async () => {
  village = await furnishAskedVillage(api);
}, 60_000);

const today = async (client: Client) =>
  (await client.get(`/api/communities/${client.communityId}/today`).expect(200)).body as Today;

describe('what is written down', () => {
  it('holds only the uses that were ticked; one that is not listed is a no', async () => {
    const { officer } = village;
    const consent = await addConsent(officer, 'entry', village.millet, { uses: ['keep'] });
    expect(consent.uses).toEqual(['keep']);
    const body = { ...consentContent(), itemType: 'entry', itemId: village.quietDays };
    expect(
      refusedFields(await officer.post(consentsPath(officer), { ...body, uses: ['satellite'] })),
    ).toEqual([['uses.0', 'not-in-list']]);
    const { uses: _uses, ...without } = body;
    expect(refusedFields(await officer.post(consentsPath(officer), without))).toEqual([['uses', 'required']]);
  });

  it.each([
    ['a yes to nothing', { uses: [] }, 'uses', 'choose-one'],
    ['a no with ticks', { answer: 'refused' }, 'uses', 'uses-need-yes'],
    ['a yes of somebody else without proof', { proof: null }, 'proof', 'proof-required'],
    ['a group for which nobody spoke', { givenAs: 'group' }, 'spokeFor', 'required'],
    ['conditions that are not told', { answer: 'given-with-conditions' }, 'conditions', 'required'],
    ['an heir without a name', { afterDeath: 'pass-to' }, 'passTo', 'required'],
    ['an end before the asking', { until: '2026-11-30' }, 'until', 'before-asked'],
    [
      'somebody else’s own word',
      { proof: { kind: 'own-word', witness: '', attachmentId: null } },
      'proof.kind',
      'own-word-of-giver',
    ],
  ] as const)('is refused at its field: %s', async (_what, changes, field, code) => {
    const { officer } = village;
    const content = consentContent(changes as Partial<ConsentContent>);
    const answer = await officer.post(consentsPath(officer), {
      ...content,
      itemType: 'entry',
      itemId: village.millet,
    });
    expect([answer.status, refusedFields(answer)]).toEqual([422, [[field, code]]]);
  });

  it('takes nobody’s own word for what somebody else gave, unless they were asked about it', async () => {
    const { officer, elder, elder2, millet } = village;
    const mine = consentContent({ giverId: officer.personId, proof: null });
    const body = { ...mine, itemType: 'entry', itemId: millet };
    expect(refusedFields(await officer.post(consentsPath(officer), body))).toEqual([
      ['proof', 'proof-required'],
    ]);
    const consent = await addConsent(elder, 'entry', millet, asked({ giverId: elder2.personId }));
    const said = consentContent({ giverId: elder2.personId, proof: null });
    const given = await changeConsent(elder2, consent, said).expect(200);
    expect((given.body as Consent).content.proof?.kind).toBe('own-word');
  });

  it('is about each person once', async () => {
    const { officer, elder } = village;
    await addConsent(officer, 'entry', village.millet, { giverId: elder.personId });
    const body = {
      ...consentContent({ giverId: elder.personId }),
      itemType: 'entry',
      itemId: village.millet,
    };
    const answer = await officer.post(consentsPath(officer), body).expect(409);
    expect((answer.body as Problem).reason).toBe('consent-there');
  });

  it('answers 409 with both states when somebody wrote a newer one', async () => {
    const { officer, steward } = village;
    const consent = await addConsent(officer, 'entry', village.millet, asked());
    await changeConsent(steward, consent, consentContent()).expect(200);
    const mine = asked({ answer: 'refused' });
    const answer = await changeConsent(officer, consent, mine).expect(409);
    expect(answer.body).toMatchObject({
      type: '/problems/stale',
      current: { state: 'given', version: consent.version + 1 },
      sent: { answer: 'refused' },
    });
    expect((await withdrawConsent(officer, consent).expect(409)).body).toMatchObject({
      type: '/problems/stale',
    });
  });

  it('names a giver less from then on, and never more', async () => {
    const { officer } = village;
    const naming = async () =>
      ((await officer.get(sharingPath(officer, 'entry', village.millet)).expect(200)).body as ItemSharing)
        .sharing.naming;
    const consent = await addConsent(officer, 'entry', village.millet, { naming: 'role' });
    expect(await naming()).toBe('role');
    await changeConsent(officer, consent, consentContent({ naming: 'named' })).expect(200);
    expect(await naming()).toBe('role');
    const entry = (await entriesOf(officer, village.calendarId)).find(({ id }) => id === village.millet);
    expect(entry?.content.sharing?.naming).toBe('role');
  });
});

describe('a yes that is recorded with the form', () => {
  const spoken = () => spokenContent({ answer: 'given', uses: ['keep', 'show', 'print'] });

  it('is kept with the clip that proves it, in one step, and plays', async () => {
    const { officer, millet } = village;
    const path = consentsPath(officer, '', '/spoken');
    const sent = officer.upload(
      path,
      { ...spoken(), itemType: 'entry', itemId: millet },
      webm({ note: 'Yes' }),
    );
    const { content } = (await sent.expect(201)).body as Consent;
    expect(content.proof).toMatchObject({ kind: 'voice' });
    const heard = `/api/attachments/${content.proof?.attachmentId ?? ''}/parts/1`;
    expect((await village.elder2.get(heard)).status).toBe(200);
    expect((await village.staff.get(heard)).status).toBe(404);
  });

  it('leaves neither words nor clip where one of the two is refused', async () => {
    const { officer, millet } = village;
    const path = consentsPath(officer, '', '/spoken');
    const body = { ...spoken(), itemType: 'entry', itemId: millet };
    await officer.upload(path, body, Buffer.from('no sound')).expect(422);
    const stranger = { ...body, giverId: millet };
    await officer.upload(path, stranger, webm({ note: 'Yes' })).expect(422);
    expect(await registerOf(officer)).toEqual([]);
    expect(await api.dataSource.query('SELECT id FROM attachment')).toEqual([]);
    expect(filesWith(api, 'Yes')).toEqual([]);
  });

  it('can stand for a new answer, too', async () => {
    const { officer, millet } = village;
    const consent = await addConsent(officer, 'entry', millet, asked());
    const path = consentsPath(officer, consent.id, '/spoken');
    const sent = officer.upload(path, { content: spoken(), version: consent.version }, webm({ note: 'Yes' }));
    expect((await sent.expect(200)).body).toMatchObject({
      state: 'given',
      content: { proof: { kind: 'voice' } },
    });
  });
});

describe('who may do what', () => {
  it('lets the family or group that the giver named take it back, without reading what it is about', async () => {
    const { elder, observer, staff, kept } = village;
    const kin = await addGroup(elder, 'Kin of the terraces', [elder, observer]);
    const consent = await addConsent(elder, 'entry', kept, {
      ...{ giverId: elder.personId, mayWithdraw: ['family'], withdrawGroupId: kin.id },
    });
    expect(await registerOf(staff)).toEqual([]);
    await withdrawConsent(staff, consent).expect(404);
    expect(await registerOf(observer)).toMatchObject([
      { id: consent.id, title: null, giverName: null, uses: null, may: { read: false, withdraw: true } },
    ]);
    await observer.get(consentsPath(observer, consent.id)).expect(404);
    await withdrawConsent(observer, consent).expect(200);
    expect((await registerOf(elder))[0]?.state).toBe('withdrawn');
  });

  it('lets elders whom the giver named take back what only giver and successor see', async () => {
    const { elder, elder2 } = village;
    const sealed = await addEntry(elder, village.calendarId, { sharingLevel: 'sealed' });
    const given = { giverId: elder.personId, mayWithdraw: ['elders' as const] };
    const consent = await addConsent(elder, 'entry', sealed.id, given);
    expect(await registerOf(village.officer)).toEqual([]);
    await withdrawConsent(elder2, consent).expect(200);
  });

  it('does not take the officer who wrote it down for its giver, and says that nobody is named', async () => {
    const { officer, elder } = village;
    const of = (itemId: string) => `/api/communities/${officer.communityId}/items/entry/${itemId}/consents`;
    const read = async (id: string) => (await officer.get(of(id)).expect(200)).body as ItemConsents;
    const unnamed = await addEntry(officer, village.calendarId, { giver: '' });
    expect(await read(unnamed.id)).toMatchObject({ giverId: null, whomToAsk: 'nobody' });
    expect(await read(village.millet)).toMatchObject({ giverId: elder.personId, whomToAsk: 'giver' });
    const mine = { ...consentContent({ giverId: officer.personId, proof: null }), itemType: 'entry' };
    const said = await officer.post(consentsPath(officer), { ...mine, itemId: village.feast });
    expect(refusedFields(said)).toEqual([['proof', 'proof-required']]);
  });

  it('lets givers speak for themselves, whatever their role, and nobody else of theirs without a role', async () => {
    const { staff, observer } = village;
    const own = await addEntry(village.officer, village.calendarId, { giverId: observer.personId });
    const consent = await addConsent(observer, 'entry', own.id, { giverId: observer.personId, proof: null });
    expect(consent.content.proof?.kind).toBe('own-word');
    expect((await registerOf(observer)).map(({ id, isMine }) => [id, isMine])).toEqual([[consent.id, true]]);
    expect(await registerOf(staff)).toEqual([]);
    await staff.get(consentsPath(staff, consent.id)).expect(404);
    const body = { ...consentContent(), itemType: 'entry', itemId: village.feast };
    expect(((await staff.post(consentsPath(staff), body).expect(409)).body as Problem).reason).toBe(
      'not-the-giver',
    );
    await withdrawConsent(staff, consent).expect(404);
    await withdrawConsent(observer, consent).expect(200);
  });

  it('gives the steward the register of kept things without a word of them, and the taking back', async () => {
    const { elder, steward, officer, elder2 } = village;
    const consent = await addConsent(elder, 'entry', village.kept, {
      giverId: elder.personId,
      giverName: 'Marrun of the kin',
      conditions: 'Only while the well is full',
      answer: 'given-with-conditions',
    });
    const answer = await steward.get(consentsPath(steward)).expect(200);
    expect((answer.body as { items: ConsentLine[] }).items).toMatchObject([
      {
        ...{
          id: consent.id,
          itemType: 'entry',
          itemId: village.kept,
          level: 'elders',
          state: 'given-with-conditions',
        },
        ...{ title: null, giverName: null, uses: null },
        may: { read: false, change: false, withdraw: true },
      },
    ]);
    expect(answer.text).not.toMatch(/kin|well/u);
    await steward.get(consentsPath(steward, consent.id)).expect(404);
    await steward.get(consentsPath(steward, consent.id, '/card.pdf')).expect(404);
    await changeConsent(steward, consent, consentContent()).expect(404);
    expect(await registerOf(officer)).toEqual([]);
    await withdrawConsent(officer, consent).expect(404);
    expect((await registerOf(elder2))[0]?.giverName).toBe('Marrun of the kin');
    const back = await withdrawConsent(steward, consent).expect(200);
    expect(back.text).not.toMatch(/kin|well/u);
    expect((await registerOf(elder2))[0]?.state).toBe('withdrawn');
  });

  it('lists what was agreed about one thing for those who keep its word, and nothing of it for others', async () => {
    const { officer, elder } = village;
    await addConsent(officer, 'entry', village.millet);
    const read = async (client: Client, itemId = village.millet) =>
      client.get(`/api/communities/${client.communityId}/items/entry/${itemId}/consents`);
    const forOfficer = (await read(officer)).body as ItemConsents;
    expect(forOfficer).toMatchObject({ title: 'Sow long millet', giverId: elder.personId, mayAsk: true });
    expect(forOfficer.items.map(({ content }) => content.giverName)).toEqual(['Old Marrun']);
    const forStaff = (await read(village.staff)).body as ItemConsents;
    expect(forStaff).toMatchObject({ giverId: null, giverName: '', items: [], mayAsk: false });
    expect((await read(officer, village.kept)).status).toBe(404);
  });
});

describe('a voice as proof', () => {
  it('belongs to the consent, is played by those who read it, and is nothing to anybody else', async () => {
    const { officer, elder2, staff, millet } = village;
    const consent = await addConsent(officer, 'entry', millet, asked());
    const voice = await addRecording(officer, consent.id, {
      subjectType: 'consent',
      sharingLevel: 'village',
    });
    const proof = { kind: 'voice', witness: '', attachmentId: voice.id } as const;
    const given = await changeConsent(officer, consent, consentContent({ proof })).expect(200);
    expect((given.body as Consent).content.proof).toEqual(proof);
    const status = async (client: Client) =>
      (await client.get(`/api/attachments/${voice.id}/parts/1`)).status;
    expect([await status(officer), await status(elder2), await status(staff)]).toEqual([200, 200, 404]);
  });

  it('of another thing proves nothing', async () => {
    const { officer, millet } = village;
    const consent = await addConsent(officer, 'entry', millet, asked());
    const other = await addRecording(officer, millet, { subjectType: 'entry' });
    const proof = { kind: 'voice', witness: '', attachmentId: other.id } as const;
    const answer = await changeConsent(officer, consent, consentContent({ proof })).expect(422);
    expect(refusedFields(answer)).toEqual([['content.proof.attachmentId', 'unknown']]);
  });
});

describe('asking again', () => {
  it('is due thirty days before the review date, for officer, steward and giver, without a title', async () => {
    const { elder, officer } = village;
    await addConsent(elder, 'entry', village.kept, { giverId: elder.personId, reviewBy: '2027-12-01' });
    await addConsent(officer, 'entry', village.millet, { reviewBy: '2027-12-01' });
    const due = async () => {
      const counts: Record<string, number> = {};
      for (const name of ['officer', 'steward', 'elder', 'elder2', 'staff']) {
        counts[name] = (await today(await api.signIn(name))).consentsDue;
      }
      return counts;
    };
    api.clock.set(new Date('2027-10-31T12:00:00Z'));
    expect(await due()).toEqual({ officer: 0, steward: 0, elder: 0, elder2: 0, staff: 0 });
    api.clock.set(new Date('2027-11-01T12:00:00Z'));
    expect(await due()).toEqual({ officer: 1, steward: 2, elder: 1, elder2: 0, staff: 0 });
    const lines = await registerOf(await api.signIn('steward'));
    expect(lines.map(({ isDue, title }) => [isDue, title]).toSorted()).toEqual(
      [
        [true, 'Sow long millet'],
        [true, null],
      ].toSorted(),
    );
    api.clock.set(TEST_NOW);
  });

  it('is over with a new answer, and the next date is what was said then', async () => {
    const { officer } = village;
    const consent = await addConsent(officer, 'entry', village.millet, { reviewBy: '2026-12-20' });
    expect(consent.isDue).toBe(true);
    const renewed = await changeConsent(officer, consent, consentContent({ reviewBy: '2027-12-20' })).expect(
      200,
    );
    expect(renewed.body).toMatchObject({ isDue: false, reviewBy: '2027-12-20' });
  });
});

describe('the card', () => {
  it('is a copy on paper with every use, each yes and each no in words, and how to take it back', async () => {
    const { officer } = village;
    const { id } = await addConsent(officer, 'entry', village.millet, {
      uses: ['keep', 'show', 'print'],
      answer: 'given-with-conditions',
      conditions: 'Never on the radio',
    });
    const text = await wordsOfPdf(officer, consentsPath(officer, id, '/card.pdf'));
    for (const words of [
      'A copy for Old Marrun',
      'Yes: Print it',
      'No: Say it on the radio',
      'No: Sell it, or sell with it',
      'Conditions: Never on the radio',
      'We ask again by 1 December 2027.',
      'You can take this back on any day',
    ]) {
      expect(text.replaceAll('\u00a0', ' ')).toContain(words);
    }
  });
});

describe('a thing that is withdrawn', () => {
  it('takes along what was agreed about it, and the voice that proved it', async () => {
    const { officer, elder, steward, millet } = village;
    const consent = await addConsent(officer, 'entry', millet, asked());
    const voice = await addRecording(officer, consent.id, { subjectType: 'consent' });
    const path = `/api/communities/${elder.communityId}/items/entry/${millet}/withdrawal`;
    await elder.post(path, { leavesTrace: true, askedById: null }).expect(204);
    expect(await registerOf(steward)).toEqual([]);
    await officer.get(consentsPath(officer, consent.id)).expect(404);
    await officer.get(`/api/attachments/${voice.id}`).expect(404);
    const files: string[] = [];
    for await (const key of api.storage.keys()) files.push(key);
    expect(files).toEqual([]);
  });
});

describe('the records', () => {
  it('say that something was agreed and taken back, with codes alone', async () => {
    const { officer, elder } = village;
    const consent = await addConsent(officer, 'entry', village.millet, {
      conditions: 'Secretly',
      uses: ['keep', 'show'],
    });
    await withdrawConsent(officer, consent).expect(200);
    const answer = await elder.get(`/api/communities/${elder.communityId}/audit`).expect(200);
    const actions = (answer.body as { items: { action: string; details: object }[] }).items;
    expect(actions.slice(0, 2)).toMatchObject([
      { action: 'consent-withdrawn', details: { consentId: consent.id, state: 'withdrawn' } },
      { action: 'consent-written', details: { state: 'given' } },
    ]);
    expect(answer.text).not.toContain('Secretly');
  });
});
