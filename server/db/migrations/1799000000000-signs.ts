import type { MigrationInterface, QueryRunner } from 'typeorm';

/** The villages' lists of signs, and when a sign was seen. */
const STATEMENTS = [
  `CREATE TABLE IF NOT EXISTS \`sign\` (\`id\` uuid NOT NULL, \`community_id\` uuid NOT NULL, \`words\` json NOT NULL, \`taken_out_at\` datetime(6) NULL, \`updated_by\` uuid NOT NULL, \`updated_at\` datetime(6) NOT NULL, \`version\` int NOT NULL, INDEX \`sign_community\` (\`community_id\`), PRIMARY KEY (\`id\`)) ENGINE=InnoDB`,
  `CREATE TABLE IF NOT EXISTS \`sign_sighting\` (\`id\` uuid NOT NULL, \`sign_id\` uuid NOT NULL, \`day\` char(10) CHARACTER SET ascii COLLATE ascii_bin NOT NULL, \`who\` varchar(120) NOT NULL, \`marked_by\` uuid NOT NULL, \`marked_at\` datetime(6) NOT NULL, INDEX \`sign_sighting_sign\` (\`sign_id\`), PRIMARY KEY (\`id\`)) ENGINE=InnoDB`,
  `ALTER TABLE \`sign\` ADD CONSTRAINT \`fk_sign_community\` FOREIGN KEY IF NOT EXISTS (\`community_id\`) REFERENCES \`community\`(\`id\`) ON DELETE CASCADE ON UPDATE NO ACTION`,
  `ALTER TABLE \`sign_sighting\` ADD CONSTRAINT \`fk_sign_sighting_sign\` FOREIGN KEY IF NOT EXISTS (\`sign_id\`) REFERENCES \`sign\`(\`id\`) ON DELETE CASCADE ON UPDATE NO ACTION`,
];

export class Signs1799000000000 implements MigrationInterface {
  readonly name = 'Signs1799000000000';

  async up(queryRunner: QueryRunner): Promise<void> {
    for (const statement of STATEMENTS) await queryRunner.query(statement);
  }

  async down(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query('DROP TABLE IF EXISTS `sign_sighting`');
    await queryRunner.query('DROP TABLE IF EXISTS `sign`');
  }
}
