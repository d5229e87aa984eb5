import { useTranslation } from 'react-i18next';
import { Link } from 'react-router-dom';
import { CALENDAR_FIRST_YEAR, CALENDAR_LAST_YEAR } from '#shared/contracts/calendars.js';
import type { OccurrenceDetail } from '#shared/contracts/stars.js';
import type { Phenomenon } from '#shared/sky/vocabulary.js';
import { dayNumberOf, todayIn } from '#src/lib/days.js';
import { paths } from '#src/lib/paths.js';
import { endOfNight } from '#src/lib/sky-words.js';
import { ButtonLink } from '#src/ui/button.js';
import { PhenomenonIcon } from '#src/ui/icons/phenomenon-icon.js';
import { RingRow } from '#src/ui/pictures/ring-row.js';
import { Board } from '#src/ui/surfaces.js';
import { rowAround } from '../model/strip.js';
import { DayNotes } from './day-notes.js';
import type { FourDaysProps } from './four-days.js';
import type { StarDates } from './star-dates.js';

/** One of the four days: the date with its range, rings with a bracket, what it means and where to look. */
export function DateCard({
  star,
  dates,
  place,
  mayTie,
  phenomenon,
}: FourDaysProps & { phenomenon: Phenomenon }) {
  const { t } = useTranslation(['stars', 'sky']);
  const { outcome } = star.phenomena[phenomenon];
  const occurrences = star.details[phenomenon];
  return (
    <Board
      level={3}
      className="flex flex-col"
      title={
        <span className="flex items-center gap-2 text-body leading-snug text-umber-soft">
          <PhenomenonIcon phenomenon={phenomenon} size={28} />
          {t(`sky:phenomenonTitle.${phenomenon}`)}
        </span>
      }
    >
      {outcome !== 'dated' && <p>{t(`star.noDay.${outcome}`, { year: dates.year })}</p>}
      {occurrences.map((occurrence, index) => (
        <div key={occurrence.expected.dayNumber} className={index > 0 ? 'mt-4' : undefined}>
          {index > 0 && <p className="text-small text-umber-soft">{t('star.secondTime')}</p>}
          <OneDay
            occurrence={occurrence}
            phenomenon={phenomenon}
            dates={dates}
            today={dayNumberOf(todayIn(place.timeZone))}
          />
          <DayNotes star={star} occurrence={occurrence} phenomenon={phenomenon} dates={dates} />
          {isInCalendarYears(star.year) && (
            <Link
              className="mt-1 inline-flex min-h-12 items-center"
              to={paths.look({
                marker: star.markerKey,
                phenomenon,
                date: occurrence.expected.gregorian,
                placeId: place.id,
              })}
            >
              {t('star.whereOnDay')}
            </Link>
          )}
        </div>
      ))}
      <p className="mt-2 text-small text-umber-soft">{t(`sky:trade.${phenomenon}`)}</p>
      {mayTie && outcome === 'dated' && (
        <div className="mt-auto pt-1">
          {occurrences.map(({ expected }, index) => (
            <ButtonLink
              key={expected.dayNumber}
              look="quiet"
              className="-ms-2"
              to={paths.calendars({
                marker: star.markerKey,
                phenomenon,
                occurrence: index === 0 ? undefined : index + 1,
              })}
            >
              {t(index === 0 ? 'star.tieThis' : 'star.tieSecond')}
            </ButtonLink>
          ))}
        </div>
      )}
    </Board>
  );
}

/** People go out on days of these years; for others the four days are enough. */
function isInCalendarYears(year: number): boolean {
  return year >= CALENDAR_FIRST_YEAR && year <= CALENDAR_LAST_YEAR;
}

interface OneDayProps {
  occurrence: OccurrenceDetail;
  phenomenon: Phenomenon;
  dates: StarDates;
  today: number;
}

function OneDay({ occurrence, phenomenon, dates, today }: OneDayProps) {
  const { t } = useTranslation(['stars', 'sky']);
  const { expected, early, late } = occurrence;
  const side = endOfNight(phenomenon);
  const row = rowAround(early?.dayNumber ?? null, expected.dayNumber, late?.dayNumber ?? null);
  return (
    <>
      <p className="text-part leading-tight">
        {t(side === 'dawn' ? 'star.morningOf' : 'star.eveningOf', { day: dates.day(expected) })}
      </p>
      <p className="mb-2">{dates.between(occurrence)}</p>
      {row !== null && (
        <>
          <RingRow
            span={row}
            today={today}
            ranges={[
              {
                key: phenomenon,
                early: early?.dayNumber ?? null,
                expected: expected.dayNumber,
                late: late?.dayNumber ?? null,
                side,
              },
            ]}
            label={t('star.rangeSentence', {
              phenomenon: t(`sky:phenomenonTitle.${phenomenon}`),
              about: dates.aboutBetween(occurrence),
            })}
          />
          <div className="picture mb-1 flex justify-between text-small text-umber-soft" aria-hidden>
            <span>{dates.dayBeside(expected, row.first)}</span>
            <span>{dates.dayBeside(expected, row.last)}</span>
          </div>
        </>
      )}
    </>
  );
}
