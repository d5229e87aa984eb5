import { describe, expect, it } from 'vitest';
import { phrasesOf, saidBy } from '#shared/calendar/import-phrases.js';

const PHRASES = phrasesOf({
  'due-meridian': { south: '{{star}} due south at {{hour}} | {{star}} sudo-ab [{{hour}}]' },
  entry: { bestFrom: 'planned {{entry}} | planned date of {{entry}}' },
  altitude: {
    count_one: '{{star}} {{altitude}}° up, {{count}} minute',
    count_other: '{{star}} {{altitude}}° up, {{count}} minutes',
  },
});
const read = (words: string) => saidBy(words, PHRASES);

describe('a phrase with holes', () => {
  it('is known whole, in any case and with what stands in its holes as it was written', () => {
    expect(read('The Belt DUE SOUTH at  21:15')).toEqual({
      path: ['due-meridian', 'south'],
      holes: { star: 'Belt', hour: '21:15' },
    });
    expect(read('Belt due south at nine')).toBeNull();
    expect(read('Belt due south at 21:15 perhaps')).toBeNull();
  });

  it('is another way to say the same, and the same in singular and plural', () => {
    expect(read('Belt sudo-ab [21]')).toEqual({
      path: ['due-meridian', 'south'],
      holes: { star: 'Belt', hour: '21' },
    });
    const path = ['altitude', 'count'];
    expect(read('Belt 40 ° up, 1 minute')).toEqual({
      path,
      holes: { star: 'Belt', altitude: '40', count: '1' },
    });
    expect(read('Belt 40° up 30 minutes')).toEqual({
      path,
      holes: { star: 'Belt', altitude: '40', count: '30' },
    });
  });

  it('that says more in words of its own is asked first', () => {
    expect(read('planned date of A04')?.holes).toEqual({ entry: 'A04' });
    expect(read('planned A04')?.holes).toEqual({ entry: 'A04' });
  });
});
