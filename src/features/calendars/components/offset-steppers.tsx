import { ChevronLeft, ChevronRight } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import { OFFSET_MAX_DAYS, type EntryOffsets, type EntryWindow } from '#shared/contracts/calendars.js';
import { useDateWords } from '#src/lib/date-words.js';
import { signed } from '#src/lib/signed.js';
import { Button } from '#src/ui/button.js';
import { Stepper } from '#src/ui/stepper.js';
import { leadDayNumber, type FormState } from '../model/form-state.js';
import { OFFSETS, shifted } from '../model/offsets.js';

const LABELS = {
  earliestDays: 'days.earliest',
  bestFromDays: 'days.bestFrom',
  bestToDays: 'days.bestTo',
  lastAdvisedDays: 'days.lastAdvised',
} as const satisfies Record<keyof EntryOffsets, string>;

const POINTS = {
  earliestDays: 'earliest',
  bestFromDays: 'bestFrom',
  bestToDays: 'bestTo',
  lastAdvisedDays: 'lastAdvised',
} as const satisfies Record<keyof EntryOffsets, keyof EntryWindow>;

/** Four days, each stepped away from the leading day, with the date it comes to. */
export function OffsetSteppers({ form }: { form: FormState }) {
  const { t } = useTranslation('calendars');
  const dates = useDateWords();
  const { draft, change, at, content } = form;
  const lead = leadDayNumber(form);
  const isFixedLast = form.dates?.window?.lastAdvisedBy === 'fixed';
  // Where the last date cuts the window, the cut day is what counts, not the day that was stepped to.
  const dateOf = (name: keyof EntryOffsets) => {
    const window = form.dates?.window;
    if (window) return dates.day(window[POINTS[name]]);
    return lead === null ? '' : dates.day(lead + draft.offsets[name]);
  };
  return (
    <div className="grid gap-3">
      <div className="grid gap-3 @min-[26rem]:grid-cols-2 @min-[43rem]:grid-cols-4">
        {OFFSETS.map((name) => (
          <Stepper
            key={name}
            label={
              <>
                {t(LABELS[name])} <strong>{dateOf(name)}</strong>
              </>
            }
            value={draft.offsets[name]}
            min={-OFFSET_MAX_DAYS}
            max={OFFSET_MAX_DAYS}
            bigStep={7}
            format={(days) => t('form.stepDays', { count: Math.abs(days), days: signed(days) })}
            problem={at(`offsets.${name}`)}
            hint={
              name === 'lastAdvisedDays' && isFixedLast
                ? t('form.fixedLast', { source: content.lastDate?.source ?? '' })
                : undefined
            }
            onChange={(days) => {
              change((now) => ({ offsets: { ...now.offsets, [name]: days } }));
            }}
          />
        ))}
      </div>
      <div className="flex flex-wrap gap-2">
        <Button
          icon={<ChevronLeft aria-hidden className="turns" size={20} />}
          onClick={() => {
            change((now) => ({ offsets: shifted(now.offsets, -1) }));
          }}
        >
          {t('form.wholeEarlier')}
        </Button>
        <Button
          icon={<ChevronRight aria-hidden className="turns" size={20} />}
          onClick={() => {
            change((now) => ({ offsets: shifted(now.offsets, 1) }));
          }}
        >
          {t('form.wholeLater')}
        </Button>
      </div>
    </div>
  );
}
