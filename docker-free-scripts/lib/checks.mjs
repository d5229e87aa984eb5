import os from 'node:os';
import { tool } from './build.mjs';

/**
 * @typedef {object} Check
 * @property {string} name what it holds the tree against
 * @property {() => Promise<{ code: number, output: string }>} run
 */

/** Folders with a tsconfig of their own. */
const typedFolders = ['shared', 'server', 'src', 'docker-free-scripts', 'tests'];

/** One entry each in the final count. @type {Check[]} */
const checks = [
  // In two parts of like length, so that two processors share them.
  { name: 'lint of the screens', run: () => tool('eslint', ['src']) },
  { name: 'lint of the rest', run: () => tool('eslint', ['.', '--ignore-pattern', 'src/**']) },
  { name: 'types', run: allTypes },
  { name: 'format', run: () => tool('prettier', ['--check', '--log-level', 'warn', '.']) },
  {
    name: 'import rules',
    run: () =>
      tool('depcruise', [
        '--config',
        '.dependency-cruiser.mjs',
        'server',
        'shared',
        'src',
        'tests',
        'docker-free-scripts',
      ]),
  },
  {
    name: 'unused code',
    run: () => tool('knip', ['--no-progress', '--no-config-hints', '--tsConfig', 'tsconfig.lint.json']),
  },
];

/** The compiler's native edition: same language, a tenth of the time. The build itself is still by `tsc`. */
async function allTypes() {
  let output = '';
  let code = 0;
  for (const folder of typedFolders) {
    const done = await tool('tsgo', ['-p', folder, '--noEmit']);
    output += done.output;
    code ||= done.code;
  }
  return { code, output };
}

/**
 * Runs all checks, as many at once as there are processors (two at most: the compiler needs memory).
 *
 * @param {(name: string, passed: boolean, seconds: number, output: string) => void} report
 * @returns {Promise<{ passed: number, failed: number }>}
 */
export async function runChecks(report) {
  const waiting = [...checks];
  let passed = 0;
  const worker = async () => {
    for (let check = waiting.shift(); check; check = waiting.shift()) {
      const begin = performance.now();
      const { code, output } = await check.run();
      if (code === 0) passed += 1;
      report(check.name, code === 0, (performance.now() - begin) / 1000, output.trim());
    }
  };
  await Promise.all(Array.from({ length: Math.min(2, os.availableParallelism()) }, worker));
  return { passed, failed: checks.length - passed };
}
