import { afterAll, beforeAll, expect, it } from 'vitest';
import { openTestApi, type TestApi } from '#tests/support/api.js';

let api: TestApi;
beforeAll(async () => {
  api = await openTestApi({ settings: { PUBLIC_URL: 'https://calendar.example', TRUST_PROXY: '1' } });
});
afterAll(() => api.close());

it('behind https the session travels in a cookie that no other host of the domain can set', async () => {
  const visitor = await api.visitor();
  const answer = await visitor.get('/api/session').set('X-Forwarded-Proto', 'https').expect(200);
  const [cookie = ''] = answer.headers['set-cookie'] as unknown as string[];
  expect(cookie).toMatch(/^__Host-dawnpeg\.session=/u);
  const attributes = cookie.split('; ').slice(1);
  expect(attributes).toEqual(expect.arrayContaining(['Path=/', 'HttpOnly', 'Secure', 'SameSite=Lax']));
  expect(attributes.some((attribute) => attribute.startsWith('Domain'))).toBe(false);
});
