import type { EntryDates } from '#shared/contracts/calendars.js';
import type { Translate } from '../../print/translator.js';

/** The reason, as what follows a colon behind what has no date. */
export function whyNoDate(
  dates: EntryDates,
  year: number,
  { files: t, sky: skyText }: { files: Translate; sky: Translate },
): string | null {
  const { starOutcome, phenomenonOutcome, sky, warnings } = dates;
  if (starOutcome !== null && starOutcome !== 'rises-and-sets') return t(`sheet.noDate.${starOutcome}`);
  if (warnings.includes('one-occurrence-only'))
    return t(`sheet.noDate.${sky ? 'fewer-of-them' : 'one-occurrence-only'}`, { year });
  if (warnings.includes('no-lead-yet')) return t('sheet.noDate.no-lead-yet');
  if (warnings.includes('waits-for-actual-day')) return t('sheet.noDate.waits');
  if (warnings.includes('anchor-gone') || warnings.includes('anchor-without-days')) {
    return t('sheet.noDate.anchor');
  }
  if (sky && sky.reason !== null) return skyText(`noSign.${sky.reason}`);
  if (phenomenonOutcome !== null && phenomenonOutcome !== 'dated') {
    return t(`sheet.noDate.${phenomenonOutcome}`, { year });
  }
  return null;
}
