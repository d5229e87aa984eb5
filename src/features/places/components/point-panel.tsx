import { ChevronLeft, ChevronRight, Plus } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import {
  SKYLINE_ALTITUDE_MAX_DEG,
  SKYLINE_ALTITUDE_MIN_DEG,
  type SkylinePoint,
} from '#shared/contracts/places.js';
import { Button, IconButton } from '#src/ui/button.js';
import { Stepper } from '#src/ui/stepper.js';
import { useToast } from '#src/ui/toast.js';
import {
  addPointAfter,
  DIRECTION_STEP_DEG,
  directionLimits,
  HEIGHT_STEP_DEG,
  movePoint,
} from '../model/skyline-edit.js';
import { useSkylineWords } from './skyline-words.js';

export interface PointPanelProps {
  points: readonly SkylinePoint[];
  selected: number;
  onSelect: (index: number) => void;
  onChange: (points: SkylinePoint[]) => void;
  /** Undoes taking a point away; other points may have changed meanwhile. */
  onPutBack: (point: SkylinePoint) => void;
}

/** The chosen point of the skyline: go along, step its direction and height, add one, take it away. */
export function PointPanel({ points, selected, onSelect, onChange, onPutBack }: PointPanelProps) {
  const { t } = useTranslation('places');
  const words = useSkylineWords();
  const say = useToast();
  const point = points[selected];
  if (point === undefined) return null;
  const limits = directionLimits(points, selected);
  const added = addPointAfter(points, selected);
  const degrees = (value: number) => t('skyline.degrees', { value: words.degrees(value) });
  const takeAway = () => {
    onChange(points.filter((_, index) => index !== selected));
    onSelect(Math.max(0, selected - 1));
    const text =
      points.length === 1
        ? t('skyline.levelAgain')
        : t('skyline.takenAway', { azimuth: words.degrees(point.azimuthDeg) });
    say(text, {
      onUndo: () => {
        onPutBack(point);
      },
    });
  };
  return (
    <div className="grid content-start gap-3">
      <div className="flex items-center justify-between gap-2">
        <IconButton
          label={t('skyline.before')}
          icon={<ChevronLeft aria-hidden size={22} />}
          onClick={() => {
            onSelect((selected - 1 + points.length) % points.length);
          }}
        />
        <p className="text-center text-small leading-snug" aria-live="polite">
          <strong>{t('skyline.point', { index: selected + 1, total: points.length })}</strong>
          <span className="block">{words.direction(point.azimuthDeg)}</span>
        </p>
        <IconButton
          label={t('skyline.next')}
          icon={<ChevronRight aria-hidden size={22} />}
          onClick={() => {
            onSelect((selected + 1) % points.length);
          }}
        />
      </div>
      <div className="grid gap-3 mid:grid-cols-2 wide:grid-cols-1">
        <Stepper
          label={t('skyline.direction')}
          value={point.azimuthDeg}
          min={Math.min(limits.min, point.azimuthDeg)}
          max={Math.max(limits.max, point.azimuthDeg)}
          step={DIRECTION_STEP_DEG}
          format={degrees}
          onChange={(azimuthDeg) => {
            onChange(movePoint(points, selected, { azimuthDeg }));
          }}
        />
        <Stepper
          label={t('skyline.height')}
          hint={words.hands(point.altitudeDeg)}
          value={point.altitudeDeg}
          min={SKYLINE_ALTITUDE_MIN_DEG}
          max={SKYLINE_ALTITUDE_MAX_DEG}
          step={HEIGHT_STEP_DEG}
          bigStep={2}
          format={degrees}
          onChange={(altitudeDeg) => {
            onChange(movePoint(points, selected, { altitudeDeg }));
          }}
        />
      </div>
      <div className="flex flex-wrap items-center gap-2">
        <Button
          icon={<Plus aria-hidden size={20} />}
          closedBecause={added === null ? t('skyline.noRoom') : undefined}
          onClick={() => {
            if (added === null) return;
            onChange(added.points);
            onSelect(added.index);
          }}
        >
          {t('skyline.add')}
        </Button>
        <Button look="quiet" onClick={takeAway}>
          {t('skyline.takeAway')}
        </Button>
      </div>
    </div>
  );
}
