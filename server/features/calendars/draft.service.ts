import type { EntryDates } from '#shared/contracts/calendars.js';
import type { PlaceSnapshot } from '#shared/contracts/stars.js';
import type { EntityManager } from 'typeorm';
import { CalendarEntity } from '../../db/entities/calendar.entity.js';
import { DraftContributionEntity } from '../../db/entities/draft-contribution.entity.js';
import type { EntryEntity } from '../../db/entities/entry.entity.js';
import { PlaceEntity } from '../../db/entities/place.entity.js';
import { AppError, notFound } from '../../http/app-error.js';
import { everyVillageFigure } from '../figures/village-figures.service.js';
import { toPlaceSnapshot } from '../places/place-snapshot.service.js';
import { inVillageWords, knownWords } from '../word-lists/known-words.service.js';
import { liveEntries } from './calendars.repository.js';
import { withAnchors } from './anchored-draft.service.js';
import type { SkyDatesService } from './sky-dates.service.js';

export interface DraftEntry {
  row: EntryEntity;
  /** What the entry's own content gives; warnings about two entries are not in it. */
  dates: EntryDates;
}

export interface Draft {
  /** With every figure of the village, also those that were taken out. */
  place: PlaceSnapshot;
  entries: DraftEntry[];
}

/**
 * Every change of a calendar, of its draft, of its versions and of the answers to them begins with this lock. So
 * they wait for each other, and none of them can meet a state that another is about to change.
 */
export async function lockCalendar(manager: EntityManager, calendarId: string): Promise<CalendarEntity> {
  const calendar = await manager.findOne(CalendarEntity, {
    where: { id: calendarId },
    lock: { mode: 'pessimistic_write' },
  });
  if (calendar === null) throw notFound();
  return calendar;
}

/** The same for a change of the draft, which is locked while a submission is out. */
export async function lockOpenDraft(manager: EntityManager, calendarId: string): Promise<CalendarEntity> {
  const calendar = await lockCalendar(manager, calendarId);
  expectOpen(calendar);
  return calendar;
}

export function expectOpen({ outNumber }: CalendarEntity): void {
  if (outNumber !== null) throw new AppError('draft-locked');
}

/** Writes down that somebody wrote to the draft: until the next published version they cannot sign. */
export async function recordContribution(
  manager: EntityManager,
  calendarId: string,
  personId: string,
  at: Date,
): Promise<void> {
  await manager.upsert(DraftContributionEntity, { calendarId, personId, lastAt: at }, [
    'calendarId',
    'personId',
  ]);
  await manager.update(CalendarEntity, { id: calendarId }, { updatedAt: at });
}

/** Whoever wrote to the draft since the last published version. */
export async function draftWriterIds(manager: EntityManager, calendarId: string): Promise<string[]> {
  const rows = await manager.findBy(DraftContributionEntity, { calendarId });
  return rows.map(({ personId }) => personId).sort();
}

/** A published version ends the count; whoever writes next compiles the next one. */
export async function forgetContributions(manager: EntityManager, calendarId: string): Promise<void> {
  await manager.delete(DraftContributionEntity, { calendarId });
}

/** The draft as it stands, with the dates of today's engine and in today's words of the village. */
export async function readDraft(
  manager: EntityManager,
  sky: SkyDatesService,
  calendar: CalendarEntity,
): Promise<Draft> {
  const place = {
    ...toPlaceSnapshot(await manager.findOneByOrFail(PlaceEntity, { id: calendar.placeId })),
    figures: await everyVillageFigure(manager, calendar.communityId),
  };
  const words = await knownWords(manager, calendar.communityId);
  const rows = await liveEntries(manager, calendar.id);
  for (const row of rows) row.content = inVillageWords(row.content, words);
  const dates = sky.datesOf(
    place,
    calendar.year,
    rows.map(({ content }) => content),
  );
  const entries = rows.flatMap((row, index) => {
    const own = dates[index];
    return own ? [{ row, dates: own }] : [];
  });
  return { place, entries: await withAnchors(manager, calendar.year, entries) };
}
