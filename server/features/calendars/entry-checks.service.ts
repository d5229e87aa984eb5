import { seenOf } from '#shared/calendar/as-seen.js';
import type { EntryInput } from '#shared/contracts/calendars.js';
import { sameJson } from '#shared/kernel/canonical-json.js';
import type { EntityManager } from 'typeorm';
import { EntryEntity } from '../../db/entities/entry.entity.js';
import { invalidField, notFound } from '../../http/app-error.js';
import type { Viewer } from '../../policy/viewer.js';
import { figuresSeenBy } from '../figures/village-figures.service.js';
import { knowsMarker, markerKeyOfLead } from './sky-dates.service.js';

export async function liveEntry(
  manager: EntityManager,
  calendarId: string,
  entryId: string,
): Promise<EntryEntity> {
  const row = await manager.findOneBy(EntryEntity, { id: entryId, calendarId });
  if (row === null || row.deletedAt !== null) throw notFound();
  return row;
}

/**
 * A figure that was taken out serves no new entry; one that goes by it already may be written on.
 * @param field where the lead stands in the request
 */
export async function expectKnownMarker(
  manager: EntityManager,
  viewer: Viewer,
  { lead }: EntryInput,
  field: string,
): Promise<void> {
  const markerKey = markerKeyOfLead(lead);
  if (markerKey === null) return;
  if (knowsMarker(markerKey, await figuresSeenBy(manager, viewer))) return;
  throw invalidField(
    lead.type === 'sky' ? `${field}.spec.markerKey` : `${field}.markerKey`,
    'unknown-marker',
  );
}

/** What was seen belongs to the calendar's year, or comes just before or after it; and its day has come. */
export function expectSeenInYear(
  { lead }: EntryInput,
  { year, today }: { year: number; today: string },
  field: string,
): void {
  const seen = seenOf(lead);
  if (seen === null) return;
  if (Math.abs(Number(seen.date.slice(0, 4)) - year) > 1) {
    throw invalidField(`${field}.seen.date`, 'not-of-this-year');
  }
  if (seen.date > today) throw invalidField(`${field}.seen.date`, 'in-the-future');
}

/** Names of the fields that differ; what stands in them stays out of the record. */
export function changedFields(before: EntryInput, after: EntryInput): string[] {
  const was = new Map<string, unknown>(Object.entries(before));
  const is = new Map<string, unknown>(Object.entries(after));
  return [...new Set([...was.keys(), ...is.keys()])]
    .filter((field) => !sameJson(was.get(field) ?? null, is.get(field) ?? null))
    .sort();
}
