import { parse } from 'csv-parse/sync';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { csvText, csvWords } from '#shared/kernel/csv.js';

describe('csvText', () => {
  it('ends every line with CRLF and quotes only what RFC 4180 asks for', () => {
    expect(csvText([['a', 'b,c', 'd "e"', 'f\ng', null, 2.5]])).toBe('a,"b,c","d ""e""","f\ng",,2.5\r\n');
  });

  it('keeps the sign of numbers', () => {
    expect(csvText([[-1.46, -43]])).toBe('-1.46,-43\r\n');
  });

  it.each(['=1+1', '+1', '-0043-07-19', '@sum', '\t=1', '\r=1', '＝1'])(
    'puts an apostrophe before %j, which a spreadsheet would run',
    (text) => {
      expect(parse(csvText([[text]]))).toEqual([[`'${text}`]]);
    },
  );

  it('reads back whatever was written', () => {
    const cell = fc.string({ unit: 'binary' }).map((text) => `x${text}`);
    fc.assert(
      fc.property(fc.array(fc.array(cell, { minLength: 2, maxLength: 2 }), { minLength: 1 }), (rows) => {
        expect(parse(csvText(rows))).toEqual(rows);
      }),
    );
  });
});

describe('csvWords', () => {
  it('takes off what csvText put in front, and nothing else', () => {
    const words = fc.oneof(
      fc.string({ unit: 'binary' }),
      fc.stringMatching(/^'{0,3}[=+\-@]\d{0,3}$/u),
      fc.stringMatching(/^-\d{1,4}$/u),
    );
    fc.assert(
      fc.property(words, (text) => {
        const [[cell] = []] = parse(csvText([[text, 'end']]));
        expect(csvWords(cell ?? '')).toBe(text);
      }),
    );
  });

  it('leaves plain numbers alone, with their sign', () => {
    expect(csvText([['-5', '-1.5', '-5 days']])).toBe("-5,-1.5,'-5 days\r\n");
  });
});
