import type { MarkerRow } from '#shared/contracts/stars.js';
import { textFits } from '#src/ui/combo-field.js';

/** More would only be scrolled past: another letter narrows the list faster. */
export const SHOWN_MAX = 30;

/**
 * Stars and figures that fit what was typed: by name, letter and constellation, or HR number. The chosen one comes
 * first, then what the calendar goes by already, then the village's own figures, other figures, then the brighter before the fainter.
 */
export function findMarkers(
  rows: readonly MarkerRow[],
  typed: string,
  inUse: ReadonlySet<string>,
  chosen = '',
): MarkerRow[] {
  const wanted = typed.trim();
  const rank = ({ markerKey, kind }: MarkerRow) => {
    if (markerKey === chosen) return 0;
    if (inUse.has(markerKey)) return 1;
    return kind === 'own-figure' ? 2 : kind === 'figure' ? 3 : 4;
  };
  return rows.filter((row) => fits(row, wanted)).sort((a, b) => rank(a) - rank(b) || a.vMag - b.vMag);
}

function fits(row: MarkerRow, typed: string): boolean {
  if (typed === '') return true;
  const number = /^(?:hr\s*)?(\d{1,4})$/iu.exec(typed)?.[1];
  if (number !== undefined && row.hr === Number(number)) return true;
  return textFits(`${row.name} ${row.designation}`, typed);
}
