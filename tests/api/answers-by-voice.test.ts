import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { Problem } from '#shared/contracts/problem.js';
import type { Answer, SpokenAnswerInput } from '#shared/contracts/reviews.js';
import type { Version } from '#shared/contracts/versions.js';
import { openTestApi, type Client, type TestApi } from '#tests/support/api.js';
import { addRecording, attachmentsPath, recordingInput } from '#tests/support/attachment-api.js';
import {
  openSubmission,
  outcomes,
  reasonOf,
  says,
  sign,
  versionPath,
  answerAll,
  type Village,
} from '#tests/support/calendar-api.js';
import { plainPicture, webm } from '#tests/support/media.js';

let api: TestApi;
let village: Village;
let version: Version;
beforeAll(async () => {
  api = await openTestApi();
});
beforeEach(async () => {
  ({ village, version } = await openSubmission(api));
});
afterAll(() => api.close());

const entryId = (index = 0) => version.entries[index]?.entryId ?? '';
const path = (index = 0) => `${versionPath(version)}/entries/${entryId(index)}/answer`;
const byVoice = (recordingId: string) => says({ answer: 'change-this', note: '', recordingId });
const given = async (client: Client) =>
  ((await client.get(`${versionPath(version)}/answers`).expect(200)).body as { items: Answer[] }).items;
const speak = (client: Client, about = entryId(), changes = {}) =>
  addRecording(client, about, { subjectType: 'entry', ...changes });
const fieldOf = ({ body }: { body: unknown }) =>
  (body as Problem).errors?.map(({ field, code }) => `${field} ${code}`);

describe('"change this" by voice', () => {
  it('counts instead of typed words, and is heard by whoever may hear the recording', async () => {
    const { id } = await speak(village.elder);
    const answer = (await village.elder.put(path(), byVoice(id)).expect(200)).body as Answer;
    expect(answer).toMatchObject({
      answer: 'change-this',
      note: '',
      proof: null,
      spoken: { state: 'kept', attachmentId: id },
    });
    expect((await given(village.elder2))[0]?.spoken).toEqual({ state: 'kept', attachmentId: id });
    // It was spoken for the elders: the officer learns that it was spoken, and not where.
    expect((await given(village.officer))[0]?.spoken).toEqual({ state: 'kept-apart', attachmentId: null });
  });

  it('is the elder’s own, about this entry, and whole', async () => {
    const others = await speak(village.elder2);
    const elsewhere = await speak(village.elder, entryId(1));
    const begun = await village.elder.upload(
      attachmentsPath(village.elder),
      recordingInput({ subjectType: 'entry', subjectId: entryId() }),
      webm({ note: 'I agree' }),
    );
    const { id: unfinished } = begun.body as { id: string };
    for (const id of [others.id, elsewhere.id, unfinished, entryId()]) {
      const refused = await village.elder.put(path(), byVoice(id)).expect(422);
      expect(fieldOf(refused)).toEqual(['recordingId not-your-recording']);
    }
    expect(await given(village.elder)).toEqual([]);
  });

  it('says that the recording was taken away once it is gone, and does not take a gone one', async () => {
    const { id } = await speak(village.elder);
    await village.elder.put(path(), byVoice(id)).expect(200);
    await village.elder.delete(`/api/attachments/${id}`).expect(204);
    for (const client of [village.elder, village.officer]) {
      expect((await given(client))[0]).toMatchObject({
        answer: 'change-this',
        spoken: { state: 'taken-away', attachmentId: null },
      });
    }
    expect(fieldOf(await village.elder.put(path(), byVoice(id)))).toEqual(['recordingId not-your-recording']);
  });

  it('is not needed for the other answers, and goes when the answer is given anew without it', async () => {
    const { id } = await speak(village.elder);
    await village.elder.put(path(), { ...byVoice(id), answer: 'not-for-the-board' }).expect(200);
    await village.elder.put(path(), says()).expect(200);
    expect((await given(village.elder))[0]).toMatchObject({ answer: 'agree', spoken: null });
  });
});

describe('a voice that proves what another hand wrote', () => {
  const spoken = (changes: Partial<SpokenAnswerInput> = {}) => ({
    answer: 'agree',
    note: '',
    onBehalfOf: village.elder.personId,
    ...changes,
  });
  const send = (client: Client, changes = {}, file = webm({ note: 'I agree to the barley' })) =>
    client.upload(`${path()}/spoken`, spoken(changes), file);

  it('is kept in the same step, and heard by whoever may see the answer', async () => {
    const answer = (await send(village.officer).expect(201)).body as Answer;
    expect(answer).toMatchObject({ elderName: 'Elder A-1', recordedByName: 'Beyno', witness: null });
    expect(answer.proof).toMatchObject({ kind: 'voice', on: null });
    const clip = `/api/attachments/${answer.proof?.attachmentId ?? ''}/parts/1`;
    for (const client of [village.elder, village.elder2, village.officer, village.steward]) {
      await client.get(clip).expect(200);
    }
    for (const mailbox of ['staff', 'observer', 'officer2']) {
      await (await api.signIn(mailbox)).get(clip).expect(404);
    }
  });

  it('leaves nothing behind where it is no sound, or where nobody may answer', async () => {
    const before = api.storage;
    const picture = await send(village.officer, {}, await plainPicture()).expect(422);
    expect(fieldOf(picture)).toEqual(['file not-a-recording']);
    await village.elder.put(path(), says()).expect(200);
    expect(reasonOf(await send(village.officer))).toBe('409 own-answer-stands');
    expect(await filesOf(before)).toEqual([]);
  });

  it('is for another hand only, for elders only, and not after they have signed', async () => {
    expect(reasonOf(await send(village.elder, { onBehalfOf: null }))).toBe('409 no-proof-needed');
    const staff = await api.signIn('staff');
    expect(reasonOf(await send(village.officer, { onBehalfOf: staff.personId }))).toBe('409 not-an-elder');
    await send(staff).expect(403);
    await answerAll(village.elder2, version);
    await sign(village.elder2, version, 'elder').expect(200);
    const late = await send(village.officer, { onBehalfOf: village.elder2.personId });
    expect(reasonOf(late)).toBe('409 elder-has-signed');
  });

  it('sent twice at once is one answer', async () => {
    const both = await Promise.all([send(village.officer), send(village.officer)]);
    expect(outcomes(both)).toEqual(['201', '201']);
    expect(await given(village.elder)).toHaveLength(1);
  });
});

async function filesOf(storage: TestApi['storage']): Promise<string[]> {
  const keys: string[] = [];
  for await (const key of storage.keys()) keys.push(key);
  return keys;
}
