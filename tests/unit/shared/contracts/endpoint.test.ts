import { describe, expect, it } from 'vitest';
import { z } from 'zod';
import { anybody, defineEndpoint, fillPath, member, signedIn } from '#shared/contracts/endpoint.js';
import { ENDPOINTS } from '#shared/contracts/index.js';

const spec = { id: 'one', method: 'GET', path: '/api/one', summary: 'One', access: anybody } as const;

describe('an endpoint', () => {
  it('answers 200 with an answer or a file, 204 without, unless it says otherwise', () => {
    expect(defineEndpoint({ ...spec, response: z.string() }).status).toBe(200);
    expect(defineEndpoint({ ...spec, fileType: 'text/csv' }).status).toBe(200);
    expect(defineEndpoint(spec).status).toBe(204);
    expect(defineEndpoint({ ...spec, response: z.string(), status: 201 }).status).toBe(201);
  });

  it('fills its path with encoded parameters', () => {
    expect(fillPath('/api/a/:oneId/b/:number', { oneId: 'x/y z', number: 'ŋ' })).toBe(
      '/api/a/x%2Fy%20z/b/%C5%8B',
    );
  });

  it('says who may call it', () => {
    expect(signedIn).toEqual({ kind: 'signed-in' });
    expect(member('place', 'officer', 'elder')).toEqual({
      kind: 'member',
      scope: 'place',
      roles: ['officer', 'elder'],
    });
  });
});

describe('the table of endpoints', () => {
  it('has no id and no method with path twice', () => {
    const ids = ENDPOINTS.map(({ id }) => id);
    const routes = ENDPOINTS.map(({ method, path }) => `${method} ${path}`);
    expect(new Set(ids).size).toBe(ids.length);
    expect(new Set(routes).size).toBe(routes.length);
  });

  it('names in every path of members the thing by which their community is found', () => {
    for (const { id, path, access } of ENDPOINTS) {
      if (access.kind !== 'member') continue;
      expect([id, path.includes(`:${access.scope}Id`)]).toEqual([id, true]);
      expect(access.roles.length).toBeGreaterThan(0);
    }
  });

  it('changes nothing by reading: a GET has no body', () => {
    expect(ENDPOINTS.filter(({ method, body }) => method === 'GET' && body !== undefined)).toEqual([]);
  });
});
