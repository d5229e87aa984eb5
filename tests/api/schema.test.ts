import type { DataSource } from 'typeorm';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { z } from 'zod';
import { migrate } from '#server/db/migrate.js';
import { openTestDatabase } from '#tests/support/database.js';

let db: DataSource;
beforeAll(async () => {
  db = await openTestDatabase();
});
afterAll(() => db.destroy());

describe('the schema', () => {
  it('is made by the migrations exactly as the entities describe it', async () => {
    const missing = await db.driver.createSchemaBuilder().log();
    expect(missing.upQueries.map(({ query }) => query)).toEqual([]);
  });

  it('needs nothing when it is up to date', async () => {
    expect(await migrate(db)).toEqual([]);
  });

  it('is migrated once when two processes start together', async () => {
    await db.dropDatabase();
    const [first, second] = await Promise.all([migrate(db), migrate(db)]);
    expect([first.length, second.length].sort((a, b) => a - b)).toEqual([0, db.migrations.length]);
  });

  it('goes down and up again to the same tables', async () => {
    const before = await columns(db);
    for (let left = db.migrations.length; left > 0; left -= 1)
      await db.undoLastMigration({ transaction: 'each' });
    expect(await columns(db)).toEqual([]);
    await migrate(db);
    expect(await columns(db)).toEqual(before);
  });

  it('tells apart letters that differ by a mark, and takes capitals for the same', async () => {
    const [row] = z
      .tuple([z.object({ marks: z.coerce.number(), capitals: z.coerce.number() })])
      .parse(
        await db.query(
          "SELECT CONVERT('ọ' USING utf8mb4) COLLATE utf8mb4_uca1400_as_ci = 'o' AS marks, CONVERT('Ŋ' USING utf8mb4) COLLATE utf8mb4_uca1400_as_ci = 'ŋ' AS capitals",
        ),
      );
    expect(row).toEqual({ marks: 0, capitals: 1 });
  });
});

async function columns(source: DataSource): Promise<unknown[]> {
  const rows: unknown = await source.query(
    `SELECT TABLE_NAME, COLUMN_NAME, COLUMN_TYPE, IS_NULLABLE, COLLATION_NAME FROM information_schema.COLUMNS
     WHERE TABLE_SCHEMA = DATABASE() AND TABLE_NAME <> 'schema_migration' ORDER BY TABLE_NAME, ORDINAL_POSITION`,
  );
  return z.array(z.unknown()).parse(rows);
}
