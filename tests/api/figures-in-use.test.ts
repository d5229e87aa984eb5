import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { DriftAnswer } from '#shared/contracts/drift.js';
import type { FinderAnswer } from '#shared/contracts/finder.js';
import type { FigureDetail } from '#shared/contracts/figures.js';
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

  it('leads Today by the definition that was published', async () => {
    api.clock.set(new Date('2027-06-16T03:00:00Z'));
    // The old sign-in has run out by then.
    const officer = await api.signIn('officer');
    const path = `/api/communities/${officer.communityId}/today?placeId=${village.placeId}`;
    const { coming } = (await officer.get(path).expect(200)).body as Today;
    expect(coming.find(({ leads }) => leads.length > 0)?.marker.name).toBe('Ŋɔ́rɛ̃');
  });
});
