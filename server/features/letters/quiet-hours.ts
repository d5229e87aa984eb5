export interface QuietHours {
  fromHour: number;
  toHour: number;
}

const STEP_MS = 15 * 60_000;
/** A day and the hour that a change of the clock may add. */
const STEPS = (25 * 60) / 15;
const DIGEST_HOUR = 7;

/** The first quarter of an hour from `at` on that is not quiet by the village's clock; `at` itself where it is not. */
export function afterQuietHours(at: Date, timeZone: string, quiet: QuietHours | null): Date {
  if (quiet === null) return at;
  return firstFrom(at, (moment) => !isQuiet(localHour(moment, timeZone), quiet)) ?? at;
}

/** The next morning moment for a digest, later than `at`, moved on by quiet hours that last longer. */
export function nextDigestAt(at: Date, timeZone: string, quiet: QuietHours | null): Date {
  const isMorning = (moment: Date) => localHour(moment, timeZone) === DIGEST_HOUR;
  // Whoever is in that hour already waits for tomorrow's.
  const outside = firstFrom(at, (moment) => !isMorning(moment)) ?? at;
  return afterQuietHours(firstFrom(outside, isMorning) ?? outside, timeZone, quiet);
}

/** The village's civil day, `YYYY-MM-DD`. */
export function localDay(at: Date, timeZone: string): string {
  return new Intl.DateTimeFormat('en-CA', { timeZone, dateStyle: 'short' }).format(at);
}

function isQuiet(hour: number, { fromHour, toHour }: QuietHours): boolean {
  if (fromHour === toHour) return hour !== fromHour;
  return fromHour < toHour ? hour >= fromHour && hour < toHour : hour >= fromHour || hour < toHour;
}

function firstFrom(at: Date, fits: (moment: Date) => boolean): Date | null {
  if (fits(at)) return at;
  // On whole quarters, where every zone's hours begin.
  const first = Math.ceil(at.getTime() / STEP_MS) * STEP_MS;
  for (let step = 0; step <= STEPS; step += 1) {
    const moment = new Date(first + step * STEP_MS);
    if (fits(moment)) return moment;
  }
  return null;
}

function localHour(at: Date, timeZone: string): number {
  return Number(new Intl.DateTimeFormat('en-GB', { timeZone, hour: '2-digit', hourCycle: 'h23' }).format(at));
}
