import type { MigrationInterface, QueryRunner } from 'typeorm';

const PLAIN = `'{"groupId":null,"trace":"blank","tellingSeason":null,"successorId":null,"naming":"named"}'`;
const SHARING_COLUMNS = '(`item_type`, `item_id`, `community_id`, `level`, `details`, `giver_id`, `version`)';

/** Who may see what: groups, a level for every thing, and versions whose hash outlives what is taken back. */
const STATEMENTS = [
  `CREATE TABLE IF NOT EXISTS \`village_group\` (\`id\` uuid NOT NULL, \`community_id\` uuid NOT NULL, \`name\` varchar(60) NOT NULL, \`version\` int NOT NULL, INDEX \`village_group_community\` (\`community_id\`), PRIMARY KEY (\`id\`)) ENGINE=InnoDB`,
  `ALTER TABLE \`village_group\` ADD CONSTRAINT \`fk_village_group_community\` FOREIGN KEY IF NOT EXISTS (\`community_id\`) REFERENCES \`community\`(\`id\`) ON DELETE CASCADE ON UPDATE NO ACTION`,
  `CREATE TABLE IF NOT EXISTS \`group_member\` (\`group_id\` uuid NOT NULL, \`person_id\` uuid NOT NULL, INDEX \`group_member_person\` (\`person_id\`), PRIMARY KEY (\`group_id\`, \`person_id\`)) ENGINE=InnoDB`,
  `ALTER TABLE \`group_member\` ADD CONSTRAINT \`fk_group_member_group\` FOREIGN KEY IF NOT EXISTS (\`group_id\`) REFERENCES \`village_group\`(\`id\`) ON DELETE CASCADE ON UPDATE NO ACTION`,
  `ALTER TABLE \`group_member\` ADD CONSTRAINT \`fk_group_member_person\` FOREIGN KEY IF NOT EXISTS (\`person_id\`) REFERENCES \`person\`(\`id\`) ON DELETE CASCADE ON UPDATE NO ACTION`,
  `CREATE TABLE IF NOT EXISTS \`item_sharing\` (\`item_type\` varchar(16) CHARACTER SET ascii COLLATE ascii_bin NOT NULL, \`item_id\` uuid NOT NULL, \`community_id\` uuid NOT NULL, \`level\` varchar(16) CHARACTER SET ascii COLLATE ascii_bin NOT NULL, \`details\` json NOT NULL, \`giver_id\` uuid NULL, \`asked\` json NULL, \`state\` varchar(16) CHARACTER SET ascii COLLATE ascii_bin NOT NULL DEFAULT 'shared', \`state_at\` datetime(6) NULL, \`leaves_trace\` tinyint NOT NULL DEFAULT 0, \`version\` int NOT NULL, INDEX \`item_sharing_community\` (\`community_id\`), INDEX \`item_sharing_giver\` (\`giver_id\`), PRIMARY KEY (\`item_type\`, \`item_id\`)) ENGINE=InnoDB`,
  `ALTER TABLE \`item_sharing\` ADD CONSTRAINT \`fk_item_sharing_community\` FOREIGN KEY IF NOT EXISTS (\`community_id\`) REFERENCES \`community\`(\`id\`) ON DELETE CASCADE ON UPDATE NO ACTION`,
  'CREATE TABLE IF NOT EXISTS `kept_read` (`person_id` uuid NOT NULL, `item_id` uuid NOT NULL, `day` date NOT NULL, PRIMARY KEY (`person_id`, `item_id`, `day`)) ENGINE=InnoDB',
  `INSERT IGNORE INTO \`item_sharing\` ${SHARING_COLUMNS} SELECT 'entry', e.id, c.community_id, JSON_VALUE(e.content, '$.sharingLevel'), ${PLAIN}, e.updated_by, 1 FROM entry e JOIN calendar c ON c.id = e.calendar_id`,
  // So that the two statements behind it can run again when the column has gone already.
  "ALTER TABLE `figure` ADD COLUMN IF NOT EXISTS `sharing_level` varchar(16) CHARACTER SET ascii COLLATE ascii_bin NOT NULL DEFAULT 'village'",
  `INSERT IGNORE INTO \`item_sharing\` ${SHARING_COLUMNS} SELECT 'figure', id, community_id, sharing_level, ${PLAIN}, updated_by, 1 FROM figure`,
  `INSERT IGNORE INTO \`item_sharing\` ${SHARING_COLUMNS} SELECT 'story', id, community_id, sharing_level, ${PLAIN}, updated_by, 1 FROM figure`,
  'ALTER TABLE `figure` DROP COLUMN IF EXISTS `sharing_level`',
  'ALTER TABLE `calendar_version` ADD COLUMN IF NOT EXISTS `scheme` int NOT NULL DEFAULT 1',
  'ALTER TABLE `calendar_version` ADD COLUMN IF NOT EXISTS `leaves` json NULL',
  'ALTER TABLE `calendar_version` ADD COLUMN IF NOT EXISTS `withdrawn_traces` int NOT NULL DEFAULT 0',
  'ALTER TABLE `version_entry` ADD COLUMN IF NOT EXISTS `rank` int NULL',
  'ALTER TABLE `version_entry` ADD COLUMN IF NOT EXISTS `stands` tinyint NOT NULL DEFAULT 1',
];

export class Sharing1796600000000 implements MigrationInterface {
  readonly name = 'Sharing1796600000000';

  async up(queryRunner: QueryRunner): Promise<void> {
    for (const statement of STATEMENTS) await queryRunner.query(statement);
  }

  async down(queryRunner: QueryRunner): Promise<void> {
    for (const column of ['stands', 'rank']) {
      await queryRunner.query(`ALTER TABLE \`version_entry\` DROP COLUMN IF EXISTS \`${column}\``);
    }
    for (const column of ['withdrawn_traces', 'leaves', 'scheme']) {
      await queryRunner.query(`ALTER TABLE \`calendar_version\` DROP COLUMN IF EXISTS \`${column}\``);
    }
    await queryRunner.query(
      "ALTER TABLE `figure` ADD COLUMN IF NOT EXISTS `sharing_level` varchar(16) CHARACTER SET ascii COLLATE ascii_bin NOT NULL DEFAULT 'village' AFTER `own_depths`",
    );
    for (const table of ['kept_read', 'item_sharing', 'group_member', 'village_group']) {
      await queryRunner.query(`DROP TABLE IF EXISTS \`${table}\``);
    }
  }
}
