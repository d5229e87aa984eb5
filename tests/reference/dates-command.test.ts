import { execFile } from 'node:child_process';
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { fileURLToPath } from 'node:url';

import { afterAll, beforeAll, describe, expect, it } from 'vitest';

import { fixturePath, jsonFixture } from '#tests/support/sky/fixtures.js';

const projectDir = fileURLToPath(new URL('../..', import.meta.url));
const folder = mkdtempSync(path.join(tmpdir(), 'dawnpeg-dates-'));

interface Run {
  code: number;
  stdout: string;
  stderr: string;
}

function run(command: string, args: string[]): Promise<Run> {
  return new Promise((resolve) => {
    execFile(command, args, { cwd: projectDir }, (error, stdout, stderr) => {
      resolve({ code: typeof error?.code === 'number' ? error.code : 0, stdout, stderr });
    });
  });
}

/** What `npm run dates` runs, without the second that npm takes; one test goes through npm itself. */
function dates(...files: string[]): Promise<Run> {
  const { scripts } = JSON.parse(readFileSync(path.join(projectDir, 'package.json'), 'utf8')) as {
    scripts: { dates: string };
  };
  const [command = '', ...args] = scripts.dates.split(' ');
  return run(path.join(projectDir, 'node_modules/.bin', command), [...args, ...files]);
}

function fileOf(name: string, content: string): string {
  const file = path.join(folder, name);
  writeFileSync(file, content);
  return file;
}

const good = {
  hr: 2491,
  latitudeDeg: 30,
  longitudeDeg: 31,
  year: 2000,
  skylineDeg: 0,
  thresholdsDeg: { sameSide: 9, oppositeSide: 7 },
};
const mixed = {
  cases: [
    { id: 'sirius', ...good },
    { id: 'far-north', ...good, latitudeDeg: 91 },
    'nonsense',
    { id: 'no-such-star', ...good, hr: 1 },
    { id: 'no-thresholds', ...good, thresholdsDeg: undefined },
    { id: 'polar', ...good, latitudeDeg: -85 },
    { id: 'sirius', ...good, year: 2001 },
  ],
};

describe('npm run -s dates', () => {
  let reference: Run;
  let partly: Run;
  let missing: Run;
  let broken: Run;
  let wrongShape: Run;
  let nothing: Run;

  beforeAll(async () => {
    reference = await run('npm', ['run', '-s', 'dates', '--', fixturePath('reference-dates.json')]);
    partly = await dates(fileOf('mixed.json', JSON.stringify(mixed)));
    missing = await dates(path.join(folder, 'not-there.json'));
    broken = await dates(fileOf('broken.json', '{"cases": ['));
    wrongShape = await dates(fileOf('shape.json', '[]'));
    nothing = await dates();
    // A second each on a free machine.
  }, 180_000);
  afterAll(() => rmSync(folder, { recursive: true }));

  it('answers the 60 reference cases in their order and in their own form', () => {
    const { cases } = jsonFixture('reference-dates.json') as { cases: Record<string, unknown>[] };
    const answers = (JSON.parse(reference.stdout) as { cases: Record<string, unknown>[] }).cases;
    expect(reference).toMatchObject({ code: 0, stderr: '' });
    expect(answers.map(({ id, outcome }) => [id, outcome])).toEqual(
      cases.map(({ id, outcome }) => [id, outcome]),
    );
    const shapeOf = ({ dayNumbers, gregorian }: Record<string, unknown>): unknown[] =>
      [dayNumbers, gregorian].map((lists) => lists && Object.keys(lists));
    expect(answers.map(shapeOf)).toEqual(cases.map(shapeOf));
    // A case whose days agree to the day has the same dates, letter for letter.
    const same = cases.filter(
      ({ dayNumbers }, index) =>
        JSON.stringify(dayNumbers) === JSON.stringify(answers[index]?.['dayNumbers']),
    );
    expect(same.length).toBeGreaterThan(50);
    for (const { id, gregorian } of same) {
      expect(answers.find((answer) => answer['id'] === id)?.['gregorian']).toEqual(gregorian);
    }
  });

  it('puts an error in the place of a bad case, says it again on stderr, and answers the rest', () => {
    const answers = (JSON.parse(partly.stdout) as { cases: Record<string, unknown>[] }).cases;
    expect(partly.code).toBe(2);
    expect(answers.map(({ id }) => id)).toEqual([
      'sirius',
      'far-north',
      null,
      'no-such-star',
      'no-thresholds',
      'polar',
      'sirius',
    ]);
    expect(answers[0]).toMatchObject({ outcome: 'rises-and-sets' });
    expect(answers[5]).toEqual({ id: 'polar', outcome: 'never-sets' });
    const errors = answers.flatMap((answer) =>
      typeof answer['error'] === 'string' ? [answer['error']] : [],
    );
    expect(errors).toHaveLength(5);
    expect(partly.stderr.trim().split('\n')).toEqual(errors);
    for (const answer of answers.filter((one) => 'error' in one))
      expect(Object.keys(answer)).toEqual(['id', 'error']);
    expect(errors[0]).toContain('latitudeDeg');
    expect(errors[2]).toContain('hr');
    expect(errors[3]).toContain('thresholdsDeg');
    expect(errors[4]).toContain('id');
  });

  it('writes nothing on stdout for a file that it cannot read, and exits with 2', () => {
    for (const run of [missing, broken, wrongShape, nothing]) {
      expect(run).toMatchObject({ code: 2, stdout: '' });
      expect(run.stderr.trim().split('\n')).toHaveLength(1);
    }
  });
});
