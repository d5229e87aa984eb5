import { screen, within } from '@testing-library/react';
import { afterEach, beforeEach, expect, it, vi } from 'vitest';
import type { Community, Role } from '#shared/contracts/people.js';
import type { SessionState } from '#shared/contracts/session.js';
import { UPPER_TAZIMEL } from '#server/features/demo/demo-villages.data.js';
import { SettingsPage } from '#src/features/people/components/settings-page.js';
import { answerWith } from '#tests/support/answers.js';
import { OFFICER, renderOnBoard } from '#tests/support/on-board.js';

const id = OFFICER.memberships?.[0]?.communityId ?? '';
const path = `/api/communities/${id}`;
const VILLAGE: Community = {
  ...UPPER_TAZIMEL.settings,
  localMonths: [{ name: 'Ŋɔ́rɛ̃', begins: { month: 6, day: 8 } }],
  signOffRule: { minElders: 1, mustSign: [], oneOf: [], steward: false },
  ...{ id, version: 1 },
};

function as(...roles: Role[]): SessionState {
  return { ...OFFICER, memberships: (OFFICER.memberships ?? []).map((each) => ({ ...each, roles })) };
}

async function show(session: SessionState) {
  const sent = answerWith({
    [`GET ${path}`]: VILLAGE,
    [`GET ${path}/people`]: { items: [], nextCursor: null },
    [`PUT ${path}`]: ({ body }: { body: unknown }) => ({ ...(body as Community), id, version: 2 }),
  });
  const { user } = await renderOnBoard(<SettingsPage />, { session });
  const puts = () => sent.filter(({ method }) => method === 'PUT').map(({ body }) => body);
  return { user, puts };
}

beforeEach(() => {
  localStorage.clear();
});
afterEach(() => {
  vi.unstubAllGlobals();
});

it('names months and Moons: two on one day, or one without a name, are said at their fields', async () => {
  const { user, puts } = await show(as('steward'));
  const months = within(await screen.findByRole('region', { name: 'Months of the village' }));
  await user.click(months.getByRole('button', { name: 'Add a month' }));
  const second = months.getByRole('textbox', { name: 'Name of month 2' });
  expect(document.activeElement).toBe(second);
  const begins = within(months.getAllByRole('group', { name: 'Begins' })[1] ?? document.body);
  expect(begins.getByRole('combobox', { name: 'Month' })).toHaveProperty('value', '7');
  await user.selectOptions(begins.getByRole('combobox', { name: 'Month' }), 'June');
  const save = screen.getByRole('button', { name: 'Save the settings' });
  await user.click(save);
  expect(second.getAttribute('aria-invalid')).toBe('true');
  await user.click(second);
  await user.paste('Wírra̰m');
  await user.click(save);
  await months.findByText(/Another month begins on this day already/u);
  expect(puts()).toEqual([]);

  await user.selectOptions(begins.getByRole('combobox', { name: 'Month' }), 'August');
  await user.click(screen.getByText('Name the Moons'));
  await user.click(screen.getByRole('textbox', { name: 'Moon 1' }));
  await user.paste('Màvɔru');
  await user.click(save);
  await screen.findByText('The settings are saved.');
  expect(puts()).toMatchObject([
    {
      localMonths: [
        { name: 'Ŋɔ́rɛ̃', begins: { month: 6, day: 8 } },
        { name: 'Wírra̰m', begins: { month: 8, day: 8 } },
      ],
      moonNames: ['Màvɔru', ...VILLAGE.moonNames.slice(1)],
    },
  ]);

  await user.click(months.getByRole('button', { name: 'Take out month 1' }));
  expect(months.getByRole('textbox', { name: 'Name of month 1' })).toHaveProperty('value', 'Wírra̰m');
});

it('whoever does not change them reads them', async () => {
  await show(as('officer'));
  expect(await screen.findByText('Ŋɔ́rɛ̃ from 8 June')).toBeTruthy();
  expect(screen.getByText('Moon 13: Zìɓɔ́n')).toBeTruthy();
  expect(screen.queryByRole('textbox')).toBeNull();
});
