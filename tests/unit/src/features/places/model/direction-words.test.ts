import { describe, expect, it } from 'vitest';
import { directionWords, handsHigh } from '#src/features/places/model/direction-words.js';

describe('a direction in words', () => {
  it.each([
    [0, 'n', null],
    [357, 'n', null],
    [93, 'e', null],
    [110, 'e', 's'],
    [70, 'e', 'n'],
    [190, 's', 'w'],
    [350, 'n', 'w'],
    [45, 'ne', null],
    [56, 'ne', null],
    [292, 'wnw', null],
  ] as const)('%d° is %s, leaning to %s', (azimuthDeg, point, leansTo) => {
    expect(directionWords(azimuthDeg)).toEqual({ point, leansTo });
  });
});

describe('a height in hands', () => {
  it.each([
    [-2, { key: 'below' }],
    [0, { key: 'level' }],
    [1.5, { key: 'part', part: 'eighth' }],
    [3.5, { key: 'part', part: 'third' }],
    [5, { key: 'part', part: 'half' }],
    [8, { key: 'part', part: 'three-quarters' }],
    [10, { key: 'hands', count: 1 }],
    [24, { key: 'hands', count: 2.5 }],
  ] as const)('%d° is %o', (altitudeDeg, hands) => {
    expect(handsHigh(altitudeDeg)).toEqual(hands);
  });
});
