import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { Calendar } from '#shared/contracts/calendars.js';
import type { Answer } from '#shared/contracts/reviews.js';
import type { Version } from '#shared/contracts/versions.js';
import { openTestApi, type Client, type TestApi } from '#tests/support/api.js';
import {
  addEntry,
  answerAll,
  openSubmission,
  publishDraft,
  readVersion,
  says,
  sign,
  submit,
  takeBack,
  versionPath,
  type Village,
} from '#tests/support/calendar-api.js';
import { withdraw } from '#tests/support/withdrawal-api.js';
import { addWord, changeWords, renaming } from '#tests/support/words-api.js';

let api: TestApi;
let village: Village;
let calendar: Calendar;
let first: Version;
beforeAll(async () => {
  api = await openTestApi();
});
beforeEach(async () => {
  ({ village, calendar, version: first } = await openSubmission(api));
});
afterAll(() => api.close());

const answersIn = async (client: Client, version: Version): Promise<Answer[]> =>
  ((await client.get(`${versionPath(version)}/answers`).expect(200)).body as { items: Answer[] }).items;
const words = async (version: Version) =>
  (await answersIn(village.officer, version)).map(({ entryId, entryHash, elderId, answer }) => ({
    ...{ entryId, answer, isTheirs: elderId === village.elder.personId },
    isOfThisText: version.entries.some((one) => one.entryId === entryId && one.hash === entryHash),
  }));
const callFarmWork = (word: string) => changeWords(village.officer, 'kinds', renaming('farm', word));

describe('what elders said to an entry', () => {
  it('stands where the village calls its kind otherwise: both texts are frozen, and the elder can sign', async () => {
    const { elder, officer } = village;
    await answerAll(elder, first);
    await takeBack(officer, first);
    await callFarmWork('Work of the terraces');
    const second = await submit(officer, calendar.id);
    expect(second.entries[0]?.content.kindWord).toEqual({ word: 'Work of the terraces' });
    expect((await readVersion(officer, first)).entries[0]?.content.kindWord).toBeUndefined();
    expect(second.entries[0]?.hash).not.toBe(first.entries[0]?.hash);
    const given = await words(second);
    const agreed = { answer: 'agree', isTheirs: true, isOfThisText: true };
    expect(given).toMatchObject([agreed, agreed]);
    expect(given.map(({ entryId }) => entryId).sort()).toEqual(
      second.entries.map(({ entryId }) => entryId).sort(),
    );
    await sign(elder, second, 'elder').expect(200);
  });

  it('is one word through all names: what is said later counts when the old name comes back', async () => {
    const { elder, officer } = village;
    await answerAll(elder, first);
    await takeBack(officer, first);
    await callFarmWork('Field');
    const second = await submit(officer, calendar.id);
    await answerAll(elder, second, says({ answer: 'change-this', note: 'Later.' }));
    await takeBack(officer, second);
    await callFarmWork('');
    const third = await submit(officer, calendar.id);
    expect((await words(third)).map(({ answer }) => answer)).toEqual(['change-this', 'change-this']);
    const path = `${versionPath(third)}/entries/${third.entries[0]?.entryId ?? ''}/answer`;
    await elder.delete(path).expect(204);
    expect(await words(third)).toHaveLength(1);
  });

  it('is asked anew where the entry goes by another crop or by another word of the village', async () => {
    const { elder, officer } = village;
    const crop = await addWord(officer, 'crops', { word: 'Long millet', like: null });
    const own = await addWord(officer, 'kinds', { like: 'farm', word: 'First-smoke work' });
    await answerAll(elder, first);
    await takeBack(officer, first);
    await changeWords(officer, 'crops', renaming(crop.key, 'Grey millet'));
    const [, seed] = first.entries;
    const path = `/api/calendars/${calendar.id}/entries/${seed?.entryId ?? ''}`;
    const content = { ...seed?.content, kindWord: { id: own.key, word: own.word } };
    await officer.put(path, { content, version: 1 }).expect(200);
    const second = await submit(officer, calendar.id);
    expect(second.entries.map((entry) => entry.content.crop)).toEqual(['Grey millet', 'all seed']);
    expect(await words(second)).toEqual([]);
  });

  it('goes with its entry when that is taken back, under every name', async () => {
    const { elder, officer } = village;
    const kept = await addAfter(first);
    await answerAll(elder, kept);
    await takeBack(officer, kept);
    await callFarmWork('Field');
    const next = await publishDraft(village, calendar.id);
    const own = next.entries.at(-1)?.entryId ?? '';
    expect((await words(next)).some(({ entryId }) => entryId === own)).toBe(true);
    await withdraw(elder, 'entry', own).expect(204);
    expect((await words(next)).some(({ entryId }) => entryId === own)).toBe(false);
  });
});

/** The draft with an entry that the elder gave, out for review again. */
async function addAfter(before: Version): Promise<Version> {
  const { officer, elder } = village;
  await takeBack(officer, before);
  await addEntry(officer, calendar.id, { giver: 'Elder A-2', giverId: elder.personId });
  return submit(officer, calendar.id);
}
