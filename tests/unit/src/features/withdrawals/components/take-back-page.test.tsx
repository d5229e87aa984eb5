import { screen, waitFor } from '@testing-library/react';
import { afterEach, describe, expect, it, vi } from 'vitest';
import type { Note } from '#shared/contracts/notes.js';
import type { ItemState } from '#shared/contracts/withdrawals.js';
import { TakeBackPage } from '#src/features/withdrawals/components/take-back-page.js';
import { keep, readKept } from '#src/lib/device-storage.js';
import { PATTERNS, paths } from '#src/lib/paths.js';
import { answerWith, refusal } from '#tests/support/answers.js';
import { OFFICER, renderOnBoard } from '#tests/support/on-board.js';

const VILLAGE = OFFICER.memberships?.[0]?.communityId ?? '';
const ENTRY = '0190a3a0-0000-7000-8000-0000000000b1';
const ELDER = '0190a3a0-0000-7000-8000-0000000000e1';
const item = `/api/communities/${VILLAGE}/items/entry/${ENTRY}`;
const elder = { id: ELDER, displayName: 'Elder A-1', roles: ['elder'] };
const people = {
  items: [{ ...elder, email: '', active: true, codeExpiresAt: null, version: 1 }],
  nextCursor: null,
};

function stateOf(changes: Partial<ItemState> = {}): ItemState {
  return {
    state: 'shared',
    pausedAt: null,
    title: 'Sow the terrace',
    isMine: true,
    may: { withdraw: true, pause: true, resume: false, takeNameOff: true, removeSound: false },
    ...changes,
  };
}

async function open(answers: Record<string, unknown>) {
  const sent = answerWith(answers);
  const board = await renderOnBoard(<TakeBackPage />, {
    path: paths.takeBack(VILLAGE, 'entry', ENTRY),
    pattern: PATTERNS.takeBack,
  });
  return { ...board, sent, writes: () => sent.filter(({ method }) => method !== 'GET') };
}

afterEach(() => {
  vi.unstubAllGlobals();
  localStorage.clear();
});

describe('taking something back', () => {
  it('says first what will happen, and happens only after a tick and a second press', async () => {
    const { user, writes } = await open({
      [`GET ${item}/state`]: stateOf(),
      [`POST ${item}/withdrawal`]: new Response(null, { status: 204 }),
    });
    await screen.findByText(/hangs on a wall cannot change/u);
    await user.click(screen.getByRole('button', { name: 'Take it back' }));
    const yes = screen.getByRole('button', { name: /Yes, take it back/u });
    await user.click(yes);
    expect(writes()).toEqual([]);
    await user.click(screen.getByRole('checkbox'));
    await user.click(yes);
    await screen.findByText('It is gone. Nothing of it is kept.');
    expect(writes()).toMatchObject([
      { path: `${item}/withdrawal`, body: { leavesTrace: true, askedById: null } },
    ]);
  });

  it('leaves no trace where that is chosen, and takes what this device kept along', async () => {
    keep(`draft.me.entry.calendar.${ENTRY}`, 'words');
    const { user, writes } = await open({
      [`GET ${item}/state`]: stateOf(),
      [`POST ${item}/withdrawal`]: new Response(null, { status: 204 }),
    });
    await user.click(await screen.findByRole('radio', { name: /^Nothing/u }));
    await user.click(screen.getByRole('button', { name: 'Take it back' }));
    await user.click(screen.getByRole('checkbox'));
    await user.click(screen.getByRole('button', { name: /Yes, take it back/u }));
    await screen.findByText('It is gone. Nothing of it is kept.');
    expect(writes()).toMatchObject([{ body: { leavesTrace: false } }]);
    expect(readKept(`draft.me.entry.calendar.${ENTRY}`)).toBeNull();
  });

  it('asks on whose request it is done where it is somebody else’s', async () => {
    const { user, writes } = await open({
      [`GET ${item}/state`]: stateOf({ isMine: false, title: null }),
      [`GET /api/communities/${VILLAGE}/people`]: people,
      [`POST ${item}/pause`]: new Response(null, { status: 204 }),
    });
    const [forWhom] = await screen.findAllByLabelText('On whose request');
    await waitFor(() => expect(screen.getAllByRole('option', { name: 'Elder A-1' })).not.toHaveLength(0));
    await user.selectOptions(forWhom as HTMLElement, ELDER);
    await user.click(screen.getByRole('button', { name: 'Hide it' }));
    await user.click(screen.getByRole('button', { name: 'Yes, hide it' }));
    await waitFor(() =>
      expect(writes()).toMatchObject([{ path: `${item}/pause`, body: { askedById: ELDER } }]),
    );
  });

  it('keeps the question open and says why when it could not be done', async () => {
    const { user } = await open({
      [`GET ${item}/state`]: stateOf(),
      [`POST ${item}/name-removal`]: refusal('something-broke', 500),
    });
    await user.click(await screen.findByRole('button', { name: 'Take the name off' }));
    await user.click(screen.getByRole('button', { name: 'Yes, take the name off' }));
    await screen.findByRole('alert');
  });

  it('says to whom to turn where it is not theirs', async () => {
    const may = { withdraw: false, pause: false, resume: false, takeNameOff: false, removeSound: false };
    await open({ [`GET ${item}/state`]: stateOf({ isMine: false, may }) });
    await screen.findByText('This is not yours to take back');
    expect(screen.queryByRole('button', { name: 'Take it back' })).toBeNull();
  });
});

describe('something hidden', () => {
  it('is brought back with one press', async () => {
    const { user, writes } = await open({
      [`GET ${item}/state`]: stateOf({
        ...{ state: 'paused', pausedAt: '2027-03-10T06:00:00.000Z' },
        may: { withdraw: true, pause: false, resume: true, takeNameOff: true, removeSound: false },
      }),
      [`DELETE ${item}/pause`]: new Response(null, { status: 204 }),
    });
    await user.click(await screen.findByRole('button', { name: 'Bring it back' }));
    await waitFor(() => expect(writes()).toMatchObject([{ method: 'DELETE', path: `${item}/pause` }]));
  });
});

describe('what stays, but otherwise', () => {
  it('is asked to be corrected by a note that survives a reload until it is pinned', async () => {
    const notes = `/api/communities/${VILLAGE}/notes`;
    const pinned: Note = {
      ...{ subjectType: 'entry', subjectId: ENTRY, id: ELDER, pin: { at: 'whole' }, wordsStand: true },
      ...{ text: 'On the third evening', voices: 0, level: 'village', authorName: 'Beyno', mine: true },
      ...{ writtenAt: '2026-12-01T06:00:00.000Z', closedAt: null, answers: [] },
    };
    const { user, writes, unmount } = await open({ [`GET ${item}/state`]: stateOf() });
    await user.click(await screen.findByRole('button', { name: 'Ask for the correction' }));
    expect(writes()).toEqual([]);
    await user.type(screen.getByLabelText('What it should say'), 'On the third evening');
    unmount();

    const again = await open({
      [`GET ${item}/state`]: stateOf(),
      [`POST ${notes}`]: () => Response.json(pinned, { status: 201 }),
    });
    const field = await screen.findByLabelText<HTMLTextAreaElement>('What it should say');
    expect(field.value).toBe('On the third evening');
    await again.user.click(screen.getByRole('button', { name: 'Ask for the correction' }));
    await screen.findByText(/Your note is pinned/u);
    expect(again.writes()[0]?.body).toMatchObject({
      subjectType: 'entry',
      subjectId: ENTRY,
      text: 'On the third evening',
    });
    expect(field.value).toBe('');
  });

  it('loses its recording only after a second yes, and says that the words stay', async () => {
    const may = { withdraw: true, pause: true, resume: false, takeNameOff: true, removeSound: true };
    const { user, writes } = await open({
      [`GET ${item}/state`]: stateOf({ may }),
      [`POST /api/communities/${VILLAGE}/items/attachment/${ENTRY}/sound-removal`]: () =>
        new Response(null, { status: 204 }),
    });
    await user.click(await screen.findByRole('button', { name: 'Remove the recording' }));
    expect(writes()).toEqual([]);
    await screen.findByText('Remove the recording and keep the words?');
    await user.click(screen.getByRole('button', { name: 'Yes, remove the recording' }));
    await screen.findByText('The recording is gone. Its words stay.');
    expect(writes().map(({ body }) => body)).toEqual([{ askedById: null }]);
  });
});
