/** Two runs that are not counted let the compiler settle; the median leaves out what the machine did besides. */
const WARM_UP_RUNS = 2;

/** Median time of several runs, milliseconds. */
export function medianMs(runs: number, work: () => void): number {
  const times: number[] = [];
  for (let run = -WARM_UP_RUNS; run < runs; run += 1) {
    const start = performance.now();
    work();
    if (run >= 0) times.push(performance.now() - start);
  }
  times.sort((left, right) => left - right);
  return times[Math.floor(times.length / 2)] ?? Number.NaN;
}
