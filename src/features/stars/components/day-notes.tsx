import { Trans, useTranslation } from 'react-i18next';
import type { MarkerDetail, OccurrenceDetail } from '#shared/contracts/stars.js';
import type { Phenomenon } from '#shared/sky/vocabulary.js';
import { compassPoint, endOfNight } from '#src/lib/sky-words.js';
import type { StarDates } from './star-dates.js';

export interface DayNotesProps {
  star: MarkerDetail;
  occurrence: OccurrenceDetail;
  phenomenon: Phenomenon;
  dates: StarDates;
}

/** Below it a skyline is as good as level: half a finger at arm's length. */
const LEVEL_DEG = 0.5;

/** What to know about one day: where and when to look, what it means, what is in it. One sentence a line. */
export function DayNotes(props: DayNotesProps) {
  const { star, occurrence, phenomenon } = props;
  const { t } = useTranslation('stars');
  const notes = [...occurrence.notes, ...star.notes.filter((note) => note !== 'never-disappears')];
  return (
    <div className="grid gap-1.5 text-small leading-snug">
      <WhereToLook {...props} />
      <p>{t(`star.meaning.${phenomenon}`)}</p>
      <Hidden {...props} />
      <HillEffect {...props} />
      {occurrence.clarity !== 'ordinary' && <p>{t(`star.air.${occurrence.clarity}`)}</p>}
      {notes.map((note) => (
        <p key={note}>{t(`star.note.${note}`)}</p>
      ))}
    </div>
  );
}

function WhereToLook({ occurrence, phenomenon }: DayNotesProps) {
  const { t } = useTranslation(['stars', 'sky']);
  const { expected, stopLookingAt, startLookingAt } = occurrence;
  const isRising = phenomenon === 'heliacal-rising' || phenomenon === 'acronychal-rising';
  const isDawn = endOfNight(phenomenon) === 'dawn';
  const where = {
    compass: t(`sky:compass.${compassPoint(expected.starAzimuthDeg)}`),
    azimuth: Math.round(expected.starAzimuthDeg) % 360,
    altitude: Math.round(expected.starAltitudeDeg * 2) / 2,
  };
  const time = isDawn ? stopLookingAt : startLookingAt;
  return (
    <>
      <p>
        {t(Math.abs(expected.starAltitudeDeg) < LEVEL_DEG ? 'star.lookLevel' : 'star.look', where)}{' '}
        {t(isRising ? 'star.comesUpAt' : 'star.goesDownAt', { time: expected.localTime })}
      </p>
      {time !== null && (
        <p>
          <Trans
            t={t}
            i18nKey={isDawn ? 'star.stopAt' : 'star.startAt'}
            values={{ time }}
            components={{ 1: <strong /> }}
          />
        </p>
      )}
    </>
  );
}

function Hidden({ star, phenomenon }: DayNotesProps) {
  const { t } = useTranslation('stars');
  const isHiding = star.nightsHidden !== null && !star.notes.includes('never-disappears');
  if (!isHiding) return null;
  const count = star.nightsHidden ?? 0;
  if (phenomenon === 'heliacal-setting') return <p>{t('star.thenHidden', { count })}</p>;
  return phenomenon === 'heliacal-rising' ? <p>{t('star.afterHidden', { count })}</p> : null;
}

/** "Two days later" than over flat ground. */
function HillEffect({ occurrence, dates }: DayNotesProps) {
  const { t } = useTranslation('stars');
  const flat = occurrence.flatExpected;
  if (flat === null) return null;
  const days = occurrence.expected.dayNumber - flat.dayNumber;
  if (days === 0) return <p>{t('star.flatSame')}</p>;
  const day = dates.day(flat);
  return <p>{t(days > 0 ? 'star.flatLater' : 'star.flatEarlier', { day, count: Math.abs(days) })}</p>;
}
