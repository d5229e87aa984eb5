const NUMBER = String.raw`(\d+(?:\.\d+)?)`;
const HOURS = new RegExp(`^${NUMBER}\\s*h\\s*(?:${NUMBER}\\s*m?\\s*)?(?:${NUMBER}\\s*s?)?$`, 'u');
const PARTS = new RegExp(
  `^([+-]?)${NUMBER}\\s*[°d]?\\s*(?:${NUMBER}\\s*['′m]?\\s*)?(?:${NUMBER}\\s*["″s]?)?$`,
  'u',
);

/** Degrees of right ascension from `266.4` or `17h 45m 40s`; null where it is neither. */
export function readRightAscension(typed: string): number | null {
  const text = plain(typed);
  const hours = HOURS.exec(text);
  if (hours) return within(15 * sexagesimal(hours[1], hours[2], hours[3]), 0, 360);
  const degrees = PARTS.exec(text);
  return degrees && degrees[1] !== '-'
    ? within(sexagesimal(degrees[2], degrees[3], degrees[4]), 0, 360)
    : null;
}

/** Degrees of declination from `-29`, `−29.0` or `-29 00 28`; null where it is none. */
export function readDeclination(typed: string): number | null {
  const parts = PARTS.exec(plain(typed));
  if (!parts) return null;
  const size = sexagesimal(parts[2], parts[3], parts[4]);
  return within(parts[1] === '-' ? -size : size, -90, 90);
}

/** As it stands in a field: a tenth of a degree is less than the eye tells apart in a patch of sky. */
export function writeDegrees(degrees: number): string {
  return String(Math.round(degrees * 100) / 100);
}

function plain(typed: string): string {
  return typed
    .trim()
    .toLowerCase()
    .replace(/[−–]/gu, '-')
    .replace(/(\d),(\d)/gu, '$1.$2')
    .replace(/(\d):(?=\d)/gu, '$1 ');
}

function sexagesimal(whole = '0', minutes = '0', seconds = '0'): number {
  return Number(whole) + Number(minutes) / 60 + Number(seconds) / 3600;
}

function within(value: number, min: number, max: number): number | null {
  return value >= min && value <= max ? value : null;
}
