import { SEEN_DAYS_BACK } from '#shared/contracts/signs.js';
import { addDays } from '#shared/kernel/iso-date.js';
import { In, IsNull, MoreThanOrEqual, type EntityManager } from 'typeorm';
import { SignSightingEntity } from '../../db/entities/sign-sighting.entity.js';
import { SignEntity } from '../../db/entities/sign.entity.js';
import { invalidField } from '../../http/app-error.js';

/** By name, as people sort it. */
export async function signRows(manager: EntityManager, communityId: string): Promise<SignEntity[]> {
  const rows = await manager.findBy(SignEntity, { communityId, takenOutAt: IsNull() });
  return rows.sort((a, b) => a.words.name.localeCompare(b.words.name) || a.id.localeCompare(b.id));
}

/** Of the last year or so, newest day first, by sign. */
export async function lateSightings(
  manager: EntityManager,
  signIds: readonly string[],
  today: string,
): Promise<Map<string, SignSightingEntity[]>> {
  const bySign = new Map<string, SignSightingEntity[]>();
  if (signIds.length === 0) return bySign;
  const rows = await manager.find(SignSightingEntity, {
    where: { signId: In([...signIds]), day: MoreThanOrEqual(firstDayTold(today)) },
    order: { day: 'DESC', markedAt: 'DESC', id: 'ASC' },
  });
  for (const row of rows) bySign.set(row.signId, [...(bySign.get(row.signId) ?? []), row]);
  return bySign;
}

/** Not a day that is still to come, nor one that is told no more. */
export function expectDayTold(day: string, today: string): void {
  if (day > today) throw invalidField('day', 'still-to-come');
  if (day < firstDayTold(today)) throw invalidField('day', 'too-long-ago');
}

/** The first day of which it is still told that a sign was seen. */
export function firstDayTold(today: string): string {
  return addDays(today, -SEEN_DAYS_BACK);
}
