import type { SharedItemType } from '#shared/contracts/sharing.js';
import { In, type EntityManager } from 'typeorm';
import { AttachmentEntity } from '../../db/entities/attachment.entity.js';
import { EntryEntity } from '../../db/entities/entry.entity.js';
import { SignEntity } from '../../db/entities/sign.entity.js';
import { FigureEntity } from '../../db/entities/figure.entity.js';

/** What things are called now, by id. A note, and what has no title, is called by nothing. */
export async function titlesOf(
  manager: EntityManager,
  items: readonly { itemType: SharedItemType; itemId: string }[],
): Promise<Map<string, string>> {
  const idsOf = (...types: SharedItemType[]) =>
    In(items.filter(({ itemType }) => types.includes(itemType)).map(({ itemId }) => itemId));
  const entries = await manager.findBy(EntryEntity, { id: idsOf('entry') });
  const figures = await manager.findBy(FigureEntity, { id: idsOf('figure', 'story') });
  const attachments = await manager.findBy(AttachmentEntity, { id: idsOf('attachment') });
  const signs = await manager.findBy(SignEntity, { id: idsOf('sign') });
  const titles = [
    ...entries.map(({ id, content }) => [id, content.titleOfficer] as const),
    ...figures.map(({ id, names }) => [id, names[0]?.name ?? ''] as const),
    ...signs.map(({ id, words }) => [id, words.name] as const),
    ...attachments.map(({ id, title }) => [id, title] as const),
  ];
  return new Map(titles.filter(([, title]) => title !== ''));
}
