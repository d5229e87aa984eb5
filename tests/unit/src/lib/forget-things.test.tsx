import { beforeEach, describe, expect, it } from 'vitest';
import { keep, readKept } from '#src/lib/device-storage.js';
import { alsoForget, forgetThings, WITHDRAWN_KEY } from '#src/lib/forget-things.js';
import { testQueryClient } from '#tests/support/on-board.js';

const GONE = '0190a3a0-0000-7000-8000-0000000000b1';
const STAYS = '0190a3a0-0000-7000-8000-0000000000b2';

describe('what was taken back', () => {
  beforeEach(() => {
    localStorage.clear();
  });

  it('leaves the texts that were not saved on this device, and no other text', async () => {
    keep(`draft.me.entry.calendar.${GONE}`, { draft: 'words' });
    keep(`draft.me.words.${GONE}.words`, 'words');
    keep(`draft.me.entry.calendar.${STAYS}`, { draft: 'other words' });
    keep('theme', 'bright');
    await forgetThings(testQueryClient(), [GONE]);
    expect(Object.keys(localStorage).sort()).toEqual([
      `dawnpeg.draft.me.entry.calendar.${STAYS}`,
      'dawnpeg.theme',
    ]);
    expect(readKept('theme')).toBe('bright');
  });

  it('leaves everything that was read: whatever holds its id anywhere', async () => {
    const client = testQueryClient();
    client.setQueryData(['calendars', 'c', 'entries'], { items: [{ id: GONE, title: 'word' }] });
    client.setQueryData(['attachments', 'v', 'entry', GONE], []);
    client.setQueryData(['places', 'v'], [{ id: STAYS }]);
    await forgetThings(client, [GONE]);
    expect(
      client
        .getQueryCache()
        .getAll()
        .map(({ queryKey }) => queryKey[0]),
    ).toEqual(['places']);
  });

  it('stays named in the list of what is gone, so that the next start knows it too', async () => {
    const client = testQueryClient();
    client.setQueryData([WITHDRAWN_KEY, 'me', 'v'], [{ itemId: GONE }]);
    await forgetThings(client, [GONE]);
    expect(client.getQueryData([WITHDRAWN_KEY, 'me', 'v'])).toBeDefined();
  });

  it('leaves other keepers even where one of them fails', async () => {
    const told: string[][] = [];
    alsoForget(() => Promise.reject(new Error('the store is closed')));
    alsoForget((ids) => {
      told.push([...ids]);
    });
    await forgetThings(testQueryClient(), [GONE]);
    expect(told).toEqual([[GONE]]);
  });
});
