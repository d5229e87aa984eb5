import type { AuditAction } from '#shared/contracts/audit.js';
import type { AnswerWord } from '#shared/contracts/reviews.js';
import { randomUUID } from 'node:crypto';
import type { EntityManager } from 'typeorm';
import { AnswerEntity } from '../../db/entities/answer.entity.js';
import { AttachmentEntity } from '../../db/entities/attachment.entity.js';
import type { CalendarVersionEntity } from '../../db/entities/calendar-version.entity.js';
import { SignatureEntity } from '../../db/entities/signature.entity.js';
import type { VersionEntryEntity } from '../../db/entities/version-entry.entity.js';
import type { Actor } from '../../http/actor.js';
import { conflict, invalidField } from '../../http/app-error.js';
import { sharedById } from '../../policy/sharing.repository.js';
import { recordAudit } from '../audit/audit.service.js';
import { answersHashOf } from '../versions/answers-across-words.service.js';
import type { Hand } from './answer-hand.js';
import { elderIdsOf } from './reviews.repository.js';

/** Where an answer belongs. */
export interface Asked {
  manager: EntityManager;
  version: CalendarVersionEntity;
  entry: VersionEntryEntity;
}

export interface Word {
  answer: AnswerWord;
  note: string;
  recordingId?: string | null | undefined;
}

/**
 * Writes an answer down. What an elder said with their own hand is not written over by somebody else's, and nothing
 * changes once they have signed.
 * @param proofFor keeps what proves another hand's writing, with the answer's id; null where nothing comes with it
 */
export async function writeAnswer(
  asked: Asked,
  actor: Actor,
  now: Date,
  hand: Hand,
  word: Word,
  proofFor: ((answerId: string) => Promise<string>) | null = null,
): Promise<AnswerEntity> {
  const { manager, entry, version } = asked;
  const { elderId, recordedBy } = hand;
  const isOtherHand = recordedBy !== null;
  if (isOtherHand && !(await elderIdsOf(manager, actor.communityId)).includes(elderId)) {
    throw conflict('not-an-elder');
  }
  await expectUnsigned(asked, elderId, isOtherHand ? 'elder-has-signed' : 'already-signed');
  const before = await findAnswer(asked, elderId);
  if (isOtherHand) expectNotOwn(before);
  const recordingId = word.recordingId ?? null;
  if (recordingId !== null) await expectSpoken(asked, actor.communityId, elderId, recordingId);
  const id = before?.id ?? randomUUID();
  const row = manager.create(AnswerEntity, {
    id,
    calendarId: version.calendarId,
    entryId: entry.entryId,
    entryHash: answersHashOf(entry),
    elderId,
    answer: word.answer,
    note: word.note,
    letStand: false,
    ofItsPeople: false,
    recordedBy,
    witness: hand.witness,
    recordingId,
    proof: hand.proof,
    proofId: proofFor === null ? null : await proofFor(id),
    answeredAt: now,
  });
  await manager.save(AnswerEntity, row, { reload: false });
  await recordAnswer(
    asked,
    actor,
    now,
    isOtherHand ? 'answered-on-behalf' : 'answered',
    isOtherHand ? { answer: word.answer, elderId, proof: hand.proof } : { answer: word.answer },
    isOtherHand ? elderId : null,
  );
  return row;
}

export function expectNotOwn(before: AnswerEntity | null): void {
  if (before?.recordedBy === null) throw conflict('own-answer-stands');
}

/** Only what this person gave about this very entry, whole and not taken back, speaks for them. */
export async function expectSpoken(
  { manager, entry }: Pick<Asked, 'manager'> & { entry: { entryId: string } },
  communityId: string,
  elderId: string,
  recordingId: string,
): Promise<void> {
  const row = await manager.findOne(AttachmentEntity, {
    where: {
      id: recordingId,
      communityId,
      kind: 'recording',
      subjectType: 'entry',
      subjectId: entry.entryId,
    },
    relations: { parts: true },
  });
  const shared = (await sharedById(manager, 'attachment', [recordingId])).get(recordingId);
  const isWhole = row?.parts.some(({ part }) => part > 0) === true;
  if (!isWhole || shared?.state !== 'shared' || shared.giverId !== elderId) {
    throw invalidField('recordingId', 'not-your-recording');
  }
}

/** A signature says that its elder's answers are given; they stay as they were when it was given. */
export async function expectUnsigned(
  { manager, version }: Asked,
  elderId: string,
  reason: 'already-signed' | 'elder-has-signed',
): Promise<void> {
  const signature = { versionId: version.id, personId: elderId, role: 'elder' as const };
  if (await manager.existsBy(SignatureEntity, signature)) throw conflict(reason);
}

export async function findAnswer({ manager, entry }: Asked, elderId: string): Promise<AnswerEntity | null> {
  return manager.findOneBy(AnswerEntity, {
    entryId: entry.entryId,
    entryHash: answersHashOf(entry),
    elderId,
  });
}

export async function recordAnswer(
  { manager, version, entry }: Asked,
  actor: Actor,
  now: Date,
  action: AuditAction,
  details: Record<string, unknown>,
  onBehalfOf: string | null = null,
): Promise<void> {
  await recordAudit(manager, {
    at: now,
    communityId: actor.communityId,
    actorId: actor.helper?.id ?? actor.person.id,
    onBehalfOf,
    action,
    subjectType: 'entry',
    subjectId: entry.entryId,
    details: { calendarId: version.calendarId, number: version.number, ...details },
  });
}
