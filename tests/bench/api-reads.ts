import autocannon from 'autocannon';
import { openClient, signInAs, type Client } from '#tests/support/api.js';
import { onBuiltProduct } from './built-product.js';

/** The demo villages' everyday reads at this rate, and for the same time nothing but the question whether it is well. */
const RATE_PER_SECOND = 100;
const SECONDS = 10;
const CONNECTIONS = 10;

export interface ApiReads {
  apiReadP95Ms: number;
  healthP95Ms: number;
}

/** Measures the built product on a throw-away database. */
export async function measureApiReads(): Promise<ApiReads> {
  return onBuiltProduct(async (address) => {
    const officer = await openClient(address);
    await signInAs(officer, 'officer');
    const paths = await everydayReads(officer);
    // Everybody has been here before: what is computed once a year is computed.
    for (const each of paths) await expectWell(officer, each);
    const health = await p95Of(address, ['/api/health'], officer.cookie);
    const reads = await p95Of(address, paths, officer.cookie);
    return { apiReadP95Ms: reads, healthP95Ms: health };
  });
}

/** What the screens of a day ask for: Today, the stars, the draft, its versions, the review, the village. */
async function everydayReads(officer: Client): Promise<string[]> {
  const village = `/api/communities/${officer.communityId}`;
  const [calendar] = await itemsOf(officer, '/api/calendars');
  const [place] = await itemsOf(officer, `${village}/places`);
  const [entry] = await itemsOf(officer, `/api/calendars/${calendar?.id ?? ''}/entries`);
  const ofCalendar = `/api/calendars/${calendar?.id ?? ''}`;
  const ofPlace = `/api/places/${place?.id ?? ''}`;
  return [
    '/api/session',
    '/api/communities',
    village,
    `${village}/today?placeId=${place?.id ?? ''}`,
    `${village}/places`,
    ofPlace,
    `${ofPlace}/stars?year=2027`,
    `${ofPlace}/stars/pleiades?year=2027`,
    `${village}/figures`,
    '/api/calendars',
    ofCalendar,
    `${ofCalendar}/entries`,
    `${ofCalendar}/versions`,
    `${ofCalendar}/versions/1`,
    `${ofCalendar}/versions/2/answers`,
    `${ofCalendar}/comparison?from=1&to=2`,
    `${village}/notes?subjectType=entry&subjectId=${entry?.id ?? ''}`,
    `${village}/groups`,
    `${village}/consents`,
    `${village}/audit`,
  ];
}

async function itemsOf(client: Client, address: string): Promise<{ id: string }[]> {
  return ((await client.get(address).expect(200)).body as { items: { id: string }[] }).items;
}

async function expectWell(client: Client, address: string): Promise<void> {
  const { status } = await client.get(address);
  if (status !== 200) throw new Error(`${address} answers ${status}`);
}

async function p95Of(url: string, paths: readonly string[], cookie: string): Promise<number> {
  const times: number[] = [];
  const failed: number[] = [];
  await new Promise<void>((resolve, reject) => {
    const run = autocannon(
      {
        url,
        connections: CONNECTIONS,
        overallRate: RATE_PER_SECOND,
        duration: SECONDS,
        requests: paths.map((each) => ({ method: 'GET', path: each, headers: { cookie } })),
      },
      (error) => {
        if (error instanceof Error) reject(error);
        else resolve();
      },
    );
    run.on('response', (_client, status, _bytes, milliseconds) => {
      times.push(milliseconds);
      if (status !== 200) failed.push(status);
    });
  });
  if (failed.length > 0) throw new Error(`${failed.length} reads failed, first with ${failed[0] ?? ''}`);
  times.sort((a, b) => a - b);
  return times[Math.ceil(times.length * 0.95) - 1] ?? Number.NaN;
}
