import { dayOfYear, daysInMonth, isoOf } from './civil-days.js';
import { moonDisc } from './moon.js';
import { HEAD_NAME_MM, issueWords } from './page-foot.js';
import type { Primitive } from './primitives.js';
import type { SheetModel } from './sheet-model.js';
import { leadingMm, onOneLine, textBlock, textOnBaseline, wrapText } from './text-layout.js';
import type { TextMeasurer, TextStyle } from './text-layout.js';
import { versionFigure } from './version-figure.js';
import { LEGEND } from './word-block.js';

export const MONTH_NAME: TextStyle = { role: 'month-name', sizePt: 40, weight: 700 };
/** What names a card that is no month's, in two lines at most. */
const CARD_HEADING: TextStyle = { role: 'legend', sizePt: 20, weight: 700 };
const CARD_HEADING_LINES = 2;
const MOON_DATE: TextStyle = { role: 'moon-date', sizePt: 16, weight: 700 };

const FIGURE_BASELINE_MM = 29.2;
const NAME_BASELINE_MM = 26.4;
const SECOND_LINE_MM = 31.6;
const NAME_WIDTH_MM = 76;
const MOON_PITCH_MM = 10.8;
const MOON_RADIUS_MM = 4.2;
const GAP_MM = 3;

export interface HeadArea {
  readonly left: number;
  readonly right: number;
}

/** The month as it is written large: the village's name where there is one and it fits, else the officer's. */
export function monthTitle(
  model: SheetModel,
  month: number,
  widthMm: number,
  measurer: TextMeasurer,
): { readonly large: string; readonly other: string | null } {
  const { village, officer } = model.words.monthName(month);
  const fits = (name: string): boolean => name !== '' && measurer.widthMm(name, MONTH_NAME) <= widthMm;
  const candidates = [village, officer, model.words.monthShort(month)].map((name) =>
    name.normalize('NFC').trim(),
  );
  const large = candidates.find(fits) ?? String(month);
  const other = [officer, village].find((name) => name !== '' && name !== large) ?? null;
  return { large, other };
}

/**
 * Title, Moons and issue over a card; `second` is what stands under the title, or is the title itself where the card is
 * no month's. Answers where it ends.
 */
export function cardHead(
  model: SheetModel,
  month: number | null,
  second: string,
  area: HeadArea,
  measurer: TextMeasurer,
): { primitives: Primitive[]; bottom: number } {
  const moons =
    month === null
      ? []
      : model.moon
          .filter(({ date }) => date.startsWith(isoOf(model.year, month, 1).slice(0, 8)))
          .toSorted((a, b) => (a.date < b.date ? -1 : 1));
  const title = month === null ? null : monthTitle(model, month, NAME_WIDTH_MM, measurer);
  const heading = month === null ? wrapText(second, NAME_WIDTH_MM, CARD_HEADING, measurer) : [];
  const isHeading = heading.length > 0 && heading.length <= CARD_HEADING_LINES;
  const moonsLeft = area.left + NAME_WIDTH_MM + 1.5;
  const moonsRight = moonsLeft + moons.length * MOON_PITCH_MM;
  const figure = versionFigure(
    model,
    { left: moonsRight + 1, right: area.right, baseline: FIGURE_BASELINE_MM },
    measurer,
  );
  const primitives: Primitive[] = [
    ...(title === null
      ? []
      : [textOnBaseline([title.large], { x: area.left, baseline: NAME_BASELINE_MM }, MONTH_NAME, measurer)]),
    ...(isHeading
      ? [
          textBlock(
            heading,
            { x: area.left, top: SECOND_LINE_MM - heading.length * leadingMm(CARD_HEADING) },
            CARD_HEADING,
            measurer,
          ),
        ]
      : []),
    ...figure.primitives,
  ];
  moons.forEach(({ phase, date }, index) => {
    const cx = moonsLeft + MOON_RADIUS_MM + index * MOON_PITCH_MM;
    primitives.push(
      moonDisc(phase, model.latitudeDeg, { cx, cy: 14.6, radius: MOON_RADIUS_MM }),
      textOnBaseline(
        [String(Number(date.slice(8)))],
        { x: cx, baseline: NAME_BASELINE_MM, align: 'middle', figures: true },
        MOON_DATE,
        measurer,
      ),
    );
  });

  const under = [title?.other ?? '', isHeading ? '' : second].filter((part) => part !== '').join(' · ');
  const moonWords = moons.length === 0 ? '' : model.words.moonPhases(moons.map(({ phase }) => phase));
  // The village's name comes first; the Moons speak for themselves where their words have no room beside it.
  const place = onOneLine(
    [model.communityName, ...(figure.saysYear ? [] : [issueWords(model)])].join(' · '),
    Math.max(area.right - moonsLeft, HEAD_NAME_MM),
    LEGEND,
    measurer,
  );
  const forMoons = area.right - measurer.widthMm(place, LEGEND) - GAP_MM - moonsLeft;
  const columns = [
    { lines: wrapText(under, NAME_WIDTH_MM, LEGEND, measurer), x: area.left, align: 'left' as const },
    {
      lines: moonWords !== '' && measurer.widthMm(moonWords, LEGEND) <= forMoons ? [moonWords] : [],
      x: moonsLeft,
      align: 'left' as const,
    },
    { lines: [place], x: area.right, align: 'right' as const },
  ];
  for (const { lines, x, align } of columns) {
    if (lines.length > 0)
      primitives.push(textBlock(lines, { x, top: SECOND_LINE_MM, align }, LEGEND, measurer));
  }
  const most = Math.max(1, ...columns.map(({ lines }) => lines.length));
  return { primitives, bottom: SECOND_LINE_MM + most * leadingMm(LEGEND) };
}

/** "Row 6 · holes 152 to 181". */
export function holesOfMonth(model: SheetModel, month: number): string {
  const first = dayOfYear(isoOf(model.year, month, 1));
  return model.words.holes({ row: month, first, last: first + daysInMonth(model.year, month) - 1 });
}
