import type {
  Signature,
  VersionEntry,
  VersionEntryBody,
  VersionHeader,
  VersionSummary,
  VersionVariant,
} from '#shared/contracts/versions.js';
import type { FrozenVariant } from '#shared/contracts/variants.js';
import type { CalendarVersionEntity } from '../../db/entities/calendar-version.entity.js';
import type { VersionVariantEntity } from '../../db/entities/version-variant.entity.js';
import type { SignatureEntity } from '../../db/entities/signature.entity.js';
import type { VersionEntryEntity } from '../../db/entities/version-entry.entity.js';

/** The texts were written from these very types and are checked against their hash before they are read. */
export function toHeader(row: CalendarVersionEntity): VersionHeader {
  return JSON.parse(row.headerText) as VersionHeader;
}

export function toVersionEntry(row: VersionEntryEntity): VersionEntry {
  const { entryId, content, dates } = JSON.parse(row.bodyText) as VersionEntryBody;
  return {
    entryId,
    content,
    dates,
    position: row.position,
    salt: row.salt,
    hash: row.hash,
    rank: row.rank,
    redacted: row.redacted,
  };
}

/** Whether the village's board may go by it is for the policy to say. */
export function toVersionVariant(row: VersionVariantEntity): VersionVariant {
  const { variantId, content, dates } = JSON.parse(row.bodyText) as FrozenVariant;
  const { salt, hash, rank, redacted } = row;
  return { variantId, content, dates, forBoard: false, salt, hash, rank, redacted };
}

export function toSummary(
  row: CalendarVersionEntity,
  submittedByName: string,
  entryCount: number,
): VersionSummary {
  return {
    id: row.id,
    calendarId: row.calendarId,
    number: row.number,
    label: row.label,
    state: row.state,
    submittedBy: submittedByName,
    submittedAt: row.submittedAt.toISOString(),
    publishedAt: row.publishedAt?.toISOString() ?? null,
    entryCount,
    hash: row.hash,
  };
}

export function toSignature(row: SignatureEntity, names: ReadonlyMap<string, string>): Signature {
  return {
    personId: row.personId,
    displayName: names.get(row.personId) ?? '',
    role: row.role,
    signedAt: row.signedAt.toISOString(),
  };
}
