import { useTranslation } from 'react-i18next';
import type { AirOccurrence, NightMinutes } from '#shared/contracts/air.js';
import { CLARITIES, type Clarity } from '#shared/sky/vocabulary.js';
import { percent, startPercent, type DaySpan } from '#src/ui/pictures/day-span.js';
import { RingRow } from '#src/ui/pictures/ring-row.js';
import { columnHeightPx } from '../model/minute-columns.js';

const LANE_HEIGHT_PX = 40;
/** Share of a day's width that its column takes. */
const COLUMN_SHARE = 0.66;

export interface MinutesPictureProps {
  occurrence: AirOccurrence;
  span: DaySpan;
  side: 'dawn' | 'dusk';
  /** The picture as sentences. */
  label: string;
}

/** The holes of the days with the village's bracket, and under them a lane of columns for each air. */
export function MinutesPicture({ occurrence, span, side, label }: MinutesPictureProps) {
  const { t } = useTranslation('air');
  const { rule, nights } = occurrence;
  const ranges = rule && [
    {
      key: 'rule',
      early: rule.early?.dayNumber ?? null,
      expected: rule.expected.dayNumber,
      late: rule.late?.dayNumber ?? null,
      side,
    },
  ];
  return (
    <div
      role="img"
      aria-label={label}
      className="grid grid-cols-[auto_minmax(0,1fr)] items-end gap-x-3 gap-y-2 text-small"
    >
      <span />
      <div aria-hidden>
        <RingRow span={span} label="" ranges={ranges ?? []} />
      </div>
      {CLARITIES.map((clarity) => (
        <div key={clarity} className="contents" aria-hidden>
          <span className="leading-none">{t(`lane.${clarity}`)}</span>
          <MinutesLane nights={nights} clarity={clarity} span={span} side={side} />
        </div>
      ))}
    </div>
  );
}

function MinutesLane({
  nights,
  clarity,
  span,
  side,
}: {
  nights: readonly NightMinutes[];
  clarity: Clarity;
  span: DaySpan;
  side: 'dawn' | 'dusk';
}) {
  const dayPercent = 100 / (span.last - span.first + 1);
  return (
    <div className="picture">
      <svg width="100%" height={LANE_HEIGHT_PX + 2}>
        {nights.map(({ dayNumber, byClarity }) => {
          const height = columnHeightPx(byClarity[clarity], LANE_HEIGHT_PX);
          return height === 0 ? null : (
            <rect
              key={dayNumber}
              className={side === 'dawn' ? 'pic-dawn' : 'pic-dusk'}
              x={percent(startPercent(dayNumber + (1 - COLUMN_SHARE) / 2, span))}
              width={percent(dayPercent * COLUMN_SHARE)}
              y={LANE_HEIGHT_PX - height}
              height={height}
            />
          );
        })}
        <rect className="pic-best" y={LANE_HEIGHT_PX} width="100%" height={1} strokeWidth={0} />
      </svg>
    </div>
  );
}
