import type { Look, LookMoment } from './look.js';

/** What is said beside a star's path, on the screen and on paper: where, at what time, and the key of the words. */
export interface LookMark {
  key: 'comesUp' | 'darkEnough' | 'tooLight' | 'goesDown' | 'stopLabel' | 'startLabel';
  time: string;
  azimuthDeg: number;
  altitudeDeg: number;
}

/** Nearer to the skyline than this the thick air takes a star away, not the light. */
const THICK_AIR_DEG = 5;

/** In order of time. */
export function lookMarks(look: Look): LookMark[] {
  const { path, side, comesUp, goesDown, seenFromAt, seenToAt, limitAt } = look;
  const up = path.filter((moment) => moment.isUp);
  const seen = path.filter((moment) => moment.isSeen);
  const rises = comesUp?.when === 'in-watch';
  const sets = goesDown?.when === 'in-watch';
  const limit = limitPoint(look) ?? undefined;
  return [
    ...(side === 'dusk' ? mark('startLabel', limit, limitAt) : []),
    ...(rises ? mark('comesUp', up[0], comesUp.localTime) : []),
    ...(side === 'dusk' && !(rises && isLow(seen[0])) ? mark('darkEnough', seen[0], seenFromAt) : []),
    ...(side === 'dawn' && !(sets && isLow(seen.at(-1))) ? mark('tooLight', seen.at(-1), seenToAt) : []),
    ...(sets ? mark('goesDown', up.at(-1), goesDown.localTime) : []),
    ...(side === 'dawn' ? mark('stopLabel', limit, limitAt) : []),
  ];
}

/** Where the star stands when people stop, or begin, because of the Sun; null where it is not up then. */
export function limitPoint({
  path,
  side,
  limitAt,
}: Pick<Look, 'path' | 'side' | 'limitAt'>): LookMoment | null {
  const end = side === 'dawn' ? path.at(-1) : path[0];
  return limitAt !== null && end?.isUp === true ? end : null;
}

function isLow(moment: LookMoment | undefined): boolean {
  return moment !== undefined && moment.aboveSkylineDeg < THICK_AIR_DEG;
}

function mark(key: LookMark['key'], at: LookMoment | undefined, time: string | null): LookMark[] {
  if (at === undefined || time === null) return [];
  return [{ key, time, azimuthDeg: at.azimuthDeg, altitudeDeg: at.altitudeDeg }];
}
