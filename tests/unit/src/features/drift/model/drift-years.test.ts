import { describe, expect, it } from 'vitest';
import { readView, stretchOf } from '#src/features/drift/model/drift-years.js';

const read = (text: string) => readView(new URLSearchParams(text));

describe('the years of an address', () => {
  it('are read with the day that is looked at', () => {
    expect(read('from=-1000&to=2100&its=heliacal-setting')).toEqual({
      from: -1000,
      to: 2100,
      phenomenon: 'heliacal-setting',
    });
  });

  it.each(['', 'from=soon', 'from=2100&to=1000', 'to=5000', 'its=nothing'])(
    'fall back to the recent centuries for “%s”',
    (text) => {
      expect(read(text)).toMatchObject({ from: 1000, to: 2100, phenomenon: 'heliacal-rising' });
    },
  );

  it('are known by their name where they have one', () => {
    expect(stretchOf({ from: -3000, to: 3000 })).toBe('all');
    expect(stretchOf({ from: -3000, to: 2999 })).toBeNull();
  });
});
