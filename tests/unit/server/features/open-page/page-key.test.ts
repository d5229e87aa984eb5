import { expect, it } from 'vitest';
import { keysMeant, newPageKey } from '#server/features/open-page/page-key.js';

it('is found again however its letters were typed from the wall', () => {
  const key = newPageKey();
  for (const typed of [key, key.toLowerCase(), key.replaceAll('-', ''), key.replaceAll('-', ' ')]) {
    expect(keysMeant(typed)).toContain(key);
  }
});

it('leaves keys of before as they are: their letters have a size', () => {
  const before = 'pV3_aK9-xQm2Zr7tLw0YcB5nUe8DfHjS';
  expect(keysMeant(before)).toEqual([before]);
});
