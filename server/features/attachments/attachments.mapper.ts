import type { Attachment, AttachmentWords } from '#shared/contracts/attachments.js';
import type { AttachmentWordsEntity } from '../../db/entities/attachment-words.entity.js';
import { hidesGiver } from '../../policy/giver-naming.js';
import type { Viewer } from '../../policy/viewer.js';
import {
  hasWordsAlone,
  mayHearConsent,
  mayRemove,
  mayWriteWords,
  type SeenAttachment,
} from './attachment-access.service.js';

export function toAttachment(seen: SeenAttachment, viewer: Viewer, addedByName: string): Attachment {
  const { row, shared } = seen;
  const { widthPx, heightPx } = row;
  const { naming } = shared.details;
  // Whoever gave it may have brought it, and written it out, too.
  const isHidden = hidesGiver(viewer, shared);
  const nameOf = (id: string, name: string) => (isHidden && id === shared.giverId ? '' : name);
  return {
    id: row.id,
    communityId: row.communityId,
    clientId: row.clientId,
    kind: row.kind,
    subjectType: row.subjectType,
    subjectId: row.subjectId,
    title: row.title,
    speaker: isHidden ? '' : row.speaker,
    naming,
    language: row.language,
    consent: row.consent,
    sharingLevel: shared.level,
    addedBy: nameOf(row.addedBy, addedByName),
    addedAt: row.addedAt.toISOString(),
    hasWordsAlone: hasWordsAlone(row),
    parts: row.parts
      .filter(({ part }) => part > 0 || mayHearConsent(viewer, seen))
      .sort((a, b) => a.part - b.part)
      .map(({ part, contentType, bytes, seconds }) => ({ part, contentType, bytes, seconds })),
    picture: widthPx === null || heightPx === null ? null : { widthPx, heightPx },
    words: row.words
      .sort((a, b) => wordsOrder(a).localeCompare(wordsOrder(b)))
      .map((words) => ({ ...toWords(words), authorName: nameOf(words.authorId, words.author.displayName) })),
    may: { writeWords: mayWriteWords(viewer, seen), remove: mayRemove(viewer, seen) },
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
