import type { MigrationInterface, QueryRunner } from 'typeorm';

/** That somebody of a village died: what they chose for afterwards is done. */
const STATEMENTS = [
  `CREATE TABLE IF NOT EXISTS \`death\` (\`person_id\` uuid NOT NULL, \`community_id\` uuid NOT NULL, \`died_on\` date NOT NULL, \`noted_by\` uuid NOT NULL, \`noted_at\` datetime(6) NOT NULL, \`done\` json NOT NULL, \`removed\` int NOT NULL DEFAULT 0, PRIMARY KEY (\`person_id\`, \`community_id\`)) ENGINE=InnoDB`,
  `ALTER TABLE \`death\` ADD CONSTRAINT \`fk_death_community\` FOREIGN KEY IF NOT EXISTS (\`community_id\`) REFERENCES \`community\`(\`id\`) ON DELETE CASCADE ON UPDATE NO ACTION`,
];

export class Deaths1798410000000 implements MigrationInterface {
  readonly name = 'Deaths1798410000000';

  async up(queryRunner: QueryRunner): Promise<void> {
    for (const statement of STATEMENTS) await queryRunner.query(statement);
  }

  async down(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query('DROP TABLE IF EXISTS `death`');
  }
}
