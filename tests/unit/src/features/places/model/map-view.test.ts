import { describe, expect, it } from 'vitest';
import {
  mapProjection,
  panned,
  placeAt,
  WHOLE_EARTH,
  ZOOM_MAX,
  zoomed,
  type MapView,
} from '#src/features/places/model/map-view.js';

const WIDTH = 640;
const HEIGHT = 320;
const NORTH: MapView = { longitudeDeg: 23, latitudeDeg: 66, zoom: 16 };

describe('the map', () => {
  it.each([WHOLE_EARTH, NORTH, { longitudeDeg: 179, latitudeDeg: -14, zoom: 4 }])(
    'finds under a finger the place that is drawn there (%o)',
    (view) => {
      for (const [x, y] of [
        [0, 0],
        [120, -60],
        [-200, 90],
      ] as const) {
        const { longitudeDeg, latitudeDeg } = placeAt(view, x, y, WIDTH);
        const spot = mapProjection(view, WIDTH, HEIGHT)([longitudeDeg, latitudeDeg]);
        // What is written down is rounded to what a finger can mean: at most a few pixels.
        expect(Math.abs((spot?.[0] ?? NaN) - WIDTH / 2 - x)).toBeLessThan(3);
        expect(Math.abs((spot?.[1] ?? NaN) - HEIGHT / 2 - y)).toBeLessThan(3);
      }
    },
  );

  it('follows the finger, over the date line as well', () => {
    const view = { longitudeDeg: 179, latitudeDeg: 0, zoom: 4 };
    const moved = panned(view, -WIDTH / 40, 10, WIDTH);
    expect(moved.longitudeDeg).toBeCloseTo(-178.75, 9);
    expect(moved.latitudeDeg).toBeGreaterThan(0);
  });

  it('stays on the Earth and between the whole of it and a village’s surroundings', () => {
    expect(panned(NORTH, 0, 1e6, WIDTH).latitudeDeg).toBe(85);
    expect(zoomed(NORTH, 1e6).zoom).toBe(ZOOM_MAX);
    expect(zoomed(NORTH, 0).zoom).toBe(1);
    expect(placeAt({ ...WHOLE_EARTH, latitudeDeg: 80 }, 0, -500, WIDTH).latitudeDeg).toBe(90);
  });

  it('writes tenths of a degree from afar and finer ones from near', () => {
    const far = placeAt(WHOLE_EARTH, 33, 21, WIDTH);
    expect(far.latitudeDeg).toBe(Number(far.latitudeDeg.toFixed(1)));
    const near = placeAt({ ...NORTH, zoom: ZOOM_MAX }, 33, 21, WIDTH);
    expect(near.latitudeDeg).toBe(Number(near.latitudeDeg.toFixed(3)));
  });
});
