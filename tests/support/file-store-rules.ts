import { randomBytes } from 'node:crypto';
import { Readable } from 'node:stream';
import { buffer } from 'node:stream/consumers';
import { beforeEach, expect, it } from 'vitest';
import { FileNotStored, type FileStore } from '#server/storage/file-store.js';

/** What every store of files must do. Call it inside `describe` with a maker of an empty store. */
export function holdsToTheRulesOfAFileStore(open: () => Promise<FileStore>): void {
  let store: FileStore;
  beforeEach(async () => {
    store = await open();
  });
  const newKey = () => randomBytes(16).toString('hex');
  const keep = async (text: string, key = newKey()) => {
    await store.put(Readable.from(Buffer.from(text)), key);
    return key;
  };
  const textOf = async (key: string, range?: { start: number; end: number }) =>
    (await buffer(await store.read(key, range))).toString();
  const keysOf = async () => {
    const keys: string[] = [];
    for await (const key of store.keys()) keys.push(key);
    return keys.sort();
  };

  it('gives back what was kept, whole and in part', async () => {
    const key = await keep('a voice');
    expect(await textOf(key)).toBe('a voice');
    expect(await textOf(key, { start: 2, end: 4 })).toBe('voi');
    expect(await textOf(key, { start: 6, end: 6 })).toBe('e');
  });

  it('knows how large a file is and since when it is kept', async () => {
    const facts = await store.stat(await keep('a voice'));
    expect(facts?.bytes).toBe(7);
    expect(facts?.storedAt).toBeInstanceOf(Date);
  });

  it('keeps an empty file', async () => {
    expect((await store.stat(await keep('')))?.bytes).toBe(0);
  });

  it('has nothing under a key that nobody used', async () => {
    expect(await store.stat(newKey())).toBeNull();
    await expect(store.read(newKey())).rejects.toThrow(FileNotStored);
  });

  it('never writes over what is kept', async () => {
    const key = await keep('first');
    await expect(keep('second', key)).rejects.toThrow();
    expect(await textOf(key)).toBe('first');
  });

  it('keeps nothing of a file that broke off', async () => {
    const key = newKey();
    const breaksOff = Readable.from(
      (function* () {
        yield Buffer.from('half a ');
        throw new Error('the line is dead');
      })(),
    );
    await expect(store.put(breaksOff, key)).rejects.toThrow('the line is dead');
    expect(await store.stat(key)).toBeNull();
    expect(await keysOf()).toEqual([]);
  });

  it('forgets what is removed, and does not mind removing it again', async () => {
    const key = await keep('a voice');
    await store.remove(key);
    await store.remove(key);
    expect(await store.stat(key)).toBeNull();
    await expect(store.read(key)).rejects.toThrow(FileNotStored);
  });

  it('names every key once', async () => {
    expect(await keysOf()).toEqual([]);
    const kept = [await keep('one'), await keep('two'), await keep('three')];
    expect(await keysOf()).toEqual(kept.sort());
  });

  it.each(['../../etc/passwd', 'AB', '', `${'a'.repeat(31)}/`])('takes no key like %j', async (key) => {
    await expect(keep('x', key)).rejects.toThrow(TypeError);
    await expect(store.read(key)).rejects.toThrow(TypeError);
  });
}
