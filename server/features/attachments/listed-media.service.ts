import type { CalendarFileMedium } from '#shared/contracts/calendar-file.js';
import { In, type DataSource } from 'typeorm';
import type { AttachmentPartEntity } from '../../db/entities/attachment-part.entity.js';
import { AttachmentEntity } from '../../db/entities/attachment.entity.js';
import type { Clock } from '../../http/context.js';
import { recordingsMayBeOpened } from '../../policy/consent-gate.js';
import { consentsById } from '../../policy/consent.repository.js';
import { mayUse } from '../../policy/consents.js';
import { isForVillage } from '../../policy/policy.js';
import { sharedById } from '../../policy/sharing.repository.js';
import { villageDay } from '../../policy/viewer.js';
import { sha256Of } from '../../storage/file-hash.js';
import { FileNotStored, type FileStore } from '../../storage/file-store.js';

/**
 * Voices and pictures of entries as a file to take along may list them: open or the village's, agreed to be handed on, and
 * of entries whose recordings may be opened. Nobody is named, and the spoken consent is proof and no part of what was told.
 */
export class ListedMediaService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
    private readonly store: FileStore,
  ) {}

  async of(communityId: string, entryIds: readonly string[]): Promise<CalendarFileMedium[]> {
    if (entryIds.length === 0) return [];
    const { manager } = this.dataSource;
    const today = await villageDay(manager, communityId, this.clock.now());
    const rows = await manager.find(AttachmentEntity, {
      where: { communityId, subjectType: 'entry', subjectId: In([...entryIds]) },
      relations: { parts: true },
      order: { addedAt: 'ASC', id: 'ASC', parts: { part: 'ASC' } },
    });
    const ids = rows.map(({ id }) => id);
    const shared = await sharedById(manager, 'attachment', ids);
    const consentsOf = await consentsById(manager, 'attachment', ids);
    const media: CalendarFileMedium[] = [];
    for (const { id, kind, title, subjectType, subjectId, parts } of rows) {
      const own = shared.get(id);
      const told = parts.filter(({ part }) => kind === 'picture' || part > 0);
      if (own === undefined || told.length === 0 || !isForVillage(own, today)) continue;
      if (!mayUse(consentsOf(id), 'feed', null, today)) continue;
      if (!(await recordingsMayBeOpened(manager, today, { subjectType, subjectId }))) continue;
      const listed = await this.parts(kind, told);
      if (listed === null) continue;
      media.push({ attachmentId: id, entryId: subjectId, kind, title, level: own.level, parts: listed });
    }
    return media;
  }

  /** By the bytes that are handed out: of a picture, which was drawn anew, they are others than came. Null where they are gone. */
  private async parts(
    kind: AttachmentEntity['kind'],
    rows: readonly AttachmentPartEntity[],
  ): Promise<CalendarFileMedium['parts'] | null> {
    try {
      const parts: CalendarFileMedium['parts'] = [];
      for (const { part, contentType, bytes, storageKey, sha256 } of rows) {
        const handedOut = kind === 'picture' ? await sha256Of(await this.store.read(storageKey)) : sha256;
        parts.push({ part, contentType, bytes, sha256: handedOut });
      }
      return parts;
    } catch (cause) {
      if (cause instanceof FileNotStored) return null;
      throw cause;
    }
  }
}
