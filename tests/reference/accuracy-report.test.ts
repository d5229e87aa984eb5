import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';

import { accuracyReport } from '#tests/accuracy/authorities.js';
import { withReportTable } from '#tests/accuracy/report-table.js';
import { accuracyOf } from '#tests/accuracy/statistics.js';
import { PROPERTY_TIMEOUT_MS } from '#tests/support/sky/arbitraries.js';

describe('the accuracy report', () => {
  it(
    'stands in the readme as it comes out; else run `npm run accuracy -- --write`',
    { timeout: PROPERTY_TIMEOUT_MS },
    () => {
      const readme = readFileSync(new URL('../../README.md', import.meta.url), 'utf8');
      const report = accuracyReport();
      expect(readme).toBe(withReportTable(readme, report));
      // What other ephemerides could move is far below a day; scans of the same rule agree to the day.
      const worst = (name: string): number =>
        report.find((one) => one.name.startsWith(name))?.maxDays ?? Number.NaN;
      expect(worst('ERFA')).toBeLessThan(0.02);
      expect(worst('PyEphem')).toBeLessThan(0.03);
      expect(worst('independent scan')).toBeLessThanOrEqual(1);
      expect(worst('plain scan')).toBeLessThanOrEqual(1);
    },
  );

  it('tells mean, standard deviation and the largest difference of either sign', () => {
    expect(accuracyOf('some', [1, -3, 2, 0])).toEqual({
      name: 'some',
      count: 4,
      meanDays: 0,
      sdDays: 1.871,
      maxDays: 3,
    });
  });

  it('writes between its marks only, and refuses a text without them', () => {
    const text = 'before\n<!-- accuracy:begin -->\nold\n<!-- accuracy:end -->\nafter\n';
    const written = withReportTable(text, [accuracyOf('dates', [-1, 0, -1])]);
    expect(written).toMatch(/^before\n.*\| dates \| 3 \| −0\.7 \| 0\.5 \| 1\.0 \|.*\nafter\n$/su);
    expect(written).not.toContain('old');
    expect(() => withReportTable('nothing', [])).toThrow(/accuracy:begin/u);
  });
});
