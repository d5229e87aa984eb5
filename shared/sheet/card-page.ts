import { barDown } from './page-foot.js';
import type { Primitive, SheetPage } from './primitives.js';
import type { SheetModel } from './sheet-model.js';
import type { TextMeasurer } from './text-layout.js';
import { watermarked } from './watermark.js';
import type { WordRow } from './word-block.js';

/** Month cards: A4 upright, seven holes a week, 25.4 mm apart both ways, like a bought pegboard. */
export const CARD_PITCH_MM = 25.4;
const WIDTH_MM = 210;
const HEIGHT_MM = 297;
const LEFT_MM = 16.1;
const BAR_DOWN_X_MM = 10.2;
const BAR_DOWN_TOP_MM = 62;

export const CARD_AREA = { left: LEFT_MM, right: LEFT_MM + 7 * CARD_PITCH_MM } as const;
/** Where the foot of a card ends. */
export const CARD_BOTTOM_MM = HEIGHT_MM - 8;

/** One card with its bar down and, where nothing is published, its state across. */
export function cardPage(
  model: SheetModel,
  about: Pick<SheetPage, 'kind' | 'month' | 'name'>,
  primitives: readonly Primitive[],
  measurer: TextMeasurer,
): SheetPage {
  const withBar = [
    ...primitives,
    ...barDown(
      model,
      { x: BAR_DOWN_X_MM, top: BAR_DOWN_TOP_MM, textBaseline: BAR_DOWN_X_MM + 4.3 },
      measurer,
    ),
  ];
  return {
    ...about,
    width: WIDTH_MM,
    height: HEIGHT_MM,
    trim: null,
    primitives: watermarked(
      model,
      withBar,
      { x: CARD_AREA.left, y: 46, width: CARD_AREA.right - CARD_AREA.left, height: 150 },
      measurer,
    ),
  };
}

/** Rows of words one under the other. */
export function stackedRows(rows: readonly WordRow[], top: number): Primitive[] {
  let y = top;
  return rows.flatMap((row) => {
    const drawn = row.draw(y);
    y += row.height;
    return drawn;
  });
}
