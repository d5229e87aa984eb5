import type { z } from 'zod';
import type { Role } from './people.js';

/**
 * Who may call an endpoint. `public`: anybody; `signed-in`: any person; otherwise a member of the community that
 * the path names (by its own id, or through the place, calendar or attachment in the path) who holds one of `roles`.
 * A stranger to the community gets 404, a member without the role 403.
 */
export type Access =
  { kind: 'public' } | { kind: 'signed-in' } | { kind: 'member'; scope: MemberScope; roles: readonly Role[] };

export type MemberScope = 'community' | 'place' | 'calendar' | 'attachment';

/** A call that brings a file: multipart, the input as JSON in the field `meta`, then the file in the field `file`. */
export interface Upload {
  maxBytes: number;
}

export type HttpMethod = 'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE';

type Schema = z.ZodType;

/** One operation of the API: the server mounts it, the client calls it, OpenAPI and the permission table list it. */
export interface Endpoint<
  P extends Schema | undefined = Schema | undefined,
  Q extends Schema | undefined = Schema | undefined,
  B extends Schema | undefined = Schema | undefined,
  R extends Schema | undefined = Schema | undefined,
> {
  id: string;
  method: HttpMethod;
  /** Express-style path below the origin, e.g. `/api/places/:placeId`. */
  path: string;
  summary: string;
  access: Access;
  params: P;
  query: Q;
  body: B;
  /** JSON answer; undefined for 204 or for a file. */
  response: R;
  status: number;
  /** Content type of an answer that is not JSON. */
  fileType: string | null;
  /** Null where no file comes with the call. */
  upload: Upload | null;
  /** True where a session that a card opened is too weak. */
  needsPassword: boolean;
  /** True where whoever helps somebody, with their PIN, reads what that person would. */
  readAsHelped: boolean;
  /** True where the same write that comes again with its key counts once. */
  countsOnce: boolean;
}

interface EndpointSpec<
  P extends Schema | undefined,
  Q extends Schema | undefined,
  B extends Schema | undefined,
  R extends Schema | undefined,
> {
  id: string;
  method: HttpMethod;
  path: string;
  summary: string;
  access: Access;
  params?: P;
  query?: Q;
  body?: B;
  response?: R;
  status?: number;
  fileType?: string;
  upload?: Upload;
  needsPassword?: boolean;
  readAsHelped?: boolean;
  countsOnce?: boolean;
}

/** Fills the defaults: status 200 with an answer, 204 without one. */
export function defineEndpoint<
  P extends Schema | undefined = undefined,
  Q extends Schema | undefined = undefined,
  B extends Schema | undefined = undefined,
  R extends Schema | undefined = undefined,
>(spec: EndpointSpec<P, Q, B, R>): Endpoint<P, Q, B, R> {
  const fileType = spec.fileType ?? null;
  return {
    id: spec.id,
    method: spec.method,
    path: spec.path,
    summary: spec.summary,
    access: spec.access,
    params: spec.params as P,
    query: spec.query as Q,
    body: spec.body as B,
    response: spec.response as R,
    status: spec.status ?? (spec.response === undefined && fileType === null ? 204 : 200),
    fileType,
    upload: spec.upload ?? null,
    needsPassword: spec.needsPassword ?? false,
    readAsHelped: spec.readAsHelped ?? false,
    countsOnce: spec.countsOnce ?? false,
  };
}

export const anybody: Access = { kind: 'public' };
export const signedIn: Access = { kind: 'signed-in' };

export function member(scope: MemberScope, ...roles: Role[]): Access {
  return { kind: 'member', scope, roles };
}

/** Path with its parameters filled in, each percent-encoded. */
export function fillPath(path: string, params: Readonly<Record<string, string>>): string {
  return path.replace(/:([A-Za-z]+)/g, (_, name: string) => encodeURIComponent(params[name] ?? ''));
}
