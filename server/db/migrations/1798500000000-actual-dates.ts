import type { MigrationInterface, QueryRunner } from 'typeorm';

/** When the work of an entry was really done this year. */
const STATEMENTS = [
  `CREATE TABLE IF NOT EXISTS \`actual_date\` (\`entry_id\` uuid NOT NULL, \`first_day\` char(10) CHARACTER SET ascii COLLATE ascii_bin NOT NULL, \`last_day\` char(10) CHARACTER SET ascii COLLATE ascii_bin NULL, \`said_by\` varchar(120) NOT NULL, \`plots\` varchar(120) NOT NULL, \`typed_by\` uuid NOT NULL, \`typed_at\` datetime(6) NOT NULL, PRIMARY KEY (\`entry_id\`)) ENGINE=InnoDB`,
  `ALTER TABLE \`actual_date\` ADD CONSTRAINT \`fk_actual_date_entry\` FOREIGN KEY IF NOT EXISTS (\`entry_id\`) REFERENCES \`entry\`(\`id\`) ON DELETE CASCADE ON UPDATE NO ACTION`,
];

export class ActualDates1798500000000 implements MigrationInterface {
  readonly name = 'ActualDates1798500000000';

  async up(queryRunner: QueryRunner): Promise<void> {
    for (const statement of STATEMENTS) await queryRunner.query(statement);
  }

  async down(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query('DROP TABLE IF EXISTS `actual_date`');
  }
}
