import type { Response } from 'supertest';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { PLAIN_DETAILS } from '#shared/contracts/sharing.js';
import { fillPath, type Endpoint } from '#shared/contracts/endpoint.js';
import { ENDPOINTS } from '#shared/contracts/index.js';
import type { Problem } from '#shared/contracts/problem.js';
import { openTestApi, type Client, type TestApi } from '#tests/support/api.js';
import { attachmentInput, attachmentsPath } from '#tests/support/attachment-api.js';
import { addEntry, beginCalendar, entryInput, reasonOf, says } from '#tests/support/calendar-api.js';
import { plainPicture } from '#tests/support/media.js';
import { sampleOf } from '#tests/support/sample-of-schema.js';
import { openTwoVillages, type TwoVillages } from '#tests/support/two-villages.js';

/**
 * Ids that were guessed, or that are real and belong to somebody else. Whole paths of another village are walked by the
 * permission matrix; here one foreign id stands among the own ones.
 */
const NOBODY = '0190a3a0-0000-4000-8000-00000000dead';
let api: TestApi;
let two: TwoVillages;
let steward: Client;
let officer: Client;
beforeAll(async () => {
  api = await openTestApi();
  two = await openTwoVillages(api);
  ({ steward, officer } = two.village);
});
afterAll(() => api.close());

const idsIn = ({ path }: Endpoint) => [...path.matchAll(/:(\w+Id)\b/gu)].map(([, name = '']) => name);
const WITH_IDS = ENDPOINTS.filter((endpoint) => idsIn(endpoint).length > 0);

/** The own ids with one of them replaced. */
function pathWith(endpoint: Endpoint, name: string, value: string): string {
  const own: Record<string, string> = {
    ...two.home,
    ...{ itemType: 'entry', itemId: two.home.entryId, markerKey: 'pleiades', number: '1', part: '1' },
  };
  return fillPath(endpoint.path, { ...own, [name]: value });
}

async function call(client: Client, endpoint: Endpoint, path: string) {
  const body = endpoint.body && sampleOf(endpoint.body, { text: 'a word', id: NOBODY });
  switch (endpoint.method) {
    case 'GET':
      return client.get(path);
    case 'PUT':
      return client.put(path, body);
    case 'DELETE':
      return client.delete(path);
    default:
      return endpoint.upload === null
        ? client.post(path, body)
        : client.upload(path, body, await plainPicture());
  }
}

/** An answer without what differs each time. */
const plain = ({ body }: { body: unknown }) => ({ ...(body as Problem), requestId: '' });

describe('an id that names nothing', () => {
  it.each(WITH_IDS.map((one) => [`${one.method} ${one.path}`, one] as const))(
    '%s lets nobody through on a guess, and answers as for something of another village',
    async (_name, endpoint) => {
      for (const name of idsIn(endpoint)) {
        const client =
          endpoint.access.kind === 'member' && !endpoint.access.roles.includes('officer') ? steward : officer;
        const guessed = await call(client, endpoint, pathWith(endpoint, name, NOBODY));
        const theirs = foreignFor(name);
        const foreign = await call(client, endpoint, pathWith(endpoint, name, theirs));
        expect([name, foreign.status, plain(foreign)]).toEqual([name, guessed.status, plain(guessed)]);
        expect([200, 201, 500]).not.toContain(guessed.status);
      }
    },
  );

  function foreignFor(name: string): string {
    const away: Record<string, string> = { ...two.away, itemId: two.away.entryId };
    return away[name] ?? '0190a3a0-0000-4000-8000-00000000beef';
  }
});

describe('what is no id at all', () => {
  const TRICKS = [
    '..%2f..%2fetc%2fpasswd',
    '%2e%2e%2f%2e%2e%2f.env',
    '..%5c..%5cwin.ini',
    '%00',
    `${NOBODY}%00.png`,
    "'%20OR%20'1'='1",
    '1;DROP%20TABLE%20person',
    '%24%7B7*7%7D',
    '__proto__',
    'constructor',
    '*',
    'a'.repeat(5000),
  ];

  it.each(WITH_IDS.filter(({ method }) => method === 'GET').map((one) => [one.path, one] as const))(
    '%s finds nothing under tricks of paths and of the database',
    async (_path, endpoint) => {
      for (const name of idsIn(endpoint)) {
        for (const trick of TRICKS) {
          const marked = pathWith(endpoint, name, 'TRICK').replace('TRICK', trick);
          const answer = await officer.get(marked);
          expect([trick, answer.status]).toEqual([trick, 404]);
          expect(answer.text).not.toMatch(/root:|SELECT|ER_/u);
        }
      }
    },
  );

  it.each(['stars/:key', 'drift/:key', 'stars/:key/air'])(
    'nor does %s with such a name of a star',
    async (way) => {
      for (const trick of TRICKS) {
        const path = `/api/places/${two.home.placeId}/${way.replace(':key', trick)}?from=2000&to=2027&year=2027`;
        const answer = await officer.get(path);
        expect([trick, answer.status < 500, answer.status >= 400]).toEqual([trick, true, true]);
      }
    },
  );
});

describe('an id of another village in what is sent', () => {
  /** Refused, and for the very reason that the id is foreign. */
  const refused = (answer: Response, reason: string) => {
    const { errors } = answer.body as Problem;
    expect(errors === undefined ? reasonOf(answer) : `422 ${errors.map(({ code }) => code).join()}`).toBe(
      reason,
    );
  };

  it('makes no calendar at a foreign place', async () => {
    const path = `/api/communities/${two.home.communityId}/calendars`;
    refused(await officer.post(path, { placeId: two.away.placeId, year: 2031 }), '422 unknown-place');
  });

  it('gives nothing into the name of a stranger, nor to a foreign group', async () => {
    const group = { ...PLAIN_DETAILS, groupId: two.away.groupId };
    const successor = { ...PLAIN_DETAILS, successorId: two.away.personId };
    const calendar = await beginCalendar(two.village, 2029);
    const entries = `/api/calendars/${calendar.id}/entries`;
    refused(
      await officer.post(entries, entryInput({ giverId: two.away.personId })),
      '422 not-of-this-village',
    );
    refused(
      await officer.post(entries, entryInput({ sharingLevel: 'group', sharing: group })),
      '422 group-of-giver',
    );
    refused(
      await officer.post(entries, entryInput({ sharingLevel: 'sealed', sharing: successor })),
      '422 not-of-this-village',
    );
  });

  it('takes no stranger into a group', async () => {
    const path = `/api/communities/${two.home.communityId}/groups`;
    refused(
      await steward.post(path, { name: 'Spies', memberIds: [two.away.personId] }),
      '422 not-of-this-village',
    );
  });

  it('hangs no picture on foreign things, and tells nothing about them', async () => {
    for (const [subjectType, subjectId] of [
      ['figure', two.away.figureId],
      ['entry', two.away.entryId],
    ] as const) {
      const input = attachmentInput({ subjectType, subjectId });
      const foreign = await officer.upload(attachmentsPath(officer), input, await plainPicture());
      const guessed = await officer.upload(
        attachmentsPath(officer),
        attachmentInput({ subjectType, subjectId: NOBODY }),
        await plainPicture(),
      );
      expect([foreign.status, plain(foreign)]).toEqual([404, plain(guessed)]);
      const list = `${attachmentsPath(officer)}?subjectType=${subjectType}&subjectId=${subjectId}`;
      expect((await officer.get(list)).text).not.toContain(two.away.attachmentId);
    }
  });

  it('answers for no stranger, and moves no foreign entry', async () => {
    const version = `/api/calendars/${two.home.calendarId}/versions/1`;
    const onBehalf = says({ onBehalfOf: two.away.personId, witness: 'Tirel' });
    refused(await officer.put(`${version}/entries/${two.home.entryId}/answer`, onBehalf), '409 not-an-elder');
    refused(
      await two.village.elder.put(`${version}/entries/${two.away.entryId}/answer`, says()),
      '404 not-found',
    );
    const calendar = await beginCalendar(two.village, 2030);
    const { id } = await addEntry(officer, calendar.id);
    const order = { entryIds: [id, two.away.entryId] };
    refused(await officer.put(`/api/calendars/${calendar.id}/order`, order), '409 order-differs');
  });

  it('takes nothing back in the name of a stranger', async () => {
    const item = `/api/communities/${two.home.communityId}/items/entry/${two.home.entryId}`;
    const asked = await officer.post(`${item}/withdrawal`, {
      leavesTrace: true,
      askedById: two.away.personId,
    });
    refused(asked, '422 not-of-this-village');
    refused(await officer.post(`${item}/pause`, { askedById: two.away.personId }), '422 not-of-this-village');
  });

  it('puts no stranger into the rule of who signs', async () => {
    const path = `/api/communities/${two.home.communityId}`;
    const { id: _id, ...settings } = (await steward.get(path).expect(200)).body as Record<string, unknown>;
    const rule = { ...(settings['signOffRule'] as object), mustSign: [two.away.personId] };
    refused(await steward.put(path, { ...settings, signOffRule: rule }), '409 members-missing');
  });
});
