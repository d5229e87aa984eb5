import type { QueryRunner } from 'typeorm';
import { describe, expect, it, vi } from 'vitest';
import { askedOnce, askedOnceEach, askingOnce } from '#server/db/asked-once.js';

const plain = {};
const inTransaction = { queryRunner: {} as QueryRunner };

describe('a call that only reads', () => {
  it('asks the same question once, and another one by itself', async () => {
    const ask = vi.fn(() => Promise.resolve('Spica'));
    await askingOnce(async () => {
      expect(await askedOnce(plain, 'star 1', ask)).toBe('Spica');
      expect(await askedOnce(plain, 'star 1', ask)).toBe('Spica');
      await askedOnce(plain, 'star 2', ask);
    });
    expect(ask).toHaveBeenCalledTimes(2);
  });

  it('asks only for things that nobody has asked for, and leaves out what is not there', async () => {
    const ask = vi.fn((ids: readonly string[]) =>
      Promise.resolve(new Map(ids.filter((id) => id !== 'gone').map((id) => [id, `row ${id}`]))),
    );
    await askingOnce(async () => {
      expect(await askedOnceEach(plain, 'rows', ['a', 'gone', 'a'], ask)).toEqual(new Map([['a', 'row a']]));
      const more = await askedOnceEach(plain, 'rows', ['gone', 'b', 'a'], ask);
      expect([...more]).toEqual([
        ['b', 'row b'],
        ['a', 'row a'],
      ]);
      await askedOnceEach(plain, 'rows', [], ask);
    });
    expect(ask.mock.calls).toEqual([[['a', 'gone']], [['b']]]);
  });

  it('knows nothing of what the call before it was told', async () => {
    const ask = vi.fn(() => Promise.resolve(1));
    await askingOnce(() => askedOnce(plain, 'count', ask));
    await askingOnce(() => askedOnce(plain, 'count', ask));
    expect(ask).toHaveBeenCalledTimes(2);
  });
});

describe('whoever writes', () => {
  it.each([
    ['outside of a reading call', plain, (work: () => Promise<void>) => work()],
    ['in a transaction', inTransaction, (work: () => Promise<void>) => askingOnce(work)],
  ] as const)('is told anew each time: %s', async (_, manager, within) => {
    let state = 0;
    const ask = () => Promise.resolve((state += 1));
    const each = (ids: readonly string[]) => Promise.resolve(new Map(ids.map((id) => [id, (state += 1)])));
    await within(async () => {
      expect(await askedOnce(manager, 'state', ask)).toBe(1);
      expect(await askedOnce(manager, 'state', ask)).toBe(2);
      expect(await askedOnceEach(manager, 'states', ['a'], each)).toEqual(new Map([['a', 3]]));
      expect(await askedOnceEach(manager, 'states', ['a'], each)).toEqual(new Map([['a', 4]]));
    });
  });
});
