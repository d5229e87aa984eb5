import { existsSync, readFileSync } from 'node:fs';
import path from 'node:path';
import process from 'node:process';
import { run } from './processes.mjs';
import { Remedy, say } from './say.mjs';
import { projectDir } from './settings.mjs';

/** Runs `npm ci` where packages are missing or are not those of the lock file. */
export async function ensureNodePackages() {
  if (installedAsLocked()) return;
  say('Installing the packages of package-lock.json.');
  // The build needs the development packages too, which NODE_ENV=production would leave out.
  const done = await run('npm', ['ci', '--include=dev', '--no-audit', '--no-fund', '--loglevel=error'], {
    cwd: projectDir,
    env: process.env,
  });
  if (done.code !== 0)
    throw new Remedy(`${done.output.trim()}\n\nnpm could not install the packages; see its words above.`);
}

/**
 * npm leaves a list of what it installed. Comparing the two takes a few milliseconds, where asking npm
 * takes seconds.
 */
function installedAsLocked() {
  const installedFile = path.join(projectDir, 'node_modules/.package-lock.json');
  if (!existsSync(installedFile)) return false;
  const wanted = packagesIn(path.join(projectDir, 'package-lock.json'));
  const installed = packagesIn(installedFile);
  return Object.entries(wanted).every(
    ([place, entry]) =>
      place === '' || entry.optional === true || installed[place]?.version === entry.version,
  );
}

/** @typedef {{ version?: string, optional?: boolean }} LockedPackage */

/** @param {string} file @returns {Record<string, LockedPackage>} */
function packagesIn(file) {
  /** @type {unknown} */
  const lock = JSON.parse(readFileSync(file, 'utf8'));
  return /** @type {{ packages: Record<string, LockedPackage> }} */ (lock).packages;
}
