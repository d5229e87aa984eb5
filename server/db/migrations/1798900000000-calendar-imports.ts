import type { MigrationInterface, QueryRunner } from 'typeorm';

/** What was brought into drafts, so that nothing is brought in twice. */
const STATEMENTS = [
  `CREATE TABLE IF NOT EXISTS \`calendar_import\` (\`import_key\` uuid NOT NULL, \`calendar_id\` uuid NOT NULL, \`brought_by\` uuid NOT NULL, \`brought_at\` datetime(6) NOT NULL, \`added\` int NOT NULL, \`refused\` int NOT NULL, INDEX \`calendar_import_calendar\` (\`calendar_id\`), PRIMARY KEY (\`import_key\`)) ENGINE=InnoDB`,
  `ALTER TABLE \`calendar_import\` ADD CONSTRAINT \`fk_calendar_import_calendar\` FOREIGN KEY IF NOT EXISTS (\`calendar_id\`) REFERENCES \`calendar\`(\`id\`) ON DELETE CASCADE ON UPDATE NO ACTION`,
];

export class CalendarImports1798900000000 implements MigrationInterface {
  readonly name = 'CalendarImports1798900000000';

  async up(queryRunner: QueryRunner): Promise<void> {
    for (const statement of STATEMENTS) await queryRunner.query(statement);
  }

  async down(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query('DROP TABLE IF EXISTS `calendar_import`');
  }
}
