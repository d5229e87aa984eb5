import { cpSync, existsSync, mkdirSync, readdirSync, readFileSync, renameSync, rmSync } from 'node:fs';
import path from 'node:path';
import { parts, writeManifest } from './backup-folder.mjs';
import { reachOf } from './kept-database.mjs';
import { projectDir } from './settings.mjs';
import { copyOut } from './sql-copy.mjs';

/** @typedef {import('./settings.mjs').Settings} Settings */

/**
 * Saves everything into a new folder below `to`. Tables first, files after, the list last: a file is kept before its
 * row, so every row finds its file, and the list knows at least what the tables know.
 *
 * @param {Settings} settings
 * @param {number} dbPort
 * @param {string} to
 * @returns {Promise<{ folder: string, attachments: number }>}
 */
export async function makeBackup(settings, dbPort, to) {
  const madeAt = new Date();
  const name = `dawnpeg-${madeAt.toISOString().replaceAll(/[:.]/gu, '')}`;
  const folder = path.join(to, name);
  const unfinished = `${folder}.unfinished`;
  mkdirSync(unfinished, { recursive: true, mode: 0o700 });
  try {
    await copyOut(reachOf(settings, dbPort), path.join(unfinished, parts.tables));
    for (const [from, part] of [
      ['attachments', parts.attachments],
      ['withdrawals/list.jsonl', parts.withdrawals],
    ]) {
      const kept = path.join(settings.dataDir, String(from));
      if (existsSync(kept)) cpSync(kept, path.join(unfinished, String(part)), { recursive: true });
    }
    await writeManifest(unfinished, { productVersion: productVersion(), madeAt });
    renameSync(unfinished, folder);
  } catch (error) {
    rmSync(unfinished, { recursive: true, force: true });
    throw error;
  }
  return { folder, attachments: countFiles(path.join(folder, parts.attachments)) };
}

/** @param {string} folder */
function countFiles(folder) {
  if (!existsSync(folder)) return 0;
  return readdirSync(folder, { recursive: true, withFileTypes: true }).filter((entry) => entry.isFile())
    .length;
}

function productVersion() {
  return /"version": "([^"]+)"/u.exec(readFileSync(path.join(projectDir, 'package.json'), 'utf8'))?.[1] ?? '';
}
