import type { MadeCard } from '#shared/contracts/cards.js';
import type { Client, TestApi } from './api.js';

export const PIN = '4711';
export const WRONG_PIN = '9025';

/** Gives somebody a card and chooses its PIN, as they would on a phone. Answers its letters. */
export async function givePin(api: TestApi, steward: Client, personId: string): Promise<string> {
  const path = `/api/communities/${steward.communityId}/people/${personId}/card`;
  const { code } = (await steward.post(path).expect(201)).body as MadeCard;
  await (await api.visitor()).post('/api/session/card/pin', { code, pin: PIN }).expect(200);
  return code;
}
