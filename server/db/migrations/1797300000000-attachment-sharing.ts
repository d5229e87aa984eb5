import type { MigrationInterface, QueryRunner } from 'typeorm';

/** How an attachment is shared stands in `item_sharing`, as for everything else. */
export class AttachmentSharing1797300000000 implements MigrationInterface {
  readonly name = 'AttachmentSharing1797300000000';

  async up(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query('ALTER TABLE `attachment` DROP COLUMN IF EXISTS `sharing_level`');
  }

  async down(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query(
      "ALTER TABLE `attachment` ADD COLUMN IF NOT EXISTS `sharing_level` varchar(16) CHARACTER SET ascii COLLATE ascii_bin NOT NULL DEFAULT 'elders'",
    );
  }
}
