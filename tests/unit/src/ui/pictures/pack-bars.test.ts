import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { packBars } from '#src/ui/pictures/pack-bars.js';

const bar = (key: string, startPx: number, endPx: number, labelPx: number) => ({
  key,
  startPx,
  endPx,
  labelPx,
});

describe('bars with their labels', () => {
  it('share a row where both have room', () => {
    const placed = packBars([bar('a', 0, 40, 90), bar('b', 120, 150, 60), bar('c', 60, 80, 30)], 400);
    expect(placed.map(({ key, row }) => [key, row])).toEqual([
      ['a', 0],
      ['c', 1],
      ['b', 0],
    ]);
  });

  it('at the right edge have a label that ends at its bar', () => {
    const [placed] = packBars([bar('late', 360, 390, 120)], 400);
    expect(placed).toMatchObject({ labelStartPx: 270, fromPx: 270, toPx: 390 });
  });

  it('never cover one another', () => {
    const bars = fc.array(fc.tuple(fc.nat(380), fc.nat(80), fc.nat(160)), { maxLength: 30 });
    fc.assert(
      fc.property(bars, (list) => {
        const placed = packBars(
          list.map(([start, length, label], index) =>
            bar(String(index), start, Math.min(400, start + length), label),
          ),
          400,
        );
        for (const one of placed) {
          const beside = placed.filter((other) => other.key !== one.key && other.row === one.row);
          expect(beside.every((other) => other.toPx <= one.fromPx || one.toPx <= other.fromPx)).toBe(true);
        }
      }),
      { seed: 11, numRuns: 100 },
    );
  });
});
