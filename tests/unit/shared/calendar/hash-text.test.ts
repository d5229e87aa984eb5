import { createHash } from 'node:crypto';
import { describe, expect, it } from 'vitest';
import { entryBodyText, entryHashText, leafText, versionHashText } from '#shared/calendar/hash-text.js';

const sha256 = (text: string) => createHash('sha256').update(text, 'utf8').digest('hex');

const body = {
  entryId: '3f0c7f5e-8a4e-4c55-9c1e-0a5d9f1e2b3c',
  content: { titleOfficer: 'Sow long millet', titleVillage: 'Ŋɔ́rɛ̃' },
  dates: { window: null, warnings: [] },
};

describe('hashed texts', () => {
  it('can be made again with any tool: salt, line feed, canonical JSON', () => {
    expect(entryHashText('00ff', entryBodyText(body))).toBe(
      '00ff\n{"content":{"titleOfficer":"Sow long millet","titleVillage":"Ŋɔ́rɛ̃"},' +
        '"dates":{"warnings":[],"window":null},"entryId":"3f0c7f5e-8a4e-4c55-9c1e-0a5d9f1e2b3c"}',
    );
    expect(leafText(12, 'bb')).toBe('12\nbb');
    expect(versionHashText(2, 'aa', ['cc', 'bb'])).toBe('dawnpeg-version-2\naa\nbb\ncc\n');
  });

  it('differ by salt, by content, by dates and by entry, and by nothing else', () => {
    const hash = (changes: Partial<typeof body>, salt = 'aa') =>
      sha256(entryHashText(salt, entryBodyText({ ...body, ...changes })));
    const hashes = [
      hash({}),
      hash({}, 'ab'),
      hash({ content: { ...body.content, titleOfficer: 'Sow short millet' } }),
      hash({ dates: { window: null, warnings: ['weak-marker'] as never } }),
      hash({ entryId: '00000000-0000-4000-8000-000000000000' }),
    ];
    expect(new Set(hashes).size).toBe(hashes.length);
    const reordered = { dates: body.dates, content: body.content, entryId: body.entryId, position: 7 };
    expect(entryBodyText(reordered)).toBe(entryBodyText(body));
  });

  it('of a version depend on the order of its entries through their ranks alone', () => {
    const leaves = (ranks: number[]) =>
      ['bb', 'cc'].map((hash, index) => sha256(leafText(ranks[index] ?? 0, hash)));
    expect(versionHashText(2, 'aa', leaves([1, 9]))).not.toBe(versionHashText(2, 'aa', leaves([9, 1])));
    const [first = '', second = ''] = leaves([1, 9]);
    expect(versionHashText(2, 'aa', [first, second])).toBe(versionHashText(2, 'aa', [second, first]));
  });

  it('of the first scheme go over entry hashes in order', () => {
    expect(versionHashText(1, 'aa', ['cc', 'bb'])).toBe('dawnpeg-version-1\naa\ncc\nbb\n');
  });
});
