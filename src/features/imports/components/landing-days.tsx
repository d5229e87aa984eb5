import { useTranslation } from 'react-i18next';
import type { EntryWarning, EntryWindow } from '#shared/contracts/calendars.js';
import { goesByNothing, useEntryWords } from '#src/lib/entry-words.js';

interface LandingDaysProps {
  coming: { protectiveWatch: boolean; window: EntryWindow | null; warnings: readonly EntryWarning[] };
  year: number;
}

/** The days that something would have in the draft, or why it has none. */
export function LandingDays({ coming, year }: LandingDaysProps) {
  const { t } = useTranslation('imports');
  const words = useEntryWords();
  const { window, warnings } = coming;
  if (window !== null || goesByNothing(coming)) return <p>{words.window(coming, window, year)}</p>;
  if (warnings.includes('waits-for-actual-day')) return <p>{t('lines.waits')}</p>;
  const hangsOnNothing = warnings.includes('anchor-gone') || warnings.includes('anchor-without-days');
  return <p>{t(hangsOnNothing ? 'lines.anchorWithoutDays' : 'lines.noDay')}</p>;
}
