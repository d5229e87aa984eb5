import type { AddedPerson, Role } from '#shared/contracts/people.js';
import type { Someone } from '../../docker-free-scripts/lib/visibility-rules.js';
import type { Client, TestApi } from './api.js';
import { DEMO_PASSWORD } from '#server/features/demo/demo-villages.data.js';
import { openVillage, type Village } from './calendar-api.js';

export interface LevelledPeople extends Village {
  staff: Client;
  observer: Client;
  officer2: Client;
  /** One browser for each relation to a thing: elder A-1 gives, A-2 comes after them. */
  people: Record<Someone, Client>;
}

/**
 * The demo village's people and two more, for everybody of the demo is something else besides: an elder who neither
 * gives nor belongs to the group, and an observer who does not.
 */
export async function openLevelledPeople(api: TestApi): Promise<LevelledPeople> {
  const village = await openVillage(api);
  const [staff, observer, officer2, visitor] = await Promise.all([
    api.signIn('staff'),
    api.signIn('observer'),
    api.signIn('officer2'),
    api.visitor(),
  ]);
  const plainObserver = await newcomer(api, village.steward, 'Talu', 'observer');
  const plainElder = await newcomer(api, village.steward, 'Elder A-4', 'elder');
  return {
    ...{ ...village, staff, observer, officer2 },
    people: {
      visitor,
      'officer of another village': officer2,
      observer: plainObserver,
      staff,
      officer: village.officer,
      steward: village.steward,
      elder: plainElder,
      'member of the group': observer,
      giver: village.elder,
      successor: village.elder2,
    },
  };
}

const PASSWORD = 'holes and pegs';
const addressOf = (name: string) => `${name.replace(/\W/gu, '')}@example.org`.toLowerCase();

async function newcomer(api: TestApi, steward: Client, name: string, role: Role): Promise<Client> {
  const email = addressOf(name);
  const path = `/api/communities/${steward.communityId}/people`;
  const added = (await steward.post(path, { email, displayName: name, roles: [role] }).expect(201))
    .body as AddedPerson;
  const browser = await api.visitor();
  const code = added.oneTimeCode;
  await browser.post('/api/session/code', { email, code, newPassword: PASSWORD }).expect(200);
  return browser;
}

/** Signs everybody in anew, on the day that the clock shows: older sessions are over. */
export async function signInAgain(
  api: TestApi,
  people: Record<Someone, Client>,
): Promise<Record<Someone, Client>> {
  const fresh: [string, Client][] = await Promise.all(
    Object.entries(people).map(async ([name, { session }]): Promise<[string, Client]> => {
      const browser = await api.visitor();
      const person = session.person;
      if (person !== null) {
        const isNew = person.email.endsWith('@example.org');
        const password = isNew ? PASSWORD : DEMO_PASSWORD;
        await browser.post('/api/session', { email: person.email, password }).expect(200);
      }
      return [name, browser];
    }),
  );
  return Object.fromEntries(fresh) as Record<Someone, Client>;
}
