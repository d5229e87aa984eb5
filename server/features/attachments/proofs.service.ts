import type { AttachmentInput } from '#shared/contracts/attachments.js';
import { PLAIN_DETAILS } from '#shared/contracts/sharing.js';
import { randomUUID } from 'node:crypto';
import type { EntityManager } from 'typeorm';
import { AttachmentEntity } from '../../db/entities/attachment.entity.js';
import { AttachmentPartEntity } from '../../db/entities/attachment-part.entity.js';
import type { Clock } from '../../http/context.js';
import { insertSharing } from '../../policy/sharing.repository.js';
import type {
  AttachmentFilesService,
  IncomingFile,
  KeptFile,
  KeptPicture,
} from './attachment-files.service.js';

/** What a proof belongs to, and whose it is. Whoever sees that may hear or see the proof. */
export interface ProofOf {
  communityId: string;
  subjectType: Extract<AttachmentInput['subjectType'], 'answer' | 'meeting' | 'consent'>;
  subjectId: string;
  speaker: string;
  giverId: string;
  addedBy: string;
}

export type Attach = (manager: EntityManager, proof: ProofOf) => Promise<string>;

/** A voice or a paper that comes with what it proves, and is kept in the same step or not at all. */
export class ProofsService {
  constructor(
    private readonly files: AttachmentFilesService,
    private readonly clock: Clock,
  ) {}

  /** @param work writes what is proved; it may run twice, and each time its last proof counts. */
  async keepWith<T>(
    kind: AttachmentInput['kind'],
    file: IncomingFile,
    work: (attach: Attach) => Promise<T>,
  ): Promise<T> {
    const kept: KeptFile | KeptPicture = await (kind === 'picture'
      ? this.files.keepPicture(file)
      : this.files.keepSound(file));
    try {
      return await work(async (manager, { giverId, ...proof }) => {
        const id = randomUUID();
        await manager.insert(AttachmentEntity, {
          ...proof,
          id,
          kind,
          clientId: randomUUID(),
          title: '',
          language: null,
          consent: kind === 'picture' ? 'asked' : 'clip',
          ...sizeOf(kept),
          addedAt: this.clock.now(),
        });
        const { storageKey, thumbnailKey, contentType, bytes, sha256 } = kept;
        const fileFacts = { storageKey, thumbnailKey, contentType, bytes, sha256 };
        await manager.insert(AttachmentPartEntity, {
          attachmentId: id,
          part: 1,
          seconds: null,
          ...fileFacts,
        });
        await insertSharing(manager, {
          itemType: 'attachment',
          itemId: id,
          communityId: proof.communityId,
          level: 'village',
          details: PLAIN_DETAILS,
          giverId,
        });
        return id;
      });
    } catch (cause) {
      await this.files.remove([kept]);
      throw cause;
    }
  }
}

function sizeOf(kept: KeptFile | KeptPicture): { widthPx: number | null; heightPx: number | null } {
  return 'widthPx' in kept
    ? { widthPx: kept.widthPx, heightPx: kept.heightPx }
    : { widthPx: null, heightPx: null };
}
