import { useTranslation } from 'react-i18next';
import { actualDaysInput, type ActualDaysInput } from '#shared/contracts/actual-days.js';
import type { Entry } from '#shared/contracts/calendars.js';
import { useDateWords } from './date-words.js';
import { useWrittenForm } from './written-form.js';
import { Button } from '#src/ui/button.js';
import { TextField } from '#src/ui/field.js';
import { More } from '#src/ui/fold.js';
import { useToast } from '#src/ui/toast.js';
import { useActualDays } from './use-actual-days.js';
import { LineField } from '#src/ui/said-fields.js';

interface ActualDaysPanelProps {
  calendarId: string;
  year: number;
  entry: Pick<Entry, 'id' | 'actual'>;
}

const NOTHING: ActualDaysInput = { from: '', to: null, saidBy: '', plots: '' };

/** When the work was really done this year: said by somebody, typed by whoever writes. It waits for no submission. */
export function ActualDaysPanel({ calendarId, year, entry }: ActualDaysPanelProps) {
  const { t } = useTranslation(['anchors', 'common']);
  const dates = useDateWords();
  const say = useToast();
  const { put, remove } = useActualDays(calendarId, entry.id);
  const { actual } = entry;
  const start = actual ? inputOf(actual) : NOTHING;
  const { written, set, at, checked, refuse } = useWrittenForm<ActualDaysInput>(actualDaysInput, start);
  const sayRefusal = (cause: unknown) => {
    const refusal = refuse(cause);
    if (refusal !== null) say(refusal);
  };
  const save = () => {
    const input = checked();
    if (input === null) return;
    put.mutate(input, {
      onError: sayRefusal,
      onSuccess: () => {
        say(t('actual.saved'));
      },
    });
  };
  const days = actual && (actual.to === null ? dates.day(actual.from) : dates.range(actual.from, actual.to));
  return (
    <section className="mt-3 grid gap-2">
      <h3 className="text-body text-umber-soft">{t('actual.title')}</h3>
      <p>
        {actual
          ? t(actual.plots === '' ? 'actual.said' : 'actual.saidPlots', {
              ...actual,
              days: days ?? '',
              when: dates.moment(actual.typedAt),
            })
          : t('actual.nothing')}
      </p>
      <More label={t(actual ? 'actual.change' : 'actual.write')}>
        <div className="mt-3 grid gap-4">
          <div className="grid gap-4 @min-[34rem]:grid-cols-2">
            {(['from', 'to'] as const).map((field) => (
              <TextField
                key={field}
                type="date"
                label={t(`actual.${field}`)}
                min={`${year - 1}-01-01`}
                max={`${year + 1}-12-31`}
                value={written[field] ?? ''}
                problem={at(field)}
                onChange={(event) => {
                  const day = event.currentTarget.value;
                  set(field === 'from' ? { from: day } : { to: day === '' ? null : day });
                }}
              />
            ))}
            {(['saidBy', 'plots'] as const).map((field) => (
              <LineField
                key={field}
                label={t(`actual.${field}`)}
                value={written[field]}
                problem={at(field)}
                onChange={(value) => {
                  set({ [field]: value });
                }}
              />
            ))}
          </div>
          <div className="flex flex-wrap gap-3">
            <Button busy={put.isPending} onClick={save}>
              {t('actual.save')}
            </Button>
            {actual && (
              <Button
                look="quiet"
                busy={remove.isPending}
                onClick={() => {
                  remove.mutate(undefined, {
                    onError: sayRefusal,
                    onSuccess: () => {
                      set(NOTHING);
                      say(t('actual.removed'));
                    },
                  });
                }}
              >
                {t('actual.remove')}
              </Button>
            )}
          </div>
        </div>
      </More>
    </section>
  );
}

function inputOf({ from, to, saidBy, plots }: NonNullable<Entry['actual']>): ActualDaysInput {
  return { from, to, saidBy, plots };
}
