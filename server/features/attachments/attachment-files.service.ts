import { randomBytes } from 'node:crypto';
import { createReadStream } from 'node:fs';
import { stat } from 'node:fs/promises';
import { Readable } from 'node:stream';
import { PICTURE_MAX_BYTES, type AttachmentKind } from '#shared/contracts/attachments.js';
import { AppError, conflict, invalidField } from '../../http/app-error.js';
import { sha256OfFile } from '../../storage/file-hash.js';
import { drawAnew } from '../../media/picture-file.js';
import { soundTypeOf } from '../../media/sound-file.js';
import type { FileScan } from '../../storage/file-scan.js';
import type { FileStore } from '../../storage/file-store.js';

/** A file that has come and is still to be looked at. */
export interface IncomingFile {
  path: string;
  bytes: number;
}

/** What was kept, as a part's row holds it. */
export interface KeptFile {
  storageKey: string;
  thumbnailKey: string | null;
  contentType: string;
  bytes: number;
  sha256: string;
}

/** A file as it was found to be; it still lies where it was looked at. */
export interface LookedFile {
  path: string;
  contentType: string;
  thumbnail: Buffer | null;
}

export interface KeptPicture extends KeptFile {
  widthPx: number;
  heightPx: number;
}

/** Looks at files that have come and keeps what may be kept. The only one that puts anything into the store. */
export class AttachmentFilesService {
  constructor(
    private readonly store: FileStore,
    /** Null where no virus scanner is set. */
    private readonly scan: FileScan | null,
  ) {}

  /** Keeps the recording as it came. */
  async keepSound({ path, bytes }: IncomingFile): Promise<KeptFile> {
    await this.expectClean(path);
    const contentType = await soundTypeOf(path);
    if (contentType === null) throw invalidField('file', 'not-a-recording');
    const storageKey = await this.put(createReadStream(path));
    return { storageKey, thumbnailKey: null, contentType, bytes, sha256: await sha256OfFile(path) };
  }

  /** Keeps the picture drawn anew, and a small one; the file that came is thrown away. */
  async keepPicture({ path, bytes }: IncomingFile): Promise<KeptPicture> {
    if (bytes > PICTURE_MAX_BYTES) throw new AppError('too-large', { reason: 'file-too-large' });
    await this.expectClean(path);
    const drawn = await drawAnew(path);
    if (drawn === null) throw invalidField('file', 'not-a-picture');
    const storageKey = await this.put(Readable.from(drawn.picture));
    const thumbnailKey = await this.putBeside(storageKey, drawn.thumbnail);
    return {
      storageKey,
      thumbnailKey,
      contentType: 'image/jpeg',
      bytes: drawn.picture.length,
      sha256: await sha256OfFile(path),
      widthPx: drawn.widthPx,
      heightPx: drawn.heightPx,
    };
  }

  /** What a file that comes back is by its content; null for what is no such sound or picture. Nothing is kept yet. */
  async look(kind: AttachmentKind, path: string): Promise<LookedFile | null> {
    await this.expectClean(path);
    if (kind === 'recording') {
      const contentType = await soundTypeOf(path);
      return contentType === null ? null : { path, contentType, thumbnail: null };
    }
    const drawn = await drawAnew(path);
    return drawn === null ? null : { path, contentType: 'image/jpeg', thumbnail: drawn.thumbnail };
  }

  /**
   * Keeps a file that comes back, byte for byte. Only for bytes that are known to be those that were kept here before: a
   * picture of anybody else's hand is drawn anew.
   */
  async keepAgain({ path, contentType, thumbnail }: LookedFile, sha256: string): Promise<KeptFile> {
    const { size: bytes } = await stat(path);
    const storageKey = await this.put(createReadStream(path));
    const thumbnailKey = thumbnail === null ? null : await this.putBeside(storageKey, thumbnail);
    return { storageKey, thumbnailKey, contentType, bytes, sha256 };
  }

  /** A second file with the same content. */
  async keepCopy({ storageKey, contentType, bytes, sha256 }: KeptFile): Promise<KeptFile> {
    const copied = await this.put(await this.store.read(storageKey));
    return { storageKey: copied, thumbnailKey: null, contentType, bytes, sha256 };
  }

  async remove(files: readonly Pick<KeptFile, 'storageKey' | 'thumbnailKey'>[]): Promise<void> {
    for (const { storageKey, thumbnailKey } of files) {
      await this.store.remove(storageKey);
      if (thumbnailKey !== null) await this.store.remove(thumbnailKey);
    }
  }

  private async expectClean(path: string): Promise<void> {
    if (this.scan !== null && !(await this.scan(path))) throw conflict('file-refused');
  }

  /** A small picture, or neither of the two. */
  private async putBeside(storageKey: string, thumbnail: Buffer): Promise<string> {
    return this.put(Readable.from(thumbnail)).catch(async (cause: unknown) => {
      await this.store.remove(storageKey);
      throw cause;
    });
  }

  private async put(content: Readable): Promise<string> {
    const key = randomBytes(16).toString('hex');
    await this.store.put(content, key);
    return key;
  }
}
