import { readFileSync } from 'node:fs';

import { parse } from 'csv-parse/sync';

/** Readers of tests/fixtures/sky; provenance is in its README. */

function textOf(name: string): string {
  return readFileSync(new URL(`../../fixtures/sky/${name}`, import.meta.url), 'utf8');
}

export function fixturePath(name: string): URL {
  return new URL(`../../fixtures/sky/${name}`, import.meta.url);
}

export function jsonFixture<Shape>(name: string): Shape {
  return JSON.parse(textOf(name)) as Shape;
}

export function csvFixture(name: string): Record<string, string>[] {
  return parse<Record<string, string>>(textOf(name), { columns: true });
}
