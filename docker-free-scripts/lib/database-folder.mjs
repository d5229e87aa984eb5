import { createHash } from 'node:crypto';
import { chmodSync, chownSync, existsSync, mkdirSync, mkdtempSync, readdirSync, rmSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import process from 'node:process';
import { isRoot, run } from './processes.mjs';
import { Remedy, say } from './say.mjs';

/** The user MariaDB runs as: its own when the script is root, otherwise whoever runs the script. */
export const databaseUser = isRoot ? 'mysql' : undefined;

/**
 * The folder of the kept database. Inside the data folder, unless MariaDB's user cannot enter that (a
 * project under a closed home): then below /var/lib, and the person is told.
 *
 * A database that exists already decides, so that changed permissions never start a second, empty one.
 *
 * @param {string} dataDir
 */
export async function keptDatabaseFolder(dataDir) {
  mkdirSync(dataDir, { recursive: true });
  const inside = path.join(dataDir, 'mariadb');
  if (!databaseUser) return prepared(inside);

  const id = createHash('sha256').update(dataDir).digest('hex').slice(0, 12);
  const outside = path.join('/var/lib/dawnpeg', id);
  if (await canEnter(dataDir)) {
    if (existsSync(path.join(inside, 'data')) || !existsSync(path.join(outside, 'data')))
      return prepared(inside);
  } else if (existsSync(path.join(inside, 'data')))
    throw new Remedy(
      `The database is in ${inside}, where the user ${databaseUser} may not go any more; allow it with: chmod o+x ${dataDir} (and the folders above it).`,
    );
  say(`The user ${databaseUser} cannot enter ${dataDir}; the database is kept in ${outside}.`);
  return prepared(outside);
}

/** A new folder for a throw-away database, with a name that tells which process it belongs to. */
export async function throwAwayFolder() {
  const ownTemp = os.tmpdir();
  const base = !databaseUser || (await canEnter(ownTemp)) ? ownTemp : '/tmp';
  removeForgotten(base);
  return prepared(mkdtempSync(path.join(base, `dawnpeg-test-${process.pid}-`)));
}

/** A run that was killed could not clean up; the next one does. @param {string} base */
function removeForgotten(base) {
  for (const name of readdirSync(base)) {
    const owner = /^dawnpeg-test-(\d+)-/.exec(name)?.[1];
    if (owner === undefined || existsSync(`/proc/${owner}`)) continue;
    rmSync(path.join(base, name), { recursive: true, force: true });
  }
}

/** @param {string} folder */
async function prepared(folder) {
  mkdirSync(folder, { recursive: true });
  await giveToDatabaseUser(folder);
  chmodSync(folder, 0o700);
  return folder;
}

/** @param {string} file */
export async function giveToDatabaseUser(file) {
  if (!databaseUser) return;
  const ids = await Promise.all(['-u', '-g'].map((flag) => run('/usr/bin/id', [flag, databaseUser])));
  const [uid, gid] = ids.map(({ output }) => Number(output));
  if (!uid || !gid) throw new Remedy(`The system user ${databaseUser} is missing.`);
  chownSync(file, uid, gid);
}

/** @param {string} folder */
async function canEnter(folder) {
  return (await run('/usr/bin/test', ['-x', folder], { user: databaseUser })).code === 0;
}
