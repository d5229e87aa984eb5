import type { MigrationInterface, QueryRunner } from 'typeorm';

/** Addresses under which telephones fetch the village's calendar. */
const STATEMENTS = [
  `CREATE TABLE IF NOT EXISTS \`calendar_feed\` (\`id\` uuid NOT NULL, \`community_id\` uuid NOT NULL, \`person_id\` uuid NOT NULL, \`key_hash\` char(64) CHARACTER SET "ascii" COLLATE "ascii_bin" NOT NULL, \`made_at\` datetime(6) NOT NULL, \`fetched_on\` date NULL, INDEX \`calendar_feed_person\` (\`community_id\`, \`person_id\`), UNIQUE INDEX \`calendar_feed_key\` (\`key_hash\`), PRIMARY KEY (\`id\`)) ENGINE=InnoDB`,
  `ALTER TABLE \`calendar_feed\` ADD CONSTRAINT \`fk_calendar_feed_community\` FOREIGN KEY IF NOT EXISTS (\`community_id\`) REFERENCES \`community\`(\`id\`) ON DELETE CASCADE ON UPDATE NO ACTION`,
  `ALTER TABLE \`calendar_feed\` ADD CONSTRAINT \`fk_calendar_feed_person\` FOREIGN KEY IF NOT EXISTS (\`person_id\`) REFERENCES \`person\`(\`id\`) ON DELETE CASCADE ON UPDATE NO ACTION`,
];

export class CalendarFeeds1798600000000 implements MigrationInterface {
  readonly name = 'CalendarFeeds1798600000000';

  async up(queryRunner: QueryRunner): Promise<void> {
    for (const statement of STATEMENTS) await queryRunner.query(statement);
  }

  async down(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query('DROP TABLE IF EXISTS `calendar_feed`');
  }
}
