import { readdirSync } from 'node:fs';
import type { Server } from 'node:http';
import { connect, type AddressInfo, type Socket } from 'node:net';
import path from 'node:path';
import sharp from 'sharp';
import type { Response } from 'supertest';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { AttachmentPartEntity } from '#server/db/entities/attachment-part.entity.js';
import type { Attachment } from '#shared/contracts/attachments.js';
import { openTestApi, type Client, type TestApi } from '#tests/support/api.js';
import { addPicture, addRecording, attachmentInput, attachmentsPath } from '#tests/support/attachment-api.js';
import { addFigure } from '#tests/support/figure-api.js';
import { photoWithPlace, webm } from '#tests/support/media.js';

let api: TestApi;
let officer: Client;
let elder: Client;
let figureId: string;
let voice: Attachment;
let sound: Buffer;
beforeAll(async () => {
  api = await openTestApi();
  [officer, elder] = await Promise.all([api.signIn('officer'), api.signIn('elder')]);
  figureId = (await addFigure(officer)).id;
  voice = await addRecording(elder, figureId, { sharingLevel: 'village' }, ['a voice']);
  sound = webm({ note: 'a voice' });
});
afterAll(() => api.close());

const waitingFiles = () => readdirSync(path.join(api.dataDir, 'waiting'));
const part = (client = officer) => client.get(`/api/attachments/${voice.id}/parts/1`).responseType('blob');
const bytesOf = (answer: Response) => answer.body as Buffer;

describe('a kept file', () => {
  it('comes whole, with its own type, and may be kept nowhere and run nothing', async () => {
    const answer = await part().expect(200);
    expect(bytesOf(answer).equals(sound)).toBe(true);
    expect(answer.headers).toMatchObject({
      'content-type': 'audio/webm',
      'content-length': String(sound.length),
      'accept-ranges': 'bytes',
      'cache-control': 'private, no-store',
      'x-content-type-options': 'nosniff',
      'content-security-policy': "default-src 'none'; sandbox",
      'cross-origin-resource-policy': 'same-origin',
    });
    expect(answer.headers['content-disposition']).toMatch(
      /^inline; filename="Why_the_bowl_is_empty-1\.webm"/u,
    );
  });

  it.each([
    ['bytes=0-3', 0, 3],
    ['bytes=10-', 10, undefined],
    ['bytes=-5', -5, undefined],
    ['bytes=2-99999', 2, undefined],
  ])('comes in part: %s', async (range, start, last) => {
    const answer = await part().set('Range', range).expect(206);
    const wanted = sound.subarray(start, last === undefined ? undefined : last + 1);
    expect(bytesOf(answer).equals(wanted)).toBe(true);
    const first = start < 0 ? sound.length + start : start;
    expect(answer.headers['content-range']).toBe(
      `bytes ${first}-${first + wanted.length - 1}/${sound.length}`,
    );
  });

  it('has nothing beyond its end', async () => {
    const answer = await part().set('Range', `bytes=${sound.length}-`).expect(416);
    expect(answer.headers['content-range']).toBe(`bytes */${sound.length}`);
  });

  it.each(['bytes=0-1,4-5', 'pages=1-2', 'bytes=x-y'])('comes whole for %s', async (range) => {
    expect(bytesOf(await part().set('Range', range).expect(200)).equals(sound)).toBe(true);
  });

  it('is described without its bytes', async () => {
    const { headers } = await part().expect(200);
    const agent = await api.signIn('observer');
    const answer = await agent.head(`/api/attachments/${voice.id}/parts/1`).expect(200);
    expect(answer.body).toEqual({});
    expect([answer.headers['content-length'], answer.headers['etag']]).toEqual([
      headers['content-length'],
      headers['etag'],
    ]);
  });

  it('goes on from the same state only', async () => {
    const etag = String((await part().expect(200)).headers['etag']);
    await part().set('Range', 'bytes=0-1').set('If-Range', etag).expect(206);
    await part().set('Range', 'bytes=0-1').set('If-Range', '"older"').expect(200);
    await part().set('If-None-Match', etag).expect(304);
  });

  it.each(['parts/7', 'parts/-1', 'parts/99', 'parts/x', 'thumbnail'])('is not there as %s', async (way) => {
    expect((await officer.get(`/api/attachments/${voice.id}/${way}`)).status).toBe(404);
  });

  it('that the store has lost is not there', async () => {
    const lost = await addRecording(elder, figureId, { sharingLevel: 'village' });
    const row = await api.dataSource
      .getRepository(AttachmentPartEntity)
      .findOneByOrFail({ attachmentId: lost.id, part: 1 });
    await api.storage.remove(row.storageKey);
    const answer = await officer.get(`/api/attachments/${lost.id}/parts/1`);
    expect([answer.status, answer.headers['content-type']]).toEqual([
      404,
      'application/problem+json; charset=utf-8',
    ]);
  });
});

describe('a photo', () => {
  it('is served without the place and the device that the sent file named', async () => {
    const photo = await photoWithPlace();
    expect(photo.toString('latin1')).toContain('Telltale');
    const input = attachmentInput({ subjectId: figureId });
    const { id } = (await officer.upload(attachmentsPath(officer), input, photo).expect(201))
      .body as Attachment;
    for (const way of ['parts/1', 'thumbnail']) {
      const answer = await elder.get(`/api/attachments/${id}/${way}`).responseType('blob').expect(200);
      const { exif, format, width, height } = await sharp(bytesOf(answer)).metadata();
      expect({ exif, format, width, height }).toEqual({ format: 'jpeg', width: 40, height: 60 });
      expect(bytesOf(answer).toString('latin1')).not.toMatch(/Telltale|Exif|GPS/u);
    }
  });

  it('in another village is not there', async () => {
    const { id } = await addPicture(officer, figureId);
    const stranger = await api.signIn('officer2');
    expect((await stranger.get(`/api/attachments/${id}/thumbnail`)).status).toBe(404);
  });
});

describe('sending', () => {
  let server: Server;
  let port: number;
  beforeAll(async () => {
    server = api.app.express.listen(0, '127.0.0.1');
    await new Promise((resolve) => server.once('listening', resolve));
    ({ port } = server.address() as AddressInfo);
  });
  afterAll(
    () =>
      new Promise<void>((resolve) => {
        server.close(() => {
          resolve();
        });
        server.closeAllConnections();
      }),
  );

  const BOUNDARY = 'here-ends-a-part';
  /** Announces ten million bytes and sends a few: whoever answers has not waited for the rest. */
  async function begin(headers: Record<string, string>): Promise<Socket> {
    const socket = connect(port, '127.0.0.1');
    const lines = [
      `POST ${attachmentsPath(officer)} HTTP/1.1`,
      'Host: 127.0.0.1',
      `Content-Type: multipart/form-data; boundary=${BOUNDARY}`,
      'Content-Length: 10000000',
      ...Object.entries(headers).map(([name, value]) => `${name}: ${value}`),
      '',
      `--${BOUNDARY}\r\nContent-Disposition: form-data; name="meta"\r\n`,
      JSON.stringify(attachmentInput({ subjectId: figureId })),
      `--${BOUNDARY}\r\nContent-Disposition: form-data; name="file"; filename="a.png"\r\n`,
      'the first bytes',
    ];
    await new Promise((resolve) => socket.write(lines.join('\r\n'), resolve));
    return socket;
  }
  const statusOf = async (socket: Socket) => {
    const [head] = await new Promise<Buffer[]>((resolve) => {
      socket.once('data', (data: Buffer) => {
        resolve([data]);
      });
    });
    socket.destroy();
    return head?.toString('latin1').split('\r\n')[0];
  };

  it('without the session’s token is refused before the file has come', async () => {
    const socket = await begin({ Cookie: officer.cookie });
    expect(await statusOf(socket)).toBe('HTTP/1.1 403 Forbidden');
  });

  it('by somebody whom the village does not know is refused before the file has come', async () => {
    const stranger = await api.signIn('officer2');
    const socket = await begin({ Cookie: stranger.cookie, 'X-CSRF-Token': stranger.session.csrfToken });
    expect(await statusOf(socket)).toBe('HTTP/1.1 404 Not Found');
    expect(waitingFiles()).toEqual([]);
  });

  it('that is cut leaves nothing behind, and can be tried again', async () => {
    const socket = await begin({ Cookie: officer.cookie, 'X-CSRF-Token': officer.session.csrfToken });
    await expect.poll(waitingFiles).toHaveLength(1);
    socket.destroy();
    await expect.poll(waitingFiles).toHaveLength(0);
    await addPicture(officer, figureId);
  });

  it('as anything but a form with a file is refused', async () => {
    const answer = await officer.post(attachmentsPath(officer), attachmentInput({ subjectId: figureId }));
    expect(answer.status).toBe(415);
  });

  it('with more than one file, or fields that nobody asked for, is refused', async () => {
    const input = attachmentInput({ subjectId: figureId });
    const photo = await photoWithPlace();
    const two = await officer.upload(attachmentsPath(officer), input, photo).attach('file', photo, 'b.jpg');
    const more = await officer.upload(attachmentsPath(officer), input, photo).field('more', '1');
    expect([two.status, more.status, waitingFiles()]).toEqual([400, 400, []]);
  });
});
