import type { Readable } from 'node:stream';
import type { DataSource, EntityManager } from 'typeorm';
import type { AttachmentEntity } from '../../db/entities/attachment.entity.js';
import type { Actor } from '../../http/actor.js';
import { notFound } from '../../http/app-error.js';
import type { Clock } from '../../http/context.js';
import { endingOf } from '../../media/file-endings.js';
import { recordingsMayBeOpened } from '../../policy/consent-gate.js';
import { FileNotStored, type ByteRange, type FileStore } from '../../storage/file-store.js';
import { viewerOf, type Viewer } from '../../policy/viewer.js';
import { recordKeptReads } from '../audit/kept-reads.service.js';
import { mayHearConsent } from './attachment-access.service.js';
import { readable } from './attachments.repository.js';

/** A kept file that somebody may have. */
interface OpenedFile {
  bytes: number;
  contentType: string;
  fileName: string;
  tag: string;
  open: (range?: ByteRange) => Promise<Readable>;
}

/** Hands out the bytes, to whom they are for. */
export class AttachmentReadingService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
    private readonly store: FileStore,
  ) {}

  /** @param fromBeginning false where a player asks for more of what it has begun: that is not written down again */
  async part(
    actor: Actor,
    attachmentId: string,
    number: number,
    fromBeginning: boolean,
  ): Promise<OpenedFile> {
    const { manager } = this.dataSource;
    const viewer = await viewerOf(manager, actor, this.clock.now());
    const seen = await readable(manager, viewer, attachmentId);
    const { row } = seen;
    const part = row.parts.find((each) => each.part === number);
    if (part === undefined || (number === 0 && !mayHearConsent(viewer, seen))) throw notFound();
    // The spoken consent is proof of what was said, so it does not wait for what was said.
    if (number > 0) await expectMayBeOpened(manager, viewer, row);
    if (fromBeginning) {
      await recordKeptReads(manager, viewer, this.clock.now(), 'attachment', [attachmentId]);
    }
    const { storageKey, bytes, contentType, sha256 } = part;
    const fileName = `${row.title || row.kind}-${number}.${endingOf(contentType)}`;
    return { bytes, contentType, fileName, tag: sha256, open: (range) => this.open(storageKey, range) };
  }

  async thumbnail(actor: Actor, attachmentId: string): Promise<OpenedFile> {
    const { manager } = this.dataSource;
    const viewer = await viewerOf(manager, actor, this.clock.now());
    const { row } = await readable(manager, viewer, attachmentId);
    await expectMayBeOpened(manager, viewer, row);
    const part = row.parts.find(({ thumbnailKey }) => thumbnailKey !== null);
    const key = part?.thumbnailKey ?? null;
    const facts = key === null ? null : await this.store.stat(key);
    if (part === undefined || key === null || facts === null) throw notFound();
    return {
      bytes: facts.bytes,
      contentType: 'image/jpeg',
      fileName: `${row.title || row.kind}-small.jpg`,
      tag: `${part.sha256}-small`,
      open: (range) => this.open(key, range),
    };
  }

  private async open(key: string, range?: ByteRange): Promise<Readable> {
    try {
      return await this.store.read(key, range);
    } catch (cause) {
      throw cause instanceof FileNotStored ? notFound() : cause;
    }
  }
}

/** Where the giver shares only what was said, the voice or the picture itself is there for its sender alone. */
async function expectMayBeOpened(
  manager: EntityManager,
  viewer: Viewer,
  row: AttachmentEntity,
): Promise<void> {
  if (row.addedBy === viewer.personId) return;
  if (!(await recordingsMayBeOpened(manager, viewer.today, row))) throw notFound();
}
