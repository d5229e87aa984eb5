import type { MigrationInterface, QueryRunner } from 'typeorm';

/** Months of rain and cloud at a place; none where nobody has said. Every statement can be run again. */
const NO_RAIN = JSON.stringify(new Array<boolean>(12).fill(false));
const STATEMENTS = [
  'ALTER TABLE `place` ADD COLUMN IF NOT EXISTS `rain_months` json NULL',
  `UPDATE \`place\` SET \`rain_months\` = '${NO_RAIN}' WHERE \`rain_months\` IS NULL`,
  'ALTER TABLE `place` MODIFY COLUMN `rain_months` json NOT NULL',
];

export class RainMonths1797000000000 implements MigrationInterface {
  readonly name = 'RainMonths1797000000000';

  async up(queryRunner: QueryRunner): Promise<void> {
    for (const statement of STATEMENTS) await queryRunner.query(statement);
  }

  async down(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query('ALTER TABLE `place` DROP COLUMN IF EXISTS `rain_months`');
  }
}
