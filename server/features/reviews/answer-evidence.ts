import type { Answer } from '#shared/contracts/reviews.js';
import { In, type EntityManager } from 'typeorm';
import type { AnswerEntity } from '../../db/entities/answer.entity.js';
import { AttachmentEntity } from '../../db/entities/attachment.entity.js';
import { MeetingEntity } from '../../db/entities/meeting.entity.js';
import type { Viewer } from '../../policy/viewer.js';
import { seenAttachments } from '../attachments/attachment-access.service.js';

/** What stands behind an answer, as far as the reader may hear or see it. */
export type Evidence = Pick<Answer, 'proof' | 'spoken'>;

/** What was spoken to answers, and what proves those that another hand wrote. */
export async function evidenceOf(
  manager: EntityManager,
  viewer: Viewer,
  rows: readonly AnswerEntity[],
): Promise<(row: AnswerEntity) => Evidence> {
  const ofPaper = (row: AnswerEntity) => row.proof === 'paper';
  const voiceIds = rows.flatMap(({ recordingId, proof, proofId }) => [
    ...(recordingId === null ? [] : [recordingId]),
    ...(proof === 'voice' && proofId !== null ? [proofId] : []),
  ]);
  const meetingIds = [...new Set(rows.filter(ofPaper).flatMap(({ proofId }) => proofId ?? []))];
  const { communityId } = viewer;
  const where = [
    ...(voiceIds.length === 0 ? [] : [{ communityId, id: In(voiceIds) }]),
    ...(meetingIds.length === 0
      ? []
      : [{ communityId, subjectType: 'meeting' as const, subjectId: In(meetingIds) }]),
  ];
  const there =
    where.length === 0
      ? []
      : await manager.find(AttachmentEntity, {
          where,
          relations: { parts: true, words: { author: true } },
          order: { addedAt: 'ASC', id: 'ASC' },
        });
  const seen = new Set((await seenAttachments(manager, viewer, there)).map(({ row }) => row.id));
  const isThere = new Set(there.map(({ id }) => id));
  const meetings = meetingIds.length === 0 ? [] : await manager.findBy(MeetingEntity, { id: In(meetingIds) });
  const open = (id: string | null) => (id !== null && seen.has(id) ? id : null);

  return ({ recordingId, proof, proofId }) => {
    const paper = there.find(({ subjectId, id }) => subjectId === proofId && seen.has(id));
    return {
      spoken:
        recordingId === null
          ? null
          : {
              state: stateOf(isThere.has(recordingId), seen.has(recordingId)),
              attachmentId: open(recordingId),
            },
      proof:
        proof === null
          ? null
          : {
              kind: proof,
              attachmentId: proof === 'paper' ? (paper?.id ?? null) : open(proofId),
              on: meetings.find(({ id }) => id === proofId)?.heldOn ?? null,
            },
    };
  };
}

function stateOf(isThere: boolean, isSeen: boolean): NonNullable<Answer['spoken']>['state'] {
  if (!isThere) return 'taken-away';
  return isSeen ? 'kept' : 'kept-apart';
}
