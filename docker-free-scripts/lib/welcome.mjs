import process from 'node:process';
import { secondsSinceStart } from './say.mjs';

/** The invented people of the demo villages (server/db/seeds makes them). */
const demoPeople = ['steward', 'officer', 'elder', 'elder2', 'elder3', 'staff', 'observer', 'officer2'];

/**
 * The last words of a successful start: where to go, and who one can be there.
 *
 * @param {string} address
 * @param {boolean} demo
 */
export function welcome(address, demo) {
  const lines = ['', `  Dawnpeg is ready at ${address}   (${secondsSinceStart().toFixed(1)} s)`, ''];
  if (demo) {
    lines.push('  Demo accounts, all with the password limewash-and-pegs:');
    for (const name of demoPeople) lines.push(`    ${name}@dawnpeg.example`);
    lines.push('', `  Letters of the demo are read at ${address}/dev/letters`, '');
  }
  lines.push('  Ctrl-C stops it; nothing is lost.', '');
  process.stdout.write(`${lines.join('\n')}\n`);
}
