import { ICON_BOX_UNITS, ICONS } from './icons.js';
import type { Ink, Primitive, RectPrimitive, ScaleBarPrimitive, TextPrimitive } from './primitives.js';
import {
  FLAP_HATCH_GAP_MM,
  FLAP_HATCH_STROKE_MM,
  HATCH_GAP_MM,
  HATCH_STROKE_MM,
  STROKE_MM,
} from './strokes.js';
import { roundMm } from './units.js';

/**
 * The last step before ink, the same for paper and screen: every primitive but text becomes SVG path data in
 * millimetres with a fill and a stroke.
 */
export interface PathOp {
  readonly d: string;
  readonly fill: Ink | null;
  readonly stroke: Ink | null;
  readonly strokeMm: number;
  readonly dashMm: readonly [number, number] | null;
  /** `butt` ends exactly where the line does, as a measuring bar must; drawn signs have round ends. */
  readonly cap: 'butt' | 'round';
  /** Place and scale for path data that is not in millimetres; strokes scale with it. */
  readonly move: { readonly x: number; readonly y: number; readonly scale: number } | null;
}

/** A circle from four Bézier curves; the largest error of this form is 0.03 % of the radius. */
const KAPPA = 0.5522847498;

export function pathsOf(primitive: Exclude<Primitive, TextPrimitive>): PathOp[] {
  switch (primitive.type) {
    case 'ring': {
      const { cx, cy, radius, strokeMm, dashed } = primitive;
      const reach = primitive.crossLength / 2;
      const cross = `M${n(cx - reach)} ${n(cy)}H${n(cx + reach)}M${n(cx)} ${n(cy - reach)}V${n(cy + reach)}`;
      return [
        // Eight dashes around 3 mm of radius.
        line(circle(cx, cy, radius), strokeMm, dashed ? [1.6, (2 * Math.PI * radius) / 8 - 1.6] : null),
        line(cross, STROKE_MM, null),
      ];
    }
    case 'line': {
      const { x1, y1, x2, y2 } = primitive;
      return [
        { ...line(`M${n(x1)} ${n(y1)}L${n(x2)} ${n(y2)}`, primitive.strokeMm, null), stroke: primitive.ink },
      ];
    }
    case 'rect':
      return rectPaths(primitive);
    case 'disc': {
      const { cx, cy, radius, fill, strokeMm } = primitive;
      const outline = circle(cx, cy, radius);
      if (fill === 'paper') return [filled(outline, 'paper')];
      if (fill === 'solid') return [filled(outline, 'ink')];
      const ring = line(outline, strokeMm, null);
      return fill === 'open' ? [ring] : [filled(halfDisc(cx, cy, radius, primitive.inkedSide), 'ink'), ring];
    }
    case 'diamond': {
      const { cx, cy, reach } = primitive;
      const shape = (r: number): string =>
        `M${n(cx)} ${n(cy - r)}L${n(cx + r)} ${n(cy)}L${n(cx)} ${n(cy + r)}L${n(cx - r)} ${n(cy)}Z`;
      return [filled(shape(reach + 0.7), 'paper'), filled(shape(reach), 'ink')];
    }
    case 'icon': {
      const drawing = ICONS[primitive.icon];
      const move = { x: primitive.x, y: primitive.y, scale: primitive.size / ICON_BOX_UNITS };
      return [
        ...(drawing.fill === '' ? [] : [{ ...filled(drawing.fill, 'ink'), move }]),
        ...drawing.strokes.map((stroke): PathOp => ({
          ...line(stroke.d, stroke.width, null),
          cap: 'round',
          move,
        })),
      ];
    }
    case 'scale-bar':
      return [barPath(primitive)];
  }
}

function rectPaths(rect: RectPrimitive): PathOp[] {
  const outline = rect.cornerMm > 0 ? roundedRect(rect) : plainRect(rect);
  const edge = rect.strokeMm > 0 ? [line(outline, rect.strokeMm, null)] : [];
  switch (rect.fill) {
    case 'solid':
      return [filled(outline, 'ink'), ...edge];
    case 'paper':
      return [filled(outline, 'paper'), ...edge];
    case 'open':
      return [filled(outline, 'paper'), ...edge];
    case 'hatch':
      return [
        filled(outline, 'paper'),
        line(slants(rect, HATCH_GAP_MM, HATCH_STROKE_MM), HATCH_STROKE_MM, null),
        ...edge,
      ];
    case 'wide-hatch': {
      const hatch = line(slants(rect, FLAP_HATCH_GAP_MM, FLAP_HATCH_STROKE_MM), FLAP_HATCH_STROKE_MM, null);
      return [{ ...hatch, stroke: 'grey' }, ...edge];
    }
  }
}

/** Lines at 45° that keep inside a box, with clear paper of `gapMm` between two of them. */
function slants(
  box: { x: number; y: number; width: number; height: number },
  gapMm: number,
  strokeMm: number,
): string {
  const step = (gapMm + strokeMm) * Math.SQRT2;
  const { x, y, width, height } = box;
  let path = '';
  // A slant leaves the bottom edge at `offset` and climbs to the right.
  for (let offset = -height + step / 2; offset < width; offset += step) {
    const fromX = Math.max(0, offset);
    const toX = Math.min(width, offset + height);
    if (toX - fromX < 0.1) continue;
    path += `M${n(x + fromX)} ${n(y + height - (fromX - offset))}L${n(x + toX)} ${n(y + height - (toX - offset))}`;
  }
  return path;
}

function barPath(bar: ScaleBarPrimitive): PathOp {
  const half = bar.strokeMm / 2;
  const tick = bar.tickLength / 2;
  const { x, y, length } = bar;
  const d =
    bar.axis === 'across'
      ? `M${n(x)} ${n(y)}H${n(x + length)}M${n(x + half)} ${n(y - tick)}V${n(y + tick)}M${n(x + length - half)} ${n(y - tick)}V${n(y + tick)}`
      : `M${n(x)} ${n(y)}V${n(y + length)}M${n(x - tick)} ${n(y + half)}H${n(x + tick)}M${n(x - tick)} ${n(y + length - half)}H${n(x + tick)}`;
  return line(d, bar.strokeMm, null);
}

function circle(cx: number, cy: number, r: number): string {
  const k = r * KAPPA;
  return (
    `M${n(cx + r)} ${n(cy)}` +
    `C${n(cx + r)} ${n(cy + k)} ${n(cx + k)} ${n(cy + r)} ${n(cx)} ${n(cy + r)}` +
    `C${n(cx - k)} ${n(cy + r)} ${n(cx - r)} ${n(cy + k)} ${n(cx - r)} ${n(cy)}` +
    `C${n(cx - r)} ${n(cy - k)} ${n(cx - k)} ${n(cy - r)} ${n(cx)} ${n(cy - r)}` +
    `C${n(cx + k)} ${n(cy - r)} ${n(cx + r)} ${n(cy - k)} ${n(cx + r)} ${n(cy)}Z`
  );
}

function halfDisc(cx: number, cy: number, r: number, side: 'left' | 'right' | 'top' | null): string {
  if (side === 'top') return `M${n(cx - r)} ${n(cy)}A${n(r)} ${n(r)} 0 0 1 ${n(cx + r)} ${n(cy)}Z`;
  const sweep = side === 'left' ? 0 : 1;
  return `M${n(cx)} ${n(cy - r)}A${n(r)} ${n(r)} 0 0 ${sweep} ${n(cx)} ${n(cy + r)}Z`;
}

function plainRect({ x, y, width, height }: RectPrimitive): string {
  return `M${n(x)} ${n(y)}H${n(x + width)}V${n(y + height)}H${n(x)}Z`;
}

function roundedRect({ x, y, width, height, cornerMm }: RectPrimitive): string {
  const r = Math.min(cornerMm, width / 2, height / 2);
  const corner = (toX: number, toY: number): string => `A${n(r)} ${n(r)} 0 0 1 ${n(toX)} ${n(toY)}`;
  return (
    `M${n(x + r)} ${n(y)}H${n(x + width - r)}${corner(x + width, y + r)}V${n(y + height - r)}` +
    `${corner(x + width - r, y + height)}H${n(x + r)}${corner(x, y + height - r)}V${n(y + r)}${corner(x + r, y)}Z`
  );
}

function filled(d: string, fill: Ink): PathOp {
  return { d, fill, stroke: null, strokeMm: 0, dashMm: null, cap: 'butt', move: null };
}

function line(d: string, strokeMm: number, dashMm: readonly [number, number] | null): PathOp {
  return { d, fill: null, stroke: 'ink', strokeMm, dashMm, cap: 'butt', move: null };
}

function n(lengthMm: number): string {
  return String(roundMm(lengthMm));
}
