import type { MigrationInterface, QueryRunner } from 'typeorm';

/** Pages of villages that everybody may read. */
const STATEMENTS = [
  `CREATE TABLE IF NOT EXISTS \`open_page\` (\`community_id\` uuid NOT NULL, \`page_key\` varchar(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL, \`place_shown\` varchar(16) CHARACTER SET ascii COLLATE ascii_bin NOT NULL, \`switched_by\` uuid NOT NULL, \`switched_on_at\` datetime(6) NOT NULL, UNIQUE INDEX \`open_page_key\` (\`page_key\`), PRIMARY KEY (\`community_id\`)) ENGINE=InnoDB`,
  `ALTER TABLE \`open_page\` ADD CONSTRAINT \`fk_open_page_community\` FOREIGN KEY IF NOT EXISTS (\`community_id\`) REFERENCES \`community\`(\`id\`) ON DELETE CASCADE ON UPDATE NO ACTION`,
];

export class OpenPages1798910000000 implements MigrationInterface {
  readonly name = 'OpenPages1798910000000';

  async up(queryRunner: QueryRunner): Promise<void> {
    for (const statement of STATEMENTS) await queryRunner.query(statement);
  }

  async down(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query('DROP TABLE IF EXISTS `open_page`');
  }
}
