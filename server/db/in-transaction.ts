import { QueryFailedError, type DataSource, type EntityManager } from 'typeorm';
import { z } from 'zod';

/**
 * What MariaDB answers when two people's changes met: the row changed since this transaction's snapshot,
 * waiting for a lock took too long, or each waited for the other. Nothing was written, so it may run again.
 */
const MET_ANOTHER_CHANGE = new Set([1020, 1205, 1213]);
const ATTEMPTS = 4;

const driverError = z.object({ errno: z.number() });

/**
 * Runs `work` in one transaction, again from its beginning when it met another change. `work` must
 * therefore do nothing but database work: no letters, no files, no counting outside.
 */
export async function inTransaction<T>(
  dataSource: DataSource,
  work: (manager: EntityManager) => Promise<T>,
): Promise<T> {
  for (let attempt = 1; ; attempt += 1) {
    try {
      return await dataSource.transaction(work);
    } catch (error) {
      if (attempt === ATTEMPTS || !metAnotherChange(error)) throw error;
    }
  }
}

function metAnotherChange(error: unknown): boolean {
  if (!(error instanceof QueryFailedError)) return false;
  const parsed = driverError.safeParse(error.driverError);
  return parsed.success && MET_ANOTHER_CHANGE.has(parsed.data.errno);
}
