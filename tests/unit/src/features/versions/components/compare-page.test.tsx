import { screen, within } from '@testing-library/react';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import type { Comparison, VersionSummary } from '#shared/contracts/versions.js';
import { compareEntries } from '#shared/calendar/comparison.js';
import { addDays } from '#shared/kernel/iso-date.js';
import { ComparePage } from '#src/features/versions/components/compare-page.js';
import { answerWith, refusal } from '#tests/support/answers.js';
import { CALENDAR, entryOf, tazimelMarkers, YEAR } from '#tests/support/draft-of-tazimel.js';
import { renderOnBoard } from '#tests/support/on-board.js';

vi.setConfig({ testTimeout: 20_000 });

const markers = await tazimelMarkers();
const path = `/api/calendars/${CALENDAR.id}`;
const list = (items: readonly unknown[]) => ({ items, nextCursor: null });

const summary = (number: number, state: VersionSummary['state']): VersionSummary => ({
  id: `0190a3a0-0000-7000-8000-0000000000f${number}`,
  calendarId: CALENDAR.id,
  number,
  label: state === 'published' ? '2027-1' : null,
  state,
  submittedBy: 'Beyno',
  submittedAt: '2027-05-31T06:00:00.000Z',
  publishedAt: state === 'published' ? '2027-05-20T06:00:00.000Z' : null,
  entryCount: 2,
  hash: 'ab'.repeat(32),
});

const bodyOf = ({ id, content, dates }: ReturnType<typeof entryOf>) => ({ entryId: id, content, dates });

/** Best from moves three days; a second entry stays, a third is new. */
function comparison(): Comparison {
  const sow = bodyOf(entryOf(markers, 1));
  const stay = bodyOf(entryOf(markers, 2, { titleOfficer: 'Store-closing day', crop: '' }));
  const fresh = bodyOf(entryOf(markers, 3, { titleOfficer: 'Weed', crop: 'beans' }));
  const window = sow.dates.window;
  const moved = {
    ...sow,
    dates: { ...sow.dates, window: window && { ...window, bestFrom: addDays(window.bestFrom, 3) } },
  };
  const entries = compareEntries([sow, stay], [moved, stay, fresh]).map((entry) => {
    const { titleOfficer, titleVillage } = (entry.after ?? sow).content;
    return { ...entry, titleOfficer, titleVillage };
  });
  return {
    from: '1',
    to: '2',
    year: YEAR,
    counts: { added: 1, removed: 0, changed: 1, same: 1 },
    header: [{ field: 'weatherContact', before: 'call 900', after: 'call 950' }],
    entries,
  };
}

const answers = {
  [`GET ${path}`]: CALENDAR,
  [`GET ${path}/versions`]: list([summary(2, 'in-review'), summary(1, 'published')]),
  [`GET ${path}/comparison`]: comparison,
  [`GET ${path}/versions/1`]: () => refusal('not-found', 404),
  [`GET ${path}/versions/2`]: () => refusal('not-found', 404),
  [`GET ${path}/versions/1/answers`]: () => ({
    ...list([
      {
        id: '0190a3a0-0000-7000-8000-0000000000aa',
        entryId: entryOf(markers, 1).id,
        entryHash: 'x',
        elderId: '0190a3a0-0000-7000-8000-0000000000ab',
        elderName: 'Elder A-2',
        answer: 'change-this',
        note: 'Start three days later.',
        letStand: false,
        recordedByName: null,
        witness: null,
        proof: null,
        spoken: null,
        answeredAt: '2027-05-30T06:00:00.000Z',
        mine: false,
      },
    ]),
    progress: [],
    outcomes: [],
  }),
};

const open = () =>
  renderOnBoard(<ComparePage />, {
    path: `/calendars/${CALENDAR.id}/compare?from=1&to=2`,
    pattern: '/calendars/:calendarId/compare',
  });

beforeEach(() => {
  vi.useFakeTimers({ shouldAdvanceTime: true, now: new Date('2027-06-07T09:00:00Z') });
  vi.stubGlobal('scrollTo', vi.fn());
});

afterEach(() => {
  vi.useRealTimers();
  vi.unstubAllGlobals();
});

describe('what changed', () => {
  it('counts first, then says each entry in a sentence with reason and who', async () => {
    answerWith(answers);
    await open();
    const counted = await screen.findByText(/1 entry changes\./);
    expect(counted.parentElement?.textContent).toBe('1 entry changes. 1 is new. 1 stays as it is.');
    const sow = screen.getByRole('region', { name: 'Sow long millet' });
    expect(sow.textContent).toMatch(/Best from moves 3 days later, from .+ to .+\. The other days stay\./);
    expect(await within(sow).findByText('Asked by Elder A-2: “Start three days later.”')).toBeTruthy();
    expect(within(sow).getByText(/Put in by Beyno, submitted/)).toBeTruthy();
    expect(within(sow).getByRole('img', { name: /before .+, now/ })).toBeTruthy();
    expect(screen.getByRole('region', { name: 'Weed' }).textContent).toMatch(/^Weed.*New.*New: best/u);
    expect(
      screen.getByText('The contact of the weather service is now “call 950”; before, “call 900”.'),
    ).toBeTruthy();
  });

  it('shows all entries, or every difference side by side', async () => {
    answerWith(answers);
    const { user } = await open();
    await screen.findByText(/1 entry changes\./);
    expect(screen.queryByRole('region', { name: 'Store-closing day' })).toBeNull();
    await user.click(screen.getByRole('radio', { name: 'All 3' }));
    expect(screen.getByRole('region', { name: 'Store-closing day' }).textContent).toContain(
      'Stays as it is.',
    );
    await user.click(screen.getByRole('radio', { name: 'Side by side' }));
    const table = screen.getByRole('table', { name: 'Every difference, before and now' });
    expect(within(table).getByRole('rowheader', { name: 'Sow long millet' })).toBeTruthy();
    expect(within(table).queryByRole('rowheader', { name: 'Store-closing day' })).toBeNull();
  });

  it('shows what is about days, words, levels or people alone, and says why days moved', async () => {
    const why = {
      moved: { point: 'bestFrom', days: 3 },
      causes: [
        { cause: 'skyline', days: 2 },
        { cause: 'offsets', days: 2 },
      ],
      togetherDays: -1,
    } as const;
    answerWith({
      ...answers,
      [`GET ${path}/comparison`]: () => {
        const found = comparison();
        return {
          ...found,
          entries: found.entries.map((entry) => (entry.change === 'changed' ? { ...entry, why } : entry)),
        };
      },
    });
    const { user } = await open();
    const sow = await screen.findByRole('region', { name: 'Sow long millet' });
    const causes = within(sow)
      .getAllByRole('listitem')
      .map((item) => item.textContent);
    expect(causes).toEqual([
      '2 days later: the skyline',
      '2 days later: the days from the lead, changed by hand',
      '1 day earlier: several of these acting together',
    ]);
    await user.click(screen.getByRole('radio', { name: 'People' }));
    expect(screen.queryByRole('region', { name: 'Sow long millet' })).toBeNull();
    expect(screen.getByRole('region', { name: 'Weed' })).toBeTruthy();
    await user.click(screen.getByRole('radio', { name: 'Days' }));
    expect(screen.getByText('2 entries differ in their days.')).toBeTruthy();
  });
});
