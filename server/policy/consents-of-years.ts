import type { EntryKind } from '#shared/contracts/calendars.js';
import type { ConsentFact } from './consents.js';
import { amongItsOwn, isOpen } from './consents.js';

/**
 * What somebody's answer about a thing in one year leaves of their answer about the same thing in another: a no and an end hold
 * for every year, a yes only for the year in which it was said.
 * @param known their answer for the other year; null where nobody was asked there
 * @returns the answer that holds from now on; null where nothing becomes narrower
 */
export function narrowedConsent(
  known: ConsentFact | null,
  said: ConsentFact,
  kind: EntryKind | null,
): ConsentFact | null {
  if (known === null) return narrowedFromNothing(said, kind);
  if (isNo(known)) return null;
  if (isNo(said)) return { ...known, state: said.state, uses: [] };
  if (isOpen(said.state)) {
    if (isOpen(known.state) || known.uses.every(isKeepOrShow)) return null;
    return { ...known, uses: known.uses.filter(isKeepOrShow) };
  }
  if (isOpen(known.state)) {
    if (shows(said) && said.until === null) return null;
    return { ...known, state: said.state, uses: said.uses.filter(isKeepOrShow), until: said.until };
  }
  const uses = known.uses.filter((use) => said.uses.includes(use));
  const until = earlier(known.until, said.until);
  if (uses.length === known.uses.length && until === known.until) return null;
  return { ...known, uses, until };
}

function narrowedFromNothing(said: ConsentFact, kind: EntryKind | null): ConsentFact | null {
  if (isOpen(said.state)) return null;
  const usual = amongItsOwn(kind);
  const uses = isNo(said) ? [] : usual.filter((use) => said.uses.includes(use));
  return uses.length === usual.length && said.until === null ? null : { ...said, uses };
}

function isNo({ state }: ConsentFact): boolean {
  return state === 'withdrawn' || state === 'refused';
}

function shows({ uses }: ConsentFact): boolean {
  return uses.includes('keep') && uses.includes('show');
}

function isKeepOrShow(use: ConsentFact['uses'][number]): boolean {
  return use === 'keep' || use === 'show';
}

function earlier(a: string | null, b: string | null): string | null {
  if (a === null || b === null) return a ?? b;
  return a < b ? a : b;
}
