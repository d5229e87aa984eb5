import fc from 'fast-check';
import { describe, expect, it } from 'vitest';

import { jointWord, odehV, wordByOdeh, wordByYallop, yallopQ } from '#shared/sky/moon/crescent-criteria.js';
import { SEED } from '#tests/support/sky/arbitraries.js';

const DEG = Math.PI / 180;

describe('the two tests of the young Moon', () => {
  it('give Yallop’s q at zero where the older Indian rule has its limit [Yallop1997; table from memory]', () => {
    // Indian rule: least arc of vision at a difference in azimuth, for a Moon of 15′.
    for (const { arcOfVisionDeg, azimuthDeg } of [
      { arcOfVisionDeg: 10.4, azimuthDeg: 0 },
      { arcOfVisionDeg: 10.0, azimuthDeg: 5 },
      { arcOfVisionDeg: 9.3, azimuthDeg: 10 },
      { arcOfVisionDeg: 8.0, azimuthDeg: 15 },
      { arcOfVisionDeg: 6.2, azimuthDeg: 20 },
    ]) {
      const width = 15 * (1 - Math.cos(arcOfVisionDeg * DEG) * Math.cos(azimuthDeg * DEG));
      expect(Math.abs(yallopQ(arcOfVisionDeg, width))).toBeLessThan(0.02);
    }
  });

  it('keep their own constants: 11.8371 for the Earth’s centre, 7.1651 for the place', () => {
    expect(yallopQ(11.8371, 0)).toBeCloseTo(0, 10);
    expect(odehV(7.1651, 0)).toBeCloseTo(0, 10);
    // The same crescent: the place sees it a parallax (0.95°) lower. With the other's constant the words would part.
    const [arc, parallax, width] = [12, 0.95, 0.4];
    expect(wordByYallop(yallopQ(arc, width))).toBe('easy');
    expect(wordByOdeh(odehV(arc - parallax, width))).toBe('easy');
    expect(wordByOdeh(odehV(arc - parallax, width) - (11.8371 - 7.1651))).not.toBe('easy');
  });

  it('never make a wider or higher crescent harder to see', () => {
    const order = ['not-by-eye', 'if-air-is-clear', 'easy'];
    const arcs = fc.double({ min: -5, max: 30, noNaN: true });
    const widths = fc.double({ min: 0, max: 12, noNaN: true });
    fc.assert(
      fc.property(arcs, widths, arcs, widths, (arc, width, arcMore, widthMore) => {
        const [lowArc, highArc] = [Math.min(arc, arcMore), Math.max(arc, arcMore)];
        const [thin, wide] = [Math.min(width, widthMore), Math.max(width, widthMore)];
        for (const word of [
          (a: number, w: number) => wordByYallop(yallopQ(a, w)),
          (a: number, w: number) => wordByOdeh(odehV(a, w)),
        ]) {
          expect(order.indexOf(word(highArc, wide))).toBeGreaterThanOrEqual(
            order.indexOf(word(lowArc, thin)),
          );
        }
      }),
      { seed: SEED },
    );
  });

  it('meet in the middle where they differ', () => {
    expect(jointWord('easy', 'easy')).toBe('easy');
    expect(jointWord('not-by-eye', 'not-by-eye')).toBe('not-by-eye');
    expect(jointWord('easy', 'not-by-eye')).toBe('if-air-is-clear');
    expect(jointWord('easy', 'if-air-is-clear')).toBe('if-air-is-clear');
  });
});
