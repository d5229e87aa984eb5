import { describe, expect, it } from 'vitest';
import { eyeWay, halfHands, handsFigure } from '#shared/kernel/hands.js';

describe('hands', () => {
  it('are told to the nearest half', () => {
    expect([0, 2.4, 2.6, 7.4, 10, 14, 30].map(halfHands)).toEqual([0, 0, 0.5, 0.5, 1, 1.5, 3]);
    expect(halfHands(-4)).toBe(0);
  });

  it('are written with a half', () => {
    expect([0.5, 1, 1.5, 3].map(handsFigure)).toEqual(['½', '1', '1½', '3']);
  });
});

describe('the way an eye goes', () => {
  it.each([
    [0, 'up'],
    [22, 'up'],
    [23, 'up-right'],
    [90, 'right'],
    [180, 'down'],
    [225, 'down-left'],
    [359, 'up'],
    [-45, 'up-left'],
  ])('%d° is %s', (bearing, way) => {
    expect(eyeWay(bearing)).toBe(way);
  });
});
