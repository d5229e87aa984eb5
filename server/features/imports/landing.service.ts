import { ENTRIES_MAX, type EntryInput } from '#shared/contracts/calendars.js';
import type { VariantInput } from '#shared/contracts/variants.js';
import { randomUUID } from 'node:crypto';
import type { EntityManager } from 'typeorm';
import type { CalendarEntity } from '../../db/entities/calendar.entity.js';
import { ConsentEntity, type ConsentDetails } from '../../db/entities/consent.entity.js';
import { EntryVariantEntity } from '../../db/entities/entry-variant.entity.js';
import { EntryEntity } from '../../db/entities/entry.entity.js';
import { RolledItemEntity } from '../../db/entities/rolled-item.entity.js';
import type { Actor } from '../../http/actor.js';
import { AppError, conflict } from '../../http/app-error.js';
import { copySharing, insertSharing } from '../../policy/sharing.repository.js';
import { settleShownUntil } from '../../policy/consent.repository.js';
import { viewerOf, villageDay } from '../../policy/viewer.js';
import { recordAudit } from '../audit/audit.service.js';
import { expectGoodAnchor } from '../calendars/anchored-draft.service.js';
import { countedOnce } from '../calendars/count-once.service.js';
import { roomAtTheEnd } from '../calendars/draft-order.service.js';
import { withOwnSignIds, withSignsOfThisVillage } from '../signs/entry-signs.service.js';
import { lockCalendar, recordContribution } from '../calendars/draft.service.js';
import { sharingOf } from '../calendars/entry-sharing.service.js';
import { landSeason, type SeasonPlan } from '../season-reviews/carried-season.service.js';

/** The way by which something came into a draft. */
export type ImportWay = 'file' | 'table' | 'village';

export interface LandingEntry {
  id: string;
  content: EntryInput;
  /** The same thing in another draft of this village: its level, giver and consents go along, and so does taking it back. */
  sameAs: string | null;
  /** Somebody has to be asked before it is used: a consent that nobody has answered yet says so. */
  isToBeAsked?: boolean;
  variants: readonly { id: string; content: VariantInput; sameAs: string | null }[];
}

export interface Landed {
  /** False where the same key had come before. */
  isNew: boolean;
  added: number;
  refused: number;
  seasonAdded: number;
  seasonLeft: number;
  voices: number;
  pictures: number;
}

/** Voices and pictures that came with the entries; how many of them came to stand beside these. */
export type LandMedia = (
  manager: EntityManager,
  entries: readonly LandingEntry[],
) => Promise<Pick<Landed, 'voices' | 'pictures'>>;

export interface Landing {
  way: ImportWay;
  entries: readonly LandingEntry[];
  refused: number;
  /** What the year taught, where entries come in beside which it stands. */
  season?: SeasonPlan;
  media?: LandMedia;
}

/**
 * Puts entries behind those of an open draft, all or none, once for each key of a write. `prepare` is asked only where the
 * key is new, with the calendar locked; what it throws keeps everything as it was.
 */
export async function landOnce(
  manager: EntityManager,
  actor: Actor,
  calendarId: string,
  at: Date,
  prepare: (calendar: CalendarEntity) => Promise<Landing>,
): Promise<Landed> {
  const calendar = await lockCalendar(manager, calendarId);
  const { isNew, resultId, counts } = await countedOnce(manager, actor, at, async () => {
    if (calendar.outNumber !== null) throw new AppError('draft-locked');
    const landing = await prepare(calendar);
    await land(manager, actor, calendar, landing, at);
    const { entries, refused, season, media } = landing;
    if (season) await landSeason(manager, season);
    const stood = media ? await media(manager, entries) : NO_MEDIA;
    return {
      resultId: calendarId,
      counts: { added: entries.length, refused, ...seasonCounts(season), ...stood },
    };
  });
  if (resultId !== calendarId) throw conflict('write-key-used');
  // What was written before there were such counts has none.
  return { isNew, ...seasonCounts(undefined), ...NO_MEDIA, ...counts };
}

const NO_MEDIA = { voices: 0, pictures: 0 };

export function seasonCounts(season: SeasonPlan | undefined): Pick<Landed, 'seasonAdded' | 'seasonLeft'> {
  if (season === undefined) return { seasonAdded: 0, seasonLeft: 0 };
  const { lessons, decisions, left } = season;
  return { seasonAdded: lessons.length + decisions.length, seasonLeft: left };
}

async function land(
  manager: EntityManager,
  actor: Actor,
  { id: calendarId }: CalendarEntity,
  { way, entries }: Landing,
  at: Date,
): Promise<void> {
  if (entries.length === 0) return;
  const newIds = entries.map(({ id }) => id);
  const room = await roomAtTheEnd(manager, calendarId, newIds);
  if (room.first + entries.length > ENTRIES_MAX) throw conflict('too-many-entries');
  const { communityId, person } = actor;
  const touched = { updatedBy: person.id, updatedAt: at };
  const viewer = await viewerOf(manager, actor, at);
  for (const [index, { id, content: said, sameAs, variants, isToBeAsked }] of entries.entries()) {
    const content = withOwnSignIds(await withSignsOfThisVillage(manager, viewer, said));
    const position = room.first + index;
    await manager.insert(EntryEntity, { id, calendarId, position, content, deletedAt: null, ...touched });
    await share(manager, actor, calendarId, { itemType: 'entry', itemId: id, content, sameAs });
    if (isToBeAsked === true) await ask(manager, actor, { id, content }, at);
    for (const variant of variants) {
      await manager.insert(EntryVariantEntity, {
        ...{ id: variant.id, entryId: id, content: variant.content, addedAt: at },
        ...touched,
      });
      const { id: itemId, sameAs: fromId } = variant;
      await share(manager, actor, calendarId, {
        ...{ itemType: 'variant', itemId, content: variant.content, sameAs: fromId },
      });
    }
  }
  await expectAnchored(manager, actor, calendarId, entries, at);
  await room.takeIt();
  await recordContribution(manager, calendarId, person.id, at);
  await recordAudit(manager, {
    ...{ at, communityId, actorId: person.id, action: 'entries-brought-in' },
    ...{ subjectType: 'calendar', subjectId: calendarId, details: { number: entries.length, way } },
  });
}

/** What counts its days from another one does so rightly; a refusal takes everything back. */
async function expectAnchored(
  manager: EntityManager,
  actor: Actor,
  calendarId: string,
  entries: readonly LandingEntry[],
  at: Date,
): Promise<void> {
  const viewer = await viewerOf(manager, actor, at);
  for (const [index, { id, content }] of entries.entries()) {
    const field = `entries.${String(index)}.content.lead`;
    await expectGoodAnchor(manager, viewer, calendarId, { id, content }, field);
  }
}

/** Nobody in particular is named: whoever is to be asked is found out by whoever asks. */
async function ask(
  manager: EntityManager,
  { communityId, person }: Actor,
  { id: itemId, content }: Pick<LandingEntry, 'id' | 'content'>,
  at: Date,
): Promise<void> {
  const today = await villageDay(manager, communityId, at);
  await manager.insert(ConsentEntity, {
    ...{ id: randomUUID(), communityId, itemType: 'entry', itemId, giverId: null },
    ...{ state: 'asked', uses: [], until: null, reviewBy: today },
    details: { ...NOTHING_SAID, askedOn: today, level: content.sharingLevel },
    ...{ recordedBy: person.id, recordedAt: at },
  });
  await settleShownUntil(manager, 'entry', itemId);
}

const NOTHING_SAID: Omit<ConsentDetails, 'askedOn' | 'level'> = {
  givenAs: 'person',
  ...{ giverName: '', spokeFor: '', askedWhere: '', language: null, askedHow: [] },
  ...{ explainedBy: '', explanation: '', proof: null, naming: null, conditions: '', benefits: '' },
  ...{ afterDeath: null, passTo: '', mayWithdraw: [] },
};

/** Something new is shared as its words say; the same thing of another draft as it is there. */
async function share(
  manager: EntityManager,
  { communityId, person }: Actor,
  calendarId: string,
  landing: {
    itemType: 'entry' | 'variant';
    itemId: string;
    content: EntryInput | VariantInput;
    sameAs: string | null;
  },
): Promise<void> {
  const { itemType, itemId, content, sameAs } = landing;
  if (sameAs !== null) return goAlong(manager, itemType, calendarId, sameAs, itemId);
  const giverId = content.giverId ?? person.id;
  await insertSharing(manager, { itemType, itemId, communityId, ...sharingOf(content), giverId });
}

async function goAlong(
  manager: EntityManager,
  itemType: 'entry' | 'variant',
  calendarId: string,
  fromId: string,
  itemId: string,
): Promise<void> {
  await copySharing(manager, itemType, fromId, itemId);
  await manager.insert(RolledItemEntity, { itemId, itemType, fromId, calendarId, before: null });
}
