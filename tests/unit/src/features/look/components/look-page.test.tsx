import { screen, within } from '@testing-library/react';
import { afterEach, describe, expect, it, vi } from 'vitest';
import type { Place } from '#shared/contracts/places.js';
import { LookPage } from '#src/features/look/components/look-page.js';
import { answerWith, type Sent } from '#tests/support/answers.js';
import { lookAtPlace } from '#tests/support/look-of-tazimel.js';
import { renderOnBoard } from '#tests/support/on-board.js';
import { TAZIMEL } from '#tests/support/stars-of-tazimel.js';

// Whole screens over real years of the sky: quick by themselves, slow on a busy machine.
vi.setConfig({ testTimeout: 20_000 });

afterEach(() => {
  vi.unstubAllGlobals();
});

const NOW = new Date('2027-06-01T09:00:00Z');

async function open(search: string, place: Place = TAZIMEL) {
  answerWith({
    [`GET /api/communities/${TAZIMEL.communityId}/places`]: { items: [place], nextCursor: null },
    [`GET /api/places/${place.id}/look`]: (_: Sent, query: URLSearchParams) => lookAtPlace(place, query, NOW),
  });
  return renderOnBoard(<LookPage />, { path: `/look?${search}`, pattern: '/look' });
}
const plain = () => document.querySelector('main')?.textContent.replaceAll('\u00a0', ' ') ?? '';

describe('where to look on a first morning', () => {
  it('says when to stop, when and where to look, and from when to when it is seen', async () => {
    const look = await lookAtPlace(
      TAZIMEL,
      new URLSearchParams({ marker: 'pleiades', date: '2027-06-10' }),
      NOW,
    );
    await open('marker=pleiades&date=2027-06-10');
    expect(await screen.findByText(`Stop at ${look.limitAt ?? '—'}`)).toBeTruthy();
    expect(plain()).toContain('Thursday 10 June 2027');
    expect(plain()).toContain(
      `Look for Pleiades at about ${look.best?.localTime ?? '—'} in the east-north-east`,
    );
    expect(plain()).toContain(`seen from ${look.seenFromAt ?? '—'} to ${look.seenToAt ?? '—'}`);
  });

  it('draws the way with a spoken summary, and has the same as a table', async () => {
    const { user } = await open('marker=pleiades&date=2027-06-10');
    const picture = await screen.findByRole('img', {
      name: /Pleiades over the skyline.*Stop looking at \d\d:\d\d/,
    });
    expect(picture).toBeTruthy();
    await user.click(screen.getByText('Show as a table'));
    const table = screen.getByRole('table', { name: /Where Pleiades stands/ });
    expect(within(table).getAllByRole('row').length).toBeGreaterThan(10);
    expect(within(table).getAllByText('yes').length).toBeGreaterThan(2);
    expect(within(table).getAllByText('behind the skyline').length).toBeGreaterThan(2);
  });

  it('says what the thick line goes by, what had to be changed for it and what the model says by itself', async () => {
    const { user } = await open('marker=pleiades&date=2027-06-10');
    await user.click(await screen.findByText('How the thick line is reckoned'));
    expect(plain()).toMatch(
      /set so that Pleiades just shows on the day that the village’s rule gives: first morning seen, about \d+ June 2027/,
    );
    expect(plain()).toMatch(/by [\d.]+ magnitudes;|next to nothing/);
    expect(plain()).toMatch(/Left to itself the model would (?:not show it|show it from)/);
  });

  it('says why a star without such a day goes by the rule of the dates', async () => {
    const north = { ...TAZIMEL, latitudeDeg: 66, longitudeDeg: 23, timeZone: 'Europe/Stockholm' };
    const { user } = await open('marker=hr7001&date=2027-11-10', north);
    await user.click(await screen.findByText('How the thick line is reckoned'));
    expect(plain()).toContain('By the village’s rule for dates. The star has no first or last day here');
  });

  it('names the planet beside it, stars to start from, the Moon and the season', async () => {
    await open('marker=pleiades&date=2027-06-10');
    await screen.findByText('Not to be taken for it');
    expect(plain()).toMatch(/Venus is brighter and stands half a hand below and to the right of Pleiades/);
    expect(plain()).toMatch(/Hamal, in the east-north-east: from it go 2½ hands down/);
    expect(plain()).toContain('A growing crescent, not up while you look.');
    expect(plain()).toMatch(/the days of its first morning: about \d+ June, between \d+ and \d+ June/);
  });

  it('carries the cautions and offers the card of that day', async () => {
    await open('marker=pleiades&date=2027-06-10');
    const card = await screen.findByRole('link', { name: 'Print a card to take along' });
    expect(card.getAttribute('href')).toBe(
      `/api/places/${TAZIMEL.id}/look.pdf?marker=pleiades&phenomenon=heliacal-rising&date=2027-06-10`,
    );
    expect(plain()).toContain('Never look at the Sun.');
    expect(plain()).toContain('Eyes only: no phone camera, no binoculars');
    expect(plain()).toContain('Go in pairs');
  });
});

describe('the day', () => {
  it('is stepped on and back, and the address follows', async () => {
    const { user, address } = await open('marker=pleiades&date=2027-06-10');
    await screen.findByText(/Thursday 10/);
    await user.click(screen.getByRole('button', { name: 'The next day' }));
    expect(await screen.findByText(/Friday 11/)).toBeTruthy();
    expect(address()).toContain('date=2027-06-11');
    await user.click(screen.getByRole('button', { name: 'The day before' }));
    expect(await screen.findByText(/Thursday 10/)).toBeTruthy();
  });

  it('without one in the address is the next that serves', async () => {
    await open('marker=pleiades');
    const look = await lookAtPlace(TAZIMEL, new URLSearchParams({ marker: 'pleiades' }), NOW);
    await screen.findByText(/Stop at/);
    expect(plain()).toContain(`${Number(look.date.slice(-2))} June 2027`);
  });

  it('may become an evening', async () => {
    const { user, address } = await open('marker=pleiades&date=2027-04-28');
    await screen.findByText(/Wednesday 28/);
    await user.click(screen.getByText('Another day, morning or evening'));
    await user.click(screen.getByRole('radio', { name: 'Evening' }));
    expect(await screen.findByText(/Begin at \d\d:\d\d/)).toBeTruthy();
    expect(address()).toContain('phenomenon=heliacal-setting');
    expect(address()).toContain('date=2027-04-28');
  });

  it('outside the season says when the next one is and leads there', async () => {
    const { user, address } = await open('marker=pleiades&date=2027-05-20');
    await screen.findByText(/is not above the skyline while people can look/);
    expect(plain()).toMatch(/It comes up at \d\d:\d\d, too late to look/);
    expect(plain()).toMatch(/First morning seen: about \d+ June.*That is still to come/);
    await user.click(screen.getByRole('button', { name: /^To \d+.June.2027$/ }));
    expect(address()).toMatch(/date=2027-06-\d\d/);
  });
});

describe('where the star never serves', () => {
  const north: Place = { ...TAZIMEL, latitudeDeg: 66, skyline: [] };

  it('says that it never sets, and offers another star', async () => {
    await open('marker=hr7001&date=2027-11-24', north);
    expect(await screen.findByText(/It never sets here and is no sign of the season/)).toBeTruthy();
    const other = screen.getByText(/Another star that serves here/).querySelector('a');
    expect(other?.getAttribute('href')).toMatch(/^\/look\?marker=.*&phenomenon=heliacal-rising&date=202/);
  });

  it('says that the Sun does not set, without a time to stop and without a card', async () => {
    await open('marker=hr2491&date=2027-06-20', north);
    expect(await screen.findByText(/The Sun does not set long enough/)).toBeTruthy();
    expect(screen.queryByText(/Stop at/)).toBeNull();
    expect(screen.queryByRole('link', { name: /Print/ })).toBeNull();
  });

  it('asks for a star where the address names none', async () => {
    await open('');
    expect(await screen.findByText('Choose a star first')).toBeTruthy();
  });
});
