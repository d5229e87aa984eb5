import { inflateSync } from 'node:zlib';

/**
 * Reads back what a PDF really paints: every path of every page with the place, the line width and the dash
 * that it ends up with, in millimetres from the top left corner of the sheet. It understands just enough of the
 * format (ISO 32000-1) for files with one plain stream per page; text is read with poppler instead.
 */
export interface PaintedPath {
  /** Straight and curved pieces in the order drawn: their kind and end point; curves with control points. */
  readonly pieces: readonly PathPiece[];
  readonly isFilled: boolean;
  readonly isStroked: boolean;
  readonly strokeMm: number;
  readonly isDashed: boolean;
}

export interface PathPiece {
  readonly kind: 'move' | 'line' | 'curve' | 'close';
  /** End point, after any control points. */
  readonly points: readonly { readonly x: number; readonly y: number }[];
}

export interface PdfPageContent {
  readonly widthMm: number;
  readonly heightMm: number;
  readonly paths: readonly PaintedPath[];
}

const MM_PER_PT = 25.4 / 72;
type Matrix = readonly [number, number, number, number, number, number];

export function readPdfPages(file: Buffer): PdfPageContent[] {
  const text = file.toString('latin1');
  const objects = new Map<number, string>();
  for (const match of text.matchAll(/(?:^|\n)(\d+) 0 obj\n([\s\S]*?)\nendobj/gu)) {
    objects.set(Number(match[1]), match[2] ?? '');
  }
  const tree = [...objects.values()].find((body) => /\/Type \/Pages\b/u.test(body)) ?? '';
  const kids = [...(/\/Kids \[([^\]]*)\]/u.exec(tree)?.[1] ?? '').matchAll(/(\d+) 0 R/gu)];
  return kids.map((kid) => {
    const page = objects.get(Number(kid[1])) ?? '';
    const [, , width = 0, height = 0] = numbersIn(/\/MediaBox \[([^\]]*)\]/u.exec(page)?.[1] ?? '');
    const stream = objects.get(Number(/\/Contents (\d+) 0 R/u.exec(page)?.[1])) ?? '';
    return {
      widthMm: width * MM_PER_PT,
      heightMm: height * MM_PER_PT,
      paths: paintedPaths(contentOf(stream), height),
    };
  });
}

function contentOf(body: string): string {
  const start = body.indexOf('stream\n') + 'stream\n'.length;
  const bytes = Buffer.from(body.slice(start, body.lastIndexOf('\nendstream')), 'latin1');
  return (body.includes('/FlateDecode') ? inflateSync(bytes) : bytes).toString('latin1');
}

function numbersIn(text: string): number[] {
  return text.trim().split(/\s+/u).map(Number);
}

interface State {
  matrix: Matrix;
  width: number;
  isDashed: boolean;
}

/** Walks the operators of one content stream. Text objects are passed over. */
function paintedPaths(content: string, pageHeightPt: number): PaintedPath[] {
  const paths: PaintedPath[] = [];
  const stack: State[] = [];
  let state: State = { matrix: [1, 0, 0, 1, 0, 0], width: 1, isDashed: false };
  let pieces: PathPiece[] = [];
  let operands: string[] = [];
  const at = (x: number, y: number) => {
    const [a, b, c, d, e, f] = state.matrix;
    return { x: (a * x + c * y + e) * MM_PER_PT, y: (pageHeightPt - (b * x + d * y + f)) * MM_PER_PT };
  };
  const pairs = (): PathPiece['points'] => {
    const values = operands.map(Number);
    return Array.from({ length: values.length / 2 }, (_, index) =>
      at(values[2 * index] ?? 0, values[2 * index + 1] ?? 0),
    );
  };
  const paint = (isFilled: boolean, isStroked: boolean): void => {
    const scale = Math.hypot(state.matrix[0], state.matrix[1]);
    paths.push({
      pieces,
      isFilled,
      isStroked,
      strokeMm: state.width * scale * MM_PER_PT,
      isDashed: state.isDashed,
    });
    pieces = [];
  };

  // Strings of text cannot hold operators of paths here: they are hexadecimal.
  const plain = content.replace(/<<[\s\S]*?>>\s*BDC/gu, 'BDC');
  for (const token of plain.match(/\[[^\]]*\]|<[^>]*>|\/[^\s/[\]<>]+|[^\s[\]<>/]+/gu) ?? []) {
    if (/^[-+.\d]|^\[|^\/|^</u.test(token)) {
      operands.push(token);
      continue;
    }
    switch (token) {
      case 'q':
        stack.push({ ...state });
        break;
      case 'Q':
        state = stack.pop() ?? state;
        break;
      case 'cm':
        state.matrix = multiply(operands.map(Number) as unknown as Matrix, state.matrix);
        break;
      case 'w':
        state.width = Number(operands[0]);
        break;
      case 'd':
        state.isDashed = /\d/u.test(operands[0] ?? '');
        break;
      case 'm':
        pieces.push({ kind: 'move', points: pairs() });
        break;
      case 'l':
        pieces.push({ kind: 'line', points: pairs() });
        break;
      case 'c':
        pieces.push({ kind: 'curve', points: pairs() });
        break;
      case 'h':
        pieces.push({ kind: 'close', points: [] });
        break;
      case 'S':
        paint(false, true);
        break;
      case 'f':
      case 'f*':
        paint(true, false);
        break;
      case 'B':
      case 'B*':
        paint(true, true);
        break;
      case 'n':
        pieces = [];
        break;
      default:
        break;
    }
    operands = [];
  }
  return paths;
}

/** The first matrix is applied first. */
function multiply(first: Matrix, then: Matrix): Matrix {
  const [a, b, c, d, e, f] = first;
  const [A, B, C, D, E, F] = then;
  return [a * A + b * C, a * B + b * D, c * A + d * C, c * B + d * D, e * A + f * C + E, e * B + f * D + F];
}

export interface FoundRing {
  readonly cx: number;
  readonly cy: number;
  readonly radius: number;
  readonly strokeMm: number;
  readonly isDashed: boolean;
}

/** Stroked circles without filling: a move and four curves whose ends lie at one distance from their middle. */
export function ringsIn(page: PdfPageContent): FoundRing[] {
  return page.paths.flatMap((path) => {
    const shape = path.pieces.filter(({ kind }) => kind !== 'close');
    if (path.isFilled || !path.isStroked || shape.length !== 5) return [];
    if (shape[0]?.kind !== 'move' || shape.slice(1).some(({ kind }) => kind !== 'curve')) return [];
    const ends = shape.slice(1).map(({ points }) => points.at(-1) ?? { x: 0, y: 0 });
    const cx = ends.reduce((sum, { x }) => sum + x, 0) / 4;
    const cy = ends.reduce((sum, { y }) => sum + y, 0) / 4;
    const radii = ends.map(({ x, y }) => Math.hypot(x - cx, y - cy));
    const radius = radii.reduce((sum, value) => sum + value, 0) / 4;
    if (radii.some((value) => Math.abs(value - radius) > 0.001)) return [];
    return [{ cx, cy, radius, strokeMm: path.strokeMm, isDashed: path.isDashed }];
  });
}

/** Bars with a tick at each end: their direction and their length over the ticks' outer edges. */
export function scaleBarsIn(page: PdfPageContent): { axis: 'across' | 'down'; lengthMm: number }[] {
  return page.paths.flatMap((path) => {
    const kinds = path.pieces.map(({ kind }) => kind).join(' ');
    if (!path.isStroked || path.isFilled || kinds !== 'move line move line move line') return [];
    const ends = path.pieces.map(({ points }) => points[0] ?? { x: 0, y: 0 });
    const [from, to, tick, , lastTick] = ends;
    if (!from || !to || !tick || !lastTick) return [];
    const isAcross = Math.abs(to.y - from.y) < 0.001;
    const between = isAcross ? lastTick.x - tick.x : lastTick.y - tick.y;
    return [{ axis: isAcross ? ('across' as const) : ('down' as const), lengthMm: between + path.strokeMm }];
  });
}
