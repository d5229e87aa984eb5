import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Place } from '#shared/contracts/places.js';
import type { Problem } from '#shared/contracts/problem.js';
import type { SkyMarkerSpec, SkyMarkerYear } from '#shared/contracts/sky-markers.js';
import type { Comparison, Version } from '#shared/contracts/versions.js';
import { computeSkyMarker } from '#shared/sky/index.js';
import { openTestApi, type Client, type TestApi } from '#tests/support/api.js';
import {
  addEntry,
  beginCalendar,
  entriesOf,
  entryInput,
  openVillage,
  submit,
  takeBack,
  type Village,
} from '#tests/support/calendar-api.js';
import { addPlaceLike, firstPlace } from '#tests/support/place-api.js';

let api: TestApi;
let village: Village;
let observer: Client;
let place: Place;
/** 66° N with a ridge in the south that hides the noon Sun in midwinter. */
let north: Place;
beforeAll(async () => {
  api = await openTestApi();
  [village, observer] = [await openVillage(api), await api.signIn('observer')];
  place = await firstPlace(observer);
  north = await addPlaceLike(village.officer, place, {
    name: 'The river mouth',
    latitudeDeg: 66,
    longitudeDeg: 23,
    timeZone: 'Europe/Stockholm',
    skyline: [
      { azimuthDeg: 0, altitudeDeg: 3 },
      { azimuthDeg: 180, altitudeDeg: 2 },
    ],
  });
});
afterAll(() => api.close());

const NOON_SUN: SkyMarkerSpec = { kind: 'noon-sun', passage: 'back', ridgeName: 'the south ridge' };
const pathOf = ({ id }: Place) => `/api/places/${id}/sky-markers`;
async function offered(at: Place): Promise<SkyMarkerYear[]> {
  const answer = await observer.get(`${pathOf(at)}?year=2027`).expect(200);
  return (answer.body as { items: SkyMarkerYear[] }).items;
}
async function compute(at: Place, spec: SkyMarkerSpec): Promise<SkyMarkerYear> {
  return (await observer.post(pathOf(at), { year: 2027, spec }).expect(200)).body as SkyMarkerYear;
}

describe('the signs that are offered at a place', () => {
  it('are those that it has, each with its days: the Sun overhead in the tropics, light nights in the north', async () => {
    const kinds = async (at: Place) => new Set((await offered(at)).map(({ spec }) => spec.kind));
    expect(await kinds(place)).toContain('zenith-sun');
    expect(await kinds(place)).not.toContain('dark-night');
    expect(await kinds(north)).not.toContain('zenith-sun');
    expect(await kinds(north)).toContain('dark-night');
    expect(await kinds(north)).toContain('noon-sun');
    for (const sign of await offered(north)) expect(sign.outcome).not.toBe('never-here');
  });
});

describe('stars due on the meridian', () => {
  it('are offered on the side on which they are highest, also those that pass on the other side of the zenith', async () => {
    const facingOf = async (markerKey: string) =>
      (await offered(place)).flatMap(({ spec }) =>
        spec.kind === 'due-meridian' && spec.markerKey === markerKey ? [spec.facing] : [],
      );
    // At 12° N: Sirius at −17°, Capella at 46° of declination.
    expect(await facingOf('hr2491')).toEqual(['south']);
    expect(await facingOf('hr1708')).toEqual(['north']);
  });
});

describe('one sign', () => {
  it('is computed by the engine, with the direction in words and the clock time of the place', async () => {
    const found = await compute(north, NOON_SUN);
    const { latitudeDeg, longitudeDeg, elevationM, timeZone, skyline } = north;
    const engine = computeSkyMarker(
      NOON_SUN,
      { latitudeDeg, longitudeDeg, elevationM, timeZone, skyline },
      north,
      2027,
    );
    expect(found).toMatchObject({ outcome: 'dated', time: 'noon', sourceKey: engine.sourceKey });
    expect(found.occurrences.map(({ expected }) => expected.dayNumber)).toEqual(
      engine.occurrences.map(({ expected }) => expected.dayNumber),
    );
    // Noon by the Sun at 23° E is 28 minutes before one in the time of the zone, less the equation of time.
    expect(found.occurrences[0]?.compass).toBe('s');
    expect(found.occurrences[0]?.localTime).toMatch(/^11:3\d$/u);
  });

  it('that a place never has answers with the reason', async () => {
    expect(await compute(place, NOON_SUN)).toMatchObject({
      outcome: 'never-here',
      reason: 'noon-sun-always-clears',
      occurrences: [],
    });
  });

  it.each([
    [
      'spec.markerKey',
      'unknown-marker',
      { kind: 'due-meridian', markerKey: 'hr9999', facing: 'south', solarHour: 21 },
    ],
    [
      'spec.solarHour',
      'sky-hour',
      { kind: 'due-meridian', markerKey: 'hr2491', facing: 'south', solarHour: 25 },
    ],
    [
      'spec.azimuthDeg',
      'azimuth-range',
      { kind: 'sun-azimuth', event: 'sunset', azimuthDeg: -1, pointName: '' },
    ],
    ['spec.depthDeg', 'not-in-list', { kind: 'dark-night', end: 'last', depthDeg: 7 }],
  ])('is refused at %s where it is out of range', async (field, code, spec) => {
    const answer = await observer.post(pathOf(place), { year: 2027, spec }).expect(422);
    expect((answer.body as Problem).errors).toMatchObject([{ field, code }]);
  });
});

describe('an entry that goes by such a sign', () => {
  const lead = { type: 'sky', spec: NOON_SUN, occurrence: 1 } as const;

  it('has its days from it, is frozen with them, verifies and compares', async () => {
    const calendar = await beginCalendar({ ...village, placeId: north.id });
    const added = await addEntry(village.officer, calendar.id, { lead, titleOfficer: 'Sun is back' });
    const [sign] = (await compute(north, NOON_SUN)).occurrences;
    expect(added.dates).toMatchObject({ sky: { outcome: 'dated' }, warnings: [] });
    expect(added.dates.marker?.expected).toEqual(sign?.expected);

    const frozen = await submit(village.officer, calendar.id);
    // Reading a version checks its seal.
    const path = `/api/calendars/${calendar.id}/versions/${frozen.number}`;
    const version = (await village.elder.get(path).expect(200)).body as Version;
    expect(version.entries[0]?.content.lead).toEqual(lead);
    expect(version.header.markers).toEqual([]);

    await takeBack(village.officer, frozen);
    const [entry] = await entriesOf(village.officer, calendar.id);
    const belt = { kind: 'due-meridian', markerKey: 'orion-belt', facing: 'south', solarHour: 21 } as const;
    await village.officer
      .put(`/api/calendars/${calendar.id}/entries/${entry?.id ?? ''}`, {
        content: { ...entry?.content, lead: { type: 'sky', spec: belt, occurrence: 1 } },
        version: entry?.version,
      })
      .expect(200);
    const comparison = (
      await village.officer.get(`/api/calendars/${calendar.id}/comparison?from=1&to=draft`).expect(200)
    ).body as Comparison;
    const [changed] = comparison.entries;
    expect(changed?.fields.map(({ field }) => field)).toEqual(
      expect.arrayContaining(['lead', 'dates.marker', 'dates.window']),
    );
    const sheet = await village.officer
      .get(`/api/calendars/${calendar.id}/versions/draft/sheet?layout=month-cards`)
      .expect(200);
    expect(JSON.stringify(sheet.body)).toContain('Belt of Orion due south');
  });

  it('may be the seventh first crescent of a year, with its range, and a Moon that the year has not is told', async () => {
    const calendar = await beginCalendar({ ...village, placeId: place.id }, 2031);
    const crescents = (
      await observer
        .post(pathOf(place), { year: 2031, spec: { kind: 'moon-phase', event: 'first-crescent' } })
        .expect(200)
    ).body as SkyMarkerYear;
    expect(crescents.time).toBe('evening');
    expect(crescents.occurrences.length).toBeGreaterThanOrEqual(12);
    const spec = { kind: 'moon-phase', event: 'first-crescent' } as const;
    const seventh = await addEntry(village.officer, calendar.id, {
      lead: { type: 'sky', spec, occurrence: 7 },
    });
    expect(seventh.dates.marker?.expected).toEqual(crescents.occurrences[6]?.expected);
    expect(seventh.dates.marker?.late?.dayNumber).toBeGreaterThan(
      seventh.dates.marker?.expected.dayNumber ?? 0,
    );
    const full = { kind: 'moon-phase', event: 'full' } as const;
    const fulls = (await observer.post(pathOf(place), { year: 2031, spec: full }).expect(200))
      .body as SkyMarkerYear;
    const last = await addEntry(village.officer, calendar.id, {
      lead: { type: 'sky', spec: full, occurrence: 13 },
    });
    expect(last.dates.warnings).toEqual(fulls.occurrences.length === 13 ? [] : ['one-occurrence-only']);
    const refused = await village.officer
      .post(`/api/calendars/${calendar.id}/entries`, {
        ...entryInput(),
        lead: { type: 'sky', spec, occurrence: 14 },
      })
      .expect(422);
    expect((refused.body as Problem).errors).toMatchObject([
      { field: 'lead.occurrence', code: 'moon-count' },
    ]);
  });

  it('names its star in the frozen version, so that the name is there when the table changes', async () => {
    const calendar = await beginCalendar({ ...village, placeId: north.id }, 2028);
    const spec = { kind: 'about-pole', markerKey: 'hr5191', position: 'lowest', solarHour: 21 } as const;
    await addEntry(village.officer, calendar.id, { lead: { type: 'sky', spec, occurrence: 1 } });
    const { header } = await submit(village.officer, calendar.id);
    expect(header.markers.map(({ name }) => name)).toEqual(['Alkaid']);
  });

  it('is refused where its star is in no table', async () => {
    const calendar = await beginCalendar({ ...village, placeId: north.id }, 2029);
    const spec = { kind: 'about-pole', markerKey: 'hr9999', position: 'lowest', solarHour: 21 } as const;
    const answer = await village.officer
      .post(`/api/calendars/${calendar.id}/entries`, {
        ...entryInput(),
        lead: { type: 'sky', spec, occurrence: 1 },
      })
      .expect(422);
    expect((answer.body as Problem).errors).toMatchObject([
      { field: 'lead.spec.markerKey', code: 'unknown-marker' },
    ]);
  });
});
