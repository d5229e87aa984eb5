import type { EntryOffsets } from '#shared/contracts/calendars.js';
import type { MovePart } from '#src/ui/pictures/day-drag.js';
import type { WindowDays } from '#src/ui/pictures/window-bar.js';
import { endMoved, shifted, startMoved } from './offsets.js';

const MOVES = { all: shifted, start: startMoved, end: endMoved } as const;

/** The four days counted from the lead after a move by so many days. */
export function movedOffsets(offsets: EntryOffsets, part: MovePart, days: number): EntryOffsets {
  return MOVES[part](offsets, days);
}

/** Where a window would stand after a move; it goes as far as the count goes. */
export function movedDays(days: WindowDays, offsets: EntryOffsets, part: MovePart, by: number): WindowDays {
  const moved = movedOffsets(offsets, part, by);
  return {
    earliest: days.earliest + moved.earliestDays - offsets.earliestDays,
    bestFrom: days.bestFrom + moved.bestFromDays - offsets.bestFromDays,
    bestTo: days.bestTo + moved.bestToDays - offsets.bestToDays,
    lastAdvised: days.lastAdvised + moved.lastAdvisedDays - offsets.lastAdvisedDays,
  };
}
