import { existsSync } from 'node:fs';
import path from 'node:path';
import { describe, expect, it } from 'vitest';
import { coveredElsewhere } from './covered-elsewhere.js';
import { projectDir, projectFiles, textOf } from './source-tree.js';

const files = projectFiles();
const exists = (file: string) => existsSync(path.join(projectDir, file));

describe('unit tests', () => {
  const tests = files.filter((file) => /^tests\/unit\/.*\.test\.tsx?$/.test(file));

  it('stand at the place of what they test', () => {
    const strays = tests.filter(
      (test) => !['.ts', '.tsx', '.mjs'].some((ending) => exists(sourceOf(test, ending))),
    );
    expect(strays, 'tests whose source is not at the same path without tests/unit/').toEqual([]);
  });

  it('exist for every file of shared/ that computes something, or another test is named for it', () => {
    const untested = files
      .filter((file) => file.startsWith('shared/') && computes(file))
      .filter(
        (file) => !exists(`tests/unit/${file.replace(/\.ts$/, '.test.ts')}`) && !(file in coveredElsewhere),
      );
    expect(untested, 'write tests/unit/<same path>.test.ts or name the test in covered-elsewhere.ts').toEqual(
      [],
    );
  });

  it('that are named for a file elsewhere are there, and are still needed', () => {
    const wrong = Object.entries(coveredElsewhere).filter(
      ([source, test]) =>
        !exists(source) || !exists(test) || exists(`tests/unit/${source.replace(/\.ts$/, '.test.ts')}`),
    );
    expect(wrong).toEqual([]);
  });
});

describe('files', () => {
  it('hold at most 400 lines, data, migrations and texts apart', () => {
    const long = files
      .filter((file) => /\.(tsx?|m?js|css|html)$/.test(file) && !mayBeLong(file))
      .map((file) => ({ file, lines: textOf(file).split('\n').length - 1 }))
      .filter(({ lines }) => lines > 400);
    expect(long).toEqual([]);
  });

  it('are named in small letters with hyphens', () => {
    const shouting = files.filter(
      (file) =>
        /^(shared|server|src|docker-free-scripts)\/.*\.(tsx?|mjs|css)$/.test(file) && /[A-Z_ ]/.test(file),
    );
    expect(shouting).toEqual([]);
  });

  it('of the lock name no address to download from, so that any registry can serve them', () => {
    expect(textOf('package-lock.json')).not.toContain('"resolved": "http');
  });
});

describe('README.md and DEVELOPERS.md', () => {
  it('lead to files that are there', () => {
    const links = ['README.md', 'DEVELOPERS.md'].flatMap((page) =>
      [...textOf(page).matchAll(/\]\((?!https?:|#)([^)]+)\)/g)].map(([, target = '']) => target),
    );
    expect(links.length).toBeGreaterThan(0);
    expect(links.filter((target) => !exists(target))).toEqual([]);
  });
});

describe('DEVELOPERS.md', () => {
  it('names every folder of the first two levels', () => {
    const map = exists('DEVELOPERS.md') ? textOf('DEVELOPERS.md') : '';
    const folders = new Set(
      files.flatMap((file) => {
        const parts = path.dirname(file).split('/');
        return file.includes('/')
          ? parts.slice(0, 2).map((_, index) => parts.slice(0, index + 1).join('/'))
          : [];
      }),
    );
    expect(
      [...folders].sort().filter((folder) => !isNamed(map, folder)),
      'folders to describe',
    ).toEqual([]);
  });
});

/** A whole path (`server/http`), or the last part as the tree drawing has it (`  http/`). */
function isNamed(map: string, folder: string): boolean {
  const last = path.posix.basename(folder).replaceAll('.', '\\.');
  return map.includes(folder) || new RegExp(`(^|[\\s\`/{,])${last}[/\`,}]`, 'm').test(map);
}

/** tests/unit/shared/sky/time/julian-day.test.ts → shared/sky/time/julian-day.ts */
function sourceOf(test: string, ending: string): string {
  return test.replace(/^tests\/unit\//, '').replace(/\.test\.tsx?$/, ending);
}

/** True for a file that exports a function: types, constants and lists have nothing to get wrong on their own. */
function computes(file: string): boolean {
  if (!file.endsWith('.ts') || /^shared\/(locales|sky\/data)\//.test(file)) return false;
  return /^export (async )?function |^export const \w+ = (async )?(<\w+>)?\(/m.test(textOf(file));
}

function mayBeLong(file: string): boolean {
  return /(^|\/)(data|migrations|locales|fixtures)\/|\.data\.ts$/.test(file);
}
