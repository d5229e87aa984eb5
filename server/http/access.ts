import type { Access } from '#shared/contracts/endpoint.js';
import type { Role } from '#shared/contracts/people.js';
import type { DataSource } from 'typeorm';
import { AttachmentEntity } from '../db/entities/attachment.entity.js';
import { CalendarEntity } from '../db/entities/calendar.entity.js';
import { MembershipEntity } from '../db/entities/membership.entity.js';
import { PlaceEntity } from '../db/entities/place.entity.js';
import type { Actor, Person } from './actor.js';
import { AppError, notFound } from './app-error.js';

type MemberAccess = Extract<Access, { kind: 'member' }>;

/**
 * The one gate of every community's data: finds the community that the path belongs to, then the person's
 * membership, then the role. A stranger learns nothing (404), a member without the role gets 403.
 */
export async function admit(
  dataSource: DataSource,
  access: MemberAccess,
  person: Person,
  params: Readonly<Record<string, string>>,
  /** Roles that count, where not all of the person's do. */
  only: readonly Role[] | null = null,
): Promise<Actor> {
  const found = await communityOf(dataSource, access.scope, params);
  const communityId = person.byCardIn === undefined || person.byCardIn === found ? found : null;
  const membership =
    communityId === null
      ? null
      : await dataSource
          .getRepository(MembershipEntity)
          .findOne({ where: { communityId, personId: person.id } });
  if (communityId === null || membership === null) throw notFound();
  const roles = membership.roles.filter((role) => only?.includes(role) ?? true);
  if (!access.roles.some((role) => roles.includes(role))) throw new AppError('not-allowed');
  return { person, communityId, roles };
}

/** The community that a path belongs to; null where it names nothing. */
export async function communityOf(
  dataSource: DataSource,
  scope: MemberAccess['scope'],
  params: Readonly<Record<string, string>>,
): Promise<string | null> {
  if (scope === 'community') return params['communityId'] ?? null;
  const id = params[`${scope}Id`] ?? '';
  const row = await dataSource
    .getRepository<{ id: string; communityId: string }>(OWNERS[scope])
    .findOne({ where: { id }, select: { id: true, communityId: true } });
  return row?.communityId ?? null;
}

/** What a path may name instead of its community. */
const OWNERS = { place: PlaceEntity, calendar: CalendarEntity, attachment: AttachmentEntity } as const;
