import type { MigrationInterface, QueryRunner } from 'typeorm';

/** DDL commits by itself in MariaDB, so every statement can be run again after a start that broke off half-way. */
const STATEMENTS = [
  `CREATE TABLE IF NOT EXISTS \`community\` (\`id\` uuid NOT NULL, \`name\` varchar(120) NOT NULL, \`village_language_tag\` varchar(35) CHARACTER SET ascii COLLATE ascii_bin NOT NULL, \`village_language_name\` varchar(60) NOT NULL, \`officer_language_tag\` varchar(35) CHARACTER SET ascii COLLATE ascii_bin NOT NULL, \`officer_language_name\` varchar(60) NOT NULL, \`year_start_month\` tinyint UNSIGNED NOT NULL, \`year_start_day\` tinyint UNSIGNED NOT NULL, \`year_start_note\` varchar(200) NOT NULL, \`weather_contact\` varchar(200) NOT NULL, \`agriculture_contact\` varchar(200) NOT NULL, \`sign_off_rule\` json NOT NULL, \`created_at\` datetime(6) NOT NULL, \`version\` int NOT NULL, PRIMARY KEY (\`id\`)) ENGINE=InnoDB`,
  `CREATE TABLE IF NOT EXISTS \`place\` (\`id\` uuid NOT NULL, \`community_id\` uuid NOT NULL, \`name\` varchar(120) NOT NULL, \`latitude_deg\` double NOT NULL, \`longitude_deg\` double NOT NULL, \`elevation_m\` double NOT NULL, \`time_zone\` varchar(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL, \`skyline\` json NOT NULL, \`clarity_by_month\` json NOT NULL, \`threshold_set\` varchar(32) CHARACTER SET ascii COLLATE ascii_bin NOT NULL, \`same_side_shift_deg\` double NOT NULL, \`opposite_side_shift_deg\` double NOT NULL, \`skyline_rule\` varchar(32) CHARACTER SET ascii COLLATE ascii_bin NOT NULL, \`created_at\` datetime(6) NOT NULL, \`version\` int NOT NULL, INDEX \`place_community\` (\`community_id\`), PRIMARY KEY (\`id\`)) ENGINE=InnoDB`,
  `CREATE TABLE IF NOT EXISTS \`calendar\` (\`id\` uuid NOT NULL, \`community_id\` uuid NOT NULL, \`place_id\` uuid NOT NULL, \`year\` int NOT NULL, \`out_number\` int NULL, \`published_number\` int NULL, \`submission_count\` int NOT NULL DEFAULT '0', \`label_count\` int NOT NULL DEFAULT '0', \`created_at\` datetime(6) NOT NULL, \`updated_at\` datetime(6) NOT NULL, INDEX \`calendar_community\` (\`community_id\`), UNIQUE INDEX \`calendar_place_year\` (\`place_id\`, \`year\`), PRIMARY KEY (\`id\`)) ENGINE=InnoDB`,
  `CREATE TABLE IF NOT EXISTS \`membership\` (\`id\` uuid NOT NULL, \`person_id\` uuid NOT NULL, \`community_id\` uuid NOT NULL, \`roles\` json NOT NULL, \`version\` int NOT NULL, INDEX \`membership_community\` (\`community_id\`), UNIQUE INDEX \`membership_person_community\` (\`person_id\`, \`community_id\`), PRIMARY KEY (\`id\`)) ENGINE=InnoDB`,
  `CREATE TABLE IF NOT EXISTS \`person\` (\`id\` uuid NOT NULL, \`email\` varchar(190) NOT NULL, \`display_name\` varchar(80) NOT NULL, \`password_hash\` varchar(255) NULL, \`is_demo\` tinyint NOT NULL DEFAULT 0, \`created_at\` datetime(6) NOT NULL, \`version\` int NOT NULL, UNIQUE INDEX \`person_email\` (\`email\`), PRIMARY KEY (\`id\`)) ENGINE=InnoDB`,
  `CREATE TABLE IF NOT EXISTS \`answer\` (\`id\` uuid NOT NULL, \`calendar_id\` uuid NOT NULL, \`entry_id\` uuid NOT NULL, \`entry_hash\` char(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL, \`elder_id\` uuid NOT NULL, \`answer\` varchar(24) CHARACTER SET ascii COLLATE ascii_bin NOT NULL, \`note\` varchar(1000) NOT NULL, \`let_stand\` tinyint NOT NULL DEFAULT 0, \`recorded_by\` uuid NULL, \`witness\` varchar(120) NULL, \`answered_at\` datetime(6) NOT NULL, INDEX \`answer_calendar\` (\`calendar_id\`), UNIQUE INDEX \`answer_entry_elder\` (\`entry_id\`, \`entry_hash\`, \`elder_id\`), PRIMARY KEY (\`id\`)) ENGINE=InnoDB`,
  `CREATE TABLE IF NOT EXISTS \`audit_event\` (\`sequence\` bigint UNSIGNED NOT NULL AUTO_INCREMENT, \`id\` uuid NOT NULL, \`community_id\` uuid NULL, \`at\` datetime(6) NOT NULL, \`actor_id\` uuid NULL, \`action\` varchar(40) CHARACTER SET ascii COLLATE ascii_bin NOT NULL, \`subject_type\` varchar(16) CHARACTER SET ascii COLLATE ascii_bin NOT NULL, \`subject_id\` uuid NULL, \`details\` json NOT NULL, UNIQUE INDEX \`audit_id\` (\`id\`), INDEX \`audit_community\` (\`community_id\`, \`sequence\`), PRIMARY KEY (\`sequence\`)) ENGINE=InnoDB`,
  `CREATE TABLE IF NOT EXISTS \`version_entry\` (\`id\` uuid NOT NULL, \`version_id\` uuid NOT NULL, \`position\` int NOT NULL, \`entry_id\` uuid NOT NULL, \`salt\` varchar(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL, \`body_text\` longtext NOT NULL, \`hash\` char(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL, INDEX \`version_entry_entry\` (\`entry_id\`), UNIQUE INDEX \`version_entry_position\` (\`version_id\`, \`position\`), PRIMARY KEY (\`id\`)) ENGINE=InnoDB`,
  `CREATE TABLE IF NOT EXISTS \`calendar_version\` (\`id\` uuid NOT NULL, \`calendar_id\` uuid NOT NULL, \`number\` int NOT NULL, \`label\` varchar(20) NULL, \`state\` varchar(16) CHARACTER SET ascii COLLATE ascii_bin NOT NULL, \`state_note\` varchar(300) NOT NULL DEFAULT '', \`header_text\` longtext NOT NULL, \`header_hash\` char(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL, \`hash\` char(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL, \`sign_off_rule\` json NOT NULL, \`writer_ids\` json NOT NULL, \`submitted_by\` uuid NOT NULL, \`submitted_at\` datetime(6) NOT NULL, \`published_at\` datetime(6) NULL, UNIQUE INDEX \`calendar_version_number\` (\`calendar_id\`, \`number\`), PRIMARY KEY (\`id\`)) ENGINE=InnoDB`,
  `CREATE TABLE IF NOT EXISTS \`draft_contribution\` (\`calendar_id\` uuid NOT NULL, \`person_id\` uuid NOT NULL, \`last_at\` datetime(6) NOT NULL, PRIMARY KEY (\`calendar_id\`, \`person_id\`)) ENGINE=InnoDB`,
  `CREATE TABLE IF NOT EXISTS \`entry\` (\`id\` uuid NOT NULL, \`calendar_id\` uuid NOT NULL, \`position\` int NOT NULL, \`content\` json NOT NULL, \`deleted_at\` datetime(6) NULL, \`updated_by\` uuid NOT NULL, \`updated_at\` datetime(6) NOT NULL, \`version\` int NOT NULL, INDEX \`entry_calendar_position\` (\`calendar_id\`, \`position\`), PRIMARY KEY (\`id\`)) ENGINE=InnoDB`,
  `CREATE TABLE IF NOT EXISTS \`one_time_code\` (\`id\` uuid NOT NULL, \`purpose\` varchar(16) CHARACTER SET ascii COLLATE ascii_bin NOT NULL, \`person_id\` uuid NULL, \`code_hash\` char(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL, \`failed_tries\` int NOT NULL DEFAULT '0', \`expires_at\` datetime(6) NOT NULL, \`used_at\` datetime(6) NULL, INDEX \`one_time_code_person\` (\`person_id\`), PRIMARY KEY (\`id\`)) ENGINE=InnoDB`,
  `CREATE TABLE IF NOT EXISTS \`session\` (\`sid_hash\` varchar(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL, \`person_id\` uuid NULL, \`data\` longtext NOT NULL, \`expires_at\` datetime(6) NOT NULL, INDEX \`session_person\` (\`person_id\`), INDEX \`session_expiry\` (\`expires_at\`), PRIMARY KEY (\`sid_hash\`)) ENGINE=InnoDB`,
  `CREATE TABLE IF NOT EXISTS \`signature\` (\`id\` uuid NOT NULL, \`version_id\` uuid NOT NULL, \`person_id\` uuid NOT NULL, \`role\` varchar(16) CHARACTER SET ascii COLLATE ascii_bin NOT NULL, \`signed_at\` datetime(6) NOT NULL, UNIQUE INDEX \`signature_version_person_role\` (\`version_id\`, \`person_id\`, \`role\`), PRIMARY KEY (\`id\`)) ENGINE=InnoDB`,
  `ALTER TABLE \`place\` ADD CONSTRAINT \`fk_place_community\` FOREIGN KEY IF NOT EXISTS (\`community_id\`) REFERENCES \`community\`(\`id\`) ON DELETE CASCADE ON UPDATE NO ACTION`,
  `ALTER TABLE \`calendar\` ADD CONSTRAINT \`fk_calendar_community\` FOREIGN KEY IF NOT EXISTS (\`community_id\`) REFERENCES \`community\`(\`id\`) ON DELETE CASCADE ON UPDATE NO ACTION`,
  `ALTER TABLE \`calendar\` ADD CONSTRAINT \`fk_calendar_place\` FOREIGN KEY IF NOT EXISTS (\`place_id\`) REFERENCES \`place\`(\`id\`) ON DELETE RESTRICT ON UPDATE NO ACTION`,
  `ALTER TABLE \`membership\` ADD CONSTRAINT \`fk_membership_person\` FOREIGN KEY IF NOT EXISTS (\`person_id\`) REFERENCES \`person\`(\`id\`) ON DELETE CASCADE ON UPDATE NO ACTION`,
  `ALTER TABLE \`membership\` ADD CONSTRAINT \`fk_membership_community\` FOREIGN KEY IF NOT EXISTS (\`community_id\`) REFERENCES \`community\`(\`id\`) ON DELETE CASCADE ON UPDATE NO ACTION`,
  `ALTER TABLE \`answer\` ADD CONSTRAINT \`fk_answer_calendar\` FOREIGN KEY IF NOT EXISTS (\`calendar_id\`) REFERENCES \`calendar\`(\`id\`) ON DELETE CASCADE ON UPDATE NO ACTION`,
  `ALTER TABLE \`answer\` ADD CONSTRAINT \`fk_answer_elder\` FOREIGN KEY IF NOT EXISTS (\`elder_id\`) REFERENCES \`person\`(\`id\`) ON DELETE CASCADE ON UPDATE NO ACTION`,
  `ALTER TABLE \`version_entry\` ADD CONSTRAINT \`fk_version_entry_version\` FOREIGN KEY IF NOT EXISTS (\`version_id\`) REFERENCES \`calendar_version\`(\`id\`) ON DELETE CASCADE ON UPDATE NO ACTION`,
  `ALTER TABLE \`calendar_version\` ADD CONSTRAINT \`fk_calendar_version_calendar\` FOREIGN KEY IF NOT EXISTS (\`calendar_id\`) REFERENCES \`calendar\`(\`id\`) ON DELETE CASCADE ON UPDATE NO ACTION`,
  `ALTER TABLE \`entry\` ADD CONSTRAINT \`fk_entry_calendar\` FOREIGN KEY IF NOT EXISTS (\`calendar_id\`) REFERENCES \`calendar\`(\`id\`) ON DELETE CASCADE ON UPDATE NO ACTION`,
  `ALTER TABLE \`one_time_code\` ADD CONSTRAINT \`fk_one_time_code_person\` FOREIGN KEY IF NOT EXISTS (\`person_id\`) REFERENCES \`person\`(\`id\`) ON DELETE CASCADE ON UPDATE NO ACTION`,
  `ALTER TABLE \`signature\` ADD CONSTRAINT \`fk_signature_version\` FOREIGN KEY IF NOT EXISTS (\`version_id\`) REFERENCES \`calendar_version\`(\`id\`) ON DELETE CASCADE ON UPDATE NO ACTION`,
  `ALTER TABLE \`signature\` ADD CONSTRAINT \`fk_signature_person\` FOREIGN KEY IF NOT EXISTS (\`person_id\`) REFERENCES \`person\`(\`id\`) ON DELETE RESTRICT ON UPDATE NO ACTION`,
];

const TABLES = [
  'community',
  'place',
  'calendar',
  'membership',
  'person',
  'answer',
  'audit_event',
  'version_entry',
  'calendar_version',
  'draft_contribution',
  'entry',
  'one_time_code',
  'session',
  'signature',
];

export class FirstSchema1796000000000 implements MigrationInterface {
  readonly name = 'FirstSchema1796000000000';

  async up(queryRunner: QueryRunner): Promise<void> {
    for (const statement of STATEMENTS) await queryRunner.query(statement);
  }

  async down(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query('SET FOREIGN_KEY_CHECKS = 0');
    for (const table of TABLES) await queryRunner.query(`DROP TABLE IF EXISTS \`${table}\``);
    await queryRunner.query('SET FOREIGN_KEY_CHECKS = 1');
  }
}
