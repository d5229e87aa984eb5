import { act, screen } from '@testing-library/react';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { NewPlacePage } from '#src/features/places/components/new-place-page.js';
import { answerWith } from '#tests/support/answers.js';
import { OFFICER, renderOnBoard } from '#tests/support/on-board.js';
import { skylineEffects, TAZIMEL } from '#tests/support/stars-of-tazimel.js';

// Whole screens over real years of the sky: quick by themselves, slow on a busy machine.
vi.setConfig({ testTimeout: 20_000 });

const communityPath = `/api/communities/${TAZIMEL.communityId}`;

beforeEach(() => {
  vi.useFakeTimers({ shouldAdvanceTime: true, now: new Date('2027-06-07T09:00:00Z') });
  localStorage.clear();
});

afterEach(() => {
  vi.useRealTimers();
  vi.unstubAllGlobals();
});

describe('a new place', () => {
  it('takes both coordinates from one field, finds its clock, and opens once it is saved', async () => {
    const log = answerWith({
      [`GET ${communityPath}/places`]: { items: [], nextCursor: null },
      [`POST ${communityPath}/places`]: ({ body }: { body: unknown }) => ({
        ...TAZIMEL,
        ...(body as object),
      }),
      [`POST ${communityPath}/skyline-effects`]: { items: skylineEffects(2027), nextCursor: null },
      'GET /api/time-zone': { timeZone: 'Africa/Maputo' },
    });
    const { user, address } = await renderOnBoard(<NewPlacePage />, {
      path: '/places/new',
      pattern: '/places/new',
    });
    await user.click(screen.getByLabelText('Name of the place'));
    await user.paste('The old well');
    await user.click(screen.getByLabelText('Latitude'));
    await user.paste('12° 30′ S, 39 15 E');
    await user.click(screen.getByLabelText('Height, metres'));
    await user.paste('1240');
    expect(screen.getByLabelText<HTMLInputElement>('Longitude').value).toBe('39 15 E');
    await act(() => vi.advanceTimersByTimeAsync(1000));
    await screen.findByText('Africa/Maputo');
    expect(screen.getByText('UTC+2 all year')).toBeTruthy();
    await user.click(screen.getByRole('button', { name: 'Save the place' }));
    await vi.waitFor(() => expect(address()).toBe(`/places/${TAZIMEL.id}`));
    const [sent] = log.filter(({ method, path }) => method === 'POST' && path.endsWith('/places'));
    expect(sent?.body).toMatchObject({
      name: 'The old well',
      latitudeDeg: -12.5,
      longitudeDeg: 39.25,
      elevationM: 1240,
      timeZone: 'Africa/Maputo',
      skyline: [],
    });
  });

  it('names every field that is missing, and sends nothing', async () => {
    const log = answerWith({ [`GET ${communityPath}/places`]: { items: [], nextCursor: null } });
    const { user } = await renderOnBoard(<NewPlacePage />, { path: '/places/new', pattern: '/places/new' });
    await user.click(screen.getByRole('button', { name: 'Save the place' }));
    expect(screen.getByText('Fill this in.')).toBeTruthy();
    expect(screen.getByText('Write the latitude, such as 12° 30′ S or −12.5.')).toBeTruthy();
    expect(screen.getByText('Write the longitude, such as 39° 15′ E or 39.25.')).toBeTruthy();
    expect(screen.getByText('Write the height above the sea in metres; a rough one will do.')).toBeTruthy();
    expect(document.activeElement).toBe(screen.getByLabelText('Name of the place'));
    expect(log.filter(({ method }) => method === 'POST')).toEqual([]);
  });

  it('is an officer’s work', async () => {
    answerWith({ [`GET ${communityPath}/places`]: { items: [], nextCursor: null } });
    const elder = {
      ...OFFICER,
      memberships: [{ ...OFFICER.memberships?.[0], roles: ['elder' as const] }],
    } as typeof OFFICER;
    await renderOnBoard(<NewPlacePage />, { session: elder, path: '/places/new', pattern: '/places/new' });
    expect(screen.queryByLabelText('Latitude')).toBeNull();
  });
});
