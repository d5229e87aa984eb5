import type { EntryInput } from '#shared/contracts/calendars.js';
import type { Answer } from '#shared/contracts/reviews.js';
import type { Version } from '#shared/contracts/versions.js';
import { sameForElders } from './entry-draft.js';

export interface ElderRequest {
  answer: Answer;
  /** The entry was changed after the elder answered; it will be asked again. */
  changedSince: boolean;
}

export interface EntryAnswers {
  /** "Change this" or "not for the board", not settled yet. */
  requests: ElderRequest[];
  /** The elder lets it stand: two ways are kept beside the entry. */
  kept: Answer[];
}

/**
 * What elders said to the entries of the newest submission and what is still open about it. Once a version is
 * signed off nothing is open; differences that were kept stay beside their entries.
 */
export function answersByEntry(
  version: Version,
  answers: readonly Answer[],
  draftContents: ReadonlyMap<string, EntryInput>,
): Map<string, EntryAnswers> {
  const isOpen = version.state === 'in-review' || version.state === 'changes-asked';
  const found = new Map<string, EntryAnswers>();
  for (const frozen of version.entries) {
    const own = answers.filter((one) => one.entryId === frozen.entryId && one.entryHash === frozen.hash);
    const present = draftContents.get(frozen.entryId);
    const changedSince = present !== undefined && !sameForElders(frozen.content, present);
    const requests = isOpen ? own.filter(asksForSomething).map((answer) => ({ answer, changedSince })) : [];
    const kept = own.filter(({ answer, letStand }) => answer === 'change-this' && letStand);
    if (requests.length + kept.length > 0) found.set(frozen.entryId, { requests, kept });
  }
  return found;
}

function asksForSomething({ answer, letStand }: Answer): boolean {
  return answer === 'not-for-the-board' || (answer === 'change-this' && !letStand);
}
