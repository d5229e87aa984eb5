import { screen, waitFor, within } from '@testing-library/react';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import type { CivilDay } from '#shared/contracts/stars.js';
import { AirPage } from '#src/features/air/components/air-page.js';
import { answerWith, type Sent } from '#tests/support/answers.js';
import { OFFICER, renderOnBoard } from '#tests/support/on-board.js';
import { starAir, TAZIMEL } from '#tests/support/stars-of-tazimel.js';

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

async function open(markerKey: string, year = 2027) {
  answerWith({
    [`GET ${communityPath}/places`]: { items: [TAZIMEL], nextCursor: null },
    [`GET /api/places/${TAZIMEL.id}/stars/${markerKey}/air`]: (_: Sent, search: URLSearchParams) =>
      starAir(markerKey, Number(search.get('year'))),
  });
  const view = await renderOnBoard(<AirPage />, {
    session: OFFICER,
    path: `/stars/${markerKey}/air?year=${year}`,
    pattern: '/stars/:markerKey/air',
  });
  await screen.findByRole('heading', { name: 'What the model rests on' });
  return view;
}

const plain = (element: Element | null | undefined) => element?.textContent.replaceAll('\u00a0', ' ') ?? '';
const board = (title: string) => screen.getByRole('heading', { name: title }).closest('section');
const dayOf = (day: CivilDay | null | undefined, label: 'gregorian' | 'julian' = 'gregorian') =>
  Number(day?.[label].slice(-2));

describe('the page of other air', () => {
  it('goes to another year, which then stands in the address', async () => {
    const { user, address } = await open('pleiades');
    await user.click(screen.getByRole('button', { name: 'One more' }));
    await waitFor(() => {
      expect(address()).toContain('year=2028');
      expect(screen.getByText(/Upper terraces, 2028/u)).toBeTruthy();
    });
  });

  it('has the village’s day with its range beside the model’s in each air', async () => {
    const { phenomena } = await starAir('pleiades', 2027);
    const [occurrence] = phenomena['heliacal-rising'].occurrences;
    await open('pleiades');
    const text = plain(board('First morning seen'));
    expect(text).toMatch(
      new RegExp(
        `Morning of about ${dayOf(occurrence?.rule?.expected)} \\w+, between ${dayOf(occurrence?.rule?.early)}`,
      ),
    );
    for (const clarity of ['clear', 'ordinary', 'hazy'] as const) {
      const day = occurrence?.byModel[clarity];
      expect(text).toMatch(
        new RegExp(
          `By the model, ${clarity} airmorning of ${dayOf(day)} \\w+, ${day?.minutes ?? NaN} minute`,
        ),
      );
    }
    expect(plain(board('Last evening seen'))).toMatch(/Evening of about/);
  });

  it('says where the width of the range comes from', async () => {
    await open('hr2491');
    expect(plain(board('First morning seen'))).toContain(
      'The range allows for 1.5° of the Sun’s depth to either side, as far as published sightings scatter.',
    );
  });

  it('says that published rules disagree, and sets them all side by side', async () => {
    const { phenomena } = await starAir('hr1457', 2027);
    const [occurrence] = phenomena['heliacal-rising'].occurrences;
    await open('hr1457');
    expect(screen.getByText(/Published rules and models disagree by several days/)).toBeTruthy();
    const text = plain(board('First morning seen'));
    expect(text).toContain('three-class rulein use here');
    expect(text).toMatch(
      new RegExp(
        `line by magnitudeMorning of about ${dayOf(occurrence?.bySet['linear-magnitude']?.expected)} `,
      ),
    );
    expect(text).toContain('rule by the angle between star and Sun');
  });

  it('has the minutes as a picture with a sentence, and the same as a table', async () => {
    const { phenomena } = await starAir('pleiades', 2027);
    const nights = phenomena['heliacal-rising'].occurrences[0]?.nights ?? [];
    const { user } = await open('pleiades');
    const section = within(board('First morning seen') as HTMLElement);
    expect(
      section.getByRole('img', {
        name: /^Minutes in which Pleiades shows in the mornings .* In clear air from /,
      }),
    ).toBeTruthy();
    await user.click(section.getByText('Show as a table'));
    const rows = within(section.getByRole('table', { name: /day by day/ })).getAllByRole('row');
    expect(rows).toHaveLength(nights.length + 1);
    const cells = within(rows.at(-1) as HTMLElement)
      .getAllByRole('cell')
      .map((cell) => Number(cell.textContent));
    const last = nights.at(-1);
    expect(cells).toEqual([
      last?.byClarity.clear,
      last?.byClarity.ordinary,
      last?.byClarity.hazy,
      last?.underMoon,
    ]);
  });

  it('has no minutes where the star is looked for right at the skyline', async () => {
    await open('pleiades');
    const section = within(board('Last evening rising') as HTMLElement);
    expect(section.queryByRole('img', { name: /Minutes/ })).toBeNull();
    expect(section.getByText(/minutes say nothing/)).toBeTruthy();
  });

  it('tells what the model rests on, and leads back to the star', async () => {
    const { extinctionMag, basis } = await starAir('pleiades', 2027);
    await open('pleiades');
    const text = plain(board('What the model rests on'));
    expect(text).toContain(`takes ${extinctionMag.clear.toFixed(2)} magnitudes`);
    expect(text).toContain(`engine ${basis.engineVersion}`);
    expect(screen.getByRole('link', { name: 'Back' }).getAttribute('href')).toBe(
      `/stars/pleiades?placeId=${TAZIMEL.id}&year=2027`,
    );
    expect(screen.getByText(/Never look at the Sun/)).toBeTruthy();
  });

  it('has one sentence for a star that never sets', async () => {
    await open('hr424');
    expect(screen.getByText(/It never sets here/)).toBeTruthy();
    expect(screen.queryByRole('heading', { name: 'First morning seen' })).toBeNull();
  });

  it('writes ancient days in the Julian calendar', async () => {
    const { phenomena } = await starAir('hr2491', -43);
    await open('hr2491', -43);
    expect(plain(board('First morning seen'))).toContain(
      `about ${dayOf(phenomena['heliacal-rising'].occurrences[0]?.rule?.expected, 'julian')} July`,
    );
    expect(screen.getByText(/44 BC/)).toBeTruthy();
  });
});
