import { withSeen } from './as-seen.js';
import { sameJson } from '#shared/kernel/canonical-json.js';
import type { DaySpell } from './entry-dates.js';
import { isStarLead, type EntryTiming, type EntryWindow } from './entry-model.js';

/** What can move a day: the sky and what it is watched with, and the hand of whoever compiles. */
export const MOVE_CAUSES = [
  'year',
  'place',
  'skyline',
  'threshold',
  'figure',
  'engine',
  'lead',
  'seen',
  'anchor',
  'offsets',
  'last-date',
] as const;
export type MoveCause = (typeof MOVE_CAUSES)[number];

/** A place as far as its members belong to one cause or another; what they hold is for the sky to know. */
export interface MovedPlace {
  latitudeDeg: number;
  longitudeDeg: number;
  elevationM: number;
  timeZone: string;
  skyline: unknown;
  skylineRule: unknown;
  thresholdSet: unknown;
  sameSideShiftDeg: number;
  oppositeSideShiftDeg: number;
  clarityByMonth: unknown;
  figures?: readonly { key: string }[] | undefined;
}

/** Everything on which the days of one entry rest, save the engine. */
export interface DayGrounds<P extends MovedPlace = MovedPlace> {
  year: number;
  place: P;
  timing: EntryTiming;
  /** The days that another entry gave, where this one is counted from it. */
  anchor: DaySpell | null;
}

export interface DatedSide<P extends MovedPlace = MovedPlace> extends DayGrounds<P> {
  engineVersion: string;
  /** As it stood there, whatever today's engine says. */
  window: EntryWindow | null;
}

const OF_THE_PLACE = {
  place: ['latitudeDeg', 'longitudeDeg', 'elevationM', 'timeZone'],
  skyline: ['skyline', 'skylineRule'],
  threshold: ['thresholdSet', 'sameSideShiftDeg', 'oppositeSideShiftDeg', 'clarityByMonth'],
  figure: ['figures'],
} as const satisfies Partial<Record<MoveCause, readonly (keyof MovedPlace)[]>>;

/** Is this one of the things in which two sides are not alike? */
export function differs<P extends MovedPlace>(
  cause: MoveCause,
  before: DatedSide<P>,
  after: DatedSide<P>,
): boolean {
  const was = before.timing;
  const is = after.timing;
  switch (cause) {
    case 'year':
      return before.year !== after.year;
    case 'engine':
      return before.engineVersion !== after.engineVersion;
    case 'lead':
      return !sameJson(unseen(was), unseen(is));
    case 'seen':
      return sameJson(unseen(was), unseen(is)) && !sameJson(was.lead, is.lead);
    case 'anchor':
      return sameJson(was.lead, is.lead) && !sameJson(before.anchor, after.anchor);
    case 'offsets':
      return !sameJson(was.offsets, is.offsets);
    case 'last-date':
      return was.protectiveWatch !== is.protectiveWatch || !sameJson(lastDayOf(was), lastDayOf(is));
    case 'figure':
      return !sameJson(usedFigures(before), usedFigures(after));
    case 'place':
    case 'skyline':
    case 'threshold':
      return OF_THE_PLACE[cause].some((member) => !sameJson(before.place[member], after.place[member]));
  }
}

/** The older side's grounds with one thing as the newer side has it. */
export function changed<P extends MovedPlace>(
  cause: Exclude<MoveCause, 'engine'>,
  before: DatedSide<P>,
  after: DatedSide<P>,
): DayGrounds<P> {
  const grounds = { ...before, place: withFigures(before.place, after.place) };
  const { timing } = after;
  switch (cause) {
    case 'year':
      return { ...grounds, year: after.year };
    case 'lead':
      return { ...grounds, timing: { ...before.timing, lead: timing.lead }, anchor: after.anchor };
    case 'seen':
      return { ...grounds, timing: { ...before.timing, lead: timing.lead } };
    case 'anchor':
      return { ...grounds, anchor: after.anchor };
    case 'offsets':
      return { ...grounds, timing: { ...before.timing, offsets: timing.offsets } };
    case 'last-date': {
      const { hasLastDate, lastDate, protectiveWatch } = timing;
      return { ...grounds, timing: { ...before.timing, hasLastDate, lastDate, protectiveWatch } };
    }
    case 'figure':
      return { ...grounds, place: withFigures(after.place, before.place, before.place) };
    case 'place':
    case 'skyline':
    case 'threshold': {
      const members = OF_THE_PLACE[cause].map((member) => [member, after.place[member]] as const);
      return { ...grounds, place: { ...grounds.place, ...Object.fromEntries(members) } };
    }
  }
}

/** On a place whose other members are `rest`'s: the figures of the first, and of the second those that it lacks. */
function withFigures<P extends MovedPlace>(first: P, second: P, rest: P = first): P {
  const known = first.figures ?? [];
  const lacking = (second.figures ?? []).filter(({ key }) => known.every((figure) => figure.key !== key));
  return known.length + lacking.length === 0 ? rest : { ...rest, figures: [...known, ...lacking] };
}

function unseen({ lead }: EntryTiming): unknown {
  return withSeen(lead, null);
}

/** Where the date has its source from moves no day. */
function lastDayOf({ hasLastDate, lastDate }: EntryTiming): unknown {
  return hasLastDate ? (lastDate?.date ?? null) : null;
}

/** Of the figures only the one that leads moves this entry's days. */
function usedFigures<P extends MovedPlace>({ place, timing: { lead } }: DayGrounds<P>): unknown {
  const key = isStarLead(lead)
    ? lead.markerKey
    : lead.type === 'sky' && 'markerKey' in lead.spec
      ? lead.spec.markerKey
      : null;
  return place.figures?.find((figure) => figure.key === key) ?? null;
}
