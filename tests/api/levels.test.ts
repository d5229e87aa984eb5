import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { openTestApi, type Client, type TestApi } from '#tests/support/api.js';
import { furnishLevels, type LevelledVillage, type Planted } from '#tests/support/levelled-village.js';
import { pathsOf, READING, textOf } from '#tests/support/every-endpoint.js';

/**
 * Marker words stand in things of every level. Every endpoint of the contracts that reads is asked by everybody for
 * everything, and no answer may hold a word that is not for who asks. A new endpoint comes into this by itself; one
 * whose parameters are new has to be given values here.
 */
let api: TestApi;
let village: LevelledVillage;
let people: Record<string, Client>;

beforeAll(async () => {
  api = await openTestApi();
  village = await furnishLevels(api);
  people = {
    steward: village.steward,
    officer: village.officer,
    giver: village.elder,
    heir: village.elder2,
    weaver: village.elder3,
    staff: village.staff,
    'observer of the group': village.observer,
    'officer of another village': village.officer2,
    visitor: await api.visitor(),
  };
}, 120_000);
afterAll(() => api.close());

describe('what every endpoint says to everybody', () => {
  it.each(READING.map((endpoint) => [`${endpoint.method} ${endpoint.path}`, endpoint] as const))(
    '%s holds no word that is not for who asks',
    async (_, endpoint) => {
      for (const [name, client] of Object.entries(people)) {
        for (const path of pathsOf(endpoint, village)) {
          const text = await textOf(client, path, endpoint);
          const leaked = village.planted.filter(
            ({ word, for: seers }) => text.includes(word) && !seers.has(name),
          );
          expect(leaked.map(({ word }) => `${name} read ${word} at ${path}`)).toEqual([]);
        }
      }
    },
  );

  it('shows each thing to its own people somewhere, so that the search above means something', async () => {
    for (const [name, client] of Object.entries(people)) {
      const seen = new Set<string>();
      for (const endpoint of READING.filter(({ id }) => SHOWING.has(id))) {
        for (const path of pathsOf(endpoint, village)) {
          const text = await textOf(client, path, endpoint);
          for (const { word } of village.planted) if (text.includes(word)) seen.add(word);
        }
      }
      const expected = village.planted.filter(({ for: seers }) => seers.has(name)).map(({ word }) => word);
      expect([name, [...seen].sort()]).toEqual([name, expected.sort()]);
    }
  });
});

describe('the printed board', () => {
  it.each(['month-cards', 'year-board'])(
    '%s holds open and village entries alone, whoever prints it',
    async (layout) => {
      for (const client of [village.officer, village.elder, village.staff]) {
        const path = `/api/calendars/${village.calendarId}/versions/${village.publishedNumber}/sheet.pdf?layout=${layout}`;
        const text = await textOf(client, path, { fileType: 'application/pdf' });
        const printed = village.planted.filter(({ word }) => text.includes(word));
        expect(printed.map(({ where }) => where).sort()).toEqual(['open entry', 'village entry']);
      }
    },
  );
});

describe('a thing that somebody does not see', () => {
  it('is answered like a thing that never was, by whatever would read or change it', async () => {
    const { hiddenEntryId, hiddenFigureId } = village;
    const hidden = await tries(hiddenEntryId, hiddenFigureId);
    const nothing = await tries(randomUUID(), randomUUID());
    expect(hidden).toEqual(nothing);
    expect(hidden.every(([status]) => status === 404 || status === 409)).toBe(true);
  });

  async function tries(hiddenEntryId: string, hiddenFigureId: string): Promise<[number, string][]> {
    const { calendarId } = village;
    const community = `/api/communities/${village.officer.communityId}`;
    const entry = `/api/calendars/${calendarId}/entries/${hiddenEntryId}`;
    const reviewed = `/api/calendars/${calendarId}/versions/${village.reviewedNumber}/entries/${hiddenEntryId}/answer`;
    const body = { content: village.content, version: 1 };
    const answers = [
      await village.officer.put(entry, body),
      await village.officer.delete(entry),
      await village.officer.post(`${entry}/copy`),
      await village.officer.post(`${entry}/restore`),
      await village.elder3.put(reviewed, { answer: 'agree', note: '', onBehalfOf: null, witness: null }),
      await village.elder3.delete(reviewed),
      await village.officer.put(`${community}/figures/${hiddenFigureId}`, { ...village.figure, version: 1 }),
      await village.officer.delete(`${community}/figures/${hiddenFigureId}`),
      await village.officer.post(`${community}/figures/${hiddenFigureId}/restore`),
      await village.steward.get(`${community}/items/entry/${hiddenEntryId}/sharing`),
      await village.steward.put(`${community}/items/entry/${hiddenEntryId}/sharing`, village.sharingChange),
      await village.steward.post(`${community}/items/entry/${hiddenEntryId}/sharing/agreement`),
    ];
    return answers.map(({ status, body: { type } }) => [status, String(type)]);
  }
});

describe('a telling season', () => {
  it('opens on its first day and closes after its last, by the clock of the village', async () => {
    const word = plantedIn('season entry').word;
    const seen: Record<string, boolean> = {};
    // Upper Tazimel is three hours ahead of universal time.
    for (const at of [
      '2027-07-31T20:59:00Z',
      '2027-07-31T21:01:00Z',
      '2027-08-31T20:59:00Z',
      '2027-08-31T21:01:00Z',
    ]) {
      api.clock.set(new Date(at));
      const officer = await api.signIn('officer');
      const path = `/api/calendars/${village.calendarId}/versions/${village.publishedNumber}`;
      seen[at] = (await officer.get(path).expect(200)).text.includes(word);
    }
    api.clock.set(new Date('2026-12-01T06:00:00Z'));
    expect(Object.values(seen)).toEqual([false, true, true, false]);
  });
});

/** Where a thing of each person is to be found. */
const SHOWING = new Set([
  'listEntries',
  'readVersion',
  'listFigures',
  'listAnswers',
  'readConsent',
  'listAttachments',
  'listNotes',
]);

function plantedIn(where: string): Planted {
  const found = village.planted.find((one) => one.where === where);
  if (!found) throw new Error(`Nothing is planted in ${where}`);
  return found;
}
