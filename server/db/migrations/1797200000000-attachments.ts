import type { MigrationInterface, QueryRunner } from 'typeorm';

/** Recordings and pictures. Every statement can be run again. */
const STATEMENTS = [
  `CREATE TABLE IF NOT EXISTS \`attachment_part\` (\`attachment_id\` uuid NOT NULL, \`part\` int NOT NULL, \`storage_key\` varchar(32) CHARACTER SET ascii COLLATE ascii_bin NOT NULL, \`thumbnail_key\` varchar(32) CHARACTER SET ascii COLLATE ascii_bin NULL, \`content_type\` varchar(32) CHARACTER SET ascii COLLATE ascii_bin NOT NULL, \`bytes\` int NOT NULL, \`seconds\` double NULL, \`sha256\` char(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL, PRIMARY KEY (\`attachment_id\`, \`part\`)) ENGINE=InnoDB`,
  `CREATE TABLE IF NOT EXISTS \`attachment_words\` (\`id\` uuid NOT NULL, \`attachment_id\` uuid NOT NULL, \`kind\` varchar(16) CHARACTER SET ascii COLLATE ascii_bin NOT NULL, \`language\` varchar(35) CHARACTER SET ascii COLLATE ascii_bin NOT NULL, \`text\` mediumtext NOT NULL, \`author_id\` uuid NOT NULL, \`checked_by_speaker\` tinyint NOT NULL DEFAULT 0, \`updated_at\` datetime(6) NOT NULL, \`version\` int NOT NULL, UNIQUE INDEX \`attachment_words_language\` (\`attachment_id\`, \`kind\`, \`language\`), PRIMARY KEY (\`id\`)) ENGINE=InnoDB`,
  `CREATE TABLE IF NOT EXISTS \`attachment\` (\`id\` uuid NOT NULL, \`community_id\` uuid NOT NULL, \`client_id\` uuid NOT NULL, \`kind\` varchar(16) CHARACTER SET ascii COLLATE ascii_bin NOT NULL, \`subject_type\` varchar(16) CHARACTER SET ascii COLLATE ascii_bin NOT NULL, \`subject_id\` varchar(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL, \`title\` varchar(120) NOT NULL, \`speaker\` varchar(80) NOT NULL, \`language\` varchar(35) CHARACTER SET ascii COLLATE ascii_bin NULL, \`consent\` varchar(16) CHARACTER SET ascii COLLATE ascii_bin NOT NULL, \`sharing_level\` varchar(16) CHARACTER SET ascii COLLATE ascii_bin NOT NULL, \`width_px\` int NULL, \`height_px\` int NULL, \`added_by\` uuid NOT NULL, \`added_at\` datetime(6) NOT NULL, INDEX \`attachment_subject\` (\`community_id\`, \`subject_type\`, \`subject_id\`), UNIQUE INDEX \`attachment_sent_once\` (\`community_id\`, \`added_by\`, \`client_id\`), PRIMARY KEY (\`id\`)) ENGINE=InnoDB`,
  `ALTER TABLE \`attachment_part\` ADD CONSTRAINT \`fk_attachment_part_attachment\` FOREIGN KEY IF NOT EXISTS (\`attachment_id\`) REFERENCES \`attachment\`(\`id\`) ON DELETE CASCADE ON UPDATE NO ACTION`,
  `ALTER TABLE \`attachment_words\` ADD CONSTRAINT \`fk_attachment_words_attachment\` FOREIGN KEY IF NOT EXISTS (\`attachment_id\`) REFERENCES \`attachment\`(\`id\`) ON DELETE CASCADE ON UPDATE NO ACTION`,
  `ALTER TABLE \`attachment_words\` ADD CONSTRAINT \`fk_attachment_words_author\` FOREIGN KEY IF NOT EXISTS (\`author_id\`) REFERENCES \`person\`(\`id\`) ON DELETE CASCADE ON UPDATE NO ACTION`,
  `ALTER TABLE \`attachment\` ADD CONSTRAINT \`fk_attachment_community\` FOREIGN KEY IF NOT EXISTS (\`community_id\`) REFERENCES \`community\`(\`id\`) ON DELETE CASCADE ON UPDATE NO ACTION`,
];

export class Attachments1797200000000 implements MigrationInterface {
  readonly name = 'Attachments1797200000000';

  async up(queryRunner: QueryRunner): Promise<void> {
    for (const statement of STATEMENTS) await queryRunner.query(statement);
  }

  async down(queryRunner: QueryRunner): Promise<void> {
    for (const table of ['attachment_words', 'attachment_part', 'attachment']) {
      await queryRunner.query(`DROP TABLE IF EXISTS \`${table}\``);
    }
  }
}
