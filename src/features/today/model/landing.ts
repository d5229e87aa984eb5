import type { Role } from '#shared/contracts/people.js';
import type { WaitingItem } from '#shared/contracts/today.js';

/**
 * What a person who has just come in meets first instead of Today, or null. Elders come for their review and staff for
 * the sheet; who also compiles or keeps the village's records has more than one thing to do and begins at Today.
 */
export function landingOf(roles: readonly Role[], waiting: readonly WaitingItem[]): WaitingItem | null {
  if (roles.includes('officer') || roles.includes('steward')) return null;
  const review = waiting.find(({ kind }) => kind === 'answer-entries' || kind === 'sign-as-elder');
  if (roles.includes('elder') && review) return review;
  const sheet = waiting.find(({ kind }) => kind === 'print-published');
  return roles.includes('staff') && sheet ? sheet : null;
}
