import { existsSync } from 'node:fs';
import path from 'node:path';
import { describe, expect, it } from 'vitest';
import { projectDir, projectFiles, textOf } from './source-tree.js';

const files = projectFiles();
const inFolder = (folder: string) =>
  files.filter((file) => file.startsWith(folder) && /\.(tsx?|css|html)$/u.test(file));

describe('the records', () => {
  const WRITES_OVER =
    /\b(update|delete|remove|save|upsert|softDelete|clear)\w*\(\s*AuditEventEntity|getRepository\(\s*AuditEventEntity\s*\)|(UPDATE|DELETE\s+FROM|TRUNCATE(\s+TABLE)?|REPLACE\s+INTO)\s+`?audit_event/iu;

  it('are only ever added to: no line of the server changes or takes one away', () => {
    const found = inFolder('server/').filter(
      (file) => !file.startsWith('server/db/migrations/') && WRITES_OVER.test(textOf(file)),
    );
    expect(found).toEqual([]);
  });

  it('would be found out: the search knows such lines', () => {
    for (const line of [
      'await manager.delete(AuditEventEntity, { id })',
      'await manager.update(\n AuditEventEntity, {}, {})',
      "query('DELETE FROM audit_event WHERE 1')",
    ]) {
      expect(WRITES_OVER.test(line)).toBe(true);
    }
  });
});

describe('the pages', () => {
  /** Names of vocabularies, which no browser fetches. */
  const NOT_FETCHED = /^http:\/\/www\.w3\.org\//u;

  it('name no other address: no tracker, no font, no picture comes from elsewhere', () => {
    const named = ['index.html', ...inFolder('src/'), ...inFolder('public/')].flatMap((file) =>
      [...textOf(file).matchAll(/(https?:)?\/\/[a-z0-9-]+\.[a-z]{2,}[^\s'"`)<]*/giu)]
        .map(([address]) => address)
        .filter((address) => !NOT_FETCHED.test(address))
        .map((address) => `${file}: ${address}`),
    );
    expect(named).toEqual([]);
  });

  it('keep nothing that follows people about: no beacon, no cookie of a script, no fingerprint', () => {
    const found = inFolder('src/').filter((file) =>
      /sendBeacon|document\.cookie|FingerprintJS|gtag\(/u.test(textOf(file)),
    );
    expect(found).toEqual([]);
  });
});

describe('the security checklist of DEVELOPERS.md', () => {
  const guide = textOf('DEVELOPERS.md');
  const part = (name: string) =>
    guide.slice(guide.indexOf(`<!-- ${name}:begin -->`), guide.indexOf(`<!-- ${name}:end -->`));
  const rowsOf = (name: string) =>
    part(name)
      .split('\n')
      .filter((line) => /^\| (?!item|tried|---)/u.test(line))
      .map((line) =>
        line
          .split('|')
          .slice(1, -1)
          .map((cell) => cell.trim()),
      );

  it.each(['checklist', 'attacks'])(
    'names for each line of %s a test that is there, or says why there is none',
    (name) => {
      const rows = rowsOf(name);
      expect(rows.length).toBeGreaterThan(15);
      for (const row of rows) {
        const tests = [...(row.at(-1) ?? '').matchAll(/`([^`]+)`/gu)].map(([, file = '']) => file);
        expect([row[0], tests.length > 0 || /^–/u.test(row.at(-1) ?? '')]).toEqual([row[0], true]);
        for (const file of tests) {
          expect([file, existsSync(path.join(projectDir, 'tests', file))]).toEqual([file, true]);
        }
      }
    },
  );

  it('goes through four chapters, each item once', () => {
    const items = rowsOf('checklist').flatMap(([item = '']) => item.split(', '));
    expect(new Set(items).size).toBe(items.length);
    for (const chapter of ['2.', '3.', '4.', '12.']) {
      expect([chapter, items.some((item) => item.startsWith(chapter))]).toEqual([chapter, true]);
    }
  });
});
