import { z } from 'zod';
import { anybody, defineEndpoint } from './endpoint.js';

export const health = z.strictObject({
  status: z.enum(['ok', 'database-unreachable']),
  productVersion: z.string(),
  engineVersion: z.string(),
});
export type Health = z.infer<typeof health>;

export const healthEndpoints = {
  read: defineEndpoint({
    id: 'readHealth',
    method: 'GET',
    path: '/api/health',
    summary: 'Tells whether the database answers, and the versions of product and engine',
    access: anybody,
    response: health,
  }),
  openapi: defineEndpoint({
    id: 'readOpenApi',
    method: 'GET',
    path: '/api/openapi.json',
    summary: 'This description as OpenAPI 3.1',
    access: anybody,
    response: z.record(z.string(), z.unknown()),
  }),
} as const;
