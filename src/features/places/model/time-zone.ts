/** Time zones as people look for them: `Africa/Addis_Ababa` reads `Africa/Addis Ababa`. */
export function zoneName(timeZone: string): string {
  return timeZone.replaceAll('_', ' ');
}

/** All zones this device knows, and those given, in order of their names. */
export function allZones(also: readonly string[]): string[] {
  return [...new Set([...Intl.supportedValuesOf('timeZone'), ...also.filter((zone) => zone !== '')])].sort();
}

/** How far clocks of a zone stand from UTC in January and in July of a year, in minutes; null for an unknown zone. */
export function offsetsMin(timeZone: string, year: number): { january: number; july: number } | null {
  const at = (month: number) => offsetMin(timeZone, new Date(Date.UTC(year, month, 15, 12)));
  try {
    return { january: at(0), july: at(6) };
  } catch {
    return null;
  }
}

/** `UTC+3`, `UTC−3:30`, `UTC`. */
export function offsetName(minutes: number): string {
  if (minutes === 0) return 'UTC';
  const size = Math.abs(minutes);
  const rest = size % 60 === 0 ? '' : `:${String(size % 60).padStart(2, '0')}`;
  return `UTC${minutes < 0 ? '−' : '+'}${Math.floor(size / 60)}${rest}`;
}

function offsetMin(timeZone: string, instant: Date): number {
  const parts = new Intl.DateTimeFormat('en', { timeZone, timeZoneName: 'longOffset' }).formatToParts(
    instant,
  );
  const name = parts.find((part) => part.type === 'timeZoneName')?.value ?? '';
  const found = /([+-])(\d{2}):(\d{2})/u.exec(name);
  if (!found) return 0;
  return (found[1] === '-' ? -1 : 1) * (Number(found[2]) * 60 + Number(found[3]));
}
