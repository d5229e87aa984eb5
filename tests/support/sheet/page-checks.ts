import type { Box, DrawnPage, Primitive, RingPrimitive, TextPrimitive } from '#shared/sheet/primitives.js';
import { lineBoxes } from '#shared/sheet/text-layout.js';
import { TYPE_FLOORS_PT } from '#shared/sheet/type-floors.js';

/** What an office printer leaves blank is 3 to 5 mm; the boards keep 7.5 mm free. */
export const SAFE_MARGIN_MM = 7.5;
/** Rounding of coordinates to a tenth of a micrometre, several of them added up. */
const TOUCH_MM = 0.01;

export function rings(pages: readonly DrawnPage[]): RingPrimitive[] {
  return pages.flatMap((page) => page.primitives.filter((primitive) => primitive.type === 'ring'));
}

export function texts(pages: readonly DrawnPage[]): TextPrimitive[] {
  return pages.flatMap((page) => page.primitives.filter((primitive) => primitive.type === 'text'));
}

export function allWords(pages: readonly DrawnPage[]): string {
  return texts(pages)
    .flatMap((text) => text.lines.map((line) => line.text))
    .join('\n');
}

/** The ground a primitive's ink can cover. */
export function boundsOf(primitive: Primitive): Box {
  switch (primitive.type) {
    case 'text':
    case 'rect':
      return primitive.type === 'text' ? primitive.box : primitive;
    case 'ring':
    case 'disc': {
      const reach = primitive.radius + primitive.strokeMm / 2;
      return box(primitive.cx - reach, primitive.cy - reach, primitive.cx + reach, primitive.cy + reach);
    }
    case 'diamond': {
      const { cx, cy, reach } = primitive;
      return box(cx - reach, cy - reach, cx + reach, cy + reach);
    }
    case 'icon':
      return { x: primitive.x, y: primitive.y, width: primitive.size, height: primitive.size };
    case 'line': {
      const { x1, y1, x2, y2 } = primitive;
      return box(Math.min(x1, x2), Math.min(y1, y2), Math.max(x1, x2), Math.max(y1, y2));
    }
    case 'scale-bar': {
      const half = primitive.tickLength / 2;
      return primitive.axis === 'across'
        ? box(primitive.x, primitive.y - half, primitive.x + primitive.length, primitive.y + half)
        : box(primitive.x - half, primitive.y, primitive.x + half, primitive.y + primitive.length);
    }
  }
}

function box(left: number, top: number, right: number, bottom: number): Box {
  return { x: left, y: top, width: right - left, height: bottom - top };
}

export function overlap(a: Box, b: Box): boolean {
  return (
    a.x + a.width - b.x > TOUCH_MM &&
    b.x + b.width - a.x > TOUCH_MM &&
    a.y + a.height - b.y > TOUCH_MM &&
    b.y + b.height - a.y > TOUCH_MM
  );
}

/** Sentences about everything that breaks a rule of the page; none on a good page. */
export function faultsOf(page: DrawnPage): string[] {
  const faults: string[] = [];
  const words: { box: Box; text: string; owner: number }[] = [];
  page.primitives.forEach((primitive, index) => {
    const bounds = boundsOf(primitive);
    if (
      bounds.x < SAFE_MARGIN_MM - TOUCH_MM ||
      bounds.y < SAFE_MARGIN_MM - TOUCH_MM ||
      bounds.x + bounds.width > page.width - SAFE_MARGIN_MM + TOUCH_MM ||
      bounds.y + bounds.height > page.height - SAFE_MARGIN_MM + TOUCH_MM
    ) {
      faults.push(
        `${page.name}: ${primitive.type} ${nameOf(primitive)} leaves the page: ${JSON.stringify(bounds)}`,
      );
    }
    if (primitive.type !== 'text') return;
    if (primitive.sizePt < TYPE_FLOORS_PT[primitive.role]) {
      faults.push(`${page.name}: ${primitive.role} at ${primitive.sizePt} pt`);
    }
    if (primitive.role === 'watermark') return;
    lineBoxes(primitive).forEach((line, at) => {
      words.push({ box: line, text: primitive.lines[at]?.text ?? '', owner: index });
    });
  });
  const holes = page.primitives.filter((primitive) => primitive.type === 'ring');
  words.forEach((word, index) => {
    for (const other of words.slice(index + 1)) {
      if (other.owner !== word.owner && overlap(word.box, other.box)) {
        faults.push(`${page.name}: "${word.text}" and "${other.text}" overlap`);
      }
    }
    for (const hole of holes) {
      if (overlap(word.box, boundsOf(hole)))
        faults.push(`${page.name}: "${word.text}" meets hole ${hole.date}`);
    }
  });
  return faults;
}

function nameOf(primitive: Primitive): string {
  if (primitive.type === 'text') return `"${primitive.lines[0]?.text ?? ''}"`;
  return 'role' in primitive ? primitive.role : '';
}
