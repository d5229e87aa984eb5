import type { SharedItemType } from '#shared/contracts/sharing.js';
import { In, type EntityManager } from 'typeorm';
import { AttachmentEntity } from '../../db/entities/attachment.entity.js';
import { EntryEntity } from '../../db/entities/entry.entity.js';
import { EntryVariantEntity } from '../../db/entities/entry-variant.entity.js';
import { FigureEntity } from '../../db/entities/figure.entity.js';
import { ItemSharingEntity } from '../../db/entities/item-sharing.entity.js';
import { NoteEntity } from '../../db/entities/note.entity.js';
import { sharedById } from '../../policy/sharing.repository.js';
import { takeNameOffSpeaker } from '../attachments/attachment-eraser.service.js';
import { takeNameOffDraft } from '../calendars/entry-eraser.service.js';
import { takeNamesOffConsents } from '../consents/consent-eraser.service.js';
import { takeNamesOffTellings } from '../figures/figure-eraser.service.js';
import { sameInOtherYears } from '../rollovers/same-things.service.js';
import { takeNameOffVariant } from '../variants/variant-eraser.service.js';
import {
  takeNameOffFrozen,
  takeNameOffFrozenVariant,
  variantIdsOf,
} from '../versions/frozen-eraser.service.js';

interface Thing {
  itemType: SharedItemType;
  itemId: string;
}

/** One and the same giver: by who they are here, or by how they wished to be called. */
interface Giver {
  id: string | null;
  names: ReadonlySet<string>;
}

/**
 * The giver's name goes off a thing and off everything of theirs that hangs on it: timings beside an entry, recordings,
 * notes, what was agreed. What others gave beside it keeps their names.
 */
export async function takeNamesOff(
  manager: EntityManager,
  thing: Thing,
  giverId: string | null,
): Promise<void> {
  const giver = { id: giverId, names: await namesOn(manager, thing) };
  const others = await sameInOtherYears(manager, thing.itemType, thing.itemId);
  const everyYear = [thing, ...others.map((itemId) => ({ itemType: thing.itemType, itemId }))];
  const theirs = [...everyYear];
  for (const one of everyYear) theirs.push(...(await hangingOf(manager, one, giver)));
  for (const { itemType, itemId } of theirs) {
    await TAKE_OFF[itemType](manager, itemId);
    await takeNamesOffConsents(manager, itemType, itemId, giver);
    const row = await manager.findOneBy(ItemSharingEntity, { itemType, itemId });
    if (row === null) continue;
    const details = { ...row.details, naming: 'not-named' as const };
    await manager.update(ItemSharingEntity, { itemType, itemId }, { details });
  }
}

const nothing = () => Promise.resolve();

/** Where the names stand that are written into things; a note's writer is looked up, and is told no more. */
const TAKE_OFF: Readonly<Record<SharedItemType, (manager: EntityManager, itemId: string) => Promise<void>>> =
  {
    entry: async (manager, id) => {
      await takeNameOffDraft(manager, id);
      await takeNameOffFrozen(manager, id);
    },
    variant: async (manager, id) => {
      await takeNameOffVariant(manager, id);
      await takeNameOffFrozenVariant(manager, id);
    },
    figure: takeNamesOffTellings,
    story: takeNamesOffTellings,
    attachment: takeNameOffSpeaker,
    note: nothing,
    sign: nothing,
  };

async function namesOn(manager: EntityManager, { itemType, itemId }: Thing): Promise<Set<string>> {
  const id = itemId;
  const names: (string | undefined)[] = [];
  if (itemType === 'entry') names.push((await manager.findOneBy(EntryEntity, { id }))?.content.giver);
  if (itemType === 'variant')
    names.push((await manager.findOneBy(EntryVariantEntity, { id }))?.content.giver);
  if (itemType === 'attachment') names.push((await manager.findOneBy(AttachmentEntity, { id }))?.speaker);
  if (itemType === 'figure' || itemType === 'story') {
    const figure = await manager.findOneBy(FigureEntity, { id });
    names.push(...(figure?.variants ?? []).map(({ toldBy }) => toldBy));
  }
  return new Set(names.flatMap((name) => (name === undefined || name === '' ? [] : [name])));
}

/** What of the same giver's hangs on it. */
async function hangingOf(
  manager: EntityManager,
  { itemType, itemId }: Thing,
  giver: Giver,
): Promise<Thing[]> {
  if (itemType === 'attachment' || itemType === 'variant' || itemType === 'sign') return [];
  const subjectType = itemType === 'story' ? 'figure' : itemType;
  const recordings = await manager.findBy(AttachmentEntity, { subjectType, subjectId: itemId });
  const variantIds = itemType === 'entry' ? await variantIdsOf(manager, itemId) : [];
  const variants = await manager.findBy(EntryVariantEntity, { id: In(variantIds) });
  const notes =
    subjectType === 'note' ? [] : await manager.findBy(NoteEntity, { subjectType, subjectId: itemId });
  const things = [
    ...recordings.map(({ id, speaker }) => ({
      itemType: 'attachment' as const,
      itemId: id,
      name: speaker,
    })),
    ...variants.map(({ id, content }) => ({ itemType: 'variant' as const, itemId: id, name: content.giver })),
    ...notes.map(({ id }) => ({ itemType: 'note' as const, itemId: id, name: '' })),
  ];
  const givers = new Map<string, string | null>();
  for (const type of ['attachment', 'variant', 'note'] as const) {
    const ids = things.flatMap((one) => (one.itemType === type ? [one.itemId] : []));
    for (const [id, shared] of await sharedById(manager, type, ids)) givers.set(id, shared.giverId);
  }
  return things
    .filter(({ itemId: id, name }) => giver.names.has(name) || isSame(giver.id, givers.get(id)))
    .map(({ itemType: type, itemId: id }) => ({ itemType: type, itemId: id }));
}

function isSame(giverId: string | null, other: string | null | undefined): boolean {
  return giverId !== null && giverId === other;
}
