import { describe, expect, it } from 'vitest';
import {
  besideAzimuth,
  fittingCompass,
  labelsLeft,
  labelTops,
  lookView,
  placeNeighbours,
} from '#src/ui/pictures/look-layout.js';
import type { SkylineScale, SkylineView } from '#src/ui/pictures/skyline.js';

const HEIGHT = 210;
const hills = [
  { azimuthDeg: 60, altitudeDeg: 2 },
  { azimuthDeg: 80, altitudeDeg: 6 },
];

function scaleOf(view: SkylineView, width: number): SkylineScale {
  const perDeg = width / (view.toAzimuthDeg - view.fromAzimuthDeg);
  const down = HEIGHT / (view.topDeg - view.bottomDeg);
  return {
    width,
    height: HEIGHT,
    x: (azimuthDeg) => (azimuthDeg - view.fromAzimuthDeg) * perDeg,
    y: (altitudeDeg) => (view.topDeg - altitudeDeg) * down,
  };
}

describe('where to look', () => {
  it('never stretches the sky: a hand across is a hand up, on every width', () => {
    for (const width of [256, 320, 560, 1200]) {
      const scale = scaleOf(lookView(hills, 66, 14, HEIGHT)(width), width);
      expect(scale.x(76) - scale.x(66)).toBeCloseTo(scale.y(0) - scale.y(10), 6);
    }
  });

  it('keeps the words above the ground and apart from one another', () => {
    const scale = scaleOf(lookView(hills, 66, 14, HEIGHT)(320), 320);
    const tops = labelTops(
      [
        { azimuthDeg: 66, altitudeDeg: 3 },
        { azimuthDeg: 66.5, altitudeDeg: 4 },
        { azimuthDeg: 68, altitudeDeg: 14 },
      ],
      hills,
      scale,
      [],
    );
    const [low = 0, middle = 0, high = 0] = tops;
    expect(low + 24).toBeLessThanOrEqual(scale.y(6));
    expect(middle + 24).toBeLessThanOrEqual(low);
    expect(high + 24).toBeLessThanOrEqual(middle);
  });

  it('lifts the words over a slanting path that fills a narrow picture', () => {
    const scale = scaleOf(lookView(hills, 66, 14, HEIGHT)(320), 320);
    const path = Array.from({ length: 9 }, (_, step) => ({
      azimuthDeg: 66 + 2 * step,
      altitudeDeg: 6 + step,
    }));
    const tops = labelTops(path.slice(0, 3), hills, scale, path);
    for (const top of tops) expect(top + 24).toBeLessThanOrEqual(scale.y(14));
  });

  it('leaves out compass words that would run into the one nearest to the star', () => {
    const compass = [
      { azimuthDeg: 45, words: 'north-east' },
      { azimuthDeg: 67.5, words: 'east-north-east' },
      { azimuthDeg: 90, words: 'east' },
    ];
    const at = (width: number) =>
      fittingCompass(compass, 66, scaleOf(lookView(hills, 66, 14, HEIGHT)(width), width)).map(
        ({ words }) => words,
      );
    expect(at(256)).toEqual(['east-north-east']);
    expect(at(900).sort()).toEqual(['east', 'east-north-east', 'north-east']);
  });
});

describe('neighbours', () => {
  const scale = scaleOf(lookView(hills, 66, 14, HEIGHT)(600), 600);
  const place = (
    azimuthDeg: number,
    altitudeDeg: number,
    taken: { left: number; top: number; width: number; height: number }[] = [],
  ) => placeNeighbours([{ azimuthDeg, altitudeDeg, words: 'Aldebaran' }], hills, scale, taken)[0];

  it('are drawn over the ground and inside the picture only', () => {
    expect(place(70, 12)).toMatchObject({ x: scale.x(70), y: scale.y(12), words: 'right' });
    expect(place(70, 1)).toBeNull();
    expect(place(200, 12)).toBeNull();
  });

  it('have their name where there is room: right, else left, else not at all', () => {
    const x = scale.x(70);
    const y = scale.y(12);
    const right = { left: x + 12, top: y - 10, width: 80, height: 20 };
    const left = { left: x - 100, top: y - 10, width: 80, height: 20 };
    expect(place(70, 12, [right])?.words).toBe('left');
    expect(place(70, 12, [right, left])?.words).toBeNull();
    expect(place(70, 12, [{ left: x - 2, top: y - 2, width: 4, height: 4 }])).toBeNull();
  });
});

describe('directions', () => {
  it('are counted from the star, so that a path may run through north', () => {
    expect(besideAzimuth(2, 358)).toBe(362);
    expect(besideAzimuth(358, 2)).toBe(-2);
    expect(besideAzimuth(90, 100)).toBe(90);
  });

  it('put words to the right of the whole path, or to its left where the picture ends', () => {
    const scale = scaleOf(lookView([], 90, 14, HEIGHT)(600), 600);
    const at = (azimuthDeg: number) => ({ azimuthDeg, altitudeDeg: 5 });
    expect(labelsLeft([at(90), at(95)], scale)).toBeCloseTo(scale.x(95) + 26, 6);
    expect(labelsLeft([at(90), at(118)], scale)).toBeLessThan(scale.x(90));
  });
});
