import { hatchedBar, STROKE_MM, straight } from './strokes.js';
import type { RowSpan } from './lanes.js';
import { moonDayMark } from './moon-days.js';
import type { Primitive } from './primitives.js';
import type { SheetMarker, SheetModel } from './sheet-model.js';
import { capHeightMm, textOnBaseline } from './text-layout.js';
import type { TextMeasurer } from './text-layout.js';
import { roundMm } from './units.js';
import { LEGEND } from './word-block.js';

export const BAR_LEGEND_MM = 7.2;
const SAMPLE_MM = 8.5;

interface Sample {
  readonly words: string;
  readonly width: number;
  draw(left: number, middle: number): Primitive[];
}

/** A line that says what bars and small numbers mean; only what the page really shows. */
export function barLegend(
  model: SheetModel,
  shown: readonly RowSpan[],
  at: {
    readonly left: number;
    readonly right: number;
    readonly top: number;
    readonly moonDays: boolean;
  },
  measurer: TextMeasurer,
): { primitives: Primitive[]; height: number } {
  const samples = samplesFor(model, shown);
  if (at.moonDays) samples.push(moonDaySample(model.words.legendMoonDay(), measurer));
  if (samples.length === 0) return { primitives: [], height: 0 };
  const primitives: Primitive[] = [];
  let left = at.left;
  let middle = at.top + BAR_LEGEND_MM / 2;
  for (const sample of samples) {
    const width = sample.width + 1.6 + measurer.widthMm(sample.words, LEGEND);
    if (left > at.left && left + width > at.right) {
      left = at.left;
      middle += BAR_LEGEND_MM;
    }
    primitives.push(
      ...sample.draw(left, middle),
      textOnBaseline(
        [sample.words],
        { x: left + sample.width + 1.6, baseline: middle + capHeightMm(LEGEND.sizePt) / 2 },
        LEGEND,
        measurer,
      ),
    );
    left += width + 3.4;
  }
  return { primitives, height: middle + BAR_LEGEND_MM / 2 - at.top };
}

function samplesFor(model: SheetModel, shown: readonly RowSpan[]): Sample[] {
  const { words } = model;
  const spans = shown.map(({ span }) => span);
  const looks = new Set(spans.flatMap((span) => span.parts.map((part) => part.look)));
  const bar = (look: 'best' | 'margin' | 'watch', text: string): Sample => ({
    words: text,
    width: SAMPLE_MM,
    draw: (left, middle) => [hatchedBar(look, { left, right: left + SAMPLE_MM, middle, height: 2.4 })],
  });
  const samples: Sample[] = [];
  if (looks.has('best')) samples.push(bar('best', words.legendBest()));
  if (looks.has('margin')) samples.push(bar('margin', words.legendMargin()));
  if (looks.has('watch')) samples.push(bar('watch', words.legendWatch()));
  if (spans.some((span) => span.kind === 'entry' && span.point !== null)) {
    samples.push({
      words: words.legendFixed(),
      width: 4,
      draw: (left, middle) => [{ type: 'diamond', cx: roundMm(left + 2), cy: roundMm(middle), reach: 2 }],
    });
  }
  if (spans.some((span) => span.stop !== null)) {
    samples.push({
      words: words.legendLastAdvised(),
      width: 1.2,
      draw: (left, middle) => [
        {
          type: 'rect',
          role: 'last-advised',
          x: roundMm(left),
          y: roundMm(middle - 1.95),
          width: 1.2,
          height: 3.9,
          fill: 'solid',
          strokeMm: 0,
          cornerMm: 0,
        },
      ],
    });
  }
  const letters = new Set(spans.flatMap((span) => (span.kind === 'marker' ? [span.tag] : [])));
  const markers = model.markers.filter(({ letter }) => letters.has(letter));
  if (markers.length > 0) samples.push(markerSample(words.legendMarker(ledBy(markers))));
  return samples;
}

function ledBy(markers: readonly SheetMarker[]): 'star' | 'sign' | 'both' {
  if (markers.every(({ isStar }) => isStar)) return 'star';
  return markers.some(({ isStar }) => isStar) ? 'both' : 'sign';
}

function moonDaySample(words: string, measurer: TextMeasurer): Sample {
  const width = 3;
  return {
    words,
    width,
    draw: (left, middle) => [moonDayMark(1, { right: left + width, middle }, measurer)],
  };
}

/** A bracket with its black round, as under the holes. */
function markerSample(words: string): Sample {
  return {
    words,
    width: SAMPLE_MM + 3,
    draw: (left, middle) => [
      straight('bracket', { x: left, y: middle }, { x: left + SAMPLE_MM + 3, y: middle }, 0.6),
      straight('bracket', { x: left, y: middle - 1.7 }, { x: left, y: middle }, 0.6),
      straight(
        'bracket',
        { x: left + SAMPLE_MM + 3, y: middle - 1.7 },
        { x: left + SAMPLE_MM + 3, y: middle },
        0.6,
      ),
      {
        type: 'disc',
        role: 'tag',
        cx: roundMm(left + SAMPLE_MM / 2 + 1.5),
        cy: roundMm(middle),
        radius: 1.9,
        fill: 'solid',
        inkedSide: null,
        strokeMm: STROKE_MM,
      },
    ],
  };
}
