import { readdirSync } from 'node:fs';
import path from 'node:path';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { sweepOrphans } from '#server/features/attachments/attachment-sweep.service.js';
import type { Attachment, WordsInput } from '#shared/contracts/attachments.js';
import type { Problem } from '#shared/contracts/problem.js';
import { Readable } from 'node:stream';
import { openTestApi, type Client, type TestApi } from '#tests/support/api.js';
import {
  addPart,
  addPicture,
  addRecording,
  attachmentInput,
  attachmentsPath,
  recordingInput,
} from '#tests/support/attachment-api.js';
import { reasonOf } from '#tests/support/calendar-api.js';
import { addFigure } from '#tests/support/figure-api.js';
import { movie, mp4, ogg, plainPicture, webm } from '#tests/support/media.js';

let api: TestApi;
let officer: Client;
let elder: Client;
let elder2: Client;
let figureId: string;
let virus = false;
beforeAll(async () => {
  api = await openTestApi({ scan: () => Promise.resolve(!virus) });
});
afterAll(() => api.close());
beforeEach(async () => {
  virus = false;
  await api.reset();
  [officer, elder, elder2] = await Promise.all([
    api.signIn('officer'),
    api.signIn('elder'),
    api.signIn('elder2'),
  ]);
  figureId = (await addFigure(officer)).id;
});

async function keptFiles(): Promise<number> {
  const keys: string[] = [];
  for await (const key of api.storage.keys()) keys.push(key);
  return keys.length;
}
const waitingFiles = () => readdirSync(path.join(api.dataDir, 'waiting'));
const listed = async (client: Client, subjectType = 'figure', subjectId = figureId) =>
  (
    (
      await client
        .get(`${attachmentsPath(client)}?subjectType=${subjectType}&subjectId=${subjectId}`)
        .expect(200)
    ).body as { items: Attachment[] }
  ).items;
const fieldsOf = (answer: { body: unknown }) =>
  (answer.body as Problem).errors?.map(({ field, code }) => `${field} ${code}`);

describe('a picture', () => {
  it('is kept as what it shows, and the village sees it', async () => {
    const picture = await addPicture(officer, figureId);
    expect(picture).toMatchObject({
      kind: 'picture',
      title: 'The bowl',
      addedBy: 'Beyno',
      addedAt: api.clock.now().toISOString(),
      picture: { widthPx: 40, heightPx: 40 },
      parts: [{ part: 1, contentType: 'image/jpeg', seconds: null }],
      words: [],
      may: { writeWords: true, remove: true },
    });
    const observer = await api.signIn('observer');
    expect(await listed(observer)).toMatchObject([
      { id: picture.id, may: { writeWords: false, remove: false } },
    ]);
  });

  it.each([
    ['a sound', webm()],
    ['a page', Buffer.from('<html></html>')],
    ['a drawing that can run scripts', Buffer.from('<svg xmlns="http://www.w3.org/2000/svg"/>')],
  ])('is not made from %s', async (_what, file) => {
    const answer = await officer.upload(
      attachmentsPath(officer),
      attachmentInput({ subjectId: figureId }),
      file,
    );
    expect([answer.status, fieldsOf(answer)]).toEqual([422, ['file not-a-picture']]);
    expect([await keptFiles(), waitingFiles(), await listed(officer)]).toEqual([0, [], []]);
  });

  it('says at each field what is amiss, and keeps nothing', async () => {
    const input = {
      ...attachmentInput({ subjectId: figureId }),
      consent: 'clip',
      subjectType: 'cloud',
      more: 1,
    };
    const answer = await officer.upload(attachmentsPath(officer), input, await plainPicture());
    expect(answer.status).toBe(422);
    expect(fieldsOf(answer)?.sort()).toEqual(['more not-expected', 'subjectType not-in-list']);
    expect([await keptFiles(), waitingFiles()]).toEqual([0, []]);
  });

  it('needs its file', async () => {
    const answer = await officer.upload(
      attachmentsPath(officer),
      attachmentInput({ subjectId: figureId }),
      null,
    );
    expect([answer.status, fieldsOf(answer)]).toEqual([422, ['file required']]);
  });

  it('that is too large is refused with the limit', async () => {
    const file = Buffer.concat([await plainPicture(), Buffer.alloc(12 * 1024 * 1024)]);
    const answer = await officer.upload(
      attachmentsPath(officer),
      attachmentInput({ subjectId: figureId }),
      file,
    );
    expect(reasonOf(answer)).toBe('413 file-too-large');
    expect([await keptFiles(), waitingFiles()]).toEqual([0, []]);
  });

  it('that a virus scanner finds fault with is not kept', async () => {
    virus = true;
    const input = attachmentInput({ subjectId: figureId });
    expect(reasonOf(await officer.upload(attachmentsPath(officer), input, await plainPicture()))).toBe(
      '409 file-refused',
    );
    expect([await keptFiles(), waitingFiles()]).toEqual([0, []]);
  });

  it('sent twice, even at once, is there once', async () => {
    const input = attachmentInput({ subjectId: figureId });
    const file = await plainPicture();
    const send = () => officer.upload(attachmentsPath(officer), input, file).expect(201);
    const answers = await Promise.all([send(), send()]);
    answers.push(await send());
    expect(new Set(answers.map(({ body }) => (body as Attachment).id)).size).toBe(1);
    expect([(await listed(officer)).length, await keptFiles()]).toEqual([1, 2]);
  });
});

describe('a recording', () => {
  it('begins with the spoken consent and goes on in parts', async () => {
    const recording = await addRecording(elder, figureId, {}, ['one', 'two']);
    expect(recording).toMatchObject({
      speaker: 'A-2',
      language: 'art-x-tazimel',
      consent: 'clip',
      sharingLevel: 'elders',
    });
    expect(recording.parts.map(({ part, seconds }) => [part, seconds])).toEqual([
      [0, null],
      [1, 2],
      [2, 2],
    ]);
  });

  it.each([
    ['without the spoken consent', { consent: 'asked' as const }, 'consent consent-clip-first'],
    ['of nobody', { speaker: '' }, 'speaker required'],
    ['in no language', { language: null }, 'language required'],
  ])('%s is refused', async (_what, changes, field) => {
    const input = recordingInput({ subjectId: figureId, ...changes });
    expect(fieldsOf(await elder.upload(attachmentsPath(elder), input, webm()))).toEqual([field]);
  });

  it.each([
    ['MP4', mp4(), 'audio/mp4'],
    ['Ogg', ogg(), 'audio/ogg'],
  ])('may be %s', async (_name, file, contentType) => {
    const { id } = await addRecording(elder, figureId, {}, []);
    const answer = await elder
      .upload(`/api/attachments/${id}/parts`, { part: 1, seconds: 2 }, file)
      .expect(201);
    expect((answer.body as Attachment).parts[1]?.contentType).toBe(contentType);
  });

  it('with moving pictures is refused', async () => {
    const input = recordingInput({ subjectId: figureId });
    const answer = await elder.upload(attachmentsPath(elder), input, movie());
    expect(fieldsOf(answer)).toEqual(['file not-a-recording']);
  });

  it('takes each part once, in order, and only from who began it', async () => {
    const { id } = await addRecording(elder, figureId, { sharingLevel: 'village' }, ['one']);
    const parts = `/api/attachments/${id}/parts`;
    expect((await addPart(elder, id, 1, 'one')).parts).toHaveLength(2);
    expect(reasonOf(await elder.upload(parts, { part: 1, seconds: 2 }, webm({ note: 'another' })))).toBe(
      '409 part-differs',
    );
    expect(reasonOf(await elder.upload(parts, { part: 3, seconds: 2 }, webm()))).toBe('409 part-missing');
    expect(reasonOf(await elder2.upload(parts, { part: 2, seconds: 2 }, webm()))).toBe('409 not-yours');
    expect([await keptFiles(), waitingFiles()]).toEqual([2, []]);
  });
});

describe('written-out words', () => {
  const words = (changes: Partial<WordsInput> = {}): WordsInput => ({
    kind: 'words',
    language: 'art-x-tazimel',
    text: 'Ŋɔ́rɛ̃ …',
    checkedBySpeaker: false,
    version: null,
    ...changes,
  });

  it('stand beside their translation, each with its author', async () => {
    const { id } = await addRecording(elder, figureId, { sharingLevel: 'village' });
    await elder.put(`/api/attachments/${id}/words`, words({ checkedBySpeaker: true })).expect(200);
    const translation = words({ kind: 'translation', language: 'en', text: 'The bowl …' });
    const saved = (await officer.put(`/api/attachments/${id}/words`, translation).expect(200))
      .body as Attachment;
    expect(
      saved.words.map(({ kind, text, authorName, checkedBySpeaker }) => [
        kind,
        text,
        authorName,
        checkedBySpeaker,
      ]),
    ).toEqual([
      ['words', 'Ŋɔ́rɛ̃ …', elder.session.person?.displayName, true],
      ['translation', 'The bowl …', 'Beyno', false],
    ]);
  });

  it('are never written over unseen: the later writer gets both', async () => {
    const { id } = await addRecording(elder, figureId, { sharingLevel: 'village' });
    await elder.put(`/api/attachments/${id}/words`, words({ text: 'First' })).expect(200);
    const late = await officer.put(`/api/attachments/${id}/words`, words({ text: 'Second' }));
    expect(late.status).toBe(409);
    expect(late.body).toMatchObject({ current: { text: 'First', version: 1 }, sent: { text: 'Second' } });
    await officer.put(`/api/attachments/${id}/words`, words({ text: 'Both', version: 1 })).expect(200);
  });

  it('of two first writers one is kept and the other is told', async () => {
    const { id } = await addRecording(elder, figureId, { sharingLevel: 'village' });
    const write = (client: Client, text: string) =>
      client.put(`/api/attachments/${id}/words`, words({ text }));
    const answers = await Promise.all([write(elder, 'one'), write(officer, 'two')]);
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409]);
  });
});

describe('removing', () => {
  it('takes rows and files away at once, and only whoever added it can', async () => {
    const { id } = await addRecording(elder, figureId, { sharingLevel: 'village' }, ['one', 'two']);
    const picture = await addPicture(officer, figureId);
    expect(reasonOf(await officer.delete(`/api/attachments/${id}`))).toBe('409 not-yours');
    await elder.delete(`/api/attachments/${id}`).expect(204);
    await officer.delete(`/api/attachments/${picture.id}`).expect(204);
    expect((await elder.get(`/api/attachments/${id}/parts/1`)).status).toBe(404);
    expect(await keptFiles()).toBe(0);
  });

  it('leaves nothing behind after a broken end: the next start sweeps files of nobody away', async () => {
    await addPicture(officer, figureId);
    await api.storage.put(Readable.from('of nobody'), 'f'.repeat(32));
    const soon = new Date(Date.now() + 2 * 60 * 60 * 1000);
    expect(await sweepOrphans(api.dataSource, api.storage, new Date())).toBe(0);
    expect(await sweepOrphans(api.dataSource, api.storage, soon)).toBe(1);
    expect(await keptFiles()).toBe(2);
  });
});
