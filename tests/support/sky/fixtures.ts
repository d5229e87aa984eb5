import { readFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';

import { parse } from 'csv-parse/sync';

/** Readers of tests/fixtures/sky; provenance is in its README. */

export function fixturePath(name: string): string {
  return fileURLToPath(new URL(`../../fixtures/sky/${name}`, import.meta.url));
}

function textOf(name: string): string {
  return readFileSync(fixturePath(name), 'utf8');
}

/** The caller says what is in the file. */
export function jsonFixture(name: string): unknown {
  return JSON.parse(textOf(name));
}

export function csvFixture(name: string): Record<string, string>[] {
  return parse<Record<string, string>>(textOf(name), { columns: true });
}
