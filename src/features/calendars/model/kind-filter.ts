import type { EntryKind } from '#shared/contracts/calendars.js';
import type { ShownEntry } from './preview-dates.js';

/** A kind as a list has it; a word of the village's own is a kind of its own there. */
export interface KindInList {
  key: string;
  kind: EntryKind;
  /** What the village calls it; null for the usual name. */
  word: string | null;
  count: number;
}

/** The kinds of these entries, in the order in which they come first. */
export function kindsIn(entries: readonly ShownEntry[]): KindInList[] {
  const kinds = new Map<string, KindInList>();
  for (const entry of entries) {
    const key = kindKey(entry);
    const { kind, kindWord } = entry.content;
    const known = kinds.get(key) ?? { key, kind, word: kindWord?.word ?? null, count: 0 };
    kinds.set(key, { ...known, count: known.count + 1 });
  }
  return [...kinds.values()];
}

/** Those of one kind, with the open one: what is typed there must not take it away under somebody's hands. */
export function ofKind(
  entries: readonly ShownEntry[],
  key: string | null,
  openId: string | null,
): readonly ShownEntry[] {
  return key === null ? entries : entries.filter((entry) => kindKey(entry) === key || entry.id === openId);
}

function kindKey({ content: { kind, kindWord } }: ShownEntry): string {
  return kindWord?.id ?? kind;
}
