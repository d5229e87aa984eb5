// npm run bench:large            a table for people
// npm run bench:large -- --json  one JSON line
import { chromium, type BrowserContext } from '@playwright/test';
import type { Calendar } from '#shared/contracts/calendars.js';
import type { Version } from '#shared/contracts/versions.js';
import { openClient, signInAs, type Client } from '#tests/support/api.js';
import { submit, takeBack, wholeEntry } from '#tests/support/calendar-api.js';
import playwrightConfig from '../../playwright.config.js';
import { onBuiltProduct } from './built-product.js';
import { firstRowsMs, stripTimes } from './editor-page.js';

/** As much as a calendar may hold, and as many submissions as a busy office makes of it. */
const ENTRIES = 500;
const VERSIONS = 20;
/** As much as a large village draws on one strip. */
const STRIP_ENTRIES = 200;
/** Long lists are drawn in parts of so many. */
const FIRST_PART = 40;
const TIMES = 7;
const STARS = ['pleiades', 'hr1457', 'hr2491', 'hr5340', 'hr7001'] as const;

async function measure(address: string): Promise<Record<string, number>> {
  const officer = await openClient(address);
  await signInAs(officer, 'officer');
  const calendar = await fillCalendar(officer, 2029, ENTRIES);
  const onStrip = await fillCalendar(officer, 2030, STRIP_ENTRIES);
  // Before anything is submitted: from then on nobody may write in the draft.
  const editor = await inBrowser(address, officer, (context) =>
    measureEditor(context, `${address}/calendars/${calendar.id}`, `${address}/calendars/${onStrip.id}`),
  );
  const path = `/api/calendars/${calendar.id}`;
  const last = await fillVersions(officer, calendar.id);
  return {
    ...editor,
    listCalendarsMs: await middleMs(officer, '/api/calendars'),
    draftMs: await middleMs(officer, `${path}/entries`),
    versionsMs: await middleMs(officer, `${path}/versions`),
    versionMs: await middleMs(officer, `${path}/versions/${last.number}`),
    comparisonMs: await middleMs(officer, `${path}/comparison?from=1&to=${last.number}`),
    longLookMs: await middleMs(officer, `${path}/long-look?from=2029&number=draft`),
    ...(await inBrowser(address, officer, (context) =>
      measurePages(context, `${address}/calendars/${calendar.id}`, last),
    )),
  };
}

/** Does something in a browser in which the officer is signed in, on a phone's screen. */
async function inBrowser<T>(
  address: string,
  officer: Client,
  work: (context: BrowserContext) => Promise<T>,
): Promise<T> {
  const browser = await chromium.launch(playwrightConfig.use?.launchOptions ?? {});
  try {
    const context = await browser.newContext({ viewport: { width: 360, height: 740 } });
    const [name = '', ...value] = (officer.cookie.split(';')[0] ?? '').split('=');
    await context.addCookies([{ name, value: value.join('='), url: address }]);
    return await work(context);
  } finally {
    await browser.close();
  }
}

async function measureEditor(
  context: BrowserContext,
  address: string,
  onStrip: string,
): Promise<Record<string, number>> {
  const { dragLongestTaskMs, releaseMs } = await stripTimes(context, onStrip);
  return {
    editor500FirstRowsMs: await firstRowsMs(context, address, 1),
    draftPageMs: await firstRowsMs(context, address, FIRST_PART),
    stripDragLongestTaskMs: dragLongestTaskMs,
    stripReleaseMs: releaseMs,
  };
}

async function measurePages(
  context: BrowserContext,
  address: string,
  { number }: Version,
): Promise<Record<string, number>> {
  return {
    versionPageMs: await firstRowsMs(context, `${address}/versions/${number}`, FIRST_PART),
    longLookPageMs: await firstRowsMs(context, `${address}/long-look?number=draft`, FIRST_PART),
  };
}

/** Every month its own fixed date and stars in between, so that no two entries are alike. */
async function fillCalendar(officer: Client, year: number, entries: number): Promise<Calendar> {
  const places = `/api/communities/${officer.communityId}/places`;
  const { items } = (await officer.get(places).expect(200)).body as { items: { id: string }[] };
  const calendars = `/api/communities/${officer.communityId}/calendars`;
  const body = { placeId: items[0]?.id, year };
  const calendar = (await officer.post(calendars, body).expect(201)).body as Calendar;
  for (let index = 0; index < entries; index += 1) {
    const markerKey = STARS[index % STARS.length] ?? STARS[0];
    const date = { month: (index % 12) + 1, day: (index % 28) + 1 };
    const lead =
      index % 2 === 0
        ? ({ type: 'marker', markerKey, phenomenon: 'heliacal-rising', occurrence: 1 } as const)
        : ({ type: 'fixed-date', date, source: 'the office' } as const);
    const content = wholeEntry({ titleOfficer: `Work ${index + 1}`, crop: `plot ${index + 1}`, lead });
    await officer.post(`/api/calendars/${calendar.id}/entries`, content).expect(201);
  }
  return calendar;
}

/** One entry changes between each two submissions. */
async function fillVersions(officer: Client, calendarId: string): Promise<Version> {
  let last = await submit(officer, calendarId);
  while (last.number < VERSIONS) {
    await takeBack(officer, last);
    const path = `/api/calendars/${calendarId}/entries`;
    const { items } = (await officer.get(path).expect(200)).body as {
      items: { id: string; version: number; content: object }[];
    };
    const entry = items[last.number];
    if (!entry) throw new Error('no entry');
    const content = { ...entry.content, crop: `plot of submission ${last.number}` };
    await officer.put(`${path}/${entry.id}`, { content, version: entry.version }).expect(200);
    last = await submit(officer, calendarId);
  }
  return last;
}

/** The middle one of several times, after one that warms up what is computed once. */
async function middleMs(officer: Client, address: string): Promise<number> {
  await officer.get(address).expect(200);
  const times: number[] = [];
  for (let time = 0; time < TIMES; time += 1) {
    const start = performance.now();
    await officer.get(address).expect(200);
    times.push(performance.now() - start);
  }
  return Math.round(times.toSorted((a, b) => a - b)[Math.floor(TIMES / 2)] ?? Number.NaN);
}

const results = await onBuiltProduct(measure);
if (process.argv.includes('--json')) {
  process.stdout.write(`${JSON.stringify(results)}\n`);
} else {
  process.stdout.write(`${ENTRIES} entries, ${VERSIONS} submissions, one person at a time\n`);
  for (const [key, value] of Object.entries(results)) {
    process.stdout.write(`${key.padEnd(24)} ${String(value).padStart(7)}\n`);
  }
}
