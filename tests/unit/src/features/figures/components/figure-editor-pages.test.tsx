import { screen, waitFor } from '@testing-library/react';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { readChart } from '#server/features/figures/chart.service.js';
import type { Community } from '#shared/contracts/people.js';
import { ChangeFigurePage, NewFigurePage } from '#src/features/figures/components/figure-editor-pages.js';
import { UPPER_TAZIMEL } from '#server/features/demo/demo-villages.data.js';
import { PLAIN_DETAILS } from '#shared/contracts/sharing.js';
import { answerWith, refusal } from '#tests/support/answers.js';
import { figureInput } from '#tests/support/figure-api.js';
import { OFFICER, renderOnBoard } from '#tests/support/on-board.js';

vi.setConfig({ testTimeout: 20_000 });

const communityId = OFFICER.memberships?.[0]?.communityId ?? '';
const figures = `/api/communities/${communityId}/figures`;
const community: Community = {
  ...UPPER_TAZIMEL.settings,
  id: communityId,
  version: 1,
  signOffRule: { minElders: 1, mustSign: [], oneOf: [], steward: true },
};
const SAVED = {
  ...figureInput(),
  sharing: PLAIN_DETAILS,
  storyLevel: 'village',
  storyShown: true,
  id: '0190a3a0-0000-7000-8000-0000000000f1',
  communityId,
  markerKey: 'f-0190a3a0-0000-7000-8000-0000000000f1',
  updatedBy: 'Beyno',
  updatedAt: '2027-06-06T09:00:00.000Z',
  version: 1,
  usedBy: [],
};
const ANSWERS = {
  [`GET /api/communities/${communityId}`]: community,
  'GET /api/chart': readChart(),
};

beforeEach(() => {
  localStorage.clear();
});
afterEach(() => {
  vi.unstubAllGlobals();
});

describe('a new figure', () => {
  it('begins with a well-known group, takes a star out, and is saved under the village’s own name', async () => {
    const log = answerWith({
      ...ANSWERS,
      [`POST ${figures}`]: ({ body }: { body: unknown }) => ({ ...SAVED, ...(body as object) }),
    });
    const { user, address } = await renderOnBoard(<NewFigurePage />);
    await user.type(await screen.findByLabelText('Name in Tazimeli'), 'Ŋɔ́rɛ̃');
    await user.selectOptions(screen.getByLabelText('Begin with a well-known group'), 'orion-belt');
    // Alnilam leads until somebody chooses another star or takes it out.
    expect(screen.getByRole('radio', { name: 'Alnilam – it leads' })).toBeTruthy();
    const [takeOut] = screen.getAllByRole('button', { name: 'Take Mintaka out' });
    if (takeOut) await user.click(takeOut);
    await user.click(screen.getByRole('button', { name: 'Save the figure' }));
    await waitFor(() => {
      expect(address()).toBe(`/figures/${SAVED.id}`);
    });
    expect(log.find(({ method }) => method === 'POST')?.body).toMatchObject({
      names: [{ tag: 'art-x-tazimel', name: 'Ŋɔ́rɛ̃' }],
      memberHrs: [1903, 1948],
      indicatorHr: 1903,
      sharingLevel: 'village',
      sharing: PLAIN_DETAILS,
      storyLevel: 'village',
    });
  });

  it('says at the field what is missing, and keeps what was typed for the next time', async () => {
    answerWith(ANSWERS);
    const first = await renderOnBoard(<NewFigurePage />);
    await first.user.type(await screen.findByLabelText('As it is told here'), 'The bowl.');
    await first.user.click(screen.getByRole('button', { name: 'Save the figure' }));
    expect(document.activeElement).toBe(screen.getByLabelText('Name in Tazimeli'));
    expect(screen.getByText('Choose at least one star, or mark a patch of sky instead.')).toBeTruthy();
    first.unmount();
    await renderOnBoard(<NewFigurePage />);
    expect((await screen.findByLabelText<HTMLTextAreaElement>('As it is told here')).value).toBe('The bowl.');
    expect(screen.getByRole('button', { name: 'Throw it away' })).toBeTruthy();
  });
});

describe('changing a figure', () => {
  it('lays a newer state beside one’s own and saves what was chosen over it', async () => {
    let isStale = true;
    const theirs = { ...SAVED, story: 'Theirs.', version: 2 };
    const log = answerWith({
      ...ANSWERS,
      [`GET ${figures}/${SAVED.id}`]: SAVED,
      [`PUT ${figures}/${SAVED.id}`]: ({ body }: { body: unknown }) => {
        if (!isStale) return { ...SAVED, ...(body as object), version: 3 };
        isStale = false;
        return refusal('stale', 409, { current: theirs, sent: body });
      },
    });
    const { user } = await renderOnBoard(<ChangeFigurePage />, {
      path: `/figures/${SAVED.id}/change`,
      pattern: '/figures/:figureId/change',
    });
    const story = await screen.findByLabelText('As it is told here');
    await user.clear(story);
    await user.type(story, 'Mine.');
    await user.click(screen.getByRole('button', { name: 'Save the figure' }));
    await user.click(await screen.findByRole('radio', { name: /What you wrote/u }));
    await user.click(screen.getByRole('button', { name: 'Go on with these' }));
    await user.click(screen.getByRole('button', { name: 'Save the figure' }));
    await waitFor(() => {
      expect(log.filter(({ method }) => method === 'PUT')).toHaveLength(2);
    });
    expect(log.filter(({ method }) => method === 'PUT').at(-1)?.body).toMatchObject({
      story: 'Mine.',
      version: 2,
    });
  });
});
