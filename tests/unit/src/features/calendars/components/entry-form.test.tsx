import { fireEvent, screen, waitFor } from '@testing-library/react';
import { afterEach, beforeEach, expect, it, vi } from 'vitest';
import { EditorPage } from '#src/features/calendars/components/editor-page.js';
import { answerWith, type Sent } from '#tests/support/answers.js';
import { draftServer } from '#tests/support/draft-server.js';
import { CALENDAR, tazimelMarkers, YEAR } from '#tests/support/draft-of-tazimel.js';
import { skySign } from '#tests/support/finder-of-tazimel.js';
import { renderOnBoard } from '#tests/support/on-board.js';
import { starTable, TAZIMEL } from '#tests/support/stars-of-tazimel.js';

// Whole screens over a real year of the sky: quick by themselves, slow on a busy machine.
vi.setConfig({ testTimeout: 30_000 });

const { calendarPath, draft, server } = draftServer(await tazimelMarkers(), await starTable(YEAR));

beforeEach(() => {
  vi.stubGlobal('scrollTo', vi.fn());
  localStorage.clear();
  vi.stubGlobal('matchMedia', () => ({
    matches: true,
    addEventListener: () => undefined,
    removeEventListener: () => undefined,
  }));
});
afterEach(() => {
  vi.unstubAllGlobals();
});

it('leaves whoever writes on in their field when a new entry comes to be saved, and saves the rest over it', async () => {
  const answers = server(draft());
  const post = answers[`POST ${calendarPath}/entries`] as (sent: Sent) => Response;
  let letThrough: () => void = () => undefined;
  const log = answerWith({
    ...answers,
    [`POST ${calendarPath}/entries`]: async (sent: Sent) => {
      await new Promise<void>((resolve) => {
        letThrough = resolve;
      });
      return post(sent);
    },
  });
  const { user, address } = await renderOnBoard(
    <EditorPage about={() => null} tasks={() => null} lockedAction={() => null} />,
    {
      path: `/calendars/${CALENDAR.id}?entry=new-x&marker=hr2491&phenomenon=heliacal-rising`,
      pattern: '/calendars/:calendarId',
    },
  );
  await user.type(await screen.findByLabelText(/Name of the work or rite/), 'First weeding');
  await user.click(screen.getByRole('button', { name: 'Save the entry' }));
  const crop = screen.getByLabelText<HTMLInputElement>('Crop or variety');
  await user.type(crop, 'bea');
  letThrough();
  await screen.findByText('Saved: First weeding.');
  await waitFor(() => {
    expect(address()).toMatch(/entry=0190a3a0/u);
  });
  await user.keyboard('ns');
  expect(document.activeElement).toBe(crop);
  expect(crop.value).toBe('beans');
  expect(log.filter(({ method }) => method === 'POST')).toHaveLength(1);
});

it('counts a sign of the sky from the day on which people saw it, says both countings, and doubts a far day', async () => {
  answerWith({
    ...server(draft()),
    [`POST /api/places/${TAZIMEL.id}/sky-markers`]: ({ body }: Sent) => skySign(body),
  });
  const sky = encodeURIComponent(JSON.stringify({ kind: 'sun-season', season: 'june-solstice' }));
  const { user } = await renderOnBoard(
    <EditorPage about={() => null} tasks={() => null} lockedAction={() => null} />,
    { path: `/calendars/${CALENDAR.id}?entry=new-x&sky=${sky}`, pattern: '/calendars/:calendarId' },
  );
  await user.click(await screen.findByRole('checkbox', { name: /from the day on which people see it/ }));
  await user.click(screen.getByRole('checkbox', { name: 'It was seen this year' }));
  const seenOn = (date: string) =>
    fireEvent.change(screen.getByLabelText('On which morning or evening'), { target: { value: date } });
  seenOn(`${YEAR}-06-24`);
  const counted =
    /Counted from 24.June, when it was seen\. By the computed day the best days would be 21 to 28.June/u;
  await waitFor(() => expect(document.body.textContent).toMatch(counted), { timeout: 10_000 });
  expect(screen.queryByText(/days from the computed day/)).toBeNull();
  seenOn(`${YEAR}-11-20`);
  expect(await screen.findByText(/152 days from the computed day/)).toBeTruthy();
});

it('asks once for a sign of the sky, saves the entry before one is chosen, and stays where it was picked', async () => {
  const log = answerWith(server(draft()));
  const { user } = await renderOnBoard(
    <EditorPage about={() => null} tasks={() => null} lockedAction={() => null} />,
    { path: `/calendars/${CALENDAR.id}?entry=new-x`, pattern: '/calendars/:calendarId' },
  );
  await user.type(await screen.findByLabelText(/Name of the work or rite/), 'Mend the terraces');
  await user.click(screen.getByRole('radio', { name: /^Another sign of the sky/ }));
  expect(screen.getByRole('button', { name: 'Choose a sign' })).toBeTruthy();
  expect(screen.queryByRole('combobox', { name: /Star or figure/ })).toBeNull();
  await user.click(screen.getByRole('button', { name: 'Save the entry' }));
  await screen.findByText('Saved: Mend the terraces.');
  const sent = log.find(({ method }) => method === 'POST')?.body;
  expect(sent).toMatchObject({ lead: { type: 'none', way: 'sky' } });
  expect(screen.getByRole('radio', { name: /^Another sign of the sky/ })).toHaveProperty('checked', true);
  expect(await screen.findByText('without a date yet')).toBeTruthy();
  expect(screen.getByText('Without a bar, because it goes by nothing yet: Mend the terraces.')).toBeTruthy();
});
