import type { Server } from 'node:http';
import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { MembershipEntity } from '#server/db/entities/membership.entity.js';
import { openServer } from '#server/http/timeouts.js';
import { draftGlance, type DraftGlance } from '#shared/contracts/draft-changes.js';
import { openTestApi, type Client, type TestApi } from '#tests/support/api.js';
import {
  addEntry,
  beginCalendar,
  openVillage,
  type Village,
  wholeEntry,
} from '#tests/support/calendar-api.js';
import { addVariant } from '#tests/support/variant-api.js';

/** Whoever has a draft open learns at once that it became another one: of what they see, and as ids alone. */
let api: TestApi;
let server: Server;
let address: string;
let village: Village;
let calendarId: string;
let year = 2027;
beforeAll(async () => {
  api = await openTestApi();
  village = await openVillage(api);
});
beforeEach(async () => {
  api.restart();
  calendarId = (await beginCalendar(village, year)).id;
  year += 1;
  server = openServer(api.app.express);
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
  const bound = server.address();
  address = `http://127.0.0.1:${String(typeof bound === 'object' ? bound?.port : '')}`;
});
afterEach(async () => {
  api.app.endStreams();
  await new Promise((resolve) => server.close(resolve));
  await api.app.settled();
});
afterAll(() => api.close());

/** A stream as a browser holds it: glances one after the other; null once it has ended. */
async function open(client: Client, seconds = 600) {
  const answer = await fetch(`${address}/api/calendars/${calendarId}/changes?seconds=${seconds}`, {
    headers: { Cookie: client.cookie, 'Accept-Encoding': 'gzip, br' },
  });
  const reader = answer.body?.pipeThrough(new TextDecoderStream()).getReader();
  let text = '';
  const next = async (): Promise<DraftGlance | null> => {
    for (;;) {
      const found = /event: glance\ndata: (.*)\n\n/u.exec(text);
      if (found) {
        text = text.slice(found.index + found[0].length);
        return draftGlance.parse(JSON.parse(found[1] ?? ''));
      }
      const part = await reader?.read();
      if (part === undefined || part.done) return null;
      text += part.value;
    }
  };
  return { answer, next };
}

const idsOf = (glance: DraftGlance | null) => glance?.entries.map(({ entryId }) => entryId);

describe('a draft that is listened to', () => {
  it('tells of other timings to those who see them, and of what elders keep to them alone', async () => {
    const { id } = await addEntry(village.officer, calendarId);
    const elder = await open(village.elder);
    const officer = await open(village.officer);
    await elder.next();
    await officer.next();
    const { variantId } = await addVariant(village.elder, calendarId, id);
    const one = [{ variantId, version: 1 }];
    expect((await officer.next())?.entries[0]?.variants).toEqual(one);
    expect((await elder.next())?.entries[0]?.variants).toEqual(one);
    const kept = await addVariant(village.elder, calendarId, id, { sharingLevel: 'elders' });
    // Both were put in at the same moment of a clock that stands still, so neither is first.
    const both = (await elder.next())?.entries[0]?.variants.map((variant) => variant.variantId);
    expect(both?.toSorted()).toEqual([variantId, kept.variantId].toSorted());
    await village.elder
      .delete(`/api/calendars/${calendarId}/entries/${id}/variants/${variantId}`)
      .expect(204);
    // The officer was told nothing of the one in between.
    expect((await officer.next())?.entries[0]?.variants).toEqual([]);
  });

  it('tells of every save, order, removal and submission, and whose save it was', async () => {
    const first = await addEntry(village.officer, calendarId, { titleOfficer: 'Zqword' });
    const colleague = await api.signIn('officer');
    const path = `/api/calendars/${calendarId}/entries`;
    const elder = await open(village.elder);
    expect(await elder.next()).toEqual({
      entries: [{ entryId: first.id, version: 1, byMe: false, doneTypedAt: null, variants: [] }],
      locked: false,
      publishedNumber: null,
    });
    const second = await addEntry(colleague, calendarId, { titleOfficer: 'Weed' });
    expect(idsOf(await elder.next())).toEqual([first.id, second.id]);

    await colleague
      .put(`${path}/${first.id}`, { content: wholeEntry({ crop: 'short millet' }), version: 1 })
      .expect(200);
    expect((await elder.next())?.entries[0]).toMatchObject({ entryId: first.id, version: 2 });
    await colleague
      .put(`/api/calendars/${calendarId}/order`, { entryIds: [second.id, first.id] })
      .expect(200);
    expect(idsOf(await elder.next())).toEqual([second.id, first.id]);
    await colleague
      .put(`${path}/${first.id}/actual-days`, { from: '2027-06-24', to: null, saidBy: 'Hala', plots: '' })
      .expect(200);
    expect((await elder.next())?.entries[1]?.doneTypedAt).not.toBeNull();
    await colleague.delete(`${path}/${second.id}`).expect(204);
    expect(idsOf(await elder.next())).toEqual([first.id]);
    await colleague.post(`/api/calendars/${calendarId}/versions`).expect(201);
    expect(await elder.next()).toMatchObject({ locked: true });

    const own = await colleague.get(`/api/calendars/${calendarId}/changes`).expect(200);
    expect(own.text).toContain('"byMe":true');
    expect(own.text).not.toContain('Zqword');
  });

  it('keeps still about what its people keep, and shows it no more where it becomes theirs', async () => {
    const seen = await addEntry(village.officer, calendarId);
    const officer = await open(village.officer);
    await officer.next();
    const kept = await addEntry(village.elder, calendarId, { sharingLevel: 'elders' });
    const after = await addEntry(village.officer, calendarId, { titleOfficer: 'Weed' });
    expect(idsOf(await officer.next())).toEqual([seen.id, after.id]);
    const elder = await open(village.elder2);
    expect(idsOf(await elder.next())).toEqual([seen.id, kept.id, after.id]);
  });

  it('goes out as it is, held back by nothing in between', async () => {
    const { answer, next } = await open(village.officer);
    await next();
    expect(answer.headers.get('content-type')).toBe('text/event-stream; charset=utf-8');
    expect(answer.headers.get('content-encoding')).toBeNull();
    expect(answer.headers.get('cache-control')).toBe('no-store, no-transform');
  });
});

describe('a stream ends', () => {
  it('with the session that opened it, before another word', async () => {
    const leaving = await api.signIn('officer');
    const stream = await open(leaving);
    await stream.next();
    await leaving.delete('/api/session').expect(200);
    await addEntry(village.officer, calendarId);
    expect(await stream.next()).toBeNull();
  });

  it('with the membership', async () => {
    const { personId, communityId } = village.elder3;
    const stream = await open(village.elder3);
    await stream.next();
    await api.dataSource.getRepository(MembershipEntity).delete({ personId, communityId });
    await addEntry(village.officer, calendarId);
    expect(await stream.next()).toBeNull();
  });

  it('with the server, which waits for none of them and opens no other', async () => {
    const stream = await open(village.officer);
    await stream.next();
    api.app.endStreams();
    expect(await stream.next()).toBeNull();
    const refused = await open(village.officer);
    expect(refused.answer.status).toBe(429);
    expect(await refused.next()).toBeNull();
  });

  it('by itself where only the present state was asked for', async () => {
    const { next } = await open(village.officer, 0);
    expect(await next()).not.toBeNull();
    expect(await next()).toBeNull();
  });
});

it('one person holds eight streams at most; others are not kept out by them', async () => {
  const held = await Promise.all(Array.from({ length: 8 }, () => open(village.officer)));
  for (const { next } of held) await next();
  const ninth = await open(village.officer);
  expect(ninth.answer.status).toBe(429);
  expect(await ninth.next()).toBeNull();
  expect((await open(village.elder)).answer.status).toBe(200);
});
