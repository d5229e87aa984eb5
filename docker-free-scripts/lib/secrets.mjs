import { randomBytes } from 'node:crypto';
import { chmodSync, existsSync, mkdirSync, readFileSync, renameSync, writeFileSync } from 'node:fs';
import path from 'node:path';

/**
 * @typedef {object} Secrets
 * @property {string} databaseRootPassword
 * @property {string} databasePassword
 * @property {string} sessionSecret
 */

/**
 * The passwords of this installation: made once, kept in the data folder, readable by its owner only.
 *
 * @param {string} dataDir
 * @returns {Secrets}
 */
export function keptSecrets(dataDir) {
  const file = path.join(dataDir, 'secrets.json');
  const kept = existsSync(file)
    ? /** @type {Partial<Secrets>} */ (JSON.parse(readFileSync(file, 'utf8')))
    : {};
  const secrets = {
    databaseRootPassword: kept.databaseRootPassword ?? randomText(),
    databasePassword: kept.databasePassword ?? randomText(),
    sessionSecret: kept.sessionSecret ?? randomText(),
  };
  if (Object.entries(secrets).some(([name, value]) => kept[/** @type {keyof Secrets} */ (name)] !== value)) {
    mkdirSync(dataDir, { recursive: true });
    // Written beside and renamed: a power cut leaves the old file or the new one, never half of it.
    writeFileSync(`${file}.new`, `${JSON.stringify(secrets, null, 2)}\n`, { mode: 0o600 });
    renameSync(`${file}.new`, file);
  }
  chmodSync(file, 0o600);
  return secrets;
}

/** 32 random bytes in letters that need no quoting in SQL or a shell. */
export function randomText() {
  return randomBytes(32).toString('base64url');
}
