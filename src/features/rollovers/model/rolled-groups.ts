import type { ROLLED_OUTCOMES } from '#shared/contracts/rollovers.js';
import { type RolledEntry } from '#shared/contracts/rollovers.js';

export type RolledGroup = (typeof ROLLED_OUTCOMES)[number] | 'consent';

/** What asks for a decision first; what stays comes last. */
const ORDER: readonly RolledGroup[] = [
  'lost-days',
  'moved',
  'consent',
  'found-days',
  'without-days',
  'stays',
];

/** The groups that hold something. An entry whose consent is due stands among those, too. */
export function rolledGroups(
  entries: readonly RolledEntry[],
): { group: RolledGroup; entries: readonly RolledEntry[] }[] {
  return ORDER.map((group) => ({
    group,
    entries: entries.filter((entry) => (group === 'consent' ? entry.needsConsent : entry.outcome === group)),
  })).filter((each) => each.entries.length > 0);
}
