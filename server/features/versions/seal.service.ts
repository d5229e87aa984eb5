import { entryBodyText, entryHashText, versionHashText } from '#shared/calendar/hash-text.js';
import type { VersionEntryBody, VersionHeader } from '#shared/contracts/versions.js';
import { canonicalJson } from '#shared/kernel/canonical-json.js';
import { createHash, randomBytes } from 'node:crypto';
import type { EntrySeal } from './versions.repository.js';

const SALT_BYTES = 16;

export interface SealedEntry extends EntrySeal {
  entryId: string;
  bodyText: string;
}

export interface SealedVersion {
  headerText: string;
  headerHash: string;
  hash: string;
  entries: SealedEntry[];
}

/** A stored version whose text and hashes do not belong together: somebody changed it past the product. */
class BrokenSealError extends Error {
  override readonly name = 'BrokenSealError';
}

/**
 * Freezes header and entries as text with their hashes. An entry that says exactly what an earlier submission said
 * keeps the salt of then, and with it the hash: the answers that elders gave to it stay valid. Everything else gets
 * a new random salt.
 */
export function seal(
  header: VersionHeader,
  bodies: readonly VersionEntryBody[],
  earlier: ReadonlyMap<string, readonly EntrySeal[]>,
): SealedVersion {
  const headerText = canonicalJson(header);
  const headerHash = sha256(headerText);
  const entries = bodies.map((body): SealedEntry => {
    const bodyText = entryBodyText(body);
    const kept = earlier
      .get(body.entryId)
      ?.find(({ salt, hash }) => sha256(entryHashText(salt, bodyText)) === hash);
    const salt = kept?.salt ?? randomBytes(SALT_BYTES).toString('hex');
    return { entryId: body.entryId, bodyText, salt, hash: sha256(entryHashText(salt, bodyText)) };
  });
  return { headerText, headerHash, hash: versionHash(headerHash, entries), entries };
}

/** Throws a BrokenSealError unless every hash can be made again from the stored texts. */
export function checkSeal(version: SealedVersion): void {
  const intact =
    sha256(version.headerText) === version.headerHash &&
    version.entries.every(({ salt, bodyText, hash }) => sha256(entryHashText(salt, bodyText)) === hash) &&
    versionHash(version.headerHash, version.entries) === version.hash;
  if (!intact) throw new BrokenSealError('A stored version does not match its hash.');
}

function versionHash(headerHash: string, entries: readonly { hash: string }[]): string {
  return sha256(
    versionHashText(
      headerHash,
      entries.map(({ hash }) => hash),
    ),
  );
}

function sha256(text: string): string {
  return createHash('sha256').update(text, 'utf8').digest('hex');
}
