import { parse } from 'csv-parse/sync';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Place } from '#shared/contracts/places.js';
import type { MarkerRow } from '#shared/contracts/stars.js';
import { FIGURES, STARS } from '#shared/sky/index.js';
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

describe('the star table as CSV', () => {
  const download = async ({ id }: Place = place, year = 2027) =>
    observer.get(`/api/places/${id}/stars.csv?year=${year}`).buffer(true).expect(200);
  const addPlace = (changes: Partial<Place>) => addPlaceLike(officer, place, changes);
  const read = (text: string) => parse<Record<string, string>>(text, { bom: true, columns: true });

  it('is UTF-8 with a mark, RFC 4180, one line a marker under one line of titles', async () => {
    const { text, headers } = await download();
    expect(headers['content-type']).toBe('text/csv; charset=utf-8');
    expect(text.startsWith('\ufeffkind,name,designation,HR number,magnitude V,')).toBe(true);
    expect(text.split('\r\n').length).toBe(STARS.length + FIGURES.length + 1 + 1);
    const lines = read(text);
    expect(lines.length).toBe(STARS.length + FIGURES.length);
    expect(new Set(lines.map((line) => Object.keys(line).length)).size).toBe(1);
  });

  it('has the dates and ranges of the table, and numbers with their sign', async () => {
    const list = await observer.get(`/api/places/${place.id}/stars?year=2027`).expect(200);
    const { items } = list.body as { items: MarkerRow[] };
    const lines = read((await download()).text);
    const sirius = lines.find((line) => line['name'] === 'Sirius');
    const [rising] =
      items.find((row) => row.markerKey === 'hr2491')?.phenomena['heliacal-rising'].occurrences ?? [];
    expect(sirius).toMatchObject({
      'magnitude V': '-1.46',
      designation: 'α CMa',
      'first morning seen: expected': rising?.expected.gregorian,
      'first morning seen: earliest': rising?.early?.gregorian,
      'first morning seen: latest': rising?.late?.gregorian,
      'first morning seen: Julian Day Number': String(rising?.expected.dayNumber),
      'calendar of the dates': 'Gregorian',
    });
  });

  it('says why there is no date', async () => {
    const lines = read((await download(await addPlace({ name: 'Ice', latitudeDeg: 66, skyline: [] }))).text);
    expect(lines.find((line) => line['name'] === 'Polaris')).toMatchObject({
      'what it does here': 'never sets',
      'first morning seen: expected': '',
      'first morning seen: remark': 'never sets',
    });
  });

  it('carries basis, a line to cite and caution on every line, so that a line copied out alone keeps them', async () => {
    const lines = read((await download()).text);
    expect(lines.every((line) => line['basis']?.includes('Vogt 1920'))).toBe(true);
    expect(
      lines.every((line) => /^Dawnpeg: .* in 2027, computed with: .*Vogt 1920/u.test(line['cite as'] ?? '')),
    ).toBe(true);
    expect(lines.every((line) => line['caution']?.includes('do not forecast the weather'))).toBe(true);
  });

  it('runs nothing in a spreadsheet: a name that begins like a formula and a year BC get an apostrophe', async () => {
    const { text } = await download(await addPlace({ name: '=cmd|1' }), -43);
    expect(read(text)[0]).toMatchObject({ place: "'=cmd|1", year: '-43', 'calendar of the dates': 'Julian' });
    const dates = read(text).flatMap((line) => line['first morning seen: expected'] || []);
    expect(dates.length).toBeGreaterThan(500);
    expect(dates.every((date) => /^'-0043-\d\d-\d\d$/.test(date))).toBe(true);
  });

  it('is named after place and year, also where the name holds a slash or letters of another script', async () => {
    const plain = await download();
    expect(plain.headers['content-disposition']).toBe(
      'attachment; filename="Upper_terraces_2027_stars.csv"; filename*=UTF-8\'\'Upper%20terraces%202027%20stars.csv',
    );
    const other = await download(await addPlace({ name: 'Ŋɔ́rɛ̃/2' }));
    const name = /filename\*=UTF-8''(.*)$/.exec(other.headers['content-disposition'] ?? '')?.[1] ?? '';
    expect(decodeURIComponent(name)).toBe('Ŋɔ́rɛ̃-2 2027 stars.csv'.normalize('NFC'));
  });
});
