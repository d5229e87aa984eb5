import type { MigrationInterface, QueryRunner } from 'typeorm';

/** Whoever keeps an entry answers for it, elder or not. */
export class AnswersOfItsPeople1798200000000 implements MigrationInterface {
  readonly name = 'AnswersOfItsPeople1798200000000';

  async up(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query(
      'ALTER TABLE `answer` ADD COLUMN IF NOT EXISTS `of_its_people` tinyint NOT NULL DEFAULT 0',
    );
  }

  async down(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query('ALTER TABLE `answer` DROP COLUMN IF EXISTS `of_its_people`');
  }
}
