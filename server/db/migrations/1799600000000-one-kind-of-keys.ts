import type { MigrationInterface, QueryRunner } from 'typeorm';

/** What was brought into a draft counts once in the same list as every other write; what stood in its own list goes along. */
const ADD_COUNTS = 'ALTER TABLE `write_key` ADD COLUMN IF NOT EXISTS `counts` json NULL';
/** The key as `http/write-key.ts` hashes it; what was asked with it is not known any more. */
const TAKE_OVER = `INSERT IGNORE INTO \`write_key\` (\`key_hash\`, \`call_hash\`, \`person_id\`, \`result_id\`, \`done_at\`, \`counts\`)
  SELECT SHA2(CONCAT('["', \`brought_by\`, '","', \`import_key\`, '"]'), 256), '', \`brought_by\`, \`calendar_id\`, \`brought_at\`,
    JSON_OBJECT('added', \`added\`, 'refused', \`refused\`)
  FROM \`calendar_import\` WHERE \`brought_by\` IN (SELECT \`id\` FROM \`person\`)`;
const OWN_LIST = [
  `CREATE TABLE IF NOT EXISTS \`calendar_import\` (\`import_key\` uuid NOT NULL, \`calendar_id\` uuid NOT NULL, \`brought_by\` uuid NOT NULL, \`brought_at\` datetime(6) NOT NULL, \`added\` int NOT NULL, \`refused\` int NOT NULL, INDEX \`calendar_import_calendar\` (\`calendar_id\`), PRIMARY KEY (\`import_key\`)) ENGINE=InnoDB`,
  `ALTER TABLE \`calendar_import\` ADD CONSTRAINT \`fk_calendar_import_calendar\` FOREIGN KEY IF NOT EXISTS (\`calendar_id\`) REFERENCES \`calendar\`(\`id\`) ON DELETE CASCADE ON UPDATE NO ACTION`,
];

export class OneKindOfKeys1799600000000 implements MigrationInterface {
  readonly name = 'OneKindOfKeys1799600000000';

  async up(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query(ADD_COUNTS);
    if (await queryRunner.hasTable('calendar_import')) await queryRunner.query(TAKE_OVER);
    await queryRunner.query('DROP TABLE IF EXISTS `calendar_import`');
  }

  async down(queryRunner: QueryRunner): Promise<void> {
    for (const statement of OWN_LIST) await queryRunner.query(statement);
    await queryRunner.query('ALTER TABLE `write_key` DROP COLUMN IF EXISTS `counts`');
  }
}
