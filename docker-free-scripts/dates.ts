// npm run -s dates -- FILE.json
// Answers the cases of a file by the depth at the crossing (see shared/sky): civil days in local mean solar time,
// thresholds exactly as given. A bad case gets {id, error} in its place and the exit code 2; the rest is answered.
import { readFileSync } from 'node:fs';

import { type CaseAnswer, answerCases, readCases } from './lib/answer-cases.js';

function complain(sentence: string): void {
  process.stderr.write(`${sentence}\n`);
  process.exitCode = 2;
}

function casesOf(path: string): unknown[] | null {
  try {
    return readCases(readFileSync(path, 'utf8'));
  } catch (error) {
    complain(`${path} cannot be read: ${error instanceof Error ? error.message : String(error)}`);
    return null;
  }
}

const [path, ...rest] = process.argv.slice(2);
if (path === undefined || rest.length > 0) {
  complain('Give one file of cases: npm run -s dates -- FILE.json');
} else {
  const cases = casesOf(path);
  if (cases) {
    const answers: CaseAnswer[] = answerCases(cases);
    process.stdout.write(`${JSON.stringify({ cases: answers }, null, 1)}\n`);
    for (const answer of answers) if ('error' in answer) complain(answer.error);
  }
}
