import { answeredCount, peopleGaps, signingObstacle, type ReviewState } from '#shared/calendar/sign-off.js';
import type { StillToAsk } from '#shared/contracts/letters.js';
import type { EntityManager } from 'typeorm';
import { CalendarVersionEntity } from '../../db/entities/calendar-version.entity.js';
import { MembershipEntity } from '../../db/entities/membership.entity.js';
import { PlaceEntity } from '../../db/entities/place.entity.js';
import { keptEntryIds } from '../../policy/entry-sight.js';
import { viewerOf } from '../../policy/viewer.js';
import { countOwn } from '../reviews/own-answers.service.js';
import { frozenContent } from '../versions/frozen-content.service.js';
import { readReviewState } from '../versions/review-state.service.js';
import { thingOf } from '../versions/seen-content.service.js';

/** A submission that waits for a person. */
export interface StillWaiting {
  /** With its calendar and place. */
  version: CalendarVersionEntity;
  communityId: string;
  personId: string;
  personName: string;
  /** Without one nobody writes: they are visited. */
  hasAddress: boolean;
  /** `answer-own`: for what they keep with others, which is nobody else's to know. */
  does: StillToAsk['does'] | 'answer-own';
}

/**
 * For whom the submissions in review wait: elders with entries to answer, whoever of the rule can sign, and everybody
 * else with entries that they keep. Whoever wrote to the draft is not asked about the draft.
 */
export async function stillWaiting(
  manager: EntityManager,
  now: Date,
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
    const hasKept = await keepsAny(manager, version);
    const members = await manager.find(MembershipEntity, {
      where: { communityId, ...(only.personId === undefined ? {} : { personId: only.personId }) },
      relations: { person: true },
      order: { person: { displayName: 'ASC' } },
    });
    for (const { personId, roles, person } of members) {
      const { displayName: personName, email } = person;
      const one = { version, communityId, personId, personName, hasAddress: email !== null };
      const does = whatWaits(personId, roles, review);
      if (does !== null) waiting.push({ ...one, does });
      // An elder is asked about the submission as a whole.
      if (!hasKept || roles.includes('elder')) continue;
      const viewer = await viewerOf(manager, { person: { id: personId }, communityId, roles }, now);
      const { answered, of } = await countOwn(manager, viewer, version);
      if (answered < of) waiting.push({ ...one, does: 'answer-own' });
    }
  }
  return waiting;
}

/** Whom the officer and the steward see on their list. */
export function isTold(one: StillWaiting): one is StillWaiting & { does: StillToAsk['does'] } {
  return one.does !== 'answer-own';
}

/** Whether anything of a submission is kept at all: mostly nothing is. */
async function keepsAny(manager: EntityManager, version: CalendarVersionEntity): Promise<boolean> {
  const { entries } = await frozenContent(manager, version);
  return (await keptEntryIds(manager, entries.map(thingOf))).size > 0;
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
