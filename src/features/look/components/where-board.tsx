import { Printer } from 'lucide-react';
import { Trans, useTranslation } from 'react-i18next';
import type { Look } from '#shared/contracts/look.js';
import { halfHands } from '#shared/kernel/hands.js';
import { markerName } from '#src/lib/marker-names.js';
import { ButtonAnchor } from '#src/ui/button.js';
import { Board } from '#src/ui/surfaces.js';
import { lookCardUrl } from '../api/look-query.js';
import { useLookWords } from '../model/use-look-words.js';
import { SkyPicture } from './sky-picture.js';
import { PathTable } from './path-table.js';
import { SightNote } from './sight-note.js';

/** Where it stands at the best moment, drawn over the place's skyline, and from when to when. */
export function WhereBoard({ look }: { look: Look }) {
  const { t } = useTranslation('look');
  return (
    <Board aria-label={t('title')}>
      <Outcome look={look} />
      {look.best !== null && <SkyPicture look={look} best={look.best} />}
      <Times look={look} />
      {look.path.some(({ isUp }) => isUp) && (
        <>
          <PathTable look={look} />
          <SightNote look={look} />
        </>
      )}
      {look.best !== null && (
        <ButtonAnchor
          className="mt-3"
          href={lookCardUrl(look.placeId, {
            marker: look.marker.markerKey,
            phenomenon: look.phenomenon,
            date: look.date,
          })}
          download
          icon={<Printer aria-hidden size={22} />}
        >
          {t('print')}
        </ButtonAnchor>
      )}
    </Board>
  );
}

function Outcome({ look: { outcome, outcomeDetail, best, marker } }: { look: Look }) {
  const { t } = useTranslation('look');
  const words = useLookWords();
  const isJustAbove = best !== null && halfHands(best.aboveSkylineDeg) === 0;
  const key =
    outcome === 'never-clears-skyline'
      ? (outcomeDetail ?? 'below-skyline')
      : outcome === 'seen' && isJustAbove
        ? 'seenOn'
        : outcome;
  return (
    <p className="text-lead leading-snug">
      <Trans
        t={t}
        i18nKey={`outcome.${key}`}
        values={{
          marker: markerName(marker),
          time: best?.localTime ?? '',
          compass: best === null ? '' : words.compass(best.azimuthDeg),
          hands: best === null ? '' : words.hands(best.aboveSkylineDeg),
        }}
        components={{ b: <strong /> }}
      />
    </p>
  );
}

/** One sentence a line, in order of time. */
function Times({ look }: { look: Look }) {
  const { t } = useTranslation('look');
  const { comesUp, goesDown, seenFromAt, seenToAt, seenMinutes, watchFromAt, clarity, best } = look;
  const isUpAlready = best !== null && comesUp?.when === 'before-watch';
  return (
    <div className="mt-2 grid gap-1.5">
      {isUpAlready && <p>{t('times.comesUpBefore')}</p>}
      {comesUp?.when === 'in-watch' && <p>{t('times.comesUp', { time: comesUp.localTime })}</p>}
      {comesUp?.when === 'after-watch' && best === null && (
        <p>{t('times.comesUpAfter', { time: comesUp.localTime })}</p>
      )}
      {seenFromAt !== null && seenToAt !== null && (
        <p>
          {seenFromAt === watchFromAt && look.side === 'dawn'
            ? t('times.seenUntil', { to: seenToAt })
            : t('times.seen', { from: seenFromAt, to: seenToAt, count: seenMinutes })}{' '}
          {t(`times.air.${clarity}`)}
        </p>
      )}
      {goesDown?.when === 'in-watch' && <p>{t('times.goesDown', { time: goesDown.localTime })}</p>}
      {goesDown?.when === 'before-watch' && best === null && comesUp?.when !== 'after-watch' && (
        <p>{t('times.goesDownBefore', { time: goesDown.localTime })}</p>
      )}
      {look.season.starOutcome === 'never-sets' && <p>{t('times.neverSets')}</p>}
      {best !== null && (
        <p className="text-small text-umber-soft">
          {t('degrees', {
            azimuth: Math.round(best.azimuthDeg) % 360,
            altitude: Math.round(best.altitudeDeg),
            depth: Math.round(best.sunDepressionDeg),
          })}
        </p>
      )}
    </div>
  );
}
