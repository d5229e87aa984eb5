import { layoutSheet } from '#shared/sheet/layout-sheet.js';
import type { SheetPage } from '#shared/sheet/primitives.js';
import type { SheetModel } from '#shared/sheet/sheet-model.js';
import { unprintableClusters } from './font-book.js';
import { fontMeasurer } from './font-measurer.js';
import { renderPages } from './render-pages.js';
import type { PdfAbout } from './render-pages.js';

/** The pages of a sheet, measured with the printed typefaces: plain data for the screen and for `renderPages`. */
export function layoutSheetForServer(model: SheetModel): SheetPage[] {
  return layoutSheet(model, fontMeasurer);
}

/** What the file says about itself. */
export function pdfAbout(model: SheetModel): PdfAbout {
  return {
    title: model.words.boardTitle({
      community: model.communityName,
      issue: model.label ?? `${model.year} · ${model.stateWatermark ?? ''}`,
    }),
    author: model.communityName,
    language: model.officerLanguage,
    printDate: model.printDate,
  };
}

/** The sheet as a PDF at true scale. The same model gives the same bytes. */
export async function renderSheetPdf(model: SheetModel): Promise<Buffer> {
  return renderPages(layoutSheetForServer(model), pdfAbout(model));
}

/** Letters of a laid-out sheet that no typeface of ours has, in the order in which they appear. */
export function unprintableLetters(pages: readonly SheetPage[]): string[] {
  const text = pages.flatMap((page) =>
    page.primitives.flatMap((primitive) =>
      primitive.type === 'text' ? primitive.lines.map((line) => line.text) : [],
    ),
  );
  return unprintableClusters(text.join('\n'));
}
