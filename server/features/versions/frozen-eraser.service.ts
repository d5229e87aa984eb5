import type { VariantInput } from '#shared/contracts/variants.js';
import type { VersionEntryBody, VersionHeader } from '#shared/contracts/versions.js';
import { wasPublished } from '#shared/calendar/version-state.js';
import { canonicalJson } from '#shared/kernel/canonical-json.js';
import { Like, type EntityManager } from 'typeorm';
import { AnswerEntity } from '../../db/entities/answer.entity.js';
import { CalendarVersionEntity } from '../../db/entities/calendar-version.entity.js';
import { EntryVariantEntity } from '../../db/entities/entry-variant.entity.js';
import { VersionVariantEntity } from '../../db/entities/version-variant.entity.js';
import { VersionEntryEntity } from '../../db/entities/version-entry.entity.js';
import type { PublishedTrace } from '../../db/entities/withdrawal.entity.js';
import { withoutGiver } from '../../policy/giver-naming.js';
import { keepingShared } from '../../policy/sign-sight.js';
import { markerNamesOf } from '../stars/marker-names.service.js';
import { frozenEntries } from './versions.repository.js';

/**
 * Takes an entry out of every version that froze it, with what elders said about it. Its leaf stays, so the hash of
 * the version still holds for the rest.
 */
export async function eraseFrozenEntry(
  manager: EntityManager,
  entryId: string,
  leavesTrace: boolean,
): Promise<PublishedTrace[]> {
  const rows = await manager.find(VersionEntryEntity, {
    where: { entryId },
    relations: { calendarVersion: true },
  });
  for (const { id, versionId, calendarVersion: version } of rows) {
    const leaves = version.leaves ?? (await frozenEntries(manager, versionId)).map(({ hash }) => hash);
    await manager.update(
      CalendarVersionEntity,
      { id: versionId },
      { leaves, withdrawnTraces: version.withdrawnTraces + (leavesTrace ? 1 : 0) },
    );
    version.leaves = leaves;
    await manager.delete(VersionEntryEntity, { id });
  }
  await manager.delete(AnswerEntity, { entryId });
  return tracesOf(rows);
}

/** The published versions in which something stood, each once. */
function tracesOf(rows: readonly { calendarVersion: CalendarVersionEntity }[]): PublishedTrace[] {
  const versions = new Map(rows.map(({ calendarVersion }) => [calendarVersion.id, calendarVersion]));
  return [...versions.values()]
    .filter(({ state }) => wasPublished(state))
    .map(({ calendarId, number, label }) => ({ calendarId, number, label: label ?? '' }));
}

/** Takes a variant out of every version that froze it; its leaf stays. */
export async function eraseFrozenVariant(
  manager: EntityManager,
  variantId: string,
): Promise<PublishedTrace[]> {
  const rows = await manager.find(VersionVariantEntity, {
    where: { variantId },
    relations: { calendarVersion: true },
  });
  await manager.delete(VersionVariantEntity, { variantId });
  return tracesOf(rows);
}

/** Variants of an entry, in its draft and wherever they were frozen. */
export async function variantIdsOf(manager: EntityManager, entryId: string): Promise<string[]> {
  const drafted = await manager.findBy(EntryVariantEntity, { entryId });
  const frozen = await manager.findBy(VersionVariantEntity, { entryId });
  return [...new Set([...drafted.map(({ id }) => id), ...frozen.map(({ variantId }) => variantId)])];
}

/** Takes the giver's name off an entry wherever it was frozen; that entry's own hash cannot be made again then. */
export async function takeNameOffFrozen(manager: EntityManager, entryId: string): Promise<void> {
  for (const { id, bodyText } of await manager.findBy(VersionEntryEntity, { entryId })) {
    const body = JSON.parse(bodyText) as VersionEntryBody;
    const { giverId: _giver, ...content } = body.content;
    const nameless = canonicalJson({ ...body, content: withoutGiver(content) });
    if (nameless !== bodyText) {
      await manager.update(VersionEntryEntity, { id }, { bodyText: nameless, redacted: true });
    }
  }
}

/** The same of a timing beside an entry. */
export async function takeNameOffFrozenVariant(manager: EntityManager, variantId: string): Promise<void> {
  for (const { id, bodyText } of await manager.findBy(VersionVariantEntity, { variantId })) {
    const body = JSON.parse(bodyText) as { content: VariantInput };
    const nameless = canonicalJson({ ...body, content: { ...body.content, giver: '', giverId: null } });
    if (nameless !== bodyText) {
      await manager.update(VersionVariantEntity, { id }, { bodyText: nameless, redacted: true });
    }
  }
}

/** Takes a sign of the village's list out of every version that froze it; those entries' hashes cannot be made again then. */
export async function eraseFrozenSign(manager: EntityManager, signId: string): Promise<PublishedTrace[]> {
  const rows = await manager.find(VersionEntryEntity, {
    where: { bodyText: Like(`%${signId}%`) },
    relations: { calendarVersion: true },
  });
  for (const { id, bodyText } of rows) {
    const body = JSON.parse(bodyText) as VersionEntryBody;
    const content = keepingShared(body.content, (one) => one !== signId);
    await manager.update(
      VersionEntryEntity,
      { id },
      { bodyText: canonicalJson({ ...body, content }), redacted: true },
    );
  }
  return tracesOf(rows);
}

/** Takes a figure's own name out of every frozen header: what went by it goes by its star's name in the sky. */
export async function eraseFrozenFigure(
  manager: EntityManager,
  communityId: string,
  markerKey: string,
): Promise<PublishedTrace[]> {
  const versions = await manager.find(CalendarVersionEntity, { where: { calendar: { communityId } } });
  const found = versions.filter(({ headerText }) => headerText.includes(markerKey));
  for (const { id, headerText } of found) {
    const header = JSON.parse(headerText) as VersionHeader;
    const nameless = canonicalJson(withoutName(header, markerKey));
    await manager.update(CalendarVersionEntity, { id }, { headerText: nameless, headerRedacted: true });
  }
  return found
    .filter(({ state }) => wasPublished(state))
    .map(({ calendarId, number, label }) => ({ calendarId, number, label: label ?? '' }));
}

function withoutName(header: VersionHeader, markerKey: string): VersionHeader {
  const figures = header.place.figures?.map((figure) =>
    figure.key === markerKey ? { ...figure, name: '' } : figure,
  );
  const markers = header.markers.map((marker) => {
    if (marker.markerKey !== markerKey) return marker;
    const star = marker.hr === null ? null : markerNamesOf(`hr${marker.hr}`, []);
    return { ...marker, name: star?.name ?? '', designation: star?.designation ?? '' };
  });
  return { ...header, markers, place: { ...header.place, ...(figures ? { figures } : {}) } };
}
