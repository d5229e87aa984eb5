import { In, type DataSource } from 'typeorm';
import { AttachmentPartEntity } from '../../db/entities/attachment-part.entity.js';
import type { FileStore } from '../../storage/file-store.js';

const AT_ONCE = 500;
/** Younger files may belong to a row that is being written at this moment. */
const YOUNG_MS = 60 * 60 * 1000;

/**
 * Removes files that no row knows any more: a process ended between the rows and the files.
 * @returns how many were removed
 */
export async function sweepOrphans(dataSource: DataSource, store: FileStore, now: Date): Promise<number> {
  let removed = 0;
  let batch: string[] = [];
  const sweep = async () => {
    const known = await knownKeys(dataSource, batch);
    for (const key of batch.filter((each) => !known.has(each))) {
      const facts = await store.stat(key);
      if (facts === null || now.getTime() - facts.storedAt.getTime() < YOUNG_MS) continue;
      await store.remove(key);
      removed += 1;
    }
    batch = [];
  };
  for await (const key of store.keys()) {
    batch.push(key);
    if (batch.length === AT_ONCE) await sweep();
  }
  await sweep();
  return removed;
}

async function knownKeys(dataSource: DataSource, keys: readonly string[]): Promise<Set<string>> {
  const rows = await dataSource.getRepository(AttachmentPartEntity).find({
    where: [{ storageKey: In(keys) }, { thumbnailKey: In(keys) }],
    select: { attachmentId: true, part: true, storageKey: true, thumbnailKey: true },
  });
  return new Set(rows.flatMap(({ storageKey, thumbnailKey }) => [storageKey, thumbnailKey ?? storageKey]));
}
