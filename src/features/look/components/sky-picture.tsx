import { useTranslation } from 'react-i18next';
import { limitPoint, lookMarks } from '#shared/contracts/look-marks.js';
import type { Look, LookMoment } from '#shared/contracts/look.js';
import { markerName } from '#src/lib/marker-names.js';
import { compassPoint } from '#src/lib/sky-words.js';
import { LookPicture, type LookNeighbour } from '#src/ui/pictures/look-picture.js';
import { pathParts } from '../model/picture-parts.js';
import { useLookWords } from '../model/use-look-words.js';

/** The skyline, the star's path, the bright neighbours, and times beside the path; all of it is said in words as well. */
export function SkyPicture({ look, best }: { look: Look; best: LookMoment }) {
  const { t } = useTranslation(['look', 'sky']);
  const words = useLookWords();
  const { side, limitAt, seenFromAt, seenToAt, pointers, planets, moon } = look;
  const parts = pathParts(look.path);
  const limit = limitPoint(look);
  const neighbours: LookNeighbour[] = [
    ...planets.map((planet) => ({
      ...planet,
      key: planet.planet,
      kind: 'planet' as const,
      words: t(`planet.${planet.planet}`),
    })),
    ...pointers.map((pointer) => ({
      ...pointer,
      key: `hr${pointer.hr}`,
      kind: 'star' as const,
      words: pointer.name,
    })),
    ...(moon?.isUp === true ? [{ ...moon, key: 'moon', kind: 'moon' as const, words: t('moon.title') }] : []),
  ];
  const summary = [
    t('picture.what', { marker: markerName(look.marker), compass: words.compass(best.azimuthDeg) }),
    seenFromAt !== null && seenToAt !== null
      ? t('picture.seen', { from: seenFromAt, to: seenToAt })
      : t('picture.notSeen'),
    ...(limitAt === null ? [] : [t(side === 'dawn' ? 'picture.stop' : 'picture.start', { time: limitAt })]),
  ];
  return (
    <figure className="mt-3">
      <LookPicture
        points={look.skyline}
        star={best}
        seenPaths={parts.seen}
        lightPaths={parts.light}
        neighbours={neighbours}
        {...(side === 'dawn' && limit !== null ? { stop: limit } : {})}
        labels={lookMarks(look).map(({ key, time, ...at }) => ({
          key,
          ...at,
          words: t(`picture.${key}`, { time }),
        }))}
        compass={Array.from({ length: 16 }, (_, index) => ({
          azimuthDeg: index * 22.5,
          words: t(`sky:compass.${compassPoint(index * 22.5)}`),
        }))}
        handWords={t('handRod')}
        height={240}
        label={summary.join(' ')}
      />
      <figcaption className="mt-1 text-small text-umber-soft">
        {t('handHint')} {t('picture.key')}
      </figcaption>
    </figure>
  );
}
