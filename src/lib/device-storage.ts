/**
 * Small things kept on this device. Storage may be full, closed or missing (private windows): then a thing is
 * simply not kept, and the screen goes on.
 */
const PREFIX = 'dawnpeg.';

export function readKept(key: string): unknown {
  try {
    const text = localStorage.getItem(PREFIX + key);
    return text === null ? null : (JSON.parse(text) as unknown);
  } catch {
    return null;
  }
}

/** Answers whether it is really kept. */
export function keep(key: string, value: unknown): boolean {
  try {
    localStorage.setItem(PREFIX + key, JSON.stringify(value));
    return true;
  } catch {
    return false;
  }
}

export function forget(key: string): void {
  try {
    localStorage.removeItem(PREFIX + key);
  } catch {
    // Nothing was kept, so nothing is left behind.
  }
}

/** Everything kept whose key begins so, with the rest of each key: one calendar's unsaved entries, for instance. */
export function readAllKept(keyStart: string): Map<string, unknown> {
  const found = new Map<string, unknown>();
  try {
    const full = PREFIX + keyStart;
    for (const key of Object.keys(localStorage)) {
      if (key.startsWith(full)) found.set(key.slice(full.length), readKept(key.slice(PREFIX.length)));
    }
  } catch {
    // Nothing can be read, so nothing was kept.
  }
  return found;
}

/** Forgets every kept thing whose key begins so: one person's drafts when they sign out, for instance. */
export function forgetAll(keyStart: string): void {
  try {
    const full = PREFIX + keyStart;
    for (const key of Object.keys(localStorage)) {
      if (key.startsWith(full)) localStorage.removeItem(key);
    }
  } catch {
    // See forget().
  }
}

/** Forgets every kept thing whose key says so. */
export function forgetWhere(isGone: (key: string) => boolean): void {
  try {
    for (const key of Object.keys(localStorage)) {
      if (key.startsWith(PREFIX) && isGone(key.slice(PREFIX.length))) localStorage.removeItem(key);
    }
  } catch {
    // See forget().
  }
}
