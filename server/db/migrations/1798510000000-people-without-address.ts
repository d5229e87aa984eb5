import type { MigrationInterface, QueryRunner } from 'typeorm';

/** Whoever has no e-mail address belongs to a village all the same; a card signs them in. */
export class PeopleWithoutAddress1798510000000 implements MigrationInterface {
  readonly name = 'PeopleWithoutAddress1798510000000';

  async up(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query('ALTER TABLE `person` MODIFY `email` varchar(190) NULL');
  }

  async down(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query(
      "UPDATE `person` SET `email` = CONCAT(`id`, '@none.invalid') WHERE `email` IS NULL",
    );
    await queryRunner.query('ALTER TABLE `person` MODIFY `email` varchar(190) NOT NULL');
  }
}
