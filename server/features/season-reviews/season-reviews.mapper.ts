import { spanOfSeen } from '#shared/calendar/signs-in.js';
import type { ActualDays } from '#shared/contracts/actual-days.js';
import type { Decision, Lesson, ReviewedEntry, reviewedSign } from '#shared/contracts/season-reviews.js';
import type { VersionEntryBody } from '#shared/contracts/versions.js';
import { dayNumberFromIso } from '#shared/kernel/iso-date.js';
import type { Figure } from '#shared/sky/index.js';
import type { z } from 'zod';
import type { SeasonDecisionEntity } from '../../db/entities/season-decision.entity.js';
import type { SeasonLessonEntity } from '../../db/entities/season-lesson.entity.js';
import { signKey } from '../signs/days-of-signs.service.js';
import { markerNamesOf } from '../stars/marker-names.service.js';

export interface LineFacts {
  body: VersionEntryBody;
  year: number;
  figures: readonly Figure[];
  isPublished: boolean;
  inDraft: boolean;
  actual: ActualDays | null;
  /** Days on which each sign was seen, oldest first; see `signKey`. */
  seenDays: ReadonlyMap<string, readonly string[]>;
  lessons: Lesson[];
  decisions: Decision[];
}

export function toReviewedEntry({ body, year, figures, ...facts }: LineFacts): ReviewedEntry {
  const { entryId, content, dates } = body;
  const { isPublished, inDraft, actual, lessons, decisions } = facts;
  return {
    entryId,
    titleVillage: content.titleVillage,
    titleOfficer: content.titleOfficer,
    kind: content.kind,
    protectiveWatch: content.protectiveWatch,
    planned: dates,
    ...{ isPublished, inDraft, actual },
    star: starOf(body, figures),
    signs: signsOf(body, year, facts.seenDays),
    otherSigns: content.otherSigns,
    ...{ lessons, decisions },
  };
}

function starOf({ content: { lead } }: VersionEntryBody, figures: readonly Figure[]): ReviewedEntry['star'] {
  if (lead.type !== 'marker' && lead.type !== 'marker-as-seen') return null;
  const { name, designation } = markerNamesOf(lead.markerKey, figures);
  return {
    name: name === '' ? designation : name,
    phenomenon: lead.phenomenon,
    seen: lead.type === 'marker-as-seen' ? lead.seen : null,
  };
}

function signsOf(
  { entryId, content: { record }, dates }: VersionEntryBody,
  year: number,
  seenDays: ReadonlyMap<string, readonly string[]>,
): z.infer<typeof reviewedSign>[] {
  if (record === undefined) return [];
  const span = spanOfSeen(dates.window, year, record.when);
  return record.signs.list.map(({ name, sharedId, ownId }, place) => {
    const canBeMarked = (sharedId ?? ownId) !== undefined;
    const days = canBeMarked ? seenDays.get(signKey(entryId, sharedId, ownId)) : undefined;
    const came = days?.find((day) => {
      const number = dayNumberFromIso(day);
      return span.first <= number && number <= span.last;
    });
    return {
      name,
      mustHave: record.signs.mustHave === place,
      canBeMarked,
      cameOn: came ?? null,
    };
  });
}

export function toLesson(
  { id, text, authorId, typedBy, writtenAt }: SeasonLessonEntity,
  personId: string,
  nameOf: (personId: string) => string,
): Lesson {
  return {
    ...{ id, text, by: nameOf(authorId) },
    ...(typedBy === null ? {} : { typedBy: nameOf(typedBy) }),
    writtenAt: writtenAt.toISOString(),
    mine: authorId === personId,
  };
}

export function toDecision(
  { id, kind, text, authorId, decidedAt, doneBy, doneOn }: SeasonDecisionEntity,
  nameOf: (personId: string) => string,
): Decision {
  return {
    ...{ id, kind, text, by: nameOf(authorId) },
    decidedAt: decidedAt.toISOString(),
    done: doneBy === null || doneOn === null ? null : { on: doneOn, by: nameOf(doneBy) },
  };
}
