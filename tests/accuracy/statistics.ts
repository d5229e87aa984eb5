/** How an authority and the engine differ, in days. */
export interface Accuracy {
  name: string;
  count: number;
  meanDays: number;
  sdDays: number;
  /** Largest difference, whatever its sign. */
  maxDays: number;
}

/** Mean, standard deviation and largest difference, to a thousandth of a day. */
export function accuracyOf(name: string, differencesDays: readonly number[]): Accuracy {
  const count = differencesDays.length;
  const mean = differencesDays.reduce((sum, one) => sum + one, 0) / count;
  const variance = differencesDays.reduce((sum, one) => sum + (one - mean) ** 2, 0) / count;
  return {
    name,
    count,
    meanDays: rounded(mean),
    sdDays: rounded(Math.sqrt(variance)),
    maxDays: rounded(Math.max(...differencesDays.map(Math.abs))),
  };
}

function rounded(days: number): number {
  const value = Math.round(days * 1000) / 1000;
  return value === 0 ? 0 : value;
}
