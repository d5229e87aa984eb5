import type { Variant } from '#shared/contracts/variants.js';
import type { DraftVariant } from './draft-variants.service.js';

export function toVariant({ row, dates }: DraftVariant, updatedByName: string, mine: boolean): Variant {
  return {
    variantId: row.id,
    entryId: row.entryId,
    content: row.content,
    dates,
    updatedBy: updatedByName,
    updatedAt: row.updatedAt.toISOString(),
    mine,
    version: row.version,
  };
}
