import { describe, expect, it } from 'vitest';
import { fitsSearch } from '#src/features/stars/model/star-search.js';

const sirius = { hr: 2491, words: ['sirius', 'α', 'cma', 'alpha', 'canis', 'majoris', 'major'] };
const gamma = { hr: 3207, words: ['γ2', 'vel', 'gamma2', 'gamma', 'velorum', 'vela'] };
const atlas = { hr: 1178, words: ['atlas', '27', 'tau', 'tauri', 'taurus'] };

describe('a search', () => {
  it.each([
    ['sirius', sirius],
    ['SIR', sirius],
    ['α', sirius],
    ['alpha', sirius],
    ['alpha canis', sirius],
    ['a cma', sirius],
    ['rius', sirius],
    ['HR 2491', sirius],
    ['hr2491', sirius],
    ['2491', sirius],
    ['249', sirius],
    ['gamma vel', gamma],
    ['γ² Vel', gamma],
    ['27 tau', atlas],
    ['', sirius],
  ])('for %j finds the star', (typed, star) => {
    expect(fitsSearch(star, typed)).toBe(true);
  });

  it.each([
    ['beta', sirius],
    ['alpha vel', sirius],
    ['24', sirius],
    ['hr 249 1', sirius],
    ['us', { hr: 1, words: ['taurus'] }],
    ['7 tau', atlas],
  ])('for %j does not', (typed, star) => {
    expect(fitsSearch(star, typed)).toBe(false);
  });
});
