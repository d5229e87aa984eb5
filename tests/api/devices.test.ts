import request from 'supertest';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { MembershipEntity } from '#server/db/entities/membership.entity.js';
import { SessionEntity } from '#server/db/entities/session.entity.js';
import { SessionStore } from '#server/http/session-store.js';
import type { Device } from '#shared/contracts/session.js';
import { DEMO_PASSWORD } from '#server/features/demo/demo-villages.data.js';
import { openTestApi, TEST_NOW, type Client, type TestApi } from '#tests/support/api.js';

let api: TestApi;
beforeAll(async () => {
  api = await openTestApi();
});
beforeEach(() => api.reset());
afterAll(() => api.close());

// Written as these browsers send it (from memory).
const PHONE = 'Mozilla/5.0 (Android 14; Mobile; rv:128.0) Gecko/128.0 Firefox/128.0';

async function devicesOf(client: Client): Promise<Device[]> {
  return ((await client.get('/api/session/devices').expect(200)).body as { items: Device[] }).items;
}

async function signInOn(userAgent: string): Promise<void> {
  const visitor = await api.visitor();
  const body = { email: 'officer@dawnpeg.example', password: DEMO_PASSWORD };
  await visitor.post('/api/session', body).set('User-Agent', userAgent).expect(200);
}

describe('the own devices', () => {
  it('say when each began, when it was used last and roughly what it is; the one that asks is marked', async () => {
    const here = await api.signIn('officer');
    await signInOn(PHONE);
    const later = new Date(TEST_NOW.getTime() + 90 * 60_000);
    api.clock.set(later);
    // A request counts as a use once it has been answered.
    await devicesOf(here);
    const [first, second] = await devicesOf(here);
    expect(first).toMatchObject({ here: true, lastUsedAt: later.toISOString() });
    expect(second).toMatchObject({ browser: 'Firefox', system: 'Android', here: false });
    expect([first?.beganAt, second?.lastUsedAt]).toEqual([TEST_NOW.toISOString(), TEST_NOW.toISOString()]);
  });

  it('are nobody else’s, and a name that opens no session', async () => {
    const officer = await api.signIn('officer');
    const elder = await api.signIn('elder');
    const own = await devicesOf(officer);
    expect(own).toHaveLength(1);
    const id = own[0]?.id ?? '';
    await request(api.app.express)
      .get('/api/communities')
      .set('Cookie', `dawnpeg.session=s:${id}`)
      .expect(401);
    await elder.delete(`/api/session/devices/${id}`).expect(204);
    await officer.get('/api/communities').expect(200);
  });

  it('are signed out one at a time, with effect on the next request', async () => {
    const here = await api.signIn('officer');
    const there = await api.signIn('officer');
    const other = (await devicesOf(here)).find((device) => !device.here);
    await here.delete(`/api/session/devices/${other?.id ?? ''}`).expect(204);
    await there.get('/api/communities').expect(401);
    await here.get('/api/communities').expect(200);
  });

  it('are signed out everywhere but here', async () => {
    const here = await api.signIn('officer');
    const others = [await api.signIn('officer'), await api.signIn('officer')];
    const elder = await api.signIn('elder');
    await here.delete('/api/session/devices').expect(204);
    for (const other of others) await other.get('/api/communities').expect(401);
    await here.get('/api/communities').expect(200);
    await elder.get('/api/communities').expect(200);
  });

  it('do not come back with a request that was on its way when they were signed out', async () => {
    await api.signIn('officer');
    const rows = api.dataSource.getRepository(SessionEntity);
    const row = await rows.findOneByOrFail({});
    await rows.delete({ sidHash: row.sidHash });
    const store = new SessionStore(api.dataSource, api.clock);
    await new Promise<void>((resolve, reject) => {
      store.touch('any', JSON.parse(row.data) as never, (error) => {
        if (error === undefined) resolve();
        else reject(new Error('touching failed', { cause: error }));
      });
    });
    expect(await rows.count()).toBe(0);
  });
});

describe('an open session', () => {
  it('loses a role and the whole village at once, in the middle of work', async () => {
    const officer = await api.signIn('officer');
    const { communityId, personId } = officer;
    const places = `/api/communities/${communityId}/places`;
    const rows = api.dataSource.getRepository(MembershipEntity);
    await officer.post(places, {}).expect(422);
    await rows.update({ communityId, personId }, { roles: ['staff'] });
    await officer.post(places, {}).expect(403);
    await rows.delete({ communityId, personId });
    await officer.get(places).expect(404);
    expect((await officer.get('/api/session').expect(200)).body).toMatchObject({ memberships: [] });
  });
});

describe('guessing', () => {
  it('from one address is slowed down over all accounts together', async () => {
    const visitor = await api.visitor();
    for (let tries = 0; tries < 50; tries += 1) {
      const body = { email: `nobody${tries}@example.org`, password: 'wrong' };
      await visitor.post('/api/session', body).expect(401);
    }
    const body = { email: 'officer@dawnpeg.example', password: DEMO_PASSWORD };
    await visitor.post('/api/session', body).expect(429);
  });
});
