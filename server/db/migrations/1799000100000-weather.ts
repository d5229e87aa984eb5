import type { MigrationInterface, QueryRunner } from 'typeorm';

/** Notices of the weather service, and the rain that a village wrote down. */
const STATEMENTS = [
  `CREATE TABLE IF NOT EXISTS \`weather_notice\` (\`id\` uuid NOT NULL, \`community_id\` uuid NOT NULL, \`text\` text NOT NULL, \`issuer\` varchar(120) NOT NULL, \`issued_on\` date NOT NULL, \`expires_on\` date NOT NULL, \`written_by\` uuid NOT NULL, \`written_at\` datetime(6) NOT NULL, INDEX \`weather_notice_community\` (\`community_id\`), PRIMARY KEY (\`id\`)) ENGINE=InnoDB`,
  `CREATE TABLE IF NOT EXISTS \`rain_day\` (\`id\` uuid NOT NULL, \`community_id\` uuid NOT NULL, \`day\` date NOT NULL, \`mm\` double NULL, \`words\` varchar(120) NOT NULL, \`written_by\` uuid NOT NULL, \`written_at\` datetime(6) NOT NULL, INDEX \`rain_day_community\` (\`community_id\`, \`day\`), PRIMARY KEY (\`id\`)) ENGINE=InnoDB`,
  `ALTER TABLE \`weather_notice\` ADD CONSTRAINT \`fk_weather_notice_community\` FOREIGN KEY IF NOT EXISTS (\`community_id\`) REFERENCES \`community\`(\`id\`) ON DELETE CASCADE ON UPDATE NO ACTION`,
  `ALTER TABLE \`rain_day\` ADD CONSTRAINT \`fk_rain_day_community\` FOREIGN KEY IF NOT EXISTS (\`community_id\`) REFERENCES \`community\`(\`id\`) ON DELETE CASCADE ON UPDATE NO ACTION`,
];

export class Weather1799000100000 implements MigrationInterface {
  readonly name = 'Weather1799000100000';

  async up(queryRunner: QueryRunner): Promise<void> {
    for (const statement of STATEMENTS) await queryRunner.query(statement);
  }

  async down(queryRunner: QueryRunner): Promise<void> {
    await queryRunner.query('DROP TABLE IF EXISTS `rain_day`');
    await queryRunner.query('DROP TABLE IF EXISTS `weather_notice`');
  }
}
