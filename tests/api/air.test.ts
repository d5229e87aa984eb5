import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { AirAnswer } from '#shared/contracts/air.js';
import type { Place } from '#shared/contracts/places.js';
import type { Problem } from '#shared/contracts/problem.js';
import {
  CLARITIES,
  computeAirYear,
  computeMarkerYear,
  PHENOMENA,
  THRESHOLD_SETS,
} from '#shared/sky/index.js';
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

async function airOf(markerKey: string, year = 2027, placeId = place.id): Promise<AirAnswer> {
  return (await observer.get(`/api/places/${placeId}/stars/${markerKey}/air?year=${year}`).expect(200))
    .body as AirAnswer;
}

describe('a second opinion on a star’s days', () => {
  it('sets the place’s own dates, every published rule and the model in three airs side by side', async () => {
    const answer = await airOf('pleiades');
    const own = computeMarkerYear('pleiades', place, place, 2027);
    const model = computeAirYear('pleiades', place, place, 2027);
    expect(answer).toMatchObject({ name: 'Pleiades', kind: 'figure', placeId: place.id, year: 2027 });
    for (const phenomenon of PHENOMENA) {
      const [shown] = answer.phenomena[phenomenon].occurrences;
      const [expected] = own.phenomena[phenomenon].occurrences;
      const [modelled] = model.phenomena[phenomenon].occurrences;
      expect(answer.phenomena[phenomenon].outcome).toBe(own.phenomena[phenomenon].outcome);
      expect(shown?.rule).toMatchObject({
        expected: { dayNumber: expected?.expected.dayNumber },
        early: { dayNumber: expected?.early?.dayNumber },
        late: { dayNumber: expected?.late?.dayNumber },
      });
      expect(shown?.ruleClarity).toBe(expected?.clarity);
      expect(shown?.ruleWidth).toEqual(expected?.width);
      for (const clarity of CLARITIES) {
        expect(shown?.byModel[clarity]).toMatchObject({
          dayNumber: modelled?.byModel[clarity]?.dayNumber,
          minutes: modelled?.byModel[clarity]?.minutes,
        });
      }
      for (const set of THRESHOLD_SETS) {
        const bySet = computeMarkerYear('pleiades', place, { ...place, thresholdSet: set }, 2027);
        expect(shown?.bySet[set]?.expected.dayNumber).toBe(
          bySet.phenomena[phenomenon].occurrences[0]?.expected.dayNumber,
        );
      }
    }
  });

  it('counts the minutes of seeing around first mornings and last evenings', async () => {
    const { phenomena } = await airOf('hr2491');
    for (const phenomenon of ['heliacal-rising', 'heliacal-setting'] as const) {
      const nights = phenomena[phenomenon].occurrences[0]?.nights ?? [];
      const days = nights.map((night) => night.dayNumber);
      expect(days).toEqual(days.map((_, index) => (days[0] ?? 0) + index));
      expect(nights.some(({ byClarity }) => byClarity.ordinary === 0)).toBe(true);
      expect(nights.some(({ byClarity }) => byClarity.ordinary > 15)).toBe(true);
    }
    expect(phenomena['acronychal-rising'].occurrences[0]?.nights).toEqual([]);
  });

  it('rests on the place: another height has other air', async () => {
    const high = await addPlaceLike(officer, place, { name: 'High above', elevationM: 4200 });
    const [here, above] = [await airOf('hr2491'), await airOf('hr2491', 2027, high.id)];
    for (const clarity of CLARITIES)
      expect(above.extinctionMag[clarity]).toBeLessThan(here.extinctionMag[clarity]);
    expect(above.basis).toMatchObject({ thresholdSet: place.thresholdSet, year: 2027 });
  });

  it('has an answer for a star that never rises, and for an ancient year', async () => {
    const hidden = await airOf('hr5267', 2027, (await addPlaceLike(officer, place, { latitudeDeg: 45 })).id);
    expect(hidden).toMatchObject({ outcome: 'never-clears-skyline', outcomeDetail: 'never-rises' });
    for (const phenomenon of PHENOMENA) expect(hidden.phenomena[phenomenon].occurrences).toEqual([]);
    const ancient = await airOf('hr2491', -2000);
    expect(ancient.phenomena['heliacal-rising'].occurrences[0]?.byModel.clear?.julian).toMatch(/^-2000-/);
  });

  it('knows no marker that is none, and asks for a year it can compute', async () => {
    await observer.get(`/api/places/${place.id}/stars/hr9999/air?year=2027`).expect(404);
    const refusal = await observer.get(`/api/places/${place.id}/stars/hr2491/air?year=9000`).expect(422);
    expect((refusal.body as Problem).errors).toEqual([
      expect.objectContaining({ field: 'year', code: 'year-range' }),
    ]);
  });
});
