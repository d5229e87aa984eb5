import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { ENDPOINTS } from '#shared/contracts/index.js';
import { fillPath, type Endpoint } from '#shared/contracts/endpoint.js';
import type { Response } from 'supertest';
import { openTestApi, type Client, type TestApi } from '#tests/support/api.js';
import { asBuffer } from '#tests/support/bytes-of.js';
import { addPicture, attachmentInput, attachmentsPath } from '#tests/support/attachment-api.js';
import { addEntry, beginCalendar, entriesOf, submit, versionPath } from '#tests/support/calendar-api.js';
import { addFigure } from '#tests/support/figure-api.js';
import { plainPicture } from '#tests/support/media.js';
import { addPlaceLike } from '#tests/support/place-api.js';
import { readPdfText } from '#tests/support/pdf/read-text.js';
import { sampleOf } from '#tests/support/sample-of-schema.js';
import { openTwoVillages, type TwoVillages } from '#tests/support/two-villages.js';

/** Script and markup in whatever takes words: stored, given back, written into files and their names. */
const SCRIPT = '<script>alert(1)</script><img src=x onerror=alert(1)>';
const FORMULA = '=HYPERLINK("https://evil.example","x")';
let api: TestApi;
let two: TwoVillages;
let officer: Client;
beforeAll(async () => {
  api = await openTestApi();
  two = await openTwoVillages(api);
  ({ officer } = two.village);
});
afterAll(() => api.close());

function isPlainJson(answer: Response): void {
  expect(answer.headers['content-type'] ?? 'application/json').toMatch(/^application\/(problem\+)?json/u);
  expect(answer.headers['x-content-type-options']).toBe('nosniff');
  expect(answer.headers['content-security-policy']).toContain("script-src 'self'");
  expect(answer.headers['content-security-policy']).not.toMatch(/script-src[^;]*unsafe/u);
  expect(answer.status).toBeLessThan(500);
}

describe('script in every field that takes text', () => {
  const WRITING = ENDPOINTS.filter(({ body }) => body !== undefined);

  it.each(WRITING.map((one) => [one.id, one] as const))(
    'of %s comes back as JSON only, if at all',
    async (_id, endpoint) => {
      const path = fillPath(endpoint.path, {
        ...two.home,
        ...{ itemType: 'entry', itemId: two.home.entryId, markerKey: 'pleiades', number: '1', part: '1' },
      });
      for (const text of [
        SCRIPT,
        `"'><svg/onload=alert(1)>`,
        'javascript:alert(1)',
        '{{constructor.constructor("alert(1)")()}}',
      ]) {
        isPlainJson(await send(endpoint, path, text));
      }
      api.restart();
    },
  );

  async function send(endpoint: Endpoint, path: string, text: string) {
    const body = endpoint.body && sampleOf(endpoint.body, { text, id: two.away.entryId });
    const client = ['signIn', 'redeemCode', 'resetPassword', 'setUpFirstSteward'].includes(endpoint.id)
      ? await api.visitor()
      : officer;
    if (endpoint.upload !== null) return client.upload(path, body, await plainPicture());
    return endpoint.method === 'PUT' ? client.put(path, body) : client.post(path, body);
  }
});

describe('script that is stored', () => {
  it('comes back as the very text, in a title, a story, a place, a picture', async () => {
    const calendar = await beginCalendar(two.village, 2028);
    const entry = await addEntry(officer, calendar.id, { titleOfficer: SCRIPT, notes: SCRIPT, giver: 'A' });
    const [read] = await entriesOf(officer, calendar.id);
    expect(read?.content).toMatchObject({ titleOfficer: SCRIPT, notes: SCRIPT });
    const figure = await addFigure(officer, {
      names: [{ tag: 'en', name: SCRIPT.slice(0, 60) }],
      story: SCRIPT,
    });
    expect(figure.story).toBe(SCRIPT);
    const place = await addPlaceLike(officer, two.place, { name: SCRIPT });
    expect(place.name).toBe(SCRIPT);
    const picture = await addPicture(officer, entry.id, { subjectType: 'entry', title: SCRIPT });
    const answer = await officer.get(`/api/attachments/${picture.id}`);
    isPlainJson(answer);
    expect(answer.body).toMatchObject({ title: SCRIPT });
  });

  it('is words on the printed sheet, and no link, action or script of its file', async () => {
    const calendar = await beginCalendar(two.village, 2029);
    await addEntry(officer, calendar.id, { titleOfficer: '<b>Sow</b> (/JS) /URI', agreedToPrint: true });
    const version = await submit(officer, calendar.id);
    const answer = await officer
      .get(`${versionPath(version)}/sheet.pdf?layout=month-cards`)
      .buffer(true)
      .parse(asBuffer)
      .expect(200);
    const file = answer.body as Buffer;
    expect(file.toString('latin1')).not.toMatch(/\/(JavaScript|JS|URI|Launch|OpenAction|EmbeddedFile|AA)\b/u);
    expect(readPdfText(file)).toContain('<b>Sow</b>');
  });

  it('makes no name of a file: neither a path, nor a second header, nor another ending', async () => {
    const place = await addPlaceLike(officer, two.place, { name: '../../etc/"x"; filename=evil.html;\\' });
    for (const way of ['stars.csv?year=2027', 'moons.csv?year=2027']) {
      const answer = await officer.get(`/api/places/${place.id}/${way}`).expect(200);
      const named = answer.headers['content-disposition'] ?? '';
      expect(named).toMatch(/^attachment; filename="[\w.-]+"; filename\*=UTF-8''[\w.%!~*'()-]+$/u);
      expect(/filename="([^"]*)"/u.exec(named)?.[1]).toMatch(/\.csv$/u);
      expect(named).not.toMatch(/%2F|\.\.\/|evil\.html;/u);
    }
  });

  it('is no formula in a table for a spreadsheet', async () => {
    const figure = await addFigure(officer, { names: [{ tag: 'en', name: FORMULA }] });
    for (const way of [`stars.csv?year=2027`, `drift/${figure.markerKey}/table.csv?from=2000&to=2027`]) {
      const answer = await officer.get(`/api/places/${two.home.placeId}/${way}`).expect(200);
      expect(answer.text).toContain('HYPERLINK');
      expect(answer.text).not.toMatch(/(^|,|\n)"?=HYPERLINK/u);
    }
  });
});

describe('the name that a browser gives a file', () => {
  it.each([
    '../../../../tmp/evil.png',
    '..\\..\\evil.png',
    '<img src=x onerror=alert(1)>.png',
    'x'.repeat(3000),
    'con',
    '.htaccess',
  ])('is never used: %j', async (name) => {
    const input = attachmentInput({ subjectId: two.home.figureId });
    const sent = officer
      .upload(attachmentsPath(officer), input, null)
      .attach('file', await plainPicture(), { filename: name, contentType: 'text/html' });
    const answer = await sent;
    expect(answer.status).toBe(201);
    expect(answer.text).not.toContain('evil');
    const { id } = answer.body as { id: string };
    const file = await officer.get(`/api/attachments/${id}/parts/1`).expect(200);
    expect(file.headers['content-type']).toBe('image/jpeg');
    expect(file.headers['content-disposition']).toMatch(/^inline; filename="[\w.-]+\.jpe?g"/u);
    await officer.delete(`/api/attachments/${id}`).expect(204);
  });
});
