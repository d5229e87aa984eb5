import { screen, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import type { EntryDates } from '#shared/contracts/calendars.js';
import type { RolledEntry, RolloverReport } from '#shared/contracts/rollovers.js';
import { NextYear } from '#src/features/rollovers/components/next-year.js';
import { RolloverPage } from '#src/features/rollovers/components/rollover-page.js';
import { answerWith, refusal } from '#tests/support/answers.js';
import { CALENDAR } from '#tests/support/draft-of-tazimel.js';
import { renderOnBoard } from '#tests/support/on-board.js';

const ENTRY_ID = '0190a3a0-0000-7000-8000-0000000000e1';
const NEXT_ID = '0190a3a0-0000-7000-8000-0000000000c9';

function dates(year: number, from: string, to: string): EntryDates {
  const [bestFrom, bestTo] = [`${String(year)}-${from}`, `${String(year)}-${to}`];
  return {
    ...{ starOutcome: null, phenomenonOutcome: null, marker: null, warnings: [] },
    window: { earliest: bestFrom, bestFrom, bestTo, lastAdvised: bestTo, lastAdvisedBy: 'offset' },
  };
}

const moved: RolledEntry = {
  ...{ entryId: ENTRY_ID, titleVillage: '', titleOfficer: 'Sow long millet', kind: 'farm' },
  ...{ protectiveWatch: false, outcome: 'moved', movedDays: -11, needsConsent: true },
  before: dates(2027, '06-12', '06-30'),
  after: dates(2028, '06-01', '06-19'),
};

const report: RolloverReport = {
  ...{ calendarId: NEXT_ID, fromCalendarId: CALENDAR.id, fromYear: 2027, year: 2028 },
  ...{ placeName: 'Upper terraces', rolledAt: '2027-11-01T08:00:00.000Z', rolledBy: 'Beyno' },
  entries: [moved],
};

const page = { path: `/calendars/${NEXT_ID}/rollover`, pattern: '/calendars/:calendarId/rollover' };

describe('the page of what a new year changed', () => {
  it('says in words what moved, with both years’ days, and whose consent is due', async () => {
    answerWith({ [`GET /api/calendars/${NEXT_ID}/rollover`]: () => report });
    await renderOnBoard(<RolloverPage />, page);
    expect(await screen.findByRole('heading', { level: 1, name: 'From 2027 to 2028' })).toBeTruthy();
    expect(screen.getByText('1 entry moved by more than three days.')).toBeTruthy();
    expect(screen.getByText('For 1 entry somebody is to be asked before 2028.')).toBeTruthy();
    const [table] = screen.getAllByRole('table');
    const row = within(table ?? document.body).getByRole('row', { name: /Sow long millet/u });
    expect(row.textContent).toMatch(/best 12 to 30.June/u);
    expect(row.textContent).toMatch(/best 1 to 19.June/u);
    expect(row.textContent).toContain('11 days earlier');
    expect(screen.getByRole('link', { name: 'Ask about it' })).toBeTruthy();
  });

  it('says where to look once the draft was submitted', async () => {
    answerWith({ [`GET /api/calendars/${NEXT_ID}/rollover`]: () => refusal('not-found', 404) });
    await renderOnBoard(<RolloverPage />, page);
    expect(await screen.findByText('There is no such list any more')).toBeTruthy();
  });
});

describe('the way to the next year', () => {
  it('asks first, begins it, and opens what changed', async () => {
    const sent = answerWith({
      [`POST /api/calendars/${CALENDAR.id}/next-year`]: () => ({ calendarId: NEXT_ID, hasReport: true }),
    });
    const { user, address } = await renderOnBoard(
      <NextYear calendar={CALENDAR} calendars={[CALENDAR]} isOfficer />,
    );
    await user.click(screen.getByRole('button', { name: 'Begin 2028 from this one' }));
    expect(sent).toHaveLength(0);
    await user.click(screen.getByRole('button', { name: 'Begin 2028' }));
    expect(await screen.findByText('The draft of 2028 is begun.')).toBeTruthy();
    expect(address()).toBe(`/calendars/${NEXT_ID}/rollover`);
  });

  it('opens next year’s calendar where there is one, and begins nothing for others than officers', async () => {
    const next = { ...CALENDAR, id: NEXT_ID, year: CALENDAR.year + 1, rolledFromYear: CALENDAR.year };
    const calendars = [next, CALENDAR];
    const { unmount } = await renderOnBoard(<NextYear calendar={CALENDAR} calendars={calendars} isOfficer />);
    expect(screen.getByRole('link', { name: 'Open 2028' }).getAttribute('href')).toBe(
      `/calendars/${NEXT_ID}`,
    );
    expect(screen.queryByRole('button')).toBeNull();
    unmount();
    await renderOnBoard(<NextYear calendar={next} calendars={calendars} isOfficer={false} />);
    expect(screen.getByRole('link', { name: 'What changed from 2027 to 2028' })).toBeTruthy();
    expect(screen.queryByRole('button')).toBeNull();
  });
});
