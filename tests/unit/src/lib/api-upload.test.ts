import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { attachmentsEndpoints } from '#shared/contracts/attachments.js';
import { ApiProblem } from '#src/lib/api-problem.js';
import { uploadToApi } from '#src/lib/api-upload.js';
import { keepCsrfToken } from '#src/lib/csrf.js';
import { answerWith, refusal } from '#tests/support/answers.js';
import { attachmentInput } from '#tests/support/attachment-api.js';
import { attachmentOf } from '#tests/support/attachment-on-board.js';

type Outcome = { status: number; body: unknown; type?: string } | 'offline' | 'never';

/** A request that ends as the test says. */
class FakeRequest extends EventTarget {
  static outcomes: Outcome[] = [];
  static sent: { address: string; token: string; form: FormData }[] = [];
  upload = new EventTarget();
  status = 0;
  responseText = '';
  private type = '';
  private address = '';
  private token = '';

  open(_method: string, address: string): void {
    this.address = address;
  }
  setRequestHeader(name: string, value: string): void {
    if (name === 'X-CSRF-Token') this.token = value;
  }
  getResponseHeader(): string {
    return this.type;
  }
  send(form: FormData): void {
    FakeRequest.sent.push({ address: this.address, token: this.token, form });
    this.upload.dispatchEvent(Object.assign(new Event('progress'), { loaded: 5, total: 10 }));
    const outcome = FakeRequest.outcomes.shift() ?? 'never';
    if (outcome === 'never') return;
    if (outcome === 'offline') {
      this.dispatchEvent(new Event('error'));
      return;
    }
    this.status = outcome.status;
    this.type = outcome.type ?? 'application/json';
    this.responseText = JSON.stringify(outcome.body);
    this.dispatchEvent(new Event('load'));
  }
  abort(): void {
    this.dispatchEvent(new Event('abort'));
  }
}

const KEPT = { status: 201, body: attachmentOf() };
const file = new Blob(['a picture']);
const communityId = '0190a3a0-0000-7000-8000-0000000000a1';
const body = attachmentInput({ subjectId: '0190a3a0-0000-7000-8000-0000000000f1' });
const send = (more: { signal?: AbortSignal; onProgress?: () => void } = {}) =>
  uploadToApi(attachmentsEndpoints.create, { params: { communityId }, body, file, ...more });

async function problemOf(slug: string, status: number): Promise<Outcome> {
  return { status, type: 'application/problem+json', body: await refusal(slug, status).json() };
}

beforeEach(() => {
  FakeRequest.sent = [];
  FakeRequest.outcomes = [];
  vi.stubGlobal('XMLHttpRequest', FakeRequest);
  keepCsrfToken('present');
});
afterEach(() => {
  vi.unstubAllGlobals();
});

describe('sending a file', () => {
  it('sends the words before the file, with the session’s token, and tells how far it is', async () => {
    FakeRequest.outcomes = [KEPT];
    const onProgress = vi.fn();
    await expect(send({ onProgress })).resolves.toEqual(KEPT.body);
    const [sent] = FakeRequest.sent;
    expect([...(sent?.form.keys() ?? [])]).toEqual(['meta', 'file']);
    expect(sent?.form.get('meta')).toBe(JSON.stringify(body));
    expect([sent?.address, sent?.token]).toEqual([`/api/communities/${communityId}/attachments`, 'present']);
    expect(onProgress).toHaveBeenCalledWith(5, 10);
  });

  it('takes a new token once when the one it had has died', async () => {
    answerWith({ 'GET /api/session': { person: null, memberships: null, card: null, csrfToken: 'new' } });
    FakeRequest.outcomes = [await problemOf('csrf-token', 403), KEPT];
    await expect(send()).resolves.toEqual(KEPT.body);
    expect(FakeRequest.sent.map(({ token }) => token)).toEqual(['present', 'new']);
  });

  it('throws what the server refuses, and a missing network, as a problem', async () => {
    FakeRequest.outcomes = [await problemOf('too-large', 413), 'offline', { status: 201, body: 'nonsense' }];
    const slugs: unknown[] = [];
    for (let turn = 0; turn < 3; turn += 1) {
      slugs.push(await send().catch((cause: unknown) => (cause instanceof ApiProblem ? cause.slug : cause)));
    }
    expect(slugs).toEqual(['too-large', 'offline', 'unreadable']);
  });

  it('can be stopped, before and while it is on its way', async () => {
    const controller = new AbortController();
    const sending = send({ signal: controller.signal });
    controller.abort();
    await expect(sending).rejects.toMatchObject({ name: 'AbortError' });
    await expect(send({ signal: controller.signal })).rejects.toMatchObject({ name: 'AbortError' });
    expect(FakeRequest.sent).toHaveLength(1);
  });
});
