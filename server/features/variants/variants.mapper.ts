import type { Variant, VariantInput } from '#shared/contracts/variants.js';
import type { DraftVariant } from './draft-variants.service.js';

/** @param content with its giver named as they wish */
export function toVariant(
  { row, dates }: DraftVariant,
  content: VariantInput,
  updatedByName: string,
  mine: boolean,
): Variant {
  return {
    variantId: row.id,
    entryId: row.entryId,
    content,
    dates,
    updatedBy: updatedByName,
    updatedAt: row.updatedAt.toISOString(),
    mine,
    version: row.version,
  };
}
