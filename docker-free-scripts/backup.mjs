/**
 * `npm run backup` and `npm run restore`: everything the villages own as one folder, and back again.
 *
 *   npm run backup                          into data/backups
 *   npm run backup -- --to FOLDER           into a folder elsewhere, a disk that is carried away
 *   npm run restore -- BACKUP               into an installation that holds nothing yet
 *   npm run restore -- BACKUP --replace     instead of what is there, which is saved first
 *   npm run restore -- BACKUP --withdrawals FILE   with the list of the machine that is lost
 */
import { existsSync } from 'node:fs';
import path from 'node:path';
import { parseArgs } from 'node:util';
import { BACKUP_KEPT_DAYS, removeOldBackups } from './lib/backup-folder.mjs';
import { ensureDebianPackages } from './lib/debian.mjs';
import { isOurs, startKeptDatabase } from './lib/kept-database.mjs';
import { ensureNodePackages } from './lib/node-packages.mjs';
import { requireFreePort } from './lib/product-server.mjs';
import { Remedy, runScript, say } from './lib/say.mjs';
import { readSettings, requireNode20 } from './lib/settings.mjs';

const usage =
  'Use: npm run backup [-- --to FOLDER], or npm run restore -- BACKUP [--replace] [--withdrawals FILE]';

await runScript(async () => {
  requireNode20();
  const settings = readSettings();
  if (!isOurs(settings))
    throw new Remedy(`DB_HOST is ${settings.dbHost}: that database is saved and restored where it runs.`);
  const { action, from, to, replace, withdrawals } = asked(settings.dataDir);
  if (action === 'restore') await requireFreePort(settings.host, settings.port);
  await ensureDebianPackages('mariadb');
  await ensureNodePackages();
  const database = await startKeptDatabase(settings);
  try {
    if (action === 'backup') {
      const { makeBackup } = await import('./lib/make-backup.mjs');
      const made = await makeBackup(settings, database.port, to);
      say(
        `Saved in ${made.folder}: the tables, ${made.attachments} recordings and pictures, the list of what was taken back.`,
      );
      const old = removeOldBackups(to, new Date());
      if (old.length > 0) say(`Removed ${old.length} older than ${BACKUP_KEPT_DAYS} days.`);
      say(
        'It holds what people said in confidence: keep it on an encrypted disk, where the villages want it kept.',
      );
      return 0;
    }
    const { restoreBackup } = await import('./lib/restore-backup.mjs');
    return await restoreBackup(settings, database.port, { from, replace, withdrawals });
  } finally {
    if (!database.wasRunning) await database.stop();
  }
});

/** @param {string} dataDir */
function asked(dataDir) {
  const { values, positionals } = parseArgs({
    allowPositionals: true,
    options: {
      to: { type: 'string' },
      replace: { type: 'boolean', default: false },
      withdrawals: { type: 'string' },
    },
  });
  const [action = '', from = '', ...more] = positionals;
  if (!['backup', 'restore'].includes(action) || more.length > 0) throw new Remedy(usage);
  if ((action === 'restore') !== (from !== '')) throw new Remedy(usage);
  for (const file of [from, values.withdrawals ?? ''])
    if (file !== '' && !existsSync(file)) throw new Remedy(`${file} is not there.`);
  return {
    action,
    from: path.resolve(from),
    to: path.resolve(values.to ?? path.join(dataDir, 'backups')),
    replace: values.replace,
    withdrawals: values.withdrawals === undefined ? [] : [path.resolve(values.withdrawals)],
  };
}
