import path from 'node:path';
import { readConfig } from './config/env.js';
import { createDataSource } from './db/data-source.js';
import { migrate } from './db/migrate.js';
import { AttachmentFilesService } from './features/attachments/attachment-files.service.js';
import { seedDemo } from './features/demo/demo.service.js';
import { holdLettersBack } from './features/letters/letter-rounds.service.js';
import { erasersOf } from './features/withdrawals/erasers.service.js';
import { replayWithdrawals } from './features/withdrawals/replay.service.js';
import { LocalFileStore } from './storage/local-file-store.js';
import { WithdrawalFile } from './storage/withdrawal-list.js';

/** `npm run db:migrate`, `db:seed` and the end of `npm run restore`: the same steps as a start of the server, without serving. */
const action = process.argv[2];
const config = readConfig();
const dataSource = createDataSource(config.database);
await dataSource.initialize();
try {
  const names = await migrate(dataSource);
  process.stdout.write(names.length > 0 ? `Migrated: ${names.join(', ')}.\n` : 'The schema is up to date.\n');
  if (action === 'seed') {
    if (!config.demo)
      throw new Error('DEMO must not be 0 (and NODE_ENV not production) to make the demo villages.');
    await seedDemo(dataSource, { now: () => config.fixedNow ?? new Date() });
    process.stdout.write('The demo villages are there.\n');
  }
  if (action === 'restored') {
    await holdLettersBack(dataSource.manager);
    const files = new AttachmentFilesService(
      new LocalFileStore(path.join(config.dataDir, 'attachments')),
      null,
    );
    const list = new WithdrawalFile(path.join(config.dataDir, 'withdrawals', 'list.jsonl'));
    const clock = { now: () => config.fixedNow ?? new Date() };
    const vanished = await replayWithdrawals(dataSource, erasersOf(files, clock), list);
    process.stdout.write(`Taken back since and gone again: ${vanished}.\n`);
  }
} finally {
  await dataSource.destroy();
}
