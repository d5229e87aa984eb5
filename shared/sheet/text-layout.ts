import type { Box, TextLine, TextPrimitive } from './primitives.js';
import { ASCENT_EM, CAP_HEIGHT_EM, DESCENT_EM, TYPE_FLOORS_PT } from './type-floors.js';
import type { TextRole } from './type-floors.js';
import type { Label } from './sheet-model.js';
import { MM_PER_PT, roundMm } from './units.js';

export interface TextStyle {
  readonly role: TextRole;
  readonly sizePt: number;
  readonly weight: 400 | 700;
  /** Distance from line to line where it is not the role's usual one. */
  readonly leadingEm?: number;
}

/** Tells how wide a line of text will be, with the very fonts that will draw it. */
export interface TextMeasurer {
  widthMm(text: string, style: { readonly sizePt: number; readonly weight: 400 | 700 }): number;
}

/** Distance from line to line, in ems: marks may stack above and hang below. */
const LEADING_EM: Partial<Record<TextRole, number>> = { 'event-name': 1.5 };
const USUAL_LEADING_EM = ASCENT_EM + DESCENT_EM;

export function leadingMm(style: TextStyle): number {
  return (style.leadingEm ?? LEADING_EM[style.role] ?? USUAL_LEADING_EM) * style.sizePt * MM_PER_PT;
}

export function capHeightMm(sizePt: number): number {
  return CAP_HEIGHT_EM * sizePt * MM_PER_PT;
}

const clusters = new Intl.Segmenter('und', { granularity: 'grapheme' });

/** Cuts one word that is wider than a line between its letters, never between a letter and its mark. */
function breakWord(word: string, widthMm: number, style: TextStyle, measurer: TextMeasurer): string[] {
  const pieces: string[] = [];
  let piece = '';
  for (const { segment } of clusters.segment(word)) {
    if (piece !== '' && measurer.widthMm(piece + segment, style) > widthMm) {
      pieces.push(piece);
      piece = segment;
    } else {
      piece += segment;
    }
  }
  return [...pieces, piece];
}

/**
 * Breaks text into lines no wider than `widthMm`. A no-break space holds (a date stays whole); line breaks in
 * the text are kept; text is composed (NFC) first. Empty text gives no line.
 */
export function wrapText(text: string, widthMm: number, style: TextStyle, measurer: TextMeasurer): string[] {
  const lines: string[] = [];
  for (const paragraph of text.normalize('NFC').split('\n')) {
    let line = '';
    for (const word of paragraph.split(/[ \t]+/u).filter((part) => part !== '')) {
      const joined = line === '' ? word : `${line} ${word}`;
      if (measurer.widthMm(joined, style) <= widthMm) {
        line = joined;
        continue;
      }
      if (line !== '') lines.push(line);
      const pieces =
        measurer.widthMm(word, style) <= widthMm ? [word] : breakWord(word, widthMm, style, measurer);
      lines.push(...pieces.slice(0, -1));
      line = pieces.at(-1) ?? '';
    }
    if (line !== '') lines.push(line);
  }
  return lines;
}

/** Text on one line, its end left out with an ellipsis where it is too long. */
export function onOneLine(text: string, widthMm: number, style: TextStyle, measurer: TextMeasurer): string {
  const whole = text.normalize('NFC').replaceAll('\n', ' ');
  if (measurer.widthMm(whole, style) <= widthMm) return whole;
  const letters = Array.from(clusters.segment(whole), ({ segment }) => segment);
  while (letters.length > 1 && measurer.widthMm(`${letters.join('').trimEnd()}…`, style) > widthMm)
    letters.pop();
  return `${letters.join('').trimEnd()}…`;
}

/**
 * Whole statements as running text, in their order, as many as fit into the lines there are. A statement that
 * does not fit is left out whole and named, never cut: half a telephone number helps nobody.
 */
export function fitStatements(
  statements: readonly string[],
  widthMm: number,
  maxLines: number,
  style: TextStyle,
  measurer: TextMeasurer,
): { readonly lines: string[]; readonly leftOut: string[] } {
  let lines: string[] = [];
  let text = '';
  const leftOut: string[] = [];
  for (const statement of statements) {
    const longer = text === '' ? statement : `${text} ${statement}`;
    const wrapped = wrapText(longer, widthMm, style, measurer);
    if (wrapped.length > maxLines) {
      leftOut.push(statement);
      continue;
    }
    text = longer;
    lines = wrapped;
  }
  return { lines, leftOut };
}

/** The village's words, then the officer's, on one line; one of them where they are the same or one is missing. */
export function joinLabel(label: Label): string {
  const village = label.village.normalize('NFC').trim();
  const officer = label.officer.normalize('NFC').trim();
  if (village === '' || village === officer) return officer;
  return officer === '' ? village : `${village} · ${officer}`;
}

/** Lines of a label: both languages on one line where they fit, else each language begins its own line. */
export function wrapLabel(label: Label, widthMm: number, style: TextStyle, measurer: TextMeasurer): string[] {
  const joined = joinLabel(label);
  if (measurer.widthMm(joined, style) <= widthMm) return joined === '' ? [] : [joined];
  if (joined === label.officer.normalize('NFC').trim()) return wrapText(joined, widthMm, style, measurer);
  return [
    ...wrapText(label.village, widthMm, style, measurer),
    ...wrapText(label.officer, widthMm, style, measurer),
  ];
}

export interface TextPlace {
  /** Left edge, middle or right edge, as `align` says. */
  readonly x: number;
  /** Top of the first line's room. */
  readonly top: number;
  readonly align?: 'left' | 'middle' | 'right';
  readonly paint?: TextPrimitive['paint'];
}

/** Lines of text as one primitive. Throws where a size is below its role's floor: no sheet may break one. */
export function textBlock(
  lines: readonly string[],
  place: TextPlace,
  style: TextStyle,
  measurer: TextMeasurer,
): TextPrimitive {
  const em = style.sizePt * MM_PER_PT;
  const leading = leadingMm(style);
  const first = place.top + (leading - (ASCENT_EM + DESCENT_EM) * em) / 2 + ASCENT_EM * em;
  return textOnBaseline(lines, { ...place, baseline: first }, style, measurer);
}

/** The same, told where the first line's letters stand. `figures` has room for figures and capitals only. */
export function textOnBaseline(
  lines: readonly string[],
  place: Omit<TextPlace, 'top'> & { readonly baseline: number; readonly figures?: boolean },
  style: TextStyle,
  measurer: TextMeasurer,
): TextPrimitive {
  if (style.sizePt < TYPE_FLOORS_PT[style.role]) {
    throw new RangeError(
      `${style.role} at ${style.sizePt} pt is below its floor of ${TYPE_FLOORS_PT[style.role]} pt`,
    );
  }
  const em = style.sizePt * MM_PER_PT;
  const leading = leadingMm(style);
  // Lines set closer than usual leave each other less room for marks.
  const closer = Math.max(0, (ASCENT_EM + DESCENT_EM - leading / em) / 2);
  const above = (place.figures ? CAP_HEIGHT_EM : ASCENT_EM - closer) * em;
  const below = (place.figures ? 0.02 : DESCENT_EM - closer) * em;
  const laid = lines.map((text, index): TextLine => {
    const width = measurer.widthMm(text, style);
    const shift = place.align === 'right' ? width : place.align === 'middle' ? width / 2 : 0;
    return {
      x: roundMm(place.x - shift),
      baseline: roundMm(place.baseline + index * leading),
      width: roundMm(width),
      text,
    };
  });
  const left = Math.min(place.x, ...laid.map((line) => line.x));
  const right = Math.max(left, ...laid.map((line) => line.x + line.width));
  const top = place.baseline - above;
  const bottom = place.baseline + Math.max(0, laid.length - 1) * leading + below;
  return {
    type: 'text',
    role: style.role,
    sizePt: style.sizePt,
    weight: style.weight,
    paint: place.paint ?? 'ink',
    turnDeg: 0,
    lines: laid,
    box: boxOf(left, top, right, bottom),
  };
}

/** One line that reads from bottom to top; `x` is its baseline, `middle` the middle of its length. */
export function textUpward(
  text: string,
  place: { readonly x: number; readonly middle: number },
  style: TextStyle,
  measurer: TextMeasurer,
): TextPrimitive {
  const upright = textOnBaseline([text], { x: 0, baseline: 0 }, style, measurer);
  const width = upright.lines[0]?.width ?? 0;
  const em = style.sizePt * MM_PER_PT;
  const start = place.middle + width / 2;
  return {
    ...upright,
    turnDeg: 90,
    lines: [{ x: roundMm(place.x), baseline: roundMm(start), width, text }],
    box: boxOf(place.x - ASCENT_EM * em, start - width, place.x + DESCENT_EM * em, start),
  };
}

/** The ground that each single line of a text covers: what must not meet other words. */
export function lineBoxes(text: TextPrimitive): Box[] {
  if (text.turnDeg !== 0) return [text.box];
  const first = text.lines[0];
  if (first === undefined) return [];
  const last = text.lines.at(-1) ?? first;
  const above = first.baseline - text.box.y;
  const below = text.box.y + text.box.height - last.baseline;
  return text.lines.map((line) =>
    boxOf(line.x, line.baseline - above, line.x + line.width, line.baseline + below),
  );
}

function boxOf(left: number, top: number, right: number, bottom: number): Box {
  return {
    x: roundMm(left),
    y: roundMm(top),
    width: roundMm(right - left),
    height: roundMm(bottom - top),
  };
}
