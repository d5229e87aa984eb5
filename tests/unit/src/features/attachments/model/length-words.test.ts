import { expect, it } from 'vitest';
import { clockOf, secondsOf } from '#src/features/attachments/model/length-words.js';

it.each([
  [0, '0:00'],
  [5.9, '0:05'],
  [65, '1:05'],
  [7200, '120:00'],
  [-1, '0:00'],
])('%d seconds are read as %s', (seconds, words) => {
  expect(clockOf(seconds)).toBe(words);
});

it('counts the parts of a recording and leaves the spoken agreement out', () => {
  expect(
    secondsOf([
      { part: 0, seconds: 9 },
      { part: 1, seconds: 300 },
      { part: 2, seconds: null },
    ]),
  ).toBe(300);
});
