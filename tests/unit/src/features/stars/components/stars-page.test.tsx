import { act, screen, within } from '@testing-library/react';
import { afterEach, beforeAll, beforeEach, describe, expect, it, vi } from 'vitest';
import { isGoodMarker } from '#src/features/stars/model/star-choice.js';
import { StarsPage } from '#src/features/stars/components/stars-page.js';
import { answerWith, type Sent } from '#tests/support/answers.js';
import { renderOnBoard } from '#tests/support/on-board.js';
import { starTable, TAZIMEL } from '#tests/support/stars-of-tazimel.js';

// Fifty rows of pictures in jsdom take seconds on a busy machine, a hundredth of that in a browser.
vi.setConfig({ testTimeout: 30_000 });

const communityPath = `/api/communities/${TAZIMEL.communityId}`;
const tables = new Map<number, Awaited<ReturnType<typeof starTable>>>();

beforeAll(async () => {
  for (const year of [2027, -43]) tables.set(year, await starTable(year));
}, 60_000);

beforeEach(() => {
  vi.useFakeTimers({ shouldAdvanceTime: true, now: new Date('2027-06-07T09:00:00Z') });
});

afterEach(() => {
  vi.useRealTimers();
  vi.unstubAllGlobals();
});

function serve(): Sent[] {
  return answerWith({
    [`GET ${communityPath}/places`]: { items: [TAZIMEL], nextCursor: null },
    [`GET /api/places/${TAZIMEL.id}/stars`]: (_: Sent, search: URLSearchParams) =>
      tables.get(Number(search.get('year'))),
  });
}

/** A screen of 1280 pixels: jsdom itself has none, and then the cards of a phone are shown. */
function onWideScreen() {
  vi.stubGlobal('matchMedia', () => ({
    matches: true,
    addEventListener: () => undefined,
    removeEventListener: () => undefined,
  }));
}

const open = (path = '/stars') => renderOnBoard(<StarsPage />, { path, pattern: '/stars' });
const rest = () => act(() => vi.advanceTimersByTimeAsync(400));
/** Read from the table itself: asking for roles goes through thousands of cells. */
const names = () => [...document.querySelectorAll('tbody th a')].map((link) => link.textContent);
const ready = () => vi.waitFor(() => expect(names().length).toBeGreaterThan(0));

describe('the table of stars', () => {
  it('has a lane in every row, a range under each date, and one sentence where there is no date', async () => {
    onWideScreen();
    serve();
    await open('/stars?show=all&q=polaris');
    const row = await screen.findByRole('row', { name: /Polaris/ });
    expect(within(row).getByRole('img', { name: /seen all night all year/ })).toBeTruthy();
    const sentence = within(row).getByText(/Never sets here: it stands in the north/);
    expect(sentence.getAttribute('colspan')).toBe('5');
  });

  it('never shows a date without its range', async () => {
    onWideScreen();
    serve();
    await open('/stars?q=pleiades');
    await ready();
    const table = screen.getByRole('table');
    const [, pleiades] = within(table).getAllByRole('row');
    if (!pleiades) throw new Error('no row');
    const cells = within(pleiades)
      .getAllByRole('cell')
      .map((cell) => cell.textContent.replaceAll('\u00a0', ' '));
    const occurrence = tables.get(2027)?.items.find((row) => row.markerKey === 'pleiades');
    expect(occurrence?.phenomena['heliacal-rising'].outcome).toBe('dated');
    for (const index of [1, 3, 4, 5]) {
      expect(cells[index]).toMatch(/^\d+ \w+\d+( \w+)? to \d+ \w+$/);
    }
  });

  it('shows fifty rows and as many more at a time', async () => {
    onWideScreen();
    serve();
    const { user } = await open('/stars?show=all');
    await ready();
    expect(names()).toHaveLength(50);
    expect(screen.getByText('Showing 50 of 836.')).toBeTruthy();
    await user.click(screen.getByText('Show 50 more'));
    expect(names()).toHaveLength(100);
  });

  it('sorts by its heads, and leaves those without a date last either way', async () => {
    onWideScreen();
    serve();
    const { user, address } = await open('/stars?q=alpha%20u');
    await ready();
    const head = (name: RegExp) => screen.getByRole('button', { name });
    expect([...names()].sort()).toEqual(['Dubhe', 'Polaris', 'Unukalhai']);
    // Polaris never sets here; magnitudes 1.8, 2.0 and 2.7.
    await user.click(head(/^Brightness/));
    expect(names()).toEqual(['Dubhe', 'Polaris', 'Unukalhai']);
    await user.click(head(/^Brightness/));
    expect(names()).toEqual(['Unukalhai', 'Polaris', 'Dubhe']);
    await user.click(head(/^First morning seen/));
    const forward = names();
    expect(forward.at(-1)).toBe('Polaris');
    await user.click(head(/^First morning seen/));
    expect(names()).toEqual([forward[1], forward[0], 'Polaris']);
    const column = screen.getByRole('columnheader', { name: /First morning seen/ });
    expect(column.getAttribute('aria-sort')).toBe('descending');
    await rest();
    expect(address()).toContain('sort=-heliacal-rising');
  });

  it.each([
    ['aldeb', 'Aldebaran'],
    ['alpha tau', 'Aldebaran'],
    ['α Tau', 'Aldebaran'],
    ['HR 1457', 'Aldebaran'],
    ['epsilon cygni', 'Epsilon Cygni'],
  ])('finds a star by %j', async (typed, expected) => {
    onWideScreen();
    serve();
    const { user } = await open('/stars?q=zzz');
    await screen.findByText('No star fits');
    await user.clear(screen.getByRole('searchbox'));
    await user.click(screen.getByRole('searchbox'));
    await user.paste(typed);
    expect(names()).toContain(expected);
    expect(names().length).toBeLessThan(8);
  });

  it('says what to do when nothing fits', async () => {
    onWideScreen();
    serve();
    const { user } = await open('/stars?q=zzz');
    await user.click(await screen.findByText('Show all stars'));
    expect(names()).toHaveLength(50);
  });

  it('takes a year as people write it, asks for it once, and says which calendar it is', async () => {
    onWideScreen();
    const log = serve();
    const { user, address } = await open('/stars?q=pleiades');
    await ready();
    const year = screen.getByRole('spinbutton', { name: 'Year' });
    await user.clear(year);
    await user.click(year);
    await user.paste('44 BC');
    await user.keyboard('{Enter}');
    await rest();
    await screen.findByRole('table', { name: /in 44 BC/ });
    expect(screen.getByText(/Julian calendar/)).toBeTruthy();
    expect(address()).toContain('year=-43');
    expect(log.filter(({ path }) => path.endsWith('/stars'))).toHaveLength(2);
  });
});

describe('the stars on a phone', () => {
  it('are cards with a lane and a sentence: when it comes back, and how long it was gone', async () => {
    serve();
    await open('/stars?q=pleiades');
    const heading = await screen.findByRole('heading', { name: 'Pleiades' });
    const card = heading.closest('article');
    expect(card?.textContent.replaceAll('\u00a0', ' ')).toMatch(
      /Comes back on the morning of about \d+ June, between \d+ and \d+ June, after about \d+ nights out of sight\./,
    );
    expect(card?.querySelector('svg[role="img"][aria-label*="2027"]')).not.toBeNull();
  });

  it('begin with good markers only', async () => {
    serve();
    await open();
    await screen.findByText('Pleiades');
    const good = tables.get(2027)?.items.filter(isGoodMarker).length ?? 0;
    expect(screen.getByText(`Showing 50 of ${good}.`)).toBeTruthy();
  });
});

describe('a village without a place', () => {
  it('is told the next step', async () => {
    answerWith({ [`GET ${communityPath}/places`]: { items: [], nextCursor: null } });
    await open();
    await screen.findByText('The dates need a watching place');
    expect(screen.getByRole('link', { name: 'Add the first place' }).getAttribute('href')).toBe(
      '/places/new',
    );
  });
});
