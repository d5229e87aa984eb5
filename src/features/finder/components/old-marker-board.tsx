import { useTranslation } from 'react-i18next';
import type { FinderAnswer, OldMarkerNow } from '#shared/contracts/finder.js';
import { useDateWords } from '#src/lib/date-words.js';
import { markerName } from '#src/lib/marker-names.js';
import { endOfNight } from '#src/lib/sky-words.js';
import { PhenomenonIcon } from '#src/ui/icons/phenomenon-icon.js';
import { Board } from '#src/ui/surfaces.js';

interface OldMarkerBoardProps {
  old: OldMarkerNow;
  wanted: FinderAnswer['wanted'];
}

/** From this year on people wrote Gregorian dates; before it Julian ones. */
const FIRST_GREGORIAN_YEAR = 1583;

/** What the sign that people used to go by has become: its day of old, its day now, and how far it moved. */
export function OldMarkerBoard({ old, wanted }: OldMarkerBoardProps) {
  const { t } = useTranslation(['finder', 'sky']);
  const dates = useDateWords();
  const dayOf = ({ days }: OldMarkerNow['then']) =>
    days &&
    t(endOfNight(old.phenomenon) === 'dawn' ? 'old.dawn' : 'old.dusk', {
      about: dates.aboutWithin(
        days.expected.gregorian,
        days.early?.gregorian ?? null,
        days.late?.gregorian ?? null,
      ),
    });
  const why = ({ outcome, phenomenonOutcome }: OldMarkerNow['then']) =>
    t(`old.why.${outcome === 'rises-and-sets' ? whyNoDay(phenomenonOutcome) : outcome}`);
  const { then, now, movedDays } = old;
  return (
    <Board title={t('old.title')}>
      <p className="flex items-center gap-3">
        <PhenomenonIcon phenomenon={old.phenomenon} size={32} />
        <strong>
          {markerName(old)}, {t(`sky:phenomenon.${old.phenomenon}`)}
        </strong>
      </p>
      <dl className="facts mt-2">
        {[then, now].map((each) => (
          <div key={each.year} className="contents">
            <dt>{t('old.inYear', { year: dates.year(each.year) })}</dt>
            <dd>
              {dayOf(each) ??
                t(each === then ? 'old.noDayThen' : 'old.noDayNow', {
                  year: dates.year(each.year),
                  why: why(each),
                })}
            </dd>
          </div>
        ))}
      </dl>
      {then.days !== null && then.year < FIRST_GREGORIAN_YEAR && (
        <p className="mt-2 text-small text-umber-soft">
          {t('old.julian', { day: dates.day(julianAsWritten(then.days.expected.julian)) })}
        </p>
      )}
      {movedDays !== null && (
        <p className="mt-2">
          <strong>
            {movedDays === 0
              ? t('old.movedNone')
              : t(movedDays > 0 ? 'old.movedLater' : 'old.movedEarlier', { count: Math.abs(movedDays) })}
          </strong>
        </p>
      )}
      {wanted !== null && then.days !== null && (
        <p className="mt-2">
          {t('old.nowOnIt', { day: dates.range(wanted.from.gregorian, wanted.to.gregorian) })}
        </p>
      )}
    </Board>
  );
}

function whyNoDay(outcome: OldMarkerNow['then']['phenomenonOutcome']) {
  return outcome === 'never-dark-enough' ? outcome : 'none-in-this-year';
}

/** The browser's calendar is Gregorian throughout: a Julian day is laid onto a leap year round 2000 to be written out. */
function julianAsWritten(date: string): string {
  return `2000${date.slice(-6)}`;
}
