import type { Client } from './api.js';

/** Takes a thing back for good; the answer is still to be looked at. */
export function withdraw(
  client: Client,
  itemType: string,
  itemId: string,
  changes: { leavesTrace?: boolean; askedById?: string } = {},
) {
  const path = `/api/communities/${client.communityId}/items/${itemType}/${itemId}/withdrawal`;
  return client.post(path, { leavesTrace: false, askedById: null, ...changes });
}
