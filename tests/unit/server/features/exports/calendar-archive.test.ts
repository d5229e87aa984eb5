import { createHash, randomBytes } from 'node:crypto';
import { once } from 'node:events';
import { Readable } from 'node:stream';
import { buffer } from 'node:stream/consumers';
import { describe, expect, it } from 'vitest';
import { packCalendar, type FileToPack } from '#server/features/exports/calendar-archive.js';
import { unzipped } from '#tests/support/zip.js';

const calendar = {
  fileName: 'Ŋɔ́rɛ̃ 2027 calendar.json',
  json: '{"ɓ":1}',
  at: new Date('2026-12-01T06:00:00Z'),
};
const fileOf = (content: Buffer, contentType = 'audio/webm') => ({
  sha256: createHash('sha256').update(content).digest('hex'),
  ...{ contentType, bytes: content.length, open: () => Promise.resolve(Readable.from(content)) },
});

describe('a calendar that is packed', () => {
  // Written by yazl, read by yauzl: two packages that share no code.
  it('stands first as it is, then each file once under its checksum; its size was known before', async () => {
    const [voice, picture] = [randomBytes(70_000), randomBytes(2_000)];
    const files = [fileOf(voice), fileOf(picture, 'image/jpeg'), fileOf(voice)];
    const { content, bytes } = packCalendar(calendar, files);
    const zip = await buffer(content);
    expect(zip.length).toBe(bytes);
    expect(await unzipped(zip)).toEqual([
      { path: calendar.fileName, content: Buffer.from(calendar.json) },
      { path: `files/${files[0]?.sha256 ?? ''}.webm`, content: voice },
      { path: `files/${files[1]?.sha256 ?? ''}.jpg`, content: picture },
    ]);
  });

  it('opens one file after the other, and closes the one that is open where somebody hangs up', async () => {
    const opened: Readable[] = [];
    const endless = (sha256: string): FileToPack => ({
      ...{ sha256, contentType: 'audio/webm', bytes: 1_000_000_000 },
      open: () => {
        const stream = new Readable({
          read() {
            this.push(Buffer.alloc(16_384));
          },
        });
        opened.push(stream);
        return Promise.resolve(stream);
      },
    });
    const { content } = packCalendar(calendar, [endless('a'), endless('b')]);
    content.once('data', () => content.destroy());
    await once(content, 'close');
    expect(opened.map(({ destroyed }) => destroyed)).toEqual([true]);
  });

  it('breaks off where a file is gone or shorter than it was', async () => {
    const gone = { ...fileOf(Buffer.from('voice')), open: () => Promise.reject(new Error('gone')) };
    await expect(buffer(packCalendar(calendar, [gone]).content)).rejects.toThrow('gone');
    const shorter = { ...fileOf(Buffer.from('voice')), bytes: 500 };
    await expect(buffer(packCalendar(calendar, [shorter]).content)).rejects.toThrow('number of bytes');
  });
});
