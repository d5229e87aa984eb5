import type { MigrationInterface, QueryRunner } from 'typeorm';

/** When an entry was set back to an old version. */
export class RestoredEntries1799110000000 implements MigrationInterface {
  readonly name = 'RestoredEntries1799110000000';

  async up(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query('ALTER TABLE `entry` ADD COLUMN IF NOT EXISTS `restored_at` datetime(6) NULL');
  }

  async down(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query('ALTER TABLE `entry` DROP COLUMN IF EXISTS `restored_at`');
  }
}
