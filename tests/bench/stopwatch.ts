/** Two runs that are not counted let the compiler settle. */
const WARM_UP_RUNS = 2;

/**
 * Time of the fastest of several runs, milliseconds. Whatever else the machine does only ever adds time, so the fastest
 * run says most about the work itself, and two kinds of work are compared fairly.
 */
export function fastestMs(runs: number, work: () => void): number {
  let fastest = Number.POSITIVE_INFINITY;
  for (let run = -WARM_UP_RUNS; run < runs; run += 1) {
    const start = performance.now();
    work();
    if (run >= 0) fastest = Math.min(fastest, performance.now() - start);
  }
  return fastest;
}
