import { screen } from '@testing-library/react';
import { afterEach, expect, it, vi } from 'vitest';
import type { SessionState } from '#shared/contracts/session.js';
import { HelpingBoard } from '#src/features/helping/components/helping-board.js';
import { answerWith, refusal } from '#tests/support/answers.js';
import { OFFICER, renderOnBoard } from '#tests/support/on-board.js';

const VILLAGE = OFFICER.memberships?.[0]?.communityId ?? '';
const ELDER = '0190a3a0-0000-7000-8000-0000000000e1';
const CODE = 'ABC-DEF-GHJ-KLM-NPQ-RST';
const OBSERVER: SessionState = {
  ...OFFICER,
  memberships: (OFFICER.memberships ?? []).map((each) => ({ ...each, roles: ['observer'] })),
};
const helping = `/api/communities/${VILLAGE}/helping`;
const list = { items: [{ personId: ELDER, displayName: 'Elder A-1', hasPin: true }], nextCursor: null };

afterEach(() => {
  vi.unstubAllGlobals();
});

it('asks whoever only reads for the elder’s card and PIN, each at its field, and sends neither half', async () => {
  const sent = answerWith({
    [`GET ${helping}`]: () => list,
    [`POST ${helping}`]: () =>
      refusal('invalid-input', 422, {
        errors: [{ field: 'card.code', code: 'card-of-another', message: 'Not their card.' }],
      }),
  });
  const { user } = await renderOnBoard(<HelpingBoard scan={() => null} />, { session: OBSERVER });
  await user.click(screen.getByRole('button', { name: 'Begin' }));
  await screen.findByText('Choose whom you help.');
  await user.selectOptions(await screen.findByLabelText('Whom do you help?'), ELDER);
  await user.click(screen.getByRole('button', { name: 'Begin' }));
  await screen.findByText(/A card has eighteen letters and numbers/u);
  await user.type(screen.getByLabelText('Letters on their card'), CODE);
  await user.click(screen.getByRole('button', { name: 'Begin' }));
  await screen.findByText(/four to six/iu);
  expect(sent.filter(({ method }) => method === 'POST')).toEqual([]);

  await user.type(screen.getByLabelText('Their PIN'), '4711');
  await user.click(screen.getByRole('button', { name: 'Begin' }));
  await screen.findByText(/These are not the letters of their card/u);
  expect(sent.at(-1)?.body).toEqual({ personId: ELDER, card: { code: CODE, pin: '4711' } });
  expect(screen.getByLabelText<HTMLInputElement>('Their PIN').value).toBe('');
});

it('takes the letters from a card that was read by the camera, and lets an officer do without', async () => {
  const sent = answerWith({
    [`GET ${helping}`]: () => list,
    [`POST ${helping}`]: () => OFFICER,
  });
  const scan = (onFound: (code: string) => void) => (
    <button
      type="button"
      onClick={() => {
        onFound(CODE);
      }}
    >
      Scan the card
    </button>
  );
  const { user } = await renderOnBoard(<HelpingBoard scan={scan} />);
  await user.selectOptions(await screen.findByLabelText('Whom do you help?'), ELDER);
  await user.click(screen.getByRole('button', { name: 'Begin' }));
  await vi.waitFor(() => {
    expect(sent.at(-1)?.body).toEqual({ personId: ELDER, card: null });
  });
  await user.click(screen.getByRole('button', { name: 'Scan the card' }));
  expect(screen.getByLabelText<HTMLInputElement>('Letters on their card').value).toBe(CODE);
});
