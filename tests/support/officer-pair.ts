import type { Page } from '@playwright/test';
import { expect } from '@playwright/test';
import { withoutSigns } from './event-record.js';
import { signIn } from './journey-steps.js';

/** Calls the API with the sign-in of a page. */
export async function send<T>(
  page: Page,
  method: 'GET' | 'POST' | 'PUT',
  path: string,
  data?: unknown,
): Promise<T> {
  const session = (await (await page.request.get('/api/session')).json()) as { csrfToken: string };
  const options = { method, headers: { 'X-CSRF-Token': session.csrfToken } };
  const answer = await page.request.fetch(path, data === undefined ? options : { ...options, data });
  expect(answer.ok(), `${method} ${path}`).toBe(true);
  return (await answer.json()) as T;
}

interface Session {
  memberships: { communityId: string }[];
}
interface Listed<T> {
  items: T[];
}
type Person = { id: string; displayName: string; version: number };

/** Makes Irvel, of the staff of Upper Tazimel, an officer beside Beyno. */
export async function makeIrvelOfficer(steward: Page): Promise<void> {
  await signIn(steward, 'steward');
  const { memberships } = await send<Session>(steward, 'GET', '/api/session');
  const people = `/api/communities/${memberships[0]?.communityId ?? ''}/people`;
  const { items } = await send<Listed<Person>>(steward, 'GET', people);
  const irvel = items.find(({ displayName }) => displayName === 'Irvel');
  await send(steward, 'PUT', `${people}/${irvel?.id ?? ''}`, {
    roles: ['staff', 'officer'],
    version: irvel?.version,
  });
}

/** The officer begins an empty calendar. */
export async function beginEmptyCalendar(officer: Page, year: number): Promise<string> {
  const { memberships } = await send<Session>(officer, 'GET', '/api/session');
  const communityPath = `/api/communities/${memberships[0]?.communityId ?? ''}`;
  const { items } = await send<Listed<{ id: string }>>(officer, 'GET', `${communityPath}/places`);
  const { id } = await send<{ id: string }>(officer, 'POST', `${communityPath}/calendars`, {
    placeId: items[0]?.id,
    year,
  });
  return id;
}

/** Work on a fixed day; its days are the same in every year. */
export function putIn(
  officer: Page,
  calendarId: string,
  titleOfficer: string,
  day = 10,
): Promise<{ id: string }> {
  return send(officer, 'POST', `/api/calendars/${calendarId}/entries`, {
    ...{ titleOfficer, titleVillage: '', kind: 'farm', icon: 'sow', crop: '', notes: '', caution: '' },
    lead: { type: 'fixed-date', date: { month: 6, day }, source: 'the village' },
    offsets: { earliestDays: 0, bestFromDays: 2, bestToDays: 9, lastAdvisedDays: 14 },
    ...{ hasLastDate: false, lastDate: null, protectiveWatch: false, otherSigns: '', ifLate: '', giver: '' },
    ...{ agreedToPrint: false, sharingLevel: 'village' },
  });
}

/** Everything is said of every entry: elders may be asked about the draft. */
export async function sayEverything(officer: Page, calendarId: string): Promise<void> {
  for (const { id, version, content } of await draftOf(officer, calendarId)) {
    const said = { ...content, titleVillage: content.titleOfficer, crop: content.crop || 'millet' };
    await send(officer, 'PUT', `/api/calendars/${calendarId}/entries/${id}`, {
      version,
      content: { ...said, giver: 'Elder A-1', ifLate: 'Ask the office.', record: withoutSigns() },
    });
  }
}

export interface DraftLine {
  id: string;
  version: number;
  content: { titleOfficer: string; crop: string };
}

/** The draft as the server has it. */
export async function draftOf(officer: Page, calendarId: string): Promise<DraftLine[]> {
  return (await send<Listed<DraftLine>>(officer, 'GET', `/api/calendars/${calendarId}/entries`)).items;
}
