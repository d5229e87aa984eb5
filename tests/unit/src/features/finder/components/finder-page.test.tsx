import { screen, waitFor, within } from '@testing-library/react';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import type { Place } from '#shared/contracts/places.js';
import { FinderPage } from '#src/features/finder/components/finder-page.js';
import { answerWith, type Sent } from '#tests/support/answers.js';
import { found, markerNames, skySigns, years } from '#tests/support/finder-of-tazimel.js';
import { OFFICER, renderOnBoard } from '#tests/support/on-board.js';
import { TAZIMEL } from '#tests/support/stars-of-tazimel.js';

// Whole screens over a real year of the sky: quick by themselves, slow on a busy machine.
vi.setConfig({ testTimeout: 30_000 });

const OBSERVER = {
  ...OFFICER,
  memberships: [{ ...OFFICER.memberships?.[0], roles: ['observer' as const] }],
} as typeof OFFICER;
const FAR_NORTH: Place = { ...TAZIMEL, latitudeDeg: 66, longitudeDeg: 14, skyline: [], name: 'Far north' };

beforeEach(() => {
  vi.useFakeTimers({ shouldAdvanceTime: true, now: new Date('2027-06-07T09:00:00Z') });
});
afterEach(() => {
  vi.useRealTimers();
  vi.unstubAllGlobals();
});

async function open(query: string, { session = OFFICER, place = TAZIMEL } = {}) {
  const sent = answerWith({
    [`GET /api/communities/${TAZIMEL.communityId}/places`]: { items: [place], nextCursor: null },
    [`GET /api/places/${TAZIMEL.id}/finder`]: (_: Sent, search: URLSearchParams) => found(search, place),
    [`GET /api/places/${TAZIMEL.id}/finder/names`]: () => markerNames(),
    [`GET /api/places/${TAZIMEL.id}/sky-markers`]: (_: Sent, search: URLSearchParams) =>
      skySigns(search, place),
    [`POST /api/places/${TAZIMEL.id}/finder/years`]: ({ body }: Sent) => years(body, place),
  });
  const view = await renderOnBoard(<FinderPage />, { session, path: `/finder?${query}`, pattern: '/finder' });
  return { ...view, sent };
}
const plain = (element: Element | null | undefined) => element?.textContent.replaceAll('\u00a0', ' ') ?? '';
const cards = async () =>
  (await screen.findByRole('region', { name: 'To go by' })).querySelectorAll('li article, li > section');

describe('which sign falls near a day', () => {
  it('shows signs as cards, the best first, each with a range and the three things that decide', async () => {
    await open('year=2027&from=06-10');
    const [best] = await cards();
    const { items } = await found(new URLSearchParams('year=2027&from=06-10'));
    expect(plain(best)).toContain(items[0]?.name ?? 'nothing');
    expect(plain(best)).toMatch(/(Morning|Evening) of about \d+ June/);
    expect(plain(best)).toMatch(/between \d+ and \d+ June/);
    expect(plain(best)).toMatch(/your day/);
    expect(plain(best)).toMatch(/within \d+ days/);
    expect(plain(best)).toMatch(/bright|shape/);
  });

  it('gives every picture a sentence with the sign’s days and the wanted ones', async () => {
    await open('year=2027&from=06-10');
    const [best] = await cards();
    const picture = within(best as HTMLElement).getByRole('img');
    expect(picture.getAttribute('aria-label')).toMatch(/of about .* between .*\. Wanted: 10.June\./);
  });

  it('asks again when the day is changed, and keeps the question in the address', async () => {
    const { user, address, sent } = await open('year=2027&from=06-10');
    await cards();
    await user.selectOptions(screen.getByRole('combobox', { name: 'Month' }), 'March');
    await waitFor(() => {
      expect(address()).toContain('from=03-10');
      expect(screen.getByText(/signs within twenty days of 10.March/)).toBeTruthy();
    });
    expect(sent.filter(({ path }) => path.endsWith('/finder')).length).toBe(2);
  });

  it('leads an officer to a calendar with the sign, and an observer only to the star', async () => {
    const { unmount } = await open('year=2027&from=06-10');
    const { items } = await found(new URLSearchParams('year=2027&from=06-10'));
    const [link] = await screen.findAllByRole('link', { name: /^Tie work to/ });
    expect(link?.getAttribute('href')).toBe(
      `/calendars?marker=${items[0]?.markerKey ?? ''}&phenomenon=${items[0]?.phenomenon ?? ''}`,
    );
    unmount();
    await open('year=2027&from=06-10', { session: OBSERVER });
    await cards();
    expect(screen.queryByRole('link', { name: /^Tie work to/ })).toBeNull();
    expect(screen.getAllByRole('link', { name: /^The page of/ }).length).toBeGreaterThan(0);
  });

  it('leads back to the entry that asked, with the sign', async () => {
    await open('year=2027&from=06-10&calendar=c-1&entry=e-1');
    const [link] = await screen.findAllByRole('link', { name: /^Take .* for the entry$/ });
    expect(link?.getAttribute('href')).toMatch(/^\/calendars\/c-1\?entry=e-1&marker=.*&phenomenon=.*/);
    expect(screen.getByRole('link', { name: 'Back' }).getAttribute('href')).toBe('/calendars/c-1?entry=e-1');
  });
});

describe('an old sign', () => {
  it('is told with its day of old, its day now and how far it moved; then what falls on its old day', async () => {
    await open('year=2027&by=old&old=pleiades&its=heliacal-rising&since=1100');
    const heading = await screen.findByRole('heading', { name: 'What has become of the old sign' });
    const board = plain(heading.closest('section'));
    expect(board).toMatch(/In 1100on the morning of about \d+ May, between/);
    expect(board).toMatch(/In 2027on the morning of about \d+ June, between/);
    expect(board).toMatch(/It has moved 1[1-4] days later/);
    expect(board).toMatch(/by the Julian calendar/);
    expect((await cards()).length).toBeGreaterThan(0);
  });

  it('is asked for before anything is looked up', async () => {
    const { sent } = await open('by=old');
    expect(await screen.findByText(/Choose the star or figure that people used to go by/)).toBeTruthy();
    expect(sent.some(({ path }) => path.endsWith('/finder'))).toBe(false);
  });

  it('that had no day here says why, and what to ask instead', async () => {
    await open('year=2027&by=old&old=hr424&since=1500');
    expect(await screen.findByText(/It had no such day here in 1500\. It never set\./)).toBeTruthy();
    expect(screen.getByText(/Give the day of the work instead/)).toBeTruthy();
  });
});

describe('where no star serves', () => {
  it('says that the nights are light, why bright stars do not help, and what to go by instead', async () => {
    await open('year=2027&from=06-20', { place: FAR_NORTH });
    const heading = await screen.findByRole('heading', { name: /No easy star serves here near 20.June/ });
    const board = plain(heading.closest('section'));
    expect(board).toMatch(/the nights stay light: the Sun sinks only 1° below the horizon/);
    expect(board).toMatch(/\d+ never set here, \d+ never come up/);
    expect(board).toMatch(/The next sign after: .*, \d+ days after your day/);
    expect(board).toMatch(/Signs of the land: birds/);
  });

  it('offers the Sun’s own days near the wanted one, with a way into a calendar that carries the sign', async () => {
    await open('year=2027&from=06-20', { place: FAR_NORTH });
    const link = await screen.findByRole('link', { name: /Tie work to this sign: .*solstice/iu });
    const address = new URL(link.getAttribute('href') ?? '', 'http://board.example');
    expect(address.pathname).toBe('/calendars');
    expect(JSON.parse(address.searchParams.get('sky') ?? '')).toEqual({
      kind: 'sun-season',
      season: 'june-solstice',
    });
    expect(plain(link.closest('li'))).toMatch(/About 21 June, between 16 and 26 June1 day after your day/);
  });

  it('keeps such signs closed, and unasked for, where stars serve', async () => {
    const { user, sent } = await open('year=2027&from=06-10');
    await cards();
    expect(sent.some(({ path }) => path.endsWith('/sky-markers'))).toBe(false);
    await user.click(screen.getByText('Sun, nights and stars at an hour'));
    expect((await screen.findAllByRole('link', { name: /^Tie work to this sign/ })).length).toBeGreaterThan(
      2,
    );
  });
});

describe('the coming years', () => {
  it('are looked through a few at a time, and told as a table', async () => {
    const { user, sent } = await open('year=2027&from=06-10');
    await cards();
    await user.click(screen.getByRole('button', { name: 'Look through the years' }));
    const table = await screen.findByRole('table', { name: 'The first signs in the years 2027 to 2036' });
    expect(within(table).getAllByText(/in \d+ of 10 years/).length).toBeGreaterThan(3);
    expect(sent.filter(({ method }) => method === 'POST').length).toBe(2);
  });

  it('can be stopped; what came through stays', async () => {
    const { user, sent } = await open('year=2027&from=06-10');
    await cards();
    await user.click(screen.getByText('40 years'));
    await user.click(screen.getByRole('button', { name: 'Look through the years' }));
    await user.click(await screen.findByRole('button', { name: 'Stop' }));
    expect(await screen.findByText(/Stopped after \d+ years?\./)).toBeTruthy();
    const asked = sent.filter(({ method }) => method === 'POST').length;
    expect(asked).toBeLessThan(8);
  });
});
