import { screen, within } from '@testing-library/react';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { StarPage } from '#src/features/stars/components/star-page.js';
import { answerWith, type Sent } from '#tests/support/answers.js';
import { OFFICER, renderOnBoard } from '#tests/support/on-board.js';
import { starDetail, TAZIMEL } from '#tests/support/stars-of-tazimel.js';

// Whole screens over real years of the sky: quick by themselves, slow on a busy machine.
vi.setConfig({ testTimeout: 20_000 });

const communityPath = `/api/communities/${TAZIMEL.communityId}`;

beforeEach(() => {
  vi.useFakeTimers({ shouldAdvanceTime: true, now: new Date('2027-06-07T09:00:00Z') });
});

afterEach(() => {
  vi.useRealTimers();
  vi.unstubAllGlobals();
});

async function open(markerKey: string, { year = 2027, session = OFFICER, state = '' } = {}) {
  answerWith({
    [`GET ${communityPath}/places`]: { items: [TAZIMEL], nextCursor: null },
    [`GET /api/places/${TAZIMEL.id}/stars/${markerKey}`]: (_: Sent, search: URLSearchParams) =>
      starDetail(markerKey, Number(search.get('year'))),
  });
  const view = await renderOnBoard(<StarPage notes={() => null} />, {
    session,
    path: `/stars/${markerKey}?year=${year}${state}`,
    pattern: '/stars/:markerKey',
  });
  await screen.findByRole('heading', { name: 'Its year, night by night' });
  return view;
}

const plain = (element: Element | null | undefined) => element?.textContent.replaceAll('\u00a0', ' ') ?? '';
const card = (title: string) => screen.getByRole('heading', { name: title }).closest('section');

describe('the page of a star', () => {
  it('tells dawn days as mornings and dusk days as evenings, each with its range', async () => {
    await open('pleiades');
    expect(plain(card('First morning seen'))).toMatch(/Morning of about \d+ Junebetween \d+ and \d+ June/);
    expect(plain(card('Last evening seen'))).toMatch(/Evening of about \d+ May/);
    expect(plain(card('Last evening rising'))).toMatch(/Evening of about \d+ November/);
    expect(plain(card('First morning setting'))).toMatch(/Morning of about \d+ \w+/);
    expect(plain(card('First morning seen'))).toContain('The trade says heliacal rising.');
  });

  it('agrees with the engine about the day, where to look and when to stop', async () => {
    const detail = await starDetail('pleiades', 2027);
    const [first] = detail.details['heliacal-rising'];
    await open('pleiades');
    const text = plain(card('First morning seen'));
    expect(text).toContain(`about ${Number(first?.expected.gregorian.slice(-2))} June`);
    expect(text).toContain(`Look east-north-east (${Math.round(first?.expected.starAzimuthDeg ?? 0)}°)`);
    expect(text).toContain(`Stop looking at ${first?.stopLookingAt ?? 'never'}.`);
    expect(text).toContain(`out of sight for about ${detail.nightsHidden ?? 0} nights`);
  });

  it('carries the cautions for eyes and for nights', async () => {
    await open('pleiades');
    expect(screen.getByText(/Never look at the Sun\..*no binoculars, no phone camera/)).toBeTruthy();
    expect(screen.getByText(/go in pairs/)).toBeTruthy();
  });

  it('has the year as a strip with a sentence, and the same as a table', async () => {
    const detail = await starDetail('pleiades', 2027);
    const { user } = await open('pleiades');
    expect(screen.getByRole('img', { name: /^Pleiades in 2027: .*hidden: not seen at all/ })).toBeTruthy();
    await user.click(screen.getByText('Show as a table'));
    const rows = within(screen.getByRole('table', { name: /The nights of 2027/ })).getAllByRole('row');
    expect(rows).toHaveLength(detail.strip.length + 1);
    const nights = rows.slice(1).map((row) => Number(within(row).getAllByRole('cell')[2]?.textContent));
    expect(nights.reduce((a, b) => a + b, 0)).toBe(365);
  });

  it('puts today’s peg into this year only', async () => {
    await open('pleiades');
    expect(screen.getByText(/Today’s peg stands at 7.June\./)).toBeTruthy();
  });

  it('says what the dates rest on', async () => {
    const { basis } = await starDetail('pleiades', 2027);
    await open('pleiades');
    const board = plain(screen.getByRole('heading', { name: 'What these dates rest on' }).closest('section'));
    expect(board).toContain('three-class rule');
    expect(board).toContain(basis.thresholdSource);
    expect(board).toContain(`engine ${basis.engineVersion}`);
    expect(board).toContain('altitude difference');
    expect(board).toContain('hazy in March, April, May, July and August');
    expect(board).toContain('Alcyone');
  });

  it('leads an officer to a calendar with the marker chosen, and nobody else', async () => {
    const { unmount } = await open('pleiades');
    expect(screen.getByRole('link', { name: 'Tie work to it' }).getAttribute('href')).toBe(
      '/calendars?marker=pleiades&phenomenon=heliacal-rising',
    );
    unmount();
    const observer = {
      ...OFFICER,
      memberships: [{ ...OFFICER.memberships?.[0], roles: ['observer' as const] }],
    } as typeof OFFICER;
    await open('pleiades', { session: observer });
    expect(screen.queryByRole('link', { name: /Tie work/ })).toBeNull();
  });

  it('has one sentence instead of days for a star that never sets', async () => {
    await open('hr424');
    expect(screen.getByText(/Never sets here: it stands in the north whenever it is dark/)).toBeTruthy();
    expect(screen.queryByRole('heading', { name: 'First morning seen' })).toBeNull();
    expect(screen.queryByRole('link', { name: /Tie work/ })).toBeNull();
    expect(screen.getByText(/it stands on another side of the pole in each month/)).toBeTruthy();
    expect(screen.getByRole('link', { name: 'Stars that serve here' })).toBeTruthy();
  });

  it('shows Julian dates for ancient years and says so', async () => {
    const detail = await starDetail('hr2491', -43);
    const [first] = detail.details['heliacal-rising'];
    await open('hr2491', { year: -43 });
    expect(screen.getByText(/from Upper terraces, 44 BC/)).toBeTruthy();
    expect(screen.getByText(/Dates before 1583 are those of the Julian calendar/)).toBeTruthy();
    expect(plain(card('First morning seen'))).toContain(
      `about ${Number(first?.expected.julian.slice(-2))} July`,
    );
    expect(screen.queryByText(/Today’s peg/)).toBeNull();
  });

  it('counts what the hills do against flat ground', async () => {
    const detail = await starDetail('hr2326', 2027);
    const [first] = detail.details['heliacal-rising'];
    const days = (first?.expected.dayNumber ?? 0) - (first?.flatExpected?.dayNumber ?? 0);
    expect(days).toBeGreaterThan(0);
    await open('hr2326');
    expect(plain(card('First morning seen'))).toContain(
      `the hills make it ${days} ${days === 1 ? 'day' : 'days'} later.`,
    );
  });
});
