import type { EntryDates, EntryInput } from '#shared/contracts/calendars.js';
import type { VariantInput } from '#shared/contracts/variants.js';
import { In, type EntityManager } from 'typeorm';
import type { EntryEntity } from '../../db/entities/entry.entity.js';
import { EntryVariantEntity } from '../../db/entities/entry-variant.entity.js';
import type { SkyDatesService } from '../calendars/sky-dates.service.js';
import type { WatchedPlace } from '../places/watched-place.service.js';

export interface DraftVariant {
  row: EntryVariantEntity;
  dates: EntryDates;
}

/** Variants of entries of a draft with the dates of today's engine, each entry's in the order in which they came. */
export async function draftVariants(
  manager: EntityManager,
  sky: SkyDatesService,
  place: WatchedPlace,
  year: number,
  entries: readonly EntryEntity[],
): Promise<DraftVariant[]> {
  if (entries.length === 0) return [];
  const byId = new Map(entries.map((entry) => [entry.id, entry]));
  const rows = await manager.find(EntryVariantEntity, {
    where: { entryId: In([...byId.keys()]) },
    order: { addedAt: 'ASC', id: 'ASC' },
  });
  const known = rows.flatMap((row) => {
    const entry = byId.get(row.entryId);
    return entry ? [{ row, content: timedLike(entry.content, row.content) }] : [];
  });
  const dates = sky.datesOf(
    place,
    year,
    known.map(({ content }) => content),
  );
  return known.flatMap(({ row }, index) => {
    const own = dates[index];
    return own ? [{ row, dates: own }] : [];
  });
}

/** The entry with the variant's timing: kind, last date and watch are the entry's, because the work is the same. */
export function timedLike(
  entry: EntryInput,
  { lead, offsets, otherSigns, ifLate }: VariantInput,
): EntryInput {
  return { ...entry, lead, offsets, otherSigns, ifLate };
}
