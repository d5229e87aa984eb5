import { barLegend } from './bar-legend.js';
import { entryWhen, tickDetails } from './month-words.js';
import { barDown, issueWords, pageFoot } from './page-foot.js';
import type { Primitive, SheetPage } from './primitives.js';
import type { SheetEntry, SheetMarker, SheetModel } from './sheet-model.js';
import { entryStretches, markerRange, spansOfMonth, touchesYear } from './spans.js';
import { rule, STROKE_MM } from './strokes.js';
import { leadingMm, onOneLine, textBlock, wrapLabel, wrapText } from './text-layout.js';
import type { TextMeasurer, TextStyle } from './text-layout.js';
import { roundMm } from './units.js';
import { versionFigure } from './version-figure.js';
import { watermarked } from './watermark.js';
import { BLOCK_ICON_MM, flowBlocks, LEGEND, LEGEND_BOLD, plainBlock, tagMark } from './word-block.js';
import { tickCircles } from './tick-circles.js';
import type { WordBlock, WordDetail, WordRow } from './word-block.js';
import { TILE_PAGE_HEIGHT_MM, TILE_PAGE_WIDTH_MM } from './year-tiles.js';

/** The sheet that hangs beside the board: every name in full, what to look for, what to do, what if it is late. */
const AREA = { left: 22, right: 286 };
const LOOK = { left: 36, width: 86 };
const ICON_LEFT_MM = 126;
const DO = { left: 144, width: 72 };
const IF_LATE = { left: 220, width: 66 };
const HEAD_BOTTOM_MM = 32;
const TITLE: TextStyle = { role: 'legend', sizePt: 22, weight: 700 };
const TAG: TextStyle = { role: 'tag', sizePt: 20, weight: 700 };
const MAX_FOOT_MM = 70;
const AFTER_BLOCK_MM = 2.6;
/** Markers are no events: their picture is smaller than board size. */
const MARKER_ICON_MM = 12.5;

export function legendPages(model: SheetModel, measurer: TextMeasurer): SheetPage[] {
  const foot = pageFoot(model, AREA, model.markers.length > 0, MAX_FOOT_MM, measurer);
  const footTop = TILE_PAGE_HEIGHT_MM - 8 - foot.height;
  const blocks = [
    ...(model.notices ?? []).map((notice) =>
      plainBlock(model.words.notice(notice), LEGEND_BOLD, AREA, measurer),
    ),
    ...model.markers.map((marker) => markerRow(model, marker, measurer)),
    ...model.entries.map((entry) => entryRow(model, entry, measurer)),
    ...changeBlocks(model, measurer),
    ...foot.leftOut.map((text) => plainBlock(text, LEGEND, AREA, measurer)),
  ];
  const spans = Array.from({ length: 12 }, (_, index) =>
    spansOfMonth(model.year, index + 1, model.markers, model.entries).map((span) => ({
      span,
      from: span.from,
      to: span.to,
      lane: 0,
    })),
  ).flat();
  const key = barLegend(model, spans, { ...AREA, top: HEAD_BOTTOM_MM, moonDays: false }, measurer);
  const columnsTop = HEAD_BOTTOM_MM + key.height;
  const top = columnsTop + leadingMm(LEGEND_BOLD) + 2.5;
  const room = footTop - top - 1;
  const areas = flowBlocks(blocks, room);
  return areas.map((rows, index): SheetPage => {
    const title = model.words.legendTitle();
    const name =
      areas.length === 1 ? title : model.words.cardOf({ month: title, card: index + 1, cards: areas.length });
    const primitives: Primitive[] = [
      textBlock([name], { x: AREA.left, top: 8.5 }, TITLE, measurer),
      textBlock(
        [
          onOneLine(
            model.words.boardTitle({ community: model.communityName, issue: issueWords(model) }),
            160,
            LEGEND,
            measurer,
          ),
        ],
        { x: AREA.left, top: 19.5 },
        LEGEND,
        measurer,
      ),
      ...versionFigure(model, { left: 190, right: AREA.right, baseline: 28.6 }, measurer).primitives,
      ...key.primitives,
      ...columnHeads(model, columnsTop, measurer),
      ...stack(rows, top),
      ...foot.draw(footTop),
      ...barDown(model, { x: 12, top: 55, textBaseline: 18.4 }, measurer),
    ];
    return {
      kind: 'legend',
      name,
      width: TILE_PAGE_WIDTH_MM,
      height: TILE_PAGE_HEIGHT_MM,
      month: null,
      trim: null,
      primitives: watermarked(
        model,
        primitives,
        { x: AREA.left, y: 30, width: AREA.right - AREA.left, height: 140 },
        measurer,
      ),
    };
  });
}

/** Whoever took the old board down finds here what the new one says otherwise. */
function changeBlocks({ changes }: SheetModel, measurer: TextMeasurer): WordBlock[] {
  if (changes === undefined) return [];
  return [
    plainBlock(changes.title, LEGEND_BOLD, AREA, measurer),
    ...changes.lines.map((line) => plainBlock(line, LEGEND, AREA, measurer)),
  ];
}

function columnHeads(model: SheetModel, top: number, measurer: TextMeasurer): Primitive[] {
  const { words } = model;
  return [
    textBlock([words.columnLook()], { x: LOOK.left, top }, LEGEND_BOLD, measurer),
    textBlock([words.columnDo()], { x: DO.left, top }, LEGEND_BOLD, measurer),
    textBlock([words.columnIfLate()], { x: IF_LATE.left, top }, LEGEND_BOLD, measurer),
    rule(AREA.left, AREA.right, top + leadingMm(LEGEND_BOLD) + 0.6),
  ];
}

function markerRow(model: SheetModel, marker: SheetMarker, measurer: TextMeasurer): WordBlock {
  const range = markerRange(marker);
  const { words } = model;
  const when =
    range === null || marker.expected === null
      ? (marker.whyNoDate ?? words.noDate(marker.phenomenon))
      : words.markerSentence({ phenomenon: marker.phenomenon, date: marker.expected, ...range });
  return tableRow(
    { kind: 'marker', tag: marker.letter, icon: marker.icon },
    {
      look: [{ text: when, bold: false }],
      do: wrapLabel(marker.titles, DO.width, LEGEND_BOLD, measurer).map((text) => ({ text, bold: true })),
      late: [],
    },
    measurer,
  );
}

function entryRow(model: SheetModel, entry: SheetEntry, measurer: TextMeasurer): WordBlock {
  const { words } = model;
  const said = (text: string): boolean => text.trim() !== '';
  const when = touchesYear(entry, model.year)
    ? entryWhen(model, entry).sentence || words.range(...ends(entry))
    : (entry.whyNoDate ?? words.noDate(''));
  const plain = (text: string): WordDetail => ({ text, bold: false });
  const strong = (text: string): WordDetail => ({ text, bold: true });
  return tableRow(
    { kind: 'entry', tag: String(entry.number), icon: entry.icon },
    {
      look: [
        ...(said(entry.signs) ? [plain(words.signs({ signs: entry.signs, needed: entry.signsNeeded }))] : []),
        ...tickDetails(model, entry),
      ],
      do: [
        ...wrapLabel(entry.titles, DO.width, LEGEND_BOLD, measurer).map(strong),
        plain(when),
        ...(said(entry.dateSetBy) ? [plain(words.dateSetBy(entry.dateSetBy))] : []),
      ],
      late: [
        ...(entry.lastAdvised === null ? [] : [strong(words.lastAdvised(entry.lastAdvised))]),
        ...(said(entry.ifLate) ? [plain(entry.ifLate)] : []),
        ...(entry.stop ? [strong(words.stopOn(entry.stop))] : []),
        ...(said(entry.caution) ? [strong(words.takeCare(entry.caution))] : []),
        ...(entry.checked ?? []).map((check) => plain(words.checkedBy(check))),
      ],
    },
    measurer,
  );
}

function ends(entry: SheetEntry): [string, string] {
  const stretches = entryStretches(entry);
  return [stretches[0]?.from ?? '', stretches.at(-1)?.to ?? ''];
}

/** A row of the table as lines side by side, so that one longer than a page can be cut between them. */
function tableRow(
  name: { readonly kind: 'marker' | 'entry'; readonly tag: string; readonly icon: SheetEntry['icon'] },
  columns: {
    readonly look: readonly WordDetail[];
    readonly do: readonly WordDetail[];
    readonly late: readonly WordDetail[];
  },
  measurer: TextMeasurer,
): WordBlock {
  const wrapped = [
    { left: LOOK.left, lines: wrapAll(columns.look, LOOK.width, measurer) },
    { left: DO.left, lines: wrapAll(columns.do, DO.width, measurer) },
    { left: IF_LATE.left, lines: wrapAll(columns.late, IF_LATE.width, measurer) },
  ];
  const lineHeight = leadingMm(LEGEND);
  const pictureMm = name.kind === 'entry' ? BLOCK_ICON_MM : MARKER_ICON_MM;
  const forPicture = Math.ceil(pictureMm / lineHeight);
  const count = Math.max(forPicture, ...wrapped.map(({ lines }) => lines.length));
  const rows = Array.from({ length: count }, (_, index): WordRow => ({
    height: lineHeight,
    draw: (top) => [
      ...(index === 0
        ? [
            ...tagMark(name, { left: AREA.left, middle: top + 4.9, size: 9.4 }, TAG, measurer),
            {
              type: 'icon' as const,
              icon: name.icon,
              x: ICON_LEFT_MM,
              y: roundMm(top + 0.3),
              size: pictureMm,
            },
          ]
        : []),
      ...wrapped.flatMap(({ left, lines }) => {
        const line = lines[index];
        if (line === undefined) return [];
        return [
          ...tickCircles(line.circles ?? 0, { left, middle: top + lineHeight / 2 }),
          ...(line.text === ''
            ? []
            : [textBlock([line.text], { x: left, top }, line.bold ? LEGEND_BOLD : LEGEND, measurer)]),
        ];
      }),
    ],
  }));
  const end: WordRow = {
    height: AFTER_BLOCK_MM,
    draw: (top) => [rule(AREA.left, AREA.right, top + AFTER_BLOCK_MM / 2, STROKE_MM)],
  };
  return { rows: [...rows, end], height: count * lineHeight + AFTER_BLOCK_MM };
}

/** Circles have a line of their own above their words: a column is narrow. */
function wrapAll(lines: readonly WordDetail[], widthMm: number, measurer: TextMeasurer): WordDetail[] {
  return lines.flatMap(({ text, bold, circles }) => [
    ...(circles === undefined ? [] : [{ text: '', bold, circles }]),
    ...wrapText(text, widthMm, bold ? LEGEND_BOLD : LEGEND, measurer).map((line) => ({ text: line, bold })),
  ]);
}

function stack(rows: readonly WordRow[], top: number): Primitive[] {
  let y = top;
  return rows.flatMap((row) => {
    const drawn = row.draw(y);
    y += row.height;
    return drawn;
  });
}
