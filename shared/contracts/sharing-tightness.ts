import { SHARING_LEVELS, type SharingDetails, type SharingLevel, type TellingSeason } from './sharing.js';

export interface Sharing {
  level: SharingLevel;
  details: SharingDetails;
}

/**
 * Does nobody see more by the new sharing than by the old? Only then may it hold at once. A season may only become
 * shorter, a slot only vanish, a name only go; another group or successor is somebody new and so counts as wider.
 */
export function isTighterOrSame(before: Sharing, after: Sharing): boolean {
  const step = rankOf(after.level) - rankOf(before.level);
  const sameGroup =
    after.level !== 'group' || before.level !== 'group' || before.details.groupId === after.details.groupId;
  const sameHeir =
    after.details.successorId === before.details.successorId || after.details.successorId === null;
  return (
    step >= 0 &&
    sameGroup &&
    sameHeir &&
    seasonWithin(after.details.tellingSeason, before.details.tellingSeason) &&
    (before.details.trace === 'blank' || after.details.trace === 'none') &&
    namingRank(after.details) >= namingRank(before.details)
  );
}

function rankOf(level: SharingLevel): number {
  return SHARING_LEVELS.indexOf(level);
}

function namingRank({ naming }: SharingDetails): number {
  return ['named', 'role', 'not-named'].indexOf(naming);
}

/** Is every day of the first season in the second? */
function seasonWithin(inner: TellingSeason | null, outer: TellingSeason | null): boolean {
  if (outer === null) return true;
  if (inner === null) return false;
  const [start, length] = spanOf(outer);
  const [innerStart, innerLength] = spanOf(inner);
  const shift = (innerStart - start + DAY_SLOTS) % DAY_SLOTS;
  return shift + innerLength <= length;
}

/** Months of 31 slots: days keep their order, which is all that is asked. */
const SLOTS_PER_MONTH = 31;
const DAY_SLOTS = 12 * SLOTS_PER_MONTH;

function spanOf({ from, to }: TellingSeason): [number, number] {
  const slot = ({ month, day }: TellingSeason['from']) => (month - 1) * SLOTS_PER_MONTH + day - 1;
  return [slot(from), (slot(to) - slot(from) + DAY_SLOTS) % DAY_SLOTS];
}

/**
 * What is left of `mine` where `other` must hold as well: nobody sees more by it than by either. Where the two name other
 * groups or seasons that do not lie in one another, it is sealed until somebody says it anew.
 */
export function tightest(mine: Sharing, other: Sharing): Sharing {
  if (isTighterOrSame(mine, other)) return other;
  const [own, theirs] = [mine.details, other.details];
  const stricter = rankOf(mine.level) >= rankOf(other.level) ? mine : other;
  const season = seasonWithin(own.tellingSeason, theirs.tellingSeason)
    ? own.tellingSeason
    : theirs.tellingSeason;
  const clash =
    (mine.level === 'group' && other.level === 'group' && own.groupId !== theirs.groupId) ||
    !seasonWithin(season, own.tellingSeason);
  return {
    level: clash ? 'sealed' : stricter.level,
    details: {
      ...own,
      groupId: clash ? null : stricter.details.groupId,
      successorId: own.successorId === theirs.successorId ? own.successorId : null,
      tellingSeason: seasonWithin(season, own.tellingSeason) ? season : own.tellingSeason,
      trace: own.trace === 'none' || theirs.trace === 'none' ? 'none' : 'blank',
      naming: namingRank(own) >= namingRank(theirs) ? own.naming : theirs.naming,
    },
  };
}
