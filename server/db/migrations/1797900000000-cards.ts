import type { MigrationInterface, QueryRunner } from 'typeorm';

/** Printed cards for signing in, and which session one of them opened. */
const STATEMENTS = [
  `CREATE TABLE IF NOT EXISTS \`sign_in_card\` (\`id\` uuid NOT NULL, \`community_id\` uuid NOT NULL, \`person_id\` uuid NOT NULL, \`live_for\` uuid NULL, \`code_hash\` char(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL, \`pin_hash\` varchar(255) NULL, \`failed_tries\` int NOT NULL DEFAULT '0', \`locked_until\` datetime(6) NULL, \`made_by\` uuid NOT NULL, \`made_at\` datetime(6) NOT NULL, \`last_used_at\` datetime(6) NULL, \`ended_at\` datetime(6) NULL, \`ended_why\` varchar(16) CHARACTER SET ascii COLLATE ascii_bin NULL, UNIQUE INDEX \`sign_in_card_code\` (\`code_hash\`), INDEX \`sign_in_card_person\` (\`community_id\`, \`person_id\`), UNIQUE INDEX \`sign_in_card_one_live\` (\`live_for\`, \`community_id\`), PRIMARY KEY (\`id\`)) ENGINE=InnoDB`,
  `ALTER TABLE \`sign_in_card\` ADD CONSTRAINT \`fk_sign_in_card_community\` FOREIGN KEY IF NOT EXISTS (\`community_id\`) REFERENCES \`community\`(\`id\`) ON DELETE CASCADE ON UPDATE NO ACTION`,
  `ALTER TABLE \`sign_in_card\` ADD CONSTRAINT \`fk_sign_in_card_person\` FOREIGN KEY IF NOT EXISTS (\`person_id\`) REFERENCES \`person\`(\`id\`) ON DELETE CASCADE ON UPDATE NO ACTION`,
  'ALTER TABLE `session` ADD COLUMN IF NOT EXISTS `card_id` uuid NULL',
  'CREATE INDEX IF NOT EXISTS `session_card` ON `session` (`card_id`)',
];

export class Cards1797900000000 implements MigrationInterface {
  readonly name = 'Cards1797900000000';

  async up(queryRunner: QueryRunner): Promise<void> {
    for (const statement of STATEMENTS) await queryRunner.query(statement);
  }

  async down(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query('DROP INDEX IF EXISTS `session_card` ON `session`');
    await queryRunner.query('ALTER TABLE `session` DROP COLUMN IF EXISTS `card_id`');
    await queryRunner.query('DROP TABLE IF EXISTS `sign_in_card`');
  }
}
