import type { DataSource } from 'typeorm';
import { z } from 'zod';
import { DATABASE_COLLATION } from './data-source.js';

const LOCK_WAIT_SECONDS = 120;

/** A database the product cannot work with. Its message says what to change. */
export class DatabaseUnfitError extends Error {
  override readonly name = 'DatabaseUnfitError';
}

/**
 * Brings the schema up to date and answers the names of the migrations that ran (none on most starts).
 *
 * Two processes may start together. MariaDB commits each DDL statement by itself, so a second run in the
 * middle of the first would find half a schema: whoever comes second waits here for a named lock.
 */
export async function migrate(dataSource: DataSource): Promise<string[]> {
  const locker = dataSource.createQueryRunner();
  try {
    await refuseUnfit(locker);
    const name = await lockName(locker);
    const [answer] = lockAnswer.parse(
      await locker.query('SELECT GET_LOCK(?, ?) AS ok', [name, LOCK_WAIT_SECONDS]),
    );
    if (Number(answer.ok) !== 1)
      throw new DatabaseUnfitError(
        `Another process has been migrating the database for ${LOCK_WAIT_SECONDS} seconds; wait for it or end it, then start again.`,
      );
    try {
      const done = await dataSource.runMigrations({ transaction: 'each' });
      return done.map((migration) => migration.name);
    } finally {
      await locker.query('SELECT RELEASE_LOCK(?)', [name]);
    }
  } finally {
    await locker.release();
  }
}

interface Asker {
  query(sql: string, parameters?: unknown[]): Promise<unknown>;
}

const lockAnswer = z.tuple([z.object({ ok: z.union([z.string(), z.number(), z.null()]) })]);
const nameAnswer = z.tuple([z.object({ name: z.string() })]);
const settingsAnswer = z.tuple([
  z.object({ timeZone: z.string(), sqlMode: z.string(), snapshot: z.coerce.number(), collation: z.string() }),
]);

/** Named locks belong to the whole server, so the name carries the database (a lock name holds 64 characters). */
async function lockName(asker: Asker): Promise<string> {
  const [{ name }] = nameAnswer.parse(await asker.query('SELECT DATABASE() AS name'));
  return `${name}.migrate`;
}

/** Refuses settings under which rows would be stored silently changed. */
async function refuseUnfit(asker: Asker): Promise<void> {
  const [settings] = settingsAnswer.parse(
    await asker.query(
      `SELECT @@session.time_zone AS timeZone, @@session.sql_mode AS sqlMode,
              @@session.innodb_snapshot_isolation AS snapshot, @@collation_database AS \`collation\``,
    ),
  );
  const wrong = [
    ...(settings.timeZone === '+00:00' ? [] : ['default-time-zone=+00:00']),
    ...(settings.sqlMode.includes('STRICT_ALL_TABLES') ? [] : ['sql-mode=STRICT_ALL_TABLES']),
    ...(settings.snapshot === 1 ? [] : ['innodb-snapshot-isolation=ON']),
  ];
  if (wrong.length > 0)
    throw new DatabaseUnfitError(
      `Start MariaDB with --${wrong.join(' --')}; without it rows can be changed silently.`,
    );
  if (settings.collation !== DATABASE_COLLATION)
    throw new DatabaseUnfitError(
      `The database must have the collation ${DATABASE_COLLATION}: ALTER DATABASE … COLLATE ${DATABASE_COLLATION}.`,
    );
}
