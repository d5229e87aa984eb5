import { anchoredDates, anchorOf, circleFrom, hangingOn } from '#shared/calendar/anchors.js';
import type { EntryDates, EntryInput } from '#shared/contracts/calendars.js';
import type { EntityManager } from 'typeorm';
import type { EntryEntity } from '../../db/entities/entry.entity.js';
import { AppError, conflict, invalidField } from '../../http/app-error.js';
import { anchorSight } from '../../policy/anchor-sight.js';
import { entrySight, type SeenThing } from '../../policy/entry-sight.js';
import type { Viewer } from '../../policy/viewer.js';
import { actualRows } from '../actual-days/known-days.service.js';
import { liveEntries } from './calendars.repository.js';
import { markerKeyOfLead } from './sky-dates.service.js';
import { texts } from '#shared/locales/en/problems.js';

interface Dated {
  row: EntryEntity;
  dates: EntryDates;
}

/** The draft with the days of those entries that are counted from other ones. */
export async function withAnchors(
  manager: EntityManager,
  year: number,
  entries: readonly Dated[],
): Promise<Dated[]> {
  if (entries.every(({ row }) => anchorOf(row.content.lead) === null)) return [...entries];
  const ids = entries.map(({ row }) => row.id);
  const actual = await actualRows(manager, ids);
  const mayHang = await anchorSight(
    manager,
    entries.map(({ row }) => thingOf(row)),
  );
  const found = anchoredDates(
    entries.map(({ row, dates }) => ({ id: row.id, lead: row.content.lead, timing: row.content, dates })),
    year,
    {
      mayHang,
      actualOf: (id) => {
        const row = actual.get(id);
        return row ? { from: row.firstDay, to: row.lastDay } : null;
      },
    },
  );
  return entries.map(({ row, dates }) => ({ row, dates: found.get(row.id) ?? dates }));
}

/**
 * An entry hangs on one that is there for whoever writes it, that everybody sees who sees this one, and not on itself
 * by way of others. Asked after the entry and its level are written; a refusal takes both back.
 * @param field where the lead stands in the request
 */
export async function expectGoodAnchor(
  manager: EntityManager,
  viewer: Viewer,
  calendarId: string,
  { id, content }: { id: string; content: EntryInput },
  field: string,
): Promise<void> {
  const anchorId = anchorOf(content.lead);
  if (anchorId === null) return;
  const rows = await liveEntries(manager, calendarId);
  const anchor = rows.find((row) => row.id === anchorId);
  const sight = await entrySight(manager, viewer, rows.map(thingOf));
  if (!anchor || sight.appearance(thingOf(anchor)) !== 'full') {
    throw invalidField(`${field}.entryId`, 'unknown-entry');
  }
  const hung = rows.map((row) => ({ id: row.id, lead: row.content.lead }));
  const circle = circleFrom(id, hung);
  if (circle !== null) {
    const titles = new Map(rows.map((row) => [row.id, row.content.titleOfficer]));
    throw new AppError('invalid-input', {
      errors: [{ field: `${field}.entryId`, code: 'anchor-circle', message: texts.field['anchor-circle'] }],
      names: circle.map((one) => titles.get(one) ?? ''),
    });
  }
  const mayHang = await anchorSight(manager, rows.map(thingOf));
  if (!mayHang(id, anchorId)) throw invalidField(`${field}.entryId`, 'anchor-kept');
}

/** What others are counted from stays; which of them the person sees is said. */
export async function expectNothingHangsOn(
  manager: EntityManager,
  viewer: Viewer,
  calendarId: string,
  entryId: string,
): Promise<void> {
  const rows = await liveEntries(manager, calendarId);
  const hung = rows.map((row) => ({ id: row.id, lead: row.content.lead, row }));
  const hanging = hangingOn(entryId, hung).map(({ row }) => row);
  const sight = await entrySight(manager, viewer, hanging.map(thingOf));
  const seen = hanging.filter((row) => sight.appearance(thingOf(row)) === 'full');
  if (seen.length > 0) {
    throw conflict(
      'entries-hang-on-it',
      seen.map(({ content }) => content.titleOfficer),
    );
  }
}

function thingOf({ id, content }: EntryEntity): SeenThing {
  return { entryId: id, markerKey: markerKeyOfLead(content.lead) };
}
