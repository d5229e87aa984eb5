import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { AuditEvent } from '#shared/contracts/audit.js';
import type { Chart, Figure, FigureDetail } from '#shared/contracts/figures.js';
import type { Problem } from '#shared/contracts/problem.js';
import { PLAIN_DETAILS } from '#shared/contracts/sharing.js';
import { openTestApi, type Client, type TestApi } from '#tests/support/api.js';
import { addEntry, beginCalendar, openVillage } from '#tests/support/calendar-api.js';
import { addFigure, DARK_CLOUD, figureInput } from '#tests/support/figure-api.js';

let api: TestApi;
let officer: Client;
let figures: string;
beforeAll(async () => {
  api = await openTestApi();
});
afterAll(() => api.close());
beforeEach(async () => {
  await api.reset();
  officer = await api.signIn('officer');
  figures = `/api/communities/${officer.communityId}/figures`;
});

const listed = async (client: Client) =>
  ((await client.get(figures).expect(200)).body as { items: Figure[] }).items;
const namesOf = (items: readonly Figure[]) => items.map(({ names }) => names[0]?.name);
const fieldsOf = (answer: { body: unknown }) =>
  (answer.body as Problem).errors?.map(({ field, code }) => [field, code]);

describe('adding a figure', () => {
  it('keeps it as it was given and shows it to everybody of the village', async () => {
    const figure = await addFigure(officer);
    expect(figure).toEqual({
      ...figureInput(),
      sharing: PLAIN_DETAILS,
      storyLevel: 'village',
      storyShown: true,
      id: figure.id,
      communityId: officer.communityId,
      markerKey: `f-${figure.id}`,
      updatedBy: 'Beyno',
      updatedAt: api.clock.now().toISOString(),
      version: 1,
      usedBy: [],
    });
    const observer = await api.signIn('observer');
    expect((await observer.get(`${figures}/${figure.id}`).expect(200)).body).toEqual(figure);
    expect(namesOf(await listed(observer))).toEqual(['Ŋɔ́rɛ̃']);
  });

  it('takes a patch of sky instead of stars', async () => {
    const figure = await addFigure(officer, DARK_CLOUD);
    expect(figure.patch).toEqual(DARK_CLOUD.patch);
    expect(figure.indicatorHr).toBeNull();
  });

  it.each([
    ['no name', { names: [] }, ['names', 'required']],
    ['a name without letters', { names: [{ tag: 'en', name: ' ' }] }, ['names.0.name', 'required']],
    [
      'a language twice',
      {
        names: [
          { tag: 'en', name: 'One' },
          { tag: 'en', name: 'Two' },
        ],
      },
      ['names', 'no-duplicates'],
    ],
    ['neither stars nor a patch', { memberHrs: [], indicatorHr: null }, ['memberHrs', 'choose-stars']],
    ['a leading star that is no part of it', { indicatorHr: 2491 }, ['indicatorHr', 'leading-star']],
    ['no leading star', { indicatorHr: null }, ['indicatorHr', 'leading-star']],
    ['a star and a patch that both lead', { patch: DARK_CLOUD.patch }, ['indicatorHr', 'star-or-patch']],
    ['a star that is not in the table', { memberHrs: [1457, 9998] }, ['memberHrs', 'unknown-star']],
    ['a star twice', { memberHrs: [1457, 1457] }, ['memberHrs', 'no-duplicates']],
    [
      'depths that nobody has measured',
      { ownDepths: { sameSideDeg: 30, oppositeSideDeg: 2 } },
      ['ownDepths.sameSideDeg', 'depth-range'],
      ['ownDepths.oppositeSideDeg', 'depth-range'],
    ],
    ['an empty telling', { variants: [{ toldBy: 'A', text: ' ' }] }, ['variants.0.text', 'required']],
  ])('refuses %s at its field and saves nothing', async (_what, change, ...errors) => {
    const answer = await officer.post(figures, { ...figureInput(), ...change });
    expect(answer.status).toBe(422);
    expect(fieldsOf(answer)).toEqual(errors);
    expect(await listed(officer)).toEqual([]);
  });

  it('stays within the village', async () => {
    const figure = await addFigure(officer);
    const stranger = await api.signIn('officer2');
    await stranger.get(`${figures}/${figure.id}`).expect(404);
    await stranger.get(`/api/communities/${stranger.communityId}/figures/${figure.id}`).expect(404);
    await stranger.delete(`/api/communities/${stranger.communityId}/figures/${figure.id}`).expect(404);
  });
});

describe('changing a figure', () => {
  it('answers 409 with both states when somebody saved a newer one', async () => {
    const figure = await addFigure(officer);
    const path = `${figures}/${figure.id}`;
    const newer = { ...figureInput(), story: 'Told anew.', version: 1 };
    expect((await officer.put(path, newer).expect(200)).body).toMatchObject({
      story: 'Told anew.',
      version: 2,
    });
    const late = { ...figureInput(), sharingLevel: 'open', version: 1 };
    const answer = await officer.put(path, late).expect(409);
    const { type, current, sent } = answer.body as Problem;
    expect(type).toBe('/problems/stale');
    expect(current).toMatchObject({ story: 'Told anew.', version: 2 });
    expect(sent).toEqual(late);
  });

  it('makes nobody else’s form stale by saving what is stored', async () => {
    const figure = await addFigure(officer);
    const answer = await officer.put(`${figures}/${figure.id}`, { ...figureInput(), version: 1 }).expect(200);
    expect((answer.body as FigureDetail).version).toBe(1);
  });

  it('lets two writers at once not overwrite each other', async () => {
    const { id } = await addFigure(officer);
    const answers = await Promise.all(
      ['One way.', 'Another way.'].map((story) =>
        officer.put(`${figures}/${id}`, { ...figureInput(), story, version: 1 }),
      ),
    );
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409]);
  });

  it('writes down who did what, without any words of the story', async () => {
    const { id } = await addFigure(officer);
    await officer
      .put(`${figures}/${id}`, { ...figureInput(), story: 'Not for records.', version: 1 })
      .expect(200);
    await officer.delete(`${figures}/${id}`).expect(204);
    await officer.post(`${figures}/${id}/restore`).expect(200);
    const path = `/api/communities/${officer.communityId}/audit`;
    const { items } = (await officer.get(path).expect(200)).body as { items: AuditEvent[] };
    expect(items.map(({ action, subjectName, details }) => [action, subjectName, details])).toEqual([
      ['figure-put-back', 'Ŋɔ́rɛ̃', {}],
      ['figure-taken-out', 'Ŋɔ́rɛ̃', {}],
      ['figure-changed', 'Ŋɔ́rɛ̃', { fields: ['story'] }],
      ['figure-added', 'Ŋɔ́rɛ̃', {}],
    ]);
  });
});

describe('taking a figure out', () => {
  it('hides it until it is put back', async () => {
    const { id } = await addFigure(officer);
    await officer.delete(`${figures}/${id}`).expect(204);
    expect(await listed(officer)).toEqual([]);
    await officer.get(`${figures}/${id}`).expect(404);
    await officer.post(`${figures}/${id}/restore`).expect(200);
    expect(namesOf(await listed(officer))).toEqual(['Ŋɔ́rɛ̃']);
    expect((await officer.post(`${figures}/${id}/restore`).expect(409)).body).toMatchObject({
      reason: 'figure-is-there',
    });
  });

  it('is refused while a draft goes by it, with the entries named; elders see them, observers do not', async () => {
    const village = await openVillage(api);
    const figure = await addFigure(officer);
    const calendar = await beginCalendar(village);
    const lead = {
      type: 'marker',
      markerKey: figure.markerKey,
      phenomenon: 'heliacal-rising',
      occurrence: 1,
    } as const;
    const entry = await addEntry(officer, calendar.id, { lead, titleOfficer: 'Sow short millet' });
    const path = `${figures}/${figure.id}`;
    expect((await officer.delete(path).expect(409)).body).toMatchObject({
      type: '/problems/conflict',
      reason: 'figure-in-use',
      names: ['Sow short millet'],
    });
    const uses = async (client: Client) => ((await client.get(path).expect(200)).body as FigureDetail).usedBy;
    expect(await uses(village.elder)).toEqual([
      {
        calendarId: calendar.id,
        entryId: entry.id,
        placeName: 'Upper terraces',
        year: 2027,
        title: 'Sow short millet',
      },
    ]);
    expect(await uses(await api.signIn('observer'))).toEqual([]);
    await officer.delete(`/api/calendars/${calendar.id}/entries/${entry.id}`).expect(204);
    await officer.delete(path).expect(204);
    // Put back, the entry still knows its sign; a new one cannot choose it any more.
    const restored = await officer
      .post(`/api/calendars/${calendar.id}/entries/${entry.id}/restore`)
      .expect(200);
    expect(restored.body).toMatchObject({ dates: { marker: { expected: {} } } });
    const refused = await officer.post(`/api/calendars/${calendar.id}/entries`, { ...entry.content, lead });
    expect(fieldsOf(refused)).toEqual([['lead.markerKey', 'unknown-marker']]);
  });
});

describe('the chart', () => {
  it('has every star at its place of J2000, and well-known groups to begin from', async () => {
    const { stars, startingPoints } = (await officer.get('/api/chart').expect(200)).body as Chart;
    // Sirius at J2000, FK5: 06h 45m 09s, −16° 43′ [Bright Star Catalogue, HR 2491].
    expect(stars.find(({ hr }) => hr === 2491)).toMatchObject({
      name: 'Sirius',
      designation: 'α CMa',
      vMag: -1.46,
    });
    expect(stars.find(({ hr }) => hr === 2491)?.rightAscensionDeg).toBeCloseTo(101.29, 2);
    expect(stars.find(({ hr }) => hr === 2491)?.declinationDeg).toBeCloseTo(-16.72, 2);
    expect(startingPoints.map(({ key }) => key)).toEqual([
      'pleiades',
      'hyades',
      'orion-belt',
      'ursa-major-seven',
      'southern-cross',
    ]);
  });
});
