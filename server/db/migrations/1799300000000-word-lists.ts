import type { MigrationInterface, QueryRunner } from 'typeorm';

/** What a village calls kinds of events, kinds of work, and crops. */
const STATEMENTS = [
  `CREATE TABLE IF NOT EXISTS \`word_list\` (\`community_id\` uuid NOT NULL, \`list\` varchar(20) NOT NULL, \`items\` json NOT NULL, \`version\` int NOT NULL, \`updated_by\` uuid NOT NULL, \`updated_at\` datetime(6) NOT NULL, PRIMARY KEY (\`community_id\`, \`list\`)) ENGINE=InnoDB`,
  `ALTER TABLE \`word_list\` ADD CONSTRAINT \`fk_word_list_community\` FOREIGN KEY IF NOT EXISTS (\`community_id\`) REFERENCES \`community\`(\`id\`) ON DELETE CASCADE ON UPDATE NO ACTION`,
];

export class WordLists1799300000000 implements MigrationInterface {
  readonly name = 'WordLists1799300000000';

  async up(queryRunner: QueryRunner): Promise<void> {
    for (const statement of STATEMENTS) await queryRunner.query(statement);
  }

  async down(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query('DROP TABLE IF EXISTS `word_list`');
  }
}
