import type { VersionEntry, VersionHeader } from '#shared/contracts/versions.js';
import { In, type EntityManager } from 'typeorm';
import type { CalendarVersionEntity } from '../../db/entities/calendar-version.entity.js';
import { EntryEntity } from '../../db/entities/entry.entity.js';
import { entrySight } from '../../policy/entry-sight.js';
import { sharedById } from '../../policy/sharing.repository.js';
import type { Viewer } from '../../policy/viewer.js';
import { answersHashes } from './answers-across-words.service.js';
import { frozenContent } from './frozen-content.service.js';
import { lonePeople } from './kept-entries.service.js';
import { cutHeader, seenOfVersion, thingOf } from './seen-content.service.js';

/** What of a submission waits for the word of those who keep it, and the parts of its header that these entries need. */
export interface OwnEntries {
  header: VersionHeader;
  entries: OwnEntry[];
}

interface OwnEntry extends VersionEntry {
  /** The hash under which its answers are kept. */
  answersHash: string;
}

/**
 * The entries that one person keeps with others, for them to answer: not what they wrote themselves, unless nobody else
 * could say a word to it. Nothing else of the submission comes out of here.
 */
export async function ownEntriesOf(
  manager: EntityManager,
  viewer: Viewer,
  version: CalendarVersionEntity,
): Promise<OwnEntries> {
  const frozen = await frozenContent(manager, version);
  const seen = await seenOfVersion(manager, viewer, version, frozen.header, frozen.entries);
  const sight = await entrySight(manager, viewer, seen.entries.map(thingOf));
  const kept = seen.entries.filter((entry) => sight.isOfItsPeople(thingOf(entry)));
  const written = await writtenAlone(
    manager,
    viewer,
    kept.map(({ entryId }) => entryId),
  );
  const hashes = await answersHashes(manager, version.id);
  const entries = kept
    .filter(({ entryId }) => !written.has(entryId))
    .map((entry) => ({ ...entry, answersHash: hashes.get(entry.entryId) ?? entry.hash }));
  return { header: cutHeader(seen.header, entries).header, entries };
}

/** Those that the person wrote last, and that somebody else has to agree to. */
async function writtenAlone(
  manager: EntityManager,
  { personId }: Viewer,
  entryIds: readonly string[],
): Promise<Set<string>> {
  if (entryIds.length === 0) return new Set();
  const drafts = await manager.findBy(EntryEntity, { id: In([...entryIds]), updatedBy: personId });
  const shared = await sharedById(manager, 'entry', entryIds);
  const isLone = (id: string) => {
    const own = shared.get(id);
    return own !== undefined && lonePeople(own).includes(personId);
  };
  return new Set(drafts.map(({ id }) => id).filter((id) => !isLone(id)));
}
