import { Trans, useTranslation } from 'react-i18next';
import { Link } from 'react-router-dom';
import type { Look } from '#shared/contracts/look.js';
import { useDateWords } from '#src/lib/date-words.js';
import { markerName } from '#src/lib/marker-names.js';
import { paths } from '#src/lib/paths.js';
import { Button } from '#src/ui/button.js';
import { Board } from '#src/ui/surfaces.js';
import { LAST_DAY } from '../model/look-address.js';
import { useLookWords } from '../model/use-look-words.js';

/** Whether this is the star's season; else when it is, or why it has none here and which star has one. */
export function SeasonBoard({ look, onChange }: { look: Look; onChange: (next: { date: string }) => void }) {
  const { t } = useTranslation(['look', 'sky']);
  const words = useDateWords();
  const { season, phenomenon } = look;
  const expected = season.days?.expected.gregorian;
  return (
    <Board title={t('season.title')}>
      <Standing look={look} />
      <p className="mt-1 text-small text-umber-soft">{t(`sky:trade.${phenomenon}`)}</p>
      {season.days !== null && season.notes.includes('never-disappears') && (
        <p className="mt-1">{t('season.neverDisappears')}</p>
      )}
      {season.notes.includes('weak-marker') && <p className="mt-1">{t('season.weak')}</p>}
      {expected !== undefined && expected !== look.date && expected <= LAST_DAY && (
        <Button
          className="mt-3"
          onClick={() => {
            onChange({ date: expected });
          }}
        >
          {t('day.toExpected', { day: words.day(expected, 'year') })}
        </Button>
      )}
      {season.days === null && <Alternative look={look} />}
    </Board>
  );
}

function Standing({ look }: { look: Look }) {
  const { t } = useTranslation(['look', 'sky']);
  const words = useLookWords();
  const { season, phenomenon } = look;
  const { days } = season;
  if (days === null) {
    if (season.starOutcome === 'never-sets') return <p>{t('season.neverSets')}</p>;
    if (season.starOutcome === 'never-clears-skyline') return <p>{t('season.neverClears')}</p>;
    return <p>{t(season.phenomenonOutcome === 'never-dark-enough' ? 'season.neverDark' : 'season.none')}</p>;
  }
  const about = words.about(days, Number(look.date.slice(0, 4)));
  if (season.season === 'within') return <p>{t(`season.within.${phenomenon}`, { about })}</p>;
  return season.season === 'after' ? (
    <p>{t('season.after', { phenomenon: t(`sky:phenomenon.${phenomenon}`), about })}</p>
  ) : (
    <p>{t('season.before', { phenomenon: t(`sky:phenomenonTitle.${phenomenon}`), about })}</p>
  );
}

/** Where a star never serves, another may. */
function Alternative({ look }: { look: Look }) {
  const { t } = useTranslation(['look', 'sky']);
  const words = useLookWords();
  const { alternative, phenomenon, placeId } = look;
  if (alternative === null) return <p className="mt-2">{t('season.noAlternative')}</p>;
  const { marker, days } = alternative;
  return (
    <p className="mt-2">
      <Trans
        t={t}
        i18nKey="season.alternative"
        values={{
          marker: markerName(marker),
          phenomenon: t(`sky:phenomenon.${phenomenon}`),
          about: words.about(days, Number(look.date.slice(0, 4))),
        }}
        components={{
          a: (
            <Link
              to={paths.look({
                marker: marker.markerKey,
                phenomenon,
                date: days.expected.gregorian,
                placeId,
              })}
            />
          ),
        }}
      />
    </p>
  );
}
