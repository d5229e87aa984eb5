import { describe, expect, it } from 'vitest';
import { namesIn } from '#shared/calendar/names-in-words.js';

const KNOWN = {
  names: ['Awa Ndiaye', 'Elder A-1', 'Rosa Kē', 'Ŋɔ́rɛ̃', ' '],
  notNames: new Set(['elder', 'officer']),
};

describe('names of people in words', () => {
  it.each([
    ['Ask awa ndiaye first', ['Awa Ndiaye']],
    ['Awa’s field before the others', ['Awa Ndiaye']],
    ['as ELDER A-1 says; Elder A-12 does not', ['Elder A-1']],
    ['With Ndiaye and Rosa', ['Awa Ndiaye', 'Rosa Kē']],
    ['Behind the house of Ŋɔ́rɛ̃', ['Ŋɔ́rɛ̃']],
  ])('are found in %j', (words, names) => {
    expect(namesIn(words, KNOWN)).toEqual(names);
  });

  it.each([
    'When the rosa flowers',
    'Any elder may say so',
    'Awash with rain, and Rosaline',
    'Ask Elder A-12',
    'A Kē tree',
    '',
  ])('are not seen in %j', (words) => {
    expect(namesIn(words, KNOWN)).toEqual([]);
  });
});
