import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { canonicalJson, CanonicalJsonError, sameJson } from '#shared/kernel/canonical-json.js';

describe('canonical JSON', () => {
  // RFC 8785 sections 3.2.2 and 3.2.3: sample values given there (from memory).
  it('writes numbers as RFC 8785 shows', () => {
    expect(
      canonicalJson([Number('333333333.33333329'), 1e30, 4.5, 2e-3, 0.000000000000000000000000001]),
    ).toBe('[333333333.3333333,1e+30,4.5,0.002,1e-27]');
    expect(canonicalJson(-0)).toBe('0');
  });

  it('sorts the members of objects by UTF-16 code units as RFC 8785 shows', () => {
    const text = canonicalJson({
      '\u20ac': 'Euro Sign',
      '\r': 'Carriage Return',
      '\ufb33': 'Hebrew Letter Dalet With Dagesh',
      '1': 'One',
      '\ud83d\ude00': 'Emoji: Grinning Face',
      '\u0080': 'Control',
      '\u00f6': 'Latin Small Letter O With Diaeresis',
    });
    expect(Object.values(JSON.parse(text) as Record<string, string>)).toEqual([
      // An object's integer-like name comes first whatever the text says; the text itself is checked below.
      'One',
      'Carriage Return',
      'Control',
      'Latin Small Letter O With Diaeresis',
      'Euro Sign',
      'Emoji: Grinning Face',
      'Hebrew Letter Dalet With Dagesh',
    ]);
    expect(text.startsWith('{"\\r":"Carriage Return","1":"One",')).toBe(true);
  });

  it('is the same for values that differ in the order of members only', () => {
    expect(canonicalJson({ b: [1, { d: 1, c: null }], a: true })).toBe('{"a":true,"b":[1,{"c":null,"d":1}]}');
    expect(sameJson({ a: 1, b: 2 }, { b: 2, a: 1 })).toBe(true);
    expect(sameJson([1, 2], [2, 1])).toBe(false);
  });

  it('leaves letters as they are: composed and decomposed spellings differ', () => {
    expect(canonicalJson('Ŋɔ́rɛ̃')).toBe('"Ŋɔ́rɛ̃"');
    expect(sameJson('é', 'e\u0301')).toBe(false);
  });

  it('holds every JSON value without loss, and its own text again', () => {
    fc.assert(
      fc.property(fc.jsonValue({ stringUnit: 'grapheme' }), (value) => {
        const text = canonicalJson(value);
        const back: unknown = JSON.parse(text);
        expect(canonicalJson(back)).toBe(text);
        // JSON has no minus zero; everything else comes back as it was.
        expect(back).toEqual(JSON.parse(JSON.stringify(value)));
      }),
      { numRuns: 300, seed: 12 },
    );
  });

  it.each([
    ['an absent value', { a: undefined }, '$.a'],
    ['not a number', [0, Number.NaN], '$.1'],
    ['infinity', { a: { b: Infinity } }, '$.a.b'],
    ['a function', { a: () => 1 }, '$.a'],
    ['a big integer', [1n], '$.0'],
    ['a date', { at: new Date(0) }, '$.at'],
    ['a map', new Map([['a', 1]]), '$'],
    ['half of a surrogate pair', { a: '\ud83d' }, '$.a'],
    // eslint-disable-next-line no-sparse-arrays -- the hole is what is tested
    ['a hole in a list', [1, , 3], '$.1'],
  ])('refuses %s and says where it stands', (_, value, path) => {
    expect(() => canonicalJson(value)).toThrow(CanonicalJsonError);
    expect(() => canonicalJson(value)).toThrow(path);
  });

  it('refuses a value that contains itself, but not one that is named twice', () => {
    const loop: Record<string, unknown> = {};
    loop['self'] = loop;
    expect(() => canonicalJson(loop)).toThrow(CanonicalJsonError);
    const shared = { a: 1 };
    expect(canonicalJson([shared, shared])).toBe('[{"a":1},{"a":1}]');
  });
});
