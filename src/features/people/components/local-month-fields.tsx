import { Plus, X } from 'lucide-react';
import { useRef } from 'react';
import { Controller, useFieldArray } from 'react-hook-form';
import { useTranslation } from 'react-i18next';
import { nextFreeDay } from '#shared/calendar/local-months.js';
import { LOCAL_MONTHS_MAX, LOCAL_NAME_MAX, MOON_NAMES } from '#shared/contracts/local-months.js';
import { useDateWords } from '#src/lib/date-words.js';
import { Button, IconButton } from '#src/ui/button.js';
import { TextField } from '#src/ui/field.js';
import { More } from '#src/ui/fold.js';
import { MonthDaySelect } from '#src/ui/month-day-select.js';
import { Board, Care } from '#src/ui/surfaces.js';
import type { SettingsPartProps } from './settings-fields.js';

/** A year without a 29 February. */
const ORDINARY_YEAR = 2027;

/** What the village calls the parts of its year; the server keeps them in the order of the village's year. */
export function LocalMonthFields({ form, at }: SettingsPartProps) {
  const { t } = useTranslation('people');
  const months = useDateWords().months(ORDINARY_YEAR);
  const { fields, append, remove } = useFieldArray({ control: form.control, name: 'localMonths' });
  const lang = form.getValues('villageLanguage.tag');
  const more = useRef<HTMLButtonElement>(null);
  const ofRows = fields.map((_, index) => ({
    name: at(`localMonths.${index}.name`),
    begins: at(`localMonths.${index}.begins`),
  }));
  const ofAll = ofRows.some(({ name, begins }) => name ?? begins) ? undefined : at('localMonths');
  return (
    <Board title={t('settings.localMonths')}>
      <div className="grid gap-4">
        <p className="text-umber-soft">{t('settings.monthsHint')}</p>
        {ofAll !== undefined && (
          <Care blocked>
            <p>{ofAll}</p>
          </Care>
        )}
        {fields.length > 0 && (
          <ol className="grid gap-4">
            {fields.map(({ id }, index) => (
              <li
                key={id}
                className="grid grid-cols-[minmax(0,1fr)_auto] gap-x-2 gap-y-2 border-b border-hairline pb-4 wide:grid-cols-[minmax(0,1fr)_16rem_auto]"
              >
                <TextField
                  {...form.register(`localMonths.${index}.name`)}
                  label={t('settings.monthName', { nth: index + 1 })}
                  problem={ofRows[index]?.name}
                  maxLength={LOCAL_NAME_MAX}
                  autoComplete="off"
                  lang={lang}
                />
                <div className="col-span-2 row-start-2 wide:col-span-1 wide:col-start-2 wide:row-start-1">
                  <Controller
                    control={form.control}
                    name={`localMonths.${index}.begins`}
                    render={({ field }) => (
                      <MonthDaySelect
                        label={t('settings.monthBegins')}
                        value={field.value}
                        onChange={field.onChange}
                        months={months}
                        problem={ofRows[index]?.begins}
                      />
                    )}
                  />
                </div>
                <div className="pt-7">
                  <IconButton
                    label={t('settings.monthOut', { nth: index + 1 })}
                    icon={<X aria-hidden size={22} />}
                    onClick={() => {
                      remove(index);
                      more.current?.focus();
                    }}
                  />
                </div>
              </li>
            ))}
          </ol>
        )}
        {fields.length < LOCAL_MONTHS_MAX && (
          <div>
            <Button
              ref={more}
              look="quiet"
              icon={<Plus aria-hidden size={20} />}
              onClick={() => {
                const { localMonths, yearStart } = form.getValues();
                const taken = localMonths.map(({ begins }) => begins);
                append({ name: '', begins: nextFreeDay(taken, yearStart.date) });
              }}
            >
              {t('settings.monthMore')}
            </Button>
          </div>
        )}
      </div>
    </Board>
  );
}

/** Names for the Moons as the village counts them. */
export function MoonNameFields({ form, at }: SettingsPartProps) {
  const { t } = useTranslation('people');
  const lang = form.getValues('villageLanguage.tag');
  return (
    <Board title={t('settings.moonNames')}>
      <p className="mb-2 text-umber-soft">{t('settings.moonsHint')}</p>
      <More label={t('settings.moonsShow')}>
        <div className="mt-2 grid gap-4 mid:grid-cols-2">
          {Array.from({ length: MOON_NAMES }, (_, index) => (
            <TextField
              key={index}
              {...form.register(`moonNames.${index}`)}
              label={t('settings.moonName', { nth: index + 1 })}
              problem={at(`moonNames.${index}`)}
              maxLength={LOCAL_NAME_MAX}
              autoComplete="off"
              lang={lang}
            />
          ))}
        </div>
      </More>
    </Board>
  );
}
