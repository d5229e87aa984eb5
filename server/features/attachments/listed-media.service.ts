import type { CalendarFileMedium } from '#shared/contracts/calendar-file.js';
import type { Readable } from 'node:stream';
import { In, type DataSource, type EntityManager } from 'typeorm';
import type { AttachmentPartEntity } from '../../db/entities/attachment-part.entity.js';
import { AttachmentEntity } from '../../db/entities/attachment.entity.js';
import type { Actor } from '../../http/actor.js';
import type { Clock } from '../../http/context.js';
import { recordingsMayBeOpened } from '../../policy/consent-gate.js';
import { consentsById } from '../../policy/consent.repository.js';
import { mayUse } from '../../policy/consents.js';
import { isForVillage, type Shared } from '../../policy/policy.js';
import { sharedById } from '../../policy/sharing.repository.js';
import { viewerOf, villageDay } from '../../policy/viewer.js';
import { sha256Of } from '../../storage/file-hash.js';
import { FileNotStored, type FileStore } from '../../storage/file-store.js';
import { seenAttachments } from './attachment-access.service.js';

/** A voice or a picture that may be listed, with those of its files that hold what was told. */
export interface ListedRow {
  row: AttachmentEntity;
  shared: Shared;
  told: readonly AttachmentPartEntity[];
}

/** One that is listed, with the files under whose checksums it is. */
export interface ListedMedium {
  medium: CalendarFileMedium;
  told: readonly AttachmentPartEntity[];
}

/** One of these files; it is read when it is opened. */
export interface ListedFile {
  sha256: string;
  contentType: string;
  bytes: number;
  open: () => Promise<Readable>;
}

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

  async of(communityId: string, entryIds: readonly string[]): Promise<ListedMedium[]> {
    const media: ListedMedium[] = [];
    for (const { row, shared, told } of await this.rows(this.dataSource.manager, communityId, entryIds)) {
      const { id, kind, title, subjectId } = row;
      const parts = await this.parts(kind, told);
      if (parts === null) continue;
      const medium = { attachmentId: id, entryId: subjectId, kind, title, level: shared.level, parts };
      media.push({ medium, told });
    }
    return media;
  }

  /** Their files, each under the checksum by which it is listed; what is gone from the store is left out. */
  async files(media: readonly ListedMedium[]): Promise<ListedFile[]> {
    const files: ListedFile[] = [];
    for (const { medium, told } of media) {
      for (const { part, sha256, contentType } of medium.parts) {
        const storageKey = told.find((each) => each.part === part)?.storageKey ?? '';
        const facts = await this.store.stat(storageKey);
        if (facts === null) continue;
        files.push({ sha256, contentType, bytes: facts.bytes, open: () => this.store.read(storageKey) });
      }
    }
    return files;
  }

  /** Those that may be listed, oldest first, as far as the tables know: no file is looked at. */
  async rows(manager: EntityManager, communityId: string, entryIds: readonly string[]): Promise<ListedRow[]> {
    const rows = await this.told(manager, communityId, entryIds);
    const ids = rows.map(({ row }) => row.id);
    const today = await villageDay(manager, communityId, this.clock.now());
    const shared = await sharedById(manager, 'attachment', ids);
    const consentsOf = await consentsById(manager, 'attachment', ids);
    const listed: ListedRow[] = [];
    for (const { row, told } of rows) {
      const own = shared.get(row.id);
      if (own === undefined || !isForVillage(own, today)) continue;
      if (!mayUse(consentsOf(row.id), 'feed', null, today)) continue;
      if (!(await recordingsMayBeOpened(manager, today, row))) continue;
      listed.push({ row, shared: own, told });
    }
    return listed;
  }

  /** How many of the entries' voices and pictures a person knows of that may not be listed today. */
  async countStaying(
    actor: Actor,
    entryIds: readonly string[],
    listed: readonly ListedRow[],
  ): Promise<number> {
    const { manager } = this.dataSource;
    const going = new Set(listed.map(({ row }) => row.id));
    const all = await this.told(manager, actor.communityId, entryIds);
    const others = all.flatMap(({ row }) => (going.has(row.id) ? [] : [row]));
    const viewer = await viewerOf(manager, actor, this.clock.now());
    return (await seenAttachments(manager, viewer, others)).length;
  }

  private async told(
    manager: EntityManager,
    communityId: string,
    entryIds: readonly string[],
  ): Promise<Omit<ListedRow, 'shared'>[]> {
    if (entryIds.length === 0) return [];
    const rows = await manager.find(AttachmentEntity, {
      where: { communityId, subjectType: 'entry', subjectId: In([...entryIds]) },
      relations: { parts: true },
      order: { addedAt: 'ASC', parts: { part: 'ASC' } },
    });
    return rows
      .toSorted((a, b) => a.addedAt.getTime() - b.addedAt.getTime() || (a.id < b.id ? -1 : 1))
      .map((row) => ({
        row,
        told: row.parts.filter(({ part }) => row.kind === 'picture' || part > 0),
      }))
      .filter(({ told }) => told.length > 0);
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
