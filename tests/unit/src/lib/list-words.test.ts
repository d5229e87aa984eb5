import { expect, it } from 'vitest';
import { listWords } from '#src/lib/list-words.js';

it('joins words as the language writes a list', () => {
  expect(listWords(['seed', 'soil', 'rain'], 'en')).toBe('seed, soil and rain');
  expect(listWords(['elder', 'steward'], 'fr')).toBe('elder et steward');
  expect(listWords([], 'en')).toBe('');
});
