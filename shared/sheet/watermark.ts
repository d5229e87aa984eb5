import type { Box, Primitive, TextPrimitive } from './primitives.js';
import { SheetModelError } from './sheet-model.js';
import type { SheetModel } from './sheet-model.js';
import { clearing } from './strokes.js';
import { lineBoxes } from './text-layout.js';
import type { TextMeasurer } from './text-layout.js';
import { CAP_HEIGHT_EM } from './type-floors.js';
import { MM_PER_PT, roundMm } from './units.js';

const LARGEST_PT = 150;
const SMALLEST_PT = 40;
const TURN_DEG = 24;

/**
 * Writes the state of an unpublished sheet across its page in outlined letters, under everything else, and
 * clears the ground under words and holes so that no line of it runs through them.
 */
export function watermarked(
  model: SheetModel,
  primitives: readonly Primitive[],
  area: Box,
  measurer: TextMeasurer,
): Primitive[] {
  const words = model.stateWatermark?.normalize('NFC').trim() ?? '';
  if (words === '') {
    if (model.label === null) throw new SheetModelError('a sheet without an issue needs its watermark');
    return [...primitives];
  }
  const clearings = primitives.flatMap((primitive): Primitive[] => {
    if (primitive.type === 'ring') {
      const reach = primitive.radius + 0.4;
      return [
        {
          type: 'disc',
          role: 'clearing',
          cx: primitive.cx,
          cy: primitive.cy,
          radius: reach,
          fill: 'paper',
          inkedSide: null,
          strokeMm: 0,
        },
      ];
    }
    if (primitive.type === 'icon')
      return [clearing(primitive.x, primitive.y, primitive.size, primitive.size)];
    if (primitive.type !== 'text' || primitive.paint === 'paper') return [];
    return lineBoxes(primitive).map((box) => clearing(box.x - 0.6, box.y, box.width + 1.2, box.height));
  });
  return [watermark(words, area, measurer), ...clearings, ...primitives];
}

function watermark(words: string, area: Box, measurer: TextMeasurer): TextPrimitive {
  const turn = (TURN_DEG * Math.PI) / 180;
  const spread = (sizePt: number): { width: number; across: number; down: number; cap: number } => {
    const width = measurer.widthMm(words, { sizePt, weight: 700 });
    const cap = CAP_HEIGHT_EM * sizePt * MM_PER_PT;
    return {
      width,
      cap,
      across: width * Math.cos(turn) + cap * Math.sin(turn),
      down: width * Math.sin(turn) + cap * Math.cos(turn),
    };
  };
  let sizePt = LARGEST_PT;
  while (sizePt > SMALLEST_PT && (spread(sizePt).across > area.width || spread(sizePt).down > area.height)) {
    sizePt -= 2;
  }
  const { width, cap, across, down } = spread(sizePt);
  const midX = area.x + area.width / 2;
  const midY = area.y + area.height / 2;
  // Back from the middle of the letters, along the line and down half a capital.
  const x = midX - (width / 2) * Math.cos(turn) + (cap / 2) * Math.sin(turn);
  const baseline = midY + (width / 2) * Math.sin(turn) + (cap / 2) * Math.cos(turn);
  return {
    type: 'text',
    role: 'watermark',
    sizePt,
    weight: 700,
    paint: 'grey-outline',
    turnDeg: TURN_DEG,
    lines: [{ x: roundMm(x), baseline: roundMm(baseline), width: roundMm(width), text: words }],
    box: {
      x: roundMm(midX - across / 2),
      y: roundMm(midY - down / 2),
      width: roundMm(across),
      height: roundMm(down),
    },
  };
}
