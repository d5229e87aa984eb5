import type { Entry, EntryInput } from '#shared/contracts/calendars.js';
import type { EventRecord } from '#shared/contracts/event-record.js';
import type { Sign, SignInput } from '#shared/contracts/signs.js';
import type { Client } from './api.js';
import { wholeRecord } from './event-record.js';

/** Wet soil, which the whole village knows; whole, ready to send. */
export function signInput(changes: Partial<SignInput> = {}): SignInput {
  return {
    type: 'soil',
    name: 'Wet to the hand',
    look: 'Soil sticks together at hand depth.',
    where: 'upper terraces',
    usual: null,
    stillSeen: 'yes',
    sharingLevel: 'village',
    ...changes,
  };
}

export function signsPath({ communityId }: Client): string {
  return `/api/communities/${communityId}/signs`;
}

export async function addSign(officer: Client, changes: Partial<SignInput> = {}): Promise<Sign> {
  return (await officer.post(signsPath(officer), signInput(changes)).expect(201)).body as Sign;
}

export async function markSeen(client: Client, { id }: Pick<Sign, 'id'>, day = '2026-11-29'): Promise<Sign> {
  const body = { day, who: 'Tirel' };
  return (await client.post(`${signsPath(client)}/${id}/seen`, body).expect(201)).body as Sign;
}

export async function signsOf(client: Client): Promise<Sign[]> {
  return ((await client.get(signsPath(client)).expect(200)).body as { items: Sign[] }).items;
}

/** A record that waits for signs of the list; what is typed beside their ids does not count. */
export function waitingFor(signs: readonly { id: string }[], needed = signs.length): EventRecord {
  const list = signs.map(({ id }) => ({
    ...{ type: 'bird' as const, name: 'typed', look: '', where: '', usual: null, stillSeen: null },
    sharedId: id,
  }));
  return wholeRecord({ signs: { list, needed, mustHave: 0 } });
}

/** A record that waits for one sign in the entry's own words. */
export function waitingForOwn(name = 'Foam on the stream'): EventRecord {
  const list = [{ type: 'water' as const, name, look: '', where: '', usual: null, stillSeen: null }];
  return wholeRecord({ signs: { list, needed: 1, mustHave: 0 } });
}

export function signNames({ content }: { content: Pick<EntryInput, 'record'> } | Entry): string[] {
  return (content.record?.signs.list ?? []).map(({ name }) => name);
}
