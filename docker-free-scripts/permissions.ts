// npm run -s permissions             prints who may call what, as a Markdown table
// npm run -s permissions -- --write  puts it, and who sees what, between their marks in the developers' guide
import { readFileSync, writeFileSync } from 'node:fs';

import { PERMISSION_GUIDE, permissionTable, withPermissionTable } from './lib/permission-table.js';
import { withVisibilityTables } from './lib/visibility-table.js';

if (process.argv.includes('--write')) {
  const guide = readFileSync(PERMISSION_GUIDE, 'utf8');
  writeFileSync(PERMISSION_GUIDE, withVisibilityTables(withPermissionTable(guide)));
} else {
  process.stdout.write(`${permissionTable()}\n`);
}
