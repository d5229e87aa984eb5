import { describe, expect, it } from 'vitest';
import { fitScale, type ScaleMonth } from '#src/ui/pictures/fit-scale.js';

/** Every letter is ten pixels wide. */
const width = (text: string) => text.length * 10;
const span = { first: 1, last: 100 };
const part = (dayNumber: number, days: number, short: string, narrow: string, more = {}): ScaleMonth => ({
  ...{ dayNumber, days, short, narrow },
  ...more,
});
const texts = (parts: ScaleMonth[], widthPx: number) =>
  fitScale(parts, span, widthPx, width).parts.map(({ text }) => text);

describe('names along a scale', () => {
  const four = ['Mala', 'Nedi', 'Osko', 'Pira'].map((name, index) =>
    part(1 + 25 * index, 25, name, name.slice(0, 1)),
  );

  it('are whole where they fit, and all one letter where they do not', () => {
    expect(texts(four, 200)).toEqual(['Mala', 'Nedi', 'Osko', 'Pira']);
    expect(texts(four, 180)).toEqual(['M', 'N', 'O', 'P']);
    expect(texts(four, 20)).toEqual(['', '', '', '']);
  });

  it('are never half a name: a part cut by the end of the span takes its letter, or nothing', () => {
    const cut = [part(-20, 27, 'Mala', 'M'), part(7, 90, 'Nedi', 'N'), part(97, 30, 'Osko', 'O')];
    expect(texts(cut, 300)).toEqual(['M', 'Nedi', 'O']);
    expect(texts(cut, 200)).toEqual(['M', 'Nedi', '']);
    expect(fitScale(cut, span, 300, width).parts[0]).toEqual({ dayNumber: 1, days: 6, text: 'M' });
  });

  it('do not all shorten for the sake of one short part', () => {
    const five = [...four.slice(0, 3), part(76, 5, 'Pagu', 'P'), part(81, 20, 'Rin', 'R')];
    expect(texts(five, 250)).toEqual(['Mala', 'Nedi', 'Osko', 'P', 'Rin']);
  });

  it('of a village are cut at their end while enough of them is left', () => {
    const own = four.map((each) => ({ ...each, short: `${each.short} long`, mayCut: true }));
    expect(texts(own, 200)).toEqual(own.map(({ short }) => short));
    expect(texts(own, 120)).toEqual(['M', 'N', 'O', 'P']);
  });

  it('are left out where there is one for some parts only, which take the room of those after them', () => {
    const days = Array.from({ length: 100 }, (_, index) =>
      part(index + 1, 1, String(index + 1), index % 10 === 0 ? String(index + 1) : ''),
    );
    const sparse = fitScale(days, span, 300, width);
    expect(sparse.parts.map(({ text }) => text)).toEqual([
      '1',
      '11',
      '21',
      '31',
      '41',
      '51',
      '61',
      '71',
      '81',
      '91',
    ]);
    expect(sparse.parts.every(({ days: room }) => room === 10)).toBe(true);
    expect(texts(days, 3000).slice(0, 3)).toEqual(['1', '2', '3']);
  });

  it('give way to lines alone where none of them fits', () => {
    const weeks = Array.from({ length: 20 }, (_, index) => part(1 + 5 * index, 5, '12 Jun', '12'));
    expect(fitScale(weeks, span, 300, width).parts).toHaveLength(20);
    expect(texts(weeks, 300).every((text) => text === '')).toBe(true);
  });
});
