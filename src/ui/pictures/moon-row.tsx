import { classNames } from '../class-names.js';
import { Peg } from '../pegs.js';
import { useWidth } from '../use-width.js';
import { MoonGlyph } from './moon-glyph.js';

export interface MoonRowDays {
  /** Day of the new Moon, and the day before the next one. */
  first: number;
  last: number;
  crescentDay: number | null;
  fullDay: number;
  beginsDay: number | null;
  sign: { early: number | null; expected: number; late: number | null } | null;
}

export interface MoonRowPictureProps {
  days: MoonRowDays;
  latitudeDeg: number;
  /** The row as a sentence. */
  label: string;
  today?: number | null | undefined;
  /** The month that was put in is drawn with dashed holes. */
  dashed?: boolean | undefined;
  className?: string | undefined;
}

/** All rows have the same holes, so that Moons stand under Moons. */
const HOLES = 30;
const PEG_ROOM = 24;
const SIGN_ROOM = 20;
/** A small star: the sign from which months are counted. */
const STAR = 'M0-8.4 2 -2.6 8.2-2.6 3.2 1 5.1 7 0 3.4-5.1 7-3.2 1-8.2-2.6-2-2.6Z';

/** A Moon as a row of holes: new, first crescent and full Moon stand in theirs, the stroke is where a month begins. */
export function MoonRowPicture({ days, latitudeDeg, label, today, dashed, className }: MoonRowPictureProps) {
  const [ref, width] = useWidth(320);
  const pitch = width / HOLES;
  const radius = Math.min(5.5, pitch * 0.34);
  const moonRadius = Math.min(9.5, pitch * 0.62);
  const hasPeg = typeof today === 'number' && today >= days.first && today <= days.last;
  const middleY = (hasPeg ? PEG_ROOM : 4) + moonRadius;
  const height = middleY + moonRadius + (days.sign === null ? 4 : SIGN_ROOM);
  const xOf = (day: number): number => (day - days.first + 0.5) * pitch;
  const moons = [
    { event: 'new' as const, day: days.first },
    { event: 'first-crescent' as const, day: days.crescentDay },
    { event: 'full' as const, day: days.fullDay },
  ].flatMap(({ event, day }) => (day === null ? [] : [{ event, day }]));
  const taken = new Set(moons.map(({ day }) => day));
  const holes = Array.from({ length: days.last - days.first + 1 }, (_, index) => days.first + index);
  return (
    <div ref={ref} className={classNames('picture', className)}>
      <svg role="img" aria-label={label} width="100%" height={Math.ceil(height)}>
        {days.beginsDay !== null && (
          <rect
            className="pic-peg"
            x={xOf(days.beginsDay) - pitch / 2 - 1}
            y={middleY - moonRadius - 2}
            width={2}
            height={2 * moonRadius + 4}
          />
        )}
        {holes
          .filter((day) => !taken.has(day))
          .map((day) => (
            <circle
              key={day}
              className="pic-hole"
              cx={xOf(day)}
              cy={middleY}
              r={radius}
              strokeWidth={radius > 4 ? 1.8 : 1.3}
              strokeDasharray={dashed === true ? '2.4 1.8' : undefined}
            />
          ))}
        {moons.map(({ event, day }) => (
          <MoonGlyph
            key={event}
            event={event}
            latitudeDeg={latitudeDeg}
            cx={xOf(day)}
            cy={middleY}
            radius={moonRadius}
          />
        ))}
        {days.sign !== null && <Sign sign={days.sign} days={days} xOf={xOf} y={middleY + moonRadius + 3} />}
        {hasPeg && <Peg x={String(xOf(today))} footY={middleY + 1} size={radius > 4 ? 0.9 : 0.75} />}
      </svg>
    </div>
  );
}

/** The sign's range as a bar with the star at its expected day; cut at the ends of the row. */
function Sign({
  sign,
  days,
  xOf,
  y,
}: {
  sign: NonNullable<MoonRowDays['sign']>;
  days: MoonRowDays;
  xOf: (day: number) => number;
  y: number;
}) {
  const from = xOf(Math.max(days.first, sign.early ?? sign.expected));
  const to = xOf(Math.min(days.last, sign.late ?? sign.expected));
  return (
    <g className="pic-peg">
      <rect x={from} y={y + 6} width={Math.max(0, to - from)} height={2} />
      <path d={STAR} transform={`translate(${String(xOf(sign.expected))} ${String(y + 7)}) scale(0.8)`} />
    </g>
  );
}
