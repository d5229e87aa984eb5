import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { Calendar } from '#shared/contracts/calendars.js';
import type { Problem } from '#shared/contracts/problem.js';
import type { Answer, AnswerInput, ElderProgress } from '#shared/contracts/reviews.js';
import type { Version } from '#shared/contracts/versions.js';
import { openTestApi, type Client, type TestApi } from '#tests/support/api.js';
import {
  addEntry,
  answerAll,
  entriesOf,
  outcomes,
  openSubmission,
  publish,
  readVersion,
  reasonOf,
  says,
  setRoles,
  sign,
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
  ({ village, calendar, version } = await openSubmission(api));
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
