import { dayNumberFromIso } from '#shared/kernel/iso-date.js';

const MS_PER_DAY = 86_400_000;
const UNIX_EPOCH_DAY_NUMBER = 2_440_588;

/** Day first, as the screens have it; a date never breaks. */
export function dayInWords(iso: string, language: string): string {
  return new Intl.DateTimeFormat(language === 'en' ? 'en-GB' : language, {
    timeZone: 'UTC',
    day: 'numeric',
    month: 'long',
    year: 'numeric',
  })
    .format((dayNumberFromIso(iso) - UNIX_EPOCH_DAY_NUMBER) * MS_PER_DAY)
    .replaceAll(' ', '\u00a0');
}
