import path from 'node:path';
import process from 'node:process';
import { keptDatabaseFolder } from './database-folder.mjs';
import { startMariaDb } from './mariadb.mjs';
import { keptSecrets } from './secrets.mjs';

/** @typedef {import('./settings.mjs').Settings} Settings */

/** False where the settings name a database on another machine: that one is somebody else's to run. @param {Settings} settings */
export function isOurs(settings) {
  return ['127.0.0.1', 'localhost'].includes(settings.dbHost);
}

/**
 * Starts the project's own MariaDB with the settings of kept data.
 *
 * @param {Settings} settings
 * @param {{ outlives?: boolean }} [options]
 */
export async function startKeptDatabase(settings, { outlives = false } = {}) {
  const folder = await keptDatabaseFolder(settings.dataDir);
  const secrets = keptSecrets(settings.dataDir);
  const server = await startMariaDb({
    folder,
    port: settings.dbPort,
    account: {
      name: settings.dbName,
      user: settings.dbUser,
      password: settings.dbPassword ?? secrets.databasePassword,
      rootPassword: secrets.databaseRootPassword,
    },
    durability: 'kept',
    outlives,
  });
  return { ...server, folder };
}

/**
 * How to reach the product's own tables.
 *
 * @param {Settings} settings
 * @param {number} dbPort where the database really listens
 * @returns {import('./sql-copy.mjs').Reach}
 */
export function reachOf(settings, dbPort) {
  return {
    host: settings.dbHost,
    port: dbPort,
    user: settings.dbUser,
    password: settings.dbPassword ?? keptSecrets(settings.dataDir).databasePassword,
    database: settings.dbName,
  };
}

/**
 * What the server needs to know, as environment variables.
 *
 * @param {Settings} settings
 * @param {{ port: number, socket: string | null }} [database] where it really listens, if it is ours
 */
export function serverEnvironment(settings, database) {
  const secrets = keptSecrets(settings.dataDir);
  return {
    ...process.env,
    HOST: settings.host,
    PORT: String(settings.port),
    DB_HOST: settings.dbHost,
    DB_PORT: String(database?.port ?? settings.dbPort),
    ...(database?.socket && { DB_SOCKET: database.socket }),
    DB_NAME: settings.dbName,
    DB_USER: settings.dbUser,
    DB_PASSWORD: settings.dbPassword ?? secrets.databasePassword,
    DATA_DIR: path.resolve(settings.dataDir),
    SESSION_SECRET: settings.sessionSecret ?? secrets.sessionSecret,
  };
}
