import type { MigrationInterface, QueryRunner } from 'typeorm';

/** Drafts that began as the year before, and which of their entries are the same. */
const STATEMENTS = [
  `CREATE TABLE IF NOT EXISTS \`rollover\` (\`calendar_id\` uuid NOT NULL, \`from_calendar_id\` uuid NOT NULL, \`rolled_by\` uuid NOT NULL, \`rolled_at\` datetime(6) NOT NULL, PRIMARY KEY (\`calendar_id\`)) ENGINE=InnoDB`,
  `ALTER TABLE \`rollover\` ADD CONSTRAINT \`fk_rollover_calendar\` FOREIGN KEY IF NOT EXISTS (\`calendar_id\`) REFERENCES \`calendar\`(\`id\`) ON DELETE CASCADE ON UPDATE NO ACTION`,
  `CREATE TABLE IF NOT EXISTS \`rolled_item\` (\`item_id\` uuid NOT NULL, \`item_type\` varchar(16) CHARACTER SET ascii COLLATE ascii_bin NOT NULL, \`from_id\` uuid NOT NULL, \`calendar_id\` uuid NOT NULL, \`before\` json NULL, INDEX \`rolled_item_from\` (\`from_id\`), INDEX \`rolled_item_calendar\` (\`calendar_id\`), PRIMARY KEY (\`item_id\`)) ENGINE=InnoDB`,
];

export class Rollovers1798800000000 implements MigrationInterface {
  readonly name = 'Rollovers1798800000000';

  async up(queryRunner: QueryRunner): Promise<void> {
    for (const statement of STATEMENTS) await queryRunner.query(statement);
  }

  async down(queryRunner: QueryRunner): Promise<void> {
    for (const table of ['rolled_item', 'rollover']) {
      await queryRunner.query(`DROP TABLE IF EXISTS \`${table}\``);
    }
  }
}
