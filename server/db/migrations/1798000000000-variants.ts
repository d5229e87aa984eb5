import type { MigrationInterface, QueryRunner } from 'typeorm';

/** Other keepers' timings beside an entry, in the draft and as they were frozen. */
const STATEMENTS = [
  `CREATE TABLE IF NOT EXISTS \`entry_variant\` (\`id\` uuid NOT NULL, \`entry_id\` uuid NOT NULL, \`content\` json NOT NULL, \`added_at\` datetime(6) NOT NULL, \`updated_by\` uuid NOT NULL, \`updated_at\` datetime(6) NOT NULL, \`version\` int NOT NULL, INDEX \`entry_variant_entry\` (\`entry_id\`), PRIMARY KEY (\`id\`)) ENGINE=InnoDB`,
  `ALTER TABLE \`entry_variant\` ADD CONSTRAINT \`fk_entry_variant_entry\` FOREIGN KEY IF NOT EXISTS (\`entry_id\`) REFERENCES \`entry\`(\`id\`) ON DELETE CASCADE ON UPDATE NO ACTION`,
  `CREATE TABLE IF NOT EXISTS \`version_variant\` (\`id\` uuid NOT NULL, \`version_id\` uuid NOT NULL, \`entry_id\` uuid NOT NULL, \`variant_id\` uuid NOT NULL, \`position\` int NOT NULL, \`salt\` varchar(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL, \`body_text\` longtext NOT NULL, \`hash\` char(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL, \`rank\` int NOT NULL, \`redacted\` tinyint NOT NULL DEFAULT 0, INDEX \`version_variant_version\` (\`version_id\`), INDEX \`version_variant_variant\` (\`variant_id\`), PRIMARY KEY (\`id\`)) ENGINE=InnoDB`,
  `ALTER TABLE \`version_variant\` ADD CONSTRAINT \`fk_version_variant_version\` FOREIGN KEY IF NOT EXISTS (\`version_id\`) REFERENCES \`calendar_version\`(\`id\`) ON DELETE CASCADE ON UPDATE NO ACTION`,
];

export class Variants1798000000000 implements MigrationInterface {
  readonly name = 'Variants1798000000000';

  async up(queryRunner: QueryRunner): Promise<void> {
    for (const statement of STATEMENTS) await queryRunner.query(statement);
  }

  async down(queryRunner: QueryRunner): Promise<void> {
    for (const table of ['version_variant', 'entry_variant']) {
      await queryRunner.query(`DROP TABLE IF EXISTS \`${table}\``);
    }
  }
}
