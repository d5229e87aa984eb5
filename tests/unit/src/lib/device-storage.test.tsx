import { afterEach, describe, expect, it, vi } from 'vitest';
import { forget, forgetAll, keep, readKept } from '#src/lib/device-storage.js';

afterEach(() => {
  vi.restoreAllMocks();
  localStorage.clear();
});

describe('what is kept on this device', () => {
  it('reads back until it is forgotten', () => {
    expect(keep('draft.p.x', { text: 'Ŋɔ́rɛ̃' })).toBe(true);
    expect(readKept('draft.p.x')).toEqual({ text: 'Ŋɔ́rɛ̃' });
    forget('draft.p.x');
    expect(readKept('draft.p.x')).toBeNull();
  });

  it('goes by its beginning when a person leaves, and only that', () => {
    keep('draft.p.x', 1);
    keep('draft.p.y', 2);
    keep('draft.q.x', 3);
    forgetAll('draft.p.');
    expect([readKept('draft.p.x'), readKept('draft.p.y'), readKept('draft.q.x')]).toEqual([null, null, 3]);
  });

  it('is simply not kept where storage is full or closed', () => {
    vi.spyOn(Storage.prototype, 'setItem').mockImplementation(() => {
      throw new DOMException('full', 'QuotaExceededError');
    });
    expect(keep('draft.p.x', 1)).toBe(false);
    expect(readKept('draft.p.x')).toBeNull();
  });

  it('is nothing where somebody else wrote what is no JSON', () => {
    localStorage.setItem('dawnpeg.theme', '{broken');
    expect(readKept('theme')).toBeNull();
  });
});
