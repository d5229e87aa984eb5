import { existsSync, readFileSync } from 'node:fs';

/** @typedef {{ passed: number, failed: number }} Counts */

/**
 * @typedef {object} VitestReport
 * @property {number} numPassedTests
 * @property {number} numFailedTests
 * @property {{ status: string, assertionResults: unknown[] }[]} testResults
 */

/**
 * @typedef {object} PlaywrightReport
 * @property {{ expected: number, unexpected: number, flaky: number }} stats
 */

/**
 * Vitest's tests. A file that broke before its first test counts as one failure, and so does a run that
 * ended badly without a failed test (an error nobody caught, a report that is missing).
 *
 * @param {string} file
 * @param {number} exitCode
 * @returns {Counts}
 */
export function vitestCounts(file, exitCode) {
  const report = /** @type {VitestReport | undefined} */ (json(file));
  if (!report) return { passed: 0, failed: 1 };
  const broken = report.testResults.filter(
    ({ status, assertionResults }) => status === 'failed' && assertionResults.length === 0,
  ).length;
  return withExitCode({ passed: report.numPassedTests, failed: report.numFailedTests + broken }, exitCode);
}

/**
 * Playwright's journeys. One that failed and then passed, in fresh villages, counts as passed; the run names it, and it
 * is to be mended: something on the screen came later than the journey waited for.
 *
 * @param {string} file
 * @param {number} exitCode
 * @returns {Counts}
 */
export function playwrightCounts(file, exitCode) {
  const report = /** @type {PlaywrightReport | undefined} */ (json(file));
  if (!report) return { passed: 0, failed: 1 };
  const { expected, unexpected, flaky } = report.stats;
  return withExitCode({ passed: expected + flaky, failed: unexpected }, exitCode);
}

/** @param {Counts} counts @param {number} exitCode @returns {Counts} */
function withExitCode(counts, exitCode) {
  return exitCode !== 0 && counts.failed === 0 ? { ...counts, failed: 1 } : counts;
}

/** @param {string} file @returns {unknown} */
function json(file) {
  if (!existsSync(file)) return undefined;
  try {
    /** @type {unknown} */
    const value = JSON.parse(readFileSync(file, 'utf8'));
    return value;
  } catch {
    return undefined;
  }
}
