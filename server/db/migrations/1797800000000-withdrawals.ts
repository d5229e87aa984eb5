import type { MigrationInterface, QueryRunner } from 'typeorm';

/** What was taken back, and which frozen texts were changed for it. */
const STATEMENTS = [
  `CREATE TABLE IF NOT EXISTS \`withdrawal\` (\`id\` uuid NOT NULL, \`community_id\` uuid NOT NULL, \`item_type\` varchar(16) CHARACTER SET ascii COLLATE ascii_bin NOT NULL, \`item_id\` uuid NOT NULL, \`asked_by\` uuid NULL, \`done_by\` uuid NULL, \`at\` datetime(6) NOT NULL, \`published\` json NOT NULL, \`sheets_replaced_at\` datetime(6) NULL, INDEX \`withdrawal_community\` (\`community_id\`), PRIMARY KEY (\`id\`)) ENGINE=InnoDB`,
  `ALTER TABLE \`withdrawal\` ADD CONSTRAINT \`fk_withdrawal_community\` FOREIGN KEY IF NOT EXISTS (\`community_id\`) REFERENCES \`community\`(\`id\`) ON DELETE CASCADE ON UPDATE NO ACTION`,
  'ALTER TABLE `calendar_version` ADD COLUMN IF NOT EXISTS `header_redacted` tinyint NOT NULL DEFAULT 0',
  'ALTER TABLE `version_entry` ADD COLUMN IF NOT EXISTS `redacted` tinyint NOT NULL DEFAULT 0',
];

export class Withdrawals1797800000000 implements MigrationInterface {
  readonly name = 'Withdrawals1797800000000';

  async up(queryRunner: QueryRunner): Promise<void> {
    for (const statement of STATEMENTS) await queryRunner.query(statement);
  }

  async down(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query('ALTER TABLE `version_entry` DROP COLUMN IF EXISTS `redacted`');
    await queryRunner.query('ALTER TABLE `calendar_version` DROP COLUMN IF EXISTS `header_redacted`');
    await queryRunner.query('DROP TABLE IF EXISTS `withdrawal`');
  }
}
