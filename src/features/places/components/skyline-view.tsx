import type { ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import type { SkylinePoint } from '#shared/contracts/places.js';
import { SkylinePicture, type SkylineScale } from '#src/ui/pictures/skyline.js';
import { heightScale, sunriseAzimuths, turnView, type Half } from '../model/skyline-edit.js';
import { useSkylineWords } from './skyline-words.js';

export interface SkylineViewProps {
  points: readonly SkylinePoint[];
  placeName: string;
  /** Half a turn on a phone, the whole one elsewhere. */
  half: Half | null;
  /** Null while the latitude cannot be read: then it is not said where the stars of the dawn rise. */
  latitudeDeg: number | null;
  /** Heights of the picture's edges while something is dragged; else they follow the points. */
  scale?: ReturnType<typeof heightScale> | undefined;
  inFront?: ((scale: SkylineScale) => ReactNode) | undefined;
  onTop?: ((scale: SkylineScale) => ReactNode) | undefined;
}

const WINDS = [
  { azimuthDeg: 0, point: 'n' },
  { azimuthDeg: 90, point: 'e' },
  { azimuthDeg: 180, point: 's' },
  { azimuthDeg: 270, point: 'w' },
  { azimuthDeg: 360, point: 'n' },
] as const;

/** The skyline as a silhouette over the words of the compass, with the part where stars rise at dawn. */
export function SkylineView(props: SkylineViewProps) {
  const { points, placeName, half, latitudeDeg, scale = heightScale(points), inFront, onTop } = props;
  const { t } = useTranslation(['places', 'sky']);
  const words = useSkylineWords();
  const turn = turnView(half);
  const percentOf = (azimuthDeg: number) =>
    ((azimuthDeg - turn.fromAzimuthDeg) / (turn.toAzimuthDeg - turn.fromAzimuthDeg)) * 100;
  return (
    <>
      <SkylinePicture
        className="border-(length:--line) border-hairline"
        points={points}
        view={{ ...turn, topDeg: scale.topDeg, bottomDeg: scale.bottomDeg }}
        height={half === null ? 232 : 180}
        label={words.sentence(points, placeName)}
        levelsDeg={[0, ...scale.levelsDeg]}
        inFront={inFront}
        onTop={onTop}
      />
      <div className="picture" aria-hidden>
        <div className="under-picture mt-1">
          {WINDS.filter((wind) => percentOf(wind.azimuthDeg) >= 0 && percentOf(wind.azimuthDeg) <= 100).map(
            ({ azimuthDeg, point }) => (
              <span
                key={azimuthDeg}
                className="first-letter:uppercase"
                style={anchored(percentOf(azimuthDeg))}
              >
                {t(`sky:compass.${point}`)}
              </span>
            ),
          )}
        </div>
        {latitudeDeg !== null && <Zones latitudeDeg={latitudeDeg} half={half} percentOf={percentOf} />}
      </div>
    </>
  );
}

function Zones({
  latitudeDeg,
  half,
  percentOf,
}: {
  latitudeDeg: number;
  half: Half | null;
  percentOf: (azimuthDeg: number) => number;
}) {
  const { t } = useTranslation('places');
  const { fromDeg, toDeg } = sunriseAzimuths(latitudeDeg);
  const rising = { start: percentOf(fromDeg), end: percentOf(toDeg) };
  const setting = { start: percentOf(360 - toDeg), end: percentOf(360 - fromDeg) };
  return (
    <div className="relative h-9">
      {half !== 'west' && (
        <Zone {...rising} className="bg-ochre">
          {t('skyline.rising')}
        </Zone>
      )}
      {half !== 'east' && (
        <Zone {...setting} className="bg-indigo">
          {t('skyline.setting')}
        </Zone>
      )}
    </div>
  );
}

function Zone({
  start,
  end,
  className,
  children,
}: {
  start: number;
  end: number;
  className: string;
  children: ReactNode;
}) {
  return (
    <>
      <i
        className={`absolute top-0 h-1 ${className}`}
        style={{ left: `${start}%`, width: `${end - start}%` }}
      />
      <span className="on-picture top-2" style={{ left: `${Math.min(start, 70)}%` }}>
        {children}
      </span>
    </>
  );
}

/** Words at the edges stay inside, all others stand in the middle of their direction. */
function anchored(percent: number): { left: string; transform: string } {
  const shift = percent <= 1 ? 0 : percent >= 99 ? -100 : -50;
  return { left: `${percent}%`, transform: `translateX(${shift}%)` };
}
