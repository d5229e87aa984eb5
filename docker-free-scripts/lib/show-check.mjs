import process from 'node:process';

/**
 * One line for a check that holds; everything it said for one that does not.
 *
 * @param {string} name
 * @param {boolean} passed
 * @param {number} seconds
 * @param {string} output
 */
export function showCheck(name, passed, seconds, output) {
  process.stdout.write(`${passed ? '✓' : '✗'} ${name} (${seconds.toFixed(1)} s)\n`);
  if (!passed) process.stdout.write(`${output}\n\n`);
}
