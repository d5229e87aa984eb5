import type { QueryClient } from '@tanstack/react-query';
import type { Membership } from '#shared/contracts/people.js';
import { calendarQuery, communityQuery, markersQuery, versionsQuery } from '#src/lib/calendar-queries.js';
import { rolesIn } from '#src/lib/roles-in.js';
import { sessionQuery } from '#src/lib/session.js';
import { entriesQuery } from './calendars-queries.js';

/**
 * Asks for what the editor shows first, while its code is still on its way; only for those who may read a draft. The
 * entries go before all else. What fails is asked again by the screen, which says so.
 */
export async function askEarly(client: QueryClient, calendarId: string): Promise<void> {
  const whose = client.query(calendarQuery(calendarId));
  whose.catch(() => undefined);
  const memberships = (await client.query(sessionQuery)).memberships ?? [];
  const entries = () => client.query(entriesQuery(calendarId));
  // Who reads drafts in each of their villages need not wait until it is known whose calendar it is.
  const early = seesEveryDraft(memberships) ? entries() : null;
  early?.catch(() => undefined);
  const { communityId, placeId, year } = await whose;
  if (!rolesIn(memberships, communityId).seesDrafts) return;
  await Promise.all([
    early ?? entries(),
    client.query(markersQuery(placeId, year)),
    client.query(communityQuery(communityId)),
    client.query(versionsQuery(calendarId)),
  ]);
}

function seesEveryDraft(memberships: readonly Membership[]): boolean {
  return (
    memberships.length > 0 &&
    memberships.every(({ communityId }) => rolesIn(memberships, communityId).seesDrafts)
  );
}
