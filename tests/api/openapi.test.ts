import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { z } from 'zod';
import { ENDPOINTS } from '#shared/contracts/index.js';
import { openTestApi, type TestApi } from '#tests/support/api.js';

/** The parts of OpenAPI 3.1 that this document uses, after the specification's own tables of fields. */
const schema = z.record(z.string(), z.unknown());
const media = z.record(z.string(), z.strictObject({ schema: schema.optional() }));
const parameter = z.strictObject({
  name: z.string().min(1),
  in: z.enum(['path', 'query', 'header']),
  required: z.boolean(),
  schema,
});
const operation = z.strictObject({
  operationId: z.string().regex(/^[a-zA-Z]+$/),
  summary: z.string().min(1),
  security: z.array(z.record(z.string(), z.array(z.string()))).optional(),
  'x-roles': z.array(z.string()).optional(),
  parameters: z.array(parameter),
  requestBody: z.strictObject({ required: z.boolean(), content: media }).optional(),
  responses: z.record(
    z.string().regex(/^(\d{3}|default)$/),
    z.strictObject({ description: z.string().min(1), content: media.optional() }),
  ),
});
const openApi = z.strictObject({
  openapi: z.literal('3.1.0'),
  info: z.strictObject({
    title: z.string(),
    version: z.string(),
    description: z.string(),
    license: z.strictObject({ name: z.string(), identifier: z.string() }),
  }),
  paths: z.record(
    z.string().regex(/^\/api\//),
    z.partialRecord(z.enum(['get', 'post', 'put', 'patch', 'delete']), operation),
  ),
  components: z.strictObject({
    schemas: z.record(z.string(), schema),
    securitySchemes: z.record(z.string(), z.record(z.string(), z.string())),
  }),
});

let api: TestApi;
let raw: unknown;
let document: z.infer<typeof openApi>;
beforeAll(async () => {
  api = await openTestApi();
  raw = (await (await api.visitor()).get('/api/openapi.json').expect(200)).body as unknown;
  document = openApi.parse(raw);
});
afterAll(() => api.close());

const operations = () =>
  Object.entries(document.paths).flatMap(([path, methods]) =>
    Object.entries(methods).map(([method, one]) => ({ path, method, ...one })),
  );
const sorted = (ids: readonly string[]) => [...ids].sort();

describe('the routes of the server', () => {
  it('are exactly the endpoints of the contracts, each mounted once', () => {
    expect(sorted(api.app.mountedIds)).toEqual(sorted(ENDPOINTS.map(({ id }) => id)));
  });

  it('are exactly the operations of the OpenAPI document', () => {
    expect(sorted(operations().map(({ operationId }) => operationId))).toEqual(sorted(api.app.mountedIds));
    for (const { id, method, path } of ENDPOINTS) {
      const found = operations().find(({ operationId }) => operationId === id);
      const written = path.replace(/:(\w+)/g, '{$1}');
      expect([found?.method, found?.path]).toEqual([method.toLowerCase(), written]);
    }
  });

  it('are all that Express answers under /api', () => {
    const known = ENDPOINTS.map(({ method, path }) => `${method} ${path}`);
    expect(sorted([...new Set(routesOf(api.app.express))])).toEqual(sorted(known));
  });
});

describe('the OpenAPI document', () => {
  it('has an id of its own for every operation', () => {
    const ids = operations().map(({ operationId }) => operationId);
    expect(new Set(ids).size).toBe(ids.length);
  });

  it('declares every parameter of a path, and none that is not in it', () => {
    for (const { path, parameters, operationId } of operations()) {
      const inPath = sorted([...path.matchAll(/\{(\w+)\}/g)].map(([, name]) => name ?? ''));
      const declared = parameters.filter((one) => one.in === 'path');
      expect([operationId, sorted(declared.map(({ name }) => name))]).toEqual([operationId, inPath]);
      expect(declared.every(({ required }) => required)).toBe(true);
    }
  });

  it('names no parameter of an operation twice', () => {
    for (const { parameters } of operations()) {
      const names = parameters.map((one) => `${one.in} ${one.name}`);
      expect(new Set(names).size).toBe(names.length);
    }
  });

  it('has no reference that leads nowhere', () => {
    const references = [...JSON.stringify(raw).matchAll(/"\$ref":"([^"]+)"/g)].map(
      ([, target]) => target ?? '',
    );
    expect(references.length).toBeGreaterThan(0);
    for (const reference of new Set(references))
      expect([reference, resolves(reference)]).toEqual([reference, true]);
  });

  it('asks for the token on every write and for a sign-in wherever the contracts do', () => {
    for (const { operationId, method, parameters, security } of operations()) {
      const endpoint = ENDPOINTS.find(({ id }) => id === operationId);
      const token = parameters.find(({ name }) => name === 'X-CSRF-Token');
      expect([operationId, token?.required ?? false]).toEqual([operationId, method !== 'get']);
      expect([operationId, security !== undefined]).toEqual([
        operationId,
        endpoint?.access.kind !== 'public',
      ]);
    }
  });

  it('describes every success with its content, and every refusal as a problem', () => {
    for (const { operationId, responses } of operations()) {
      const endpoint = ENDPOINTS.find(({ id }) => id === operationId);
      const success = responses[String(endpoint?.status)];
      const type = endpoint?.fileType ?? (endpoint?.response ? 'application/json' : undefined);
      expect([operationId, Object.keys(success?.content ?? {})]).toEqual([operationId, type ? [type] : []]);
      expect(Object.keys(responses['default']?.content ?? {})).toEqual(['application/problem+json']);
    }
  });

  it('lists in the one shape of lists', () => {
    const lists = operations().filter(({ operationId }) => operationId.startsWith('list'));
    expect(lists.length).toBeGreaterThan(8);
    for (const { operationId, responses } of lists) {
      const answer = responses['200']?.content?.['application/json']?.schema as { required?: string[] };
      expect([
        operationId,
        answer.required?.includes('items'),
        answer.required?.includes('nextCursor'),
      ]).toEqual([operationId, true, true]);
    }
  });
});

function resolves(reference: string): boolean {
  if (!reference.startsWith('#/')) return false;
  let at: unknown = raw;
  for (const part of reference.slice(2).split('/')) {
    if (typeof at !== 'object' || at === null) return false;
    at = (at as Record<string, unknown>)[part.replaceAll('~1', '/').replaceAll('~0', '~')];
  }
  return at !== undefined;
}

interface Layer {
  route?: { path: unknown; stack: { method?: string }[] };
  handle?: { stack?: Layer[] };
}

/** What Express really answers, from its own table: `METHOD /path`, routers within routers included. */
function routesOf(express: unknown): string[] {
  const { stack } = (express as { router: { stack: Layer[] } }).router;
  const walk = (layers: readonly Layer[]): string[] =>
    layers.flatMap(({ route, handle }) => {
      const inner = walk(handle?.stack ?? []);
      if (!route || typeof route.path !== 'string' || !route.path.startsWith('/api')) return inner;
      const methods = new Set(route.stack.map(({ method }) => (method ?? 'all').toUpperCase()));
      return [...inner, ...[...methods].map((method) => `${method} ${String(route.path)}`)];
    });
  return walk(stack);
}
