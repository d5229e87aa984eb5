import { anchorOf } from '#shared/calendar/anchors.js';
import type { DatedSide, DayGrounds } from '#shared/calendar/day-grounds.js';
import { entryDatesFromDays, type DaySpell } from '#shared/calendar/entry-dates.js';
import { whyMoved } from '#shared/calendar/why-moved.js';
import type { EntryDates, EntryWindow } from '#shared/contracts/calendars.js';
import type { WhyMoved } from '#shared/contracts/moves.js';
import type { PlaceSnapshot } from '#shared/contracts/stars.js';
import { dayNumberFromIso } from '#shared/kernel/iso-date.js';
import type { EntryTiming } from '#shared/calendar/entry-model.js';
import type { SkyDatesService } from '../calendars/sky-dates.service.js';

/** One side of a move as a version, a draft or a roll-over holds it. */
export interface MovedSide {
  year: number;
  place: PlaceSnapshot;
  engineVersion: string;
  timing: EntryTiming;
  dates: EntryDates;
}

/** Names why days moved, by reckoning them anew with one thing changed at a time. */
export class WhyMovedService {
  constructor(private readonly sky: SkyDatesService) {}

  of(before: MovedSide, after: MovedSide): WhyMoved | null {
    return whyMoved(datedSide(before), datedSide(after), (grounds) => this.reckon(grounds));
  }

  private reckon({ place, year, timing, anchor }: DayGrounds<PlaceSnapshot>): EntryWindow | null {
    if (anchorOf(timing.lead) === null) return this.sky.timingDates(place, year, timing).window;
    // Planned or actual: the window is counted from these days all the same.
    return entryDatesFromDays(timing, year, null, { basis: 'planned', spell: anchor, planned: null }).window;
  }
}

function datedSide({ dates, ...side }: MovedSide): DatedSide<PlaceSnapshot> {
  return { ...side, window: dates.window, anchor: anchorSpell(side.timing, dates) };
}

function anchorSpell({ lead }: EntryTiming, { counted }: EntryDates): DaySpell | null {
  if (anchorOf(lead) === null || !counted?.from) return null;
  return { first: dayNumberFromIso(counted.from), last: dayNumberFromIso(counted.to ?? counted.from) };
}
