import type { ReadLine, TableLine } from '#shared/contracts/imports.js';

/** What stands in the cells that name a sign which nobody knows, each once and in the order of the table. */
export function wordsNobodyKnows(sent: readonly TableLine[], read: readonly ReadLine[]): string[] {
  const cellsOf = new Map(sent.map(({ line, cells }) => [line, cells]));
  const words = read.flatMap(({ line, problems }) =>
    problems
      .filter(({ code }) => code === 'unknown-sign-words')
      .map(({ column }) => (cellsOf.get(line)?.[column] ?? '').trim()),
  );
  return [...new Set(words.filter((each) => each !== ''))];
}
