import { screen } from '@testing-library/react';
import { afterEach, expect, it, vi } from 'vitest';
import type { AfterDeath as State } from '#shared/contracts/after-death.js';
import { AfterDeath } from '#src/features/after-death/components/after-death.js';
import { answerWith, refusal } from '#tests/support/answers.js';
import { OFFICER, renderOnBoard } from '#tests/support/on-board.js';

const communityId = OFFICER.memberships?.[0]?.communityId ?? '';
const personId = '0190a3a0-0000-7000-8000-0000000000e1';
const NIECE = { id: '0190a3a0-0000-7000-8000-0000000000e2', displayName: 'Tirel' };
const death = `/api/communities/${communityId}/people/${personId}/death`;
const OPEN: State = {
  diedOn: null,
  chosen: { keep: 1, tighten: 0, passTo: 1, remove: 2 },
  openHeirs: ['My niece'],
  mayUndo: false,
};
const board = (onDone = () => undefined) => (
  <AfterDeath whom={{ communityId, personId }} others={[NIECE]} onDone={onDone} />
);

afterEach(() => {
  vi.unstubAllGlobals();
});

it('says in numbers what was chosen, asks for the day, and a second time before anything goes for good', async () => {
  const sent = answerWith({
    [`GET ${death}`]: () => OPEN,
    [`PUT ${death}`]: () => refusal('conflict', 409, { reason: 'removes-for-good' }),
  });
  const { user } = await renderOnBoard(board());
  await screen.findByText('1 thing stays as it is');
  screen.getByText('2 things are removed for good');
  screen.getByText(/Nobody of the village is called so, or several are: “My niece”/u);
  await user.click(screen.getByRole('button', { name: 'Note it, and do what they chose' }));
  expect(sent.some(({ method }) => method === 'PUT')).toBe(false);
  await user.type(screen.getByLabelText('Day of death'), '2026-11-30');
  await user.click(screen.getByRole('button', { name: 'Note it, and do what they chose' }));
  await screen.findByText(/Say once more that it will be gone for good/u);
  expect(sent.at(-1)?.body).toEqual({ diedOn: '2026-11-30', removesForGood: false });
});

it('lets the steward say who is meant by a name that fits nobody', async () => {
  let state: State = { ...OPEN, diedOn: '2026-11-30', mayUndo: true };
  const sent = answerWith({
    [`GET ${death}`]: () => state,
    [`POST ${death}/heirs`]: () => {
      state = { ...state, openHeirs: [] };
      return state;
    },
  });
  const { user } = await renderOnBoard(board());
  await user.click(await screen.findByRole('button', { name: 'Pass it on' }));
  await screen.findByText('Choose somebody of the village');
  await user.selectOptions(screen.getByLabelText('Who is “My niece”?'), NIECE.id);
  await user.click(screen.getByRole('button', { name: 'Pass it on' }));
  await screen.findByText('It is passed on.');
  expect(sent.find(({ method }) => method === 'POST')?.body).toEqual({
    name: 'My niece',
    personId: NIECE.id,
  });
  expect(screen.queryByLabelText('Who is “My niece”?')).toBeNull();
  screen.getByRole('button', { name: 'It was noted by mistake: undo it' });
});
