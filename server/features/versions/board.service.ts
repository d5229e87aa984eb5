import { boardTiming, type BoardTiming } from '#shared/calendar/variants.js';
import type { VersionEntryBody } from '#shared/contracts/versions.js';

/** What the village's board goes by: the entry's days and those variants that everybody of the village may see. */
export function boardOf({ content, dates, variants = [] }: VersionEntryBody): BoardTiming {
  const { kind, hasLastDate, protectiveWatch, board = null } = content;
  return boardTiming(
    { kind, hasLastDate, protectiveWatch, window: dates.window },
    variants
      .filter(({ forBoard }) => forBoard)
      .map(({ variantId, content: variant, dates: own }) => ({
        variantId,
        isObjection: variant.difference === 'not-on-a-board',
        window: own.window,
      })),
    board,
  );
}
