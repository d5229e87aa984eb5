import type { Calendar, EntryList } from '#shared/contracts/calendars.js';
import type { Page } from '@playwright/test';
import { expect } from '@playwright/test';
import { withoutSigns } from './event-record.js';

/** Where the newest submission of the demo's calendar for 2027 is. */
export async function reviewPath(page: Page): Promise<string> {
  const { items } = (await (await page.request.get('/api/calendars')).json()) as { items: Calendar[] };
  const calendar = items.find(({ year }) => year === 2027);
  return `/calendars/${calendar?.id ?? ''}/versions/${calendar?.outNumber ?? 0}`;
}

/** What somebody asks of the server, without a screen. */
export async function ask(
  page: Page,
  method: 'post' | 'delete',
  path: string,
  data: object = {},
): Promise<unknown> {
  const session = (await (await page.request.get('/api/session')).json()) as { csrfToken: string };
  const headers = { 'x-csrf-token': session.csrfToken };
  const answer = await page.request[method](`/api${path}`, { data, headers });
  expect(answer.ok(), `${method} ${path}`).toBe(true);
  return answer.status() === 204 ? undefined : answer.json();
}

/**
 * A submission in review with new entries that nobody has answered, like the draft's first one and with all that a new entry
 * has to say. For the officer's page; the villages are the journey's own.
 */
export async function openReview(page: Page, added: number): Promise<string> {
  const path = await reviewPath(page);
  const calendarPath = path.replace(/\/versions.*/u, '');
  if (!path.endsWith('/0')) {
    await ask(page, 'post', `${path}/changes-asked`, { reason: 'taken-back', note: '' });
  }
  const { items } = (await (await page.request.get(`/api${calendarPath}/entries`)).json()) as EntryList;
  const like = { ...items[0]?.content, crop: 'all crops', record: withoutSigns() };
  for (let entry = 0; entry < added; entry += 1) await ask(page, 'post', `${calendarPath}/entries`, like);
  await ask(page, 'post', `${calendarPath}/versions`);
  return reviewPath(page);
}

export const JOURNEY_PIN = '4711';

/** A card with its PIN for an elder; the page is the steward's. */
export async function giveCard(page: Page, elderName: string): Promise<string> {
  const session = (await (await page.request.get('/api/session')).json()) as {
    memberships: { communityId: string }[];
  };
  const home = `/communities/${session.memberships[0]?.communityId ?? ''}`;
  const { items } = (await (await page.request.get(`/api${home}/cards`)).json()) as {
    items: { personId: string; displayName: string }[];
  };
  const elder = items.find(({ displayName }) => displayName === elderName);
  const made = await ask(page, 'post', `${home}/people/${elder?.personId ?? ''}/card`);
  return (made as { code: string }).code;
}
