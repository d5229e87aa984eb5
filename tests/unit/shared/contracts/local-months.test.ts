import { describe, expect, it } from 'vitest';
import { localMonths, moonNames, unnamedMoons } from '#shared/contracts/local-months.js';

const begins = (month: number, day: number, name = 'Wet leaf') => ({ name, begins: { month, day } });
const refusals = (schema: typeof localMonths | typeof moonNames, value: unknown) =>
  schema.safeParse(value).error?.issues.map(({ path, message }) => `${path.join('.')}: ${message}`);

describe('months of a village', () => {
  it('never begin on one day: the second of the two is named', () => {
    expect(refusals(localMonths, [begins(6, 8), begins(7, 5), begins(6, 8, 'Dry leaf')])).toEqual([
      '2.begins: day-taken',
    ]);
    expect(localMonths.safeParse([begins(6, 8), begins(8, 6)]).success).toBe(true);
  });

  it('have a name and a day that every year has', () => {
    expect(refusals(localMonths, [begins(6, 8, '  ')])).toEqual(['0.name: required']);
    expect(refusals(localMonths, [begins(2, 29)])).toEqual(['0.begins.day: no-such-day']);
  });

  it('are at most 24', () => {
    const many = (count: number) => Array.from({ length: count }, (_, index) => begins(1, index + 1));
    expect(localMonths.safeParse(many(24)).success).toBe(true);
    expect(refusals(localMonths, many(25))).toEqual([': too-many-months']);
  });
});

it('names of Moons are thirteen, and each may be left out', () => {
  expect(moonNames.safeParse(unnamedMoons()).success).toBe(true);
  expect(moonNames.safeParse(unnamedMoons().slice(1)).success).toBe(false);
});
