import { screen, waitFor, within } from '@testing-library/react';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { EditorPage } from '#src/features/calendars/components/editor-page.js';
import { UPPER_TAZIMEL } from '#server/features/demo/demo-villages.data.js';
import { answerWith, type Sent } from '#tests/support/answers.js';
import { draftServer } from '#tests/support/draft-server.js';
import { CALENDAR, tazimelMarkers, YEAR } from '#tests/support/draft-of-tazimel.js';
import { skySign } from '#tests/support/finder-of-tazimel.js';
import { OFFICER, renderOnBoard } from '#tests/support/on-board.js';
import { starTable, TAZIMEL } from '#tests/support/stars-of-tazimel.js';

// Whole screens over a real year of the sky: quick by themselves, slow on a busy machine.
vi.setConfig({ testTimeout: 30_000 });

const markers = await tazimelMarkers();
const { draft, server, communityPath } = draftServer(markers, await starTable(YEAR));
const open = (search = '', session = OFFICER) =>
  renderOnBoard(
    <EditorPage
      about={() => null}
      tasks={() => null}
      lockedAction={() => <button type="button">Take it back</button>}
    />,
    {
      session,
      path: `/calendars/${CALENDAR.id}${search}`,
      pattern: '/calendars/:calendarId',
    },
  );

const save = () => screen.getByRole('button', { name: /Save the entry/ });
const days = (name: string) => screen.findByRole<HTMLInputElement>('spinbutton', { name: new RegExp(name) });
const puts = (log: readonly Sent[]) => log.filter(({ method }) => method === 'PUT').map(({ body }) => body);

/** A wide screen shows list and form side by side. */
function wideScreen() {
  vi.stubGlobal('matchMedia', () => ({
    matches: true,
    addEventListener: () => undefined,
    removeEventListener: () => undefined,
  }));
}

beforeEach(() => {
  vi.useFakeTimers({ shouldAdvanceTime: true, now: new Date('2027-06-07T09:00:00Z') });
  vi.stubGlobal('scrollTo', vi.fn());
  // jsdom has no CSS.escape, which the dialog asks for.
  vi.stubGlobal('CSS', { escape: (text: string) => text });
  localStorage.clear();
  wideScreen();
});

afterEach(() => {
  vi.useRealTimers();
  vi.unstubAllGlobals();
});

describe('the editor', () => {
  it('shows the dates that a step brings before anything is saved', async () => {
    answerWith(server(draft({})));
    const { user } = await open();
    const best = await days('Best from');
    const before = best.closest('.field')?.querySelector('label')?.textContent ?? '';
    await user.click(within(best.closest('.stepper') as HTMLElement).getByLabelText('One more'));
    await waitFor(() => {
      expect(best.closest('.field')?.querySelector('label')?.textContent).not.toBe(before);
    });
    expect(screen.getAllByText('not saved yet').length).toBeGreaterThan(0);
  });

  it('says what else to look at, and each way out opens the place where it is mended', async () => {
    const fixed = { type: 'fixed-date', date: { month: 6, day: 10 }, source: 'the village' } as const;
    answerWith(server(draft({ kind: 'safety', caution: '', lead: fixed })));
    const { user } = await open();
    await screen.findByText('Somebody can be hurt here, and no line of caution is written.');
    await user.click(screen.getByRole('button', { name: 'Write the caution' }));
    await user.type(await screen.findByLabelText('Caution'), 'Go in pairs.');
    await waitFor(() => {
      expect(screen.queryByText(/no line of caution is written/u)).toBeNull();
    });
  });

  it('keeps what is written over a reload, says so, and saves it over the state it was written over', async () => {
    const log = answerWith(server(draft({})));
    const first = await open();
    await first.user.click(await screen.findByText('Signs'));
    const signs = screen.getByLabelText('Other signs to wait for');
    await first.user.clear(signs);
    await first.user.type(signs, 'Frogs calling');
    await vi.advanceTimersByTimeAsync(500);
    first.unmount();
    const second = await open();
    expect(await screen.findByText(/Not saved yet. Kept on this device/)).toBeTruthy();
    expect(screen.getByLabelText<HTMLTextAreaElement>('Other signs to wait for').value).toBe('Frogs calling');
    await second.user.click(save());
    await screen.findByText('Saved: Sow long millet.');
    expect(puts(log)).toMatchObject([{ version: 1, content: { otherSigns: 'Frogs calling' } }]);
    expect(screen.queryByText(/Not saved yet/)).toBeNull();
    expect(Object.keys(localStorage).some((key) => key.includes('entry.'))).toBe(false);
  });

  it('shows both texts after somebody saved a newer one, and saves what is chosen', async () => {
    const saved = draft({ ifLate: 'Sow beans.' });
    const log = answerWith(server(saved));
    const { user } = await open();
    await user.click(await screen.findByText('Do'));
    const late = screen.getByLabelText('What to do if it is late');
    await user.clear(late);
    await user.type(late, 'Ask the office.');
    const [theirs] = saved.entries;
    if (theirs) {
      const content = { ...theirs.content, ifLate: 'Sow short millet.', crop: 'millet' };
      saved.entries = [{ ...theirs, content, version: 2, updatedBy: 'Ostrel' }];
    }
    await user.click(save());
    const both = await screen.findByRole('region', { name: 'Two people wrote to this entry' });
    const ifLate = within(both).getByRole('group', { name: 'If late' });
    expect(within(ifLate).getByText('Sow short millet.')).toBeTruthy();
    expect(within(ifLate).getByText('Ask the office.')).toBeTruthy();
    // Only the other person changed the crop: it is chosen already, and can be changed.
    const crop = within(both).getByRole('group', { name: 'Crop or variety' });
    expect(within(crop).getByRole<HTMLInputElement>('radio', { name: /Saved by Ostrel/ }).checked).toBe(true);
    await user.click(within(both).getByRole('button', { name: /Save what I chose/ }));
    expect(puts(log)).toHaveLength(1);
    await user.click(within(ifLate).getByRole('radio', { name: /Written by you/ }));
    await user.click(within(both).getByRole('button', { name: 'Save what I chose' }));
    await screen.findByText('Saved: Sow long millet.');
    expect(puts(log)[1]).toMatchObject({
      version: 2,
      content: { ifLate: 'Ask the office.', crop: 'millet' },
    });
    expect(screen.queryByRole('region', { name: 'Two people wrote to this entry' })).toBeNull();
    expect(screen.queryByText(/Not saved yet/)).toBeNull();
  });

  it('puts what is not accepted at its field, loses nothing typed, and sends nothing', async () => {
    const log = answerWith(server(draft({})));
    const { user } = await open();
    await user.click(await screen.findByRole('button', { name: 'Add an entry' }));
    await user.type(await screen.findByLabelText('Crop or variety'), 'beans');
    await user.click(save());
    const name = screen.getByLabelText(/Name of the work or rite/);
    expect(name.getAttribute('aria-invalid')).toBe('true');
    expect(screen.getByText('Fill this in.')).toBeTruthy();
    // What it goes by may wait.
    expect(screen.queryByText(/This is no marker. Choose one/)).toBeNull();
    await waitFor(() => {
      expect(document.activeElement).toBe(name);
    });
    expect(screen.getByLabelText<HTMLInputElement>('Crop or variety').value).toBe('beans');
    expect(log.filter(({ method }) => method === 'POST')).toEqual([]);
  });

  it('names the day that is out of order as soon as it is', async () => {
    answerWith(server(draft({})));
    const { user } = await open();
    const best = await days('Best from');
    await user.clear(best);
    await user.type(best, '40{Enter}');
    expect(await screen.findByText(/This day lies before the one in front of it/)).toBeTruthy();
  });

  it('takes an entry out and brings it back', async () => {
    const saved = draft({}, { titleOfficer: 'Weed' });
    answerWith(server(saved));
    const { user } = await open();
    await user.click(await screen.findByRole('button', { name: 'Take it out' }));
    const said = await screen.findByText('Sow long millet is taken out.');
    expect(screen.queryByRole('link', { name: /Sow long millet/ })).toBeNull();
    const toast = said.closest('.toast') as HTMLElement;
    await user.click(within(toast).getByRole('button', { name: 'Undo' }));
    expect(await screen.findByText('Sow long millet is back.')).toBeTruthy();
    expect(await screen.findByRole('link', { name: /Sow long millet/ })).toBeTruthy();
  });

  it('begins an entry with the star of the address', async () => {
    const log = answerWith(server(draft()));
    const { user } = await open('?entry=new-x&marker=hr2491&phenomenon=heliacal-rising');
    await user.type(await screen.findByLabelText(/Name of the work or rite/), 'First weeding');
    expect((await screen.findAllByText('Sirius')).length).toBeGreaterThan(0);
    await user.click(save());
    await screen.findByText('Saved: First weeding.');
    expect(log.find(({ method }) => method === 'POST')?.body).toMatchObject({
      titleOfficer: 'First weeding',
      lead: { type: 'marker', markerKey: 'hr2491', phenomenon: 'heliacal-rising', occurrence: 1 },
    });
  });
});

describe('a locked draft', () => {
  it('is shown to be read, with the reason and the way out', async () => {
    const saved = draft({});
    saved.calendar = { ...CALENDAR, locked: true, outNumber: 2 };
    answerWith(server(saved));
    await open();
    expect(await screen.findByText('Submission 2 is out.')).toBeTruthy();
    expect(screen.getByRole('button', { name: 'Take it back' })).toBeTruthy();
    expect(await screen.findByText('Soil wet to a hand depth')).toBeTruthy();
    expect(screen.queryByRole('spinbutton')).toBeNull();
    expect(screen.queryByRole('button', { name: /Save the entry/ })).toBeNull();
  });
});

describe('a sign that was looked up for an entry', () => {
  const chosen = () =>
    screen.getByText('Goes by', { selector: 'p' }).closest('[role="group"]')?.textContent ?? '';

  it('stands in the entry that asked for it, once, and what is chosen afterwards stands', async () => {
    const saved = draft({});
    answerWith(server(saved));
    const id = saved.entries[0]?.id ?? '';
    const { user, address } = await open(`?entry=${id}&marker=hr2491&phenomenon=heliacal-setting`);
    await waitFor(() => {
      expect(chosen()).toContain('Sirius');
      expect(address()).toBe(`/calendars/${CALENDAR.id}?entry=${id}`);
    });
    expect(screen.getByRole<HTMLInputElement>('radio', { name: /Last evening seen/ }).checked).toBe(true);
    expect(screen.getAllByText('not saved yet').length).toBeGreaterThan(0);
    await user.click(screen.getByRole('radio', { name: /First morning seen/ }));
    expect(screen.getByRole<HTMLInputElement>('radio', { name: /First morning seen/ }).checked).toBe(true);
  });

  it('brings the second of two such days in the year, where that is the one that was found', async () => {
    const log = answerWith(server(draft()));
    const { user } = await open('?entry=new-x&marker=hr2491&phenomenon=heliacal-rising&occurrence=2');
    await user.type(await screen.findByLabelText(/Name of the work or rite/), 'First weeding');
    await user.click(save());
    await screen.findByText('Saved: First weeding.');
    expect(log.find(({ method }) => method === 'POST')?.body).toMatchObject({
      lead: { type: 'marker', markerKey: 'hr2491', phenomenon: 'heliacal-rising', occurrence: 2 },
    });
  });

  it('may be a sign of the Sun: the new entry begins with it and shows its days before anything is typed', async () => {
    answerWith({
      ...server(draft()),
      [`POST /api/places/${TAZIMEL.id}/sky-markers`]: ({ body }: Sent) => skySign(body),
    });
    const sky = JSON.stringify({ kind: 'sun-season', season: 'june-solstice' });
    await open(`?entry=new-x&sky=${encodeURIComponent(sky)}`);
    await screen.findByLabelText(/Name of the work or rite/);
    expect(chosen()).toContain('June solstice');
    expect((await screen.findAllByText(/About 21.June, between 16 and 26.June/)).length).toBeGreaterThan(0);
  });

  it('can be looked for from the entry’s day, and the way leads back to this entry', async () => {
    const saved = draft({});
    answerWith(server(saved));
    await open(`?entry=${saved.entries[0]?.id ?? ''}`);
    await days('Best from');
    const link = await screen.findByRole('link', { name: 'Which sign falls near a day?' });
    const expected = saved.entries[0]?.dates.marker?.expected.gregorian.slice(5) ?? '';
    const asked = new URL(link.getAttribute('href') ?? '', 'http://board.example').searchParams;
    expect(Object.fromEntries(asked)).toEqual({
      placeId: CALENDAR.placeId,
      year: String(YEAR),
      calendar: CALENDAR.id,
      entry: saved.entries[0]?.id,
      from: expected,
    });
  });
});

describe('the draft for others', () => {
  it('is read by an elder and closed to an observer', async () => {
    const saved = draft({});
    saved.entries = saved.entries.map((entry) => ({ ...entry, mine: false }));
    answerWith(server(saved));
    const as = (role: 'elder' | 'observer') => ({
      ...OFFICER,
      memberships: [{ communityId: CALENDAR.communityId, communityName: 'Upper Tazimel', roles: [role] }],
    });
    const elder = await open('', as('elder'));
    expect(
      await screen.findByText('You read the village’s entries and write those that you keep.'),
    ).toBeTruthy();
    expect(await screen.findByText('Soil wet to a hand depth')).toBeTruthy();
    elder.unmount();
    await open('', as('observer'));
    expect(await screen.findByText('The draft is not for everybody')).toBeTruthy();
  });
});

describe('submitting', () => {
  it('is closed while a contact is missing, and says who mends it', async () => {
    const answers = server(draft({}));
    const bare = { ...UPPER_TAZIMEL.settings, weatherContact: '' };
    const log = answerWith({
      ...answers,
      [`GET ${communityPath}`]: {
        ...bare,
        id: CALENDAR.communityId,
        signOffRule: { minElders: 1, mustSign: [], oneOf: [], steward: false },
        version: 1,
      },
    });
    const { user } = await open();
    await user.click(await screen.findByRole('button', { name: 'Submit for review' }));
    const dialog = await screen.findByRole('dialog');
    expect(
      await within(dialog).findByText('The contact of the national weather service is missing.'),
    ).toBeTruthy();
    expect(within(dialog).queryByRole('button', { name: 'Submit it' })).toBeNull();
    expect(log.filter(({ method }) => method === 'POST')).toEqual([]);
  });
});
