import { describe, expect, it } from 'vitest';
import { daysDragged, daysOfKey, partAt } from '#src/ui/pictures/day-drag.js';

describe('a finger on a bar', () => {
  it('means an end near an end, and the whole bar in its middle', () => {
    expect([partAt(3, 100), partAt(50, 100), partAt(97, 100)]).toEqual(['start', 'all', 'end']);
  });

  it('means the whole of a bar that is too short to have ends', () => {
    expect([partAt(1, 30), partAt(29, 30)]).toEqual(['all', 'all']);
  });

  it('snaps to whole days, both ways, and moves nothing on a picture without width', () => {
    expect([daysDragged(5, 3), daysDragged(-5, 3), daysDragged(1, 3), daysDragged(-1, 3)]).toEqual([
      2, -2, 0, 0,
    ]);
    expect(daysDragged(40, 0)).toBe(0);
  });
});

it('arrow keys move by a day, with Shift by ten', () => {
  expect([
    daysOfKey('ArrowLeft', false),
    daysOfKey('ArrowRight', false),
    daysOfKey('ArrowLeft', true),
    daysOfKey('ArrowRight', true),
    daysOfKey('ArrowUp', false),
    daysOfKey('Enter', false),
  ]).toEqual([-1, 1, -10, 10, null, null]);
});
