import { ArrowDown, ArrowLeft, ArrowRight, ArrowUp, Minus, Plus, Table2 } from 'lucide-react';
import { useState, type Dispatch, type SetStateAction } from 'react';
import { useTranslation } from 'react-i18next';
import type { ChartStar } from '#shared/contracts/figures.js';
import { Button, IconButton } from '#src/ui/button.js';
import { More } from '#src/ui/fold.js';
import { usePanSurface } from '#src/ui/pictures/pan-surface.js';
import { useWidth } from '#src/ui/use-width.js';
import {
  project,
  RADIUS_MAX_DEG,
  RADIUS_MIN_DEG,
  separationDeg,
  unproject,
  type ChartView,
  type SkyPoint,
} from '../model/chart-projection.js';
import { ChartTable } from './chart-table.js';
import { chartRadius, StarChart } from './star-chart.js';

export interface StarPickerProps {
  stars: readonly ChartStar[];
  view: ChartView;
  onView: Dispatch<SetStateAction<ChartView>>;
  memberHrs: readonly number[];
  indicatorHr: number | null;
  patch: SkyPoint | null;
  nameOf: (star: ChartStar) => string;
  onToggle: (hr: number) => void;
  /** For a patch: a tap says where it is. Null while stars are picked. */
  onPatch: ((at: SkyPoint) => void) | null;
}

const FINGER_PX = 28;
/** One press moves on by this share of the radius. */
const STEP = 0.4;
const ZOOM = 1.5;

/** The neighbourhood to choose from: tap a star, drag the picture, or use the keys below. */
export function StarPicker(props: StarPickerProps) {
  const { stars, view, onView, memberHrs, patch, nameOf, onToggle, onPatch } = props;
  const { t } = useTranslation('figures');
  const [said, setSaid] = useState('');
  const middle = nearest(stars, view.centre);
  const isIn = middle !== null && memberHrs.includes(middle.hr);

  const [box, width] = useWidth(600);
  const radiusPx = chartRadius(width);
  const toggle = (star: ChartStar) => {
    setSaid(t(memberHrs.includes(star.hr) ? 'picker.saidOut' : 'picker.saidIn', { star: nameOf(star) }));
    onToggle(star.hr);
  };
  const zoom = (by: number) => {
    onView((before) => ({
      ...before,
      radiusDeg: Math.min(RADIUS_MAX_DEG, Math.max(RADIUS_MIN_DEG, before.radiusDeg * by)),
    }));
  };
  const surface = usePanSurface({
    onPan: (dx, dy) => {
      onView((before) => ({
        ...before,
        centre: unproject(before, { x: -dx / radiusPx, y: -dy / radiusPx }),
      }));
    },
    onZoom: (factor) => {
      zoom(1 / factor);
    },
    onTap: (x, y) => {
      const at = { x: x / radiusPx, y: y / radiusPx };
      const place = unproject(view, at);
      if (onPatch !== null) {
        onPatch(place);
        return;
      }
      const star = nearest(stars, place);
      const spot = star && project(view, star);
      if (star && spot && Math.hypot(spot.x - at.x, spot.y - at.y) * radiusPx <= FINGER_PX) toggle(star);
    },
  });
  const go = (x: number, y: number) => {
    onView((before) => ({ ...before, centre: unproject(before, { x: x * STEP, y: y * STEP }) }));
  };
  return (
    <div className="grid gap-3" ref={box}>
      <StarChart
        {...props}
        hasCrosshair
        label={t('picker.label', {
          count: memberHrs.length,
          middle: middle === null ? t('picker.nothing') : nameOf(middle),
        })}
        surface={surface}
      />
      <p className="text-small text-umber-soft">
        {t(onPatch === null ? 'picker.howStars' : 'picker.howPatch')}
      </p>
      <div className="flex flex-wrap items-center gap-2">
        {/* The picture keeps east to the left on every page; its arrows go with it. */}
        <div dir="ltr" className="flex flex-wrap gap-2">
          <IconButton
            label={t('picker.east')}
            icon={<ArrowLeft aria-hidden size={22} />}
            onClick={() => {
              go(-1, 0);
            }}
          />
          <IconButton
            label={t('picker.north')}
            icon={<ArrowUp aria-hidden size={22} />}
            onClick={() => {
              go(0, -1);
            }}
          />
          <IconButton
            label={t('picker.south')}
            icon={<ArrowDown aria-hidden size={22} />}
            onClick={() => {
              go(0, 1);
            }}
          />
          <IconButton
            label={t('picker.west')}
            icon={<ArrowRight aria-hidden size={22} />}
            onClick={() => {
              go(1, 0);
            }}
          />
        </div>
        <IconButton
          label={t('picker.nearer')}
          icon={<Plus aria-hidden size={22} />}
          onClick={() => {
            zoom(1 / ZOOM);
          }}
        />
        <IconButton
          label={t('picker.farther')}
          icon={<Minus aria-hidden size={22} />}
          onClick={() => {
            zoom(ZOOM);
          }}
        />
        {onPatch !== null ? (
          <Button
            onClick={() => {
              onPatch(view.centre);
              setSaid(t('picker.saidPatch'));
            }}
          >
            {t('picker.patchHere')}
          </Button>
        ) : (
          middle !== null && (
            <Button
              onClick={() => {
                toggle(middle);
              }}
            >
              {t(isIn ? 'picker.takeOut' : 'picker.putIn', { star: nameOf(middle) })}
            </Button>
          )
        )}
      </div>
      <p className="for-ears" role="status">
        {said}
      </p>
      <More label={t('picker.asTable')} icon={<Table2 aria-hidden size={20} />}>
        <ChartTable
          stars={stars.filter((star) => separationDeg(star, view.centre) <= view.radiusDeg)}
          memberHrs={memberHrs}
          nameOf={nameOf}
          onToggle={onPatch === null ? onToggle : null}
        />
      </More>
      {patch !== null && <p className="text-small">{t('picker.patchStands')}</p>}
    </div>
  );
}

function nearest(stars: readonly ChartStar[], to: SkyPoint): ChartStar | null {
  let found: ChartStar | null = null;
  let least = Infinity;
  for (const star of stars) {
    const away = separationDeg(star, to);
    if (away < least) [found, least] = [star, away];
  }
  return found;
}
