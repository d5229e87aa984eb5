import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  fitStatements,
  joinLabel,
  lineBoxes,
  onOneLine,
  textBlock,
  textUpward,
  wrapLabel,
  wrapText,
} from '#shared/sheet/text-layout.js';
import { plainMeasurer } from '#tests/support/sheet/plain-measurer.js';

const style = { role: 'event-name', sizePt: 30, weight: 700 } as const;
const foot = { role: 'foot', sizePt: 12, weight: 400 } as const;

describe('wrapping', () => {
  it('makes lines no wider than the room, loses no letter, and parts no letter from its mark', () => {
    fc.assert(
      fc.property(
        fc.array(fc.constantFrom('ɔ̃́', 'ŋ', 'sow', 'Ɓèŋu̍', 'Donaudampfschifffahrt', 'g͡b', 'क्ष'), {
          maxLength: 15,
        }),
        fc.integer({ min: 20, max: 150 }),
        (parts, widthMm) => {
          const text = parts.join(' ');
          const lines = wrapText(text, widthMm, style, plainMeasurer);
          for (const line of lines) {
            expect(plainMeasurer.widthMm(line, style)).toBeLessThanOrEqual(widthMm);
            expect(line).not.toMatch(/^\p{M}/u);
          }
          expect(lines.join('').replaceAll(' ', '')).toBe(text.normalize('NFC').replaceAll(' ', ''));
        },
      ),
      { seed: 11 },
    );
  });

  it('keeps a date whole over its no-break space, and line breaks that were typed', () => {
    expect(wrapText('until 5\u00a0July\nask', 40, foot, plainMeasurer)).toEqual(['until 5\u00a0July', 'ask']);
    expect(wrapText('until the 5\u00a0July', 25, foot, plainMeasurer)).toEqual(['until the', '5\u00a0July']);
  });

  it('composes what was typed as letter and mark', () => {
    expect(wrapText('e\u0301', 40, foot, plainMeasurer)).toEqual(['\u00e9']);
  });
});

describe('a label', () => {
  it('says the village’s words first, then the officer’s, on one line where they fit', () => {
    expect(wrapLabel({ village: 'Ŋɔ́', officer: 'Sow' }, 150, style, plainMeasurer)).toEqual(['Ŋɔ́ · Sow']);
  });

  it('begins a line for each language where they do not', () => {
    const lines = wrapLabel({ village: 'Ŋɔ́rɛ̃ ɗí', officer: 'Sow short millet' }, 110, style, plainMeasurer);
    expect(lines).toEqual(['Ŋɔ́rɛ̃ ɗí'.normalize('NFC'), 'Sow short millet']);
  });

  it.each([
    [{ village: '', officer: 'Sow' }, 'Sow'],
    [{ village: 'Sow', officer: 'Sow' }, 'Sow'],
    [{ village: 'Ŋɔ́', officer: ' ' }, 'Ŋɔ́'],
  ])('says one of them where the other is missing or the same', (label, expected) => {
    expect(joinLabel(label)).toBe(expected.normalize('NFC'));
  });
});

describe('statements in a small room', () => {
  it('are left out whole and named, never cut', () => {
    const { lines, leftOut } = fitStatements(
      ['Short one.', 'x'.repeat(200), 'Ends.'],
      60,
      1,
      foot,
      plainMeasurer,
    );
    expect(lines).toEqual(['Short one. Ends.']);
    expect(leftOut).toEqual(['x'.repeat(200)]);
  });

  it('of one line show that they go on', () => {
    expect(onOneLine('A very long name of a village', 40, foot, plainMeasurer)).toMatch(/^A very .*…$/u);
    expect(onOneLine('Short', 40, foot, plainMeasurer)).toBe('Short');
  });
});

describe('text on a page', () => {
  it('below its floor is refused', () => {
    expect(() => textBlock(['Sow'], { x: 0, top: 0 }, { ...style, sizePt: 29 }, plainMeasurer)).toThrow(
      RangeError,
    );
  });

  it('covers the ground of its lines, marks above and below included', () => {
    const text = textBlock(['one', 'two'], { x: 50, top: 10, align: 'right' }, style, plainMeasurer);
    const [first, second] = lineBoxes(text);
    expect(first?.x).toBeCloseTo(50 - plainMeasurer.widthMm('one', style), 3);
    // 30 pt = 10.583 mm; room 1.02 em above the baseline and 0.36 em below.
    expect(first?.height).toBeCloseTo(1.38 * 10.583, 2);
    expect(second && first && second.y - first.y).toBeCloseTo(1.5 * 10.583, 2);
  });

  it('that reads upwards is as tall as it is long', () => {
    const text = textUpward('measure me', { x: 15, middle: 100 }, foot, plainMeasurer);
    const length = plainMeasurer.widthMm('measure me', foot);
    expect(text.box.height).toBeCloseTo(length, 3);
    expect(text.box.y).toBeCloseTo(100 - length / 2, 3);
    expect(text.turnDeg).toBe(90);
  });
});
