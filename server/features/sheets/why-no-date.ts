import type { EntryDates } from '#shared/contracts/calendars.js';
import type { Translate } from '../../print/translator.js';

/** The reason, as the rest of a sentence that begins with what has no date. */
export function whyNoDate(dates: EntryDates, year: number, t: Translate): string | null {
  const { starOutcome, phenomenonOutcome, warnings } = dates;
  if (starOutcome !== null && starOutcome !== 'rises-and-sets') return t(`sheet.noDate.${starOutcome}`);
  if (warnings.includes('one-occurrence-only')) return t('sheet.noDate.one-occurrence-only', { year });
  if (phenomenonOutcome !== null && phenomenonOutcome !== 'dated') {
    return t(`sheet.noDate.${phenomenonOutcome}`, { year });
  }
  return null;
}
