import { CalendarPlus } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import { Link, useNavigate } from 'react-router-dom';
import { CALENDAR_LAST_YEAR, type Calendar } from '#shared/contracts/calendars.js';
import { paths } from '#src/lib/paths.js';
import { SureButton } from '#src/lib/sure-button.js';
import { useToast } from '#src/ui/toast.js';
import { useRollOver } from '../api/rollovers-queries.js';

interface NextYearProps {
  calendar: Calendar;
  calendars: readonly Calendar[];
  isOfficer: boolean;
}

/** On a calendar's card: begin the next year from it, or open that; and what changed where it was begun so. */
export function NextYear({ calendar, calendars, isOfficer }: NextYearProps) {
  const { t } = useTranslation('rollovers');
  const { id, placeId, year, rolledFromYear } = calendar;
  const next = calendars.find((each) => each.placeId === placeId && each.year === year + 1);
  return (
    <>
      {rolledFromYear !== undefined && (
        <Link className="link-line" to={paths.rollover(id)}>
          {t('next.report', { from: rolledFromYear, year })}
        </Link>
      )}
      {isOfficer && next === undefined && year < CALENDAR_LAST_YEAR && <Begin calendar={calendar} />}
      {isOfficer && next !== undefined && (
        <Link className="link-line" to={paths.calendar(next.id)}>
          {t('next.open', { year: next.year })}
        </Link>
      )}
    </>
  );
}

function Begin({ calendar: { id, year: from } }: { calendar: Calendar }) {
  const { t } = useTranslation('rollovers');
  const navigate = useNavigate();
  const say = useToast();
  const roll = useRollOver(id);
  const year = from + 1;
  return (
    <SureButton
      label={t('next.begin', { year })}
      look="quiet"
      icon={<CalendarPlus aria-hidden size={20} />}
      question={t('next.question', { year, from })}
      what={
        <>
          <p>{t('next.keeps', { year })}</p>
          <p className="mt-2">{t('next.nothingAgreed', { year, from })}</p>
        </>
      }
      yes={t('next.yes', { year })}
      act={async () => {
        const { calendarId, hasReport } = await roll.mutateAsync();
        say(t('next.done', { year }));
        void navigate(hasReport ? paths.rollover(calendarId) : paths.calendar(calendarId));
      }}
    />
  );
}
