import type { FieldError } from '#shared/contracts/problem.js';
import { texts } from '#shared/locales/en/problems.js';
import type { z } from 'zod';

type Issue = z.core.$ZodIssue;

/** One entry per refused field, in the order of the fields, with a code that the screens can translate. */
export function fieldErrors(issues: readonly Issue[]): FieldError[] {
  const byField = new Map<string, FieldError>();
  for (const issue of issues) {
    const path = issue.path.map(String).join('.');
    for (const field of fieldsOf(issue, path)) {
      if (byField.has(field)) continue;
      const code = codeOf(issue);
      byField.set(field, { field, code, message: texts.field[code] });
    }
  }
  return [...byField.values()];
}

function fieldsOf(issue: Issue, path: string): string[] {
  if (issue.code !== 'unrecognized_keys') return [path];
  return issue.keys.map((key) => (path === '' ? key : `${path}.${key}`));
}

function codeOf(issue: Issue): keyof typeof texts.field {
  // Schemas name their own code as the message; everything else is zod's wording and maps by kind.
  if (issue.message in texts.field) return issue.message as keyof typeof texts.field;
  switch (issue.code) {
    case 'unrecognized_keys':
      return 'not-expected';
    case 'too_big':
      return 'too-long';
    case 'too_small':
      return 'too-short';
    case 'invalid_value':
    case 'invalid_union':
      return 'not-in-list';
    case 'invalid_type':
      if (issue.input === undefined) return 'required';
      return issue.expected === 'number' || issue.expected === 'int' ? 'not-a-number' : 'unknown';
    default:
      return 'unknown';
  }
}
