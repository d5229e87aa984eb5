import type { Place } from '#shared/contracts/places.js';
import type { Client } from './api.js';

/** The first place of the client's village. */
export async function firstPlace(client: Client): Promise<Place> {
  const answer = await client.get(`/api/communities/${client.communityId}/places`).expect(200);
  const [first] = (answer.body as { items: Place[] }).items;
  if (!first) throw new Error('no place');
  return first;
}

/** Adds a place like the given one, with some changes. */
export async function addPlaceLike(officer: Client, like: Place, changes: Partial<Place>): Promise<Place> {
  const { id: _id, communityId: _communityId, version: _version, ...input } = like;
  const answer = await officer
    .post(`/api/communities/${officer.communityId}/places`, { ...input, ...changes })
    .expect(201);
  return answer.body as Place;
}
