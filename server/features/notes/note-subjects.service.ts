import type { NoteField, NoteSubject } from '#shared/contracts/notes.js';
import type { EntryInput } from '#shared/contracts/calendars.js';
import type { VersionEntryBody } from '#shared/contracts/versions.js';
import { resolveMarker } from '#shared/sky/index.js';
import { IsNull, type EntityManager } from 'typeorm';
import { EntryEntity } from '../../db/entities/entry.entity.js';
import { FigureEntity } from '../../db/entities/figure.entity.js';
import { VersionEntryEntity } from '../../db/entities/version-entry.entity.js';
import { seesDrafts } from '../../http/actor.js';
import { entrySight } from '../../policy/entry-sight.js';
import { isKept, maySee } from '../../policy/policy.js';
import { sharedById } from '../../policy/sharing.repository.js';
import type { Viewer } from '../../policy/viewer.js';
import { markerKeyOfLead } from '../calendars/sky-dates.service.js';
import { figuresSeenBy } from '../figures/village-figures.service.js';

/** Texts in which a note can quote, as one person sees them. */
export type NotedTexts = Partial<Record<NoteField, string>>;

/**
 * What stands in a thing for this viewer to read now: its newest text first, then others that they see of it. Null where
 * the thing is not there for them at all.
 */
export async function notedTexts(
  manager: EntityManager,
  viewer: Viewer,
  { subjectType, subjectId }: NoteSubject,
): Promise<NotedTexts[] | null> {
  switch (subjectType) {
    case 'entry': {
      const contents = await seenContents(manager, viewer, subjectId);
      return contents.length === 0 ? null : contents.map(textsOfEntry);
    }
    case 'figure':
      return figureTexts(manager, viewer, subjectId);
    case 'marker':
      return resolveMarker(subjectId, await figuresSeenBy(manager, viewer)) === null ? null : [{}];
  }
}

/** Spaces and lines may differ: a quote is marked on a screen that breaks them as it likes. */
export function hasQuote(texts: NotedTexts | undefined, field: NoteField, quote: string): boolean {
  return plain(texts?.[field] ?? '').includes(plain(quote));
}

function plain(words: string): string {
  return words.normalize('NFC').replace(/\s+/gu, ' ').trim();
}

function textsOfEntry({ titleOfficer, titleVillage, crop, notes, ...content }: EntryInput): NotedTexts {
  const { caution, otherSigns, ifLate } = content;
  return { titleOfficer, titleVillage, crop, notes, caution, otherSigns, ifLate };
}

async function figureTexts(manager: EntityManager, viewer: Viewer, id: string): Promise<NotedTexts[] | null> {
  const { communityId } = viewer;
  const figure = await manager.findOneBy(FigureEntity, { id, communityId, takenOutAt: IsNull() });
  if (figure === null || !maySee(viewer, (await sharedById(manager, 'figure', [id])).get(id))) return null;
  const names = figure.names.map(({ name }) => name).join(' · ');
  // A story may be for fewer than its figure: what somebody cannot read, they cannot try words on.
  const seesStory = maySee(viewer, (await sharedById(manager, 'story', [id])).get(id));
  return [{ names, ...(seesStory ? { story: figure.story } : {}) }];
}

/** Drafts and reviews are for those who see them, for givers, and what is kept there for its people, too. */
async function seenContents(manager: EntityManager, viewer: Viewer, entryId: string): Promise<EntryInput[]> {
  const calendar = { communityId: viewer.communityId };
  const drafted = await manager.findOneBy(EntryEntity, { id: entryId, deletedAt: IsNull(), calendar });
  const shared = (await sharedById(manager, 'entry', [entryId])).get(entryId);
  const isTheirs = shared !== undefined && (isKept(shared) || shared.giverId === viewer.personId);
  const isOpenToThem = seesDrafts(viewer) || isTheirs;
  const frozen = await manager.find(VersionEntryEntity, {
    where: (isOpenToThem ? (['in-review', 'published'] as const) : (['published'] as const)).map((state) => ({
      entryId,
      ...(state === 'published' ? { stands: true } : {}),
      calendarVersion: { state, calendar },
    })),
    order: { calendarVersion: { number: 'DESC' } },
  });
  const contents = [
    ...(drafted !== null && isOpenToThem ? [drafted.content] : []),
    ...frozen.map(({ bodyText }) => (JSON.parse(bodyText) as VersionEntryBody).content),
  ];
  const thingOf = ({ lead }: EntryInput) => ({ entryId, markerKey: markerKeyOfLead(lead) });
  const sight = await entrySight(manager, viewer, contents.map(thingOf));
  return contents.filter((content) => sight.appearance(thingOf(content)) === 'full');
}
