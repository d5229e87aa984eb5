import { describe, expect, it } from 'vitest';
import { ICON_KEYS } from '#shared/sheet/icons.js';
import { pathsOf } from '#shared/sheet/page-paths.js';
import type { RectPrimitive } from '#shared/sheet/primitives.js';
import { HATCH_GAP_MM, HATCH_STROKE_MM } from '#shared/sheet/strokes.js';

function numbersOf(d: string): number[] {
  return d.match(/-?\d+\.?\d*/gu)?.map(Number) ?? [];
}

const bar: RectPrimitive = {
  type: 'rect',
  role: 'margin',
  x: 20,
  y: 30,
  width: 60,
  height: 2.4,
  fill: 'hatch',
  strokeMm: 0.35,
  cornerMm: 0,
};

describe('paths', () => {
  it('of a hatch keep inside the bar, with 1.2 mm and more of clear paper between two lines', () => {
    const hatch = pathsOf(bar)[1];
    const lines = hatch?.d.split('M').slice(1).map(numbersOf) ?? [];
    expect(lines.length).toBeGreaterThan(20);
    const bottoms: number[] = [];
    for (const [x1 = 0, y1 = 0, x2 = 0, y2 = 0] of lines) {
      for (const x of [x1, x2]) expect(x >= 20 && x <= 80).toBe(true);
      for (const y of [y1, y2]) expect(y >= 29.999 && y <= 32.401).toBe(true);
      expect((y1 - y2) / (x2 - x1)).toBeCloseTo(1, 3);
      bottoms.push(x1 - (32.4 - y1));
    }
    for (const [index, at] of bottoms.slice(1).entries()) {
      const across = (at - (bottoms[index] ?? 0)) / Math.SQRT2 - HATCH_STROKE_MM;
      expect(across).toBeGreaterThanOrEqual(1.2);
      expect(across).toBeCloseTo(HATCH_GAP_MM, 3);
    }
  });

  it('of a ring put no ink inside it but the cross', () => {
    const ring = {
      type: 'ring',
      date: '2027-06-01',
      cx: 10,
      cy: 10,
      radius: 3,
      crossLength: 3,
      strokeMm: 0.35,
    } as const;
    const plain = pathsOf({ ...ring, dashed: false });
    expect(plain.every((path) => path.fill === null)).toBe(true);
    expect(plain[0]?.dashMm).toBeNull();
    expect(plain[1]?.d).toBe('M8.5 10H11.5M10 8.5V11.5');
    // Dashes and gaps go evenly around 2π · 3 mm.
    const [dash = 0, gap = 0] = pathsOf({ ...ring, dashed: true })[0]?.dashMm ?? [];
    expect((dash + gap) * 8).toBeCloseTo(2 * Math.PI * 3, 6);
  });

  it('of a bar are 100 mm over the outer edges of its ticks', () => {
    const [across] = pathsOf({
      type: 'scale-bar',
      axis: 'across',
      x: 20,
      y: 50,
      length: 100,
      tickLength: 5,
      strokeMm: 0.4,
    });
    const ticks =
      across?.d
        .split('M')
        .slice(2)
        .map((part) => numbersOf(part)[0] ?? 0) ?? [];
    expect((ticks[1] ?? 0) + 0.2 - ((ticks[0] ?? 0) - 0.2)).toBeCloseTo(100, 6);
    expect(across?.cap).toBe('butt');
  });

  it('exist for every sign, placed and scaled', () => {
    for (const icon of ICON_KEYS) {
      const paths = pathsOf({ type: 'icon', icon, x: 5, y: 6, size: 15 });
      expect(paths.length).toBeGreaterThan(0);
      for (const path of paths) expect(path.move).toEqual({ x: 5, y: 6, scale: 15 / 48 });
    }
  });

  it('tell solid, hatched and open bars apart without colour', () => {
    const fills = (fill: RectPrimitive['fill']) =>
      pathsOf({ ...bar, fill }).map((path) => [path.fill, path.stroke]);
    expect(fills('solid')[0]).toEqual(['ink', null]);
    expect(fills('open')).toEqual([
      ['paper', null],
      [null, 'ink'],
    ]);
    expect(fills('hatch')).toHaveLength(3);
  });
});
