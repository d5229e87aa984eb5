/** Julian Day of 1970-01-01 00:00 UTC. */
const JD_UNIX_EPOCH = 2_440_587.5;
/** Julian Day of 1900-01-01 00:00 UTC: before it no zones are kept, as in the core's civil days. */
const JD_FIRST_ZONED = 2_415_020.5;
const MS_PER_DAY = 86_400_000;
const MINUTES_PER_DAY = 1440;

export interface PlaceClock {
  timeZone: string;
  longitudeDeg: number;
}

/**
 * `HH:MM` on the clock of a place: its IANA zone, before 1900 local mean solar time. Seconds are cut off; with
 * `up` a begun minute counts as over, so that a time to begin at is never a little early.
 */
export function localTimeOf(jdUt: number, clock: PlaceClock, rounding: 'down' | 'up' = 'down'): string {
  const minutes = (jdUt - JD_UNIX_EPOCH) * MINUTES_PER_DAY;
  // A Julian Day as a double is good to 40 microseconds: what lies that close to a minute is that minute.
  const whole = rounding === 'up' ? Math.ceil(minutes - 1e-5) : Math.floor(minutes + 1e-5);
  if (jdUt >= JD_FIRST_ZONED) return zoneTime(whole, clock.timeZone);
  const solarMinutes = whole + Math.round((clock.longitudeDeg / 360) * MINUTES_PER_DAY);
  const ofDay = ((solarMinutes % MINUTES_PER_DAY) + MINUTES_PER_DAY) % MINUTES_PER_DAY;
  return `${twoDigits(Math.floor(ofDay / 60))}:${twoDigits(ofDay % 60)}`;
}

const formats = new Map<string, Intl.DateTimeFormat>();

function zoneTime(minutesSinceEpoch: number, timeZone: string): string {
  let format = formats.get(timeZone);
  if (!format) {
    format = new Intl.DateTimeFormat('en-GB', {
      timeZone,
      hour: '2-digit',
      minute: '2-digit',
      hourCycle: 'h23',
    });
    formats.set(timeZone, format);
  }
  return format.format(minutesSinceEpoch * (MS_PER_DAY / MINUTES_PER_DAY));
}

function twoDigits(value: number): string {
  return String(value).padStart(2, '0');
}
