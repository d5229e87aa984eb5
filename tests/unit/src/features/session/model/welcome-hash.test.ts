import { expect, it } from 'vitest';
import { readWelcomeHash } from '#src/features/session/model/welcome-hash.js';
import { paths } from '#src/lib/paths.js';

it('reads a code from our own link and the token of the first start, and neither from an empty hash', () => {
  expect(readWelcomeHash(new URL(paths.welcome('AB+1 2'), 'http://x').hash)).toEqual({
    code: 'AB+1 2',
    firstSteward: null,
  });
  expect(readWelcomeHash('#first-steward=abc_-123')).toEqual({ code: null, firstSteward: 'abc_-123' });
  expect(readWelcomeHash('')).toEqual({ code: null, firstSteward: null });
  expect(readWelcomeHash('#code=')).toEqual({ code: null, firstSteward: null });
});
