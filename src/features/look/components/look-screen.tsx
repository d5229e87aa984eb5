import { useTranslation } from 'react-i18next';
import { Link } from 'react-router-dom';
import type { Look } from '#shared/contracts/look.js';
import type { Phenomenon } from '#shared/sky/vocabulary.js';
import { markerName } from '#src/lib/marker-names.js';
import { paths } from '#src/lib/paths.js';
import { Columns } from '#src/ui/page.js';
import { Care } from '#src/ui/surfaces.js';
import { GuidesBoard } from './guides-board.js';
import { LimitNote } from './limit-note.js';
import { LookDay } from './look-day.js';
import { MoonBoard } from './moon-board.js';
import { SeasonBoard } from './season-board.js';
import { WhereBoard } from './where-board.js';

export interface LookScreenProps {
  look: Look;
  /** The day that is chosen; the answer may still be that of the day before it. */
  date: string;
  isLate: boolean;
  onChange: (next: { phenomenon?: Phenomenon; date?: string }) => void;
}

/** The time to stop and the place in the sky first; everything else can be read before going out. */
export function LookScreen({ look, date, isLate, onChange }: LookScreenProps) {
  const { t } = useTranslation('look');
  const { marker, placeId, phenomenon } = look;
  const year = Number(look.date.slice(0, 4));
  return (
    <>
      <LookDay
        date={date}
        side={look.side}
        phenomenon={phenomenon}

        onChange={onChange}
      />
      <div aria-busy={isLate} className={isLate ? 'opacity-85' : undefined}>
        <Columns wider="first">
          <div className="grid content-start gap-4">
            <LimitNote look={look} />
            <WhereBoard look={look} />
          </div>
          <div className="grid content-start gap-4">
            <GuidesBoard look={look} />
            <MoonBoard look={look} />
            <SeasonBoard look={look} onChange={onChange} />
            <Care>
              <p>{t('care.eyes')}</p>
              <p className="mt-1">{t('care.night')}</p>
            </Care>
            <p>
              <Link to={paths.star(marker.markerKey, { placeId, year })}>
                {t('toStar', { marker: markerName(marker) })}
              </Link>
            </p>
          </div>
        </Columns>
      </div>
    </>
  );
}
