import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  readCoordinate,
  splitPair,
  writeCoordinate,
  type Axis,
} from '#src/features/places/model/coordinate.js';

const degrees = (text: string, axis: Axis = 'latitude') => {
  const reading = readCoordinate(text, axis);
  return reading.ok ? reading.valueDeg : reading.problem;
};

describe('a coordinate', () => {
  it.each([
    ['12° 30′ S', -12.5],
    ["12°30'S", -12.5],
    ['S 12 30', -12.5],
    ['12.5S', -12.5],
    ['12,5 s', -12.5],
    ['-12.5', -12.5],
    ['−12.5', -12.5],
    ['+12.5', 12.5],
    ['12.5', 12.5],
    ['12.5°', 12.5],
    ['12 degrees 30 min north', 12.5],
    ['12d 30m 0s N', 12.5],
    ['12 30 15 N', 12.504167],
    ['12° 30′ 15″ N', 12.504167],
    ['12° 30.25′ N', 12.504167],
    ['0', 0],
    ['-0', 0],
    ['0° 0′ S', 0],
    ['90 N', 90],
    ['007° 05′ N', 7.083333],
  ])('reads %j as %d degrees of latitude', (text, expected) => {
    expect(degrees(text)).toBe(expected);
  });

  it.each([
    ['39° 15′ E', 39.25],
    ['70W', -70],
    ['W 70° 30′', -70.5],
    ['39d 15m 30s E', 39.258333],
    ['180', 180],
    ['-180', -180],
  ])('reads %j as %d degrees of longitude', (text, expected) => {
    expect(degrees(text, 'longitude')).toBe(expected);
  });

  it.each([
    ['', 'required', ''],
    ['   ', 'required', ''],
    ['twelve', 'no-number', 'twelve'],
    ['N', 'no-number', 'N'],
    ['12° 75′ N', 'minutes', '75'],
    ['12° 60′ N', 'minutes', '60'],
    ['12° 30′ 61″', 'seconds', '61'],
    ['12.5° 30′', 'fraction-not-last', '12.5'],
    ['95 N', 'range', '95'],
    ['90° 0′ 1″', 'range', '90'],
    ['12 E', 'wrong-letter', 'E'],
    ['-12 S', 'sign-and-letter', 'S'],
    ['12 N S', 'two-letters', 'N, S'],
    ['1 2 3 4', 'too-many-numbers', '1 2 3 4'],
    ['12-30', 'unreadable', '-'],
    ['12 cats', 'unreadable', 'cats'],
    ['12..5', 'unreadable', '..5'],
  ])('refuses the latitude %j (%s) and names what to change', (text, code, value) => {
    expect(degrees(text)).toEqual({ code, value });
  });

  it('refuses a longitude beyond half a turn, and a letter of the other axis', () => {
    expect(degrees('181', 'longitude')).toEqual({ code: 'range', value: '181' });
    expect(degrees('39 N', 'longitude')).toEqual({ code: 'wrong-letter', value: 'N' });
  });

  it('written as text reads back as the same number, to a millionth of a degree', () => {
    for (const [axis, limit] of [
      ['latitude', 90],
      ['longitude', 180],
    ] as const) {
      fc.assert(
        fc.property(fc.double({ min: -limit, max: limit, noNaN: true }), (valueDeg) => {
          const rounded = Number(valueDeg.toFixed(6)) + 0;
          expect(degrees(writeCoordinate(rounded, axis), axis)).toBe(rounded);
        }),
        { seed: 7 },
      );
    }
  });

  it('is written as degrees and minutes where these say it exactly', () => {
    expect(writeCoordinate(-12.5, 'latitude').replaceAll('\u00a0', ' ')).toBe('12° 30′ S');
    expect(writeCoordinate(39, 'longitude').replaceAll('\u00a0', ' ')).toBe('39° 0′ E');
    expect(writeCoordinate(12.504167, 'latitude').replaceAll('\u00a0', ' ')).toBe('12° 30′ 15″ N');
    expect(writeCoordinate(12.345678, 'latitude').replaceAll('\u00a0', ' ')).toBe('12.345678° N');
  });
});

describe('two coordinates in one field', () => {
  it.each([
    ['12° 30′ S, 39 15 E', '12° 30′ S', '39 15 E'],
    ['12.5 N 39.25 E', '12.5 N', '39.25 E'],
    ['-12.5, 39.25', '-12.5', '39.25'],
    ['12,5; 39,25', '12,5', '39,25'],
  ])('%j are taken apart', (text, latitude, longitude) => {
    expect(splitPair(text)).toEqual({ latitude, longitude });
  });

  it.each(['12,5', '12 30', '12.5', 'here, there', '95, 39'])('%j is no such pair', (text) => {
    expect(splitPair(text)).toBeNull();
  });
});
