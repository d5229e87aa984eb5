import type { EntryAdvice } from '#shared/calendar/advice.js';
import type { ActualDays } from '#shared/contracts/actual-days.js';
import type { Calendar, Entry, EntryDates, EntryInput } from '#shared/contracts/calendars.js';
import type { CalendarEntity } from '../../db/entities/calendar.entity.js';
import type { EntryEntity } from '../../db/entities/entry.entity.js';
import type { PublishedFacts } from './calendars.repository.js';

export interface CalendarFacts {
  /** With community and place. */
  row: CalendarEntity;
  published: PublishedFacts | null;
  /** Of the draft or of what was published, as far as the person sees it. */
  entryCount: number;
  /** Whoever does not see drafts learns nothing about one: not that it is out, how long it is, when it changed. */
  showsDraft: boolean;
  /** The year that the draft was begun from, where it was. */
  rolledFromYear: number | null;
}

export function toCalendar({
  row,
  published,
  entryCount,
  showsDraft,
  rolledFromYear,
}: CalendarFacts): Calendar {
  return {
    id: row.id,
    communityId: row.communityId,
    communityName: row.community.name,
    placeId: row.placeId,
    placeName: row.place.name,
    year: row.year,
    locked: showsDraft && row.outNumber !== null,
    outNumber: showsDraft ? row.outNumber : null,
    published: published && { number: published.number, label: published.label },
    entryCount,
    updatedAt: (showsDraft ? row.updatedAt : (published?.publishedAt ?? row.createdAt)).toISOString(),
    ...(showsDraft && rolledFromYear !== null && row.submissionCount === 0 ? { rolledFromYear } : {}),
  };
}

export interface EntryFacts {
  row: EntryEntity;
  /** With its giver named as they wish. */
  content: EntryInput;
  dates: EntryDates;
  updatedByName: string;
  /** Among those that the person sees, so that no gap shows what they do not see. */
  position: number;
  mine: boolean;
  actual: ActualDays | null;
  advice: readonly EntryAdvice[];
}

export function toEntry(facts: EntryFacts): Entry {
  const { row, content, dates, updatedByName, position, mine, actual, advice } = facts;
  return {
    id: row.id,
    calendarId: row.calendarId,
    position,
    version: row.version,
    content,
    dates,
    updatedBy: updatedByName,
    updatedAt: row.updatedAt.toISOString(),
    mine,
    ...(row.isOlder && { isOlder: true as const }),
    ...(actual && { actual }),
    ...(advice.length > 0 && { advice: [...advice] }),
  };
}
