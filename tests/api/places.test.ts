import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { AuditEventEntity } from '#server/db/entities/audit-event.entity.js';
import type { Place, PlaceInput } from '#shared/contracts/places.js';
import type { Problem } from '#shared/contracts/problem.js';
import { openTestApi, type Client, type TestApi } from '#tests/support/api.js';

let api: TestApi;
let officer: Client;
let places: string;
beforeAll(async () => {
  api = await openTestApi();
  await startAfresh();
});
afterAll(() => api.close());

async function startAfresh(): Promise<void> {
  await api.reset();
  officer = await api.signIn('officer');
  places = `/api/communities/${officer.communityId}/places`;
}

const spring: PlaceInput = {
  name: 'Lower spring',
  latitudeDeg: 11.5,
  longitudeDeg: 39.25,
  elevationM: 1720,
  timeZone: 'Africa/Addis_Ababa',
  skyline: [
    { azimuthDeg: 270, altitudeDeg: 2 },
    { azimuthDeg: 90, altitudeDeg: -0.5 },
  ],
  clarityByMonth: Array.from({ length: 12 }, () => 'ordinary' as const),
  rainMonths: Array.from({ length: 12 }, (_, month) => month > 5 && month < 9),
  thresholdSet: 'linear-magnitude',
  sameSideShiftDeg: 0.5,
  oppositeSideShiftDeg: -0.25,
  skylineRule: 'depth-at-crossing',
};

async function add(input: object = spring): Promise<Place> {
  return (await officer.post(places, input).expect(201)).body as Place;
}
function inputOf({ id: _id, communityId: _communityId, ...rest }: Place) {
  return rest;
}
const fieldsOf = (answer: { body: unknown }) =>
  (answer.body as Problem).errors?.map(({ field, code }) => [field, code]);

describe('adding a place', () => {
  beforeEach(startAfresh);

  it('keeps every figure as it was given, the skyline in the order of its azimuths', async () => {
    const place = await add();
    expect(place).toEqual({
      ...spring,
      skyline: [spring.skyline[1], spring.skyline[0]],
      id: place.id,
      communityId: officer.communityId,
      version: 1,
    });
    expect((await officer.get(`/api/places/${place.id}`).expect(200)).body).toEqual(place);
  });

  it('shows up in the list of the village, by name, for everybody of the village', async () => {
    await add();
    const observer = await api.signIn('observer');
    const { items, nextCursor } = (await observer.get(places).expect(200)).body as {
      items: Place[];
      nextCursor: null;
    };
    expect(items.map((place) => place.name)).toEqual(['Lower spring', 'Upper terraces']);
    expect(nextCursor).toBeNull();
  });

  it('answers 422 with one entry per bad field and saves nothing', async () => {
    const answer = await officer.post(places, {
      ...spring,
      name: '  ',
      latitudeDeg: 91,
      longitudeDeg: '39',
      elevationM: 9001,
      timeZone: 'Africa/Nowhere',
      sameSideShiftDeg: 7,
    });
    expect(answer.status).toBe(422);
    expect(fieldsOf(answer)).toEqual([
      ['name', 'required'],
      ['latitudeDeg', 'latitude-range'],
      ['longitudeDeg', 'not-a-number'],
      ['elevationM', 'elevation-range'],
      ['timeZone', 'unknown-time-zone'],
      ['sameSideShiftDeg', 'shift-range'],
    ]);
    expect((await officer.get(places)).body).toMatchObject({ items: [{ name: 'Upper terraces' }] });
  });

  it.each([
    ['an azimuth twice', [90, 1], [90, 2], ['skyline.1.azimuthDeg', 'duplicate-azimuth']],
    ['0° and 360° that differ', [0, 1], [360, 2], ['skyline.1.altitudeDeg', 'full-turn-differs']],
    ['an altitude under −5°', [0, 1], [90, -5.1], ['skyline.1.altitudeDeg', 'altitude-range']],
    ['an altitude over 60°', [0, 1], [90, 60.1], ['skyline.1.altitudeDeg', 'altitude-range']],
    ['an azimuth over 360°', [0, 1], [360.5, 1], ['skyline.1.azimuthDeg', 'azimuth-range']],
  ])('refuses a skyline with %s, naming the point', async (_what, first, second, error) => {
    const skyline = [first, second].map(([azimuthDeg, altitudeDeg]) => ({ azimuthDeg, altitudeDeg }));
    const answer = await officer.post(places, { ...spring, skyline });
    expect(answer.status).toBe(422);
    expect(fieldsOf(answer)).toEqual([error]);
  });
});

describe('changing a place', () => {
  beforeEach(startAfresh);

  it('is saved with the next version', async () => {
    const place = await add();
    const changed = { ...inputOf(place), name: 'Lower spring, east bank', skyline: [] };
    const saved = (await officer.put(`/api/places/${place.id}`, changed).expect(200)).body as Place;
    expect(saved).toEqual({ ...place, ...changed, version: 2 });
  });

  it('answers 409 with both states to a save over a newer one, and keeps the newer one', async () => {
    const place = await add();
    const path = `/api/places/${place.id}`;
    await officer.put(path, { ...inputOf(place), name: 'First' }).expect(200);
    const late = await officer.put(path, { ...inputOf(place), name: 'Second' });
    expect(late.status).toBe(409);
    expect(late.body).toMatchObject({
      type: '/problems/stale',
      current: { name: 'First', version: 2 },
      sent: { name: 'Second', version: 1 },
    });
    expect((await officer.get(path)).body).toMatchObject({ name: 'First', version: 2 });
  });

  it('lets only one of two through that are sent at the same moment', async () => {
    const place = await add();
    const other = await api.signIn('officer');
    const answers = await Promise.all([
      officer.put(`/api/places/${place.id}`, { ...inputOf(place), elevationM: 1 }),
      other.put(`/api/places/${place.id}`, { ...inputOf(place), elevationM: 2 }),
    ]);
    expect(answers.map((answer) => answer.status).sort((a, b) => a - b)).toEqual([200, 409]);
    const refused = answers.find((answer) => answer.status === 409)?.body as Problem;
    const saved = (await officer.get(`/api/places/${place.id}`)).body as Place;
    expect(refused.current).toEqual(saved);
  });

  it('that changes nothing is no change: the version stays', async () => {
    const place = await add();
    const saved = await officer.put(`/api/places/${place.id}`, inputOf(place)).expect(200);
    expect(saved.body).toEqual(place);
  });

  it('is written down with the names of the fields and without what stands in them', async () => {
    const place = await add();
    await officer
      .put(`/api/places/${place.id}`, { ...inputOf(place), name: 'New name', elevationM: 1700 })
      .expect(200);
    const events = await api.dataSource
      .getRepository(AuditEventEntity)
      .find({ where: { subjectId: place.id }, order: { sequence: 'ASC' } });
    expect(events).toMatchObject([
      { action: 'place-added', actorId: officer.personId, details: {} },
      { action: 'place-changed', details: { fields: ['elevationM', 'name'] } },
    ]);
  });

  it('is for officers of the village: 403 for others, 404 for another village', async () => {
    const place = await add();
    const staff = await api.signIn('staff');
    await staff.put(`/api/places/${place.id}`, inputOf(place)).expect(403);
    await staff.post(places, spring).expect(403);
    const stranger = await api.signIn('officer2');
    await stranger.put(`/api/places/${place.id}`, inputOf(place)).expect(404);
    await stranger.get(`/api/places/${place.id}`).expect(404);
    await stranger.post(places, spring).expect(404);
  });
});

describe('the time zone at coordinates', () => {
  const zoneAt = async (latitudeDeg: unknown, longitudeDeg: unknown) =>
    officer.get(`/api/time-zone?latitudeDeg=${String(latitudeDeg)}&longitudeDeg=${String(longitudeDeg)}`);

  // Zones of the three demo sites, from the outlines of the time zone boundary data.
  it.each([
    [12, 39, 'Africa/Addis_Ababa'],
    [-14, -70, 'America/Lima'],
    [66, 23, 'Europe/Stockholm'],
  ])('%d, %d is %s', async (latitudeDeg, longitudeDeg, timeZone) => {
    expect((await zoneAt(latitudeDeg, longitudeDeg)).body).toEqual({ timeZone });
  });

  it('at sea goes by the longitude', async () => {
    expect((await zoneAt(0, -30)).body).toEqual({ timeZone: 'Etc/GMT+2' });
  });

  it('is left to the person where no single clock belongs to the point', async () => {
    expect((await zoneAt(90, 0)).body).toEqual({ timeZone: null });
    expect((await zoneAt(0, 180)).body).toEqual({ timeZone: null });
  });

  it('is always one that a place may have', async () => {
    const timeZones = await Promise.all(
      [
        [-45.57, -72.07],
        [43.8, 87.6],
        [-82, 166],
        [1.87, -157.4],
      ].map(async ([latitudeDeg, longitudeDeg]) => {
        const answer = await zoneAt(latitudeDeg, longitudeDeg);
        return (answer.body as { timeZone: string | null }).timeZone;
      }),
    );
    for (const timeZone of timeZones) {
      if (timeZone !== null) await officer.post(places, { ...spring, timeZone }).expect(201);
    }
    expect(timeZones.filter((zone) => zone !== null).length).toBeGreaterThan(2);
  });

  it('needs both coordinates within their ranges', async () => {
    const answer = await zoneAt(91, 'east');
    expect(answer.status).toBe(422);
    expect((answer.body as Problem).errors?.map(({ field }) => field)).toEqual([
      'latitudeDeg',
      'longitudeDeg',
    ]);
  });
});
