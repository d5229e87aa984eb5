import type { MigrationInterface, QueryRunner } from 'typeorm';

/** When signs in the own words of entries were seen. */
const STATEMENTS = [
  `CREATE TABLE IF NOT EXISTS \`own_sighting\` (\`id\` uuid NOT NULL, \`entry_id\` uuid NOT NULL, \`own_id\` uuid NOT NULL, \`day\` char(10) CHARACTER SET "ascii" COLLATE "ascii_bin" NOT NULL, \`who\` varchar(120) NOT NULL, \`marked_by\` uuid NOT NULL, \`marked_at\` datetime(6) NOT NULL, INDEX \`own_sighting_entry\` (\`entry_id\`), PRIMARY KEY (\`id\`)) ENGINE=InnoDB`,
  `ALTER TABLE \`own_sighting\` ADD CONSTRAINT \`fk_own_sighting_entry\` FOREIGN KEY IF NOT EXISTS (\`entry_id\`) REFERENCES \`entry\`(\`id\`) ON DELETE CASCADE ON UPDATE NO ACTION`,
];

export class OwnSightings1799300100000 implements MigrationInterface {
  readonly name = 'OwnSightings1799300100000';

  async up(queryRunner: QueryRunner): Promise<void> {
    for (const statement of STATEMENTS) await queryRunner.query(statement);
  }

  async down(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query('DROP TABLE IF EXISTS `own_sighting`');
  }
}
