import type { EntryKind } from '#shared/contracts/calendars.js';
import {
  DUE_AHEAD_DAYS,
  type ConsentAnswer,
  type ConsentState,
  type ConsentUse,
} from '#shared/contracts/consents.js';
import { addDays } from '#shared/kernel/iso-date.js';

/** What the rules look at of a consent. Days are civil days of the village, `YYYY-MM-DD`. */
export interface ConsentFact {
  state: ConsentAnswer | 'withdrawn';
  uses: readonly ConsentUse[];
  until: string | null;
  reviewBy: string;
}

/** A thing that was never agreed to be shown; before every day of the village. */
const NEVER = '1000-01-01';

/**
 * What a village does among its own people with what stands on its board, where nobody has been asked yet: the work of
 * the office and of older calendars. All that leaves the village needs a yes, and so does everything about a belief.
 */
const AMONG_ITS_OWN: readonly ConsentUse[] = ['keep', 'show', 'print', 'recording', 'feed', 'message'];
const OF_A_BELIEF: readonly ConsentUse[] = ['keep', 'show', 'recording'];

/**
 * The one answer to "may this be used so today?". Every record of the thing has to say yes to this use by itself: what
 * is not ticked, not answered, refused, taken back or lapsed is a no. Being asked, or "not now", hides nothing.
 *
 * @param kind of an entry; null for figures, stories and files
 */
export function mayUse(
  consents: readonly ConsentFact[],
  use: ConsentUse,
  kind: EntryKind | null,
  today: string,
): boolean {
  if (consents.length === 0) return amongItsOwn(kind).includes(use);
  return consents.every((consent) => {
    const state = stateOn(consent, today);
    if (isOpen(state) && (use === 'keep' || use === 'show')) return true;
    return isYes(state) && consent.uses.includes(use);
  });
}

/** Which yes a use of a thing still lacks: nobody was asked, somebody owes an answer, or this was not agreed to. */
export type MissingYes = 'nobody-asked' | 'no-answer' | 'not-agreed';

/** @returns null where nothing is missing */
export function missingYes(
  consents: readonly ConsentFact[],
  use: ConsentUse,
  kind: EntryKind | null,
  today: string,
): MissingYes | null {
  if (mayUse(consents, use, kind, today)) return null;
  if (consents.length === 0) return 'nobody-asked';
  return consents.some(({ state }) => isOpen(state)) ? 'no-answer' : 'not-agreed';
}

/** What a thing may be used for while nobody was asked about it. */
export function amongItsOwn(kind: EntryKind | null): readonly ConsentUse[] {
  return kind === 'belief' ? OF_A_BELIEF : AMONG_ITS_OWN;
}

export function stateOn({ state, until }: ConsentFact, today: string): ConsentState {
  return isYes(state) && until !== null && today > until ? 'lapsed' : state;
}

/** To be asked again: the review date or the end is near or past. An overdue consent still holds until its end. */
export function isDue({ state, until, reviewBy }: ConsentFact, today: string): boolean {
  if (!isYes(state)) return false;
  const first = until !== null && until < reviewBy ? until : reviewBy;
  return addDays(today, DUE_AHEAD_DAYS) >= first;
}

/** The last day on which all of them let the thing be kept and shown; null where none of them ends. */
export function shownUntil(consents: readonly ConsentFact[]): string | null {
  const ends = consents.map((consent) => {
    if (isOpen(consent.state)) return null;
    const shows = consent.uses.includes('keep') && consent.uses.includes('show');
    return isYes(consent.state) && shows ? consent.until : NEVER;
  });
  return ends.filter((end) => end !== null).toSorted()[0] ?? null;
}

/** Not answered either way. */
export function isOpen(state: ConsentState): boolean {
  return state === 'asked' || state === 'not-now';
}

function isYes(state: ConsentState): boolean {
  return state === 'given' || state === 'given-with-conditions';
}
