/** What the log keeps of an error: enough to find the place, and no word of anybody. */
export interface LoggedError {
  type: string;
  code: string | null;
  /** Left out where it repeats what was written: errors of the database, answers that do not fit. */
  reason: string | null;
  frames: string[];
}

/**
 * Errors of the database carry the query with its values, and those of schemas the value that did not fit; both would
 * bring people's words and addresses into the log.
 */
export function errorForLog(error: unknown): LoggedError {
  if (!(error instanceof Error)) return { type: typeof error, code: null, reason: null, frames: [] };
  const { code, driverError } = error as { code?: unknown; driverError?: { code?: unknown } };
  const known = driverError?.code ?? code;
  const holdsContent = ['driverError', 'sql', 'query', 'issues'].some((name) => name in error);
  return {
    type: error.name,
    code: typeof known === 'string' ? known : null,
    reason: holdsContent ? null : error.message,
    frames: (error.stack ?? '').split('\n').filter((line) => /^\s+at /u.test(line)),
  };
}
