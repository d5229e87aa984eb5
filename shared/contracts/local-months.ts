import { z } from 'zod';
import { monthDayKey } from '../kernel/iso-date.js';
import { line, monthDay } from './common.js';

/** Half-months of every month: nobody names more. */
export const LOCAL_MONTHS_MAX = 24;
export const MOON_NAMES = 13;
export const LOCAL_NAME_MAX = 40;

/** A month or season as the village says it; it lasts until the next one begins. */
const localMonth = z.strictObject({ name: line(LOCAL_NAME_MAX, 1), begins: monthDay });
export type LocalMonth = z.infer<typeof localMonth>;

/** Kept in order from the day on which the village's year begins, however they are sent. */
export const localMonths = z
  .array(localMonth)
  .max(LOCAL_MONTHS_MAX, 'too-many-months')
  .superRefine((months, context) => {
    const taken = new Set<number>();
    months.forEach(({ begins }, index) => {
      const day = monthDayKey(begins);
      if (taken.has(day)) context.addIssue({ code: 'custom', path: [index, 'begins'], message: 'day-taken' });
      taken.add(day);
    });
  });

/** Names of the first to the thirteenth Moon of the village's year; an empty one goes by its number. */
export const moonNames = z.array(line(LOCAL_NAME_MAX)).length(MOON_NAMES);

/** For villages in which Moons have no names. */
export function unnamedMoons(): string[] {
  return new Array<string>(MOON_NAMES).fill('');
}
