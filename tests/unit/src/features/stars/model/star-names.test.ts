import { describe, expect, it } from 'vitest';
import { STARS } from '#shared/sky/index.js';
import { texts } from '#shared/locales/en/stars.js';
import { markerNamesOf } from '#server/features/stars/marker-names.service.js';
import { plainWords, readDesignation, superscript } from '#src/features/stars/model/star-names.js';

describe('a designation', () => {
  it('is taken apart into letter, index, number and constellation', () => {
    expect(readDesignation('α CMa')).toEqual({ letter: 'α', index: '', number: '', constellation: 'CMa' });
    expect(readDesignation('γ² Vel')).toEqual({ letter: 'γ', index: '2', number: '', constellation: 'Vel' });
    expect(readDesignation('27 Tau')).toEqual({ letter: '', index: '', number: '27', constellation: 'Tau' });
    expect(readDesignation(' Vel')).toBeNull();
    expect(superscript('12')).toBe('¹²');
  });

  it('of every star in the table has its letter and its constellation among the texts', () => {
    for (const { hr, constellation } of STARS) {
      expect(Object.keys(texts.constellation)).toContain(constellation);
      expect(Object.keys(texts.genitive)).toContain(constellation);
      const read = readDesignation(markerNamesOf(`hr${hr}`).designation);
      if (read && read.letter !== '') expect(Object.keys(texts.letter)).toContain(read.letter);
    }
  });
});

describe('searched words', () => {
  it('lose capitals, marks and raised numbers', () => {
    expect(plainWords('Boötes γ² Vel')).toEqual(['bootes', 'γ2', 'vel']);
  });
});
