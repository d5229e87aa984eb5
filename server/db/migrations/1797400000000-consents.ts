import type { MigrationInterface, QueryRunner } from 'typeorm';

/** What people agreed to, and until when a thing is shown because of it. */
const STATEMENTS = [
  'CREATE TABLE IF NOT EXISTS `consent` (`id` uuid NOT NULL, `community_id` uuid NOT NULL, `item_type` varchar(16) CHARACTER SET ascii COLLATE ascii_bin NOT NULL, `item_id` uuid NOT NULL, `giver_id` uuid NULL, `state` varchar(24) CHARACTER SET ascii COLLATE ascii_bin NOT NULL, `uses` json NOT NULL, `until` date NULL, `review_by` date NOT NULL, `details` json NOT NULL, `recorded_by` uuid NOT NULL, `recorded_at` datetime(6) NOT NULL, `version` int NOT NULL, INDEX `consent_item` (`item_type`, `item_id`), INDEX `consent_community` (`community_id`), INDEX `consent_giver` (`giver_id`), PRIMARY KEY (`id`)) ENGINE=InnoDB',
  'ALTER TABLE `consent` ADD CONSTRAINT `fk_consent_community` FOREIGN KEY IF NOT EXISTS (`community_id`) REFERENCES `community`(`id`) ON DELETE CASCADE ON UPDATE NO ACTION',
  'ALTER TABLE `item_sharing` ADD COLUMN IF NOT EXISTS `shown_until` date NULL',
];

export class Consents1797400000000 implements MigrationInterface {
  readonly name = 'Consents1797400000000';

  async up(queryRunner: QueryRunner): Promise<void> {
    for (const statement of STATEMENTS) await queryRunner.query(statement);
  }

  async down(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query('ALTER TABLE `item_sharing` DROP COLUMN IF EXISTS `shown_until`');
    await queryRunner.query('DROP TABLE IF EXISTS `consent`');
  }
}
