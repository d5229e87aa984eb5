import { canonicalJson, sameJson } from '#shared/kernel/canonical-json.js';

/** One field that differs; null stands for a field that one side does not have. */
export interface FieldChange {
  field: string;
  before: unknown;
  after: unknown;
}

export interface ComparedBody {
  entryId: string;
  content: object;
  dates: object;
}

export interface ComparedEntry<T extends ComparedBody> {
  entryId: string;
  change: 'added' | 'removed' | 'changed' | 'same';
  before: T | null;
  after: T | null;
  fields: FieldChange[];
}

/**
 * Compares two lists of entries. Entries are matched by id, so a moved entry is the same entry. The answer stands
 * in the order of the newer list; entries that are gone come last, in the order of the older one.
 *
 * Fields are `content`'s and `dates`' own members, the latter written `dates.<name>`, in alphabetical order.
 */
export function compareEntries<T extends ComparedBody>(
  before: readonly T[],
  after: readonly T[],
): ComparedEntry<T>[] {
  const older = new Map(before.map((body) => [body.entryId, body]));
  const kept = new Set(after.map((body) => body.entryId));
  const present = after.map((body): ComparedEntry<T> => {
    const was = older.get(body.entryId);
    if (!was) return { entryId: body.entryId, change: 'added', before: null, after: body, fields: [] };
    const fields = [
      ...changedMembers(was.content, body.content, ''),
      ...changedMembers(was.dates, body.dates, 'dates.'),
    ];
    return {
      entryId: body.entryId,
      change: fields.length > 0 ? 'changed' : 'same',
      before: was,
      after: body,
      fields,
    };
  });
  const removed = before
    .filter((body) => !kept.has(body.entryId))
    .map((body): ComparedEntry<T> => ({
      entryId: body.entryId,
      change: 'removed',
      before: body,
      after: null,
      fields: [],
    }));
  return [...present, ...removed];
}

/** Differs between any two submissions and says nothing about the calendar. */
const IDENTITY = new Set(['salt', 'schema', 'calendarId', 'number', 'submittedAt']);
/** Follow from the place and from what the entries go by; the entries' own dates tell it better. */
const DERIVED = new Set(['markers']);

export interface ComparedHeader {
  place: object;
}

/**
 * What the two versions rest on and how it differs: place (`place.<name>`), engine, contacts, languages. Where the
 * entries that both sides have stand in another order, one more change named `order` holds their ids.
 */
export function compareHeaders(
  before: ComparedHeader,
  after: ComparedHeader,
  entryIdsBefore: readonly string[],
  entryIdsAfter: readonly string[],
): FieldChange[] {
  const skip = (name: string) => IDENTITY.has(name) || DERIVED.has(name) || name === 'place';
  return [
    ...changedMembers(before, after, '').filter(({ field }) => !skip(field)),
    ...changedMembers(before.place, after.place, 'place.'),
    ...orderChange(entryIdsBefore, entryIdsAfter),
  ];
}

function changedMembers(before: object, after: object, prefix: string): FieldChange[] {
  const was = new Map<string, unknown>(Object.entries(before));
  const is = new Map<string, unknown>(Object.entries(after));
  return [...new Set([...was.keys(), ...is.keys()])]
    .sort()
    .map((name) => ({
      field: `${prefix}${name}`,
      before: was.get(name) ?? null,
      after: is.get(name) ?? null,
    }))
    .filter((change) => !sameJson(change.before, change.after));
}

function orderChange(before: readonly string[], after: readonly string[]): FieldChange[] {
  const inBefore = new Set(before);
  const inAfter = new Set(after);
  const was = before.filter((id) => inAfter.has(id));
  const is = after.filter((id) => inBefore.has(id));
  return canonicalJson(was) === canonicalJson(is) ? [] : [{ field: 'order', before: was, after: is }];
}
