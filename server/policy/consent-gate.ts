import type { EntryLead } from '#shared/contracts/calendars.js';
import type { ConsentUse } from '#shared/contracts/consents.js';
import type { VersionEntryBody } from '#shared/contracts/versions.js';
import type { EntityManager } from 'typeorm';
import { consentsById } from './consent.repository.js';
import { mayUse, missingYes, type MissingYes } from './consents.js';
import { figureIdOf } from './entry-sight.js';
import { sharedById } from './sharing.repository.js';

/** A yes that a channel waits for: of the entry itself, or of the village's own figure that it goes by. */
export interface AwaitedYes {
  itemType: 'entry' | 'figure';
  itemId: string;
  missing: MissingYes;
}

/**
 * The entries that a channel may carry: each was agreed to for this use, and so was the village's own figure that it
 * goes by. Prints, feeds, messages, exports and the page for everybody ask here with their own use; levels are asked
 * about elsewhere.
 */
export async function entriesForUse<B extends VersionEntryBody>(
  manager: EntityManager,
  today: string,
  use: ConsentUse,
  entries: readonly B[],
): Promise<B[]> {
  const awaitedOf = await awaitedFor(manager, today, use, entries);
  return entries.filter((entry) => awaitedOf(entry).length === 0);
}

/** What each of them still lacks for this use. */
export async function awaitedFor<B extends VersionEntryBody>(
  manager: EntityManager,
  today: string,
  use: ConsentUse,
  entries: readonly B[],
): Promise<(entry: B) => AwaitedYes[]> {
  const figureOf = ({ content }: B) => figureIdOf(markerKeyOf(content.lead));
  const figureIds = entries.flatMap((entry) => figureOf(entry) ?? []);
  const figures = await sharedById(manager, 'figure', figureIds);
  const figureConsentsOf = await consentsById(manager, 'figure', figureIds);
  const consentsOf = await consentsById(
    manager,
    'entry',
    entries.map(({ entryId }) => entryId),
  );
  return (entry) => {
    const { entryId, content } = entry;
    const own = missingYes(consentsOf(entryId), use, content.kind, today);
    const figureId = figureOf(entry);
    // What went by a figure that was withdrawn goes by its star: nobody is left to be asked.
    const isAsked = figureId !== null && figures.get(figureId)?.state !== 'withdrawn';
    const ofFigure = isAsked ? missingYes(figureConsentsOf(figureId), use, null, today) : null;
    return [
      ...(own === null ? [] : [{ itemType: 'entry', itemId: entryId, missing: own } as const]),
      ...(isAsked && ofFigure !== null
        ? [{ itemType: 'figure', itemId: figureId, missing: ofFigure } as const]
        : []),
    ];
  };
}

/** Whether voices and pictures of a thing may be opened, or only what was written down from them. */
export async function recordingsMayBeOpened(
  manager: EntityManager,
  today: string,
  { subjectType, subjectId }: { subjectType: string; subjectId: string },
): Promise<boolean> {
  if (subjectType !== 'entry' && subjectType !== 'figure') return true;
  const consentsOf = await consentsById(manager, subjectType, [subjectId]);
  return mayUse(consentsOf(subjectId), 'recording', null, today);
}

function markerKeyOf(lead: EntryLead): string | null {
  if (lead.type === 'marker' || lead.type === 'marker-as-seen') return lead.markerKey;
  return lead.type === 'sky' && 'markerKey' in lead.spec ? lead.spec.markerKey : null;
}
