import type { CalendarFile } from '#shared/contracts/calendar-file.js';
import type { EntryInput, EntryLead } from '#shared/contracts/calendars.js';
import type { SeenVariant, VersionEntryBody } from '#shared/contracts/versions.js';
import { anchorOf } from '#shared/calendar/anchors.js';
import { randomUUID } from 'node:crypto';
import type { LandingEntry } from './landing.service.js';

export interface FilePlan {
  entries: LandingEntry[];
  refused: number;
}

/** What is known of the things of a file in the village today. */
export interface KnownToday {
  /** May an entry or a timing come in at all? */
  mayCome: (itemType: 'entry' | 'variant', itemId: string, lead: EntryLead) => boolean;
  /** Its words as they land: with its level and its giver of today. */
  wordsOf: (entry: VersionEntryBody) => EntryInput;
  variantWordsOf: (variant: SeenVariant) => SeenVariant['content'];
  /** Whether the village knows the thing: its level and consents then go along. */
  isKnown: (entryId: string) => boolean;
}

/**
 * The entries of a file that may come in, under ids of their own, pointing at each other as they did. What counts its
 * days from one that may not come in has nothing to count from, and stays out with it.
 */
export function filePlan({ entries }: Pick<CalendarFile, 'entries'>, today: KnownToday): FilePlan {
  const coming = new Map(
    entries
      .filter(({ entryId, content }) => today.mayCome('entry', entryId, content.lead))
      .map((entry) => [entry.entryId, entry]),
  );
  for (let before = -1; before !== coming.size;) {
    before = coming.size;
    for (const { entryId, content } of [...coming.values()]) {
      const anchorId = anchorOf(content.lead);
      if (anchorId !== null && !coming.has(anchorId)) coming.delete(entryId);
    }
  }
  const newIdOf = new Map<string, string>([...coming.keys()].map((id) => [id, randomUUID()]));
  const planned = [...coming.values()].map((entry): LandingEntry => {
    const { entryId, variants = [] } = entry;
    const beside = variants
      .filter((variant) => today.mayCome('variant', variant.variantId, variant.content.lead))
      .map((variant) => ({
        id: randomUUID(),
        content: today.variantWordsOf(variant),
        sameAs: variant.variantId,
      }));
    return {
      id: newIdOf.get(entryId) ?? entryId,
      content: pointingAnew(
        today.wordsOf(entry),
        newIdOf,
        new Map(beside.map((one) => [one.sameAs, one.id])),
      ),
      sameAs: today.isKnown(entryId) ? entryId : null,
      variants: beside,
    };
  });
  const all = count(entries.map(({ variants }) => variants));
  return { entries: planned, refused: all - count(planned.map(({ variants }) => variants)) };
}

/** Entries with the timings beside them. */
function count(variantsOfEntries: readonly (readonly unknown[] | undefined)[]): number {
  return variantsOfEntries.reduce((sum, variants) => sum + 1 + (variants?.length ?? 0), 0);
}

function pointingAnew(
  content: EntryInput,
  newIdOf: ReadonlyMap<string, string>,
  newVariantIdOf: ReadonlyMap<string, string>,
): EntryInput {
  const { board, lead } = content;
  const moved = 'entryId' in lead ? { ...lead, entryId: newIdOf.get(lead.entryId) ?? lead.entryId } : lead;
  // Each word stays where it stood: what is exported again is the same, letter by letter.
  const words = { ...content, lead: moved };
  if (board === undefined || board.variantId === null) return words;
  const variantId = newVariantIdOf.get(board.variantId);
  // What drove the board is not there any more: the entry's own days do.
  if (variantId !== undefined) return { ...words, board: { ...board, variantId } };
  const { board: _gone, ...left } = words;
  return left;
}
