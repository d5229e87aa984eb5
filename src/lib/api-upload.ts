import type { Endpoint } from '#shared/contracts/endpoint.js';
import { WRITE_KEY_HEADER } from '#shared/contracts/write-key.js';
import { apiUrl, renewCsrfToken, type CallInput, type CallResult } from './api-client.js';
import { ApiProblem, readProblem } from './api-problem.js';
import { csrfToken } from './csrf.js';

export type UploadInput<E extends Endpoint> = CallInput<E> & {
  file: Blob;
  /** How many bytes have left, of how many. */
  onProgress?: ((sentBytes: number, ofBytes: number) => void) | undefined;
};

interface LooseInput {
  body?: unknown;
  writeKey?: string | undefined;
  file: Blob;
  onProgress?: ((sentBytes: number, ofBytes: number) => void) | undefined;
  signal?: AbortSignal | undefined;
}

/**
 * Sends a file to an endpoint that takes one. `fetch` cannot say how far it is, so this goes by XMLHttpRequest.
 * @throws {ApiProblem} for every refusal and a missing network; an aborted sending rejects with the AbortError
 *   that `signal` carries.
 */
export async function uploadToApi<E extends Endpoint>(
  endpoint: E,
  input: UploadInput<E>,
): Promise<CallResult<E>> {
  const address = apiUrl(endpoint, input as never);
  let response = await send(address, input, csrfToken() ?? (await renewCsrfToken()));
  if (!response.ok) {
    const problem = await readProblem(response.clone());
    // A token dies with its session: take the present one and try once more.
    if (problem.slug !== 'csrf-token') throw problem;
    response = await send(address, input, await renewCsrfToken());
    if (!response.ok) throw await readProblem(response);
  }
  const parsed = endpoint.response?.safeParse(await response.json().catch(() => undefined));
  if (parsed?.success === true) return parsed.data as CallResult<E>;
  throw new ApiProblem({
    slug: 'unreadable',
    status: response.status,
    detail: `${endpoint.id} answered in another shape`,
  });
}

function send(
  address: string,
  { body, writeKey, file, onProgress, signal }: LooseInput,
  token: string,
): Promise<Response> {
  return new Promise((resolve, reject) => {
    const form = new FormData();
    // The words first: they are read before the file has come.
    form.append('meta', JSON.stringify(body));
    form.append('file', file);
    const request = new XMLHttpRequest();
    const abort = () => {
      request.abort();
    };
    const offline = () => {
      reject(new ApiProblem({ slug: 'offline', status: 0, detail: 'The server could not be reached' }));
    };
    request.open('POST', address);
    request.setRequestHeader('Accept', 'application/json');
    request.setRequestHeader('X-CSRF-Token', token);
    if (writeKey !== undefined) request.setRequestHeader(WRITE_KEY_HEADER, writeKey);
    request.upload.addEventListener('progress', ({ loaded, total }) => onProgress?.(loaded, total));
    request.addEventListener('load', () => {
      const type = request.getResponseHeader('Content-Type') ?? '';
      resolve(
        new Response(request.responseText, { status: request.status, headers: { 'Content-Type': type } }),
      );
    });
    request.addEventListener('error', offline);
    request.addEventListener('timeout', offline);
    request.addEventListener('abort', () => {
      reject(signal?.reason instanceof Error ? signal.reason : new DOMException('Stopped', 'AbortError'));
    });
    request.addEventListener('loadend', () => signal?.removeEventListener('abort', abort));
    if (signal?.aborted === true) {
      reject(signal.reason instanceof Error ? signal.reason : new DOMException('Stopped', 'AbortError'));
      return;
    }
    signal?.addEventListener('abort', abort);
    request.send(form);
  });
}
