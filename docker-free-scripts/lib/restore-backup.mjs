import { appendFileSync, cpSync, existsSync, mkdirSync, readFileSync, renameSync, rmSync } from 'node:fs';
import path from 'node:path';
import { createConnection } from 'mysql2/promise';
import { checkedManifest, parts } from './backup-folder.mjs';
import { reachOf, serverEnvironment } from './kept-database.mjs';
import { makeBackup } from './make-backup.mjs';
import { Remedy, say } from './say.mjs';
import { sourceTool } from './source-tool.mjs';
import { copyIn, createEmpty, tablesOf } from './sql-copy.mjs';

/** @typedef {import('./settings.mjs').Settings} Settings */

/**
 * Puts a backup in the place of what is there. Everything is read and checked before anything is replaced; then the
 * schema is brought up to date and the list of what was taken back is gone through, before anybody can look.
 *
 * @param {Settings} settings
 * @param {number} dbPort
 * @param {{ from: string, replace: boolean, withdrawals: string[] }} wanted
 * @returns {Promise<number>} the exit code
 */
export async function restoreBackup(settings, dbPort, { from, replace, withdrawals }) {
  const manifest = await checkedManifest(from);
  const reach = reachOf(settings, dbPort);
  const asker = await createConnection(reach);
  try {
    if ((await tablesOf(asker, reach.database)).length > 0) {
      if (!replace)
        throw new Remedy(
          'There are villages here already; nothing was changed. Add --replace to put the backup in their place: what is here is saved first.',
        );
      const { folder } = await makeBackup(settings, dbPort, path.join(settings.dataDir, 'backups'));
      say(`What was here is saved in ${folder}.`);
    }
    const incoming = `${reach.database}_incoming`;
    await asker.query('DROP DATABASE IF EXISTS ??', [incoming]);
    await createEmpty(asker, incoming);
    await copyIn({ ...reach, database: incoming }, path.join(from, parts.tables));
    joinWithdrawals(settings.dataDir, [path.join(from, parts.withdrawals), ...withdrawals]);
    await putInPlace(asker, incoming, reach.database);
  } finally {
    await asker.end();
  }
  replaceAttachments(settings.dataDir, path.join(from, parts.attachments));
  const done = await sourceTool(
    ['server/db-command.ts', 'restored'],
    serverEnvironment(settings, {
      port: dbPort,
      socket: null,
    }),
  );
  if (done.code === 0)
    say(`The villages are as they were on ${manifest.madeAt}, without what was taken back since.`);
  return done.code;
}

/** @param {import('mysql2/promise').Connection} asker @param {string} incoming @param {string} name */
async function putInPlace(asker, incoming, name) {
  await asker.query('SET FOREIGN_KEY_CHECKS = 0');
  await asker.query('DROP DATABASE ??', [name]);
  await createEmpty(asker, name);
  const moves = (await tablesOf(asker, incoming)).map((table) => [incoming, table, name, table]);
  await asker.query(`RENAME TABLE ${moves.map(() => '??.?? TO ??.??').join(', ')}`, moves.flat());
  await asker.query('DROP DATABASE ??', [incoming]);
}

/** What was taken back stays so, whichever machine was told. @param {string} dataDir @param {string[]} lists */
function joinWithdrawals(dataDir, lists) {
  const file = path.join(dataDir, 'withdrawals', 'list.jsonl');
  const here = new Set(linesOf(file));
  const more = new Set(lists.flatMap(linesOf).filter((line) => !here.has(line)));
  if (more.size === 0) return;
  mkdirSync(path.dirname(file), { recursive: true });
  appendFileSync(file, `${[...more].join('\n')}\n`, { mode: 0o600, flush: true });
}

/** @param {string} file */
function linesOf(file) {
  return existsSync(file) ? readFileSync(file, 'utf8').split('\n').filter(Boolean) : [];
}

/** Copied beside and renamed, so that a broken end leaves the old files or the new ones. @param {string} dataDir @param {string} from */
function replaceAttachments(dataDir, from) {
  const kept = path.join(dataDir, 'attachments');
  const incoming = `${kept}.incoming`;
  rmSync(incoming, { recursive: true, force: true });
  if (existsSync(from)) cpSync(from, incoming, { recursive: true });
  rmSync(kept, { recursive: true, force: true });
  if (existsSync(incoming)) renameSync(incoming, kept);
}
