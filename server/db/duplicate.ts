import { QueryFailedError } from 'typeorm';

/** Whether a row was refused because there is one like it: two people, or one person twice, did the same at once. */
export function isDuplicate(error: unknown): boolean {
  return (
    error instanceof QueryFailedError && (error.driverError as { code?: unknown }).code === 'ER_DUP_ENTRY'
  );
}
