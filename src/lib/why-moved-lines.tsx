import { useTranslation } from 'react-i18next';
import type { WhyMoved } from '#shared/contracts/moves.js';

/** Why days moved: the one cause in a sentence, or what each does and what they do together. */
export function WhyMovedLines({ why }: { why: WhyMoved }) {
  const { t } = useTranslation('moves');
  const { moved, causes, togetherDays } = why;
  const [only] = causes;
  if (only === undefined) return <p>{t('together.only')}</p>;
  if (causes.length === 1 && togetherDays === 0) {
    return <p>{t('only', { cause: t(`cause.${only.cause}`) })}</p>;
  }
  const direction = (days: number) => (days > 0 ? 'later' : 'earlier');
  return (
    <div>
      <p>{moved === null ? t('title') : t(`point.${moved.point}`)}</p>
      <ul className="why-moved">
        {causes.map(({ cause, days }) => (
          <li key={cause}>
            {days === null
              ? t('line.whole', { cause: t(`cause.${cause}`) })
              : t(`line.${direction(days)}`, { count: Math.abs(days), cause: t(`cause.${cause}`) })}
          </li>
        ))}
        {togetherDays !== 0 && (
          <li>{t(`together.${direction(togetherDays)}`, { count: Math.abs(togetherDays) })}</li>
        )}
      </ul>
    </div>
  );
}
