import { existsSync } from 'node:fs';
import path from 'node:path';
import process from 'node:process';
import { fileURLToPath } from 'node:url';
import { Remedy } from './say.mjs';

export const projectDir = path.resolve(path.dirname(fileURLToPath(import.meta.url)), '../..');

/** What the scripts need to know before the server can be built; the same values as server/config/env.ts. */
export const defaults = Object.freeze({
  HOST: '127.0.0.1',
  PORT: '4173',
  DB_HOST: '127.0.0.1',
  DB_PORT: '3317',
  DB_NAME: 'dawnpeg',
  DB_USER: 'dawnpeg',
  DATA_DIR: 'data',
});

/**
 * @typedef {object} Settings
 * @property {string} host
 * @property {number} port
 * @property {string} dbHost
 * @property {number} dbPort
 * @property {string} dbName
 * @property {string} dbUser
 * @property {string | undefined} dbPassword given by the person; otherwise one is made and kept
 * @property {string} dataDir absolute
 * @property {string | undefined} sessionSecret
 * @property {boolean} production
 */

/** Takes `.env` where there is one (a variable that is set already wins) and reads the settings. @returns {Settings} */
export function readSettings() {
  const file = path.join(projectDir, '.env');
  if (existsSync(file)) process.loadEnvFile(file);
  return {
    host: text('HOST'),
    port: port('PORT'),
    dbHost: text('DB_HOST'),
    dbPort: port('DB_PORT'),
    dbName: text('DB_NAME'),
    dbUser: text('DB_USER'),
    dbPassword: optional('DB_PASSWORD'),
    dataDir: path.resolve(projectDir, text('DATA_DIR')),
    sessionSecret: optional('SESSION_SECRET'),
    production: optional('NODE_ENV') === 'production',
  };
}

/** @param {string} name */
function optional(name) {
  const value = process.env[name]?.trim();
  return value === '' ? undefined : value;
}

/** @param {keyof typeof defaults} name */
function text(name) {
  return optional(name) ?? defaults[name];
}

/** @param {'PORT' | 'DB_PORT'} name */
function port(name) {
  const value = text(name);
  const number = Number(value);
  if (!/^\d{1,5}$/.test(value) || number < 1 || number > 65_535)
    throw new Remedy(`${name} must be a port number between 1 and 65535, such as ${defaults[name]}.`);
  return number;
}

/** Only the versions the packages are made for: a wrong one fails later with words nobody understands. */
export function requireNode20() {
  const [major = 0, minor = 0] = process.versions.node.split('.').map(Number);
  if (major !== 20 || minor < 19)
    throw new Remedy(`Node ${process.versions.node} is running; Dawnpeg needs Node 20.19 or a later 20.`);
}
