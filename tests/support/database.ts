import { createConnection } from 'mysql2/promise';
import type { DataSource } from 'typeorm';
import { inject } from 'vitest';
import { createDataSource, DATABASE_COLLATION } from '#server/db/data-source.js';
import { migrate } from '#server/db/migrate.js';

/**
 * A migrated database without a row, for one test file: `beforeAll(async () => { db = await
 * openTestDatabase(); })` and `afterAll(() => db.destroy())`.
 *
 * Each Vitest worker has a database of its own, so files run side by side and never see each other.
 */
export async function openTestDatabase(): Promise<DataSource> {
  const server = inject('mariadb');
  const name = `dawnpeg_test_${process.env['VITEST_POOL_ID'] ?? '1'}`;
  const connection = await createConnection(server);
  await connection.query(
    `CREATE DATABASE IF NOT EXISTS ${name} CHARACTER SET utf8mb4 COLLATE ${DATABASE_COLLATION}`,
  );
  await connection.end();

  const dataSource = createDataSource({ ...server, name, poolSize: 4 });
  await dataSource.initialize();
  await migrate(dataSource);
  await emptyTestDatabase(dataSource);
  return dataSource;
}

/** Takes all rows out again, in one go: between tests that each want to begin with nothing. */
export async function emptyTestDatabase(dataSource: DataSource): Promise<void> {
  const tables = dataSource.entityMetadatas.map((entity) => entity.tablePath);
  const runner = dataSource.createQueryRunner();
  try {
    await runner.query('SET FOREIGN_KEY_CHECKS = 0');
    for (const table of tables) await runner.query(`DELETE FROM \`${table}\``);
    await runner.query('SET FOREIGN_KEY_CHECKS = 1');
  } finally {
    await runner.release();
  }
}
