import type { MigrationInterface, QueryRunner } from 'typeorm';

/** Remarks that people pin to entries, figures and markers, and the answers to them. */
const STATEMENTS = [
  `CREATE TABLE IF NOT EXISTS \`note\` (\`id\` uuid NOT NULL, \`community_id\` uuid NOT NULL, \`subject_type\` varchar(16) CHARACTER SET ascii COLLATE ascii_bin NOT NULL, \`subject_id\` varchar(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL, \`pin\` json NOT NULL, \`text\` text NOT NULL, \`author_id\` uuid NOT NULL, \`written_at\` datetime(6) NOT NULL, \`closed_at\` datetime(6) NULL, INDEX \`note_subject\` (\`community_id\`, \`subject_type\`, \`subject_id\`), PRIMARY KEY (\`id\`)) ENGINE=InnoDB`,
  `ALTER TABLE \`note\` ADD CONSTRAINT \`fk_note_community\` FOREIGN KEY IF NOT EXISTS (\`community_id\`) REFERENCES \`community\`(\`id\`) ON DELETE CASCADE ON UPDATE NO ACTION`,
  `CREATE TABLE IF NOT EXISTS \`note_answer\` (\`id\` uuid NOT NULL, \`note_id\` uuid NOT NULL, \`text\` text NOT NULL, \`author_id\` uuid NOT NULL, \`written_at\` datetime(6) NOT NULL, INDEX \`note_answer_note\` (\`note_id\`), PRIMARY KEY (\`id\`)) ENGINE=InnoDB`,
  `ALTER TABLE \`note_answer\` ADD CONSTRAINT \`fk_note_answer_note\` FOREIGN KEY IF NOT EXISTS (\`note_id\`) REFERENCES \`note\`(\`id\`) ON DELETE CASCADE ON UPDATE NO ACTION`,
];

export class Notes1797600000000 implements MigrationInterface {
  readonly name = 'Notes1797600000000';

  async up(queryRunner: QueryRunner): Promise<void> {
    for (const statement of STATEMENTS) await queryRunner.query(statement);
  }

  async down(queryRunner: QueryRunner): Promise<void> {
    for (const table of ['note_answer', 'note']) await queryRunner.query(`DROP TABLE IF EXISTS \`${table}\``);
  }
}
