import { answeredCount, peopleGaps, signingObstacle, type ReviewState } from '#shared/calendar/sign-off.js';
import type { StillToAsk } from '#shared/contracts/letters.js';
import type { EntityManager } from 'typeorm';
import { CalendarVersionEntity } from '../../db/entities/calendar-version.entity.js';
import { MembershipEntity } from '../../db/entities/membership.entity.js';
import { PlaceEntity } from '../../db/entities/place.entity.js';
import { readReviewState } from '../versions/review-state.service.js';

/** A submission that waits for a person. */
export interface StillWaiting {
  /** With its calendar and place. */
  version: CalendarVersionEntity;
  communityId: string;
  personId: string;
  personName: string;
  /** Without one nobody writes: they are visited. */
  hasAddress: boolean;
  does: StillToAsk['does'];
}

/**
 * For whom the submissions in review wait: elders with entries to answer, and whoever of the rule can sign.
 * Whoever wrote to the draft is not asked.
 */
export async function stillWaiting(
  manager: EntityManager,
  only: { communityId?: string; personId?: string } = {},
): Promise<StillWaiting[]> {
  const versions = await manager.find(CalendarVersionEntity, {
    where: {
      state: 'in-review',
      ...(only.communityId === undefined ? {} : { calendar: { communityId: only.communityId } }),
    },
    relations: { calendar: { place: true } },
    order: { submittedAt: 'ASC' },
  });
  const waiting: StillWaiting[] = [];
  for (const version of versions) {
    const { communityId } = version.calendar;
    const review = await readReviewState(manager, version);
    const members = await manager.find(MembershipEntity, {
      where: { communityId, ...(only.personId === undefined ? {} : { personId: only.personId }) },
      relations: { person: true },
      order: { person: { displayName: 'ASC' } },
    });
    for (const { personId, roles, person } of members) {
      const does = whatWaits(personId, roles, review);
      if (does !== null) {
        const { displayName: personName, email } = person;
        waiting.push({ version, communityId, personId, personName, hasAddress: email !== null, does });
      }
    }
  }
  return waiting;
}

/** What a person is asked about; the letters about it share the beginning of their key. */
export function topicOf({ does, version, personId }: StillWaiting): string {
  return `${does}:${version.id}:${personId}`;
}

/** A village keeps the time of the place that it set first. */
export async function villageTimeZone(manager: EntityManager, communityId: string): Promise<string> {
  const place = await manager.findOne(PlaceEntity, { where: { communityId }, order: { createdAt: 'ASC' } });
  return place?.timeZone ?? 'UTC';
}

function whatWaits(
  personId: string,
  roles: MembershipEntity['roles'],
  review: ReviewState,
): StillToAsk['does'] | null {
  if (review.writerIds.has(personId)) return null;
  if (roles.includes('elder')) {
    const signed = review.signatures.some((one) => one.personId === personId && one.role === 'elder');
    const answered = answeredCount(personId, review.entries, review.answers);
    if (!signed && answered < review.entries.length) return 'answer';
    if (maySign(personId, 'elder', review)) return 'sign-as-elder';
  }
  return roles.includes('steward') && maySign(personId, 'steward', review) ? 'sign-as-steward' : null;
}

/** Only whose signature brings the rule further is asked for it; the steward once everybody else has signed. */
function maySign(personId: string, role: 'elder' | 'steward', review: ReviewState): boolean {
  if (signingObstacle({ personId, role }, review, true) !== null) return false;
  const gaps = (signatures: ReviewState['signatures']) =>
    peopleGaps(review.rule, signatures).reduce((sum, { count }) => sum + count, 0);
  const after = gaps([...review.signatures, { personId, role }]);
  return role === 'steward' ? after === 0 : after < gaps(review.signatures);
}
