import { useQuery } from '@tanstack/react-query';
import { useMemo } from 'react';
import { useTranslation } from 'react-i18next';
import { CALENDAR_FIRST_YEAR, CALENDAR_LAST_YEAR } from '#shared/contracts/calendars.js';
import { FIRST_YEAR, PHENOMENA, type Phenomenon } from '#shared/sky/vocabulary.js';
import { useDateWords } from '#src/lib/date-words.js';
import { markerName } from '#src/lib/marker-names.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { readYear } from '#src/lib/civil-year.js';
import { ComboField } from '#src/ui/combo-field.js';
import { SelectField, TickField } from '#src/ui/field.js';
import { MonthDaySelect } from '#src/ui/month-day-select.js';
import { PickGroup } from '#src/ui/pick.js';
import { Stepper } from '#src/ui/stepper.js';
import { Board } from '#src/ui/surfaces.js';
import { Skeleton, TroubleNote } from '#src/ui/waiting.js';
import { markerNamesQuery } from '../api/finder-queries.js';
import type { Question } from '../model/finder-question.js';

export interface QuestionBoardProps {
  question: Question;
  placeId: string;
  onChange: (patch: Partial<Question>) => void;
}

/** Any year without a 29 February: a yearly date exists every year. */
const PLAIN_YEAR = 2027;
/** The stretch that a person gets who ticks "any of several days". */
const FIRST_STRETCH_DAYS = 10;

/** The one question: a day or some days, or an old sign and since when. The answer follows while it is asked. */
export function QuestionBoard(props: QuestionBoardProps) {
  const { question, placeId, onChange } = props;
  const { t } = useTranslation('finder');
  // Asked for at once: whoever turns to an old sign types its name in the next moment.
  useQuery(markerNamesQuery(placeId));
  return (
    <Board className="grid gap-4" aria-label={t('ask.label')}>
      <PickGroup
        label={t('ask.way')}
        stacked
        value={question.way}
        onChange={(way) => {
          onChange({ way });
        }}
        options={[
          { value: 'day', label: t('ask.day'), note: t('ask.dayNote') },
          { value: 'old', label: t('ask.old'), note: t('ask.oldNote') },
        ]}
      />
      {question.way === 'day' ? <DayFields {...props} /> : <OldFields {...props} />}
      <Stepper
        label={t('ask.year')}
        value={question.year}
        min={CALENDAR_FIRST_YEAR}
        max={CALENDAR_LAST_YEAR}
        onChange={(year) => {
          onChange({ year, since: Math.min(question.since, year - 1) });
        }}
      />
      <PickGroup
        label={t('ask.show')}
        value={question.show}
        onChange={(show) => {
          onChange({ show });
        }}
        options={[
          { value: 'easy', label: t('ask.easy') },
          { value: 'all', label: t('ask.all') },
        ]}
      />
    </Board>
  );
}

function DayFields({ question, onChange }: QuestionBoardProps) {
  const { t } = useTranslation('finder');
  const months = useDateWords().months(PLAIN_YEAR);
  const { from, to } = question;
  return (
    <div className="grid gap-3">
      <MonthDaySelect
        label={t('ask.begin')}
        months={months}
        value={from}
        onChange={(next) => {
          onChange({ from: next });
        }}
      />
      <TickField
        label={t('ask.span')}
        checked={to !== null}
        onChange={(event) => {
          onChange({ to: event.currentTarget.checked ? later(from, months) : null });
        }}
      />
      {to !== null && (
        <MonthDaySelect
          label={t('ask.end')}
          months={months}
          value={to}
          onChange={(next) => {
            onChange({ to: next });
          }}
        />
      )}
    </div>
  );
}

function OldFields({ question, placeId, onChange }: QuestionBoardProps) {
  const { t } = useTranslation(['finder', 'sky']);
  const words = useDateWords();
  const problems = useProblemWords();
  const { data, error, refetch } = useQuery(markerNamesQuery(placeId));
  const options = useMemo(
    () =>
      (data ?? []).map((names) => {
        const name = markerName(names);
        const second = names.kind === 'star' && names.designation !== name ? ` (${names.designation})` : '';
        return { id: names.markerKey, text: name + second };
      }),
    [data],
  );
  return (
    <div className="grid gap-3">
      {/* The field takes its options once, so it waits for them; nothing can be typed before and lost. */}
      {data !== undefined ? (
        <ComboField
          label={t('ask.oldMarker')}
          hint={t('ask.oldMarkerHint')}
          options={options}
          value={question.oldMarker}
          onChange={(oldMarker) => {
            onChange({ oldMarker });
          }}
        />
      ) : error === null ? (
        <Skeleton lines={2} />
      ) : (
        <TroubleNote
          title={t('ask.namesTrouble')}
          sentence={problems.problem(error)}
          onRetry={() => {
            void refetch();
          }}
        />
      )}
      <SelectField
        label={t('ask.its')}
        value={question.oldPhenomenon}
        onChange={(event) => {
          onChange({ oldPhenomenon: event.currentTarget.value as Phenomenon });
        }}
      >
        {PHENOMENA.map((phenomenon) => (
          <option key={phenomenon} value={phenomenon}>
            {t(`sky:phenomenonTitle.${phenomenon}`)}
          </option>
        ))}
      </SelectField>
      <Stepper
        label={t('ask.since')}
        hint={t('ask.sinceHint')}
        value={question.since}
        min={FIRST_YEAR}
        max={question.year - 1}
        step={10}
        bigStep={100}
        format={words.year}
        read={readYear}
        onChange={(since) => {
          onChange({ since });
        }}
      />
    </div>
  );
}

function later({ month, day }: Question['from'], months: readonly { days: number }[]): Question['from'] {
  const days = months[month - 1]?.days ?? 31;
  const next = day + FIRST_STRETCH_DAYS;
  return next <= days ? { month, day: next } : { month: (month % 12) + 1, day: next - days };
}
