import type { IsoDate } from '../kernel/iso-date.js';
import type { EntryWindow } from './entry-model.js';

/** Which timing drives the board; chosen by whoever compiles, with a reason that keepers read. */
export interface BoardChoice {
  shows: 'entry' | 'variant' | 'both';
  /** The variant that drives it; null where the entry does, or all are shown. */
  variantId: string | null;
  reason: string;
}

/** A variant as far as the board asks about it. */
export interface VariantTiming {
  variantId: string;
  /** An objection: it should not be on a board. It moves no day. */
  isObjection: boolean;
  window: EntryWindow | null;
}

/** Seed, ice, fire and grazing on the one side, watches against frost, flood and birds on the other, all else apart. */
export type SafetySide = 'narrow' | 'wide' | null;

export function safetySideOf(entry: {
  kind: string;
  hasLastDate: boolean;
  protectiveWatch: boolean;
}): SafetySide {
  if (entry.protectiveWatch) return 'wide';
  return entry.hasLastDate || entry.kind === 'safety' ? 'narrow' : null;
}

export interface BoardTiming {
  /** The days that the board goes by; null where there are none. */
  window: EntryWindow | null;
  /** Why these: the choice, or the rule for what can hurt somebody. */
  drivenBy: 'entry' | 'variant' | 'later-start-earlier-end' | 'earlier-start-later-end';
  /** Marks beside it, each whole and under its own giver; never a mean of any. */
  beside: { variantId: string | null; window: EntryWindow }[];
}

/**
 * What the board shows of an entry and its variants. Where a wrong day can hurt somebody nobody chooses: seed, ice, fire
 * and grazing go by the later of the starts and the earlier of the ends, watches by the earlier start and the later
 * end, and every timing stands beside. Elsewhere the choice counts. Nothing is averaged, counted or ranked.
 */
export function boardTiming(
  entry: { kind: string; hasLastDate: boolean; protectiveWatch: boolean; window: EntryWindow | null },
  variants: readonly VariantTiming[],
  choice: BoardChoice | null,
): BoardTiming {
  const timings = variants.filter(({ isObjection }) => !isObjection);
  const marks = [
    ...(entry.window ? [{ variantId: null, window: entry.window }] : []),
    ...timings.flatMap(({ variantId, window }) => (window ? [{ variantId, window }] : [])),
  ];
  const side = safetySideOf(entry);
  if (side !== null && timings.length > 0) {
    const windows = marks.map(({ window }) => window);
    return {
      window: side === 'narrow' ? narrowest(windows) : widest(windows),
      drivenBy: side === 'narrow' ? 'later-start-earlier-end' : 'earlier-start-later-end',
      beside: marks,
    };
  }
  const chosen = timings.find(
    ({ variantId }) => choice?.shows === 'variant' && variantId === choice.variantId,
  );
  if (chosen) return { window: chosen.window, drivenBy: 'variant', beside: [] };
  const others = choice?.shows === 'both' ? marks.filter(({ variantId }) => variantId !== null) : [];
  return { window: entry.window, drivenBy: 'entry', beside: others };
}

/** An entry with the variants beside it, as versions and drafts hold it; `forBoard` says what everybody may see. */
export interface BoardBody {
  content: { kind: string; hasLastDate: boolean; protectiveWatch: boolean; board?: BoardChoice | undefined };
  dates: { window: EntryWindow | null };
  variants?:
    | readonly {
        variantId: string;
        forBoard: boolean;
        content: { difference: string };
        dates: { window: EntryWindow | null };
      }[]
    | undefined;
}

/** What the village's board goes by: the entry's days and those variants that everybody of the village may see. */
export function boardOf({ content, dates, variants = [] }: BoardBody): BoardTiming {
  const { kind, hasLastDate, protectiveWatch, board = null } = content;
  return boardTiming(
    { kind, hasLastDate, protectiveWatch, window: dates.window },
    variants
      .filter(({ forBoard }) => forBoard)
      .map(({ variantId, content: { difference }, dates: own }) => ({
        variantId,
        isObjection: difference === 'not-on-a-board',
        window: own.window,
      })),
    board,
  );
}

/** Later of the starts, earlier of the ends; null where no day is left. */
function narrowest(windows: readonly EntryWindow[]): EntryWindow | null {
  const [first] = windows;
  if (!first) return null;
  const lastAdvised = earliest(windows.map((window) => window.lastAdvised));
  const joined = {
    earliest: latest(windows.map((window) => window.earliest)),
    bestFrom: latest(windows.map((window) => window.bestFrom)),
    bestTo: earliest(windows.map((window) => window.bestTo)),
    lastAdvised,
    lastAdvisedBy: windows.find((window) => window.lastAdvised === lastAdvised)?.lastAdvisedBy ?? 'offset',
  };
  if (joined.earliest > joined.lastAdvised) return null;
  // Where the best days do not meet, what is left of the advised days is what there is.
  const best =
    joined.bestFrom <= joined.bestTo
      ? { bestFrom: clamp(joined.bestFrom, joined), bestTo: clamp(joined.bestTo, joined) }
      : { bestFrom: joined.earliest, bestTo: joined.lastAdvised };
  return { ...joined, ...best };
}

/** Earlier of the starts, later of the ends. */
function widest(windows: readonly EntryWindow[]): EntryWindow | null {
  const [first] = windows;
  if (!first) return null;
  const lastAdvised = latest(windows.map((window) => window.lastAdvised));
  return {
    earliest: earliest(windows.map((window) => window.earliest)),
    bestFrom: earliest(windows.map((window) => window.bestFrom)),
    bestTo: latest(windows.map((window) => window.bestTo)),
    lastAdvised,
    lastAdvisedBy: windows.find((window) => window.lastAdvised === lastAdvised)?.lastAdvisedBy ?? 'offset',
  };
}

function clamp(
  date: IsoDate,
  { earliest: from, lastAdvised: to }: Pick<EntryWindow, 'earliest' | 'lastAdvised'>,
) {
  return date < from ? from : date > to ? to : date;
}

function earliest(dates: readonly IsoDate[]): IsoDate {
  return dates.reduce((a, b) => (a < b ? a : b));
}

function latest(dates: readonly IsoDate[]): IsoDate {
  return dates.reduce((a, b) => (a > b ? a : b));
}
