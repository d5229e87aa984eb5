import type { EntryLead } from '#shared/contracts/calendars.js';
import type { ConsentUse } from '#shared/contracts/consents.js';
import type { VersionEntryBody } from '#shared/contracts/versions.js';
import type { EntityManager } from 'typeorm';
import { consentsById } from './consent.repository.js';
import { mayUse } from './consents.js';
import { figureIdOf } from './entry-sight.js';

/**
 * The entries that a channel may carry: each was agreed to for this use, and so was the village's own figure that it
 * goes by. Prints, feeds, messages and exports ask here with their own use; levels are asked about elsewhere.
 */
export async function entriesForUse<B extends VersionEntryBody>(
  manager: EntityManager,
  today: string,
  use: ConsentUse,
  entries: readonly B[],
  /** What leaves the village is carried only where somebody was asked and said yes. */
  leavesVillage = false,
): Promise<B[]> {
  const consentsOf = await consentsById(
    manager,
    'entry',
    entries.map(({ entryId }) => entryId),
  );
  const figureOf = ({ content }: B) => figureIdOf(markerKeyOf(content.lead));
  const figureConsentsOf = await consentsById(
    manager,
    'figure',
    entries.flatMap((entry) => figureOf(entry) ?? []),
  );
  return entries.filter((entry) => {
    const figureId = figureOf(entry);
    if (figureId !== null && !mayUse(figureConsentsOf(figureId), use, null, today)) return false;
    const consents = consentsOf(entry.entryId);
    if (leavesVillage && consents.length === 0) return false;
    return mayUse(consents, use, entry.content.kind, today);
  });
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
