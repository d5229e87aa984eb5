import {
  existsSync,
  openSync,
  closeSync,
  readFileSync,
  renameSync,
  rmSync,
  statSync,
  writeFileSync,
} from 'node:fs';
import path from 'node:path';
import process from 'node:process';
import { setTimeout as wait } from 'node:timers/promises';
import { databaseUser, giveToDatabaseUser } from './database-folder.mjs';
import { isFree } from './ports.mjs';
import { run, start } from './processes.mjs';
import { Remedy } from './say.mjs';

const SERVER = '/usr/sbin/mariadbd';
const INSTALL = '/usr/bin/mariadb-install-db';
const UPGRADE = '/usr/bin/mariadb-upgrade';
const SOCKET = 'mariadb.sock';
/** What the system takes as the path of a socket. */
const SOCKET_PATH_MAX_BYTES = 107;
const LOG_KEEP_BYTES = 5_000_000;
/** Long, because a database that was cut off in the middle of much work repairs itself first. */
const READY_WITHIN_MS = 300_000;

/** What every database of the product runs with, kept or not: rows are stored as written or refused. */
const always = [
  '--bind-address=127.0.0.1',
  '--skip-name-resolve',
  '--character-set-server=utf8mb4',
  '--collation-server=utf8mb4_uca1400_as_ci',
  '--default-time-zone=+00:00',
  '--sql-mode=STRICT_ALL_TABLES,NO_ZERO_DATE,NO_ZERO_IN_DATE,ERROR_FOR_DIVISION_BY_ZERO,NO_ENGINE_SUBSTITUTION',
  // Without it a transaction may overwrite, unseen, a row that changed after it began.
  '--innodb-snapshot-isolation=ON',
  '--skip-log-bin',
  '--max-allowed-packet=32M',
];

/** Nothing acknowledged is ever lost: the log is on the disk before a commit is answered. */
const kept = ['--innodb-flush-log-at-trx-commit=1', '--innodb-log-file-size=32M'];

/** For tests, where the data is thrown away. */
const throwAway = [
  '--innodb-log-file-size=8M',
  '--innodb-buffer-pool-size=64M',
  '--innodb-flush-log-at-trx-commit=0',
  '--innodb-fast-shutdown=2',
  '--performance-schema=OFF',
];

/**
 * @typedef {object} MariaDb
 * @property {number} port
 * @property {string | null} socket for processes of this machine: half the way of the port
 * @property {number} pid
 * @property {boolean} wasRunning it ran before this call, so whoever started it also stops it
 * @property {Promise<unknown>} exited
 * @property {(signal?: NodeJS.Signals) => Promise<void>} stop
 */

/**
 * @typedef {object} Wanted
 * @property {string} folder from keptDatabaseFolder or throwAwayFolder
 * @property {number} port
 * @property {{ name: string, user: string, password: string, rootPassword: string }} account
 * @property {'kept' | 'throw-away'} durability
 * @property {boolean} [outlives] goes on after this script has ended
 */

/**
 * Starts the database of a folder (and makes it first where there is none), on 127.0.0.1 alone, and answers
 * when the product's account can work in it.
 *
 * @param {Wanted} wanted
 * @returns {Promise<MariaDb>}
 */
export async function startMariaDb(wanted) {
  const { folder, port, account } = wanted;
  const running = runningIn(folder);
  if (running) {
    try {
      await ready({ ...wanted, port: running.port }, running.exited);
      return running;
    } catch (error) {
      // It may just be ending after the script that owned it was killed; then its place is free now.
      if (runningIn(folder)) throw error;
    }
  }
  if (!(await isFree(port)))
    throw new Remedy(`Port ${port} is taken by another program; choose a free one with DB_PORT=….`);

  await createWhereMissing(folder);
  const initFile = path.join(folder, 'start.sql');
  writeFileSync(initFile, startStatements(account), { mode: 0o600 });
  await giveToDatabaseUser(initFile);
  const log = openSync(logFile(folder), mayGrow(logFile(folder)) ? 'a' : 'w', 0o600);
  const server = start(
    SERVER,
    [
      '--no-defaults', // must be first: keeps the machine's own settings out
      ...always,
      ...(wanted.durability === 'kept' ? kept : throwAway),
      `--datadir=${dataIn(folder)}`,
      `--socket=${SOCKET}`, // inside the data folder
      '--pid-file=mariadb.pid',
      `--port=${port}`,
      `--init-file=${initFile}`,
    ],
    { user: databaseUser, stdio: ['ignore', log, log], outlives: wanted.outlives ?? false, cwd: folder },
  );
  closeSync(log);
  try {
    await ready(wanted, server.exited);
    await upgradeWhereNeeded(folder, account.rootPassword);
  } catch (error) {
    server.kill('SIGTERM');
    throw error;
  } finally {
    rmSync(initFile, { force: true });
  }
  return {
    port,
    socket: socketIn(folder),
    pid: server.pid,
    wasRunning: false,
    exited: server.exited,
    stop: async (signal = 'SIGTERM') => {
      server.kill(signal);
      await server.exited;
    },
  };
}

/**
 * The server that runs in this folder, if one does.
 *
 * @param {string} folder
 * @returns {MariaDb | undefined}
 */
export function runningIn(folder) {
  const pidFile = path.join(dataIn(folder), 'mariadb.pid');
  if (!existsSync(pidFile)) return undefined;
  const pid = Number(readFileSync(pidFile, 'utf8'));
  const words = commandOf(pid);
  const port = Number(words.find((word) => word.startsWith('--port='))?.slice('--port='.length));
  if (!words.includes(`--datadir=${dataIn(folder)}`) || !port) return undefined;
  // Not our child, so nobody tells us when it ends. The looking keeps no script alive by itself.
  const gone = async () => {
    while (commandOf(pid).length > 0) await wait(100, undefined, { ref: false });
  };
  const exited = gone();
  return {
    port,
    // Whoever started it may have given the account no right to come this way.
    socket: null,
    pid,
    wasRunning: true,
    exited,
    stop: async (signal = 'SIGTERM') => {
      process.kill(pid, signal);
      while (commandOf(pid).length > 0) await wait(20);
    },
  };
}

/** Where the database writes what it has to say. @param {string} folder */
export function logFile(folder) {
  return path.join(folder, 'mariadb.log');
}

/** @param {string} folder */
function dataIn(folder) {
  return path.join(folder, 'data');
}

/** Null where the folder lies too deep for a socket to be reached by its path. @param {string} folder */
function socketIn(folder) {
  const file = path.resolve(dataIn(folder), SOCKET);
  return Buffer.byteLength(file) <= SOCKET_PATH_MAX_BYTES ? file : null;
}

/** @param {number} pid the command line of a process, nothing when there is none @returns {string[]} */
function commandOf(pid) {
  try {
    return readFileSync(`/proc/${pid}/cmdline`, 'utf8').split('\0').filter(Boolean);
  } catch {
    return [];
  }
}

/** Made beside and renamed when complete, so an interrupted first start begins again. @param {string} folder */
async function createWhereMissing(folder) {
  if (existsSync(dataIn(folder))) return;
  const unfinished = path.join(folder, 'data.new');
  rmSync(unfinished, { recursive: true, force: true });
  const made = await run(INSTALL, [
    '--no-defaults',
    ...(databaseUser ? [`--user=${databaseUser}`] : []),
    `--datadir=${unfinished}`,
    '--auth-root-authentication-method=normal',
    '--skip-test-db',
    '--skip-name-resolve',
    '--innodb-log-file-size=8M',
  ]);
  if (made.code !== 0) throw new Remedy(`MariaDB could not make its folder ${folder}:\n${made.output}`);
  renameSync(unfinished, dataIn(folder));
}

/**
 * Run by MariaDB at each start before it listens: the product's account and database, root reachable with
 * its password only. Repeating it mends an account whose password was changed in `secrets.json`.
 *
 * @param {Wanted['account']} account
 */
function startStatements({ name, user, password, rootPassword }) {
  // By the port, and by the socket.
  const accounts = ['127.0.0.1', 'localhost'].map((host) => `'${user}'@'${host}'`);
  return [
    `CREATE DATABASE IF NOT EXISTS \`${name}\` CHARACTER SET utf8mb4 COLLATE utf8mb4_uca1400_as_ci;`,
    ...accounts.flatMap((account) => [
      `CREATE USER IF NOT EXISTS ${account} IDENTIFIED BY '${quoted(password)}';`,
      `ALTER USER ${account} IDENTIFIED BY '${quoted(password)}';`,
      `GRANT ALL ON \`${name.replaceAll('_', '\\_')}%\`.* TO ${account};`,
    ]),
    `ALTER USER 'root'@'localhost' IDENTIFIED BY '${quoted(rootPassword)}';`,
    `DELETE FROM mysql.global_priv WHERE User = 'root' AND Host <> 'localhost';`,
    'FLUSH PRIVILEGES;',
    '',
  ].join('\n');
}

/** @param {string} text */
function quoted(text) {
  return text.replaceAll('\\', '\\\\').replaceAll("'", "''");
}

/**
 * Waits until the product's account can ask something.
 *
 * @param {Wanted} wanted
 * @param {Promise<unknown>} exited
 */
async function ready({ folder, port, account }, exited) {
  const { createConnection } = await import('mysql2/promise');
  const hasEnded = whether(exited);
  const giveUpAt = Date.now() + READY_WITHIN_MS;
  for (;;) {
    try {
      const connection = await createConnection({
        host: '127.0.0.1',
        port,
        user: account.user,
        password: account.password,
        database: account.name,
      });
      await connection.end();
      return;
    } catch (error) {
      if (hasEnded() || isRefusal(error) || Date.now() > giveUpAt)
        throw new Remedy(
          `MariaDB did not start (${message(error)}). Its last words, from ${logFile(folder)}:\n${lastErrors(folder)}`,
        );
      await wait(20);
    }
  }
}

/** @param {Promise<unknown>} happened answers at any moment whether it has */
function whether(happened) {
  let already = false;
  const note = () => {
    already = true;
  };
  happened.then(note, note);
  return () => already;
}

/** A wrong password or a missing right does not mend itself by waiting. @param {unknown} error */
function isRefusal(error) {
  return /ER_ACCESS_DENIED|ER_DBACCESS_DENIED/.test(String(/** @type {{ code?: string }} */ (error).code));
}

/** @param {unknown} error */
function message(error) {
  return error instanceof Error
    ? error.message || String(/** @type {{ code?: string }} */ (error).code)
    : String(error);
}

/** @param {string} folder */
function lastErrors(folder) {
  if (!existsSync(logFile(folder))) return '(nothing)';
  const lines = readFileSync(logFile(folder), 'utf8').trim().split('\n').slice(-40);
  const errors = lines.filter((line) => line.includes('[ERROR]'));
  return (errors.length > 0 ? errors : lines).slice(-6).join('\n');
}

/** @param {string} file */
function mayGrow(file) {
  return existsSync(file) && statSync(file).size < LOG_KEEP_BYTES;
}

/**
 * A new main version of MariaDB (from the next Debian) wants its own tables brought up to date.
 *
 * @param {string} folder
 * @param {string} rootPassword
 */
async function upgradeWhereNeeded(folder, rootPassword) {
  const notes = ['mariadb_upgrade_info', 'mysql_upgrade_info'].map((name) => path.join(dataIn(folder), name));
  const note = notes.find((file) => existsSync(file));
  const installed = /\d+\.\d+/.exec(
    (await run(SERVER, ['--version'])).output.replace(/^\S+\s+Ver\s+/, ''),
  )?.[0];
  if (note && installed && readFileSync(note, 'utf8').startsWith(`${installed}.`)) return;
  const done = await run(UPGRADE, ['--no-defaults', '--socket=mariadb.sock', '--user=root', '--silent'], {
    cwd: dataIn(folder),
    user: databaseUser,
    env: { ...process.env, MYSQL_PWD: rootPassword },
  });
  if (done.code !== 0)
    throw new Remedy(`MariaDB's own tables could not be brought up to date:\n${done.output}`);
}
