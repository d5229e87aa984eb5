import { describe, expect, it } from 'vitest';

import { FIGURES, findFigure } from '#shared/sky/markers/figures.js';
import { findStar } from '#shared/sky/stars/star-table.js';

describe('figures', () => {
  it('are made of stars of the table and count their indicator among them', () => {
    for (const figure of FIGURES) {
      expect(figure.patch).toBeNull();
      expect(figure.memberHrs).toContain(figure.indicatorHr);
      for (const hr of figure.memberHrs) expect(findStar(hr), `HR ${hr}`).not.toBeNull();
    }
  });

  it('have the brightest member for an indicator', () => {
    for (const { memberHrs, indicatorHr } of FIGURES) {
      const brightest = Math.min(...memberHrs.map((hr) => findStar(hr)?.vMag ?? Infinity));
      expect(findStar(indicatorHr ?? 0)?.vMag).toBe(brightest);
    }
  });

  it('let the Pleiades behave like a star of the third class, and leave the belt to the place’s rule', () => {
    expect(findFigure('pleiades')?.thresholdOverride).toMatchObject({
      sameSideDeg: 16,
      oppositeSideDeg: 10,
    });
    expect(findFigure('orion-belt')?.thresholdOverride).toBeNull();
    expect(findFigure('hr1165')).toBeNull();
  });
});
