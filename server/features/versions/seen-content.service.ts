import { wasPublished } from '#shared/calendar/version-state.js';
import type { VersionEntry, VersionEntryBody, VersionHeader } from '#shared/contracts/versions.js';
import type { EntityManager } from 'typeorm';
import type { CalendarVersionEntity } from '../../db/entities/calendar-version.entity.js';
import { VersionEntryEntity } from '../../db/entities/version-entry.entity.js';
import { entrySight, type EntrySight, type SeenThing } from '../../policy/entry-sight.js';
import type { Viewer } from '../../policy/viewer.js';
import { markerKeyOfLead, markerKeysOf, withUsedFigures } from '../calendars/sky-dates.service.js';

/** What of a version or a draft one person sees, and how much of it stands there as an empty slot. */
export interface Seen<B extends VersionEntryBody> {
  header: VersionHeader;
  headerComplete: boolean;
  entries: B[];
  keptCount: number;
}

/** A version for one person: what is theirs to see, and once published of what is kept only what its people agreed to. */
export async function seenOfVersion(
  manager: EntityManager,
  viewer: Viewer,
  version: CalendarVersionEntity,
  header: VersionHeader,
  entries: readonly VersionEntry[],
): Promise<Seen<VersionEntry>> {
  const sight = await entrySight(manager, viewer, entries.map(thingOf));
  const fallen = wasPublished(version.state) ? await fallenIds(manager, version.id) : new Set<string>();
  return cutDown(
    header,
    entries.filter(({ entryId }) => !fallen.has(entryId)),
    sight,
  );
}

/** The draft for one person. */
export async function seenOfDraft(
  manager: EntityManager,
  viewer: Viewer,
  header: VersionHeader,
  entries: readonly VersionEntryBody[],
): Promise<Seen<VersionEntryBody>> {
  return cutDown(header, entries, await entrySight(manager, viewer, entries.map(thingOf)));
}

export function thingOf({ entryId, content }: Pick<VersionEntryBody, 'entryId' | 'content'>): SeenThing {
  return { entryId, markerKey: markerKeyOfLead(content.lead) };
}

/** Entries for the village's board: open and the village's, whoever prints it. */
export async function entriesForVillage<B extends VersionEntryBody>(
  manager: EntityManager,
  viewer: Viewer,
  entries: readonly B[],
): Promise<B[]> {
  const sight = await entrySight(manager, viewer, entries.map(thingOf));
  return entries.filter((entry) => sight.isForVillage(thingOf(entry)));
}

/** Also leaves out of the header what only unseen entries go by; positions are counted anew, so that no gap shows. */
export function cutHeader(
  header: VersionHeader,
  shown: readonly VersionEntryBody[],
): { header: VersionHeader; complete: boolean } {
  const contents = shown.map(({ content }) => content);
  const keys = new Set(markerKeysOf(contents));
  const markers = header.markers.filter(({ markerKey }) => keys.has(markerKey));
  const place = withUsedFigures(header.place, contents);
  const complete =
    markers.length === header.markers.length &&
    (place.figures ?? []).length === (header.place.figures ?? []).length;
  if (complete) return { header, complete };
  const { salt: _hidden, ...rest } = header;
  return { header: { ...rest, markers, place }, complete };
}

function cutDown<B extends VersionEntryBody>(
  header: VersionHeader,
  entries: readonly B[],
  sight: EntrySight,
): Seen<B> {
  const shown = entries.filter((entry) => sight.appearance(thingOf(entry)) === 'full');
  const cut = cutHeader(header, shown);
  return {
    header: cut.header,
    headerComplete: cut.complete,
    entries: shown.map((entry, position) => ('position' in entry ? { ...entry, position } : entry)),
    keptCount: entries.filter((entry) => sight.appearance(thingOf(entry)) === 'blank').length,
  };
}

/** Entries that were left out when the version was published, because their own people had not agreed. */
async function fallenIds(manager: EntityManager, versionId: string): Promise<Set<string>> {
  const rows = await manager.find(VersionEntryEntity, {
    where: { versionId, stands: false },
    select: { id: true, entryId: true },
  });
  return new Set(rows.map(({ entryId }) => entryId));
}
