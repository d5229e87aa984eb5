import { describe, expect, it } from 'vitest';
import { startPercent, stretch } from '#src/ui/pictures/day-span.js';

const span = { first: 1, last: 10 };

describe('days along a picture', () => {
  it('fill it from the beginning of the first to the end of the last', () => {
    expect(stretch(1, 10, span)).toEqual({ start: 0, width: 100 });
    expect(stretch(3, 3, span)).toEqual({ start: 20, width: 10 });
    expect(startPercent(3.5, span)).toBe(25);
  });

  it('are cut at its ends, and vanish beyond them', () => {
    expect(stretch(-5, 2, span)).toEqual({ start: 0, width: 20 });
    expect(stretch(11, 20, span)).toBeNull();
  });
});
