import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { MeetingInput, PaperAnswer, TypedMeeting } from '#shared/contracts/meetings.js';
import type { Problem } from '#shared/contracts/problem.js';
import type { Answer } from '#shared/contracts/reviews.js';
import type { Version } from '#shared/contracts/versions.js';
import { openTestApi, type Client, type TestApi } from '#tests/support/api.js';
import {
  openSubmission,
  reasonOf,
  says,
  takeBack,
  versionPath,
  type Village,
} from '#tests/support/calendar-api.js';
import { plainPicture, webm } from '#tests/support/media.js';
import { readPdfText } from '#tests/support/pdf/read-text.js';

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
const mark = (elder: Client, index = 0, changes: Partial<PaperAnswer> = {}): PaperAnswer => ({
  ...{ elderId: elder.personId, entryId: entryId(index), answer: 'agree', note: '' },
  ...changes,
});
const paper = (answers: PaperAnswer[], changes: Partial<MeetingInput> = {}) => ({
  ...{ heldOn: '2026-11-30', witness: 'Tirel', answers },
  ...changes,
});
const type = async (client: Client, input: object, picture: Buffer | null = null) =>
  client.upload(`${versionPath(version)}/meetings`, input, picture ?? (await plainPicture('jpeg')));
const given = async (client = village.officer) =>
  ((await client.get(`${versionPath(version)}/answers`).expect(200)).body as { items: Answer[] }).items;
const codes = ({ body }: { body: unknown }) =>
  (body as Problem).errors?.map(({ field, code }) => `${field} ${code}`);
const keysIn = async () => {
  const keys: string[] = [];
  for await (const key of api.storage.keys()) keys.push(key);
  return keys;
};

describe('what was marked at a meeting', () => {
  it('becomes answers with the picture of the paper as their proof, for those who see the answers', async () => {
    const change = mark(village.elder2, 1, { answer: 'change-this', note: 'A week later' });
    const typed = await type(village.officer, paper([mark(village.elder), change]));
    expect(typed.status).toBe(201);
    expect(typed.body as TypedMeeting).toMatchObject({ written: 2, stood: [] });
    const answers = await given();
    expect(answers).toHaveLength(2);
    for (const { proof, witness, recordedByName } of answers) {
      expect({ witness, recordedByName }).toEqual({ witness: 'Tirel', recordedByName: 'Beyno' });
      expect(proof).toMatchObject({ kind: 'paper', on: '2026-11-30' });
    }
    const picture = `/api/attachments/${answers[0]?.proof?.attachmentId ?? ''}/parts/1`;
    await village.elder3.get(picture).expect(200);
    for (const mailbox of ['observer', 'officer2'])
      await (await api.signIn(mailbox)).get(picture).expect(404);
  });

  it('never counts without the picture, and a sound is none', async () => {
    const input = paper([mark(village.elder)]);
    const bare = await village.officer.upload(`${versionPath(version)}/meetings`, input, null);
    expect(bare.status).toBe(422);
    expect(codes(await type(village.officer, input, webm()))).toEqual(['file not-a-picture']);
    expect(await given()).toEqual([]);
    expect(await keysIn()).toEqual([]);
  });

  it('does not write over an elder’s own hand, and says so', async () => {
    const path = `${versionPath(version)}/entries/${entryId()}/answer`;
    await village.elder.put(path, says({ answer: 'not-for-the-board' })).expect(200);
    const typed = await type(village.officer, paper([mark(village.elder), mark(village.elder2)]));
    expect(typed.body).toMatchObject({
      written: 1,
      stood: [{ elderId: village.elder.personId, entryId: entryId() }],
    });
    const own = (await given()).find(({ elderName }) => elderName === 'Elder A-1');
    expect(own).toMatchObject({ answer: 'not-for-the-board', proof: null });
    expect(reasonOf(await type(village.officer, paper([mark(village.elder)])))).toBe('409 own-answer-stands');
  });

  it('is all or nothing', async () => {
    const stranger = mark(village.elder, 0, { elderId: village.officer.personId });
    expect(reasonOf(await type(village.officer, paper([mark(village.elder), stranger])))).toBe(
      '409 not-an-elder',
    );
    const nowhere = mark(village.elder, 0, { entryId: village.officer.personId });
    expect((await type(village.officer, paper([mark(village.elder), nowhere]))).status).toBe(404);
    const twice = await type(village.officer, paper([mark(village.elder), mark(village.elder)]));
    expect(codes(twice)).toEqual(['answers.1.entryId no-duplicates']);
    const silent = await type(village.officer, paper([mark(village.elder, 0, { answer: 'change-this' })]));
    expect(codes(silent)).toEqual(['answers.0.note say-what-to-change']);
    const ahead = await type(village.officer, paper([mark(village.elder)], { heldOn: '2027-01-01' }));
    expect(codes(ahead)).toEqual(['heldOn in-the-future']);
    expect(await given()).toEqual([]);
    expect(await keysIn()).toEqual([]);
  });

  it('is typed by officers and stewards, while the submission is in review', async () => {
    expect((await type(village.elder, paper([mark(village.elder2)]))).status).toBe(403);
    expect((await type(village.steward, paper([mark(village.elder2)]))).status).toBe(201);
    await takeBack(village.officer, version);
    expect(reasonOf(await type(village.officer, paper([mark(village.elder)])))).toBe('409 not-in-review');
  });

  it('loses its picture with an entry on it that is taken back; the other answers keep their words', async () => {
    await type(village.officer, paper([mark(village.elder), mark(village.elder, 1)]));
    const path = `/api/communities/${village.officer.communityId}/items/entry/${entryId()}/withdrawal`;
    const asked = { leavesTrace: false, askedById: village.elder.personId };
    await village.officer.post(path, asked).expect(204);
    expect(await given()).toMatchObject([
      { entryId: entryId(1), answer: 'agree', proof: { kind: 'paper', attachmentId: null } },
    ]);
    expect(await keysIn()).toEqual([]);
  });
});

describe('the sheet that is read to a meeting', () => {
  it('holds each entry in sentences, the four answers, every elder, and number and hash on every page', async () => {
    const path = `${versionPath(version)}/read-back.pdf`;
    const sheet = await village.officer
      .get(path)
      .responseType('blob')
      .expect(200)
      .expect('Content-Type', 'application/pdf');
    const pages = readPdfText(sheet.body as Buffer)
      .split('\f')
      .map((page) => page.replace(/\s+/gu, ' '))
      .filter((page) => page.trim() !== '');
    const text = pages.join(' ');
    for (const { content } of version.entries) expect(text).toContain(content.titleOfficer);
    for (const words of ['Agree', 'Not mine to say', 'Elder A-1', 'Elder A-3', 'Best days:']) {
      expect(text).toContain(words);
    }
    for (const page of pages) {
      expect(page).toContain(`Submission ${version.number}`);
      expect(page.replace(/\s/gu, '')).toContain(version.hash);
    }
  });

  it('is for those who review, and for a submission in review', async () => {
    const path = `${versionPath(version)}/read-back.pdf`;
    await (await api.signIn('observer')).get(path).expect(403);
    await takeBack(village.officer, version);
    expect(reasonOf(await village.officer.get(path))).toBe('409 not-in-review');
  });
});
