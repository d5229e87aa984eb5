/** A value that has no one JSON text. `path` says where it stands, e.g. `$.offsets.bestFromDays`. */
export class CanonicalJsonError extends TypeError {
  override readonly name = 'CanonicalJsonError';
  constructor(
    readonly path: string,
    what: string,
  ) {
    super(`${path}: ${what}`);
  }
}

/**
 * The one JSON text of a value, after RFC 8785: no spaces, the members of objects sorted by the UTF-16 code units
 * of their names, numbers and strings as ECMAScript writes them. Equal values give equal texts, so a hash over the
 * text is a hash over the value. Strings stay as they are; whoever wants NFC normalises before.
 *
 * Throws a CanonicalJsonError for whatever JSON cannot hold or would change in silence: undefined, functions,
 * symbols, bigints, numbers that are not finite, lone surrogates, dates and other objects with a class, cycles.
 */
export function canonicalJson(value: unknown): string {
  return write(value, '$', new Set());
}

/** True where two JSON values are the same, whatever the order of their members. */
export function sameJson(a: unknown, b: unknown): boolean {
  return canonicalJson(a) === canonicalJson(b);
}

function write(value: unknown, path: string, open: Set<object>): string {
  switch (typeof value) {
    case 'boolean':
      return value ? 'true' : 'false';
    case 'number':
      if (!Number.isFinite(value)) throw new CanonicalJsonError(path, `${value} has no JSON text`);
      return JSON.stringify(value);
    case 'string':
      return writeString(value, path);
    case 'object':
      return value === null ? 'null' : writeObject(value, path, open);
    default:
      throw new CanonicalJsonError(path, `${typeof value} has no JSON text`);
  }
}

function writeString(value: string, path: string): string {
  if (/\p{Surrogate}/u.test(value)) throw new CanonicalJsonError(path, 'half of a surrogate pair');
  return JSON.stringify(value);
}

function writeObject(value: object, path: string, open: Set<object>): string {
  if (open.has(value)) throw new CanonicalJsonError(path, 'the value contains itself');
  open.add(value);
  try {
    return Array.isArray(value) ? writeArray(value, path, open) : writeMembers(value, path, open);
  } finally {
    open.delete(value);
  }
}

function writeArray(values: readonly unknown[], path: string, open: Set<object>): string {
  // Not map(): it would jump over holes, and a hole is no JSON either.
  const parts = Array.from(values, (value, index) => write(value, `${path}.${index}`, open));
  return `[${parts.join(',')}]`;
}

function writeMembers(value: object, path: string, open: Set<object>): string {
  const prototype: unknown = Object.getPrototypeOf(value);
  if (prototype !== Object.prototype && prototype !== null) {
    throw new CanonicalJsonError(path, 'only plain objects have a JSON text of their own');
  }
  // "<" compares strings by UTF-16 code units, which is what the standard asks for.
  const members = Object.entries(value)
    .sort(([a], [b]) => (a < b ? -1 : 1))
    .map(([name, member]) => {
      const memberPath = `${path}.${name}`;
      return `${writeString(name, memberPath)}:${write(member, memberPath, open)}`;
    });
  return `{${members.join(',')}}`;
}
