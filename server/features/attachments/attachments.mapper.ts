import type { Attachment, AttachmentWords } from '#shared/contracts/attachments.js';
import type { AttachmentEntity } from '../../db/entities/attachment.entity.js';
import type { AttachmentWordsEntity } from '../../db/entities/attachment-words.entity.js';
import type { Actor } from '../../http/actor.js';
import { mayChange, mayHearConsent, mayWriteWords } from './attachment-access.service.js';

export function toAttachment(row: AttachmentEntity, actor: Actor, addedByName: string): Attachment {
  const { widthPx, heightPx } = row;
  return {
    id: row.id,
    communityId: row.communityId,
    clientId: row.clientId,
    kind: row.kind,
    subjectType: row.subjectType,
    subjectId: row.subjectId,
    title: row.title,
    speaker: row.speaker,
    language: row.language,
    consent: row.consent,
    level: row.sharingLevel,
    addedBy: addedByName,
    addedAt: row.addedAt.toISOString(),
    parts: row.parts
      .filter(({ part }) => part > 0 || mayHearConsent(actor, row))
      .sort((a, b) => a.part - b.part)
      .map(({ part, contentType, bytes, seconds }) => ({ part, contentType, bytes, seconds })),
    picture: widthPx === null || heightPx === null ? null : { widthPx, heightPx },
    words: row.words.sort((a, b) => wordsOrder(a).localeCompare(wordsOrder(b))).map(toWords),
    may: { writeWords: mayWriteWords(actor), remove: mayChange(actor, row) },
  };
}

export function toWords(row: AttachmentWordsEntity): AttachmentWords {
  return {
    kind: row.kind,
    language: row.language,
    text: row.text,
    authorName: row.author.displayName,
    checkedBySpeaker: row.checkedBySpeaker,
    updatedAt: row.updatedAt.toISOString(),
    version: row.version,
  };
}

/** What was said before its translations. */
function wordsOrder({ kind, language }: AttachmentWordsEntity): string {
  return `${kind === 'words' ? 0 : 1} ${language}`;
}
