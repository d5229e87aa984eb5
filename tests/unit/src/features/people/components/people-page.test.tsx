import { screen, within } from '@testing-library/react';
import { afterEach, expect, it, vi } from 'vitest';
import type { CommunityPerson } from '#shared/contracts/people.js';
import type { SessionState } from '#shared/contracts/session.js';
import { PeoplePage } from '#src/features/people/components/people-page.js';
import { answerWith, refusal } from '#tests/support/answers.js';
import { OFFICER, renderOnBoard } from '#tests/support/on-board.js';

const VILLAGE = OFFICER.memberships?.[0]?.communityId ?? '';
const people = `/api/communities/${VILLAGE}/people`;
const STEWARD: SessionState = {
  ...OFFICER,
  memberships: (OFFICER.memberships ?? []).map((each) => ({ ...each, roles: ['steward'] })),
};
const ORRA: CommunityPerson = {
  id: '0190a3a0-0000-7000-8000-0000000000d1',
  email: '',
  displayName: 'Orra',
  roles: ['elder'],
  active: true,
  codeExpiresAt: null,
  version: 1,
};

afterEach(() => {
  vi.unstubAllGlobals();
});

it('adds an elder with a name alone, and leads on to their card', async () => {
  let items: CommunityPerson[] = [];
  const sent = answerWith({
    [`GET ${people}`]: () => ({ items, nextCursor: null }),
    [`POST ${people}`]: () => {
      items = [ORRA];
      return Response.json({ person: ORRA, oneTimeCode: null }, { status: 201 });
    },
  });
  const { user } = await renderOnBoard(<PeoplePage />, { session: STEWARD });
  screen.getByText(/Elders and observers can do without/u);
  await user.type(screen.getByRole('textbox', { name: 'How they are called' }), 'Orra');
  await user.click(screen.getByRole('checkbox', { name: /officer/iu }));
  await user.click(screen.getByRole('button', { name: 'Add them' }));
  await screen.findByText(/sign in with a password, and need an address/u);
  expect(sent.filter(({ method }) => method === 'POST')).toEqual([]);

  await user.click(screen.getByRole('checkbox', { name: /officer/iu }));
  await user.click(screen.getByRole('button', { name: 'Add them' }));
  const next = await screen.findByRole('dialog', { name: 'Orra belongs to the village now' });
  expect(within(next).getByRole('link', { name: 'Make the card' }).getAttribute('href')).toBe(
    '/village/cards',
  );
  await user.click(within(next).getByRole('button', { name: 'Later' }));
  await screen.findByText(/signs in with a card, and is visited/u);
  expect(screen.queryByText(/Has not started yet/u)).toBeNull();
});

it('brings whoever was taken out back as who they were, where no address tells', async () => {
  const sent = answerWith({
    [`GET ${people}`]: () => ({ items: [ORRA], nextCursor: null }),
    [`DELETE ${people}/${ORRA.id}`]: () => new Response(null, { status: 204 }),
    [`POST ${people}`]: () => Response.json({ person: ORRA, oneTimeCode: null }, { status: 201 }),
  });
  const { user } = await renderOnBoard(<PeoplePage />, { session: STEWARD });
  await user.click(await screen.findByRole('button', { name: 'Take Orra out of the village' }));
  await user.click(await screen.findByRole('button', { name: 'Undo' }));
  expect(await screen.findByText('Orra is back.')).toBeTruthy();
  expect(sent.find(({ method }) => method === 'POST')?.body).toMatchObject({ personId: ORRA.id, email: '' });
});

it('gives an address to somebody who becomes an officer, at the field', async () => {
  answerWith({
    [`GET ${people}`]: () => ({ items: [ORRA], nextCursor: null }),
    [`PUT ${people}/${ORRA.id}`]: () =>
      refusal('invalid-input', 422, {
        errors: [{ field: 'email', code: 'address-taken', message: 'Somebody has this address already.' }],
      }),
  });
  const { user } = await renderOnBoard(<PeoplePage />, { session: STEWARD });
  await user.click(await screen.findByRole('button', { name: 'Change roles of Orra' }));
  const dialog = await screen.findByRole('dialog', { name: 'What Orra does here' });
  const address = within(dialog).getByRole('textbox', { name: 'E-mail address' });
  await user.type(address, 'officer@dawnpeg.example');
  await user.click(within(dialog).getByRole('button', { name: 'Save the roles' }));
  await within(dialog).findByText('Somebody has this address already.');
  expect((address as HTMLInputElement).value).toBe('officer@dawnpeg.example');
});
