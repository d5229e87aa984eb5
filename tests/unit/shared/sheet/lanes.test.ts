import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { cutLanes, lanesOfRow } from '#shared/sheet/lanes.js';
import type { MonthSpan } from '#shared/sheet/spans.js';

function span(from: number, to: number, tag = `${from}-${to}`): MonthSpan {
  return {
    from,
    to,
    kind: 'entry',
    tag,
    order: 0,
    parts: [],
    point: null,
    stop: null,
    begins: true,
    ends: true,
  };
}

const anySpans = fc.array(
  fc
    .tuple(fc.integer({ min: 1, max: 31 }), fc.integer({ min: 0, max: 12 }))
    .map(([from, length]) => span(from, Math.min(31, from + length))),
  { maxLength: 14 },
);

describe('lanes', () => {
  it('never put two spans of one day into the same lane, and lose none', () => {
    fc.assert(
      fc.property(anySpans, fc.integer({ min: 2, max: 6 }), (spans, maxLanes) => {
        const lanes = lanesOfRow(spans, 8, 14, maxLanes);
        const touching = spans.filter(({ from, to }) => from <= 14 && to >= 8);
        expect(lanes.placed.length + lanes.left.length).toBe(touching.length);
        expect(lanes.laneCount + (lanes.left.length > 0 ? 1 : 0)).toBeLessThanOrEqual(maxLanes);
        for (const one of lanes.placed) {
          expect(one.from).toBeGreaterThanOrEqual(8);
          expect(one.to).toBeLessThanOrEqual(14);
          for (const other of lanes.placed) {
            if (one === other || one.lane !== other.lane) continue;
            expect(one.to < other.from || other.to < one.from).toBe(true);
          }
        }
      }),
      { seed: 7 },
    );
  });

  it('keep a free line for names only where spans are left over', () => {
    const four = [span(1, 7), span(1, 7), span(1, 7), span(1, 7)];
    expect(lanesOfRow(four, 1, 7, 4)).toMatchObject({ laneCount: 4, left: [] });
    const five = lanesOfRow([...four, span(3, 4, 'last')], 1, 7, 4);
    expect(five.laneCount).toBe(3);
    expect(five.left.map(({ tag }) => tag)).toEqual(['1-7', 'last']);
  });

  it('go on at their height over a seam', () => {
    const month = lanesOfRow([span(1, 10, 'a'), span(5, 25, 'b'), span(22, 31, 'c')], 1, 31, 6);
    const left = cutLanes(month, 1, 8);
    const right = cutLanes(month, 9, 20);
    const laneOf = (part: typeof left, tag: string) =>
      part.placed.find(({ span: { tag: of } }) => of === tag)?.lane;
    expect(laneOf(left, 'b')).toBe(laneOf(right, 'b'));
    expect(right.placed.map(({ from, to }) => [from, to])).toEqual([
      [9, 10],
      [9, 20],
    ]);
  });
});
