import { monthCards } from './month-card.js';
import type { SheetPage } from './primitives.js';
import type { SheetModel } from './sheet-model.js';
import type { TextMeasurer } from './text-layout.js';
import { yearBoard } from './year-board.js';

/**
 * The one door of the boards' geometry: a model and something that measures text give the pages of a sheet,
 * as plain data in millimetres. The same model and measurer always give the same pages.
 * Throws SheetModelError for an unpublished model without a watermark, RangeError for a date that is none.
 */
export function layoutSheet(model: SheetModel, measurer: TextMeasurer): SheetPage[] {
  return model.layout === 'month-cards' ? monthCards(model, measurer) : yearBoard(model, measurer);
}
