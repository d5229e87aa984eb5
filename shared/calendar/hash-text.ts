import { canonicalJson } from '#shared/kernel/canonical-json.js';

/**
 * The exact texts over which a version's SHA-256 hashes go, so that anybody can compute them again from a print-out
 * and a standard tool. All texts are UTF-8, all hashes and salts lower-case hex, lines end in one line feed.
 *
 * - entry hash   = SHA-256( salt ⏎ canonical JSON of {entryId, content, dates} )
 * - header hash  = SHA-256( canonical JSON of the header )
 * - leaf         = SHA-256( rank in decimal ⏎ entry hash )
 * - version hash = SHA-256( "dawnpeg-version-2" ⏎ header hash ⏎ leaves in the order of their digits, each with ⏎ )
 *   of scheme 1  = SHA-256( "dawnpeg-version-1" ⏎ header hash ⏎ entry hashes in order, each with ⏎ )
 *
 * The salt keeps the words of an entry that had to vanish from being guessed from the hash that stays. Ranks grow in
 * random steps and random leaves stand among the true ones: whoever is shown a part of the entries checks that part
 * and its order, and cannot tell how many others there are.
 */
export type HashScheme = 1 | 2;

export interface EntryBody {
  entryId: string;
  content: unknown;
  dates: unknown;
}

/** Text of an entry that is stored and hashed. Position is no part of it: a moved entry is the same entry. */
export function entryBodyText({ entryId, content, dates }: EntryBody): string {
  return canonicalJson({ entryId, content, dates });
}

export function entryHashText(salt: string, bodyText: string): string {
  return `${salt}\n${bodyText}`;
}

export function leafText(rank: number, entryHash: string): string {
  return `${rank}\n${entryHash}`;
}

/** @param leaves of scheme 1 the entry hashes in order, of scheme 2 the leaves in any order */
export function versionHashText(scheme: HashScheme, headerHash: string, leaves: readonly string[]): string {
  const lines = scheme === 1 ? leaves : [...leaves].sort();
  return [`dawnpeg-version-${scheme}`, headerHash, ...lines].map((line) => `${line}\n`).join('');
}
