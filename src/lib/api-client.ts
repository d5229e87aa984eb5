import type { z } from 'zod';
import { fillPath, type Endpoint } from '#shared/contracts/endpoint.js';
import { WRITE_KEY_HEADER } from '#shared/contracts/write-key.js';
import { ELDER_PIN_HEADER } from '#shared/contracts/on-behalf.js';
import { sessionState } from '#shared/contracts/session.js';
import { ApiProblem, readProblem } from './api-problem.js';
import { csrfToken, keepCsrfToken } from './csrf.js';
import { askElderPin } from './elder-pin.js';

type Part<K extends string, S> = S extends z.ZodType ? Record<K, z.input<S>> : object;

/** What a call needs: `params`, `query` and `body` exactly where the endpoint declares them. */
export type CallInput<E extends Endpoint> = Part<'params', E['params']> &
  Part<'query', E['query']> &
  Part<'body', E['body']> & {
    signal?: AbortSignal | undefined;
    /** Where the endpoint counts a write once: sent again with the same key, it is the same write. */
    writeKey?: string | undefined;
  };

export type CallResult<E extends Endpoint> = E['response'] extends z.ZodType
  ? z.output<E['response']>
  : undefined;

interface LooseInput {
  params?: Record<string, unknown>;
  query?: Record<string, unknown>;
  body?: unknown;
  signal?: AbortSignal | undefined;
  writeKey?: string | undefined;
}

/**
 * Calls one endpoint of the API and parses its answer with the endpoint's own schema.
 * @throws {ApiProblem} for every refusal, a missing network and an answer that does not fit the schema;
 *   an aborted call rejects with the AbortError that `signal` carries.
 */
export async function callApi<E extends Endpoint>(endpoint: E, input: CallInput<E>): Promise<CallResult<E>> {
  const response = await send(endpoint, input as LooseInput, true);
  if (endpoint.response === undefined) return undefined as CallResult<E>;
  const parsed = endpoint.response.safeParse(await response.json().catch(() => undefined));
  if (parsed.success) return parsed.data as CallResult<E>;
  throw new ApiProblem({
    slug: 'unreadable',
    status: response.status,
    detail: `${endpoint.id} answered in another shape: ${parsed.error.message}`,
  });
}

/** The same for an endpoint that answers with a file. */
export async function callApiForFile<E extends Endpoint>(endpoint: E, input: CallInput<E>): Promise<Blob> {
  return (await send(endpoint, input as LooseInput, true)).blob();
}

/** Address of an endpoint with its parameters filled in: for links to files. */
export function apiUrl<E extends Endpoint>(
  endpoint: E,
  input: Part<'params', E['params']> & Part<'query', E['query']>,
): string {
  const { params, query } = input as LooseInput;
  const path = fillPath(endpoint.path, textValues(params));
  const search = new URLSearchParams(textValues(query)).toString();
  return search === '' ? path : `${path}?${search}`;
}

async function send(
  endpoint: Endpoint,
  input: LooseInput,
  mayRenew: boolean,
  elderPin: string | null = null,
): Promise<Response> {
  const headers = new Headers({ Accept: 'application/json' });
  const init: RequestInit = { method: endpoint.method, headers, credentials: 'same-origin' };
  if (input.signal) init.signal = input.signal;
  if (endpoint.method !== 'GET') headers.set('X-CSRF-Token', csrfToken() ?? (await renewCsrfToken()));
  if (input.writeKey !== undefined) headers.set(WRITE_KEY_HEADER, input.writeKey);
  if (elderPin !== null) headers.set(ELDER_PIN_HEADER, elderPin);
  if (endpoint.body !== undefined) {
    headers.set('Content-Type', 'application/json');
    init.body = JSON.stringify(input.body);
  }
  const response = await fetchOrOffline(apiUrl(endpoint, input as never), init);
  if (response.ok) return response;
  const problem = await readProblem(response);
  // A token dies with its session (signed out elsewhere, a restart): take the present one and try once more.
  if (problem.slug === 'csrf-token' && mayRenew) {
    await renewCsrfToken();
    return send(endpoint, input, false, elderPin);
  }
  // What a helped person agrees to is proved by them: they are asked here, whichever screen it is.
  if (problem.reason === 'proof-needed' && elderPin === null) {
    const pin = await askElderPin();
    if (pin !== null) return send(endpoint, input, mayRenew, pin);
  }
  throw problem;
}

export async function renewCsrfToken(): Promise<string> {
  const response = await fetchOrOffline('/api/session', { headers: { Accept: 'application/json' } });
  if (!response.ok) throw await readProblem(response);
  const state = sessionState.parse(await response.json());
  keepCsrfToken(state.csrfToken);
  return state.csrfToken;
}

async function fetchOrOffline(url: string, init: RequestInit): Promise<Response> {
  try {
    return await fetch(url, init);
  } catch (cause) {
    if (init.signal?.aborted === true) throw cause;
    throw new ApiProblem({ slug: 'offline', status: 0, detail: 'The server could not be reached' });
  }
}

function textValues(values: Record<string, unknown> | undefined): Record<string, string> {
  return Object.fromEntries(
    Object.entries(values ?? {})
      .filter(([, value]) => value !== undefined && value !== null)
      .map(([key, value]) => [key, String(value)]),
  );
}
