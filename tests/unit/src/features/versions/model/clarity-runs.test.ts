import { describe, expect, it } from 'vitest';
import { clarityRuns } from '#src/features/versions/model/clarity-runs.js';

describe('the air by month', () => {
  it('is told in runs, every month once', () => {
    const air = ['clear', 'clear', 'hazy', 'ordinary', 'ordinary', 'hazy'] as const;
    expect(clarityRuns([...air, ...air])).toEqual([
      { from: 0, to: 1, clarity: 'clear' },
      { from: 2, to: 2, clarity: 'hazy' },
      { from: 3, to: 4, clarity: 'ordinary' },
      { from: 5, to: 5, clarity: 'hazy' },
      { from: 6, to: 7, clarity: 'clear' },
      { from: 8, to: 8, clarity: 'hazy' },
      { from: 9, to: 10, clarity: 'ordinary' },
      { from: 11, to: 11, clarity: 'hazy' },
    ]);
  });
});
