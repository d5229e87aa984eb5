import type { MigrationInterface, QueryRunner } from 'typeorm';

/** Entries that are there now were written before a record was asked for; whatever comes after them says everything. */
export class OlderEntries1799770000000 implements MigrationInterface {
  readonly name = 'OlderEntries1799770000000';

  async up(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query(
      'ALTER TABLE `entry` ADD COLUMN IF NOT EXISTS `is_older` tinyint NOT NULL DEFAULT 1',
    );
    await queryRunner.query('ALTER TABLE `entry` ALTER COLUMN `is_older` SET DEFAULT 0');
  }

  async down(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query('ALTER TABLE `entry` DROP COLUMN IF EXISTS `is_older`');
  }
}
