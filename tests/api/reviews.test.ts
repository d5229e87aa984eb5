import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { AuditEventEntity } from '#server/db/entities/audit-event.entity.js';
import type { Calendar } from '#shared/contracts/calendars.js';
import type { Community, SignOffRule } from '#shared/contracts/people.js';
import type { Problem } from '#shared/contracts/problem.js';
import type { Answer, AnswerInput, ElderProgress } from '#shared/contracts/reviews.js';
import type { Version } from '#shared/contracts/versions.js';
import { openTestApi, type Client, type TestApi } from '#tests/support/api.js';
import {
  addEntry,
  answerAll,
  beginCalendar,
  entriesOf,
  openVillage,
  outcomes,
  publish,
  readVersion,
  reasonOf,
  says,
  setRoles,
  sign,
  signOff,
  submit,
  takeBack,
  versionPath,
  type Village,
} from '#tests/support/calendar-api.js';

let api: TestApi;
let village: Village;
let calendar: Calendar;
let version: Version;
beforeAll(async () => {
  api = await openTestApi();
});
beforeEach(async () => {
  await api.reset();
  village = await openVillage(api);
  calendar = await beginCalendar(village);
  await addEntry(village.officer, calendar.id, { titleOfficer: 'Sow long millet' });
  await addEntry(village.officer, calendar.id, { titleOfficer: 'Seed check', crop: 'all seed' });
  version = await submit(village.officer, calendar.id);
});
afterAll(() => api.close());

interface Answers {
  items: Answer[];
  progress: ElderProgress[];
}

const answers = async (client: Client, of = version) =>
  (await client.get(`${versionPath(of)}/answers`).expect(200)).body as Answers;
const answerPath = (index: number, of = version) =>
  `${versionPath(of)}/entries/${of.entries[index]?.entryId ?? ''}/answer`;
const answer = (client: Client, index: number, changes: Partial<AnswerInput> = {}) =>
  client.put(answerPath(index), says(changes));
const askForChange = (client: Client, index = 0) =>
  answer(client, index, { answer: 'change-this', note: 'I wait for the red star' }).expect(200);
const letStand = (client: Client, index = 0) => client.post(`${answerPath(index)}/stand`);
const gapCodes = async () => (await readVersion(village.officer, version)).gaps.map(({ code }) => code);

describe('an answer', () => {
  it('is an elder’s own word, with a note, and can be changed and taken back', async () => {
    const note = 'Not before the soil is wet\nto a hand depth';
    const given = (await answer(village.elder, 0, { answer: 'change-this', note }).expect(200))
      .body as Answer;
    expect(given).toMatchObject({
      elderName: 'Elder A-1',
      entryHash: version.entries[0]?.hash,
      answer: 'change-this',
      note,
      letStand: false,
      recordedByName: null,
      witness: null,
      mine: true,
    });
    await answer(village.elder, 0).expect(200);
    expect((await answers(village.elder2)).items).toMatchObject([{ answer: 'agree', note: '', mine: false }]);
    await village.elder.delete(answerPath(0)).expect(204);
    await village.elder.delete(answerPath(0)).expect(404);
    expect((await answers(village.elder2)).items).toEqual([]);
  });

  it('asks what to change, and is one of four', async () => {
    const empty = await answer(village.elder, 0, { answer: 'change-this' }).expect(422);
    expect((empty.body as Problem).errors).toMatchObject([{ field: 'note', code: 'say-what-to-change' }]);
    await village.elder.put(answerPath(0), { ...says(), answer: 'maybe' }).expect(422);
  });

  it('is not for officers and stewards to give as their own, nor for others to see', async () => {
    await answer(village.officer, 0).expect(403);
    await answer(village.steward, 0).expect(403);
    for (const mailbox of ['staff', 'observer']) {
      const client = await api.signIn(mailbox);
      await answer(client, 0).expect(403);
      await client.get(`${versionPath(version)}/answers`).expect(403);
    }
    const stranger = await api.signIn('officer2');
    await answer(stranger, 0).expect(404);
    await stranger.get(`${versionPath(version)}/answers`).expect(404);
  });

  it('belongs to an entry of this submission, and to a submission in review', async () => {
    const later = await addEntryAfter();
    await village.elder.put(`${versionPath(version)}/entries/${later}/answer`, says()).expect(409);
    const next = await submit(village.officer, calendar.id);
    await village.elder.put(`${versionPath(next)}/entries/${calendar.id}/answer`, says()).expect(404);
    expect(reasonOf(await answer(village.elder, 0))).toBe('409 not-in-review');
    expect(reasonOf(await letStand(village.elder))).toBe('409 not-in-review');
    expect(reasonOf(await village.elder.delete(answerPath(0)))).toBe('409 not-in-review');

    async function addEntryAfter(): Promise<string> {
      await takeBack(village.officer, version);
      return (await addEntry(village.officer, calendar.id)).id;
    }
  });

  it('stays with unchanged content on resubmission and is asked anew where content changed', async () => {
    await answerAll(village.elder, version);
    await askForChange(village.elder2, 1);
    await takeBack(village.officer, version);
    const [, second] = await entriesOf(village.officer, calendar.id);
    if (!second) throw new Error('no second entry');
    const body = { content: { ...second.content, notes: 'Three trays' }, version: second.version };
    await village.officer.put(`/api/calendars/${calendar.id}/entries/${second.id}`, body).expect(200);
    const next = await submit(village.officer, calendar.id);
    const { items, progress } = await answers(village.elder, next);
    expect(items.map(({ entryId, elderName }) => [entryId, elderName])).toEqual([
      [next.entries[0]?.entryId, 'Elder A-1'],
    ]);
    expect(progress).toMatchObject([
      { elderName: 'Elder A-1', answered: 1, of: 2, signed: false, wroteTheDraft: false },
      { elderName: 'Elder A-2', answered: 0, of: 2 },
      { elderName: 'Elder A-3', answered: 0, of: 2 },
    ]);
    expect((await answers(village.elder)).items).toHaveLength(3);
  });

  it('given twice at once is one answer', async () => {
    const both = await Promise.all([answer(village.elder, 0), answer(village.elder, 0)]);
    expect(outcomes(both)).toEqual(['200', '200']);
    expect((await answers(village.elder)).items).toHaveLength(1);
  });
});

describe('an answer written down for an elder', () => {
  const forElder = (changes: Partial<AnswerInput> = {}) => ({
    onBehalfOf: village.elder.personId,
    witness: 'Irvel',
    ...changes,
  });

  it('names who wrote it and who was there; the elder may change it later', async () => {
    const written = (await answer(village.officer, 0, forElder()).expect(200)).body as Answer;
    expect(written).toMatchObject({
      elderName: 'Elder A-1',
      recordedByName: 'Beyno',
      witness: 'Irvel',
      mine: true,
    });
    await answer(village.steward, 0, forElder({ answer: 'not-mine-to-say' })).expect(200);
    await answer(village.elder, 0, { answer: 'not-for-the-board' }).expect(200);
    expect((await answers(village.officer)).items).toMatchObject([
      { answer: 'not-for-the-board', recordedByName: null, witness: null },
    ]);
  });

  it('needs a witness, an elder of the village, and an officer or steward', async () => {
    const alone = await answer(village.officer, 0, forElder({ witness: ' ' })).expect(422);
    expect((alone.body as Problem).errors).toMatchObject([{ field: 'witness', code: 'witness-required' }]);
    const staff = await api.signIn('staff');
    const noElder = await answer(village.officer, 0, forElder({ onBehalfOf: staff.personId }));
    expect(reasonOf(noElder)).toBe('409 not-an-elder');
    await answer(village.elder2, 0, forElder()).expect(403);
  });

  it('never writes over what an elder said with their own hand', async () => {
    await askForChange(village.elder);
    expect(reasonOf(await answer(village.officer, 0, forElder()))).toBe('409 own-answer-stands');
    expect((await answers(village.officer)).items).toMatchObject([{ answer: 'change-this' }]);
  });

  it('counts as an answer and never as a signature', async () => {
    for (const index of [0, 1]) await answer(village.officer, index, forElder()).expect(200);
    const { progress } = await answers(village.officer);
    expect(progress[0]).toMatchObject({ elderName: 'Elder A-1', answered: 2, of: 2, signed: false });
    expect(await gapCodes()).toEqual(['needs-elders', 'needs-person', 'needs-one-of', 'needs-steward']);
    await sign(village.elder, version, 'elder').expect(200);
    expect(reasonOf(await answer(village.officer, 0, forElder()))).toBe('409 elder-has-signed');
  });
});

describe('a difference', () => {
  it('is let stand by the elder who asked for the change, and by nobody else', async () => {
    await askForChange(village.elder3);
    expect(reasonOf(await letStand(village.elder))).toBe('409 no-change-asked');
    await letStand(village.officer).expect(403);
    expect((await letStand(village.elder3).expect(200)).body).toMatchObject({ letStand: true });
    expect((await answers(village.elder)).items).toMatchObject([
      { elderName: 'Elder A-3', answer: 'change-this', note: 'I wait for the red star', letStand: true },
    ]);
  });

  it('stays beside the entry on resubmission and through publishing', async () => {
    await askForChange(village.elder3);
    await letStand(village.elder3).expect(200);
    await takeBack(village.officer, version);
    version = await submit(village.officer, calendar.id);
    await publish(village, version);
    expect((await answers(village.steward)).items.filter((item) => item.letStand)).toHaveLength(1);
  });

  it('is asked about again when the elder changes their answer', async () => {
    await askForChange(village.elder3);
    await letStand(village.elder3).expect(200);
    await askForChange(village.elder3);
    expect(await gapCodes()).toContain('change-stands');
  });
});

describe('signing', () => {
  it('is refused to an elder until every entry has their answer', async () => {
    await answer(village.elder, 0).expect(200);
    expect(await readVersion(village.elder, version)).toMatchObject({
      may: { answer: true, signAsElder: false, signClosedBy: 'answers-missing' },
    });
    expect(reasonOf(await sign(village.elder, version, 'elder'))).toBe('409 answers-missing');
    await answer(village.elder, 1, { answer: 'not-mine-to-say' }).expect(200);
    const signed = (await sign(village.elder, version, 'elder').expect(200)).body as Version;
    expect(signed.signatures).toMatchObject([{ displayName: 'Elder A-1', role: 'elder' }]);
    expect(signed.may).toMatchObject({ answer: false, signAsElder: false, signClosedBy: 'already-signed' });
    expect(reasonOf(await sign(village.elder, version, 'elder'))).toBe('409 already-signed');
  });

  it('is done in a role that one holds', async () => {
    await sign(village.elder, version, 'steward').expect(403);
    await sign(village.steward, version, 'elder').expect(403);
    await sign(village.officer, version, 'elder').expect(403);
  });

  it('closes the elder’s answers, but a difference may still be let stand', async () => {
    await askForChange(village.elder);
    await answer(village.elder, 1).expect(200);
    await sign(village.elder, version, 'elder').expect(200);
    expect(reasonOf(await answer(village.elder, 0))).toBe('409 already-signed');
    expect(reasonOf(await village.elder.delete(answerPath(0)))).toBe('409 already-signed');
    await letStand(village.elder).expect(200);
  });

  it('is refused to whoever wrote to the draft since the last published version', async () => {
    await takeBack(village.officer, version);
    await setRoles(api, village.elder, ['elder', 'officer']);
    await setRoles(api, village.steward, ['steward', 'officer']);
    const [first] = await entriesOf(village.elder, calendar.id);
    await village.elder.post(`/api/calendars/${calendar.id}/entries/${first?.id ?? ''}/copy`).expect(201);
    version = await submit(village.steward, calendar.id);
    await answerAll(village.elder, version);
    expect(reasonOf(await sign(village.elder, version, 'elder'))).toBe('409 wrote-the-draft');
    expect((await answers(village.officer)).progress[0]).toMatchObject({ wroteTheDraft: true, answered: 3 });
    // Sending the draft off is not writing to it.
    await sign(village.steward, version, 'steward').expect(200);
    await answerAll(village.elder2, version);
    await sign(village.elder2, version, 'elder').expect(200);
    await answerAll(village.elder3, version);
    await sign(village.elder3, version, 'elder').expect(200);
    await village.officer.post(`${versionPath(version)}/publish`).expect(200);

    await village.officer.delete(`/api/calendars/${calendar.id}/entries/${first?.id ?? ''}`).expect(204);
    version = await submit(village.officer, calendar.id);
    await answerAll(village.elder, version);
    await sign(village.elder, version, 'elder').expect(200);
  });

  it('does not take an agree of somebody who wrote to the draft for the agree that every entry needs', async () => {
    await takeBack(village.officer, version);
    await setRoles(api, village.elder, ['elder', 'officer']);
    await addEntry(village.elder, calendar.id, { crop: 'oats' });
    version = await submit(village.officer, calendar.id);
    await answerAll(village.elder, version);
    expect(await gapCodes()).toContain('entry-without-agree');
    await answerAll(village.elder2, version);
    expect(await gapCodes()).not.toContain('entry-without-agree');
  });
});

describe('sign-off', () => {
  it('comes with the last signature of the village’s rule, and with nothing else', async () => {
    expect((await readVersion(village.officer, version)).gaps).toMatchObject([
      { code: 'needs-elders', count: 2 },
      { code: 'needs-person', names: ['Elder A-2'] },
      { code: 'needs-one-of', names: ['Elder A-1', 'Elder A-3'] },
      { code: 'needs-steward', count: 1 },
      { code: 'entry-without-agree', names: ['Sow long millet', 'Seed check'], count: 2 },
    ]);
    for (const elder of [village.elder, village.elder2, village.elder3]) await answerAll(elder, version);
    expect((await readVersion(village.officer, version)).state).toBe('in-review');
    await sign(village.steward, version, 'steward').expect(200);
    await sign(village.elder, version, 'elder').expect(200);
    expect((await sign(village.elder3, version, 'elder').expect(200)).body).toMatchObject({
      state: 'in-review',
      gaps: [{ code: 'needs-person', names: ['Elder A-2'] }],
    });
    expect((await sign(village.elder2, version, 'elder').expect(200)).body).toMatchObject({
      state: 'signed-off',
      gaps: [],
      may: { answer: false, signAsElder: false, signClosedBy: 'not-in-review' },
    });
    expect(reasonOf(await answer(village.elder, 0))).toBe('409 not-in-review');
  });

  it('waits while a "change this" stands: the last signature is taken once it is let stand', async () => {
    await answerAll(village.elder, version);
    await answerAll(village.elder2, version);
    await askForChange(village.elder3);
    await sign(village.elder, version, 'elder').expect(200);
    await sign(village.elder2, version, 'elder').expect(200);
    expect(await readVersion(village.steward, version)).toMatchObject({
      gaps: [{ code: 'needs-steward' }, { code: 'change-stands', names: ['Sow long millet'], count: 1 }],
      may: { signAsSteward: false, signClosedBy: 'something-stands' },
    });
    expect(reasonOf(await sign(village.steward, version, 'steward'))).toBe('409 something-stands');
    await letStand(village.elder3).expect(200);
    expect((await readVersion(village.steward, version)).state).toBe('in-review');
    expect((await sign(village.steward, version, 'steward').expect(200)).body).toMatchObject({
      state: 'signed-off',
    });
  });

  it('never comes over a "not for the board": the officer takes the entry out and submits again', async () => {
    await answerAll(village.elder, version);
    await answerAll(village.elder2, version);
    await answer(village.elder3, 1, { answer: 'not-for-the-board' }).expect(200);
    await sign(village.elder, version, 'elder').expect(200);
    await sign(village.elder2, version, 'elder').expect(200);
    expect(reasonOf(await letStand(village.elder3, 1))).toBe('409 no-change-asked');
    expect(reasonOf(await sign(village.steward, version, 'steward'))).toBe('409 something-stands');
    await takeBack(village.officer, version);
    const gone = version.entries[1]?.entryId ?? '';
    await village.officer.delete(`/api/calendars/${calendar.id}/entries/${gone}`).expect(204);
    version = await submit(village.officer, calendar.id);
    expect((await readVersion(village.officer, version)).signatures).toEqual([]);
    for (const elder of [village.elder, village.elder2]) await sign(elder, version, 'elder').expect(200);
    expect((await sign(village.steward, version, 'steward').expect(200)).body).toMatchObject({
      state: 'signed-off',
    });
  });

  it('needs an agree for every entry: "not mine to say" from all is silence', async () => {
    for (const elder of [village.elder, village.elder2]) {
      await answer(elder, 0).expect(200);
      await answer(elder, 1, { answer: 'not-mine-to-say' }).expect(200);
      await sign(elder, version, 'elder').expect(200);
    }
    expect(reasonOf(await sign(village.steward, version, 'steward'))).toBe('409 something-stands');
    await answer(village.elder3, 1).expect(200);
    await sign(village.steward, version, 'steward').expect(200);
  });

  it('goes by the rule as it stood when the draft was submitted', async () => {
    await changeRule({ minElders: 3, mustSign: [], oneOf: [], steward: false });
    expect((await readVersion(village.officer, version)).signOffRule.minElders).toBe(2);
    expect(await signOff(village, version)).toMatchObject({ state: 'signed-off' });
    await takeBack(village.officer, version);
    version = await submit(village.officer, calendar.id);
    expect((await readVersion(village.officer, version)).gaps).toMatchObject([
      { code: 'needs-elders', count: 3 },
    ]);
  });

  it('comes exactly once when the last two sign at once', async () => {
    for (const elder of [village.elder, village.elder2]) await answerAll(elder, version);
    await sign(village.elder, version, 'elder').expect(200);
    const both = await Promise.all([
      sign(village.elder2, version, 'elder'),
      sign(village.steward, version, 'steward'),
    ]);
    expect(outcomes(both)).toEqual(['200', '200']);
    expect(await readVersion(village.officer, version)).toMatchObject({ state: 'signed-off' });
    const events = api.dataSource.getRepository(AuditEventEntity);
    expect(await events.countBy({ action: 'signed-off' })).toBe(1);
    expect(await events.countBy({ action: 'signed' })).toBe(3);
  });

  it('and asking for changes at once: one of them counts, and the draft is locked exactly while it is out', async () => {
    for (const elder of [village.elder, village.elder2]) await answerAll(elder, version);
    await sign(village.elder, version, 'elder').expect(200);
    await sign(village.elder2, version, 'elder').expect(200);
    const [signed, asked] = await Promise.all([
      sign(village.steward, version, 'steward'),
      village.officer.post(`${versionPath(version)}/changes-asked`, { reason: 'taken-back', note: '' }),
    ]);
    // A signed-off submission may still be taken back; one that was taken back is never signed.
    expect(asked.status).toBe(200);
    expect(['200', '409 not-in-review']).toContain(outcomes([signed])[0]);
    expect(await readVersion(village.officer, version)).toMatchObject({ state: 'changes-asked' });
    expect((await village.officer.get(`/api/calendars/${calendar.id}`)).body).toMatchObject({
      locked: false,
    });
  });

  it('does not meet an objection that arrives at the same moment', async () => {
    for (const elder of [village.elder, village.elder2]) await answerAll(elder, version);
    await sign(village.elder, version, 'elder').expect(200);
    await sign(village.elder2, version, 'elder').expect(200);
    const [signed, objected] = await Promise.all([
      sign(village.steward, version, 'steward'),
      answer(village.elder3, 0, { answer: 'not-for-the-board' }),
    ]);
    const { state } = await readVersion(village.officer, version);
    expect(outcomes([signed, objected])).toEqual(
      state === 'signed-off' ? ['200', '409 not-in-review'] : ['200', '409 something-stands'],
    );
  });

  async function changeRule(signOffRule: SignOffRule): Promise<void> {
    const path = `/api/communities/${village.steward.communityId}`;
    const { id: _id, ...settings } = (await village.steward.get(path).expect(200)).body as Community;
    await village.steward.put(path, { ...settings, signOffRule }).expect(200);
  }
});
