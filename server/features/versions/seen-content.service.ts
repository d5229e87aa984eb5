import { wasPublished } from '#shared/calendar/version-state.js';
import type { EntryInput } from '#shared/contracts/calendars.js';
import type { VersionEntry, VersionEntryBody, VersionHeader } from '#shared/contracts/versions.js';
import type { EntityManager } from 'typeorm';
import type { CalendarVersionEntity } from '../../db/entities/calendar-version.entity.js';
import { VersionEntryEntity } from '../../db/entities/version-entry.entity.js';
import { entrySight, type EntrySight, type SeenThing } from '../../policy/entry-sight.js';
import { anybody, withNaming } from '../../policy/giver-naming.js';
import { sharedById } from '../../policy/sharing.repository.js';
import { withTellableSigns } from '../../policy/sign-sight.js';
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
  const seen = await withTellableSigns(manager, await withSeenVariants(manager, viewer, entries));
  const sight = await entrySight(manager, viewer, entries.map(thingOf));
  const fallen = wasPublished(version.state) ? await fallenIds(manager, version.id) : new Set<string>();
  return cutDown(
    header,
    seen.filter(({ entryId }) => !fallen.has(entryId)),
    sight,
    viewer,
  );
}

/** The draft for one person. */
export async function seenOfDraft(
  manager: EntityManager,
  viewer: Viewer,
  header: VersionHeader,
  entries: readonly VersionEntryBody[],
): Promise<Seen<VersionEntryBody>> {
  const seen = await withTellableSigns(manager, await withSeenVariants(manager, viewer, entries));
  return cutDown(header, seen, await entrySight(manager, viewer, entries.map(thingOf)), viewer);
}

export function thingOf({ entryId, content }: Pick<VersionEntryBody, 'entryId' | 'content'>): SeenThing {
  return { entryId, markerKey: markerKeyOfLead(content.lead) };
}

/** Entries for the village's board: open and the village's, with their givers as they wish, whoever prints it. */
export async function entriesForVillage<B extends VersionEntryBody>(
  manager: EntityManager,
  viewer: Viewer,
  entries: readonly B[],
): Promise<B[]> {
  const reader = anybody(viewer);
  const sight = await entrySight(manager, reader, entries.map(thingOf));
  const variantIds = entries.flatMap(({ variants = [] }) => variants.map(({ variantId }) => variantId));
  const variantsShared = await sharedById(manager, 'variant', variantIds);
  return entries
    .filter((entry) => sight.isForVillage(thingOf(entry)))
    .map(({ variants, ...rest }) => {
      const entry = { ...rest, content: withNaming(reader, sight.sharedOf(rest.entryId), rest.content) };
      const forBoard = (variants?.filter((variant) => variant.forBoard) ?? []).map((variant) => ({
        ...variant,
        content: withNaming(reader, variantsShared.get(variant.variantId), variant.content),
      }));
      return (forBoard.length === 0 ? entry : { ...entry, variants: forBoard }) as B;
    });
}

/** Contents of entries and of the variants beside them, as far as what they go by is asked. */
export function contentsOf(bodies: readonly VersionEntryBody[]): EntryInput[] {
  return bodies.flatMap(({ content, variants = [] }) => [
    content,
    ...variants.map(({ content: { lead } }) => ({ ...content, lead })),
  ]);
}

/** Entries with those of their variants that the person sees; which of them the village's board may go by is said. */
async function withSeenVariants<B extends VersionEntryBody>(
  manager: EntityManager,
  viewer: Viewer,
  entries: readonly B[],
): Promise<B[]> {
  const things = entries.flatMap(({ variants = [] }) =>
    variants.map(({ variantId, content }) => ({
      entryId: variantId,
      markerKey: markerKeyOfLead(content.lead),
    })),
  );
  if (things.length === 0) return [...entries];
  const sight = await entrySight(manager, viewer, things, 'variant');
  const byId = new Map(things.map((thing) => [thing.entryId, thing]));
  return entries.map(({ variants, ...entry }) => {
    const seen = (variants ?? []).flatMap((variant) => {
      const thing = byId.get(variant.variantId);
      if (thing === undefined || sight.appearance(thing) !== 'full') return [];
      const content = withNaming(viewer, sight.sharedOf(variant.variantId), variant.content);
      return [{ ...variant, content, forBoard: sight.isForVillage(thing) }];
    });
    return (seen.length === 0 ? entry : { ...entry, variants: seen }) as B;
  });
}

/** Also leaves out of the header what only unseen entries go by; positions are counted anew, so that no gap shows. */
export function cutHeader(
  header: VersionHeader,
  shown: readonly VersionEntryBody[],
): { header: VersionHeader; complete: boolean } {
  const contents = contentsOf(shown);
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
  viewer: Viewer,
): Seen<B> {
  const shown = entries.filter((entry) => sight.appearance(thingOf(entry)) === 'full');
  const cut = cutHeader(header, shown);
  return {
    header: cut.header,
    headerComplete: cut.complete,
    entries: shown.map((entry, position) => ({
      ...entry,
      ...('position' in entry ? { position } : {}),
      content: withNaming(viewer, sight.sharedOf(entry.entryId), entry.content),
    })),
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
