import { existsSync } from 'node:fs';
import process from 'node:process';
import { isRoot, run } from './processes.mjs';
import { Remedy, say } from './say.mjs';

/**
 * What each thing needs: the file that proves it is there, and the packages that bring it.
 *
 * MariaDB comes as its two core packages and not as `mariadb-server`: that one would also set up and start a
 * service of the whole machine, and Dawnpeg runs its own.
 */
const needs = {
  mariadb: {
    files: ['/usr/sbin/mariadbd', '/usr/bin/mariadb-install-db', '/usr/bin/my_print_defaults'],
    packages: ['mariadb-server-core', 'mariadb-client-core'],
  },
  // Debian's Chromium without windows: the journeys take three quarters of the time they take in the whole browser.
  chromium: {
    files: ['/usr/bin/chromium-headless-shell'],
    packages: ['chromium-headless-shell', 'fonts-dejavu-core'],
  },
  poppler: { files: ['/usr/bin/pdftotext', '/usr/bin/pdftoppm'], packages: ['poppler-utils'] },
};

/** @typedef {keyof typeof needs} Need */

/**
 * Installs what is missing: directly as root, with sudo where it asks for no password, and otherwise says
 * the one command to type.
 *
 * @param {...Need} wanted
 */
export async function ensureDebianPackages(...wanted) {
  const packages = wanted
    .filter((name) => needs[name].files.some((file) => !existsSync(file)))
    .flatMap((name) => needs[name].packages);
  if (packages.length > 0) await install(packages);
  if (wanted.includes('mariadb') && isRoot) await ensureMysqlUser();
}

/** @param {string[]} packages */
async function install(packages) {
  if (!existsSync('/usr/bin/apt-get'))
    throw new Remedy(`Missing here: ${packages.join(', ')} (Debian's names). Install them and start again.`);
  const sudo = isRoot ? [] : ['sudo', '-n'];
  const byHand = `sudo apt-get update && sudo apt-get install -y --no-install-recommends ${packages.join(' ')}`;
  if (!isRoot && (await run('sudo', ['-n', 'true'])).code !== 0)
    throw new Remedy(
      `${packages.join(', ')} must be installed once. Type this and start again:\n\n  ${byHand}\n`,
    );

  say(`Installing from Debian: ${packages.join(', ')}.`);
  const apt = [...sudo, 'env', 'DEBIAN_FRONTEND=noninteractive', 'apt-get', '-q', '-y'];
  const installing = [...apt, 'install', '--no-install-recommends', ...packages];
  await call([...apt, 'update']); // a list that cannot be renewed may still do
  const installed = await call(installing);
  if (installed.code !== 0)
    throw new Remedy(
      `${lastLines(installed.output)}\n\nDebian's packages could not be installed. Put that right, or type:\n\n  ${byHand}\n`,
    );
}

/**
 * Root must not run MariaDB itself. The user that Debian's larger package would make is made here where it
 * is missing; it owns nothing but the database folder.
 */
async function ensureMysqlUser() {
  if ((await run('/usr/bin/getent', ['passwd', 'mysql'])).code === 0) return;
  say('Making the system user mysql, which owns the database folder and nothing else.');
  const made = await run('/usr/sbin/useradd', ['--system', '--user-group', '--no-create-home', '--home-dir', '/nonexistent', '--shell', '/usr/sbin/nologin', 'mysql']); // prettier-ignore
  if (made.code !== 0) throw new Remedy(`The system user mysql could not be made: ${lastLines(made.output)}`);
}

/** @param {string[]} words */
async function call(words) {
  return run(String(words[0]), words.slice(1), {
    env: { ...process.env, LC_ALL: 'C.UTF-8' },
    undisturbed: true,
  });
}

/** @param {string} output */
function lastLines(output) {
  return output.trim().split('\n').slice(-8).join('\n');
}
