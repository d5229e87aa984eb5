import { describe, expect, it } from 'vitest';
import { placeUnder } from '#src/features/calendars/model/drop-place.js';

describe('an entry that is dragged', () => {
  it('goes to the row whose middle is nearest', () => {
    const middles = [30, 90, 150];
    expect([-50, 40, 70, 149, 900].map((y) => placeUnder(y, middles))).toEqual([0, 0, 1, 2, 2]);
  });
});
