// npm run -s permissions             prints who may call what, as a Markdown table
// npm run -s permissions -- --write  puts it between its marks in the developers' guide
import { readFileSync, writeFileSync } from 'node:fs';

import { PERMISSION_GUIDE, permissionTable, withPermissionTable } from './lib/permission-table.js';

if (process.argv.includes('--write')) {
  writeFileSync(PERMISSION_GUIDE, withPermissionTable(readFileSync(PERMISSION_GUIDE, 'utf8')));
} else {
  process.stdout.write(`${permissionTable()}\n`);
}
