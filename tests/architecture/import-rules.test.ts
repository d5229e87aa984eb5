import { cruise, type ICruiseResult } from 'dependency-cruiser';
import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import rules from '../../.dependency-cruiser.mjs';
import { allowed, forbidden } from './import-rules.examples.js';

/**
 * The real tree obeys the rules (`npm run check`), so it cannot show that they work. Here a small tree of
 * made-up modules breaks each of them once, and another keeps to the table everywhere.
 */
let tree: string;
let found: { rule: string; from: string; to: string }[];

beforeAll(async () => {
  tree = mkdtempSync(path.join(os.tmpdir(), 'dawnpeg-rules-'));
  writeTree();
  const { output } = await cruise(['.'], { ...rules.options, ruleSet: { forbidden: rules.forbidden }, validate: true, baseDir: tree } as never); // prettier-ignore
  const { summary } = output as ICruiseResult;
  found = summary.violations.map(({ rule, from, to }) => ({ rule: rule.name, from, to }));
});

afterAll(() => {
  rmSync(tree, { recursive: true, force: true });
});

describe('the import rules', () => {
  for (const { rule, from, to } of forbidden)
    it(`${rule}: ${from} may not import ${to}`, () => {
      expect(found).toContainEqual({ rule, from, to: expect.stringContaining(resolved(to)) as string });
    });

  for (const { from, to } of allowed)
    it(`${from} may import ${to}`, () => {
      expect(found.filter((one) => one.from === from && one.to.includes(resolved(to)))).toEqual([]);
    });

  it('are each broken by an example', () => {
    const broken = new Set(forbidden.map(({ rule }) => rule));
    expect(rules.forbidden.map(({ name }) => name).filter((name) => !broken.has(name))).toEqual([]);
  });
});

/** Every example as files: the importing one with its imports, the imported one empty. */
function writeTree(): void {
  const imports = new Map<string, string[]>();
  for (const { from, to } of [...forbidden, ...allowed]) {
    imports.set(from, [...(imports.get(from) ?? []), to]);
    if (/^(shared|server|src|tests)\//.test(to) && !to.includes('/not-there'))
      imports.set(to, imports.get(to) ?? []);
  }
  for (const [file, targets] of imports)
    write(file, targets.map((target, index) => `export { x as x${index} } from '${specifier(file, target)}';`).join('\n') || 'export const x = 1;'); // prettier-ignore
  for (const name of ['astronomy-engine', 'zod', 'typeorm', 'express', 'react', 'vitest']) {
    write(`node_modules/${name}/package.json`, JSON.stringify({ name, version: '1.0.0', main: 'index.js' }));
    write(`node_modules/${name}/index.js`, 'exports.x = 1;');
  }
  write(
    'package.json',
    JSON.stringify({
      type: 'module',
      dependencies: { 'astronomy-engine': '1', zod: '1', typeorm: '1', express: '1', react: '1' },
      devDependencies: { vitest: '1' },
    }),
  );
}

/** How `file` would write the import of `target`: packages and Node by name, files relatively. */
function specifier(file: string, target: string): string {
  if (!/^(shared|server|src|tests)\//.test(target)) return target;
  const relative = path.relative(path.dirname(file), target).replace(/\.tsx?$/, '.js');
  return relative.startsWith('.') ? relative : `./${relative}`;
}

/** How dependency-cruiser names what it found. */
function resolved(target: string): string {
  if (target.includes('/not-there')) return 'not-there';
  return target.replace(/^node:/, '');
}

function write(file: string, text: string): void {
  const full = path.join(tree, file);
  mkdirSync(path.dirname(full), { recursive: true });
  writeFileSync(full, text);
}
