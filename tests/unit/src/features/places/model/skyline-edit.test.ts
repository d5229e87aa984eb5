import { describe, expect, it } from 'vitest';
import {
  addPointAfter,
  eightPoints,
  heightScale,
  movePoint,
  placesInView,
  putBack,
  sunriseAzimuths,
  turnView,
} from '#src/features/places/model/skyline-edit.js';

const three = [
  { azimuthDeg: 0, altitudeDeg: 1 },
  { azimuthDeg: 90, altitudeDeg: 4 },
  { azimuthDeg: 180, altitudeDeg: 2 },
];

describe('moving a point', () => {
  it('goes no further than a degree before its neighbours, so that the order stays', () => {
    expect(movePoint(three, 1, { azimuthDeg: 250 })[1]?.azimuthDeg).toBe(179);
    expect(movePoint(three, 1, { azimuthDeg: -20 })[1]?.azimuthDeg).toBe(1);
    expect(movePoint(three, 2, { azimuthDeg: 400 })[2]?.azimuthDeg).toBe(359);
  });

  it('stays within what a skyline can be', () => {
    expect(movePoint(three, 1, { altitudeDeg: 99 })[1]?.altitudeDeg).toBe(60);
    expect(movePoint(three, 1, { altitudeDeg: -99 })[1]?.altitudeDeg).toBe(-5);
  });

  it('changes its height alone where its direction was measured finer than our steps', () => {
    const fine = [
      { azimuthDeg: 10.2, altitudeDeg: 1 },
      { azimuthDeg: 10.7, altitudeDeg: 1 },
      { azimuthDeg: 359.6, altitudeDeg: 1 },
    ];
    expect(movePoint(fine, 2, { altitudeDeg: 3 })[2]).toEqual({ azimuthDeg: 359.6, altitudeDeg: 3 });
    expect(movePoint(fine, 1, { azimuthDeg: 5 })[1]?.azimuthDeg).toBe(11.2);
  });
});

describe('adding a point', () => {
  it('puts it on the line, in the middle of the gap that follows', () => {
    expect(addPointAfter(three, 0)).toEqual({
      points: [three[0], { azimuthDeg: 45, altitudeDeg: 2.5 }, three[1], three[2]],
      index: 1,
    });
  });

  it('reaches over north', () => {
    expect(addPointAfter(three, 2)?.points.at(-1)).toEqual({ azimuthDeg: 270, altitudeDeg: 1.5 });
  });

  it('says when there is no room', () => {
    const close = [
      { azimuthDeg: 10, altitudeDeg: 1 },
      { azimuthDeg: 11, altitudeDeg: 1 },
    ];
    expect(addPointAfter(close, 0)).toBeNull();
  });

  it('begins a level skyline with the eight winds', () => {
    expect(eightPoints().map((point) => point.azimuthDeg)).toEqual([0, 45, 90, 135, 180, 225, 270, 315]);
  });
});

describe('a point that was taken away', () => {
  it('comes back in its place among what stands there by now', () => {
    const now = [
      { azimuthDeg: 0, altitudeDeg: 9 },
      { azimuthDeg: 180, altitudeDeg: 2 },
    ];
    expect(putBack(now, { azimuthDeg: 90, altitudeDeg: 4 })).toEqual([
      now[0],
      { azimuthDeg: 90, altitudeDeg: 4 },
      now[1],
    ]);
    expect(putBack(now, { azimuthDeg: 180, altitudeDeg: 5 })).toEqual([
      now[0],
      { azimuthDeg: 180, altitudeDeg: 5 },
    ]);
  });
});

describe('the picture', () => {
  it('leaves room above the highest point for its peg, and below the lowest', () => {
    expect(heightScale(three)).toEqual({ topDeg: 8, bottomDeg: -1, levelsDeg: [2, 4, 6] });
    const steep = heightScale([{ azimuthDeg: 0, altitudeDeg: 40 }]);
    expect(steep.topDeg).toBeGreaterThan(45);
    expect(heightScale([{ azimuthDeg: 0, altitudeDeg: -5 }]).bottomDeg).toBeLessThan(-5);
  });

  it('shows north at both ends of the whole turn', () => {
    expect(placesInView(0, turnView(null))).toEqual([0, 360]);
    expect(placesInView(0, turnView('east'))).toEqual([0]);
    expect(placesInView(0, turnView('west'))).toEqual([360]);
    expect(placesInView(90, turnView('west'))).toEqual([]);
  });

  it('marks where the Sun comes up in the course of a year, and all of it beyond the polar circle', () => {
    // On the equator the Sun rises within its own declination of east: 90° ± 23.44°.
    expect(sunriseAzimuths(0).fromDeg).toBeCloseTo(66.56, 2);
    expect(sunriseAzimuths(0).toDeg).toBeCloseTo(113.44, 2);
    expect(sunriseAzimuths(70)).toEqual({ fromDeg: 0, toDeg: 180 });
  });
});
