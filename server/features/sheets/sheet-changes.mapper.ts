import { compareEntries } from '#shared/calendar/comparison.js';
import { boardOf } from '#shared/calendar/variants.js';
import type { VersionEntryBody } from '#shared/contracts/versions.js';
import { sameJson } from '#shared/kernel/canonical-json.js';
import type { SheetChanges } from '#shared/sheet/sheet-model.js';
import type { SheetWords } from '#shared/sheet/sheet-words.js';
import type { Translate } from '../../print/translator.js';

export interface SheetBefore {
  /** Label of the version that hung on the wall before. */
  label: string;
  /** Those of it that may be printed today. */
  entries: readonly VersionEntryBody[];
}

/** What is not on the board shows no difference on it. */
const OFF_THE_BOARD = new Set([
  'giverId',
  'sharing',
  'sharingLevel',
  'agreedToPrint',
  'kind',
  'dates.warnings',
]);

/** What a mended board says otherwise than the one before it in the same year; undefined where it says the same. */
export function toSheetChanges(
  before: SheetBefore,
  entries: readonly VersionEntryBody[],
  { files, words }: { files: Translate; words: SheetWords },
): SheetChanges | undefined {
  const range = (body: VersionEntryBody) => {
    const { window } = boardOf(body);
    return window === null ? files('sheet.changes.noDays') : words.range(window.bestFrom, window.bestTo);
  };
  const lines = compareEntries(before.entries, entries).flatMap(
    ({ before: was, after: is, fields }): string[] => {
      const title = (is ?? was)?.content.titleOfficer ?? '';
      if (was === null) return [files('sheet.changes.added', { title })];
      if (is === null) return [files('sheet.changes.removed', { title })];
      if (!sameJson(boardOf(was).window, boardOf(is).window)) {
        const [from, to] = [range(was), range(is)];
        return [
          files(from === to ? 'sheet.changes.edges' : 'sheet.changes.days', {
            title,
            before: from,
            after: to,
          }),
        ];
      }
      return fields.every(({ field }) => OFF_THE_BOARD.has(field))
        ? []
        : [files('sheet.changes.words', { title })];
    },
  );
  return lines.length === 0
    ? undefined
    : { title: files('sheet.changes.title', { label: before.label }), lines };
}
