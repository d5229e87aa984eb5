import { describe, expect, it } from 'vitest';
import { placeOfPath, RAIL_PLACES } from '#src/app/layout/rail-places.js';
import { paths } from '#src/lib/paths.js';

describe('the peg of the rail', () => {
  it('stands at each place itself and at everything below it', () => {
    for (const { place, to } of RAIL_PLACES) expect(placeOfPath(to)).toBe(place);
    expect(placeOfPath(paths.star('hr1165'))).toBe('stars');
    expect(placeOfPath(paths.review('c', 2))).toBe('calendar');
    expect(placeOfPath(paths.place('p'))).toBe('village');
  });

  it('stands nowhere on the account page, and not at Today for every address', () => {
    expect(placeOfPath(paths.account())).toBeNull();
    expect(placeOfPath('/starsky')).toBeNull();
  });
});
