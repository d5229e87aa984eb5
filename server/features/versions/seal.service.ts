import {
  entryBodyText,
  entryHashText,
  leafText,
  versionHashText,
  type HashScheme,
} from '#shared/calendar/hash-text.js';
import type { FrozenVariant } from '#shared/contracts/variants.js';
import type { VersionEntryBody, VersionHeader } from '#shared/contracts/versions.js';
import { canonicalJson } from '#shared/kernel/canonical-json.js';
import { createHash, randomBytes, randomInt } from 'node:crypto';
import type { EntrySeal } from './versions.repository.js';

const SALT_BYTES = 16;

/** Leaves are filled up to a multiple of this, with at least one that belongs to nothing. */
const LEAVES_STEP = 16;
const RANK_STEP_MAX = 65_536;

export interface SealedEntry extends EntrySeal {
  entryId: string;
  bodyText: string;
  /** Null in versions of scheme 1. */
  rank: number | null;
  /** True where something was taken off it since. */
  redacted?: boolean;
}

/** A variant, sealed apart from its entry. */
export interface SealedVariant extends EntrySeal {
  entryId: string;
  variantId: string;
  position: number;
  bodyText: string;
  rank: number;
  redacted?: boolean;
}

export interface VariantBody extends FrozenVariant {
  entryId: string;
}

export interface SealedVersion {
  scheme: HashScheme;
  headerText: string;
  headerHash: string;
  hash: string;
  /** True where something was taken out of it since. */
  headerRedacted?: boolean;
  /** Null in a version of scheme 1 that is still whole. */
  leaves: string[] | null;
  entries: SealedEntry[];
  variants: SealedVariant[];
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
  variantBodies: readonly VariantBody[],
  earlier: ReadonlyMap<string, readonly EntrySeal[]>,
): SealedVersion {
  const headerText = canonicalJson(header);
  const headerHash = sha256(headerText);
  let rank = 0;
  const entries = bodies.map((body): SealedEntry & { rank: number } => {
    const bodyText = entryBodyText(body);
    const kept = earlier
      .get(body.entryId)
      ?.find(({ salt, hash }) => sha256(entryHashText(salt, bodyText)) === hash);
    const salt = kept?.salt ?? newSalt();
    rank += randomInt(1, RANK_STEP_MAX);
    return { entryId: body.entryId, bodyText, salt, hash: sha256(entryHashText(salt, bodyText)), rank };
  });
  const variants = variantBodies.map(({ entryId, variantId, content, dates }, position): SealedVariant => {
    const bodyText = canonicalJson({ entryId, variantId, content, dates });
    const salt = newSalt();
    rank += randomInt(1, RANK_STEP_MAX);
    const hash = sha256(entryHashText(salt, bodyText));
    return { entryId, variantId, position, bodyText, salt, hash, rank };
  });
  const leaves = filledUp(
    [...entries, ...variants].map((sealed) => sha256(leafText(sealed.rank, sealed.hash))),
  );
  return {
    scheme: 2,
    headerText,
    headerHash,
    hash: sha256(versionHashText(2, headerHash, leaves)),
    leaves,
    entries,
    variants,
  };
}

export function newSalt(): string {
  return randomBytes(SALT_BYTES).toString('hex');
}

/** Leaves of what was frozen and leaves of nothing, sorted together. */
function filledUp(leaves: readonly string[]): string[] {
  const length = (Math.floor(leaves.length / LEAVES_STEP) + 1) * LEAVES_STEP;
  const empty = Array.from({ length: length - leaves.length }, () => randomBytes(32).toString('hex'));
  return [...leaves, ...empty].sort();
}

/**
 * Throws a BrokenSealError unless every hash can be made again from the stored texts. What was withdrawn is not
 * among the entries any more; its leaf is.
 */
export function checkSeal(version: SealedVersion): void {
  const { scheme, headerText, headerHash, hash } = version;
  const leaves = leavesOf(version);
  const known = new Set(leaves);
  const ranks = version.entries.map(({ rank }) => rank ?? 0);
  const intact =
    (version.headerRedacted === true || sha256(headerText) === headerHash) &&
    ranks.every((rank, index) => scheme === 1 || rank > (ranks[index - 1] ?? 0)) &&
    [...version.entries, ...version.variants].every(
      (entry) =>
        (entry.redacted === true || sha256(entryHashText(entry.salt, entry.bodyText)) === entry.hash) &&
        known.has(leafOf(scheme, entry)),
    ) &&
    sha256(versionHashText(scheme, headerHash, leaves)) === hash;
  if (!intact) throw new BrokenSealError('A stored version does not match its hash.');
}

/** What the version's hash goes over. */
export function leavesOf({ leaves, entries }: Pick<SealedVersion, 'leaves' | 'entries'>): string[] {
  return leaves ?? entries.map(({ hash }) => hash);
}

function leafOf(scheme: HashScheme, { rank, hash }: Pick<SealedEntry, 'rank' | 'hash'>): string {
  return scheme === 1 ? hash : sha256(leafText(rank ?? 0, hash));
}

function sha256(text: string): string {
  return createHash('sha256').update(text, 'utf8').digest('hex');
}
