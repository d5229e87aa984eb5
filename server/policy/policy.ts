import type { SharingDetails, SharingLevel } from '#shared/contracts/sharing.js';
import type { SharingState } from '../db/entities/item-sharing.entity.js';
import type { Viewer } from './viewer.js';

/** What the policy knows about a thing. */
export interface Shared {
  communityId: string;
  level: SharingLevel;
  details: SharingDetails;
  giverId: string | null;
  state: SharingState;
  leavesTrace: boolean;
  /** The last day on which what was agreed lets it be shown; nothing where no consent says so. */
  shownUntil?: string | null;
}

/** Seen whole; seen as an empty slot; not there. */
export type Appearance = 'full' | 'blank' | 'none';

/**
 * The one decision about who sees what. Every list, count, comparison, print, letter and file asks here, and a thing
 * that nothing is known about is not there. No role stands above the levels: a steward or officer sees what is open,
 * the village's, or theirs.
 */
export function appearance(viewer: Viewer, shared: Shared | undefined): Appearance {
  if (shared?.communityId !== viewer.communityId) return 'none';
  if (shared.state !== 'shared') return 'none';
  if (!isAgreedToShow(shared, viewer.today)) return 'none';
  if (isTold(viewer, shared)) return 'full';
  return effectiveLevel(shared, viewer.today) === 'sealed' ? 'none' : shared.details.trace;
}

export function maySee(viewer: Viewer, shared: Shared | undefined): boolean {
  return appearance(viewer, shared) === 'full';
}

/** Who reads what was agreed about a thing: those who may see it by its level, also while its consent hides it. */
export function maySeeByLevel(viewer: Viewer, shared: Shared | undefined): boolean {
  return shared !== undefined && maySee(viewer, { ...shared, shownUntil: null });
}

/** Open and the village's: what goes on the village's board, into its counts and its sign-off. */
export function isForVillage(shared: Shared | undefined, today: string): boolean {
  if (shared?.state !== 'shared' || !isAgreedToShow(shared, today)) return false;
  const level = effectiveLevel(shared, today);
  return level === 'open' || level === 'village';
}

/** For whoever comes by, of the village or not. */
export function isOpen(shared: Shared | undefined, today: string): boolean {
  return isForVillage(shared, today) && shared !== undefined && effectiveLevel(shared, today) === 'open';
}

/** Outside its telling season a thing is as if sealed. */
export function effectiveLevel(
  { level, details }: Pick<Shared, 'level' | 'details'>,
  today: string,
): SharingLevel {
  return isInSeason(details.tellingSeason, today) ? level : 'sealed';
}

/** Narrower than the village at some time of the year: such things are answered by their own people. */
export function isKept({ level, details }: Pick<Shared, 'level' | 'details'>): boolean {
  return details.tellingSeason !== null || (level !== 'open' && level !== 'village');
}

/**
 * Of the people who keep a thing: its giver, the successor, the members of its group, the elders. Whoever sees it only
 * because it is the village's is none of them, also while its telling season lasts.
 */
export function isOfItsPeople(viewer: Viewer, shared: Shared | undefined): boolean {
  if (shared === undefined || !isKept(shared) || !maySee(viewer, shared)) return false;
  const { level, details, giverId } = shared;
  if (giverId === viewer.personId || details.successorId === viewer.personId) return true;
  return level === 'group' || viewer.roles.includes('elder');
}

function isAgreedToShow({ shownUntil = null }: Shared, today: string): boolean {
  return shownUntil === null || today <= shownUntil;
}

function isTold(viewer: Viewer, { level, details, giverId, ...shared }: Shared): boolean {
  if (giverId === viewer.personId) return true;
  switch (effectiveLevel({ level, details }, viewer.today)) {
    case 'open':
    case 'village':
      return shared.communityId === viewer.communityId;
    case 'group':
      return details.groupId !== null && viewer.groupIds.has(details.groupId);
    case 'elders':
      return viewer.roles.includes('elder');
    case 'sealed':
      return details.successorId === viewer.personId;
  }
}

/** Both days are in it; a season may reach over New Year. */
export function isInSeason(season: SharingDetails['tellingSeason'], today: string): boolean {
  if (season === null) return true;
  // A season that ends with February ends with its last day, whichever that is.
  const day =
    Math.min(Number(today.slice(8, 10)), today.slice(5, 7) === '02' ? 28 : 31) +
    Number(today.slice(5, 7)) * 100;
  const from = season.from.month * 100 + season.from.day;
  const to = season.to.month * 100 + season.to.day;
  return from <= to ? from <= day && day <= to : day >= from || day <= to;
}
