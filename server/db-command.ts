import { readConfig } from './config/env.js';
import { createDataSource } from './db/data-source.js';
import { migrate } from './db/migrate.js';
import { seedDemo } from './features/demo/demo.service.js';

/** `npm run db:migrate` and `npm run db:seed`: the same steps as a start of the server, without serving. */
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
} finally {
  await dataSource.destroy();
}
