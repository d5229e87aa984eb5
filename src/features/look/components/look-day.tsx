import { ChevronLeft, ChevronRight } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import { addDays } from '#shared/kernel/iso-date.js';
import { WATCH_SIDES, type Phenomenon, type WatchSide } from '#shared/sky/vocabulary.js';
import { useDateWords } from '#src/lib/date-words.js';
import { IconButton } from '#src/ui/button.js';
import { DayPicker } from '#src/ui/day-picker.js';
import { More } from '#src/ui/fold.js';
import { PickGroup } from '#src/ui/pick.js';
import { FIRST_DAY, LAST_DAY, phenomenonOn } from '../model/look-address.js';

export interface LookDayProps {
  date: string;
  side: WatchSide;
  phenomenon: Phenomenon;
  onChange: (next: { phenomenon?: Phenomenon; date?: string }) => void;
}

/** Which morning or evening: one step back or on, any other day behind one key. */
export function LookDay({ date, side, phenomenon, onChange }: LookDayProps) {
  const { t } = useTranslation('look');
  const words = useDateWords();
  const step = (by: number) => {
    onChange({ date: addDays(date, by) });
  };
  return (
    <div className="look-day">
      <div className="look-day-row" role="group" aria-label={t('day.label')}>
        <IconButton
          label={t('day.previous')}
          icon={<ChevronLeft aria-hidden size={24} className="turns" />}
          closed={date <= FIRST_DAY}
          onClick={() => {
            step(-1);
          }}
        />
        <p className="look-day-words" aria-live="polite">
          {words.day(date, 'weekday')} {date.slice(0, 4)}
          <span className="block text-small text-umber-soft">{t(`side.${side}`)}</span>
        </p>
        <IconButton
          label={t('day.next')}
          icon={<ChevronRight aria-hidden size={24} className="turns" />}
          closed={date >= LAST_DAY}
          onClick={() => {
            step(1);
          }}
        />
      </div>
      <More label={t('day.pick')}>
        <div className="mt-2 grid gap-3">
          <PickGroup
            label={t('side.label')}
            labelForEars
            value={side}
            options={WATCH_SIDES.map((value) => ({ value, label: t(`side.${value}`) }))}
            onChange={(next) => {
              onChange({ phenomenon: phenomenonOn(next, phenomenon), date });
            }}
          />
          <DayPicker
            // Opens at the month of the day that is shown.
            key={date}
            label={t('day.label')}
            value={date}
            min={FIRST_DAY}
            max={LAST_DAY}
            onChange={(day) => {
              onChange({ date: day });
            }}
          />
        </div>
      </More>
    </div>
  );
}
