import { ELDER_PIN_HEADER, ON_BEHALF } from '#shared/contracts/on-behalf.js';
import type { Endpoint } from '#shared/contracts/endpoint.js';
import { pin as pinShape } from '#shared/contracts/cards.js';
import type { Request } from 'express';
import type { DataSource } from 'typeorm';
import { admit, communityOf } from './access.js';
import { seesDrafts, type Actor, type Helped, type Person } from './actor.js';
import { AppError } from './app-error.js';

export interface HelpingRules {
  /** Null where this session helps nobody, or no longer. */
  helpedIn(request: Request, helper: Person): Promise<Helped | null>;
  /** @throws {AppError} for a wrong PIN, which is counted as at the door. */
  provePin(communityId: string, personId: string, pin: string): Promise<void>;
}

/** These are always the helper's own. */
const ABOUT_HELPING = new Set(['listHelpable', 'startHelping', 'endHelping']);

/**
 * For whom a call is made. While somebody is helped whose PIN was shown, everything is read as they see it; every write
 * is in their name, or refused. Without the PIN a helper reads as themself, and writes with their own eyes.
 */
export async function actorFor(
  dataSource: DataSource,
  rules: HelpingRules,
  endpoint: Endpoint,
  request: Request,
  person: Person,
  ids: Readonly<Record<string, string>>,
): Promise<Actor> {
  const { access } = endpoint;
  if (access.kind !== 'member') throw new TypeError(`${endpoint.id} is not for members`);
  const own = () => admit(dataSource, access, person, ids);
  const helped = ABOUT_HELPING.has(endpoint.id) ? null : await rules.helpedIn(request, person);
  if (helped === null) return own();
  if (endpoint.method === 'GET') {
    const isThere = (await communityOf(dataSource, access.scope, ids)) === helped.communityId;
    if (!helped.shownPin || !isThere) return own();
    expectNoPasswordNeeded(endpoint);
    return inTheNameOf(dataSource, endpoint, helped, person, ids);
  }
  const rule = ON_BEHALF[endpoint.id];
  if (rule === undefined) {
    // A stranger to what is asked for learns nothing of it, helping or not.
    await own();
    throw new AppError('not-allowed', { reason: 'not-while-helping' });
  }
  const itself = helped.shownPin ? null : await own();
  if (itself !== null && (rule !== 'word' || !seesDrafts(itself))) {
    throw new AppError('not-allowed', { reason: 'pin-not-shown' });
  }
  const actor = await inTheNameOf(dataSource, endpoint, helped, person, ids);
  const helper = { id: person.id, shownPin: helped.shownPin, provedNow: false };
  const eyes = itself === null ? null : { personId: person.id, roles: itself.roles };
  const pin = pinShape.safeParse(request.get(ELDER_PIN_HEADER));
  if (rule === 'pin-again' && pin.success) {
    await rules.provePin(helped.communityId, helped.person.id, pin.data);
    helper.provedNow = true;
  }
  return { ...actor, helper: { ...helper, eyes } };
}

async function inTheNameOf(
  dataSource: DataSource,
  { access }: Endpoint,
  helped: Helped,
  helper: Person,
  ids: Readonly<Record<string, string>>,
): Promise<Actor> {
  if (access.kind !== 'member') throw new TypeError('Only members are helped');
  const person = { ...helped.person, byCardIn: helped.communityId };
  const actor = await admit(dataSource, access, person, ids, helped.roles);
  const { shownPin } = helped;
  return { ...actor, helper: { id: helper.id, shownPin, provedNow: false, eyes: null } };
}

/** Helping opens no more than the helped person's card does. */
function expectNoPasswordNeeded({ needsPassword }: Endpoint): void {
  if (needsPassword) throw new AppError('not-allowed', { reason: 'needs-password' });
}
