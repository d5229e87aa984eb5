import type { Server } from 'node:http';
import { connect, type AddressInfo, type Socket } from 'node:net';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { openServer, SERVER_TIMES } from '#server/http/timeouts.js';
import { openTestApi, type Client, type TestApi } from '#tests/support/api.js';

/** Connections that send a letter now and then, to keep the server busy with waiting. */
const SHORT = { headersMs: 80, bodyMs: 120, uploadMs: 400, checkEveryMs: 20 };
let api: TestApi;
let officer: Client;
let server: Server;
beforeAll(async () => {
  api = await openTestApi();
  officer = await api.signIn('officer');
  server = openServer(api.app.express, SHORT);
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
});
afterAll(async () => {
  server.closeAllConnections();
  await new Promise((resolve) => server.close(resolve));
  await api.close();
});

/** Everything that came until the server hung up. */
async function sendAndWait(text: string): Promise<string> {
  const socket: Socket = connect((server.address() as AddressInfo).port, '127.0.0.1');
  const parts: Buffer[] = [];
  socket.on('data', (part: Buffer) => parts.push(part));
  socket.on('error', () => undefined);
  socket.write(text);
  await new Promise((resolve) => socket.once('close', resolve));
  return Buffer.concat(parts).toString();
}

const head = (...lines: string[]) => ['POST /api/session HTTP/1.1', 'Host: 127.0.0.1', ...lines].join('\r\n');

describe('a connection that never ends its request', () => {
  it('is closed while it still sends its head', async () => {
    expect(await sendAndWait(head('X-Slow: '))).toMatch(/^HTTP\/1\.1 408|^$/u);
  });

  it('is closed while it still sends its words, signed in or not', async () => {
    const body = ['Content-Type: application/json', 'Content-Length: 500', '', '{"email":'];
    expect(await sendAndWait(head(...body))).not.toMatch(/^HTTP\/1\.1 2/u);
    const signed = [`Cookie: ${officer.cookie}`, `X-CSRF-Token: ${officer.session.csrfToken}`, ...body];
    expect(await sendAndWait(head(...signed))).not.toMatch(/^HTTP\/1\.1 2/u);
  });

  it('is closed after a refusal, when it only pretends to send a file', async () => {
    const file = ['Content-Type: multipart/form-data; boundary=b', 'Content-Length: 9000000', '', '--b'];
    expect(await sendAndWait(head(...file))).toMatch(/^HTTP\/1\.1 403/u);
  });

  it('is held up by nothing while others are served', async () => {
    const slow = Array.from({ length: 20 }, () => sendAndWait(head('X-Slow: ')));
    await officer.get('/api/communities').expect(200);
    await Promise.all(slow);
  });
});

it('the times of the product leave a slow network its time and end the rest within minutes', () => {
  expect(SERVER_TIMES.headersMs).toBeLessThanOrEqual(30_000);
  expect(SERVER_TIMES.bodyMs).toBeLessThanOrEqual(120_000);
  expect(SERVER_TIMES.uploadMs).toBeGreaterThanOrEqual(15 * 60_000);
});
