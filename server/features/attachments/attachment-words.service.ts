import type { Attachment, WordsInput } from '#shared/contracts/attachments.js';
import { randomUUID } from 'node:crypto';
import type { DataSource } from 'typeorm';
import { AttachmentWordsEntity } from '../../db/entities/attachment-words.entity.js';
import { inTransaction } from '../../db/in-transaction.js';
import type { Actor } from '../../http/actor.js';
import { conflict, stale } from '../../http/app-error.js';
import type { Clock } from '../../http/context.js';
import { viewerOf } from '../../policy/viewer.js';
import { mayWriteWords } from './attachment-access.service.js';
import { recordAttachment } from './attachment-audit.js';
import { toWords } from './attachments.mapper.js';
import { lockAttachment, readable } from './attachments.repository.js';
import { describe } from './attachments.service.js';

/** What was said, written out and translated: one text for each language, each with its author. */
export class AttachmentWordsService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
  ) {}

  async save(actor: Actor, attachmentId: string, input: WordsInput): Promise<Attachment> {
    const { version, kind, language, text, checkedBySpeaker } = input;
    return inTransaction(this.dataSource, async (manager) => {
      // Two first writers meet here, before either has read: else both would find nothing to be newer than.
      await lockAttachment(manager, attachmentId);
      const viewer = await viewerOf(manager, actor, this.clock.now());
      const seen = await readable(manager, viewer, attachmentId);
      const { row } = seen;
      if (!mayWriteWords(viewer, seen)) throw conflict('not-yours');
      const before = await manager.findOne(AttachmentWordsEntity, {
        where: { attachmentId, kind, language },
        relations: { author: true },
      });
      if ((before?.version ?? null) !== version) throw stale(before === null ? null : toWords(before), input);
      const changes = { text, checkedBySpeaker, authorId: actor.person.id, updatedAt: this.clock.now() };
      if (before === null) {
        const id = randomUUID();
        await manager.insert(AttachmentWordsEntity, { id, attachmentId, kind, language, ...changes });
      } else {
        await manager.update(AttachmentWordsEntity, { id: before.id, version: before.version }, changes);
      }
      await recordAttachment(manager, this.clock, actor, 'attachment-words-written', row);
      return describe(manager, viewer, await readable(manager, viewer, attachmentId));
    });
  }
}
