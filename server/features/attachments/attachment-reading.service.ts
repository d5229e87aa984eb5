import type { Readable } from 'node:stream';
import type { DataSource } from 'typeorm';
import type { AttachmentEntity } from '../../db/entities/attachment.entity.js';
import type { Actor } from '../../http/actor.js';
import { notFound } from '../../http/app-error.js';
import type { Clock } from '../../http/context.js';
import { recordingsMayBeOpened } from '../../policy/consent-gate.js';
import { villageDay } from '../../policy/viewer.js';
import { FileNotStored, type ByteRange, type FileStore } from '../../storage/file-store.js';
import { mayHearConsent } from './attachment-access.service.js';
import { recordAttachment } from './attachment-audit.js';
import { readable } from './attachments.repository.js';

const ENDINGS: Readonly<Record<string, string>> = {
  'image/jpeg': 'jpg',
  'audio/webm': 'webm',
  'audio/mp4': 'm4a',
  'audio/ogg': 'ogg',
};

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
    const row = await readable(this.dataSource.manager, actor, attachmentId);
    const part = row.parts.find((each) => each.part === number);
    if (part === undefined || (number === 0 && !mayHearConsent(actor, row))) throw notFound();
    // The spoken consent is proof of what was said, so it does not wait for what was said.
    if (number > 0) await this.expectMayBeOpened(actor, row);
    if (fromBeginning) await this.writeDown(actor, row);
    const { storageKey, bytes, contentType, sha256 } = part;
    const fileName = `${row.title || row.kind}-${number}.${ENDINGS[contentType] ?? 'bin'}`;
    return { bytes, contentType, fileName, tag: sha256, open: (range) => this.open(storageKey, range) };
  }

  async thumbnail(actor: Actor, attachmentId: string): Promise<OpenedFile> {
    const row = await readable(this.dataSource.manager, actor, attachmentId);
    await this.expectMayBeOpened(actor, row);
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

  /** Where the giver shares only what was said, the voice or the picture itself is there for its sender alone. */
  private async expectMayBeOpened(actor: Actor, row: AttachmentEntity): Promise<void> {
    const { manager } = this.dataSource;
    if (row.addedBy === actor.person.id) return;
    const today = await villageDay(manager, row.communityId, this.clock.now());
    if (!(await recordingsMayBeOpened(manager, today, row))) throw notFound();
  }

  private async open(key: string, range?: ByteRange): Promise<Readable> {
    try {
      return await this.store.read(key, range);
    } catch (cause) {
      throw cause instanceof FileNotStored ? notFound() : cause;
    }
  }

  /** Who opened what is not for the whole village is written down; one's own is nobody's business. */
  private async writeDown(actor: Actor, row: AttachmentEntity): Promise<void> {
    if (row.sharingLevel === 'village' || row.addedBy === actor.person.id) return;
    await recordAttachment(this.dataSource.manager, this.clock, actor, 'attachment-opened', row);
  }
}
