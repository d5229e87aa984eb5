import { randomUUID } from 'node:crypto';
import { readFileSync } from 'node:fs';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Endpoint } from '#shared/contracts/endpoint.js';
import { openTestApi, type TestApi } from '#tests/support/api.js';
import { isRefusal, pathsOf, READING, wholeTextOf } from '#tests/support/every-endpoint.js';
import { signInAgain } from '#tests/support/levelled-people.js';
import { furnishLevels, type LevelledVillage } from '#tests/support/levelled-village.js';
import { PERMISSION_GUIDE } from '../../docker-free-scripts/lib/permission-table.js';
import {
  COMBINATIONS,
  isOnBoard,
  PEOPLE,
  sees,
  type Combination,
  type Someone,
} from '../../docker-free-scripts/lib/visibility-rules.js';
import { withVisibilityTables } from '../../docker-free-scripts/lib/visibility-table.js';
import {
  heldFor,
  HOLDS,
  HOLDS_NOTHING,
  PLANTED_KINDS,
  type Planted,
} from '../../docker-free-scripts/lib/what-answers-hold.js';

/**
 * A word stands in a thing of every level, telling season and consent. Every endpoint of the contracts that reads is
 * asked by everybody, and what is found in its answers is held against rules that are said without the server's own:
 * neither a word more nor a word less. A new endpoint comes into this by itself and has to say what it holds.
 */
let api: TestApi;
let village: LevelledVillage;
/** What the product told to whom, as `endpoint person kind level season consent`. */
const told = new Set<string>();
const toldKey = (
  endpointId: string,
  person: Someone,
  { kind, level, season, consent }: Omit<Planted, 'word'>,
) => [endpointId, person, kind, level, season, consent].join(' / ');

beforeAll(async () => {
  api = await openTestApi();
  village = await furnishLevels(api, COMBINATIONS);
}, 120_000);
afterAll(() => api.close());

describe('what every endpoint says to everybody', () => {
  it.each(READING.map((endpoint) => [`${endpoint.method} ${endpoint.path}`, endpoint] as const))(
    '%s holds exactly what is for who asks',
    async (_, endpoint) => {
      const asked = await Promise.all(PEOPLE.map((person) => askAll(endpoint, person)));
      for (const { person, found } of asked) {
        for (const thing of found) told.add(toldKey(endpoint.id, person, thing));
        const expected = heldFor(endpoint.id, person, village.planted);
        expect([person, named(found)]).toEqual([person, named(expected)]);
      }
      expect(asked.some(({ answered }) => answered)).toBe(true);
    },
  );

  /** Most words are of one make and found in one go; the others are looked for one by one. */
  function plantedIn(text: string): Planted[] {
    const ofOneMake = new Set(text.match(/Zq\d+xw/gu));
    return village.planted.filter(({ word }) =>
      /^Zq\d+xw$/u.test(word) ? ofOneMake.has(word) : text.includes(word),
    );
  }

  async function askAll(endpoint: Endpoint, person: Someone) {
    const found = new Set<Planted>();
    let answered = false;
    for (const path of pathsOf(endpoint, village)) {
      const text = await wholeTextOf(village.people[person], path, endpoint);
      answered ||= !isRefusal(text);
      for (const thing of plantedIn(text)) found.add(thing);
    }
    return { person, found, answered };
  }

  it('is said beforehand for every endpoint: what it holds, or why nothing', () => {
    const said = [...Object.keys(HOLDS), ...Object.keys(HOLDS_NOTHING)];
    expect(said.sort()).toEqual(READING.map(({ id }) => id).sort());
    const asked = [...Object.keys(village.queries), ...Object.keys(village.only)];
    expect(asked.filter((id) => !said.includes(id))).toEqual([]);
  });

  it('is found somewhere, each kind of thing, so that the search means something', () => {
    const kinds = new Set([...told].map((key) => key.split(' / ')[2]));
    expect([...kinds].sort()).toEqual([...PLANTED_KINDS].sort());
  });

  it('is shown in the guide as it was told (npm run permissions -- --write)', () => {
    const guide = readFileSync(PERMISSION_GUIDE, 'utf8');
    const asTold = withVisibilityTables(guide, (endpointId, person, thing) =>
      told.has(toldKey(endpointId, person, thing)),
    );
    expect(asTold).toBe(guide);
  });
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
  /** Upper Tazimel is three hours ahead of universal time. One season is 20 November to 10 December, the other August. */
  it.each([
    ['the winter season’s last minute', '2026-12-10T20:59:00Z', 'inside'],
    ['the minute after it', '2026-12-10T21:01:00Z', null],
    ['the last minute before August', '2027-07-31T20:59:00Z', null],
    ['August’s first minute', '2027-07-31T21:01:00Z', 'outside'],
    ['August’s last minute', '2027-08-31T20:59:00Z', 'outside'],
    ['the minute after it', '2027-08-31T21:01:00Z', null],
    ['the last minute before the next winter season', '2027-11-19T20:59:00Z', null],
    ['its first minute', '2027-11-19T21:01:00Z', 'inside'],
  ] as const)('tells what is told then, to everybody alike: %s', async (_, at, told) => {
    api.clock.set(new Date(at));
    const people = await signInAgain(api, village.people);
    const version = `/api/calendars/${village.calendarId}/versions/${village.publishedNumber}`;
    const entries = village.planted.filter(({ kind }) => kind === 'entry');
    const inside = (thing: Combination): Combination =>
      thing.season === 'none' ? thing : { ...thing, season: thing.season === told ? 'inside' : 'outside' };
    const versions = await Promise.all(
      PEOPLE.map(async (one) => [one, await people[one].get(version)] as const),
    );
    for (const [person, { text }] of versions) {
      const found = entries.filter(({ word }) => text.includes(word));
      const expected = entries.filter((thing) => sees(person, inside(thing)));
      expect([person, named(found)]).toEqual([person, named(expected)]);
    }
    const { text } = await people.staff.get(`${version}/sheet?layout=year-board`);
    const printed = entries.filter(({ word }) => text.includes(word));
    expect(named(printed)).toEqual(named(entries.filter((thing) => isOnBoard(inside(thing)))));
  });
});

/** Things by what they are; their words say nothing to whoever reads a failure. */
function named(things: Iterable<Planted>): string[] {
  return [...things]
    .map(({ kind, level, season, consent }) => `${kind}: ${level}, season ${season}, ${consent}`)
    .sort();
}
