import { useTranslation } from 'react-i18next';
import { TickField } from '#src/ui/field.js';
import { MonthDayFields } from '#src/lib/month-day-fields.js';
import { AreaField, LineField } from '#src/ui/said-fields.js';
import { RecordMore, setRecord, type RecordProps } from './record-parts.js';

const PEOPLE = ['responsible', 'helpers', 'decides', 'owns'] as const;
const RULES = ['inputs', 'ifEarly', 'ifLaterStill'] as const;

/** Who does it with what, and what to do where the year is early or late. */
export function RecordWork({ form }: RecordProps) {
  const { t } = useTranslation('record');
  const { work } = form.draft.record;
  const at = (field: string) => form.at(`record.work.${field}`);
  return (
    <RecordMore>
      <div className="grid gap-4 @min-[34rem]:grid-cols-2">
        {PEOPLE.map((field) => (
          <LineField
            key={field}
            label={t(field)}
            value={work[field]}
            problem={at(field)}
            onChange={(value) => setRecord(form, 'work', { [field]: value })}
          />
        ))}
      </div>
      {RULES.map((field) => (
        <AreaField
          key={field}
          label={t(field)}
          value={work[field]}
          problem={at(field)}
          onChange={(value) => setRecord(form, 'work', { [field]: value })}
        />
      ))}
      <StopFields form={form} />
      <LineField
        label={t('askWhom')}
        value={work.askWhom}
        problem={at('askWhom')}
        onChange={(askWhom) => setRecord(form, 'work', { askWhom })}
      />
    </RecordMore>
  );
}

const FIRST_STOP = { date: { month: 1, day: 1 }, source: '' };

/** The day after which nothing is begun any more, as the responsible office set it. */
function StopFields({ form }: RecordProps) {
  const { t } = useTranslation('record');
  const { stop } = form.draft.record.work;
  const at = (field: string) => form.at(`record.work.stop.${field}`);
  return (
    <div className="grid gap-3">
      <TickField
        label={t('hasStop')}
        checked={stop !== null}
        onChange={(event) =>
          setRecord(form, 'work', { stop: event.currentTarget.checked ? FIRST_STOP : null })
        }
      />
      {stop !== null && (
        <div className="grid gap-4 border-s-4 border-hairline ps-4 @min-[34rem]:grid-cols-2">
          <MonthDayFields
            label={t('stop')}
            value={stop.date}
            problem={at('date.day')}
            onChange={(date) => setRecord(form, 'work', { stop: { ...stop, date } })}
          />
          <LineField
            label={t('stopSource')}
            value={stop.source}
            problem={at('source')}
            onChange={(source) => setRecord(form, 'work', { stop: { ...stop, source } })}
          />
        </div>
      )}
    </div>
  );
}
