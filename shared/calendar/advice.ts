import { daysBetween, dayNumberFromIso, dayNumberOf } from '../kernel/iso-date.js';
import type { EntryWindow } from './entry-model.js';
import { bestDaysWithin, idsOfNested } from './overlap.js';
import { rainClashOf } from './rain-clash.js';

/*
 * What an officer may want to look at before elders are asked, beside what the days of an entry say of themselves. None
 * of it is frozen: it rests on other entries, on the place and on what is known today.
 */

/** Everything that is told beside an entry's own warnings, in the order in which it is told. */
export const ENTRY_ADVICE = [
  'same-people',
  'crop-not-ripe',
  'crop-long-ripe',
  'cloudy-season',
  'moonlit',
  'drifted',
  'no-safety-line',
] as const;
export type EntryAdvice = (typeof ENTRY_ADVICE)[number];

/** An entry as far as it is looked at here. */
export interface AdvisedEntry {
  id: string;
  content: {
    kind: string;
    crop: string;
    caution: string;
    protectiveWatch: boolean;
    record?:
      | {
          what: {
            operation: string | null;
            variety: { fromDays: number | null; toDays: number | null };
          };
          work: { responsible: string };
        }
      | undefined;
  };
  window: EntryWindow | null;
}

/**
 * Others whose best days lie wholly within this one's, or this one's within theirs, for the same people. Everybody has
 * much to do at once, so a mere overlap is not spoken of, nor is a watch, which goes on beside other work.
 */
export function forSamePeople<E extends AdvisedEntry>(entry: E, all: readonly E[]): E[] {
  const people = peopleOf(entry);
  const { window } = entry;
  if (people === '' || window === null || entry.content.protectiveWatch) return [];
  return all.filter(
    (other) =>
      other.id !== entry.id &&
      other.window !== null &&
      !other.content.protectiveWatch &&
      peopleOf(other) === people &&
      (bestDaysWithin(window, other.window) || bestDaysWithin(other.window, window)),
  );
}

const INTO_THE_GROUND = ['sow', 'plant'];

export interface CropClash<E> {
  advice: 'crop-not-ripe' | 'crop-long-ripe';
  sowing: E;
  fromDays: number;
  toDays: number;
  /** From the first best day of sowing to the first best day of harvest. */
  days: number;
}

/**
 * Whether a harvest lies outside the length of its crop: its best days begin before what was sown first can be ripe, or
 * only after what was sown last has long been. The length is said at the harvest or at the sowing of the same crop.
 */
export function cropClash<E extends AdvisedEntry>(harvest: E, all: readonly E[]): CropClash<E> | null {
  const crop = cropOf(harvest);
  const { window } = harvest;
  if (crop === '' || window === null || !isHarvest(harvest)) return null;
  for (const sowing of all) {
    if (!isSowing(sowing) || cropOf(sowing) !== crop || sowing.window === null) continue;
    const length = lengthOf(harvest) ?? lengthOf(sowing);
    if (length === null) continue;
    const { fromDays, toDays } = length;
    const days = daysBetween(sowing.window.bestFrom, window.bestFrom);
    // A harvest that comes before its sowing belongs to the sowing of the year before.
    if (days <= 0) continue;
    if (days < fromDays) return { advice: 'crop-not-ripe', sowing, fromDays, toDays, days };
    if (daysBetween(sowing.window.bestTo, window.bestFrom) > toDays) {
      return { advice: 'crop-long-ripe', sowing, fromDays, toDays, days };
    }
  }
  return null;
}

function lengthOf({ content }: AdvisedEntry): { fromDays: number; toDays: number } | null {
  const { fromDays = null, toDays = null } = content.record?.what.variety ?? {};
  if (fromDays === null && toDays === null) return null;
  return { fromDays: fromDays ?? 0, toDays: toDays ?? Infinity };
}

/** An entry with the range in which its leading marker is expected. */
export interface AdvisedInDraft extends AdvisedEntry {
  markerRange: { from: number; to: number } | null;
}

/**
 * What is told of each entry of a draft from the draft and the place alone, by id: whatever rests on the sky is told apart.
 * The same as `forSamePeople` and `cropClash` say of one entry, but no entry is held against every other one: a draft of
 * hundreds is looked at after each move of a hand.
 */
export function draftAdvice(
  entries: readonly AdvisedInDraft[],
  rainMonths: readonly boolean[],
): Map<string, EntryAdvice[]> {
  const atOnce = idsForSamePeople(entries);
  const sowings = grouped(entries.filter(isSowing), cropOf);
  return new Map(
    entries.map((entry) => {
      const clash = isHarvest(entry) ? cropClash(entry, sowings.get(cropOf(entry)) ?? []) : null;
      const told: (EntryAdvice | false)[] = [
        atOnce.has(entry.id) && 'same-people',
        clash !== null && clash.advice,
        isInCloudySeason(entry.markerRange, rainMonths) && 'cloudy-season',
        lacksSafetyLine(entry) && 'no-safety-line',
      ];
      return [entry.id, told.filter((one) => one !== false)];
    }),
  );
}

function idsForSamePeople(entries: readonly AdvisedEntry[]): Set<string> {
  const timed = entries.flatMap((entry) => {
    const { id, window, content } = entry;
    const people = peopleOf(entry);
    return people === '' || window === null || content.protectiveWatch ? [] : [{ id, window, people }];
  });
  const groups = grouped(timed, ({ people }) => people);
  return new Set([...groups.values()].flatMap((group) => [...idsOfNested(group)]));
}

function peopleOf({ content }: AdvisedEntry): string {
  return plain(content.record?.work.responsible);
}

function cropOf({ content }: AdvisedEntry): string {
  return plain(content.crop);
}

function isHarvest({ content }: AdvisedEntry): boolean {
  return content.record?.what.operation === 'harvest';
}

function isSowing({ content }: AdvisedEntry): boolean {
  const operation = content.record?.what.operation ?? null;
  return operation !== null && INTO_THE_GROUND.includes(operation);
}

function grouped<E>(entries: readonly E[], keyOf: (entry: E) => string): Map<string, E[]> {
  const groups = new Map<string, E[]>();
  for (const entry of entries) {
    const key = keyOf(entry);
    const group = groups.get(key);
    if (group) group.push(entry);
    else groups.set(key, [entry]);
  }
  return groups;
}

/** Does the range of a leading marker lie wholly in months in which cloud usually hides the sky? Day numbers. */
export function isInCloudySeason(
  range: { from: number; to: number } | null,
  rainMonths: readonly boolean[],
): boolean {
  return range !== null && rainClashOf(range, rainMonths) === 'whole';
}

/** Work and watches in which somebody can be hurt. */
const CAN_HURT = ['burn', 'fish', 'move-herd'];

/** Is there no line of caution where there must be one: safety, watches at night, fire, water? */
export function lacksSafetyLine({ content }: Pick<AdvisedEntry, 'content'>): boolean {
  if (content.caution.trim() !== '') return false;
  const operation = content.record?.what.operation ?? null;
  return (
    content.kind === 'safety' ||
    content.protectiveWatch ||
    (operation !== null && CAN_HURT.includes(operation))
  );
}

/** From how many days on a marker that moved since people began to go by it is spoken of. */
export const DRIFT_DAYS_TOLD = 3;

/**
 * By how many days of the civil year a marker comes later than it did: negative for earlier, never more than half a year.
 * @param then date of old, astronomical year, Gregorian
 */
export function driftedDays(then: string, now: string): number {
  const days = dayInYear(now) - dayInYear(then);
  if (days > HALF_A_YEAR) return days - A_YEAR;
  return days < -HALF_A_YEAR ? days + A_YEAR : days;
}

const A_YEAR = 365;
const HALF_A_YEAR = 182;
/** Any year without a 29 February. */
const PLAIN_YEAR = 2027;

function dayInYear(date: string): number {
  const [month = 1, day = 1] = date.slice(-5).split('-').map(Number);
  return dayNumberOf(PLAIN_YEAR, month, month === 2 ? Math.min(day, 28) : day);
}

/** The range in which a marker is expected, by day numbers; null for an entry without one. */
export function markerRange(
  marker: {
    expected: { gregorian: string };
    early: { gregorian: string } | null;
    late: { gregorian: string } | null;
  } | null,
): { from: number; to: number } | null {
  if (marker === null) return null;
  const { expected, early, late } = marker;
  return {
    from: dayNumberFromIso((early ?? expected).gregorian),
    to: dayNumberFromIso((late ?? expected).gregorian),
  };
}

function plain(text: string | undefined): string {
  return (text ?? '').normalize('NFC').trim().toLowerCase();
}
