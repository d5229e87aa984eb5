import { useTranslation } from 'react-i18next';
import type { NearestMarker } from '#shared/contracts/finder.js';
import { useDateWords } from '#src/lib/date-words.js';
import { listWords } from '#src/lib/list-words.js';
import { markerName } from '#src/lib/marker-names.js';
import { Button, ButtonLink } from '#src/ui/button.js';
import { Board } from '#src/ui/surfaces.js';
import { useFinderFacts } from './finder-context.js';
import { SkySigns } from './sky-signs.js';

/** Nights above this depth keep even bright stars out of sight near the ground. */
const LIGHT_NIGHT_DEG = 12;

/** Why nothing near the wanted days can be gone by, and what can: another season, the Sun, the land, a date. */
export function NoMarker({ isAll, onShowAll }: { isAll: boolean; onShowAll: () => void }) {
  const { t, i18n } = useTranslation('finder');
  const { answer, words, wanted } = useFinderFacts();
  const { darkestDeg, without, nearest } = answer;
  const reasons = [
    without.neverSets > 0 && t('none.neverSets', { count: without.neverSets }),
    without.neverClearsSkyline > 0 && t('none.neverClears', { count: without.neverClearsSkyline }),
    without.neverDarkEnough > 0 && t('none.neverDark', { count: without.neverDarkEnough }),
  ].filter((reason) => reason !== false);
  const depth = new Intl.NumberFormat(i18n.language, { maximumFractionDigits: 0 });
  return (
    <Board title={t(isAll ? 'none.titleAll' : 'none.title', { days: words.wanted(wanted) })}>
      {darkestDeg !== null && darkestDeg < LIGHT_NIGHT_DEG && (
        <p>
          {darkestDeg <= 0
            ? t('none.sunUp')
            : t('none.light', { depth: depth.format(Math.ceil(darkestDeg)) })}
        </p>
      )}
      {reasons.length > 0 && (
        <p className="mt-2">{t('none.counts', { reasons: listWords(reasons, i18n.language) })}</p>
      )}
      <h3 className="mt-4">{t('none.instead')}</h3>
      <h4 className="mt-3 mb-2">{t('signs.title')}</h4>
      <SkySigns />
      <h4 className="mt-4">{t('none.further')}</h4>
      <ul className="mt-2 grid list-disc gap-2 ps-5">
        {nearest.before !== null && <Nearest sign={nearest.before} text="before" />}
        {nearest.after !== null && <Nearest sign={nearest.after} text="after" />}
        <li>{t('none.sun')}</li>
        <li>{t('none.land')}</li>
        <li>{t('none.fixed')}</li>
      </ul>
      {!isAll && (
        <Button className="mt-3" onClick={onShowAll}>
          {t('none.tryAll')}
        </Button>
      )}
    </Board>
  );
}

function Nearest({ sign, text }: { sign: NearestMarker; text: 'before' | 'after' }) {
  const { t } = useTranslation(['finder', 'sky']);
  const dates = useDateWords();
  const { takePath } = useFinderFacts();
  const { expected, early, late } = sign.days;
  return (
    <li>
      {t(`none.${text}`, {
        sign: `${markerName(sign)}, ${t(`sky:phenomenon.${sign.phenomenon}`)}`,
        day: dates.aboutBetween(expected.gregorian, early?.gregorian ?? null, late?.gregorian ?? null),
        count: Math.abs(sign.daysAway),
      })}
      {takePath !== null && (
        <div>
          <ButtonLink look="quiet" className="-ms-2" to={takePath(sign)}>
            {t('none.use')}
          </ButtonLink>
        </div>
      )}
    </li>
  );
}
