import type { MigrationInterface, QueryRunner } from 'typeorm';

/** Writes that came with a key, so that one that is sent twice counts once. */
const STATEMENTS = [
  `CREATE TABLE IF NOT EXISTS \`write_key\` (\`key_hash\` char(64) CHARACTER SET "ascii" COLLATE "ascii_bin" NOT NULL, \`call_hash\` char(64) CHARACTER SET "ascii" COLLATE "ascii_bin" NOT NULL, \`person_id\` uuid NOT NULL, \`result_id\` uuid NOT NULL, \`done_at\` datetime(6) NOT NULL, INDEX \`write_key_person\` (\`person_id\`), INDEX \`write_key_done\` (\`done_at\`), PRIMARY KEY (\`key_hash\`)) ENGINE=InnoDB`,
  `ALTER TABLE \`write_key\` ADD CONSTRAINT \`fk_write_key_person\` FOREIGN KEY IF NOT EXISTS (\`person_id\`) REFERENCES \`person\`(\`id\`) ON DELETE CASCADE ON UPDATE NO ACTION`,
];

export class WriteKeys1799200000000 implements MigrationInterface {
  readonly name = 'WriteKeys1799200000000';

  async up(queryRunner: QueryRunner): Promise<void> {
    for (const statement of STATEMENTS) await queryRunner.query(statement);
  }

  async down(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query('DROP TABLE IF EXISTS `write_key`');
  }
}
