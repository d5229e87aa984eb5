import { useQuery } from '@tanstack/react-query';
import { geoGraticule, geoPath } from 'd3-geo';
import { ArrowDown, ArrowLeft, ArrowRight, ArrowUp, Minus, Plus } from 'lucide-react';
import { useMemo, useState } from 'react';
import { useTranslation } from 'react-i18next';
import { Button, IconButton } from '#src/ui/button.js';
import { Peg } from '#src/ui/pegs.js';
import { usePanSurface } from '#src/ui/pictures/pan-surface.js';
import { useWidth } from '#src/ui/use-width.js';
import { Skeleton, TroubleNote } from '#src/ui/waiting.js';
import { writeCoordinate } from '../model/coordinate.js';
import { coarseLand, fineLand } from '../model/land-shapes.js';
import {
  FINE_FROM_ZOOM,
  mapProjection,
  panned,
  placeAt,
  viewOf,
  zoomed,
  type EarthPoint,
  type MapView,
} from '../model/map-view.js';

const STEP_PX = 60;
const ZOOM = 2;

/** The Earth on paper: drag, pinch or use the keys; a tap says where the place is. Default export for `lazy`. */
export default function WorldMap({
  place,
  onPick,
}: {
  /** Where the peg stands; null while the coordinates cannot be read. */
  place: EarthPoint | null;
  onPick: (place: EarthPoint) => void;
}) {
  const { t } = useTranslation('places');
  const [ref, width] = useWidth(600);
  const height = Math.round(Math.min(360, Math.max(200, width / 2)));
  const [view, setView] = useState<MapView>(() => viewOf(place));
  const [shown, setShown] = useState(place);
  if (place !== null && !isSame(place, shown)) {
    // Coordinates were typed: the peg moves, and the paper follows where it would stand outside.
    setShown(place);
    if (isOutside(place, view, width, height)) setView({ ...view, ...place });
  }
  const coarse = useQuery({ queryKey: ['land', 'coarse'], queryFn: coarseLand, staleTime: Infinity });
  const fine = useQuery({
    queryKey: ['land', 'fine'],
    queryFn: fineLand,
    staleTime: Infinity,
    enabled: view.zoom >= FINE_FROM_ZOOM,
  });
  const land = (view.zoom >= FINE_FROM_ZOOM ? fine.data : undefined) ?? coarse.data;
  const drawn = useMemo(() => {
    const path = geoPath(mapProjection(view, width, height)).digits(1);
    const gapDeg = view.zoom < 3 ? 30 : view.zoom < 12 ? 10 : view.zoom < 50 ? 2 : 1;
    return {
      land: land === undefined ? '' : (path(land) ?? ''),
      lines: path(geoGraticule().step([gapDeg, gapDeg])()) ?? '',
    };
  }, [view, width, height, land]);
  const surface = usePanSurface({
    onPan: (dx, dy) => {
      setView((before) => panned(before, dx, dy, width));
    },
    onZoom: (factor) => {
      setView((before) => zoomed(before, factor));
    },
    onTap: (x, y) => {
      onPick(placeAt(view, x, y, width));
    },
  });
  if (land === undefined) {
    return coarse.isError ? (
      <TroubleNote
        sentence={t('map.notLoaded')}
        onRetry={() => {
          void coarse.refetch();
        }}
      />
    ) : (
      <Skeleton lines={4} />
    );
  }
  const spot =
    place === null ? null : mapProjection(view, width, height)([place.longitudeDeg, place.latitudeDeg]);
  const words = (point: EarthPoint) =>
    t('map.point', {
      latitude: writeCoordinate(point.latitudeDeg, 'latitude'),
      longitude: writeCoordinate(point.longitudeDeg, 'longitude'),
    });
  const middle = placeAt(view, 0, 0, width);
  const go = (x: number, y: number) => {
    setView((before) => panned(before, -x * STEP_PX, -y * STEP_PX, width));
  };
  return (
    <div className="grid gap-3">
      <div {...surface} ref={ref} className="picture world-map touchable">
        <svg
          role="img"
          aria-label={t(place === null ? 'map.labelEmpty' : 'map.label', {
            place: place === null ? '' : words(place),
            middle: words(middle),
          })}
          width="100%"
          height={height}
          style={{ overflow: 'hidden' }}
        >
          <path className="map-lines" d={drawn.lines} />
          <path className="map-land" d={drawn.land} />
          <path
            className="chart-cross"
            d={`M${width / 2 - 20} ${height / 2}h12m16 0h12M${width / 2} ${height / 2 - 20}v12m0 16v12`}
          />
          {spot !== null && <Peg x={String(spot[0])} footY={spot[1]} />}
        </svg>
      </div>
      <p className="text-small text-umber-soft">{t('map.how')}</p>
      <div className="flex flex-wrap items-center gap-2">
        <IconButton
          label={t('map.west')}
          icon={<ArrowLeft aria-hidden size={22} />}
          onClick={() => {
            go(-1, 0);
          }}
        />
        <IconButton
          label={t('map.north')}
          icon={<ArrowUp aria-hidden size={22} />}
          onClick={() => {
            go(0, -1);
          }}
        />
        <IconButton
          label={t('map.south')}
          icon={<ArrowDown aria-hidden size={22} />}
          onClick={() => {
            go(0, 1);
          }}
        />
        <IconButton
          label={t('map.east')}
          icon={<ArrowRight aria-hidden size={22} />}
          onClick={() => {
            go(1, 0);
          }}
        />
        <IconButton
          label={t('map.nearer')}
          icon={<Plus aria-hidden size={22} />}
          onClick={() => {
            setView((before) => zoomed(before, ZOOM));
          }}
        />
        <IconButton
          label={t('map.farther')}
          icon={<Minus aria-hidden size={22} />}
          onClick={() => {
            setView((before) => zoomed(before, 1 / ZOOM));
          }}
        />
        <Button
          onClick={() => {
            onPick(middle);
          }}
        >
          {t('map.middleIsIt')}
        </Button>
      </div>
      <p className="text-small" role="status">
        {place === null ? t('map.noPeg') : t('map.pegAt', { place: words(place) })}
      </p>
    </div>
  );
}

function isSame(a: EarthPoint, b: EarthPoint | null): boolean {
  return b !== null && a.latitudeDeg === b.latitudeDeg && a.longitudeDeg === b.longitudeDeg;
}

function isOutside(place: EarthPoint, view: MapView, width: number, height: number): boolean {
  const spot = mapProjection(view, width, height)([place.longitudeDeg, place.latitudeDeg]);
  return spot === null || spot[0] < 0 || spot[0] > width || spot[1] < 0 || spot[1] > height;
}
