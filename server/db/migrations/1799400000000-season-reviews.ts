import type { MigrationInterface, QueryRunner } from 'typeorm';

/** What a year taught, and what is to be done otherwise in the next one. */
const STATEMENTS = [
  `CREATE TABLE IF NOT EXISTS \`season_lesson\` (\`id\` uuid NOT NULL, \`calendar_id\` uuid NOT NULL, \`entry_id\` uuid NULL, \`text\` text NOT NULL, \`author_id\` uuid NOT NULL, \`typed_by\` uuid NULL, \`written_at\` datetime(6) NOT NULL, INDEX \`season_lesson_calendar\` (\`calendar_id\`), INDEX \`season_lesson_entry\` (\`entry_id\`), PRIMARY KEY (\`id\`)) ENGINE=InnoDB`,
  `CREATE TABLE IF NOT EXISTS \`season_decision\` (\`id\` uuid NOT NULL, \`calendar_id\` uuid NOT NULL, \`entry_id\` uuid NULL, \`kind\` varchar(16) CHARACTER SET "ascii" COLLATE "ascii_bin" NOT NULL, \`text\` text NOT NULL, \`author_id\` uuid NOT NULL, \`decided_at\` datetime(6) NOT NULL, \`done_by\` uuid NULL, \`done_on\` char(10) CHARACTER SET "ascii" COLLATE "ascii_bin" NULL, INDEX \`season_decision_calendar\` (\`calendar_id\`), INDEX \`season_decision_entry\` (\`entry_id\`), PRIMARY KEY (\`id\`)) ENGINE=InnoDB`,
  `ALTER TABLE \`season_lesson\` ADD CONSTRAINT \`fk_season_lesson_calendar\` FOREIGN KEY IF NOT EXISTS (\`calendar_id\`) REFERENCES \`calendar\`(\`id\`) ON DELETE CASCADE ON UPDATE NO ACTION`,
  `ALTER TABLE \`season_decision\` ADD CONSTRAINT \`fk_season_decision_calendar\` FOREIGN KEY IF NOT EXISTS (\`calendar_id\`) REFERENCES \`calendar\`(\`id\`) ON DELETE CASCADE ON UPDATE NO ACTION`,
];

export class SeasonReviews1799400000000 implements MigrationInterface {
  readonly name = 'SeasonReviews1799400000000';

  async up(queryRunner: QueryRunner): Promise<void> {
    for (const statement of STATEMENTS) await queryRunner.query(statement);
  }

  async down(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query('DROP TABLE IF EXISTS `season_decision`');
    await queryRunner.query('DROP TABLE IF EXISTS `season_lesson`');
  }
}
