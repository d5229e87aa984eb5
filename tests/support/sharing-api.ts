import { ItemSharingEntity } from '#server/db/entities/item-sharing.entity.js';
import { PLAIN_DETAILS, type Group, type SharingDetails } from '#shared/contracts/sharing.js';
import type { Client, TestApi } from './api.js';

/** Entries that a test writes into the tables itself, shared with the village as the product would. */
export async function shareWithVillage(
  { dataSource }: TestApi,
  communityId: string,
  entryIds: readonly string[],
): Promise<void> {
  await dataSource.getRepository(ItemSharingEntity).insert(
    entryIds.map((itemId) => ({
      itemType: 'entry' as const,
      itemId,
      communityId,
      level: 'open' as const,
      details: PLAIN_DETAILS,
      giverId: null,
      asked: null,
    })),
  );
}

export async function addGroup(founder: Client, name: string, members: readonly Client[]): Promise<Group> {
  const path = `/api/communities/${founder.communityId}/groups`;
  const body = { name, memberIds: members.map(({ personId }) => personId) };
  return (await founder.post(path, body).expect(201)).body as Group;
}

export function details(changes: Partial<SharingDetails> = {}): SharingDetails {
  return { ...PLAIN_DETAILS, ...changes };
}

export function sharingPath({ communityId }: Client, itemType: string, itemId: string): string {
  return `/api/communities/${communityId}/items/${itemType}/${itemId}/sharing`;
}
