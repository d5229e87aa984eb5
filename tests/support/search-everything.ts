import { readdirSync, readFileSync } from 'node:fs';
import path from 'node:path';
import type { DataSource } from 'typeorm';
import { z } from 'zod';
import type { TestApi } from './api.js';

const columnRow = z.object({ TABLE_NAME: z.string(), COLUMN_NAME: z.string() });

/** Every table and column in which the word stands, whatever the tables are. */
export async function tablesWith({ dataSource }: TestApi, word: string): Promise<string[]> {
  const columns = z.array(columnRow).parse(
    await dataSource.query(
      `SELECT TABLE_NAME, COLUMN_NAME FROM information_schema.COLUMNS WHERE TABLE_SCHEMA = DATABASE()
       AND DATA_TYPE IN ('varchar', 'char', 'text', 'mediumtext', 'longtext', 'json', 'blob', 'longblob')`,
    ),
  );
  const found: string[] = [];
  for (const { TABLE_NAME: table, COLUMN_NAME: column } of columns) {
    const rows: unknown[] = await dataSource.query(
      `SELECT 1 FROM \`${table}\` WHERE \`${column}\` LIKE ? LIMIT 1`,
      [`%${word}%`],
    );
    if (rows.length > 0) found.push(`${table}.${column}`);
  }
  return found;
}

/** Every file of the product's folder in which the word stands. */
export function filesWith({ dataDir }: TestApi, word: string): string[] {
  return readdirSync(dataDir, { recursive: true, withFileTypes: true })
    .filter((file) => file.isFile())
    .map((file) => path.join(file.parentPath, file.name))
    .filter((file) => readFileSync(file).includes(word));
}

export type Copy = Map<string, Record<string, unknown>[]>;

export async function copyTables({ dataSource }: TestApi): Promise<Copy> {
  const copy: Copy = new Map();
  for (const table of await tableNames(dataSource)) {
    copy.set(table, await dataSource.query(`SELECT * FROM \`${table}\``));
  }
  return copy;
}

/** As somebody who restores a dump: everything that is there is replaced. */
export async function putBack({ dataSource }: TestApi, copy: Copy): Promise<void> {
  const runner = dataSource.createQueryRunner();
  await runner.query('SET FOREIGN_KEY_CHECKS = 0');
  for (const [table, rows] of copy) {
    await runner.query(`DELETE FROM \`${table}\``);
    for (const row of rows) {
      const names = Object.keys(row).map((name) => `\`${name}\``);
      const marks = names.map(() => '?').join(', ');
      await runner.query(
        `INSERT INTO \`${table}\` (${names.join(', ')}) VALUES (${marks})`,
        Object.values(row),
      );
    }
  }
  await runner.query('SET FOREIGN_KEY_CHECKS = 1');
  await runner.release();
}

async function tableNames(dataSource: DataSource): Promise<string[]> {
  const rows = z
    .array(z.object({ TABLE_NAME: z.string() }))
    .parse(
      await dataSource.query(
        "SELECT TABLE_NAME FROM information_schema.TABLES WHERE TABLE_SCHEMA = DATABASE() AND TABLE_NAME <> 'schema_migration'",
      ),
    );
  return rows.map(({ TABLE_NAME }) => TABLE_NAME);
}
