import process from 'node:process';
import { secondsSinceStart } from './say.mjs';

/** The invented people of the demo villages (server/features/demo makes them). */
const demoPeople = [
  ['Upper Tazimel', 'officer', 'steward', 'elder', 'elder2', 'elder3', 'staff', 'observer'],
  ['Vardesca Terraces', 'officer2', 'steward2', 'elder-b1', 'elder-b2', 'observer2'],
  ['Tholmere Landing', 'officer3', 'steward3', 'elder-c1', 'elder-c2', 'elder-c3', 'observer3'],
];

/**
 * The last words of a successful start: where to go, and who one can be there.
 *
 * @param {string} address
 * @param {boolean} demo
 */
export function welcome(address, demo) {
  const lines = ['', `  Dawnpeg is ready at ${address}   (${secondsSinceStart().toFixed(1)} s)`, ''];
  if (demo) {
    lines.push('  Demo accounts, each NAME@dawnpeg.example with the password limewash-and-pegs:');
    for (const [village, ...names] of demoPeople) lines.push(`    ${village}: ${names.join(', ')}`);
    lines.push('', `  Letters of the demo are read at ${address}/dev/letters`, '');
  }
  lines.push('  Ctrl-C stops it; nothing is lost.', '');
  process.stdout.write(`${lines.join('\n')}\n`);
}
