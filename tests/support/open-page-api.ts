import type { OpenPageState } from '#shared/contracts/open-page.js';
import type { Client } from './api.js';

/** Switches the village's page for everybody on; answers with the key of its address. */
export async function switchOpenPageOn(client: Client, placeShown = 'name'): Promise<string> {
  const path = `/api/communities/${client.communityId}/open-page`;
  const answer = await client.put(path, { placeShown }).expect(200);
  return (answer.body as OpenPageState).key ?? '';
}
