import type { MigrationInterface, QueryRunner } from 'typeorm';

/** Answers stay where the village only calls a kind or a work otherwise; whatever is frozen already has its own. */
export class AnswersAcrossWords1799780000000 implements MigrationInterface {
  readonly name = 'AnswersAcrossWords1799780000000';

  async up(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query(
      'ALTER TABLE `version_entry` ADD COLUMN IF NOT EXISTS `answers_to` char(64) CHARACTER SET ascii COLLATE ascii_bin NULL',
    );
  }

  async down(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query('ALTER TABLE `version_entry` DROP COLUMN IF EXISTS `answers_to`');
  }
}
