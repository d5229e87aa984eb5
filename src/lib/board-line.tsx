import { useTranslation } from 'react-i18next';
import { boardOf, type BoardBody } from '#shared/calendar/variants.js';
import { useEntryWords } from './entry-words.js';

/** The days by which the board goes, and why, where they are not the entry's own; nothing otherwise. */
export function BoardLine({ entry }: { entry: BoardBody }) {
  const { t } = useTranslation('variants');
  const words = useEntryWords();
  if (entry.variants === undefined) return null;
  const { window, drivenBy } = boardOf(entry);
  if (drivenBy === 'entry') return null;
  const why = {
    variant: null,
    'later-start-earlier-end': t('board.narrow'),
    'earlier-start-later-end': t('board.wide'),
  }[drivenBy];
  const reason = entry.content.board?.reason;
  return (
    <div className="grid gap-1">
      <p className="font-semibold">
        {window ? t('board.days', { days: words.windowSentence(window) }) : t('board.noDays')}
      </p>
      {why !== null && <p className="text-small text-umber-soft">{why}</p>}
      {reason !== undefined && (
        <p className="text-small text-umber-soft">{t('board.reasonShown', { reason })}</p>
      )}
    </div>
  );
}
