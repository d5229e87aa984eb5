import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Place } from '#shared/contracts/places.js';
import type { Problem } from '#shared/contracts/problem.js';
import type { SkylineEffect } from '#shared/contracts/stars.js';
import { computeMarkerYear } from '#shared/sky/index.js';
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

describe('what the skyline does', () => {
  const hills = [0, 90, 180, 270].map((azimuthDeg) => ({ azimuthDeg, altitudeDeg: 8 }));
  const effectsOf = (answer: { body: unknown }) => (answer.body as { items: SkylineEffect[] }).items;

  it('sets flat and hill dates with their ranges side by side for figures and the brightest stars', async () => {
    const effects = effectsOf(
      await observer.get(`/api/places/${place.id}/skyline-effects?year=2027`).expect(200),
    );
    expect(effects.slice(0, 2).map(({ name, phenomenon }) => [name, phenomenon])).toEqual([
      ['Pleiades', 'heliacal-rising'],
      ['Pleiades', 'heliacal-setting'],
    ]);
    const [cluster] = effects;
    const hill = computeMarkerYear('pleiades', place, place, 2027);
    const flat = computeMarkerYear('pleiades', { ...place, skyline: [] }, place, 2027);
    const [overHill] = hill.phenomena['heliacal-rising'].occurrences;
    const [overFlat] = flat.phenomena['heliacal-rising'].occurrences;
    expect(cluster).toMatchObject({
      hill: {
        dayNumber: overHill?.expected.dayNumber,
        early: { dayNumber: overHill?.early?.dayNumber },
        late: { dayNumber: overHill?.late?.dayNumber },
      },
      flat: { dayNumber: overFlat?.expected.dayNumber },
      differenceDays: (overHill?.expected.dayNumber ?? NaN) - (overFlat?.expected.dayNumber ?? NaN),
    });
  });

  it('can be seen before a place is saved, and keeps nothing', async () => {
    const { id: _id, communityId: _communityId, version: _version, ...input } = place;
    const path = `/api/communities/${officer.communityId}`;
    const countPlaces = async () => effectsOf(await officer.get(`${path}/places`)).length;
    const before = await countPlaces();
    const body = { place: { ...input, skyline: hills }, year: 2027 };
    const effects = effectsOf(await officer.post(`${path}/skyline-effects`, body).expect(200));
    const canopus = effects.find((one) => one.name === 'Canopus' && one.phenomenon === 'heliacal-rising');
    const expected = computeMarkerYear('hr2326', { ...place, skyline: hills }, place, 2027);
    expect(canopus?.hill?.dayNumber).toBe(
      expected.phenomena['heliacal-rising'].occurrences[0]?.expected.dayNumber,
    );
    expect(canopus?.differenceDays).not.toBe(0);
    expect(await countPlaces()).toBe(before);
  });

  it('says what takes a date away', async () => {
    const { id: _id, communityId: _communityId, version: _version, ...input } = place;
    const wall = hills.map((point) => ({ ...point, altitudeDeg: 50 }));
    const body = { place: { ...input, skyline: wall }, year: 2027 };
    const effects = effectsOf(
      await officer.post(`/api/communities/${officer.communityId}/skyline-effects`, body).expect(200),
    );
    // Canopus culminates 25° high at 12° N.
    expect(effects.find((one) => one.name === 'Canopus')).toMatchObject({
      hill: null,
      flat: { gregorian: expect.stringMatching(/^2027-/) as string },
      differenceDays: null,
      hillOutcome: 'never-clears-skyline',
    });
  });

  it('shows no difference where the ground is flat', async () => {
    const { id } = await addPlaceLike(officer, place, { name: 'Salt pan', skyline: [] });
    const effects = effectsOf(await observer.get(`/api/places/${id}/skyline-effects?year=2027`).expect(200));
    expect(effects.length).toBeGreaterThan(30);
    expect(new Set(effects.map((one) => one.differenceDays))).toEqual(new Set([0]));
  });

  it('is shown before saving to officers only, and refuses a bad place like the form does', async () => {
    await observer.post(`/api/communities/${observer.communityId}/skyline-effects`, {}).expect(403);
    const answer = await officer.post(`/api/communities/${officer.communityId}/skyline-effects`, {
      place: { ...place, latitudeDeg: 95 },
      year: 2027,
    });
    expect(answer.status).toBe(422);
    expect((answer.body as Problem).errors?.[0]).toMatchObject({
      field: 'place.latitudeDeg',
      code: 'latitude-range',
    });
  });
});
