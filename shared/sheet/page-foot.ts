import type { Primitive } from './primitives.js';
import type { SheetModel } from './sheet-model.js';
import { rule } from './strokes.js';
import { fitStatements, leadingMm, textBlock, textUpward, wrapText } from './text-layout.js';
import type { TextMeasurer, TextStyle } from './text-layout.js';
import { roundMm } from './units.js';

export const SCALE_BAR_MM = 100;
export const DRILL_MM = 6;
export const PEG_MM = 5;

/** A village's name no wider than this stands whole in every head. */
export const HEAD_NAME_MM = 75;
const CAUTION: TextStyle = { role: 'legend', sizePt: 14, weight: 700 };
export const FOOT: TextStyle = { role: 'foot', sizePt: 12, weight: 400, leadingEm: 1.28 };

export interface PageFoot {
  readonly height: number;
  /** Statements for which the foot had no room; they belong on another page. */
  readonly leftOut: readonly string[];
  draw(top: number): Primitive[];
}

/** A 100 mm bar, measured over the outer edges of its ticks. */
export function scaleBar(axis: 'across' | 'down', x: number, y: number): Primitive {
  return {
    type: 'scale-bar',
    axis,
    x: roundMm(x),
    y: roundMm(y),
    length: SCALE_BAR_MM,
    tickLength: 5,
    strokeMm: 0.4,
  };
}

/** The bar down with its words, written upwards beside it. */
export function barDown(
  model: SheetModel,
  at: { readonly x: number; readonly top: number; readonly textBaseline: number },
  measurer: TextMeasurer,
): Primitive[] {
  return [
    scaleBar('down', at.x, at.top),
    textUpward(
      model.words.measureDown(),
      { x: at.textBaseline, middle: at.top + SCALE_BAR_MM / 2 },
      FOOT,
      measurer,
    ),
  ];
}

/** What every page says about itself, in the order in which it matters. `namesDawnOrDusk` adds the care for eyes. */
export function footStatements(
  model: SheetModel,
  namesDawnOrDusk: boolean,
  measurer: TextMeasurer,
): string[] {
  const { words } = model;
  return [
    ...(namesDawnOrDusk ? [words.eyesCaution()] : []),
    words.contacts(model.contacts),
    ...model.basis,
    ...(model.signedBy.trim() === '' ? [] : [words.signedBy(model.signedBy)]),
    // A head shortens a long name of the village; the foot has it whole.
    ...(measurer.widthMm(model.communityName, CAUTION) > HEAD_NAME_MM ? [model.communityName] : []),
  ];
}

/** "2027-1", or the state of what is not published yet. */
export function issueWords(model: SheetModel): string {
  if (model.label !== null) return model.label;
  return model.stateWatermark === null ? String(model.year) : `${model.year} · ${model.stateWatermark}`;
}

/** The foot of a whole page: caution, contacts, basis, and the bar across with how to print. */
export function pageFoot(
  model: SheetModel,
  area: { readonly left: number; readonly right: number },
  namesDawnOrDusk: boolean,
  maxHeightMm: number,
  measurer: TextMeasurer,
): PageFoot {
  const { words } = model;
  const width = area.right - area.left;
  const caution = wrapText(words.shortCaution(), width, CAUTION, measurer);
  const across = wrapText(words.measureAcross(), width - SCALE_BAR_MM - 4, FOOT, measurer);
  const howToPrint = [words.fullSize(), words.pegAndDrill({ pegMm: PEG_MM, drillMm: DRILL_MM })].join(' ');
  const printWidth = Math.min(measurer.widthMm(howToPrint, FOOT), width * 0.66);
  const printLines = wrapText(howToPrint, printWidth, FOOT, measurer);
  const issueLines = wrapText(
    words.issueForPlace({ issue: issueWords(model), place: model.placeName }),
    width - printWidth - 5,
    FOOT,
    measurer,
  ).slice(0, 3);
  const line = leadingMm(FOOT);
  const cautionHeight = caution.length * leadingMm(CAUTION);
  const acrossHeight = Math.max(6, across.length * line);
  const fixedHeight =
    0.6 + cautionHeight + acrossHeight + Math.max(printLines.length, issueLines.length) * line;
  const { lines: statements, leftOut } = fitStatements(
    [...footStatements(model, namesDawnOrDusk, measurer), words.printed(model.printDate)],
    width,
    Math.max(1, Math.floor((maxHeightMm - fixedHeight) / line)),
    FOOT,
    measurer,
  );
  const statementsHeight = statements.length * line;
  return {
    height: fixedHeight + statementsHeight,
    leftOut,
    draw: (top) => {
      const statementsTop = top + 0.6 + cautionHeight;
      const acrossTop = statementsTop + statementsHeight;
      const lastTop = acrossTop + acrossHeight;
      return [
        rule(area.left, area.right, top),
        textBlock(caution, { x: area.left, top: top + 0.6 }, CAUTION, measurer),
        textBlock(statements, { x: area.left, top: statementsTop }, FOOT, measurer),
        textBlock(across, { x: area.left, top: acrossTop + 0.4 }, FOOT, measurer),
        scaleBar('across', area.right - SCALE_BAR_MM, acrossTop + 3.2),
        textBlock(printLines, { x: area.left, top: lastTop }, FOOT, measurer),
        textBlock(issueLines, { x: area.right, top: lastTop, align: 'right' }, FOOT, measurer),
      ];
    },
  };
}
