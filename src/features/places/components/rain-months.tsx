import { useTranslation } from 'react-i18next';
import { useDateWords } from '#src/lib/date-words.js';
import { listWords } from '#src/lib/list-words.js';
import { SignIcon } from '#src/ui/icons/drawn-icon.js';

interface RainMonthsProps {
  rainMonths: readonly boolean[];
  onChange?: ((next: boolean[]) => void) | undefined;
}

/** Names of the months are those of any year. */
const ANY_YEAR = 2027;

/** Months in which rain and cloud usually hide the sky: one sentence to read, twelve switches with `onChange`. */
export function RainMonths({ rainMonths, onChange }: RainMonthsProps) {
  const { t, i18n } = useTranslation('places');
  const months = useDateWords().months(ANY_YEAR);
  if (onChange === undefined) {
    const named = months.filter((_, index) => rainMonths[index]).map(({ long }) => long);
    return (
      <p>
        {named.length === 0 ? t('rain.none') : t('rain.months', { months: listWords(named, i18n.language) })}
      </p>
    );
  }
  return (
    <ul id="place-rainMonths" tabIndex={-1} className="grid grid-cols-4 gap-1 mid:grid-cols-6">
      {months.map((month, index) => {
        const isWet = rainMonths[index] ?? false;
        return (
          <li key={month.dayNumber}>
            <button
              type="button"
              aria-pressed={isWet}
              aria-label={month.long}
              className={`flex min-h-14 w-full flex-col items-center justify-end gap-1 rounded-board border-(length:--line-control) border-edge p-1.5 text-center text-small leading-tight ${isWet ? 'bg-indigo-pale' : ''}`}
              onClick={() => {
                onChange(rainMonths.map((each, at) => (at === index ? !each : each)));
              }}
            >
              {/* As tall with a cloud as without. */}
              <span className="h-[26px]">{isWet && <SignIcon sign="rain" size={26} />}</span>
              <span>{month.short}</span>
            </button>
          </li>
        );
      })}
    </ul>
  );
}
