import type { NoticeInput, Weather } from '#shared/contracts/weather.js';
import type { Client } from './api.js';

/** A notice that holds at the moment of the tests; whole, ready to send. */
export function noticeInput(changes: Partial<NoticeInput> = {}): NoticeInput {
  return {
    text: 'Heavy rain from the west until the weekend. Keep seed dry.',
    issuer: 'National weather service',
    issuedOn: '2026-11-29',
    expiresOn: '2026-12-05',
    ...changes,
  };
}

export function weatherPath({ communityId }: Client): string {
  return `/api/communities/${communityId}/weather`;
}

export async function weatherOf(client: Client): Promise<Weather> {
  return (await client.get(weatherPath(client)).expect(200)).body as Weather;
}
