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
import { isDuplicate } from '../../db/duplicate.js';
import { inTransaction } from '../../db/in-transaction.js';
import { seesDrafts, type Actor } from '../../http/actor.js';
import { conflict, notFound } from '../../http/app-error.js';
import type { Clock } from '../../http/context.js';
import { sha256OfFile } from '../../storage/file-hash.js';
import { personNames } from '../people/person-names.service.js';
import { insertSharing, sharedById } from '../../policy/sharing.repository.js';
import { viewerOf, type Viewer } from '../../policy/viewer.js';
import { expectKnownPeople } from '../sharing/known-people.service.js';
import type { WithdrawalsService } from '../withdrawals/withdrawals.service.js';
import { mayRemove, type SeenAttachment } from './attachment-access.service.js';
import { recordAttachment } from './attachment-audit.js';
import {
  type AttachmentFilesService,
  type IncomingFile,
  type KeptFile,
  type KeptPicture,
} from './attachment-files.service.js';
import { keepsSubject, maySeeSubject } from './attachment-subjects.repository.js';
import { toAttachment } from './attachments.mapper.js';
import {
  attachmentsOf,
  lockAttachment,
  ownAttachment,
  readable,
  sentBefore,
} from './attachments.repository.js';

/** Recordings and pictures: adding, showing, removing. Their bytes go through AttachmentFilesService. */
export class AttachmentsService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
    private readonly files: AttachmentFilesService,
    private readonly withdrawals: Pick<WithdrawalsService, 'withdraw'>,
  ) {}

  async list(actor: Actor, subject: AttachmentSubject): Promise<Attachment[]> {
    const { manager } = this.dataSource;
    const viewer = await this.viewer(actor);
    const seen = await attachmentsOf(manager, viewer, subject);
    const names = await personNames(
      manager,
      seen.map(({ row }) => row.addedBy),
    );
    return seen.map((each) => toAttachment(each, viewer, names.get(each.row.addedBy) ?? ''));
  }

  async read(actor: Actor, attachmentId: string): Promise<Attachment> {
    const { manager } = this.dataSource;
    const viewer = await this.viewer(actor);
    return describe(manager, viewer, await readable(manager, viewer, attachmentId));
  }

  /** A picture, or a recording that begins with its spoken consent. Sent again, it is the one that is there. */
  async create(actor: Actor, input: AttachmentInput, file: IncomingFile): Promise<Attachment> {
    const { manager } = this.dataSource;
    const viewer = await this.viewer(actor);
    if (!(await maySeeSubject(manager, viewer, input))) throw notFound();
    if (!seesDrafts(viewer) && !(await keepsSubject(manager, viewer, input)))
      throw conflict('not-kept-by-you');
    const before = await sentBefore(manager, actor, input.clientId);
    if (before !== null) return this.describeOwn(actor, before);
    await expectKnownPeople(manager, actor, input.sharing, input.giverId, '');
    await this.expectRoom(actor, input);
    const kept = await (input.kind === 'picture' ? this.files.keepPicture(file) : this.files.keepSound(file));
    const isNew = await this.orRemove([kept], () => this.insert(actor, input, kept));
    // Two sendings of the same have met: the other one's file is the one that counts.
    if (!isNew) await this.files.remove([kept]);
    return this.describeOwn(actor, await sentBefore(manager, actor, input.clientId));
  }

  /**
   * The next part of the own recording. A part that is there already with the same content is fine. Whoever brings what
   * somebody else gives may send it to its end, also where it is not for them to hear.
   */
  async addPart(
    actor: Actor,
    attachmentId: string,
    input: PartInput,
    file: IncomingFile,
  ): Promise<Attachment> {
    const { manager } = this.dataSource;
    const row = await ownAttachment(manager, actor, attachmentId);
    if (row === null) {
      await readable(manager, await this.viewer(actor), attachmentId);
      throw conflict('not-yours');
    }
    if (row.kind !== 'recording') throw conflict('part-missing');
    const there = row.parts.find(({ part }) => part === input.part);
    if (there !== undefined) {
      if (there.sha256 !== (await sha256OfFile(file.path))) throw conflict('part-differs');
      return this.describeOwn(actor, row);
    }
    if (!row.parts.some(({ part }) => part === input.part - 1)) throw conflict('part-missing');
    const kept = await this.files.keepSound(file);
    const isNew = await this.orRemove([kept], () => this.insertPart(attachmentId, input, kept));
    if (!isNew) await this.files.remove([kept]);
    return this.describeOwn(actor, await ownAttachment(manager, actor, attachmentId));
  }

  /** For whoever brought or gave it. It is withdrawn like everything else that is taken back. */
  async remove(actor: Actor, attachmentId: string): Promise<void> {
    const viewer = await this.viewer(actor);
    const seen = await readable(this.dataSource.manager, viewer, attachmentId);
    if (!mayRemove(viewer, seen)) throw conflict('not-yours');
    const withdrawal = { leavesTrace: false, askedById: null };
    await this.withdrawals.withdraw(actor, 'attachment', attachmentId, withdrawal);
  }

  private viewer(actor: Actor): Promise<Viewer> {
    return viewerOf(this.dataSource.manager, actor, this.clock.now());
  }

  /** What somebody has just sent, in their own words, whoever may see it from now on. */
  private async describeOwn(actor: Actor, row: AttachmentEntity | null): Promise<Attachment> {
    const { manager } = this.dataSource;
    const shared = row === null ? undefined : (await sharedById(manager, 'attachment', [row.id])).get(row.id);
    if (row === null || shared === undefined) throw notFound();
    return describe(manager, await this.viewer(actor), { row, shared });
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
    const { sharingLevel, sharing, giverId, ...fields } = input;
    const id = randomUUID();
    const { communityId } = actor;
    const write = async (manager: EntityManager) => {
      const row = {
        id,
        communityId,
        ...fields,
        widthPx: 'widthPx' in kept ? kept.widthPx : null,
        heightPx: 'heightPx' in kept ? kept.heightPx : null,
        addedBy: actor.person.id,
        typedBy: actor.helper?.id ?? null,
        addedAt: this.clock.now(),
      };
      await manager.insert(AttachmentEntity, row);
      const part = input.kind === 'picture' ? 1 : 0;
      await manager.insert(AttachmentPartEntity, partRow(id, part, null, kept));
      await insertSharing(manager, {
        itemType: 'attachment',
        itemId: id,
        communityId,
        level: sharingLevel,
        details: sharing,
        giverId: giverId ?? actor.person.id,
      });
      await recordAttachment(manager, this.clock, actor, 'attachment-added', row);
    };
    try {
      await inTransaction(this.dataSource, write);
      return true;
    } catch (cause) {
      if (isDuplicate(cause)) return false;
      throw cause;
    }
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
  viewer: Viewer,
  seen: SeenAttachment,
): Promise<Attachment> {
  const { addedBy } = seen.row;
  const names = await personNames(manager, [addedBy]);
  return toAttachment(seen, viewer, names.get(addedBy) ?? '');
}
