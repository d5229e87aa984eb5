import { createHash } from 'node:crypto';
import {
  createReadStream,
  existsSync,
  readdirSync,
  readFileSync,
  rmSync,
  statSync,
  writeFileSync,
} from 'node:fs';
import path from 'node:path';
import { pipeline } from 'node:stream/promises';
import { Remedy } from './say.mjs';

const FORMAT = 'dawnpeg-backup';
const FORMAT_VERSION = 1;
const MANIFEST = 'manifest.json';
const DAY_MS = 24 * 60 * 60 * 1000;

/** A backup is gone after this many days, so that what was taken back does not lie about in copies for years. */
export const BACKUP_KEPT_DAYS = 35;

/** The parts of a backup. */
export const parts = Object.freeze({
  tables: 'tables.sql.gz',
  attachments: 'attachments',
  withdrawals: 'withdrawals.jsonl',
});

/**
 * @typedef {object} Manifest
 * @property {string} format
 * @property {number} formatVersion
 * @property {string} productVersion
 * @property {string} madeAt ISO, UTC
 * @property {{ path: string, bytes: number, sha256: string }[]} files
 */

/**
 * Says what is in the folder, so that a damaged copy is noticed before anything is replaced by it.
 *
 * @param {string} folder
 * @param {{ productVersion: string, madeAt: Date }} about
 */
export async function writeManifest(folder, { productVersion, madeAt }) {
  const files = [];
  for (const file of filesBelow(folder))
    files.push({
      path: file,
      bytes: statSync(path.join(folder, file)).size,
      sha256: await sha256(folder, file),
    });
  /** @type {Manifest} */
  const manifest = {
    format: FORMAT,
    formatVersion: FORMAT_VERSION,
    productVersion,
    madeAt: madeAt.toISOString(),
    files,
  };
  writeFileSync(path.join(folder, MANIFEST), `${JSON.stringify(manifest, null, 2)}\n`, { mode: 0o600 });
  return manifest;
}

/**
 * Reads a backup and holds every file against its checksum.
 *
 * @param {string} folder
 * @returns {Promise<Manifest>}
 */
export async function checkedManifest(folder) {
  const manifest = manifestOf(folder);
  if (!manifest) throw new Remedy(`${folder} holds no backup of Dawnpeg (no ${MANIFEST} of this kind).`);
  if (manifest.formatVersion !== FORMAT_VERSION)
    throw new Remedy(
      `${folder} was made by a later Dawnpeg (${manifest.productVersion}); restore it with that one.`,
    );
  const listed = new Map(manifest.files.map((file) => [file.path, file]));
  for (const [name, { sha256: wanted }] of listed)
    if (!existsSync(path.join(folder, name)) || (await sha256(folder, name)) !== wanted)
      throw new Remedy(
        `${name} in ${folder} is missing or damaged; nothing was changed. Take another backup.`,
      );
  if (!listed.has(parts.tables)) throw new Remedy(`${folder} holds no tables; nothing was changed.`);
  return manifest;
}

/**
 * Removes backups of this folder that are too old to be kept.
 *
 * @param {string} folder
 * @param {Date} now
 * @returns {string[]} their names
 */
export function removeOldBackups(folder, now) {
  const old = readdirSync(folder).filter((name) => {
    const manifest = manifestOf(path.join(folder, name));
    return manifest && now.getTime() - Date.parse(manifest.madeAt) > BACKUP_KEPT_DAYS * DAY_MS;
  });
  for (const name of old) rmSync(path.join(folder, name), { recursive: true, force: true });
  return old;
}

/** @param {string} folder @returns {Manifest | null} null where it is none */
function manifestOf(folder) {
  const file = path.join(folder, MANIFEST);
  try {
    const read = existsSync(file) ? /** @type {Manifest} */ (JSON.parse(readFileSync(file, 'utf8'))) : null;
    return read?.format === FORMAT ? read : null;
  } catch {
    return null;
  }
}

/** @param {string} folder @returns {string[]} paths below it, in order */
function filesBelow(folder) {
  return readdirSync(folder, { recursive: true, withFileTypes: true })
    .filter((entry) => entry.isFile())
    .map((entry) => path.relative(folder, path.join(entry.parentPath, entry.name)))
    .sort();
}

/** @param {string} folder @param {string} file */
async function sha256(folder, file) {
  const hash = createHash('sha256');
  await pipeline(createReadStream(path.join(folder, file)), hash);
  return hash.digest('hex');
}
