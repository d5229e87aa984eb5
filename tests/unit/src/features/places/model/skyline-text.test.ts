import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { skyline } from '#shared/contracts/places.js';
import {
  readSkylineText,
  withoutFullTurn,
  writeSkylineText,
} from '#src/features/places/model/skyline-text.js';

const points = (text: string) => {
  const reading = readSkylineText(text);
  if (!reading.ok) throw new Error(JSON.stringify(reading.problems));
  return reading.points.map((point) => [point.azimuthDeg, point.altitudeDeg]);
};
const problems = (text: string) => {
  const reading = readSkylineText(text);
  return reading.ok ? [] : reading.problems;
};

describe('a skyline table', () => {
  it.each([
    ['comma', '60, 3\n110,3.5'],
    ['semicolon with decimal commas', '60;3\n110;3,5'],
    ['tab', '60\t3\n110\t3.5'],
    ['colon', '60 : 3\n110 : 3.5'],
    ['blanks', '60 3\n110 3.5'],
    ['blanks with decimal commas', '60,0 3,0\n110,0 3,5'],
    ['degree signs', '60° 3°\n110°, 3.5°'],
    ['quoted cells', '"60","3"\n"110","3.5"'],
    ['a heading, empty lines and remarks', '\ufeffazimuth,altitude\r\n\r\n# east\r\n60,3\r\n110,3.5\r\n'],
    ['an empty last cell of a spreadsheet', '60;3;\n110;3.5;'],
  ])('is read with %s', (_, text) => {
    expect(points(text)).toEqual([
      [60, 3],
      [110, 3.5],
    ]);
  });

  it('comes out in order of direction', () => {
    expect(points('200,1\n10,-2\n90,4')).toEqual([
      [10, -2],
      [90, 4],
      [200, 1],
    ]);
  });

  it('takes 0 and 360 as one point where they agree', () => {
    expect(points('0,1\n90,2\n360,1')).toEqual([
      [0, 1],
      [90, 2],
    ]);
    expect(points('90,2\n360,1')).toEqual([
      [0, 1],
      [90, 2],
    ]);
  });

  it('may be empty: a level skyline', () => {
    expect(points(' \n')).toEqual([]);
  });

  it('names every wrong line with its number and what was typed', () => {
    const text = [
      'direction, height',
      '60, 3',
      '90, thirty',
      'north, 2',
      '400, 2',
      '120, 61',
      '130, -5.5',
      '140',
      '150, 1, 2',
      '60, 4',
    ].join('\n');
    expect(problems(text)).toEqual([
      { line: 3, code: 'no-height', piece: 'thirty', other: null },
      { line: 4, code: 'no-direction', piece: 'north', other: null },
      { line: 5, code: 'direction-range', piece: '400', other: null },
      { line: 6, code: 'height-range', piece: '61', other: null },
      { line: 7, code: 'height-range', piece: '-5.5', other: null },
      { line: 8, code: 'two-numbers', piece: '140', other: null },
      { line: 9, code: 'two-numbers', piece: '150, 1, 2', other: null },
      { line: 10, code: 'duplicate', piece: '60', other: 2 },
    ]);
  });

  it('asks that 360 equals 0, whichever comes first', () => {
    expect(problems('0,1\n90,2\n360,2')).toEqual([
      { line: 3, code: 'full-turn-differs', piece: '2', other: 1 },
    ]);
    expect(problems('360,2\n90,2\n0,1')).toEqual([
      { line: 3, code: 'full-turn-differs', piece: '1', other: 1 },
    ]);
  });

  it('holds at most 361 points', () => {
    const lines = Array.from({ length: 362 }, (_, index) => `${index * 0.5}, 1`);
    expect(problems(lines.join('\n'))).toEqual([{ line: 362, code: 'too-many', piece: '362', other: null }]);
  });

  it('that is read without a problem is one that the server takes', () => {
    const cell = fc.oneof(
      fc.integer({ min: -20, max: 420 }).map(String),
      fc.double({ min: -10, max: 400, noNaN: true }).map((value) => value.toFixed(1)),
      fc.constantFrom('', 'x', '1,5', '−3', '12°'),
    );
    const line = fc
      .tuple(cell, fc.constantFrom(', ', ';', '\t', ' ', ' : '), cell)
      .map((parts) => parts.join(''));
    fc.assert(
      fc.property(fc.array(line, { maxLength: 12 }), (lines) => {
        const reading = readSkylineText(lines.join('\n'));
        if (reading.ok) expect(skyline.safeParse(reading.points).success).toBe(true);
        else expect(reading.problems.length).toBeGreaterThan(0);
      }),
      { seed: 11, numRuns: 400 },
    );
  });

  it('written as text reads back as the same points', () => {
    const table = [
      { azimuthDeg: 0, altitudeDeg: 1.5 },
      { azimuthDeg: 110.25, altitudeDeg: -3 },
    ];
    const reading = readSkylineText(writeSkylineText(table));
    expect(reading).toEqual({ ok: true, points: table });
  });
});

describe('a saved skyline', () => {
  it('loses the 360 that repeats 0, and keeps a lone 360 as 0', () => {
    expect(
      withoutFullTurn([
        { azimuthDeg: 0, altitudeDeg: 1 },
        { azimuthDeg: 360, altitudeDeg: 1 },
      ]),
    ).toEqual([{ azimuthDeg: 0, altitudeDeg: 1 }]);
    expect(withoutFullTurn([{ azimuthDeg: 360, altitudeDeg: 1 }])).toEqual([
      { azimuthDeg: 0, altitudeDeg: 1 },
    ]);
  });
});
