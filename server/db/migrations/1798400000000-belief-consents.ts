import type { MigrationInterface, QueryRunner } from 'typeorm';

/**
 * Before there was a register of consents, the yes of a belief's giver to print was a tick in the entry. It becomes a
 * record like every other, which is due to be asked for again at once: nobody knows how it was asked.
 */
const STATEMENTS = [
  `INSERT INTO \`consent\` (\`id\`, \`community_id\`, \`item_type\`, \`item_id\`, \`giver_id\`, \`state\`, \`uses\`, \`until\`, \`review_by\`, \`details\`, \`recorded_by\`, \`recorded_at\`, \`version\`)
   SELECT UUID(), c.\`community_id\`, 'entry', e.\`id\`,
     JSON_VALUE(e.\`content\`, '$.giverId'), 'given', JSON_ARRAY('keep', 'show', 'print', 'recording'), NULL, UTC_DATE(),
     JSON_OBJECT(
       'givenAs', 'person',
       'giverName', COALESCE(JSON_VALUE(e.\`content\`, '$.giver'), ''),
       'spokeFor', '',
       'askedOn', DATE_FORMAT(LEAST(DATE(e.\`updated_at\`), UTC_DATE()), '%Y-%m-%d'),
       'askedWhere', '',
       'language', NULL,
       'askedHow', JSON_ARRAY(),
       'explainedBy', '',
       'explanation', 'before there was a register',
       'proof', NULL,
       'naming', COALESCE(JSON_VALUE(s.\`details\`, '$.naming'), 'not-named'),
       'conditions', '',
       'benefits', '',
       'afterDeath', NULL,
       'passTo', '',
       'mayWithdraw', JSON_ARRAY(),
       'level', s.\`level\`),
     e.\`updated_by\`, UTC_TIMESTAMP(6), 1
   FROM \`entry\` e
   JOIN \`calendar\` c ON c.\`id\` = e.\`calendar_id\`
   JOIN \`item_sharing\` s ON s.\`item_type\` = 'entry' AND s.\`item_id\` = e.\`id\` AND s.\`state\` <> 'withdrawn'
   WHERE JSON_VALUE(e.\`content\`, '$.kind') = 'belief'
     AND JSON_VALUE(e.\`content\`, '$.agreedToPrint') IN ('1', 'true')
     AND NOT EXISTS (SELECT 1 FROM \`consent\` o WHERE o.\`item_type\` = 'entry' AND o.\`item_id\` = e.\`id\`)`,
];

export class BeliefConsents1798400000000 implements MigrationInterface {
  readonly name = 'BeliefConsents1798400000000';

  async up(queryRunner: QueryRunner): Promise<void> {
    for (const statement of STATEMENTS) await queryRunner.query(statement);
  }

  /** What was written down stays: a tick says less than a record, and nothing else reads it. */
  async down(): Promise<void> {
    return Promise.resolve();
  }
}
