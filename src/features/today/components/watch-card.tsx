import { Trans, useTranslation } from 'react-i18next';
import { Link } from 'react-router-dom';
import type { Place } from '#shared/contracts/places.js';
import type { ComingMarker } from '#shared/contracts/today.js';
import { useDateWords } from '#src/lib/date-words.js';
import { listWords } from '#src/lib/list-words.js';
import { markerName } from '#src/lib/marker-names.js';
import { paths } from '#src/lib/paths.js';
import { compassPoint, endOfNight } from '#src/lib/sky-words.js';
import { LookPicture } from '#src/ui/pictures/look-picture.js';
import { Board, Care } from '#src/ui/surfaces.js';
import { watchPath } from '../model/watch-path.js';

/** What to look for, where, and when to stop. */
export function WatchCard({
  coming,
  place,
  later,
}: {
  coming: ComingMarker;
  place: Place | null;
  /** True where nothing is due in the next days and this is only the next one. */
  later: boolean;
}) {
  const { t, i18n } = useTranslation(['today', 'sky']);
  const words = useDateWords();
  const { marker, phenomenon, occurrence, leads } = coming;
  const { expected } = occurrence;
  const name = markerName(marker);
  const side = endOfNight(phenomenon);
  const compass = t(`sky:compass.${compassPoint(expected.starAzimuthDeg)}`);
  const limit = side === 'dawn' ? occurrence.stopLookingAt : occurrence.startLookingAt;
  const title = later ? 'watch.next' : side === 'dawn' ? 'watch.tomorrowDawn' : 'watch.thisEvening';
  return (
    <Board title={t(`today:${title}`)}>
      <p>
        <Trans
          t={t}
          i18nKey="today:watch.look"
          values={{ marker: name, compass }}
          components={{ b: <strong /> }}
        />
      </p>
      {place !== null && <Picture coming={coming} place={place} name={name} compass={compass} />}
      <p>
        {side === 'dawn' || limit === null
          ? t('today:watch.dawnStands', { time: expected.localTime })
          : t('today:watch.duskStands', { time: expected.localTime, start: limit })}
      </p>
      {limit !== null && (
        <Care className="my-3">
          <p>
            <Trans
              t={t}
              i18nKey={side === 'dawn' ? 'today:watch.stop' : 'today:watch.notBefore'}
              values={{ time: limit }}
              components={{ b: <strong /> }}
            />
          </p>
        </Care>
      )}
      <p>
        {t('today:watch.expected', {
          phenomenon: t(`sky:phenomenonTitle.${phenomenon}`),
          aboutBetween: words.aboutWithin(
            expected.gregorian,
            occurrence.early?.gregorian ?? null,
            occurrence.late?.gregorian ?? null,
          ),
        })}
      </p>
      {leads.length > 0 && <p>{t('today:watch.leads', { titles: listWords(leads, i18n.language) })}</p>}
      <p className="mt-2 text-umber-soft text-small">{t('today:watch.night')}</p>
      <p className="mt-2">
        <Link
          to={paths.look({
            marker: marker.markerKey,
            phenomenon,
            ...(place === null ? {} : { placeId: place.id }),
          })}
        >
          {t('today:watch.toLook')}
        </Link>
      </p>
      <p className="mt-2">
        <Link to={paths.star(marker.markerKey, { year: Number(expected.gregorian.slice(0, 4)) })}>
          {t('today:watch.toStar', { marker: name })}
        </Link>
      </p>
    </Board>
  );
}

function Picture({
  coming,
  place,
  name,
  compass,
}: {
  coming: ComingMarker;
  place: Place;
  name: string;
  compass: string;
}) {
  const { t } = useTranslation(['today', 'sky']);
  const { occurrence } = coming;
  const { localTime } = occurrence.expected;
  const { star, path, limit, rises, side } = watchPath(coming, place.latitudeDeg);
  const limitAt = side === 'dawn' ? occurrence.stopLookingAt : occurrence.startLookingAt;
  const labels = [
    {
      key: 'crossing',
      ...star,
      words: t(rises ? 'today:watch.comesUp' : 'today:watch.goesDown', { time: localTime }),
    },
    ...(limit !== null && limitAt !== null
      ? [
          {
            key: 'limit',
            ...limit,
            words: t(side === 'dawn' ? 'today:watch.stopLabel' : 'today:watch.startLabel', { time: limitAt }),
          },
        ]
      : []),
  ];
  const sentence = t('today:watch.picture', { marker: name, compass, time: localTime });
  return (
    <figure className="my-2">
      <LookPicture
        points={place.skyline}
        star={star}
        seenPaths={[]}
        lightPaths={[path]}
        {...(side === 'dawn' && limit !== null ? { stop: limit } : {})}
        labels={labels}
        compass={Array.from({ length: 16 }, (_, index) => ({
          azimuthDeg: index * 22.5,
          words: t(`sky:compass.${compassPoint(index * 22.5)}`),
        }))}
        handWords={t('today:watch.hand')}
        label={
          side === 'dawn' && limitAt !== null
            ? `${sentence} ${t('today:watch.pictureStop', { time: limitAt })}`
            : sentence
        }
      />
      <figcaption className="text-umber-soft text-small">{t('today:watch.handHint')}</figcaption>
    </figure>
  );
}
