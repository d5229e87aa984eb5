import type { Answer } from '#shared/contracts/reviews.js';

/** The answer of one elder to each entry. */
export function answersOf(answers: readonly Answer[], elderId: string): Map<string, Answer> {
  return new Map(answers.filter((each) => each.elderId === elderId).map((each) => [each.entryId, each]));
}

/** Index of the first entry without an answer behind `from`, going round; null when all are answered. */
export function nextOpen(
  entryIds: readonly string[],
  answered: ReadonlyMap<string, unknown>,
  from: number,
): number | null {
  for (let step = 1; step <= entryIds.length; step += 1) {
    const index = (from + step) % entryIds.length;
    if (!answered.has(entryIds[index] ?? '')) return index;
  }
  return null;
}
