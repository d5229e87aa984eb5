import type { IconKey } from './icons.js';
import type { TextRole } from './type-floors.js';

/**
 * What a page is made of. Plain data: the same pages become a PDF on the server and SVG on the screen.
 * Lengths and places are in millimetres from the top left corner of the sheet of paper, y downwards.
 */

/** `grey` is the one shade between: half-way, so that it survives a copier. It never carries meaning alone. */
export type Ink = 'ink' | 'paper' | 'grey';

export interface Box {
  readonly x: number;
  readonly y: number;
  readonly width: number;
  readonly height: number;
}

/** A hole for one day: a circle of its true size, its centre marked, no ink between. */
export interface RingPrimitive {
  readonly type: 'ring';
  readonly date: string;
  readonly cx: number;
  readonly cy: number;
  readonly radius: number;
  readonly crossLength: number;
  readonly strokeMm: number;
  /** The day that most years do not have. */
  readonly dashed: boolean;
}

export type LineRole =
  | 'rule'
  | 'bracket'
  | 'crop'
  | 'row'
  | 'trim'
  | 'arrow'
  | 'cut'
  | 'skyline'
  | 'ground'
  | 'star-path'
  | 'stop';

export interface LinePrimitive {
  readonly type: 'line';
  readonly role: LineRole;
  readonly x1: number;
  readonly y1: number;
  readonly x2: number;
  readonly y2: number;
  readonly strokeMm: number;
  readonly ink: Ink;
}

export type RectRole =
  'best' | 'margin' | 'watch' | 'last-advised' | 'tag' | 'flap' | 'tile-map' | 'clearing' | 'rod' | 'code';

/** `hatch` is drawn as an outline filled by slanted lines. */
export interface RectPrimitive extends Box {
  readonly type: 'rect';
  readonly role: RectRole;
  readonly fill: 'solid' | 'hatch' | 'open' | 'paper' | 'wide-hatch';
  /** 0 draws no outline. */
  readonly strokeMm: number;
  readonly cornerMm: number;
}

export interface DiscPrimitive {
  readonly type: 'disc';
  readonly role: 'moon' | 'tag' | 'clearing' | 'star-path' | 'tick';
  readonly cx: number;
  readonly cy: number;
  readonly radius: number;
  readonly fill: 'solid' | 'open' | 'paper' | 'half';
  /** Which half is inked; only read where `fill` is `half`. */
  readonly inkedSide: 'left' | 'right' | 'top' | null;
  readonly strokeMm: number;
}

/** A single fixed day. */
export interface DiamondPrimitive {
  readonly type: 'diamond';
  readonly cx: number;
  readonly cy: number;
  /** From the centre to each corner. */
  readonly reach: number;
}

export interface IconPrimitive {
  readonly type: 'icon';
  readonly icon: IconKey;
  readonly x: number;
  readonly y: number;
  readonly size: number;
}

/** A bar to check the print with: `length` is measured over the outer edges of its end ticks. */
export interface ScaleBarPrimitive {
  readonly type: 'scale-bar';
  readonly axis: 'across' | 'down';
  /** Left (or top) outer edge, and the middle of the bar in the other direction. */
  readonly x: number;
  readonly y: number;
  readonly length: number;
  readonly tickLength: number;
  readonly strokeMm: number;
}

export interface TextLine {
  /** Where the line begins on its baseline, before turning. */
  readonly x: number;
  readonly baseline: number;
  readonly width: number;
  readonly text: string;
}

export interface TextPrimitive {
  readonly type: 'text';
  readonly role: TextRole;
  readonly sizePt: number;
  readonly weight: 400 | 700;
  /** `outline` draws the letters' edges only. */
  readonly paint: 'ink' | 'paper' | 'outline' | 'grey-outline';
  /** Counter-clockwise about the beginning of each line; 0 for upright text. */
  readonly turnDeg: number;
  readonly lines: readonly TextLine[];
  /** The ground that the ink may cover, on the page, after turning. */
  readonly box: Box;
}

export type Primitive =
  | RingPrimitive
  | LinePrimitive
  | RectPrimitive
  | DiscPrimitive
  | DiamondPrimitive
  | IconPrimitive
  | ScaleBarPrimitive
  | TextPrimitive;

/** `words-card` lies beside the months' cards and is none of theirs. */
export type PageKind = 'month-card' | 'continuation' | 'words-card' | 'tile' | 'legend';

/** A laid-out page of paper of any kind. */
export interface DrawnPage {
  /** A short name for lists of pages, e.g. `June` or `2-2`. */
  readonly name: string;
  readonly width: number;
  readonly height: number;
  readonly primitives: readonly Primitive[];
}

/** A page of the peg board. */
export interface SheetPage extends DrawnPage {
  readonly kind: PageKind;
  /** 1 to 12 for a month's card and what continues it, else null. */
  readonly month: number | null;
  /** The part that is cut out and joined; null where the whole sheet is used. */
  readonly trim: Box | null;
}
