import type { MigrationInterface, QueryRunner } from 'typeorm';

/** The villages' own figures. Every statement can be run again. */
const STATEMENTS = [
  `CREATE TABLE IF NOT EXISTS \`figure\` (\`id\` uuid NOT NULL, \`community_id\` uuid NOT NULL, \`names\` json NOT NULL, \`story\` text NOT NULL, \`variants\` json NOT NULL, \`member_hrs\` json NOT NULL, \`indicator_hr\` int NULL, \`patch\` json NULL, \`own_depths\` json NULL, \`sharing_level\` varchar(16) CHARACTER SET ascii COLLATE ascii_bin NOT NULL, \`taken_out_at\` datetime(6) NULL, \`updated_by\` uuid NOT NULL, \`updated_at\` datetime(6) NOT NULL, \`version\` int NOT NULL, INDEX \`figure_community\` (\`community_id\`), PRIMARY KEY (\`id\`)) ENGINE=InnoDB`,
  `ALTER TABLE \`figure\` ADD CONSTRAINT \`fk_figure_community\` FOREIGN KEY IF NOT EXISTS (\`community_id\`) REFERENCES \`community\`(\`id\`) ON DELETE CASCADE ON UPDATE NO ACTION`,
];

export class Figures1796400000000 implements MigrationInterface {
  readonly name = 'Figures1796400000000';

  async up(queryRunner: QueryRunner): Promise<void> {
    for (const statement of STATEMENTS) await queryRunner.query(statement);
  }

  async down(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query('DROP TABLE IF EXISTS `figure`');
  }
}
