import { SEEN_DAYS_BEFORE } from '#shared/calendar/signs-in.js';
import { addDays } from '#shared/kernel/iso-date.js';
import { Between, In, type EntityManager } from 'typeorm';
import { OwnSightingEntity } from '../../db/entities/own-sighting.entity.js';
import { SignSightingEntity } from '../../db/entities/sign-sighting.entity.js';

/** Work of a year may lie beyond its ends by so much. */
const DAYS_AROUND = 120;

interface WaitedFor {
  /** Signs of the village's list. */
  signIds: readonly string[];
  /** Entries with signs in their own words. */
  entryIds: readonly string[];
}

/** A sign of an entry as the days know it: by its id in the village's list, else by the entry and its own id. */
export function signKey(entryId: string, sharedId: string | undefined, ownId: string | undefined): string {
  return sharedId ?? `${entryId} ${ownId ?? ''}`;
}

/** On which days signs were marked as seen for the work of a year, oldest first; by whom is not told. */
export async function daysOfSigns(
  manager: EntityManager,
  { signIds, entryIds }: WaitedFor,
  year: number,
): Promise<Map<string, string[]>> {
  const day = Between(
    addDays(`${String(year)}-01-01`, -SEEN_DAYS_BEFORE - DAYS_AROUND),
    addDays(`${String(year)}-12-31`, DAYS_AROUND),
  );
  const order = { day: 'ASC', id: 'ASC' } as const;
  const listed = await manager.find(SignSightingEntity, {
    where: { signId: In([...new Set(signIds)]), day },
    order,
  });
  const own = await manager.find(OwnSightingEntity, { where: { entryId: In([...entryIds]), day }, order });
  const days = new Map<string, string[]>();
  const add = (key: string, seenOn: string) => days.set(key, [...(days.get(key) ?? []), seenOn]);
  for (const row of listed) add(row.signId, row.day);
  for (const row of own) add(signKey(row.entryId, undefined, row.ownId), row.day);
  return days;
}
