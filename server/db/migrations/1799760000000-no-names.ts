import type { MigrationInterface, QueryRunner } from 'typeorm';

/** Words on pages for everybody that somebody said to be no name. */
const STATEMENTS = [
  `CREATE TABLE IF NOT EXISTS \`no_name\` (\`id\` uuid NOT NULL, \`entry_id\` uuid NOT NULL, \`word\` varchar(16) CHARACTER SET "ascii" COLLATE "ascii_bin" NOT NULL, \`found_key\` char(64) CHARACTER SET "ascii" COLLATE "ascii_bin" NOT NULL, \`said_by\` uuid NOT NULL, \`said_at\` datetime(6) NOT NULL, UNIQUE INDEX \`no_name_once\` (\`entry_id\`, \`word\`, \`found_key\`), PRIMARY KEY (\`id\`)) ENGINE=InnoDB`,
  `ALTER TABLE \`no_name\` ADD CONSTRAINT \`fk_no_name_entry\` FOREIGN KEY IF NOT EXISTS (\`entry_id\`) REFERENCES \`entry\`(\`id\`) ON DELETE CASCADE ON UPDATE NO ACTION`,
];

export class NoNames1799760000000 implements MigrationInterface {
  readonly name = 'NoNames1799760000000';

  async up(queryRunner: QueryRunner): Promise<void> {
    for (const statement of STATEMENTS) await queryRunner.query(statement);
  }

  async down(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query('DROP TABLE IF EXISTS `no_name`');
  }
}
