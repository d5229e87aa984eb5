import type { Combination } from '../../docker-free-scripts/lib/visibility-rules.js';
import type { Client } from './api.js';
import type { Plant } from './levelled-village.js';

/** A lesson of the giver about each entry, and a decision of the officer about each that is the village's. */
export async function lookBack(
  { elder, officer }: { elder: Client; officer: Client },
  calendarId: string,
  { all, villages }: Record<'all' | 'villages', readonly (Combination & { id: string })[]>,
  plant: Plant,
): Promise<void> {
  const path = `/api/calendars/${calendarId}/season-review`;
  for (const { id: entryId, ...thing } of all) {
    await elder.post(`${path}/lessons`, { entryId, text: plant('lesson', thing) }).expect(201);
  }
  for (const { id: entryId, ...thing } of villages) {
    const said = { entryId, kind: 'other-sign', text: plant('decision', thing) };
    await officer.post(`${path}/decisions`, said).expect(201);
  }
}
