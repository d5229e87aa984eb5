import { screen, waitFor } from '@testing-library/react';
import { afterEach, expect, it, vi } from 'vitest';
import type { SessionState } from '#shared/contracts/session.js';
import { SheetsToReplaceBoard } from '#src/features/withdrawals/components/sheets-to-replace-board.js';
import { answerWith } from '#tests/support/answers.js';
import { OFFICER, renderOnBoard } from '#tests/support/on-board.js';

const VILLAGE = OFFICER.memberships?.[0]?.communityId ?? '';
const path = `/api/communities/${VILLAGE}/sheets-to-replace`;
const SHEET = {
  withdrawalId: '0190a3a0-0000-7000-8000-0000000000c1',
  calendarId: '0190a3a0-0000-7000-8000-0000000000c2',
  placeName: 'Upper terrace',
  year: 2027,
  number: 3,
  label: 'v1',
  at: '2027-03-10T06:00:00.000Z',
};

afterEach(() => {
  vi.unstubAllGlobals();
});

it('asks whoever prints to take the sheet down, and goes away once they say twice that it is', async () => {
  let open = [SHEET];
  const sent = answerWith({
    [`GET ${path}`]: () => ({ items: open, nextCursor: null }),
    [`POST ${path}/${SHEET.withdrawalId}`]: () => {
      open = [];
      return new Response(null, { status: 204 });
    },
  });
  const { user } = await renderOnBoard(<SheetsToReplaceBoard />);
  await screen.findByText(/Upper terrace 2027, version 3/u);
  await user.click(screen.getByRole('button', { name: 'The old sheet is down' }));
  expect(sent.filter(({ method }) => method === 'POST')).toEqual([]);
  await user.click(screen.getByRole('button', { name: 'Yes, it is down' }));
  await waitFor(() => expect(screen.queryByText(/Upper terrace/u)).toBeNull());
});

it('asks nobody who does not print', async () => {
  const observer: SessionState = {
    ...OFFICER,
    memberships: (OFFICER.memberships ?? []).map((each) => ({ ...each, roles: ['observer'] })),
  };
  const sent = answerWith({});
  await renderOnBoard(<SheetsToReplaceBoard />, { session: observer });
  expect(sent).toEqual([]);
  expect(screen.queryByRole('heading')).toBeNull();
});
