import type { TextPrimitive } from './primitives.js';
import type { SheetModel } from './sheet-model.js';
import { capHeightMm, textOnBaseline, wrapText } from './text-layout.js';
import type { TextMeasurer, TextStyle } from './text-layout.js';

/** Its figures are 20 mm high: an old sheet has to be told from a new one across a room. */
export const VERSION_FIGURE_PT = 80;
const YEAR_SIZES_PT = [24, 20] as const;

export interface FigurePlace {
  readonly left: number;
  readonly right: number;
  readonly baseline: number;
}

/**
 * The issue in large outlined figures that end at `right`, with the year before them where there is room from
 * `left` on. What has no issue yet shows its year and, over it, its state. `saysYear` tells whether the year got in.
 */
export function versionFigure(
  model: SheetModel,
  at: FigurePlace,
  measurer: TextMeasurer,
): { readonly primitives: TextPrimitive[]; readonly saysYear: boolean } {
  if (model.label === null) return { primitives: unpublished(model, at, measurer), saysYear: true };
  const parts = /^(\d{4}-)(\d+)$/u.exec(model.label);
  const figure = textOnBaseline(
    [parts?.[2] ?? model.label],
    { x: at.right - 0.4, baseline: at.baseline, align: 'right', paint: 'outline', figures: true },
    { role: 'version-figure', sizePt: VERSION_FIGURE_PT, weight: 700 },
    measurer,
  );
  for (const sizePt of YEAR_SIZES_PT) {
    const year = textOnBaseline(
      [parts?.[1] ?? String(model.year)],
      { x: figure.box.x - 0.5, baseline: at.baseline, align: 'right', figures: true },
      yearStyle(sizePt),
      measurer,
    );
    if (year.box.x >= at.left) return { primitives: [year, figure], saysYear: true };
  }
  return { primitives: [figure], saysYear: false };
}

function yearStyle(sizePt: number): TextStyle {
  return { role: 'version-year', sizePt, weight: 700 };
}

function unpublished(model: SheetModel, at: FigurePlace, measurer: TextMeasurer): TextPrimitive[] {
  const style = yearStyle(20);
  const year = textOnBaseline(
    [String(model.year)],
    { x: at.right, baseline: at.baseline, align: 'right', figures: true },
    style,
    measurer,
  );
  const state = wrapText(model.stateWatermark ?? '', at.right - at.left, style, measurer);
  if (state.length !== 1) return [year];
  const above = at.baseline - capHeightMm(style.sizePt) - 4.5;
  return [textOnBaseline(state, { x: at.right, baseline: above, align: 'right' }, style, measurer), year];
}
