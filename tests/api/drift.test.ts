import { parse } from 'csv-parse/sync';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { DriftAnswer } from '#shared/contracts/drift.js';
import type { Place } from '#shared/contracts/places.js';
import type { Problem } from '#shared/contracts/problem.js';
import { computeMarkerYear, ENGINE_VERSION, PHENOMENA } from '#shared/sky/index.js';
import { openTestApi, type Client, type TestApi } from '#tests/support/api.js';
import { addPlaceLike, firstPlace } from '#tests/support/place-api.js';

let api: TestApi;
let observer: Client;
let officer: Client;
let place: Place;
beforeAll(async () => {
  api = await openTestApi();
  [observer, officer] = [await api.signIn('observer'), await api.signIn('officer')];
  place = await firstPlace(observer);
});
afterAll(() => api.close());

const pathOf = (markerKey: string, query: string, at = place) =>
  `/api/places/${at.id}/drift/${markerKey}${query}`;
async function drift(markerKey: string, query: string, at = place): Promise<DriftAnswer> {
  return (await observer.get(pathOf(markerKey, query, at)).expect(200)).body as DriftAnswer;
}

describe('the drift of a marker', () => {
  it('has round years, at most a hundred and one, with the first and the last as asked', async () => {
    const all = await drift('pleiades', '?from=-3000&to=3000');
    expect(all.epochs.length).toBeLessThanOrEqual(101);
    expect([all.epochs[0]?.year, all.epochs.at(-1)?.year]).toEqual([-3000, 3000]);
    expect(all.epochs.every(({ year }) => year % 100 === 0)).toBe(true);
    const odd = await drift('pleiades', '?from=1493&to=2027');
    expect(odd.epochs.map(({ year }) => year).slice(0, 3)).toEqual([1493, 1500, 1510]);
    expect(odd.epochs.at(-1)?.year).toBe(2027);
  });

  it('has the days of the engine in every year, both calendars and the Sun’s longitude', async () => {
    const { epochs, name } = await drift('hr2491', '?from=-1000&to=2000');
    expect(name).toBe('Sirius');
    for (const { year, phenomena } of epochs.filter((_, index) => index % 20 === 0)) {
      const full = computeMarkerYear('hr2491', place, place, year);
      for (const phenomenon of PHENOMENA) {
        expect(phenomena[phenomenon].occurrences.map(({ expected }) => expected.dayNumber)).toEqual(
          full.phenomena[phenomenon].occurrences.map(({ expected }) => expected.dayNumber),
        );
      }
    }
    const [day] = epochs[0]?.phenomena['heliacal-rising'].occurrences ?? [];
    expect(day?.expected.julian).toMatch(/^-1000-/);
    expect(day?.sunLongitudeDeg).toBeGreaterThan(60);
    expect(day?.sunLongitudeDeg).toBeLessThan(120);
  });

  it('says the pace, and where a day begins to exist', async () => {
    const atEdge = await addPlaceLike(officer, place, { name: 'Edge', latitudeDeg: 36.6, skyline: [] });
    const canopus = await drift('hr2326', '?from=-3000&to=3000', atEdge);
    const begins = canopus.turns.find((turn) => turn.phenomenon === 'heliacal-rising');
    expect(begins).toMatchObject({ change: 'begins', outcome: 'never-clears-skyline' });
    const pleiades = await drift('pleiades', '?from=-1000&to=2000');
    // About 1.37 days a century near 10° N.
    expect(pleiades.daysPerCentury['heliacal-rising']).toBeGreaterThan(1.2);
    expect(pleiades.daysPerCentury['heliacal-rising']).toBeLessThan(1.5);
  });

  it.each([
    ['?from=2027&to=1500', 'to', 'year-order'],
    ['?from=-3001&to=1500', 'from', 'year-range'],
    ['?to=1500', 'from', 'not-a-number'],
  ])('%s is refused at %s', async (query, field, code) => {
    const answer = await observer.get(pathOf('pleiades', query));
    expect(answer.status).toBe(422);
    expect((answer.body as Problem).errors?.map((each) => [each.field, each.code])).toContainEqual([
      field,
      code,
    ]);
  });

  it('is not there for another village, nor for what is no marker', async () => {
    const stranger = await api.signIn('officer2');
    await stranger.get(pathOf('pleiades', '?from=1500&to=2027')).expect(404);
    await observer.get(pathOf('hr9999', '?from=1500&to=2027')).expect(404);
  });
});

describe('the drift as CSV', () => {
  it('has a line for each phenomenon and year, with the dates of the answer and a line to cite', async () => {
    const query = '?from=-500&to=2000';
    const answer = await drift('hr2491', query);
    const { text, headers } = await observer
      .get(pathOf('hr2491', `/table.csv${query}`))
      .buffer(true)
      .expect(200);
    expect(headers['content-type']).toBe('text/csv; charset=utf-8');
    const lines = parse<Record<string, string>>(text, { bom: true, columns: true });
    const mornings = lines.filter((line) => line['phenomenon'] === 'first morning seen');
    const days = answer.epochs.flatMap(({ phenomena }) => phenomena['heliacal-rising'].occurrences);
    // A mark before a minus keeps a spreadsheet from reckoning with it.
    const dates = (title: string) => mornings.map((line) => line[title]?.replace(/^'/u, ''));
    expect(dates('Gregorian: expected')).toEqual(days.map(({ expected }) => expected.gregorian));
    expect(dates('Julian: earliest')).toEqual(days.map(({ early }) => early?.julian));
    for (const line of lines) {
      expect(line['cite as']).toContain(`engine ${ENGINE_VERSION}`);
      expect(line['cite as']).toContain('Vogt 1920');
      expect(line['caution']).toContain('do not forecast the weather');
    }
  });

  it('says why there is no date', async () => {
    const { text } = await observer
      .get(pathOf('hr424', '/table.csv?from=1900&to=2000'))
      .buffer(true)
      .expect(200);
    const [line] = parse<Record<string, string>>(text, { bom: true, columns: true });
    expect(line?.['remark']).toBe('never sets');
    expect(line?.['Gregorian: expected']).toBe('');
  });
});
