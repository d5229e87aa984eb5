import { describe, expect, it } from 'vitest';
import { moonDisc } from '#shared/sheet/moon.js';

const at = { cx: 10, cy: 10, radius: 4 };

describe('the printed Moon', () => {
  it('is a full disc when new and a ring when full', () => {
    expect(moonDisc('new', 52, at).fill).toBe('solid');
    expect(moonDisc('full', -33, at).fill).toBe('open');
  });

  // Which side is lit at which latitude: practice notes on printed boards, after [41] there.
  it.each([
    [52, 'first-quarter', 'left'],
    [52, 'last-quarter', 'right'],
    [-33, 'first-quarter', 'right'],
    [-33, 'last-quarter', 'left'],
    [12, 'first-quarter', 'top'],
    [-14, 'last-quarter', 'top'],
    [0, 'first-quarter', 'top'],
  ] as const)(
    'at latitude %i has its %s inked on the %s, the side that is dark there',
    (latitudeDeg, phase, side) => {
      expect(moonDisc(phase, latitudeDeg, at)).toMatchObject({ fill: 'half', inkedSide: side });
    },
  );
});
