import type { Calendar, Entry, EntryDates } from '#shared/contracts/calendars.js';
import type { PlaceSnapshot } from '#shared/contracts/stars.js';
import type { CalendarEntity } from '../../db/entities/calendar.entity.js';
import type { EntryEntity } from '../../db/entities/entry.entity.js';
import type { PlaceEntity } from '../../db/entities/place.entity.js';
import type { PublishedFacts } from './calendars.repository.js';

export interface CalendarFacts {
  /** With community and place. */
  row: CalendarEntity;
  published: PublishedFacts | null;
  draftEntryCount: number;
  /** Whoever does not see drafts learns nothing about one: not that it is out, how long it is, when it changed. */
  showsDraft: boolean;
}

export function toCalendar({ row, published, draftEntryCount, showsDraft }: CalendarFacts): Calendar {
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
    entryCount: showsDraft ? draftEntryCount : (published?.entryCount ?? 0),
    updatedAt: (showsDraft ? row.updatedAt : (published?.publishedAt ?? row.createdAt)).toISOString(),
  };
}

export function toEntry(row: EntryEntity, dates: EntryDates, updatedByName: string): Entry {
  return {
    id: row.id,
    calendarId: row.calendarId,
    position: row.position,
    version: row.version,
    content: row.content,
    dates,
    updatedBy: updatedByName,
    updatedAt: row.updatedAt.toISOString(),
  };
}

export function toPlaceSnapshot(row: PlaceEntity): PlaceSnapshot {
  return {
    name: row.name,
    latitudeDeg: row.latitudeDeg,
    longitudeDeg: row.longitudeDeg,
    elevationM: row.elevationM,
    timeZone: row.timeZone,
    skyline: row.skyline,
    clarityByMonth: row.clarityByMonth,
    thresholdSet: row.thresholdSet,
    sameSideShiftDeg: row.sameSideShiftDeg,
    oppositeSideShiftDeg: row.oppositeSideShiftDeg,
    skylineRule: row.skylineRule,
  };
}
