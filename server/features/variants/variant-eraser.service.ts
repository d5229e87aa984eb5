import type { EntityManager } from 'typeorm';
import { EntryVariantEntity } from '../../db/entities/entry-variant.entity.js';

/** Whose timing it is, is said no more; the timing stays. */
export async function takeNameOffVariant(manager: EntityManager, variantId: string): Promise<void> {
  const row = await manager.findOneBy(EntryVariantEntity, { id: variantId });
  if (row === null) return;
  const content = { ...row.content, giver: '', giverId: null };
  await manager.update(EntryVariantEntity, { id: variantId }, { content });
}
