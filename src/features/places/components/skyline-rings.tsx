import { useRef, type KeyboardEvent, type PointerEvent } from 'react';
import { useTranslation } from 'react-i18next';
import type { SkylinePoint } from '#shared/contracts/places.js';
import { Peg } from '#src/ui/pegs.js';
import type { SkylineScale } from '#src/ui/pictures/skyline.js';
import {
  DIRECTION_STEP_DEG,
  HEIGHT_STEP_DEG,
  placesInView,
  roundTo,
  turnView,
  type Half,
} from '../model/skyline-edit.js';
import { useSkylineWords } from './skyline-words.js';

export interface RingsProps {
  points: readonly SkylinePoint[];
  selected: number;
  half: Half | null;
  scale: SkylineScale;
}

const RING = 8;
/** Closer than this, rings would lie on each other: then only the chosen point is drawn. */
const LEAST_PITCH = 13;
const TARGET = 48;

interface PlacedRing {
  key: string;
  index: number;
  point: SkylinePoint;
  x: number;
  y: number;
}

function placed({ points, half, scale }: Omit<RingsProps, 'selected'>): PlacedRing[] {
  return points.flatMap((point, index) =>
    placesInView(point.azimuthDeg, turnView(half)).map((at, copy) => ({
      // A ring keeps its key while it moves; north has two.
      key: `${index} ${copy}`,
      index,
      point,
      x: scale.x(at),
      y: scale.y(point.altitudeDeg),
    })),
  );
}

function pitchOf(rings: readonly PlacedRing[], scale: SkylineScale): number {
  return rings.length === 0 ? Infinity : scale.width / rings.length;
}

/** The rings and the peg as they are drawn: inside the picture, cut at its edges. */
export function DrawnRings(props: RingsProps) {
  const rings = placed(props);
  const isCrowded = pitchOf(rings, props.scale) < LEAST_PITCH;
  return (
    <>
      {rings.map(({ key, index, x, y }) =>
        index === props.selected ? (
          <Peg key={key} x={String(x)} footY={y} size={1.1} />
        ) : isCrowded ? null : (
          <circle
            key={key}
            cx={x}
            cy={y}
            r={RING}
            fill="var(--color-field)"
            stroke="var(--color-umber)"
            strokeWidth={2.25}
          />
        ),
      )}
    </>
  );
}

export interface RingKeysProps extends RingsProps {
  /** Without dragging (a phone, where the finger has to scroll) a ring is only chosen. */
  onDrag: ((index: number, to: SkylinePoint, isEnd: boolean) => void) | null;
  onStep: (index: number, to: Partial<SkylinePoint>) => void;
  onSelect: (index: number) => void;
}

/** The rings as buttons: choose, drag, step with the arrow keys, go along with Page Up and Page Down. */
export function RingKeys(props: RingKeysProps) {
  const { points, selected, scale, onSelect, onStep, onDrag } = props;
  const { t } = useTranslation('places');
  const words = useSkylineWords();
  const dragging = useRef(false);
  const keys = useRef(new Map<number, HTMLButtonElement>());
  const rings = placed(props);
  const pitch = pitchOf(rings, scale);
  const target = Math.max(10, Math.min(TARGET, pitch));

  const go = (index: number) => {
    const next = (index + points.length) % points.length;
    onSelect(next);
    keys.current.get(next)?.focus();
  };
  const onKeyDown = (event: KeyboardEvent, index: number, point: SkylinePoint) => {
    const steps: Record<string, () => void> = {
      ArrowUp: () => onStep(index, { altitudeDeg: roundTo(point.altitudeDeg + HEIGHT_STEP_DEG, 0.1) }),
      ArrowDown: () => onStep(index, { altitudeDeg: roundTo(point.altitudeDeg - HEIGHT_STEP_DEG, 0.1) }),
      ArrowLeft: () => onStep(index, { azimuthDeg: point.azimuthDeg - DIRECTION_STEP_DEG }),
      ArrowRight: () => onStep(index, { azimuthDeg: point.azimuthDeg + DIRECTION_STEP_DEG }),
      PageUp: () => go(index - 1),
      PageDown: () => go(index + 1),
    };
    const step = steps[event.key];
    if (step === undefined) return;
    event.preventDefault();
    step();
  };
  const directionAt = (event: PointerEvent<HTMLButtonElement>): SkylinePoint | null => {
    const picture = event.currentTarget.closest('.picture')?.getBoundingClientRect();
    if (picture === undefined) return null;
    const turn = turnView(props.half);
    const across = (event.clientX - picture.left) / picture.width;
    const down = Math.min(scale.height, Math.max(0, event.clientY - picture.top));
    const [top, bottom] = [scale.y(0), scale.y(1)];
    return {
      azimuthDeg: Math.round(turn.fromAzimuthDeg + across * (turn.toAzimuthDeg - turn.fromAzimuthDeg)),
      altitudeDeg: roundTo((top - down) / (top - bottom), 0.1),
    };
  };
  const drag = (event: PointerEvent<HTMLButtonElement>, index: number, isEnd: boolean) => {
    const to = dragging.current ? directionAt(event) : null;
    if (to !== null) onDrag?.(index, to, isEnd);
  };

  return rings.map(({ key, index, point, x, y }) => (
    <button
      key={key}
      ref={(element) => {
        if (element) keys.current.set(index, element);
        else keys.current.delete(index);
      }}
      type="button"
      className="absolute -translate-1/2 rounded-full"
      style={{
        left: x,
        top: y,
        inlineSize: target,
        blockSize: TARGET,
        touchAction: onDrag === null ? 'auto' : 'none',
        cursor: onDrag === null ? 'pointer' : 'grab',
        zIndex: index === selected ? 1 : undefined,
      }}
      tabIndex={index === selected ? 0 : -1}
      aria-pressed={index === selected}
      aria-label={t('skyline.ring', {
        azimuth: words.degrees(point.azimuthDeg),
        direction: words.direction(point.azimuthDeg),
        height: words.degrees(point.altitudeDeg),
      })}
      onClick={() => {
        onSelect(index);
      }}
      onKeyDown={(event) => {
        onKeyDown(event, index, point);
      }}
      onPointerDown={(event) => {
        onSelect(index);
        if (onDrag === null || event.button !== 0) return;
        dragging.current = true;
        event.currentTarget.setPointerCapture(event.pointerId);
      }}
      onPointerMove={(event) => {
        drag(event, index, false);
      }}
      onPointerUp={(event) => {
        drag(event, index, true);
        dragging.current = false;
      }}
      onPointerCancel={() => {
        dragging.current = false;
      }}
    />
  ));
}
