import type { Answer, OwnAnswer } from '#shared/contracts/reviews.js';
import type { AnswerEntity } from '../../db/entities/answer.entity.js';
import type { Evidence } from './answer-evidence.js';

export function toAnswer(
  row: AnswerEntity,
  names: ReadonlyMap<string, string>,
  askingId: string,
  evidence: Evidence,
): Answer {
  return {
    id: row.id,
    entryId: row.entryId,
    entryHash: row.entryHash,
    elderId: row.elderId,
    elderName: names.get(row.elderId) ?? '',
    answer: row.answer,
    note: row.note,
    letStand: row.letStand,
    recordedByName: row.recordedBy === null ? null : (names.get(row.recordedBy) ?? ''),
    witness: row.witness,
    ...evidence,
    answeredAt: row.answeredAt.toISOString(),
    mine: row.elderId === askingId || row.recordedBy === askingId,
  };
}

export function toOwnAnswer(
  { answer, note, letStand }: AnswerEntity,
  { spoken }: Pick<Evidence, 'spoken'>,
): OwnAnswer {
  return { answer, note, letStand, spoken };
}
