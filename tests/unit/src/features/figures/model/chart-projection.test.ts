import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  project,
  separationDeg,
  unproject,
  viewAround,
  type ChartView,
} from '#src/features/figures/model/chart-projection.js';

const ORION: ChartView = { centre: { rightAscensionDeg: 84, declinationDeg: 0 }, radiusDeg: 20 };
const at = (rightAscensionDeg: number, declinationDeg: number) => ({ rightAscensionDeg, declinationDeg });

describe('the neighbourhood on paper', () => {
  it('has north up and east to the left, as somebody sees it who looks up', () => {
    expect(project(ORION, at(84, 10))?.y).toBeLessThan(0);
    expect(project(ORION, at(94, 0))?.x).toBeLessThan(0);
    expect(project(ORION, ORION.centre)).toEqual({ x: -0, y: -0 });
  });

  it('reaches from the middle to the edge in as many degrees as it says', () => {
    expect(project(ORION, at(84, 20))?.y).toBeCloseTo(-1, 9);
    expect(project(ORION, at(64, 0))?.x).toBeCloseTo(1, 9);
  });

  it('leaves the far half of the sky out', () => {
    expect(project(ORION, at(264, 0))).toBeNull();
  });

  it('finds the place under a finger, also across 0 h and beside a pole', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0, max: 359.9, noNaN: true }),
        fc.double({ min: -88, max: 88, noNaN: true }),
        fc.double({ min: -0.9, max: 0.9, noNaN: true }),
        fc.double({ min: -0.9, max: 0.9, noNaN: true }),
        (rightAscensionDeg, declinationDeg, x, y) => {
          const view = { centre: at(rightAscensionDeg, declinationDeg), radiusDeg: 15 };
          const back = project(view, unproject(view, { x, y }));
          expect(back?.x).toBeCloseTo(x, 6);
          expect(back?.y).toBeCloseTo(y, 6);
        },
      ),
      { seed: 7, numRuns: 100 },
    );
  });
});

describe('a view around stars', () => {
  it('holds every one of them, across 0 h too', () => {
    const stars = [at(355, 10), at(5, 12), at(0, -8)];
    const view = viewAround(stars);
    expect(view).not.toBeNull();
    for (const star of stars) {
      const spot = view && project(view, star);
      expect(Math.hypot(spot?.x ?? 9, spot?.y ?? 9)).toBeLessThan(1);
    }
    expect(viewAround([])).toBeNull();
  });

  it('measures angles as they are on the sphere', () => {
    expect(separationDeg(at(0, 90), at(123, 0))).toBeCloseTo(90, 9);
    expect(separationDeg(at(350, 0), at(10, 0))).toBeCloseTo(20, 9);
  });
});
