import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { playwrightCounts, vitestCounts } from '../../../../docker-free-scripts/lib/test-counts.mjs';

let folder: string;
beforeAll(() => {
  folder = mkdtempSync(path.join(os.tmpdir(), 'dawnpeg-counts-'));
});
afterAll(() => {
  rmSync(folder, { recursive: true, force: true });
});

function report(content: unknown): string {
  const file = path.join(folder, 'report.json');
  writeFileSync(file, typeof content === 'string' ? content : JSON.stringify(content));
  return file;
}

const file = (status: string, tests: number) => ({
  status,
  assertionResults: Array.from({ length: tests }, () => ({})),
});

describe('the count of unit and API tests', () => {
  it('is what the report says', () => {
    const written = report({ numPassedTests: 7, numFailedTests: 2, testResults: [file('failed', 9)] });
    expect(vitestCounts(written, 1)).toEqual({ passed: 7, failed: 2 });
  });

  it('has one failure for each file that broke before its first test', () => {
    const written = report({
      numPassedTests: 3,
      numFailedTests: 0,
      testResults: [file('passed', 3), file('failed', 0), file('failed', 0)],
    });
    expect(vitestCounts(written, 1)).toEqual({ passed: 3, failed: 2 });
  });

  it('has a failure when the run ended badly although every test passed', () => {
    const written = report({ numPassedTests: 3, numFailedTests: 0, testResults: [file('passed', 3)] });
    expect(vitestCounts(written, 1)).toEqual({ passed: 3, failed: 1 });
    expect(vitestCounts(written, 0)).toEqual({ passed: 3, failed: 0 });
  });

  it.each([
    ['missing', () => path.join(folder, 'not-there.json')],
    ['cut off', () => report('{"numPassedTests": 3')],
  ])('has a failure when the report is %s, even after a good end', (_, written) => {
    expect(vitestCounts(written(), 0)).toEqual({ passed: 0, failed: 1 });
  });
});

describe('the count of journeys', () => {
  it('counts one that passed in fresh villages, and one that failed twice', () => {
    const written = report({ stats: { expected: 4, unexpected: 1, flaky: 1 } });
    expect(playwrightCounts(written, 1)).toEqual({ passed: 5, failed: 1 });
  });

  it('has a failure when nothing could be started', () => {
    expect(playwrightCounts(report({ stats: { expected: 0, unexpected: 0, flaky: 0 } }), 1)).toEqual({
      passed: 0,
      failed: 1,
    });
  });
});
