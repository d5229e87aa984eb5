import { once } from 'node:events';
import { createReadStream, createWriteStream } from 'node:fs';
import { createInterface } from 'node:readline';
import { finished } from 'node:stream/promises';
import { createGunzip, createGzip } from 'node:zlib';
import mysql from 'mysql2';

/**
 * @typedef {object} Reach how to reach a database
 * @property {string} host
 * @property {number} port
 * @property {string} user
 * @property {string} password
 * @property {string} database
 */

/** Who is signed in where is nobody's to keep: these tables are copied empty. */
const WITHOUT_ROWS = new Set(['session']);
const ROWS_AT_ONCE = 200;
const BINARY = new Set(['binary', 'varbinary', 'tinyblob', 'blob', 'mediumblob', 'longblob']);

/**
 * Writes every table as it stands at one moment into a compressed file of SQL, one statement to a line. The product
 * may go on meanwhile. What MariaDB's own tool would write needs a package more on every machine; this needs the
 * driver alone.
 *
 * @param {Reach} reach
 * @param {string} file
 */
export async function copyOut(reach, file) {
  const connection = mysql.createConnection(reach);
  const asker = connection.promise();
  const out = createGzip();
  const written = finished(out.pipe(createWriteStream(file, { mode: 0o600 })));
  const put = async (/** @type {string} */ line) => {
    if (!out.write(`${line}\n`)) await once(out, 'drain');
  };
  try {
    await asker.query('SET SESSION TRANSACTION ISOLATION LEVEL REPEATABLE READ');
    await asker.query('START TRANSACTION WITH CONSISTENT SNAPSHOT, READ ONLY');
    for (const table of await tablesOf(asker, reach.database)) {
      const [created] = await asker.query('SHOW CREATE TABLE ??', [table]);
      const statement = /** @type {Record<string, string>[]} */ (created)[0]?.['Create Table'] ?? '';
      await put(`${statement.replaceAll('\n', ' ')};`);
      if (!WITHOUT_ROWS.has(table))
        for await (const line of inserts(connection, reach.database, table)) await put(line);
    }
  } finally {
    out.end();
    await written;
    await asker.end();
  }
}

/**
 * Fills an empty database from such a file.
 *
 * @param {Reach} reach
 * @param {string} file
 */
export async function copyIn(reach, file) {
  const asker = mysql.createConnection(reach).promise();
  try {
    await asker.query('SET FOREIGN_KEY_CHECKS = 0, UNIQUE_CHECKS = 0, SESSION autocommit = 0');
    const lines = createInterface({
      input: createReadStream(file).pipe(createGunzip()),
      crlfDelay: Infinity,
    });
    for await (const line of lines) if (line !== '') await asker.query(line);
    await asker.query('COMMIT');
  } finally {
    await asker.end();
  }
}

/** A database without a table. @param {import('mysql2/promise').Connection} asker @param {string} name */
export async function createEmpty(asker, name) {
  await asker.query('CREATE DATABASE ?? CHARACTER SET utf8mb4 COLLATE utf8mb4_uca1400_as_ci', [name]);
}

/** @param {import('mysql2/promise').Connection} asker @param {string} database @returns {Promise<string[]>} */
export async function tablesOf(asker, database) {
  const [rows] = await asker.query(
    "SELECT table_name AS name FROM information_schema.tables WHERE table_schema = ? AND table_type = 'BASE TABLE' ORDER BY table_name",
    [database],
  );
  return /** @type {{ name: string }[]} */ (rows).map(({ name }) => name);
}

/**
 * Every value as the text that MariaDB itself writes for it; bytes stay bytes.
 *
 * @param {mysql.Connection} connection
 * @param {string} database
 * @param {string} table
 */
async function* inserts(connection, database, table) {
  const [described] = await connection
    .promise()
    .query(
      "SELECT column_name AS name, data_type AS type FROM information_schema.columns WHERE table_schema = ? AND table_name = ? AND extra NOT LIKE '%GENERATED%' ORDER BY ordinal_position",
      [database, table],
    );
  const columns = /** @type {{ name: string, type: string }[]} */ (described);
  const binary = new Set(columns.filter(({ type }) => BINARY.has(type)).map(({ name }) => name));
  const names = columns.map(({ name }) => name);
  /** @type {AsyncIterable<(string | Buffer | null)[]>} */
  const rows = connection
    .query({
      sql: mysql.format('SELECT ?? FROM ??', [names, table]),
      rowsAsArray: true,
      typeCast: (field) => (binary.has(field.name) ? field.buffer() : field.string('utf8')),
    })
    .stream();
  /** @type {(string | Buffer | null)[][]} */
  let waiting = [];
  const line = () => `${mysql.format('INSERT INTO ?? (??) VALUES ?', [table, names, waiting])};`;
  for await (const row of rows) {
    waiting.push(row);
    if (waiting.length < ROWS_AT_ONCE) continue;
    yield line();
    waiting = [];
  }
  if (waiting.length > 0) yield line();
}
