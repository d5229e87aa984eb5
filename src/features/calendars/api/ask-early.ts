import type { QueryClient } from '@tanstack/react-query';
import { calendarQuery, communityQuery, markersQuery, versionsQuery } from '#src/lib/calendar-queries.js';
import { rolesIn } from '#src/lib/roles-in.js';
import { sessionQuery } from '#src/lib/session.js';
import { entriesQuery } from './calendars-queries.js';

/**
 * Asks for what the editor shows first, while its code is still on its way; only for those who may read a draft. The
 * entries go before all else. What fails is asked again by the screen, which says so.
 */
export async function askEarly(client: QueryClient, calendarId: string): Promise<void> {
  const [{ memberships }, { communityId, placeId, year }] = await Promise.all([
    client.query(sessionQuery),
    client.query(calendarQuery(calendarId)),
  ]);
  if (!rolesIn(memberships ?? [], communityId).seesDrafts) return;
  await Promise.all([
    client.query(entriesQuery(calendarId)),
    client.query(markersQuery(placeId, year)),
    client.query(communityQuery(communityId)),
    client.query(versionsQuery(calendarId)),
  ]);
}
