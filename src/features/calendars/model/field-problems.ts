import { entryInput, type EntryInput } from '#shared/contracts/calendars.js';
import type { FieldError } from '#shared/contracts/problem.js';

/** Codes of what is not accepted, by the field's path: `offsets.bestToDays` → `window-order`. One for each field. */
export type FieldProblems = ReadonlyMap<string, { code: string; message?: string }>;

export const NO_PROBLEMS: FieldProblems = new Map();

/** What the contract's schema refuses; the same schema answers on the server. */
export function problemsOf(content: EntryInput): FieldProblems {
  const parsed = entryInput.safeParse(content);
  const found = new Map<string, { code: string }>();
  if (parsed.success) return found;
  for (const { path, message } of parsed.error.issues) {
    const field = path.map(String).join('.');
    if (!found.has(field)) found.set(field, { code: message });
  }
  return found;
}

/** What the server refused. A body's fields stand below `content` where an entry is saved over an older one. */
export function problemsFrom(errors: readonly FieldError[]): FieldProblems {
  const found = new Map<string, { code: string; message: string }>();
  for (const { field, code, message } of errors) {
    const own = field.replace(/^content\./u, '');
    if (!found.has(own)) found.set(own, { code, message });
  }
  return found;
}

export type FieldGroup = 'what' | 'when' | 'signs' | 'work' | 'trust' | 'whose';

/** Beginnings of the fields' paths. */
const GROUPS: Record<FieldGroup, readonly string[]> = {
  what: [
    'titleVillage',
    'titleOfficer',
    'kind',
    'kindWord',
    'icon',
    'crop',
    'notes',
    'caution',
    'record.what',
  ],
  when: ['board', 'lead', 'offsets', 'hasLastDate', 'lastDate', 'protectiveWatch', 'record.when'],
  signs: ['otherSigns', 'record.signs'],
  work: ['ifLate', 'record.work'],
  trust: ['record.trust', 'record.checked'],
  whose: ['giver', 'giverId', 'agreedToPrint', 'sharingLevel', 'sharing', 'record.heard'],
};

/** The groups that must open because something in them needs another look. */
export function groupsWithProblems(problems: FieldProblems): FieldGroup[] {
  const paths = [...problems.keys()];
  return (Object.keys(GROUPS) as FieldGroup[]).filter((group) =>
    GROUPS[group].some((field) => paths.some((path) => path === field || path.startsWith(`${field}.`))),
  );
}
