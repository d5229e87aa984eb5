import type { MigrationInterface, QueryRunner } from 'typeorm';

const COLUMNS = [
  ['answer', 'recording_id', 'uuid NULL'],
  ['answer', 'proof', 'varchar(16) CHARACTER SET ascii COLLATE ascii_bin NULL'],
  ['answer', 'proof_id', 'uuid NULL'],
  ['note', 'typed_by', 'uuid NULL'],
  ['note_answer', 'typed_by', 'uuid NULL'],
  ['attachment', 'typed_by', 'uuid NULL'],
  ['audit_event', 'on_behalf_of', 'uuid NULL'],
] as const;

/** Answers by voice and on paper, and who wrote for whom. Every statement can be run again. */
const STATEMENTS = [
  ...COLUMNS.map(
    ([table, column, type]) => `ALTER TABLE \`${table}\` ADD COLUMN IF NOT EXISTS \`${column}\` ${type}`,
  ),
  // Until now somebody else's hand was proved by a witness, or by the elder's PIN.
  "UPDATE `answer` SET `proof` = IF(`witness` IS NULL, 'pin', 'witness') WHERE `recorded_by` IS NOT NULL AND `proof` IS NULL",
  `CREATE TABLE IF NOT EXISTS \`meeting\` (\`id\` uuid NOT NULL, \`version_id\` uuid NOT NULL, \`held_on\` date NOT NULL, \`witness\` varchar(120) NOT NULL, \`typed_by\` uuid NOT NULL, \`typed_at\` datetime(6) NOT NULL, INDEX \`meeting_version\` (\`version_id\`), PRIMARY KEY (\`id\`)) ENGINE=InnoDB`,
  `ALTER TABLE \`meeting\` ADD CONSTRAINT \`fk_meeting_version\` FOREIGN KEY IF NOT EXISTS (\`version_id\`) REFERENCES \`calendar_version\`(\`id\`) ON DELETE CASCADE ON UPDATE NO ACTION`,
];

export class ByEar1798300000000 implements MigrationInterface {
  readonly name = 'ByEar1798300000000';

  async up(queryRunner: QueryRunner): Promise<void> {
    for (const statement of STATEMENTS) await queryRunner.query(statement);
  }

  async down(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query('DROP TABLE IF EXISTS `meeting`');
    for (const [table, column] of COLUMNS) {
      await queryRunner.query(`ALTER TABLE \`${table}\` DROP COLUMN IF EXISTS \`${column}\``);
    }
  }
}
