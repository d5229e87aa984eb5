import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { afterAll, describe, expect, it } from 'vitest';
import { soundTypeOf } from '#server/media/sound-file.js';
import { movie, mp4, ogg, plainPicture, webm } from '#tests/support/media.js';

const folder = mkdtempSync(path.join(os.tmpdir(), 'dawnpeg-test-sound-'));
afterAll(() => {
  rmSync(folder, { recursive: true, force: true });
});

async function typeOf(content: Buffer | string): Promise<string | null> {
  const file = path.join(folder, 'sent');
  writeFileSync(file, content);
  return soundTypeOf(file);
}

const page = Buffer.from('<html><script>alert(1)</script></html>');

describe('the type of a sound file', () => {
  it.each([
    ['WebM', webm(), 'audio/webm'],
    ['MP4', mp4(), 'audio/mp4'],
    ['Ogg', ogg(), 'audio/ogg'],
    ['Ogg with Vorbis', ogg({ name: '\u0001vorbis' }), 'audio/ogg'],
  ])('is found by its content: %s', async (_name, content, type) => {
    expect(await typeOf(content)).toBe(type);
  });

  it('holds for a WebM that was cut anywhere behind its tracks', async () => {
    const whole = webm({ note: 'a voice that stops in the middle' });
    const tracksEnd = whole.indexOf(Buffer.from('1f43b675', 'hex'));
    const types = new Set<string | null>();
    for (let length = tracksEnd + 1; length < whole.length; length += 1) {
      types.add(await typeOf(whole.subarray(0, length)));
    }
    expect([...types]).toEqual(['audio/webm']);
  });

  it('holds for an MP4 whose last sound was cut', async () => {
    expect(await typeOf(mp4().subarray(0, -3))).toBe('audio/mp4');
  });

  it.each([
    ['a page', page],
    ['a drawing that can run scripts', '<svg xmlns="http://www.w3.org/2000/svg" onload="alert(1)"/>'],
    ['nothing', ''],
    ['a WebM with a moving picture', movie()],
    ['an MP4 with a moving picture', mp4({ handler: 'vide' })],
    ['an MP4 without a track', mp4().subarray(0, 24)],
    ['an Ogg of something else', ogg({ name: 'fishead' })],
    ['a page behind a WebM', Buffer.concat([webm(), page])],
    ['a few letters behind a WebM', Buffer.concat([webm(), Buffer.from('<b>')])],
    ['a page behind an MP4', Buffer.concat([mp4(), page])],
    ['a page behind an Ogg', Buffer.concat([ogg(), page])],
    ['a page in front of a WebM', Buffer.concat([page, webm()])],
    ['a WebM that is only its head', webm().subarray(0, 20)],
  ])('is none for %s', async (_name, content) => {
    expect(await typeOf(content)).toBeNull();
  });

  it('is none for a picture', async () => {
    expect(await typeOf(await plainPicture())).toBeNull();
  });
});
