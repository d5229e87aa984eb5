import {
  SKYLINE_ALTITUDE_MAX_DEG,
  SKYLINE_ALTITUDE_MIN_DEG,
  SKYLINE_POINTS_MAX,
  type SkylinePoint,
} from '#shared/contracts/places.js';

/** What is wrong in one line of a skyline table. `piece` is what was typed, `other` the line it clashes with. */
export interface LineProblem {
  line: number;
  code:
    | 'two-numbers'
    | 'no-direction'
    | 'no-height'
    | 'direction-range'
    | 'height-range'
    | 'duplicate'
    | 'full-turn-differs'
    | 'too-many';
  piece: string;
  other: number | null;
}

export type SkylineReading =
  { ok: true; points: SkylinePoint[] } | { ok: false; problems: readonly LineProblem[] };

interface ReadLine extends SkylinePoint {
  line: number;
}

/**
 * Reads a pasted table or a CSV file: a direction and a height in each line, in degrees, apart by a comma, a
 * semicolon, a tab, a colon or blanks. A first line of words is a heading; empty lines and `#` lines are passed over.
 * Either everything is right, or every wrong line is named.
 * @returns points sorted by direction, without the 360° that repeats 0°
 */
export function readSkylineText(text: string): SkylineReading {
  const problems: LineProblem[] = [];
  const read: ReadLine[] = [];
  const lines = text.replace(/^\ufeff/u, '').split(/\r\n?|\n/u);
  const firstFilled = lines.findIndex(isFilled);
  lines.forEach((content, index) => {
    if (!isFilled(content) || (index === firstFilled && isHeading(content))) return;
    const line = index + 1;
    const found = readLine(content);
    if ('code' in found) problems.push({ ...found, line, other: null });
    else read.push({ ...found, line });
  });
  problems.push(...clashes(read));
  if (problems.length > 0) return { ok: false, problems: problems.sort((a, b) => a.line - b.line) };
  return { ok: true, points: withoutFullTurn(read) };
}

/** The table as text, one point a line, in the form that readSkylineText takes. */
export function writeSkylineText(points: readonly SkylinePoint[]): string {
  return points.map(({ azimuthDeg, altitudeDeg }) => `${azimuthDeg}, ${altitudeDeg}`).join('\n');
}

/** 0° and 360° are one point; where only 360° stands, it is written as 0°. */
export function withoutFullTurn(points: readonly SkylinePoint[]): SkylinePoint[] {
  const hasNorth = points.some((point) => point.azimuthDeg === 0);
  return points
    .filter((point) => !(point.azimuthDeg === 360 && hasNorth))
    .map(({ azimuthDeg, altitudeDeg }) => ({ azimuthDeg: azimuthDeg % 360, altitudeDeg }))
    .sort((a, b) => a.azimuthDeg - b.azimuthDeg);
}

function isFilled(line: string): boolean {
  const content = line.trim();
  return content !== '' && !content.startsWith('#');
}

function isHeading(line: string): boolean {
  return !/\d/u.test(line) && cells(line).length >= 2;
}

const DECIMAL_COMMA = /^[-−–+]?\d+(?:,\d+)?°?$/u;

/** Where a line is cut: a mark that can only part numbers first, then a comma, then blanks. */
function cells(line: string): string[] {
  const content = line.trim();
  const byMark = content.split(/[;\t:|]/u);
  if (byMark.length > 1) return trimmed(byMark);
  const byBlank = content.split(/\s+/u);
  if (byBlank.length > 1 && byBlank.every((cell) => DECIMAL_COMMA.test(cell))) return byBlank;
  const byComma = content.split(',');
  return byComma.length > 1 ? trimmed(byComma) : byBlank;
}

function trimmed(parts: readonly string[]): string[] {
  const list = parts.map((part) =>
    part
      .trim()
      .replace(/^"(.*)"$/u, '$1')
      .trim(),
  );
  while (list.length > 2 && list.at(-1) === '') list.pop();
  return list;
}

function readLine(content: string): SkylinePoint | Pick<LineProblem, 'code' | 'piece'> {
  const [direction = '', height = '', ...more] = cells(content);
  if (direction === '' || height === '' || more.length > 0)
    return { code: 'two-numbers', piece: content.trim() };
  const azimuthDeg = readDegrees(direction);
  if (azimuthDeg === null) return { code: 'no-direction', piece: direction };
  const altitudeDeg = readDegrees(height);
  if (altitudeDeg === null) return { code: 'no-height', piece: height };
  if (azimuthDeg < 0 || azimuthDeg > 360) return { code: 'direction-range', piece: direction };
  if (altitudeDeg < SKYLINE_ALTITUDE_MIN_DEG || altitudeDeg > SKYLINE_ALTITUDE_MAX_DEG) {
    return { code: 'height-range', piece: height };
  }
  return { azimuthDeg, altitudeDeg };
}

function readDegrees(cell: string): number | null {
  const bare = cell.replace(/\s*(°|deg)$/iu, '').replace(/^[−–]/u, '-');
  return /^[-+]?\d+(?:[.,]\d+)?$/u.test(bare) ? Number(bare.replace(',', '.')) + 0 : null;
}

/** What only the whole table shows: the same direction twice, 0° and 360° apart, too many points. */
function clashes(read: readonly ReadLine[]): LineProblem[] {
  const problems: LineProblem[] = [];
  const firstAt = new Map<number, ReadLine>();
  for (const point of read) {
    const first = firstAt.get(point.azimuthDeg);
    if (first === undefined) firstAt.set(point.azimuthDeg, point);
    else {
      problems.push({
        line: point.line,
        code: 'duplicate',
        piece: String(point.azimuthDeg),
        other: first.line,
      });
    }
  }
  const north = firstAt.get(0);
  const fullTurn = firstAt.get(360);
  if (north && fullTurn && north.altitudeDeg !== fullTurn.altitudeDeg) {
    const [first, second] = north.line < fullTurn.line ? [north, fullTurn] : [fullTurn, north];
    problems.push({
      line: second.line,
      code: 'full-turn-differs',
      piece: String(second.altitudeDeg),
      other: first.line,
    });
  }
  const beyond = read[SKYLINE_POINTS_MAX];
  if (beyond) problems.push({ line: beyond.line, code: 'too-many', piece: String(read.length), other: null });
  return problems;
}
