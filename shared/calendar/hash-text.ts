import { canonicalJson } from '#shared/kernel/canonical-json.js';

/**
 * The exact texts over which a version's SHA-256 hashes go, so that anybody can compute them again from a print-out
 * and a standard tool. All texts are UTF-8, all hashes and salts lower-case hex, lines end in one line feed.
 *
 * - entry hash   = SHA-256( salt ⏎ canonical JSON of {entryId, content, dates} )
 * - header hash  = SHA-256( canonical JSON of the header )
 * - version hash = SHA-256( "dawnpeg-version-1" ⏎ header hash ⏎ entry hashes in order, each with ⏎ )
 *
 * The salt keeps the words of an entry that had to vanish from being guessed from the hash that stays.
 */
const VERSION_HASH_SCHEME = 'dawnpeg-version-1';

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

export function versionHashText(headerHash: string, entryHashes: readonly string[]): string {
  return [VERSION_HASH_SCHEME, headerHash, ...entryHashes].map((line) => `${line}\n`).join('');
}
