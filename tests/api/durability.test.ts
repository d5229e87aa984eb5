import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { z } from 'zod';
import { DEMO_DOMAIN, DEMO_PASSWORD } from '#server/features/demo/demo-villages.data.js';
import { place, type PlaceInput } from '#shared/contracts/places.js';
import { sessionState } from '#shared/contracts/session.js';
import { runProduct, type RunningProduct } from '#tests/support/running-product.js';
import { randomFrom } from '#tests/support/seeded-random.js';

/**
 * The promise behind "saved": what the product has acknowledged is there after its server, its database or
 * both were killed in the middle of many writes, and what was cut off is there whole or not at all.
 */
const SEED = 20270310;
const WRITERS = 4;
/** A building machine may be busy; killing and starting again takes about a second each when it is not. */
const TIMEOUT_MS = 300_000;

let product: RunningProduct;
beforeAll(async () => {
  product = await runProduct();
}, TIMEOUT_MS);
afterAll(() => product.remove());

describe('acknowledged writes', () => {
  it('are all there after kill -9 at random moments of a write load', { timeout: TIMEOUT_MS }, async () => {
    const random = randomFrom(SEED);
    const officer = await signIn(product.address);
    /** Name of each place by its id, as the last acknowledged answer had it. */
    const acknowledged = new Map<string, { name: string; version: number }>();

    for (const victims of [['database'], ['server'], ['database', 'server'], ['database']] as const) {
      const killAfter = acknowledged.size + 5 + Math.floor(random() * 40);
      const killed: Promise<void>[] = [];
      const writers = Array.from({ length: WRITERS }, (_, writer) =>
        writeUntilCutOff(officer, `${acknowledged.size}-${writer}`, (saved) => {
          acknowledged.set(saved.id, { name: saved.name, version: saved.version });
          if (acknowledged.size >= killAfter && killed.length === 0) killed.push(product.kill(victims));
          return killed.length === 0;
        }),
      );
      await Promise.all(writers);
      await Promise.all(killed);
      await product.startAgain();

      const found = new Map((await allPlaces(officer)).map((row) => [row.id, row]));
      const lost = [...acknowledged].filter(([id, { version }]) => (found.get(id)?.version ?? 0) < version);
      expect(lost, `lost after killing ${victims.join(' and ')}`).toEqual([]);
      const changed = [...acknowledged].filter(([id, { name, version }]) => {
        const row = found.get(id);
        return row?.version === version && row.name !== name;
      });
      expect(changed, 'saved under one name, found under another').toEqual([]);
      expect(await auditedNames(officer), 'each place with the trace of its making, none without').toEqual(
        [...found.values()]
          .map(({ name }) => name)
          .filter(isOurs)
          .sort(),
      );
    }
    expect(acknowledged.size).toBeGreaterThan(4 * 5);
  });
});

interface Officer {
  readonly communityId: string;
  readonly headers: Readonly<Record<string, string>>;
}

/** One sign-in for the whole test: the session must survive the killings as well. */
async function signIn(address: string): Promise<Officer> {
  const first = await fetch(`${address}/api/session`);
  const { csrfToken } = sessionState.parse(await first.json());
  const answer = await fetch(`${address}/api/session`, {
    method: 'POST',
    headers: { 'content-type': 'application/json', 'x-csrf-token': csrfToken, cookie: cookieOf(first) },
    body: JSON.stringify({ email: `officer@${DEMO_DOMAIN}`, password: DEMO_PASSWORD }),
  });
  expect(answer.status).toBe(200);
  const session = sessionState.parse(await answer.json());
  return {
    communityId: session.memberships?.[0]?.communityId ?? '',
    headers: {
      'content-type': 'application/json',
      'x-csrf-token': session.csrfToken,
      cookie: cookieOf(answer),
    },
  };
}

function cookieOf(response: Response): string {
  return response.headers
    .getSetCookie()
    .map((cookie) => cookie.split(';')[0])
    .join('; ');
}

/** Makes a place, then gives it another name, and so on, until an answer fails to come or `goOn` says no. */
async function writeUntilCutOff(
  officer: Officer,
  label: string,
  goOn: (saved: { id: string; name: string; version: number }) => boolean,
): Promise<void> {
  for (let count = 1; ; count += 1) {
    const input = somePlace(`Field ${label}-${count}`);
    const made = await send(officer, 'POST', `/api/communities/${officer.communityId}/places`, input);
    if (!made || !goOn(made)) return;
    const renamed = await send(officer, 'PUT', `/api/places/${made.id}`, {
      ...input,
      name: `${input.name} renamed`,
      version: made.version,
    });
    if (!renamed || !goOn(renamed)) return;
  }
}

/** The saved place, or null when the product was cut off before it could acknowledge. */
async function send(
  officer: Officer,
  method: string,
  path: string,
  body: unknown,
): Promise<z.infer<typeof place> | null> {
  try {
    const answer = await fetch(`${product.address}${path}`, {
      method,
      headers: officer.headers,
      body: JSON.stringify(body),
    });
    if (answer.status >= 500) return null;
    const text: unknown = await answer.json();
    expect(answer.status, JSON.stringify(text)).toBeLessThan(300);
    return place.parse(text);
  } catch (error) {
    if (error instanceof TypeError) return null; // fetch: the connection was cut
    throw error;
  }
}

async function read<T>(officer: Officer, path: string, shape: z.ZodType<T>): Promise<T[]> {
  const page = z.object({ items: z.array(shape), nextCursor: z.string().nullable() });
  const items: T[] = [];
  for (let cursor: string | null = ''; cursor !== null;) {
    const more = cursor === '' ? '' : `&cursor=${encodeURIComponent(cursor)}`;
    const answer = await fetch(`${product.address}${path}${more}`, { headers: officer.headers });
    expect(answer.status, path).toBe(200);
    const { items: some, nextCursor } = page.parse(await answer.json());
    items.push(...some);
    cursor = nextCursor;
  }
  return items;
}

function allPlaces(officer: Officer): Promise<z.infer<typeof place>[]> {
  return read(officer, `/api/communities/${officer.communityId}/places`, place);
}

/** The present names of the places whose making was written down; a trace without its place shows as null. */
async function auditedNames(officer: Officer): Promise<(string | null)[]> {
  const event = z.object({ action: z.string(), subjectName: z.string().nullable() });
  const events = await read(officer, `/api/communities/${officer.communityId}/audit?limit=200`, event);
  return events
    .filter(({ action, subjectName }) => action === 'place-added' && isOurs(subjectName))
    .map(({ subjectName }) => subjectName)
    .sort();
}

/** Not of the demo villages. */
function isOurs(name: string | null): boolean {
  return name === null || name.startsWith('Field ');
}

function somePlace(name: string): PlaceInput {
  return {
    name,
    latitudeDeg: 13.5,
    longitudeDeg: 44.25,
    elevationM: 2200,
    timeZone: 'Asia/Aden',
    skyline: [],
    clarityByMonth: Array.from({ length: 12 }, () => 'clear' as const),
    rainMonths: Array.from({ length: 12 }, () => false),
    thresholdSet: 'three-class',
    sameSideShiftDeg: 0,
    oppositeSideShiftDeg: 0,
    skylineRule: 'depth-at-crossing',
  };
}
