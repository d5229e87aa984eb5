import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { seedNeighbourCalendars } from '#server/features/demo/demo-neighbours.service.js';
import type { Calendar } from '#shared/contracts/calendars.js';
import type { OwnEntries } from '#shared/contracts/reviews.js';
import type { Version } from '#shared/contracts/versions.js';
import { boardOf } from '#shared/calendar/variants.js';
import { openTestApi, type Client, type TestApi } from '#tests/support/api.js';
import { textOf } from '#tests/support/every-endpoint.js';

let api: TestApi;
beforeAll(async () => {
  api = await openTestApi();
  await api.reset();
  await seedNeighbourCalendars(api.dataSource, api.clock);
}, 60_000);
afterAll(() => api.close());

async function onlyCalendar(client: Client): Promise<Calendar> {
  const { items } = (await client.get('/api/calendars').expect(200)).body as { items: Calendar[] };
  expect(items).toHaveLength(1);
  return items[0] as Calendar;
}

async function versionOne(client: Client): Promise<Version> {
  const { id } = await onlyCalendar(client);
  return (await client.get(`/api/calendars/${id}/versions/1`).expect(200)).body as Version;
}

const titlesOf = ({ entries }: Version) => entries.map(({ content }) => content.titleOfficer);

describe('the second village of the demo', () => {
  it('has its calendar published with days, three entries with another keeper’s timing; earthing-up waits for the planting', async () => {
    const version = await versionOne(await api.signIn('officer2'));
    expect(version).toMatchObject({ state: 'published', label: '2027-1', entryCount: 11, keptCount: 1 });
    const undated = version.entries.filter(({ dates }) => dates.window === null);
    expect(titlesOf({ ...version, entries: undated })).toEqual(['Earthing-up']);
    expect(undated[0]?.dates.counted?.basis).toBe('waiting');
    expect(version.entries.filter(({ variants = [] }) => variants.length > 0)).toHaveLength(3);
  });

  it('shows the lamp evening to lamp-makers alone, and prints it for nobody', async () => {
    for (const [name, sees] of [
      ['elder-b2', true],
      ['observer2', true],
      ['elder-b1', false],
      ['steward2', false],
      ['officer2', false],
    ] as const) {
      const client = await api.signIn(name);
      const version = await versionOne(client);
      expect([name, titlesOf(version).includes('Lamp evening')]).toEqual([name, sees]);
      const path = `/api/calendars/${version.calendarId}/versions/1/sheet.pdf?layout=month-cards`;
      const sheet = await textOf(client, path, { fileType: 'application/pdf' });
      expect(sheet).not.toContain('Lamp evening');
      if (name === 'officer2') expect(sheet).toContain('Frost watch');
    }
  });
});

describe('the third village of the demo', () => {
  it('has its calendar in review, with every entry’s days though no star serves in summer', async () => {
    const version = await versionOne(await api.signIn('officer3'));
    expect(version).toMatchObject({ state: 'in-review', entryCount: 12, keptCount: 1 });
    const undated = version.entries.filter(({ dates }) => dates.window === null);
    expect(titlesOf({ ...version, entries: undated })).toEqual([]);
    const byNature = version.entries.filter(({ content }) => content.lead.type === 'nature-sign');
    expect(titlesOf({ ...version, entries: byNature })).toEqual(['Sow oats and fodder', 'Plant potato']);
  });

  it('keeps both families’ signs of the ice beside the authority’s day; the earlier closing counts', async () => {
    const version = await versionOne(await api.signIn('officer3'));
    const road = version.entries.find(({ content }) => content.titleOfficer === 'Stop using the ice road');
    if (!road) throw new Error('The ice road is not there');
    expect(road.content.lead).toMatchObject({ type: 'fixed-date' });
    expect(road.content.lastDate?.source).toBe('Road authority');
    expect(road.variants?.map(({ content }) => content.giver).sort()).toEqual([
      'A family of the shore',
      'A family of the upper bank',
    ]);
    const variants = (road.variants ?? []).map((variant) => ({ ...variant, forBoard: true }));
    const board = boardOf({ ...road, variants });
    expect(board.drivenBy).toBe('later-start-earlier-end');
    expect(board.window?.lastAdvised).toBe('2027-05-01');
    expect(board.beside).toHaveLength(3);
  });

  it('asks its pickers about the berry week', async () => {
    const picker = await api.signIn('observer3');
    const { id } = await onlyCalendar(picker);
    const { items } = (await picker.get(`/api/calendars/${id}/versions/1/own-entries`).expect(200))
      .body as OwnEntries;
    expect(items.map(({ entry }) => entry.content.titleOfficer)).toEqual(['Berry week']);
  });
});

it('is not made twice', async () => {
  await seedNeighbourCalendars(api.dataSource, api.clock);
  expect((await onlyCalendar(await api.signIn('officer2'))).published?.label).toBe('2027-1');
  await onlyCalendar(await api.signIn('officer3'));
});
