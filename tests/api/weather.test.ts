import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { Problem } from '#shared/contracts/problem.js';
import type { Notice, RainDay } from '#shared/contracts/weather.js';
import { openTestApi, type Client, type TestApi } from '#tests/support/api.js';
import { addEntry, beginCalendar, openVillage, reasonOf, type Village } from '#tests/support/calendar-api.js';
import { textOf } from '#tests/support/every-endpoint.js';
import { noticeInput, weatherOf, weatherPath } from '#tests/support/weather-api.js';

let api: TestApi;
let village: Village;
let observer: Client;
beforeAll(async () => {
  api = await openTestApi();
});
beforeEach(async () => {
  await api.reset();
  village = await openVillage(api);
  observer = await api.signIn('observer');
});
afterAll(() => api.close());

const notices = () => `${weatherPath(village.officer)}/notices`;
const rain = () => `${weatherPath(village.officer)}/rain`;
const fieldsOf = (body: unknown) =>
  ((body as Problem).errors ?? []).map(({ field, code }) => `${field}: ${code}`);

describe('a notice of the weather service', () => {
  it('is read by everybody of the village until it expires, and stays in the list of all notices', async () => {
    await village.steward.post(notices(), noticeInput()).expect(201);
    expect((await weatherOf(observer)).notices).toMatchObject([noticeInput()]);
    api.clock.set(new Date('2026-12-06T12:00:00Z'));
    expect((await weatherOf(observer)).notices).toEqual([]);
    expect((await village.elder.get(notices()).expect(200)).body).toMatchObject({ items: [noticeInput()] });
  });

  it('says how long it holds: issued in the past, over in the future, not for ever', async () => {
    const answers = [];
    for (const wrong of [
      { issuedOn: '2026-12-02' },
      { expiresOn: '2026-11-30' },
      { expiresOn: '2027-11-30' },
      { issuedOn: '2026-11-30', expiresOn: '2026-11-29' },
    ]) {
      answers.push(...fieldsOf((await village.officer.post(notices(), noticeInput(wrong))).body));
    }
    expect(answers).toEqual([
      'issuedOn: still-to-come',
      'expiresOn: expired-already',
      'expiresOn: holds-too-long',
      'expiresOn: before-issued',
    ]);
  });

  it('stands on the sheet that is printed while it holds, and is gone from the next one', async () => {
    const { officer } = village;
    const calendar = await beginCalendar(village, 2026);
    await addEntry(officer, calendar.id);
    const { id } = (await officer.post(notices(), noticeInput()).expect(201)).body as Notice;
    const sheet = `/api/calendars/${calendar.id}/versions/draft/sheet.pdf`;
    const printed = async () =>
      (await textOf(officer, sheet, { fileType: 'application/pdf' })).replaceAll(/\s+/gu, ' ');
    expect(await printed()).toContain('Notice of National weather service');
    await officer.delete(`${notices()}/${id}`).expect(204);
    expect(await printed()).not.toContain('Notice of National');
  });
});

describe('the rain of a day', () => {
  it('is written down by anybody, measured or in words, newest day first', async () => {
    await observer.post(rain(), { day: '2026-11-28', mm: null, words: 'a short shower' }).expect(201);
    await village.elder.post(rain(), { day: '2026-11-30', mm: 4.5, words: '' }).expect(201);
    expect((await weatherOf(observer)).rain).toMatchObject([
      { day: '2026-11-30', mm: 4.5, mine: false },
      { day: '2026-11-28', words: 'a short shower', mine: true },
    ]);
  });

  it('says something, of a day that was, and once', async () => {
    const day = '2026-11-30';
    await observer.post(rain(), { day, mm: 2, words: '' }).expect(201);
    const answers = [];
    for (const wrong of [
      { day: '2026-11-29', mm: null, words: '' },
      { day: '2026-12-02', mm: 1, words: '' },
      { day: '2026-01-02', mm: 1, words: '' },
      { day, mm: 3, words: '' },
    ]) {
      answers.push(...fieldsOf((await observer.post(rain(), wrong)).body));
    }
    expect(answers).toEqual([
      'mm: rain-said',
      'day: still-to-come',
      'day: too-long-ago',
      'day: rain-of-day-there',
    ]);
  });

  it('is taken out by whoever wrote it, or by an officer', async () => {
    const written = async () => {
      const body = { day: '2026-11-30', mm: 2, words: '' };
      return ((await observer.post(rain(), body).expect(201)).body as RainDay).id;
    };
    const id = await written();
    expect(reasonOf(await village.elder.delete(`${rain()}/${id}`))).toBe('409 not-the-marker');
    await observer.delete(`${rain()}/${id}`).expect(204);
    await village.officer.delete(`${rain()}/${await written()}`).expect(204);
    expect((await weatherOf(observer)).rain).toEqual([]);
  });
});
