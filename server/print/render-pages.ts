import { setImmediate } from 'node:timers/promises';
import PDFDocument from 'pdfkit';
import { pathsOf } from '#shared/sheet/page-paths.js';
import type { PathOp } from '#shared/sheet/page-paths.js';
import type { DrawnPage, Ink, TextPrimitive } from '#shared/sheet/primitives.js';
import { MM_PER_PT } from '#shared/sheet/units.js';
import { fontOf, textRuns } from './font-book.js';
import type { FaceName, FontWeight } from './font-book.js';
import { fontMeasurer } from './font-measurer.js';

export interface PdfAbout {
  readonly title: string;
  readonly author: string;
  /** Language of most of the text, as a tag. */
  readonly language: string;
  /** `YYYY-MM-DD`; the only date in the file, so that the same sheet gives the same file. */
  readonly printDate: string;
}

const COLOURS: Record<Ink, string> = { ink: '#000000', paper: '#ffffff', grey: '#8c8c8c' };
const OUTLINE_MM = 0.6;

/** Draws laid-out pages as a PDF at true scale. Lets other work run between pages. */
export async function renderPages(pages: readonly DrawnPage[], about: PdfAbout): Promise<Buffer> {
  const doc = new PDFDocument({
    autoFirstPage: false,
    margin: 0,
    lang: about.language,
    displayTitle: true,
    pdfVersion: '1.7',
    info: {
      Title: about.title,
      Author: about.author,
      Creator: 'Dawnpeg',
      Producer: 'Dawnpeg',
      CreationDate: new Date(`${about.printDate}T00:00:00Z`),
    },
  });
  const chunks: Buffer[] = [];
  const finished = new Promise<Buffer>((resolve, reject) => {
    doc.on('data', (chunk: Buffer) => chunks.push(chunk));
    doc.on('end', () => {
      resolve(Buffer.concat(chunks));
    });
    doc.on('error', reject);
  });
  askForActualSize(doc);
  for (const page of pages) {
    doc.addPage({ size: [page.width / MM_PER_PT, page.height / MM_PER_PT], margin: 0 });
    doc.save();
    doc.scale(1 / MM_PER_PT);
    for (const primitive of page.primitives) {
      if (primitive.type === 'text') drawText(doc, primitive);
      else for (const op of pathsOf(primitive)) drawPath(doc, op);
    }
    doc.restore();
    await setImmediate();
  }
  doc.end();
  return finished;
}

/** Tells print dialogs not to fit the page to the printer: a board has to come out at its true size. */
function askForActualSize(doc: PDFKit.PDFDocument): void {
  const { _root: root } = doc as unknown as {
    _root: { data: { ViewerPreferences?: { data: Record<string, unknown> } } };
  };
  const preferences = root.data.ViewerPreferences;
  if (preferences) preferences.data['PrintScaling'] = 'None';
}

function drawPath(doc: PDFKit.PDFDocument, op: PathOp): void {
  doc.save();
  if (op.move) doc.translate(op.move.x, op.move.y).scale(op.move.scale);
  doc.path(op.d);
  if (op.stroke) {
    doc
      .lineWidth(op.strokeMm)
      .lineCap(op.cap)
      .lineJoin(op.cap === 'round' ? 'round' : 'miter');
    if (op.dashMm) doc.dash(op.dashMm[0], { space: op.dashMm[1] });
    doc.strokeColor(COLOURS[op.stroke]);
  }
  if (op.fill) doc.fillColor(COLOURS[op.fill]);
  if (op.fill && op.stroke) doc.fillAndStroke();
  else if (op.fill) doc.fill('even-odd');
  else doc.stroke();
  doc.restore();
}

function drawText(doc: PDFKit.PDFDocument, text: TextPrimitive): void {
  const sizeMm = text.sizePt * MM_PER_PT;
  const isOutline = text.paint === 'outline' || text.paint === 'grey-outline';
  doc.save();
  doc.fontSize(sizeMm);
  doc.fillColor(text.paint === 'paper' ? COLOURS.paper : COLOURS.ink);
  if (isOutline) {
    doc
      .lineWidth(OUTLINE_MM)
      .lineJoin('round')
      .strokeColor(text.paint === 'outline' ? COLOURS.ink : COLOURS.grey);
  }
  for (const line of text.lines) {
    doc.save();
    if (text.turnDeg !== 0) doc.rotate(-text.turnDeg, { origin: [line.x, line.baseline] });
    let x = line.x;
    for (const run of textRuns(line.text, text.weight)) {
      doc.font(registered(doc, run.face, text.weight));
      const draw = (): void => {
        doc.text(run.text, x, line.baseline, {
          lineBreak: false,
          baseline: 'alphabetic',
          fill: !isOutline,
          stroke: isOutline,
        });
      };
      if (run.face === 'devanagari') withReadableText(doc, run.text, draw);
      else draw();
      x += fontMeasurer.widthMm(run.text, { sizePt: text.sizePt, weight: text.weight });
    }
    doc.restore();
  }
  doc.restore();
}

/**
 * Scripts that move vowel signs about on paper cannot be read back in their order from the glyphs, so the text
 * is written down beside them. Readers place it by the drawing state at its end, which therefore has to be the
 * one the glyphs were drawn in: upside down, as the PDF library draws text.
 */
function withReadableText(doc: PDFKit.PDFDocument, text: string, draw: () => void): void {
  const { height } = doc.page;
  doc.save().transform(1, 0, 0, -1, 0, height);
  doc.markContent('Span', { actual: text });
  doc.save().transform(1, 0, 0, -1, 0, height);
  draw();
  doc.restore();
  doc.endMarkedContent();
  doc.restore();
}

const registeredFonts = new WeakMap<PDFKit.PDFDocument, Set<string>>();

function registered(doc: PDFKit.PDFDocument, face: FaceName, weight: FontWeight): string {
  const name = `${face}-${weight}`;
  const known = registeredFonts.get(doc) ?? new Set<string>();
  registeredFonts.set(doc, known);
  if (!known.has(name)) {
    // One that is read already serves every file: its tables are not gone through again. The types name bytes alone.
    doc.registerFont(name, fontOf(face, weight) as unknown as Buffer);
    known.add(name);
  }
  return name;
}
