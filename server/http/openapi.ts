import type { Endpoint } from '#shared/contracts/endpoint.js';
import { ENDPOINTS } from '#shared/contracts/index.js';
import { problem } from '#shared/contracts/problem.js';
import { WRITE_KEY, WRITE_KEY_HEADER } from '#shared/contracts/write-key.js';
import { z } from 'zod';

type Json = Record<string, unknown>;

/** OpenAPI 3.1 from the contracts: the same schemas that check every request and every answer. */
export function openApiDocument(productVersion: string): Json {
  const paths: Record<string, Json> = {};
  for (const endpoint of ENDPOINTS) {
    const path = endpoint.path.replace(/:([A-Za-z]+)/gu, '{$1}');
    (paths[path] ??= {})[endpoint.method.toLowerCase()] = operation(endpoint);
  }
  return {
    openapi: '3.1.0',
    info: {
      title: 'Dawnpeg',
      version: productVersion,
      description: 'Seasonal calendars tied to stars that can really be seen from the place.',
      license: { name: 'MIT', identifier: 'MIT' },
    },
    paths,
    components: {
      schemas: { Problem: schemaOf(problem, 'output') },
      securitySchemes: { session: { type: 'apiKey', in: 'cookie', name: 'dawnpeg.session' } },
    },
  };
}

function operation(endpoint: Endpoint): Json {
  return {
    operationId: endpoint.id,
    summary: endpoint.summary,
    ...(endpoint.access.kind === 'public' ? {} : { security: [{ session: [] }] }),
    ...(endpoint.access.kind === 'member' ? { 'x-roles': endpoint.access.roles } : {}),
    parameters: [
      ...parametersOf(endpoint.params, 'path'),
      ...parametersOf(endpoint.query, 'query'),
      ...csrf(endpoint),
      ...writeKey(endpoint),
    ],
    ...(endpoint.body
      ? { requestBody: { required: true, content: contentOf(endpoint, endpoint.body) } }
      : {}),
    responses: { [String(endpoint.status)]: success(endpoint), default: refusal },
  };
}

function contentOf({ upload }: Endpoint, body: z.ZodType): Json {
  const schema = schemaOf(body, 'input');
  if (upload === null) return { 'application/json': { schema } };
  const file = { type: 'string', format: 'binary', maxLength: upload.maxBytes };
  return {
    'multipart/form-data': {
      schema: { type: 'object', required: ['meta', 'file'], properties: { meta: schema, file } },
    },
  };
}

const refusal: Json = {
  description: 'Refused, with the reason (RFC 9457)',
  content: { 'application/problem+json': { schema: { $ref: '#/components/schemas/Problem' } } },
};

function success(endpoint: Endpoint): Json {
  if (endpoint.fileType !== null) return { description: 'The file', content: { [endpoint.fileType]: {} } };
  if (endpoint.response === undefined) return { description: 'Done' };
  return {
    description: 'Answer',
    content: { 'application/json': { schema: schemaOf(endpoint.response, 'output') } },
  };
}

function parametersOf(schema: z.ZodType | undefined, place: 'path' | 'query'): Json[] {
  if (schema === undefined) return [];
  const { properties = {}, required = [] } = schemaOf(schema, 'input') as {
    properties?: Record<string, Json>;
    required?: string[];
  };
  return Object.entries(properties).map(([name, property]) => ({
    name,
    in: place,
    required: place === 'path' || required.includes(name),
    schema: property,
  }));
}

function csrf(endpoint: Endpoint): Json[] {
  if (endpoint.method === 'GET') return [];
  return [{ name: 'X-CSRF-Token', in: 'header', required: true, schema: { type: 'string' } }];
}

function writeKey({ countsOnce }: Endpoint): Json[] {
  if (!countsOnce) return [];
  const schema = { type: 'string', pattern: WRITE_KEY.source };
  return [{ name: WRITE_KEY_HEADER, in: 'header', required: false, schema }];
}

function schemaOf(schema: z.ZodType, io: 'input' | 'output'): Json {
  const { $schema: _dialect, ...rest } = z.toJSONSchema(schema, { io, unrepresentable: 'any' }) as Json;
  return rest;
}
