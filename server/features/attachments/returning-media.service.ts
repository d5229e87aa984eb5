import { randomUUID } from 'node:crypto';
import type { DataSource, EntityManager } from 'typeorm';
import { AttachmentPartEntity } from '../../db/entities/attachment-part.entity.js';
import { AttachmentWordsEntity } from '../../db/entities/attachment-words.entity.js';
import { AttachmentEntity } from '../../db/entities/attachment.entity.js';
import { RolledItemEntity } from '../../db/entities/rolled-item.entity.js';
import type { Actor } from '../../http/actor.js';
import type { Clock } from '../../http/context.js';
import { copySharing } from '../../policy/sharing.repository.js';
import { FileNotStored } from '../../storage/file-store.js';
import { recordAttachment } from './attachment-audit.js';
import type { AttachmentFilesService, KeptFile } from './attachment-files.service.js';

/** A voice or a picture whose files are kept a second time, before any row knows of them. */
export interface KeptMedium {
  attachmentId: string;
  parts: readonly { part: number; file: KeptFile }[];
}

/** Where a voice or a picture comes to stand. */
interface Standing {
  calendarId: string;
  entryId: string;
  /** Under which id. */
  id: string;
}

/**
 * Voices and pictures that come back beside the same entry in another draft. Their bytes come with the file; whose they are, who
 * speaks, who may hear them, what was agreed and what was written out is what stands here today.
 */
export class ReturningMediaService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
    private readonly files: AttachmentFilesService,
  ) {}

  /** The spoken agreement is in no file: it is copied here. Null where a recording has lost it. */
  async keepClip(attachmentId: string): Promise<KeptFile | null> {
    const clip = await this.dataSource.manager.findOneBy(AttachmentPartEntity, { attachmentId, part: 0 });
    try {
      return clip && (await this.files.keepCopy(clip));
    } catch (cause) {
      if (cause instanceof FileNotStored) return null;
      throw cause;
    }
  }

  remove(kept: readonly KeptMedium[]): Promise<void> {
    return this.files.remove(kept.flatMap(({ parts }) => parts.map(({ file }) => file)));
  }

  /** @returns false where it was taken back since its files were looked at */
  async attach(
    manager: EntityManager,
    actor: Actor,
    { attachmentId, parts }: KeptMedium,
    { calendarId, entryId, id }: Standing,
  ): Promise<boolean> {
    const original = await manager.findOne(AttachmentEntity, {
      where: { id: attachmentId, communityId: actor.communityId },
      relations: { parts: true, words: true },
      lock: { mode: 'pessimistic_write' },
    });
    if (original === null) return false;
    const { parts: before, words, community: _community, ...row } = original;
    await manager.insert(AttachmentEntity, { ...row, id, clientId: randomUUID(), subjectId: entryId });
    for (const { part, file } of parts) {
      const seconds = before.find((each) => each.part === part)?.seconds ?? null;
      const { storageKey, thumbnailKey, contentType, bytes, sha256 } = file;
      await manager.insert(AttachmentPartEntity, {
        ...{ attachmentId: id, part, seconds, storageKey, thumbnailKey, contentType, bytes, sha256 },
      });
    }
    for (const { kind, language, text, authorId, checkedBySpeaker, updatedAt } of words) {
      await manager.insert(AttachmentWordsEntity, {
        ...{
          id: randomUUID(),
          attachmentId: id,
          kind,
          language,
          text,
          authorId,
          checkedBySpeaker,
          updatedAt,
        },
      });
    }
    await copySharing(manager, 'attachment', attachmentId, id);
    await manager.insert(RolledItemEntity, {
      ...{ itemId: id, itemType: 'attachment', fromId: attachmentId, calendarId, before: null },
    });
    await recordAttachment(manager, this.clock, actor, 'attachment-added', { id, kind: row.kind });
    return true;
  }
}
