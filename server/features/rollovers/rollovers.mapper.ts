import { rolledWindow } from '#shared/calendar/rolled-window.js';
import type { EntryDates } from '#shared/contracts/calendars.js';
import type { WhyMoved } from '#shared/contracts/moves.js';
import type { RolledEntry } from '#shared/contracts/rollovers.js';
import type { DraftEntry } from '../calendars/draft.service.js';

export interface RolledFacts {
  entry: DraftEntry;
  before: EntryDates;
  /** Years between the two drafts. */
  years: number;
  needsConsent: boolean;
  why: (before: EntryDates) => WhyMoved | null;
}

export function toRolledEntry({ entry, years, needsConsent, ...facts }: RolledFacts): RolledEntry {
  const { id, content } = entry.row;
  // Days that are counted from something which is kept by now would tell of it, those of the year before as well.
  const before = entry.dates.counted?.basis === 'gone' ? entry.dates : facts.before;
  const why = facts.why(before);
  return {
    entryId: id,
    titleVillage: content.titleVillage,
    titleOfficer: content.titleOfficer,
    kind: content.kind,
    protectiveWatch: content.protectiveWatch,
    before,
    after: entry.dates,
    ...rolledWindow(before.window, entry.dates.window, years),
    needsConsent,
    ...(why && { why }),
  };
}
