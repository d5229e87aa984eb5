import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { partsCell, partsOfCell } from '#shared/kernel/cell-parts.js';

describe('several things in one cell', () => {
  it('are lines of parts with bars between, without bars behind the last that says something', () => {
    expect(partsCell([['bird', 'weaver', '', 'river', ''], ['soil']])).toBe('bird | weaver |  | river\nsoil');
  });

  it('are read as a person writes them, whatever ends the lines', () => {
    expect(partsOfCell('bird|weaver\r\n\n soil |  wet soil ')).toEqual([
      ['bird', 'weaver'],
      ['soil', 'wet soil'],
    ]);
    expect(partsOfCell('')).toEqual([]);
  });

  it('come back as they were, whatever stands in them', () => {
    const part = fc
      .string({ unit: fc.constantFrom('a', '|', '\\', 'n', '\n', ' ', '😀') })
      .map((text) => text.trim());
    const line = fc
      .tuple(
        fc.array(part, { maxLength: 4 }),
        part.filter((text) => text !== ''),
      )
      .map(([parts, last]) => [...parts, last]);
    fc.assert(
      fc.property(fc.array(line, { maxLength: 4 }), (lines) => {
        expect(partsOfCell(partsCell(lines))).toEqual(lines);
      }),
    );
  });
});
