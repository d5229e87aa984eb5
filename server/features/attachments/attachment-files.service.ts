import { randomBytes } from 'node:crypto';
import { createReadStream } from 'node:fs';
import { Readable } from 'node:stream';
import { PICTURE_MAX_BYTES } from '#shared/contracts/attachments.js';
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
    const thumbnailKey = await this.put(Readable.from(drawn.thumbnail)).catch(async (cause: unknown) => {
      await this.store.remove(storageKey);
      throw cause;
    });
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

  async remove(files: readonly Pick<KeptFile, 'storageKey' | 'thumbnailKey'>[]): Promise<void> {
    for (const { storageKey, thumbnailKey } of files) {
      await this.store.remove(storageKey);
      if (thumbnailKey !== null) await this.store.remove(thumbnailKey);
    }
  }

  private async expectClean(path: string): Promise<void> {
    if (this.scan !== null && !(await this.scan(path))) throw conflict('file-refused');
  }

  private async put(content: Readable): Promise<string> {
    const key = randomBytes(16).toString('hex');
    await this.store.put(content, key);
    return key;
  }
}
