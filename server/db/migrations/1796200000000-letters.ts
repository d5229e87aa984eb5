import type { MigrationInterface, QueryRunner } from 'typeorm';

const CODE = 'CHARACTER SET ascii COLLATE ascii_bin';

const STATEMENTS = [
  `CREATE TABLE IF NOT EXISTS \`letter\` (\`id\` uuid NOT NULL, \`kind\` varchar(16) ${CODE} NOT NULL, \`once_key\` varchar(120) ${CODE} NOT NULL, \`person_id\` uuid NULL, \`email\` varchar(190) NULL, \`community_id\` uuid NULL, \`version_id\` uuid NULL, \`state\` varchar(16) ${CODE} NOT NULL, \`reason\` varchar(24) ${CODE} NULL, \`attempts\` int NOT NULL DEFAULT '0', \`next_at\` datetime(6) NOT NULL, \`give_up_at\` datetime(6) NOT NULL, \`created_at\` datetime(6) NOT NULL, \`sent_at\` datetime(6) NULL, INDEX \`letter_person\` (\`person_id\`), INDEX \`letter_community\` (\`community_id\`), INDEX \`letter_due\` (\`state\`, \`next_at\`), UNIQUE INDEX \`letter_once\` (\`once_key\`), PRIMARY KEY (\`id\`)) ENGINE=InnoDB`,
  `CREATE TABLE IF NOT EXISTS \`letter_choice\` (\`person_id\` uuid NOT NULL, \`channel\` varchar(8) ${CODE} NOT NULL, \`rhythm\` varchar(8) ${CODE} NOT NULL, \`visit_me\` tinyint NOT NULL, \`quiet_from_hour\` tinyint UNSIGNED NULL, \`quiet_to_hour\` tinyint UNSIGNED NULL, \`version\` int NOT NULL, PRIMARY KEY (\`person_id\`)) ENGINE=InnoDB`,
  `ALTER TABLE \`letter\` ADD CONSTRAINT \`fk_letter_person\` FOREIGN KEY IF NOT EXISTS (\`person_id\`) REFERENCES \`person\`(\`id\`) ON DELETE CASCADE ON UPDATE NO ACTION`,
  `ALTER TABLE \`letter\` ADD CONSTRAINT \`fk_letter_community\` FOREIGN KEY IF NOT EXISTS (\`community_id\`) REFERENCES \`community\`(\`id\`) ON DELETE CASCADE ON UPDATE NO ACTION`,
  `ALTER TABLE \`letter_choice\` ADD CONSTRAINT \`fk_letter_choice_person\` FOREIGN KEY IF NOT EXISTS (\`person_id\`) REFERENCES \`person\`(\`id\`) ON DELETE CASCADE ON UPDATE NO ACTION`,
];

/** The outbox of letters and how each person wants to be asked. */
export class Letters1796200000000 implements MigrationInterface {
  readonly name = 'Letters1796200000000';

  async up(queryRunner: QueryRunner): Promise<void> {
    for (const statement of STATEMENTS) await queryRunner.query(statement);
  }

  async down(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query('DROP TABLE IF EXISTS `letter_choice`');
    await queryRunner.query('DROP TABLE IF EXISTS `letter`');
  }
}
