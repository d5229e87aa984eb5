import { Table2 } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import type { Place } from '#shared/contracts/places.js';
import type { MarkerDetail } from '#shared/contracts/stars.js';
import { dayNumberOf, todayIn } from '#src/lib/days.js';
import { useWideScreen } from '#src/lib/wide-screen.js';
import { More } from '#src/ui/fold.js';
import { LaneKey } from '#src/ui/pictures/lane-key.js';
import { MonthScale } from '#src/ui/pictures/month-scale.js';
import { YearLane } from '#src/ui/pictures/year-lane.js';
import { Board } from '#src/ui/surfaces.js';
import { Table } from '#src/ui/table.js';
import { stripLines } from '../model/strip.js';
import type { StarDates } from './star-dates.js';
import { useStripSentence } from './strip-words.js';

export interface YearBoardProps {
  star: MarkerDetail;
  title: string;
  dates: StarDates;
  place: Place;
  yearStepper: React.ReactNode;
}

/** The year night by night, with today's peg, the meaning of its bands, and the table behind. */
export function YearBoard({ star, title, dates, place, yearStepper }: YearBoardProps) {
  const { t } = useTranslation(['stars', 'sky', 'common']);
  const isWide = useWideScreen();
  const sentence = useStripSentence(dates);
  const span = { first: star.firstDayNumber, last: star.lastDayNumber };
  const today = dayNumberOf(todayIn(place.timeZone));
  const hasToday = today >= span.first && today <= span.last;
  return (
    <Board title={t('star.strip')} beside={yearStepper}>
      <div className="grid grid-cols-[auto_minmax(0,1fr)] gap-x-3 text-small leading-tight">
        <div className="flex flex-col items-start justify-between" aria-hidden>
          <span className={hasToday ? 'mt-6.5 text-umber-soft' : 'text-umber-soft'}>{t('sky:dusk')}</span>
          <span className="text-ochre-ink">{t('sky:dawn')}</span>
        </div>
        <YearLane
          span={span}
          segments={star.strip}
          today={hasToday ? today : null}
          label={sentence(title, star.strip)}
        />
        <span />
        <MonthScale span={span} months={dates.months} />
      </div>
      <p className="mt-2 text-small text-umber-soft">
        {t('star.stripRead')} {hasToday && t('star.stripToday', { day: dates.dayAt(today) })}
      </p>
      {isWide ? (
        <div className="mt-3">
          <LaneKey />
        </div>
      ) : (
        <More label={t('sky:howToReadStrip')}>
          <LaneKey />
        </More>
      )}
      <div>
        <More label={t('common:showAsTable')} icon={<Table2 aria-hidden size={20} />}>
          <StripTable star={star} dates={dates} />
        </More>
      </div>
    </Board>
  );
}

function StripTable({ star, dates }: { star: MarkerDetail; dates: StarDates }) {
  const { t } = useTranslation(['stars', 'sky']);
  return (
    <Table
      caption={t('star.stripCaption', { year: dates.year })}
      captionForEars={false}
      className="max-w-measure"
    >
      <thead>
        <tr>
          <th scope="col">{t('star.stripFrom')}</th>
          <th scope="col">{t('star.stripTo')}</th>
          <th scope="col">{t('star.stripNights')}</th>
          <th scope="col">{t('star.stripWhat')}</th>
        </tr>
      </thead>
      <tbody>
        {stripLines(star.strip).map((line) => (
          <tr key={line.fromDayNumber}>
            <td>{dates.dayAt(line.fromDayNumber)}</td>
            <td>{dates.dayAt(line.toDayNumber)}</td>
            <td>{line.nights}</td>
            <td>{t(`sky:night.${line.state}`)}</td>
          </tr>
        ))}
      </tbody>
    </Table>
  );
}
