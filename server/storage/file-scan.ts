import { execFile } from 'node:child_process';

/** Looks at a file before it is kept: true lets it in, false refuses it. Anything else is thrown and refuses too. */
export type FileScan = (filePath: string) => Promise<boolean>;

const INFECTED_EXIT = 1;
const PATIENCE_MS = 120_000;

/**
 * A virus scanner that is called with the file's path as its last argument: it ends with 0 for a clean file and with 1
 * for one that must not be kept, as the usual scanners do.
 * @param words program and arguments, e.g. `['clamdscan', '--fdpass']`
 * @throws when the scanner cannot be run: a file that nobody looked at is not kept.
 */
export function commandScan([program = '', ...options]: readonly string[]): FileScan {
  return (filePath) =>
    new Promise((resolve, reject) => {
      execFile(program, [...options, filePath], { timeout: PATIENCE_MS }, (error) => {
        if (error === null) resolve(true);
        else if (error.code === INFECTED_EXIT) resolve(false);
        else reject(new Error('The virus scanner could not look at a file', { cause: error }));
      });
    });
}
