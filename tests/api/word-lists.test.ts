import { randomUUID } from 'node:crypto';
import Papa from 'papaparse';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { Calendar, Entry, EntryInput } from '#shared/contracts/calendars.js';
import { EMPTY_RECORD } from '#shared/contracts/event-record.js';
import type { Problem } from '#shared/contracts/problem.js';
import { PlaceEntity } from '#server/db/entities/place.entity.js';
import { openTestApi, type Client, type TestApi } from '#tests/support/api.js';
import {
  addEntry,
  beginCalendar,
  entriesOf,
  openVillage,
  publishDraft,
  readVersion,
  reasonOf,
  type Village,
} from '#tests/support/calendar-api.js';
import { addWord, changeWords, newWord, renaming, wordsOf, wordsPath } from '#tests/support/words-api.js';

let api: TestApi;
let village: Village;
let officer: Client;
let calendar: Calendar;
beforeAll(async () => {
  api = await openTestApi();
});
beforeEach(async () => {
  await api.reset();
  village = await openVillage(api);
  ({ officer } = village);
  calendar = await beginCalendar(village);
});
afterAll(() => api.close());

const fieldsOf = (body: unknown) =>
  ((body as Problem).errors ?? []).map(({ field, code }) => `${field}: ${code}`);
const only = async (): Promise<Entry> => {
  const [entry] = await entriesOf(officer, calendar.id);
  if (!entry) throw new Error('There is no entry.');
  return entry;
};
const weeding = { ...EMPTY_RECORD, what: { ...EMPTY_RECORD.what, operation: 'weed' as const } };

describe('the words of a village', () => {
  it('begin with those that are built in, and are read by everybody of the village', async () => {
    const lists = await wordsOf(await api.signIn('observer'));
    expect(lists.kinds.items.map(({ key }) => key)).toContain('belief');
    expect(lists.operations.items.map(({ key }) => key)).not.toContain('other');
    expect(lists.crops).toEqual({ version: 0, items: [] });
  });

  it('are renamed, and drafts follow at once, also entries that were written before', async () => {
    await addEntry(officer, calendar.id, { record: weeding });
    expect((await only()).content.kindWord).toBeUndefined();
    await changeWords(officer, 'kinds', renaming('farm', 'Work of the terraces'));
    await changeWords(officer, 'operations', renaming('weed', 'pull grass'));
    const { content } = await only();
    expect(content).toMatchObject({ kind: 'farm', kindWord: { word: 'Work of the terraces' } });
    expect(content.record?.what).toMatchObject({ operation: 'weed', operationWord: { word: 'pull grass' } });
  });

  it('are followed by a crop that is just such a word, while versions and longer words stay', async () => {
    const { key } = await addWord(officer, 'crops', { word: 'Millet', like: null });
    const giver = { giver: 'Elder A-1', ifLate: 'Sow beans.' };
    for (const crop of ['Millet', ' MILLET', 'Millet, beans']) {
      await addEntry(officer, calendar.id, { ...giver, crop });
    }
    const version = await publishDraft(village, calendar.id);
    await changeWords(officer, 'crops', renaming(key, 'Long millet'));
    const crops = (await entriesOf(officer, calendar.id)).map(({ content }) => content.crop);
    expect(crops).toEqual(['Long millet', 'Long millet', 'Millet, beans']);
    const frozen = (await readVersion(officer, version)).entries.map(({ content }) => content.crop);
    expect(frozen).toEqual(['Millet', 'MILLET', 'Millet, beans']);
  });

  it('change places among crops in one save, and an entry whose form is open is not written over', async () => {
    const first = await addWord(officer, 'crops', { word: 'Millet', like: null });
    const second = await addWord(officer, 'crops', { word: 'Barley', like: null });
    const { id, content, version } = await addEntry(officer, calendar.id, { crop: 'Millet' });
    await addEntry(officer, calendar.id, { crop: 'Barley' });
    await changeWords(officer, 'crops', (items) =>
      items.map((item) => ({ ...item, word: item.key === first.key ? second.word : first.word })),
    );
    expect((await entriesOf(officer, calendar.id)).map((entry) => entry.content.crop)).toEqual([
      'Barley',
      'Millet',
    ]);
    const late = await officer.put(`/api/calendars/${calendar.id}/entries/${id}`, { content, version });
    expect(reasonOf(late)).toBe('409 stale');
  });

  it('reach no crop of another village', async () => {
    const stranger = await api.signIn('officer2');
    const { communityId } = stranger;
    const { id: placeId } = await api.dataSource.getRepository(PlaceEntity).findOneByOrFail({ communityId });
    const theirs = await beginCalendar({ ...village, officer: stranger, placeId });
    await addEntry(stranger, theirs.id, { crop: 'Millet' });
    const { key } = await addWord(officer, 'crops', { word: 'Millet', like: null });
    await changeWords(officer, 'crops', renaming(key, 'Long millet'));
    const [entry] = await entriesOf(stranger, theirs.id);
    expect(entry?.content.crop).toBe('Millet');
  });

  it('make nobody a writer: saving an entry that only follows its list changes nothing', async () => {
    const { id, version } = await addEntry(officer, calendar.id);
    await changeWords(officer, 'kinds', renaming('farm', 'Work of the terraces'));
    const { content } = await only();
    const path = `/api/calendars/${calendar.id}/entries/${id}`;
    const saved = (await officer.put(path, { content, version }).expect(200)).body as Entry;
    expect(saved.version).toBe(version);
  });

  it('stay in a version as they were when it was frozen', async () => {
    await changeWords(officer, 'kinds', renaming('farm', 'Work of the terraces'));
    await addEntry(officer, calendar.id, { giver: 'Elder A-1', ifLate: 'Sow beans.' });
    const version = await publishDraft(village, calendar.id);
    await changeWords(officer, 'kinds', renaming('farm', 'Field'));
    const frozen = await readVersion(officer, version);
    expect(frozen.entries[0]?.content.kindWord).toEqual({ word: 'Work of the terraces' });
    expect((await only()).content.kindWord).toEqual({ word: 'Field' });
  });

  it('may be the village’s own: one behaves like a built-in one, for good', async () => {
    const own = await addWord(officer, 'kinds', { like: 'belief', word: 'First-smoke work' });
    const word = { id: own.key, word: 'whatever was typed' };
    await addEntry(officer, calendar.id, { kind: 'belief', kindWord: word, sharingLevel: 'village' });
    expect((await only()).content.kindWord).toEqual({ id: own.key, word: 'First-smoke work' });
    await changeWords(officer, 'kinds', (items) => items.map((item) => ({ ...item, like: 'farm' as const })));
    expect((await wordsOf(officer)).kinds.items.at(-1)).toMatchObject({ key: own.key, like: 'belief' });
  });

  it('are refused in an entry where they are not in its list, or mean something else', async () => {
    const own = await addWord(officer, 'kinds', { like: 'safety', word: 'Watch' });
    const write = async (changes: Partial<EntryInput>) => {
      const { content } = await addEntry(officer, calendar.id);
      return officer.post(`/api/calendars/${calendar.id}/entries`, { ...content, ...changes });
    };
    const strange = { id: randomUUID(), word: 'Watch' };
    expect(fieldsOf((await write({ kind: 'safety', kindWord: strange })).body)).toEqual([
      'kindWord.id: unknown-word',
    ]);
    expect(fieldsOf((await write({ kind: 'farm', kindWord: { ...strange, id: own.key } })).body)).toEqual([
      'kindWord.id: unknown-word',
    ]);
  });

  it('lose nothing that is used when they are offered no more', async () => {
    const own = await addWord(officer, 'operations', { like: 'other', word: 'turn the racks' });
    const what = { ...EMPTY_RECORD.what, operation: 'other' as const, ownOperation: 'x' };
    const operationWord = { id: own.key, word: own.word };
    await addEntry(officer, calendar.id, { record: { ...EMPTY_RECORD, what: { ...what, operationWord } } });
    await changeWords(officer, 'operations', (items) =>
      items.map((item) => ({ ...item, isHidden: item.key === own.key })),
    );
    expect((await only()).content.record?.what).toMatchObject({
      ...{ operation: 'other', ownOperation: 'turn the racks', operationWord },
    });
  });

  it('keep the order in which they are put', async () => {
    await changeWords(officer, 'kinds', (items) => [...items].reverse());
    const { kinds } = await wordsOf(village.elder);
    expect([kinds.items[0]?.key, kinds.items.at(-1)?.key]).toEqual(['marker-only', 'farm']);
  });
});

describe('words go along', () => {
  it('into tables and files, and a table that says them comes back as it was', async () => {
    const own = await addWord(officer, 'kinds', { like: 'herd-fish-gather', word: 'Lake work' });
    await changeWords(officer, 'kinds', renaming('farm', 'Work of the terraces'));
    const kindWord = { id: own.key, word: own.word };
    await addEntry(officer, calendar.id, { titleOfficer: 'Nets', kind: 'herd-fish-gather', kindWord });
    await addEntry(officer, calendar.id, { titleOfficer: 'Sow' });
    const file = (name: string) => officer.get(`/api/calendars/${calendar.id}/versions/draft/${name}`);
    expect((await file('calendar.ics').expect(200)).text).toContain('CATEGORIES:Lake work');
    const text = (await file('calendar.csv').expect(200)).text.replace(/^\ufeff/u, '');
    const [titles = [], ...lines] = Papa.parse<string[]>(text.trim()).data;
    const column = titles.indexOf('kind');
    expect(lines.map((cells) => cells[column])).toEqual(['Lake work', 'Work of the terraces']);
    const cells = { when: 'Pleiades, first morning', bestFromDays: '7', bestToDays: '23' };
    const table = ['lake work', 'Work of the terraces', 'Safety'].map((kind, index) => ({
      line: index + 2,
      cells: { ...cells, titleOfficer: kind, kind },
    }));
    const body = { dryRun: false, dayOrder: null, natureSigns: [], lines: table };
    await officer.post(`/api/calendars/${calendar.id}/imports/table`, body).expect(200);
    const kinds = (await entriesOf(officer, calendar.id)).map(({ content }) => [
      ...[content.kind, content.kindWord?.id ?? null, content.kindWord?.word ?? null],
    ]);
    expect(kinds.slice(2)).toEqual([
      ['herd-fish-gather', own.key, 'Lake work'],
      ['farm', null, 'Work of the terraces'],
      ['safety', null, null],
    ]);
  });
});

describe('a list of words is refused', () => {
  it.each([
    ['a word that means something else', newWord({ word: 'Safety' }), 'items.7.word: word-taken'],
    ['the usual name of another kind', newWord({ word: 'house and home' }), 'items.7.word: word-taken'],
    ['no word', newWord({ word: ' ' }), 'items.7.word: required'],
    ['a kind that it cannot behave like', newWord({ like: 'weed' }), 'items.7.like: not-in-list'],
  ])('for %s', async (_what, word, refusal) => {
    expect(fieldsOf((await changeWords(officer, 'kinds', (items) => [...items, word])).body)).toEqual([
      refusal,
    ]);
  });

  it('where two words are the same, or a crop’s longer time comes first', async () => {
    const twice = [newWord(), newWord({ word: 'WORK of the terraces' })];
    const kinds = await changeWords(officer, 'kinds', (items) => [...items, ...twice]);
    expect(fieldsOf(kinds.body)).toEqual(['items.8.word: word-taken']);
    const crop = newWord({ word: 'Millet', like: null, fromDays: 100, toDays: 90 });
    const crops = await changeWords(officer, 'crops', () => [crop]);
    expect(fieldsOf(crops.body)).toEqual(['items.0.toDays: days-order']);
  });

  it('where a word is left out, a list is older, or nothing would be offered', async () => {
    expect(reasonOf(await changeWords(officer, 'kinds', (items) => items.slice(1)))).toBe('409 words-differ');
    const none = await changeWords(officer, 'kinds', (items) =>
      items.map((item) => ({ ...item, isHidden: true })),
    );
    expect(reasonOf(none)).toBe('409 one-kind-stays');
    await addWord(officer, 'crops', { word: 'Millet', like: null, fromDays: 80, toDays: 95 });
    const late = await officer.put(`${wordsPath(officer)}/crops`, { version: 0, items: [] });
    expect(reasonOf(late)).toBe('409 stale');
    expect((late.body as { current: unknown }).current).toMatchObject({ version: 1 });
  });

  it('from anybody but the officer', async () => {
    const { elder } = village;
    expect((await changeWords(elder, 'kinds', renaming('farm', 'Field'))).status).toBe(403);
  });
});
