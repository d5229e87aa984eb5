import { fillPath, type Endpoint } from '#shared/contracts/endpoint.js';
import { ENDPOINTS } from '#shared/contracts/index.js';
import type { Client } from './api.js';
import { bytesOf } from './bytes-of.js';
import { readPdfText } from './pdf/read-text.js';

/** What stands for the parameters of paths, and queries to try, by endpoint. */
export interface Askable {
  params: Record<string, readonly string[]>;
  queries: Record<string, readonly string[]>;
  /** Parameters that belong together, where a path names them all. */
  pairs?: readonly Record<string, string>[];
  /** Values of parameters for one endpoint alone. */
  only?: Record<string, Record<string, readonly string[]>>;
}

export const READING = ENDPOINTS.filter(({ method }) => method === 'GET');

/** An answer as text, whatever it is: a PDF as another program reads it. */
export async function textOf(
  client: Client,
  path: string,
  { fileType }: Pick<Endpoint, 'fileType'>,
): Promise<string> {
  if (fileType === 'text/calendar') {
    // Long lines go on in the next one behind a space.
    return (await client.get(path)).text.replaceAll('\r\n ', '');
  }
  if (fileType === 'application/zip') return (await bytesOf(client, path)).toString('latin1');
  if (fileType !== 'application/pdf') {
    const { text, body } = (await client.get(path)) as { text: string; body: unknown };
    return Buffer.isBuffer(body) ? body.toString('latin1') : text;
  }
  const file = await bytesOf(client, path);
  return file.subarray(0, 5).toString() === '%PDF-' ? readPdfText(file) : file.toString();
}

/** A list with all its pages; anything else as it is. */
export async function wholeTextOf(client: Client, path: string, endpoint: Endpoint): Promise<string> {
  let text = await textOf(client, path, endpoint);
  for (let next = nextCursorOf(text); next !== null;) {
    const more = `${path}${path.includes('?') ? '&' : '?'}cursor=${encodeURIComponent(next)}`;
    const page = await textOf(client, more, endpoint);
    text += page;
    next = nextCursorOf(page);
  }
  return text;
}

export function isRefusal(text: string): boolean {
  return text.startsWith('{"type":"/problems/');
}

function nextCursorOf(text: string): string | null {
  return /"nextCursor":"([^"]+)"/u.exec(text)?.[1] ?? null;
}

/** Every path of the endpoint that names something of the village. */
export function pathsOf(endpoint: Endpoint, village: Askable): string[] {
  const values = village.params;
  const names = [...endpoint.path.matchAll(/:([A-Za-z]+)/gu)].map(([, name = '']) => name);
  const pairs = (village.pairs ?? []).filter((pair) =>
    Object.keys(pair).every((name) => names.includes(name)),
  );
  let filled: Record<string, string>[] = pairs.length > 0 ? [...pairs] : [{}];
  for (const name of names) {
    if (filled[0] !== undefined && name in filled[0]) continue;
    const list = village.only?.[endpoint.id]?.[name] ?? values[name];
    if (!list) throw new Error(`Say in levelled-village.ts what stands for :${name} of ${endpoint.id}.`);
    filled = filled.flatMap((params) => list.map((value) => ({ ...params, [name]: value })));
  }
  const queries = village.queries[endpoint.id] ?? [''];
  return filled.flatMap((params) => queries.map((query) => fillPath(endpoint.path, params) + query));
}
