import type { MigrationInterface, QueryRunner } from 'typeorm';

/** What the days of the year before rested on when it was rolled over, so that a move can be explained. */
const COLUMNS = [
  ['rollover', 'place', 'json NULL'],
  ['rollover', 'engine_version', 'varchar(32) CHARACTER SET ascii COLLATE ascii_bin NULL'],
  ['rolled_item', 'timing', 'json NULL'],
] as const;

export class RolloverGrounds1799100000000 implements MigrationInterface {
  readonly name = 'RolloverGrounds1799100000000';

  async up(queryRunner: QueryRunner): Promise<void> {
    for (const [table, column, type] of COLUMNS) {
      await queryRunner.query(`ALTER TABLE \`${table}\` ADD COLUMN IF NOT EXISTS \`${column}\` ${type}`);
    }
  }

  async down(queryRunner: QueryRunner): Promise<void> {
    for (const [table, column] of COLUMNS) {
      await queryRunner.query(`ALTER TABLE \`${table}\` DROP COLUMN IF EXISTS \`${column}\``);
    }
  }
}
