import { civilDayOf } from '#shared/sky/index.js';

const JD_UNIX_EPOCH = 2_440_587.5;
const MS_PER_DAY = 86_400_000;

/** The civil day that a place's own clock shows at an instant, `YYYY-MM-DD`. */
export function civilDateAt(now: Date, place: { timeZone: string; longitudeDeg: number }): string {
  const jdUt = JD_UNIX_EPOCH + now.getTime() / MS_PER_DAY;
  const { year, month, day } = civilDayOf(jdUt, place.timeZone, place.longitudeDeg).gregorian;
  const parts = [String(month), String(day)].map((part) => part.padStart(2, '0'));
  return [String(year).padStart(4, '0'), ...parts].join('-');
}
