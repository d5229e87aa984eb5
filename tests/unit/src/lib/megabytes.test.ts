import { expect, it } from 'vitest';
import { megabytes } from '#src/lib/megabytes.js';

it('says how large a file is, and never nothing for something', () => {
  expect([0, 1, 90_000, 149_999, 12_400_000, 300_400_000].map(megabytes)).toEqual([
    ...['0.0', '0.1', '0.1', '0.1', '12.4', '300'],
  ]);
});
