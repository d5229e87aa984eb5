import type { EntryInput } from '#shared/contracts/calendars.js';
import type { VillageWord } from '#shared/contracts/village-word.js';
import { sameJson } from '#shared/kernel/canonical-json.js';

/**
 * What an entry says, whatever the village calls its kind and its work: the built-in codes stay, and of the village's own
 * words which of them is meant. Two contents that differ in a name alone are the same then.
 */
export function withoutVillageWords(content: EntryInput): unknown {
  const { kindWord, record, ...rest } = content;
  if (record === undefined) return { ...rest, kindWordId: idOf(kindWord) };
  const { operationWord, ownOperation, ...what } = record.what;
  const operationWordId = idOf(operationWord);
  // "Something else" that is a word of the list has its name from there.
  const inOwnWords = operationWordId === null || what.operation !== 'other' ? ownOperation : '';
  const named = { ...record, what: { ...what, operationWordId, ownOperation: inOwnWords } };
  return { ...rest, kindWordId: idOf(kindWord), record: named };
}

export function sameButForVillageWords(a: EntryInput, b: EntryInput): boolean {
  return sameJson(withoutVillageWords(a), withoutVillageWords(b));
}

function idOf(word: VillageWord | undefined): string | null {
  return word?.id ?? null;
}
