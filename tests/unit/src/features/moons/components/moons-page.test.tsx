import { screen, waitFor, within } from '@testing-library/react';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { moonQuestion, type MoonTable } from '#shared/contracts/moons.js';
import { MoonsService } from '#server/features/moons/moons.service.js';
import { SkyYearsService } from '#server/features/stars/sky-years.service.js';
import { MoonsPage } from '#src/features/moons/components/moons-page.js';
import { answerWith, type Sent } from '#tests/support/answers.js';
import { renderOnBoard } from '#tests/support/on-board.js';
import { TAZIMEL } from '#tests/support/stars-of-tazimel.js';
import { watchedPlaces } from '#tests/support/watched-places.js';

// Real Moons of real years: quick by themselves, slow on a busy machine.
vi.setConfig({ testTimeout: 20_000 });

beforeEach(() => {
  vi.useFakeTimers({ shouldAdvanceTime: true, now: new Date('2027-06-07T09:00:00Z') });
});
afterEach(() => {
  vi.useRealTimers();
  vi.unstubAllGlobals();
});

const service = new MoonsService(watchedPlaces(TAZIMEL), new SkyYearsService());
const tableFor = (search: URLSearchParams): Promise<MoonTable> =>
  service.read({} as never, TAZIMEL.id, moonQuestion.parse(Object.fromEntries(search)));

async function open(query = 'year=2027') {
  answerWith({
    [`GET /api/communities/${TAZIMEL.communityId}/places`]: { items: [TAZIMEL], nextCursor: null },
    [`GET /api/places/${TAZIMEL.id}/moons`]: (_: Sent, search: URLSearchParams) => tableFor(search),
  });
  const view = await renderOnBoard(<MoonsPage />, { path: `/stars/moons?${query}` });
  await screen.findByRole('heading', { name: 'The year’s Moons' });
  return view;
}

const plain = (text: string | null | undefined): string => (text ?? '').replaceAll('\u00a0', ' ');

describe('the page of Moons', () => {
  it('says when to go out for the next first crescent, in words only', async () => {
    await open();
    const card = screen.getByRole('heading', { name: 'Next first crescent' }).closest('section');
    expect(plain(card?.textContent)).toMatch(/Evening of about \d+ July/);
    expect(plain(card?.textContent)).toMatch(/easy|if the air is clear/);
    expect(plain(card?.textContent)).toMatch(/Look west.*best at \d\d:\d\d; sunset is at \d\d:\d\d/);
  });

  it('draws a row for each Moon with a sentence, and the same Moons as a table', async () => {
    const { user } = await open();
    const { moons } = await tableFor(new URLSearchParams('year=2027'));
    expect(screen.getAllByRole('img', { name: /new Moon \d+.*full Moon \d+/u })).toHaveLength(moons.length);
    await user.click(screen.getByText('Show as a table'));
    const table = screen.getByRole('table', { name: 'Moons of 2027 at Upper terraces' });
    expect(within(table).getAllByRole('row')).toHaveLength(moons.length + 1);
  });

  it('names the thirteenth month and the doubt about it', async () => {
    await open();
    expect(plain(document.body.textContent)).toMatch(
      /has a thirteenth month: it begins on the evening of about/,
    );
    expect(screen.getByRole('img', { name: /^Thirteenth month: new Moon/ })).toBeTruthy();
  });

  it('counts by another sign and keeps the choice in the address', async () => {
    const { user, address } = await open();
    await user.click(screen.getByText('How the months are counted'));
    await user.selectOptions(screen.getByLabelText('Counted from'), 'Sirius');
    await waitFor(() => {
      expect(plain(document.body.textContent)).toMatch(/Sirius, first morning seen: about \d+ July/);
    });
    expect(address()).toContain('count=hr2491');
    await user.selectOptions(screen.getByLabelText('Counted from'), 'Do not count months');
    expect(await screen.findByText('The Moons are not counted.')).toBeTruthy();
    expect(screen.queryByRole('img', { name: /^Month \d/ })).toBeNull();
  });

  it('gives Venus its days, and says why it has none', async () => {
    await open('year=2026');
    const card = screen.getByRole('heading', { name: 'Venus this year' }).closest('section');
    expect(plain(card?.textContent)).toMatch(/First morningMorning: about 27 October/);
    expect(plain(card?.textContent)).toContain('None in 2026: Venus takes about nineteen months');
  });

  it('carries the cautions for eyes and nights, and leads to the file with its citation', async () => {
    await open();
    expect(screen.getByText(/Never look for the Moon or Venus while any part of the Sun is up/)).toBeTruthy();
    expect(screen.getByText(/go in pairs/)).toBeTruthy();
    expect(screen.getByRole('link', { name: 'These Moons as a CSV file' }).getAttribute('href')).toContain(
      '/moons.csv?year=2027&marker=pleiades',
    );
  });
});
