import { draftAdvice, ENTRY_ADVICE, markerRange, type EntryAdvice } from '#shared/calendar/advice.js';
import type { EntityManager } from 'typeorm';
import type { CalendarEntity } from '../../db/entities/calendar.entity.js';
import { PlaceEntity } from '../../db/entities/place.entity.js';
import type { Draft, DraftEntry } from './draft.service.js';
import type { SkyDatesService } from './sky-dates.service.js';

/** What to look at besides an entry's own days, by entry: from those alone that the person sees. */
export async function adviceOf(
  manager: EntityManager,
  sky: SkyDatesService,
  { calendar: { placeId, year }, place }: { calendar: CalendarEntity; place: Draft['place'] },
  entries: readonly DraftEntry[],
): Promise<Map<string, EntryAdvice[]>> {
  const { rainMonths } = await manager.findOneOrFail(PlaceEntity, {
    where: { id: placeId },
    select: { id: true, rainMonths: true },
  });
  const fromDraft = draftAdvice(
    entries.map(({ row: { id, content }, dates: { window, marker } }) => ({
      ...{ id, content, window },
      markerRange: markerRange(marker),
    })),
    rainMonths,
  );
  const ofSky = sky.advice.of(
    place,
    year,
    entries.map(({ row }) => row.content),
  );
  return new Map(
    entries.map(({ row: { id } }, index) => {
      const told = new Set([...(fromDraft.get(id) ?? []), ...(ofSky[index] ?? [])]);
      return [id, ENTRY_ADVICE.filter((one) => told.has(one))];
    }),
  );
}
