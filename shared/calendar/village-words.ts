import { sameJson } from '#shared/kernel/canonical-json.js';

/** A name that the village gave; with an id where it is of a word of its own. */
interface GivenName {
  id?: string | undefined;
  word: string;
}

/** The part of an entry's content that these rules look into; the rest is compared as it stands. */
export interface NamedByVillage {
  kindWord?: GivenName | undefined;
  record?:
    | { what: { operation: string | null; ownOperation: string; operationWord?: GivenName | undefined } }
    | undefined;
}

/**
 * What an entry says, whatever the village calls its kind and its work: the built-in codes stay, and of the village's own
 * words which of them is meant. Two contents that differ in a name alone are the same then.
 */
export function withoutVillageWords(content: NamedByVillage): unknown {
  const { kindWord, record, ...rest } = content;
  if (record === undefined) return { ...rest, kindWordId: idOf(kindWord) };
  const { operationWord, ownOperation, ...what } = record.what;
  const operationWordId = idOf(operationWord);
  // "Something else" that is a word of the list has its name from there.
  const inOwnWords = operationWordId === null || what.operation !== 'other' ? ownOperation : '';
  const named = { ...record, what: { ...what, operationWordId, ownOperation: inOwnWords } };
  return { ...rest, kindWordId: idOf(kindWord), record: named };
}

export function sameButForVillageWords(a: NamedByVillage, b: NamedByVillage): boolean {
  return sameJson(withoutVillageWords(a), withoutVillageWords(b));
}

function idOf(word: GivenName | undefined): string | null {
  return word?.id ?? null;
}
