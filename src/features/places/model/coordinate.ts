export type Axis = 'latitude' | 'longitude';

/** What is wrong with a typed coordinate; `value` is the piece that has to change. */
export interface CoordinateProblem {
  code:
    | 'required'
    | 'no-number'
    | 'unreadable'
    | 'wrong-letter'
    | 'sign-and-letter'
    | 'two-letters'
    | 'too-many-numbers'
    | 'fraction-not-last'
    | 'minutes'
    | 'seconds'
    | 'range';
  value: string;
}

export type CoordinateReading = { ok: true; valueDeg: number } | { ok: false; problem: CoordinateProblem };

const LIMIT_DEG: Record<Axis, number> = { latitude: 90, longitude: 180 };
const LETTERS: Record<Axis, { plus: string; minus: string }> = {
  latitude: { plus: 'N', minus: 'S' },
  longitude: { plus: 'E', minus: 'W' },
};
/** Finer than a millimetre on the ground; what the eye and the engine cannot tell apart is not kept. */
const DECIMALS = 6;

/** Words before letters, so that "north" is not read as N and leftovers. */
const TOKENS =
  /(?<number>\d+(?:[.,]\d+)?)|(?<letter>north|south|east|west|[nsew](?![a-z]))|(?<sign>[-−–+])|(?<mark>[°º˚'’′‘`´"”″“:\s]|[dms](?![a-z])|deg(?:rees?)?(?![a-z])|min(?:utes?)?(?![a-z])|sec(?:onds?)?(?![a-z]))/giuy;

interface Pieces {
  numbers: string[];
  letters: string[];
  signs: string[];
}

/**
 * Reads a latitude or longitude as people write it: decimal degrees or degrees, minutes and seconds, with N, S, E
 * or W before or after, or a minus sign; decimal point or comma. South and west are negative.
 * @param text what was typed
 * @returns degrees, −90…90 or −180…180, rounded to six decimals; or what to change
 */
export function readCoordinate(text: string, axis: Axis): CoordinateReading {
  const typed = text.trim();
  if (typed === '') return refuse('required', '');
  const pieces = piecesOf(typed, axis);
  if (typeof pieces === 'string') {
    return /\d/u.test(typed) ? refuse('unreadable', pieces) : refuse('no-number', typed);
  }
  const { numbers, letters, signs } = pieces;
  if (numbers.length === 0) return refuse('no-number', typed);
  if (numbers.length > 3) return refuse('too-many-numbers', typed);
  const direction = directionOf(letters, signs, axis, typed);
  if (typeof direction !== 'number') return direction;

  const fraction = numbers.slice(0, -1).find((number) => /[.,]/u.test(number));
  if (fraction !== undefined) return refuse('fraction-not-last', fraction);
  const [degrees = 0, minutes = 0, seconds = 0] = numbers.map((number) => Number(number.replace(',', '.')));
  if (minutes >= 60) return refuse('minutes', numbers[1] ?? '');
  if (seconds >= 60) return refuse('seconds', numbers[2] ?? '');
  const size = degrees + minutes / 60 + seconds / 3600;
  if (size > LIMIT_DEG[axis]) return refuse('range', numbers[0] ?? '');
  // `+ 0` turns −0 into 0.
  return { ok: true, valueDeg: Number((direction * size).toFixed(DECIMALS)) + 0 };
}

/** Writes degrees so that readCoordinate gives the same number back: `12° 30′ S`, `12° 30′ 15″ N`, `12.3457° E`. */
export function writeCoordinate(valueDeg: number, axis: Axis): string {
  const letter = valueDeg < 0 ? LETTERS[axis].minus : LETTERS[axis].plus;
  const size = Math.abs(valueDeg);
  const wholeSeconds = Math.round(size * 3600);
  const keepsValue = Number((wholeSeconds / 3600).toFixed(DECIMALS)) === Number(size.toFixed(DECIMALS));
  if (!keepsValue) return `${String(Number(size.toFixed(DECIMALS)))}°\u00a0${letter}`;
  const degrees = Math.floor(wholeSeconds / 3600);
  const minutes = Math.floor((wholeSeconds % 3600) / 60);
  const seconds = wholeSeconds % 60;
  const parts = [`${String(degrees)}°`, `${String(minutes)}′`];
  if (seconds > 0) parts.push(`${String(seconds)}″`);
  return [...parts, letter].join('\u00a0');
}

/** Two coordinates pasted into one field (`12.5 N, 39.25 E`): the text of each, or null where it is not such a pair. */
export function splitPair(text: string): { latitude: string; longitude: string } | null {
  const letterCut = /^(.*[ns])[\s,;]+(.*[ew])$/iu.exec(text.trim());
  const markCut = /^([^;]*);([^;]*)$/u.exec(text) ?? /^([^,]*),\s+([^,]*)$/u.exec(text.trim());
  for (const cut of [letterCut, markCut]) {
    const latitude = cut?.[1]?.trim();
    const longitude = cut?.[2]?.trim();
    if (latitude === undefined || longitude === undefined) continue;
    const bothRead = readCoordinate(latitude, 'latitude').ok && readCoordinate(longitude, 'longitude').ok;
    if (bothRead) return { latitude, longitude };
  }
  return null;
}

/** Takes a text apart; the first piece that means nothing is given back as it stands. */
function piecesOf(typed: string, axis: Axis): Pieces | string {
  const pieces: Pieces = { numbers: [], letters: [], signs: [] };
  let at = 0;
  while (at < typed.length) {
    TOKENS.lastIndex = at;
    const found = TOKENS.exec(typed);
    if (found === null) return /^\S+/u.exec(typed.slice(at))?.[0] ?? typed;
    const { number, letter, sign, mark } = found.groups ?? {};
    if (number !== undefined) pieces.numbers.push(number);
    else if (sign !== undefined) pieces.signs.push(sign);
    else if (letter !== undefined) {
      // After minutes, a small s of a longitude or of "12d 30m 15s N" stands for seconds.
      const isUnit =
        letter === 's' && pieces.numbers.length === 3 && (axis === 'longitude' || hasLetter(typed, at));
      if (!isUnit) pieces.letters.push(letter.charAt(0).toUpperCase());
    } else if (mark === undefined) return typed.slice(at);
    at = TOKENS.lastIndex;
  }
  return pieces;
}

function hasLetter(typed: string, after: number): boolean {
  return /[nsew]/iu.test(typed.slice(after + 1));
}

function directionOf(
  letters: readonly string[],
  signs: readonly string[],
  axis: Axis,
  typed: string,
): 1 | -1 | CoordinateReading {
  const [letter] = letters;
  const [sign] = signs;
  if (letters.length > 1) return refuse('two-letters', letters.join(', '));
  if (signs.length > 1 || (sign !== undefined && !typed.replace(/^[nsew]+\s*/iu, '').startsWith(sign))) {
    return refuse('unreadable', sign ?? typed);
  }
  if (letter === undefined) return sign === undefined || sign === '+' ? 1 : -1;
  const { plus, minus } = LETTERS[axis];
  if (letter !== plus && letter !== minus) return refuse('wrong-letter', letter);
  if (sign !== undefined) return refuse('sign-and-letter', letter);
  return letter === minus ? -1 : 1;
}

function refuse(code: CoordinateProblem['code'], value: string): { ok: false; problem: CoordinateProblem } {
  return { ok: false, problem: { code, value } };
}
