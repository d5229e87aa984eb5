import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import sharp from 'sharp';
import { afterAll, describe, expect, it } from 'vitest';
import { drawAnew } from '#server/media/picture-file.js';
import { photoWithPlace, plainPicture, webm } from '#tests/support/media.js';

const folder = mkdtempSync(path.join(os.tmpdir(), 'dawnpeg-test-picture-'));
afterAll(() => {
  rmSync(folder, { recursive: true, force: true });
});

async function drawn(content: Buffer | string) {
  const file = path.join(folder, 'sent');
  writeFileSync(file, content);
  return drawAnew(file);
}

describe('a photo drawn anew', () => {
  it('says nothing of place and device any more, and stands upright', async () => {
    const photo = await photoWithPlace();
    expect((await sharp(photo).metadata()).exif?.toString('latin1')).toContain('Telltale');
    const result = await drawn(photo);
    for (const file of [result?.picture, result?.thumbnail]) {
      const { exif, xmp, iptc, orientation } = await sharp(file).metadata();
      expect({ exif, xmp, iptc, orientation }).toEqual({});
      expect(file?.toString('latin1')).not.toMatch(/Telltale|Exif|GPS/u);
    }
    expect([result?.widthPx, result?.heightPx]).toEqual([40, 60]);
  });

  it('is at most 2048 px, its small one at most 320 px, and nothing is blown up', async () => {
    const large = await drawn(await plainPicture('jpeg', 3000));
    expect([large?.widthPx, (await sharp(large?.thumbnail).metadata()).width]).toEqual([2048, 320]);
    const small = await drawn(await plainPicture('webp', 30));
    expect([small?.widthPx, (await sharp(small?.thumbnail).metadata()).width]).toEqual([30, 30]);
  });

  it('loses whatever was hung on behind it', async () => {
    const hung = Buffer.concat([await plainPicture('jpeg'), Buffer.from('<script>alert(1)</script>')]);
    expect((await drawn(hung))?.picture.toString('latin1')).not.toContain('script');
  });

  it.each([
    ['a drawing that can run scripts', '<svg xmlns="http://www.w3.org/2000/svg" width="9" height="9"/>'],
    ['a page', '<html></html>'],
    ['a sound', webm()],
    ['nothing', ''],
    [
      'a form that is not on the list',
      Buffer.from('GIF89a\u0001\u0000\u0001\u0000\u0080\u0000\u0000', 'latin1'),
    ],
  ])('is none for %s', async (_name, content) => {
    expect(await drawn(content)).toBeNull();
  });

  it('is none for a picture that breaks off', async () => {
    const whole = await plainPicture('png', 200);
    expect(await drawn(whole.subarray(0, whole.length / 2))).toBeNull();
  });
});
