import {
  ATTACHMENTS_PER_SUBJECT_MAX,
  type Attachment,
  type AttachmentInput,
  type AttachmentSubject,
  type PartInput,
} from '#shared/contracts/attachments.js';
import { randomUUID } from 'node:crypto';
import type { DataSource, EntityManager } from 'typeorm';
import { AttachmentEntity } from '../../db/entities/attachment.entity.js';
import { AttachmentPartEntity } from '../../db/entities/attachment-part.entity.js';
import { inTransaction } from '../../db/in-transaction.js';
import type { Actor } from '../../http/actor.js';
import { conflict, notFound } from '../../http/app-error.js';
import type { Clock } from '../../http/context.js';
import { personNames } from '../people/person-names.service.js';
import { mayChange, mayReadAttachment } from './attachment-access.service.js';
import { recordAttachment } from './attachment-audit.js';
import {
  sha256Of,
  type AttachmentFilesService,
  type IncomingFile,
  type KeptFile,
  type KeptPicture,
} from './attachment-files.service.js';
import { maySeeSubject } from './attachment-subjects.repository.js';
import { toAttachment } from './attachments.mapper.js';
import { attachmentsOf, lockAttachment, readable, sentBefore } from './attachments.repository.js';

/** Recordings and pictures: adding, showing, removing. Their bytes go through AttachmentFilesService. */
export class AttachmentsService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
    private readonly files: AttachmentFilesService,
  ) {}

  async list(actor: Actor, subject: AttachmentSubject): Promise<Attachment[]> {
    const { manager } = this.dataSource;
    const rows: AttachmentEntity[] = [];
    for (const row of await attachmentsOf(manager, actor.communityId, subject)) {
      if (await mayReadAttachment(manager, actor, row)) rows.push(row);
    }
    const names = await personNames(
      manager,
      rows.map(({ addedBy }) => addedBy),
    );
    return rows.map((row) => toAttachment(row, actor, names.get(row.addedBy) ?? ''));
  }

  async read(actor: Actor, attachmentId: string): Promise<Attachment> {
    const { manager } = this.dataSource;
    return describe(manager, actor, await readable(manager, actor, attachmentId));
  }

  /** A picture, or a recording that begins with its spoken consent. Sent again, it is the one that is there. */
  async create(actor: Actor, input: AttachmentInput, file: IncomingFile): Promise<Attachment> {
    const { manager } = this.dataSource;
    if (!(await maySeeSubject(manager, actor, input))) throw notFound();
    const before = await sentBefore(manager, actor, input.clientId);
    if (before !== null) return describe(manager, actor, before);
    await this.expectRoom(actor, input);
    const kept = await (input.kind === 'picture' ? this.files.keepPicture(file) : this.files.keepSound(file));
    const isNew = await this.orRemove([kept], () => this.insert(actor, input, kept));
    // Two sendings of the same met: the other one's file is the one that counts.
    if (!isNew) await this.files.remove([kept]);
    const row = await sentBefore(manager, actor, input.clientId);
    if (row === null) throw notFound();
    return describe(manager, actor, row);
  }

  /** The next part of the own recording. A part that is there already with the same content is fine. */
  async addPart(
    actor: Actor,
    attachmentId: string,
    input: PartInput,
    file: IncomingFile,
  ): Promise<Attachment> {
    const { manager } = this.dataSource;
    const row = await readable(manager, actor, attachmentId);
    if (!mayChange(actor, row)) throw conflict('not-yours');
    if (row.kind !== 'recording') throw conflict('part-missing');
    const there = row.parts.find(({ part }) => part === input.part);
    if (there !== undefined) {
      if (there.sha256 !== (await sha256Of(file.path))) throw conflict('part-differs');
      return describe(manager, actor, row);
    }
    if (!row.parts.some(({ part }) => part === input.part - 1)) throw conflict('part-missing');
    const kept = await this.files.keepSound(file);
    const isNew = await this.orRemove([kept], () => this.insertPart(attachmentId, input, kept));
    if (!isNew) await this.files.remove([kept]);
    return this.read(actor, attachmentId);
  }

  /** Rows first, files once that is certain; what a failure in between leaves behind is swept away at the next start. */
  async remove(actor: Actor, attachmentId: string): Promise<void> {
    const row = await readable(this.dataSource.manager, actor, attachmentId);
    if (!mayChange(actor, row)) throw conflict('not-yours');
    const gone = await inTransaction(this.dataSource, async (manager) => {
      await lockAttachment(manager, attachmentId);
      const parts = await manager.findBy(AttachmentPartEntity, { attachmentId });
      await manager.delete(AttachmentEntity, { id: attachmentId });
      await recordAttachment(manager, this.clock, actor, 'attachment-removed', row);
      return parts;
    });
    await this.files.remove(gone);
  }

  private async expectRoom(actor: Actor, subject: AttachmentSubject): Promise<void> {
    const { subjectType, subjectId } = subject;
    const count = await this.dataSource.manager.countBy(AttachmentEntity, {
      communityId: actor.communityId,
      subjectType,
      subjectId,
    });
    if (count >= ATTACHMENTS_PER_SUBJECT_MAX) throw conflict('too-many-attachments');
  }

  /** False where the same sending has come in meanwhile. */
  private async insert(actor: Actor, input: AttachmentInput, kept: KeptFile | KeptPicture): Promise<boolean> {
    const { level, ...fields } = input;
    const id = randomUUID();
    return inTransaction(this.dataSource, async (manager) => {
      if ((await sentBefore(manager, actor, input.clientId)) !== null) return false;
      const row = {
        id,
        communityId: actor.communityId,
        ...fields,
        sharingLevel: level,
        widthPx: 'widthPx' in kept ? kept.widthPx : null,
        heightPx: 'heightPx' in kept ? kept.heightPx : null,
        addedBy: actor.person.id,
        addedAt: this.clock.now(),
      };
      await manager.insert(AttachmentEntity, row);
      const part = input.kind === 'picture' ? 1 : 0;
      await manager.insert(AttachmentPartEntity, partRow(id, part, null, kept));
      await recordAttachment(manager, this.clock, actor, 'attachment-added', row);
      return true;
    });
  }

  private async insertPart(attachmentId: string, input: PartInput, kept: KeptFile): Promise<boolean> {
    const { part, seconds } = input;
    return inTransaction(this.dataSource, async (manager) => {
      await lockAttachment(manager, attachmentId);
      if (await manager.existsBy(AttachmentPartEntity, { attachmentId, part })) return false;
      await manager.insert(AttachmentPartEntity, partRow(attachmentId, part, seconds, kept));
      return true;
    });
  }

  /** What was kept for rows that did not come to be is taken away again. */
  private async orRemove<T>(kept: readonly KeptFile[], work: () => Promise<T>): Promise<T> {
    try {
      return await work();
    } catch (cause) {
      await this.files.remove(kept);
      throw cause;
    }
  }
}

function partRow(attachmentId: string, part: number, seconds: number | null, kept: KeptFile) {
  const { storageKey, thumbnailKey, contentType, bytes, sha256 } = kept;
  return { attachmentId, part, seconds, storageKey, thumbnailKey, contentType, bytes, sha256 };
}

export async function describe(
  manager: EntityManager,
  actor: Actor,
  row: AttachmentEntity,
): Promise<Attachment> {
  const names = await personNames(manager, [row.addedBy]);
  return toAttachment(row, actor, names.get(row.addedBy) ?? '');
}
