import { readdirSync, readFileSync, statSync } from 'node:fs';
import path from 'node:path';

export const projectDir = path.resolve(import.meta.dirname, '../..');

/** What is made, fetched or kept while working, and is no part of the tree. */
const notOurs = new Set([
  'node_modules',
  'dist',
  'data',
  '.tmp',
  '.git',
  'coverage',
  'test-results',
  'playwright-report',
]);

/** Every file of the project, relative to it, with forward slashes. */
export function projectFiles(): string[] {
  return readdirSync(projectDir, { withFileTypes: true })
    .filter((entry) => !notOurs.has(entry.name))
    .flatMap((entry) =>
      entry.isDirectory()
        ? readdirSync(path.join(projectDir, entry.name), { recursive: true, encoding: 'utf8' }).map((file) =>
            path.posix.join(entry.name, file),
          )
        : [entry.name],
    )
    .filter((file) => statSync(path.join(projectDir, file)).isFile());
}

export function textOf(file: string): string {
  return readFileSync(path.join(projectDir, file), 'utf8');
}
