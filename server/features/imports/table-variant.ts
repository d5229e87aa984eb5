import type { EntryInput } from '#shared/contracts/calendars.js';
import type { ImportColumn } from '#shared/contracts/imports.js';
import { variantInput, type VariantInput } from '#shared/contracts/variants.js';
import { cellOf, type Cells, type LineProblem, type TableFacts } from './table-cells.js';
import { lineProblems, NO_LEAD, NO_OFFSETS } from './table-line.js';
import { timingOf } from './table-timing.js';

/** Another keeper's timing from one line of a table, shared as the entry beside which it comes. */
export function variantOfLine(
  cells: Cells,
  facts: TableFacts,
  sharingLevel: EntryInput['sharingLevel'],
): { content: VariantInput | null; problems: LineProblem[] } {
  const cell = (column: ImportColumn) => cellOf(cells, column);
  const timing = timingOf(cells, facts);
  const problems: LineProblem[] = [
    ...timing.problems,
    // The same work by another sign: counted from other work it would be another work.
    ...(timing.hangsOn === null ? [] : [{ column: timing.hangsOn.column, code: 'not-in-list' }]),
  ];
  const words = variantInput.safeParse({
    difference: cell('variantDifference'),
    lead: timing.lead ?? NO_LEAD,
    offsets: timing.offsets ?? NO_OFFSETS,
    otherSigns: cell('otherSigns'),
    ifLate: cell('ifLate'),
    giver: cell('giver'),
    giverId: null,
    confidence: cell('variantConfidence'),
    basis: cell('variantBasis'),
    note: cell('notes'),
    sharingLevel,
  } satisfies Record<keyof Omit<VariantInput, 'sharing'>, unknown>);
  if (!words.success) problems.push(...lineProblems(words.error.issues, cells));
  return { content: words.success && problems.length === 0 ? words.data : null, problems };
}
