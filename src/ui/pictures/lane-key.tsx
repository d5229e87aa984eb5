import { useTranslation } from 'react-i18next';
import { NIGHT_STATES, type NightState } from '#shared/sky/vocabulary.js';
import { YearLane } from './year-lane.js';

/** The six states of a lane with their words: within reach of every strip. */
export function LaneKey({ states = NIGHT_STATES }: { states?: readonly NightState[] | undefined }) {
  const { t } = useTranslation('sky');
  return (
    <ul className="lane-key" aria-label={t('howToReadStrip')}>
      {states.map((state) => (
        <li key={state}>
          <span aria-hidden>
            <YearLane
              span={{ first: 1, last: 10 }}
              segments={[{ state, fromDayNumber: 1, toDayNumber: 10 }]}
              label=""
              height={26}
            />
          </span>
          {t(`night.${state}`)}
        </li>
      ))}
    </ul>
  );
}

/** Solid, hatched, open, diamond: what the bars mean. */
export function WindowKey({ kinds = ['best', 'margin'] }: { kinds?: readonly WindowKeyKind[] | undefined }) {
  const { t } = useTranslation('sky');
  return (
    <ul className="lane-key">
      {kinds.map((kind) => (
        <li key={kind}>
          <svg className="picture" width="40" height="14" aria-hidden>
            {kind === 'fixed' ? (
              <path d="M20 0 27 7 20 14 13 7Z" className="pic-best" stroke="none" />
            ) : (
              <rect className={`pic-${kind}`} x="1" y="1" width="38" height="11" strokeWidth={1.25} />
            )}
          </svg>
          {t(`window.${kind}`)}
        </li>
      ))}
    </ul>
  );
}

export type WindowKeyKind = 'best' | 'margin' | 'watch' | 'fixed';
