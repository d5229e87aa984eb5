import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { DriftAnswer } from '#shared/contracts/drift.js';
import type { FinderAnswer } from '#shared/contracts/finder.js';
import type { FigureDetail } from '#shared/contracts/figures.js';
import type { SkyMarkerYear } from '#shared/contracts/sky-markers.js';
import type { MarkerDetail, MarkerRow } from '#shared/contracts/stars.js';
import type { Today } from '#shared/contracts/today.js';
import type { Comparison, Version } from '#shared/contracts/versions.js';
import { openTestApi, type TestApi } from '#tests/support/api.js';
import {
  addEntry,
  beginCalendar,
  entriesOf,
  openVillage,
  publishDraft,
  readVersion,
  type Village,
} from '#tests/support/calendar-api.js';
import { addFigure, DARK_CLOUD, figureInput } from '#tests/support/figure-api.js';

/** One village's figures on their way through the product: table, star page, draft, frozen version. */
let api: TestApi;
let village: Village;
let bowl: FigureDetail;
let cloud: FigureDetail;
let stars: string;
/** The day of a published sign that goes by a figure. */
let dayOfHerders: string;
beforeAll(async () => {
  api = await openTestApi();
  village = await openVillage(api);
  bowl = await addFigure(village.officer);
  cloud = await addFigure(village.officer, DARK_CLOUD);
  stars = `/api/places/${village.placeId}/stars`;
});
afterAll(() => api.close());

const table = async () =>
  ((await village.elder.get(`${stars}?year=2027`).expect(200)).body as { items: MarkerRow[] }).items;

describe('a figure of the village', () => {
  it('stands on top of the table of stars, under the village’s own name', async () => {
    const items = await table();
    expect(items.slice(0, 3).map(({ kind, name, hr }) => [kind, name, hr])).toEqual([
      ['own-figure', 'Ŋɔ́rɛ̃', 1457],
      ['own-figure', 'The dark herd', null],
      ['figure', 'Pleiades', 1165],
    ]);
  });

  it('has the dates of its leading star, and a page like any star', async () => {
    const items = await table();
    const aldebaran = items.find(({ markerKey }) => markerKey === 'hr1457');
    expect(items[0]?.phenomena).toEqual(aldebaran?.phenomena);
    const detail = (await village.elder.get(`${stars}/${bowl.markerKey}?year=2027`).expect(200))
      .body as MarkerDetail;
    expect(detail.members.map(({ name }) => name)).toEqual(['Hyadum I', 'Ain', 'Aldebaran']);
    const patch = (await village.elder.get(`${stars}/${cloud.markerKey}?year=2027`).expect(200))
      .body as MarkerDetail;
    expect(patch.basis.sameSideDeg).toBe(18);
    expect(patch.phenomena['heliacal-rising'].outcome).toBe('dated');
  });

  it('is found near a wanted day and has a drift, under the same name', async () => {
    const place = `/api/places/${village.placeId}`;
    const items = await table();
    const day = items[0]?.phenomena['heliacal-rising'].occurrences[0]?.expected.gregorian ?? '';
    const found = (
      await village.officer.get(`${place}/finder?year=2027&from=${day.slice(5)}&show=all`).expect(200)
    ).body as FinderAnswer;
    expect(found.items.map(({ name }) => name)).toContain('Ŋɔ́rɛ̃');
    const drift = (
      await village.officer.get(`${place}/drift/${cloud.markerKey}?from=1900&to=2100`).expect(200)
    ).body as DriftAnswer;
    expect([drift.kind, drift.name]).toEqual(['own-figure', 'The dark herd']);
  });

  it('is unknown to another village', async () => {
    const stranger = await api.signIn('officer2');
    const { items } = (await stranger.get(`/api/communities/${stranger.communityId}/places`)).body as {
      items: { id: string }[];
    };
    await stranger.get(`/api/places/${items[0]?.id ?? ''}/stars/${bowl.markerKey}?year=2027`).expect(404);
  });

  it('keeps its name and dates in a published version whatever becomes of it', async () => {
    const { officer } = village;
    const calendar = await beginCalendar(village);
    const lead = {
      type: 'marker',
      markerKey: bowl.markerKey,
      phenomenon: 'heliacal-rising',
      occurrence: 1,
    } as const;
    await addEntry(officer, calendar.id, { lead });
    const published = await publishDraft(village, calendar.id);
    expect(published.header.place.figures?.map(({ name }) => name)).toEqual(['Ŋɔ́rɛ̃']);
    const before = published.entries[0]?.dates.marker?.expected.dayNumber ?? 0;

    // Sirius leads from now on, under another name.
    const path = `/api/communities/${officer.communityId}/figures/${bowl.id}`;
    const changed = figureInput({
      names: [{ tag: 'en', name: 'Bright one' }],
      memberHrs: [2491],
      indicatorHr: 2491,
    });
    await officer.put(path, { ...changed, version: 1 }).expect(200);

    const read: Version = await readVersion(officer, published);
    expect(read.header.markers.map(({ name }) => name)).toEqual(['Ŋɔ́rɛ̃']);
    expect(read.entries).toEqual(published.entries);
    const [draft] = await entriesOf(officer, calendar.id);
    expect(draft?.dates.marker?.expected.dayNumber).toBeGreaterThan(before + 14);

    const query = `from=${published.number}&to=draft`;
    const comparison = (await officer.get(`/api/calendars/${calendar.id}/comparison?${query}`).expect(200))
      .body as Comparison;
    expect(comparison.header.map(({ field }) => field)).toContain('place.figures');
  });

  it('leads an entry by any sign of a star, frozen with its definition; while it leads it is not taken out', async () => {
    const { officer } = village;
    const figure = await addFigure(officer, { names: [{ tag: 'en', name: 'Three herders' }] });
    const calendar = await beginCalendar(village, 2028);
    const specs = {
      'In the east': {
        kind: 'star-altitude',
        markerKey: figure.markerKey,
        altitudeDeg: 30,
        side: 'east',
        at: { clock: 'solar-hour', solarHour: 21 },
      },
      Highest: { kind: 'culmination', markerKey: cloud.markerKey, twilight: 'dusk', depthDeg: 18 },
      'Second full Moon': {
        kind: 'moon-counted',
        markerKey: figure.markerKey,
        phenomenon: 'heliacal-rising',
        event: 'full',
        count: 2,
      },
    } as const;
    for (const [titleOfficer, spec] of Object.entries(specs)) {
      const entry = await addEntry(officer, calendar.id, {
        lead: { type: 'sky', spec, occurrence: 1 },
        titleOfficer,
      });
      expect(entry.dates.sky?.outcome, titleOfficer).toBe('dated');
    }
    const path = `/api/communities/${officer.communityId}/figures/${figure.id}`;
    expect((await officer.delete(path).expect(409)).body).toMatchObject({
      reason: 'figure-in-use',
      names: ['In the east', 'Second full Moon'],
    });
    const published = await publishDraft(village, calendar.id);
    dayOfHerders = published.entries[0]?.dates.marker?.expected.gregorian ?? '';
    expect(published.header.place.figures?.map(({ name }) => name).sort()).toEqual([
      'The dark herd',
      'Three herders',
    ]);
    const sheet = await officer
      .get(`/api/calendars/${calendar.id}/versions/${published.number}/sheet?layout=month-cards`)
      .expect(200);
    expect(JSON.stringify(sheet.body).includes('Three herders')).toBe(true);

    // Sirius leads from now on: the draft moves, what hangs on the wall does not.
    const changed = figureInput({
      names: [{ tag: 'en', name: 'One herder' }],
      memberHrs: [2491],
      indicatorHr: 2491,
    });
    await officer.put(path, { ...changed, version: 1 }).expect(200);
    const read = await readVersion(officer, published);
    expect(read.entries).toEqual(published.entries);
    expect(read.header.markers.map(({ name }) => name)).toContain('Three herders');
    const [draft] = await entriesOf(officer, calendar.id);
    const before = published.entries[0]?.dates.marker?.expected.dayNumber ?? Number.NaN;
    expect(Math.abs((draft?.dates.marker?.expected.dayNumber ?? before) - before)).toBeGreaterThan(14);
  });

  it('is offered among the signs of the place, due south and at dusk; another village cannot ask for it', async () => {
    const signs = `/api/places/${village.placeId}/sky-markers`;
    const { items } = (await village.elder.get(`${signs}?year=2027`).expect(200)).body as {
      items: SkyMarkerYear[];
    };
    const kinds = items.flatMap(({ spec }) =>
      'markerKey' in spec && spec.markerKey === bowl.markerKey ? [spec.kind] : [],
    );
    expect(kinds).toEqual(['due-meridian', 'culmination']);
    const stranger = await api.signIn('officer2');
    const { items: places } = (await stranger.get(`/api/communities/${stranger.communityId}/places`))
      .body as {
      items: { id: string }[];
    };
    const spec = { kind: 'due-meridian', markerKey: bowl.markerKey, facing: 'south', solarHour: 21 } as const;
    const refused = await stranger
      .post(`/api/places/${places[0]?.id ?? ''}/sky-markers`, { year: 2027, spec })
      .expect(422);
    expect(refused.body).toMatchObject({ errors: [{ field: 'spec.markerKey', code: 'unknown-marker' }] });
  });

  it('leads Today by the definition that was published', async () => {
    api.clock.set(new Date('2027-06-16T03:00:00Z'));
    // The old sign-in has run out by then.
    const officer = await api.signIn('officer');
    const path = `/api/communities/${officer.communityId}/today?placeId=${village.placeId}`;
    const { coming } = (await officer.get(path).expect(200)).body as Today;
    expect(coming.find(({ leads }) => leads.length > 0)?.marker.name).toBe('Ŋɔ́rɛ̃');
  });

  it('stands on Today as the sign that was published, under the name that it had', async () => {
    api.clock.set(new Date(`${dayOfHerders}T03:00:00Z`));
    const officer = await api.signIn('officer');
    const path = `/api/communities/${officer.communityId}/today?placeId=${village.placeId}`;
    const { comingSigns } = (await officer.get(path).expect(200)).body as Today;
    expect(comingSigns.map(({ marker, leads }) => [marker?.name, leads])).toEqual([
      ['Three herders', ['In the east']],
    ]);
  });
});
