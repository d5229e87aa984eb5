import { screen } from '@testing-library/react';
import { beforeEach, describe, expect, it } from 'vitest';
import { useCommunityChoice, useCurrentCommunity, useRoles } from '#src/lib/community.js';
import { OFFICER, renderOnBoard } from '#tests/support/on-board.js';

const second = {
  communityId: '0190a3a0-0000-7000-8000-0000000000a2',
  communityName: 'Vardesca Terraces',
  roles: ['staff' as const, 'observer' as const],
};
const both = { ...OFFICER, memberships: [...(OFFICER.memberships ?? []), second] };

function Here() {
  const { communityName } = useCurrentCommunity();
  const { choose } = useCommunityChoice();
  const { is } = useRoles();
  return (
    <>
      <p>
        {communityName}: {is('officer', 'steward') ? 'compiles' : 'reads'}
      </p>
      <button onClick={() => choose(second.communityId)}>other</button>
    </>
  );
}

beforeEach(() => {
  localStorage.clear();
});

describe('the village on screen', () => {
  it('is the first one until another is chosen, and brings its own roles', async () => {
    const { user } = await renderOnBoard(<Here />, { session: both });
    expect(screen.getByText('Upper Tazimel: compiles')).toBeDefined();
    await user.click(screen.getByText('other'));
    expect(screen.getByText('Vardesca Terraces: reads')).toBeDefined();
  });

  it('is remembered on this device', async () => {
    const first = await renderOnBoard(<Here />, { session: both });
    await first.user.click(screen.getByText('other'));
    first.unmount();
    await renderOnBoard(<Here />, { session: both });
    expect(screen.getByText('Vardesca Terraces: reads')).toBeDefined();
  });

  it('falls back to one of their own when the remembered membership has ended', async () => {
    const first = await renderOnBoard(<Here />, { session: both });
    await first.user.click(screen.getByText('other'));
    first.unmount();
    await renderOnBoard(<Here />, { session: OFFICER });
    expect(screen.getByText('Upper Tazimel: compiles')).toBeDefined();
  });
});
