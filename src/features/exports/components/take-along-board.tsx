import { CalendarDays, Printer, Table } from 'lucide-react';
import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { exportsEndpoints } from '#shared/contracts/exports.js';
import { apiUrl } from '#src/lib/api-client.js';
import { paths } from '#src/lib/paths.js';
import { TableLanguageField, useTableLanguage } from '#src/lib/table-language.js';
import { ButtonAnchor, ButtonLink } from '#src/ui/button.js';
import { SelectField } from '#src/ui/field.js';
import { Board } from '#src/ui/surfaces.js';
import { TakeWhole } from './take-whole.js';

const REMINDERS = ['none', '0', '1', '3', '7', '14'] as const;
type Reminder = (typeof REMINDERS)[number];

interface TakeAlongBoardProps {
  calendarId: string;
  /** A submission, or `draft`. */
  number: number | 'draft';
  /** Anything but published says in every file that it is not. */
  isPublished: boolean;
}

/** The ways in which a calendar leaves the house as a file. */
export function TakeAlongBoard({ calendarId, number, isPublished }: TakeAlongBoardProps) {
  const { t } = useTranslation('exports');
  const [reminder, setReminder] = useState<Reminder>('none');
  const tableLanguage = useTableLanguage();
  const params = { calendarId, number: String(number) };
  const icsQuery = reminder === 'none' ? {} : { alarmDays: Number(reminder) };
  return (
    <Board title={t('along.title')}>
      <p className="text-small">{t('along.what')}</p>
      {!isPublished && <p className="mt-1 text-small">{t('along.notPublished')}</p>}
      <div className="mt-3 grid gap-4">
        <ButtonLink to={paths.sheet(calendarId, { number })} icon={<Printer aria-hidden size={20} />}>
          {t('along.sheet')}
        </ButtonLink>
        <div className="grid gap-2">
          <SelectField
            label={t('along.reminder')}
            value={reminder}
            onChange={(event) => {
              setReminder(REMINDERS.find((each) => each === event.currentTarget.value) ?? 'none');
            }}
          >
            {REMINDERS.map((each) => (
              <option key={each} value={each}>
                {each === 'none' ? t('along.noReminder') : t('along.daysAhead', { count: Number(each) })}
              </option>
            ))}
          </SelectField>
          <ButtonAnchor
            href={apiUrl(exportsEndpoints.ics, { params, query: icsQuery })}
            download
            icon={<CalendarDays aria-hidden size={20} />}
          >
            {t('along.ics')}
          </ButtonAnchor>
        </div>
        <div className="grid gap-2">
          <TableLanguageField
            label={t('along.csvLanguage')}
            unreadHint={t('along.csvUnread')}
            {...tableLanguage}
          />
          <ButtonAnchor
            href={apiUrl(exportsEndpoints.csv, { params, query: { language: tableLanguage.value } })}
            download
            icon={<Table aria-hidden size={20} />}
          >
            {t('along.csv')}
          </ButtonAnchor>
        </div>
        <TakeWhole params={params} />
      </div>
    </Board>
  );
}
