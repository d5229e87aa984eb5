import type { MigrationInterface, QueryRunner } from 'typeorm';

/** What a village calls its months and Moons; none where nobody has said. Every statement can be run again. */
const NO_MOON_NAMES = JSON.stringify(new Array<string>(13).fill(''));
const STATEMENTS = [
  'ALTER TABLE `community` ADD COLUMN IF NOT EXISTS `local_months` json NULL',
  'ALTER TABLE `community` ADD COLUMN IF NOT EXISTS `moon_names` json NULL',
  "UPDATE `community` SET `local_months` = '[]' WHERE `local_months` IS NULL",
  `UPDATE \`community\` SET \`moon_names\` = '${NO_MOON_NAMES}' WHERE \`moon_names\` IS NULL`,
  'ALTER TABLE `community` MODIFY COLUMN `local_months` json NOT NULL',
  'ALTER TABLE `community` MODIFY COLUMN `moon_names` json NOT NULL',
];

export class LocalMonths1799750000000 implements MigrationInterface {
  readonly name = 'LocalMonths1799750000000';

  async up(queryRunner: QueryRunner): Promise<void> {
    for (const statement of STATEMENTS) await queryRunner.query(statement);
  }

  async down(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query('ALTER TABLE `community` DROP COLUMN IF EXISTS `moon_names`');
    await queryRunner.query('ALTER TABLE `community` DROP COLUMN IF EXISTS `local_months`');
  }
}
