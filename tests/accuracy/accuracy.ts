// npm run accuracy             a table for people
// npm run accuracy -- --json   one JSON line
// npm run accuracy -- --write  puts the table into README.md
import { readFileSync, writeFileSync } from 'node:fs';

import { accuracyReport } from './authorities.js';
import { withReportTable } from './report-table.js';

const README = new URL('../../README.md', import.meta.url);
const report = accuracyReport();

if (process.argv.includes('--json')) {
  process.stdout.write(`${JSON.stringify({ authorities: report })}\n`);
} else {
  for (const { name, count, meanDays, sdDays, maxDays } of report) {
    const figures = [meanDays, sdDays, maxDays].map((value) => value.toFixed(3).padStart(9)).join('');
    process.stdout.write(`${name.padEnd(38)}${String(count).padStart(5)}${figures}\n`);
  }
  process.stdout.write(`${'days: cases, mean, standard deviation, largest difference'.padStart(70)}\n`);
}
if (process.argv.includes('--write'))
  writeFileSync(README, withReportTable(readFileSync(README, 'utf8'), report));
