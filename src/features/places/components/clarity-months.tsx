import { useTranslation } from 'react-i18next';
import { CLARITIES, type Clarity } from '#shared/sky/vocabulary.js';
import { useDateWords } from '#src/lib/date-words.js';
import { ClarityIcon } from '#src/ui/icons/clarity-icon.js';

/** The air of twelve months by shape and word. With `onChange` each month steps on when pressed. */
export function ClarityMonths({
  clarityByMonth,
  onChange,
}: {
  clarityByMonth: readonly Clarity[];
  onChange?: ((next: Clarity[]) => void) | undefined;
}) {
  const { t } = useTranslation(['places', 'sky']);
  const words = useDateWords();
  return (
    <ul className="grid grid-cols-[repeat(auto-fill,minmax(5.25rem,1fr))] gap-2">
      {words.months(2027).map((month, index) => {
        const clarity = clarityByMonth[index] ?? 'ordinary';
        const content = (
          <>
            <ClarityIcon clarity={clarity} size={26} />
            <span aria-hidden>
              {month.short}
              <span className="block text-small leading-tight text-umber-soft">
                {t(`sky:clarity.${clarity}`)}
              </span>
            </span>
          </>
        );
        const label = t('clarity.month', { month: month.long, clarity: t(`sky:clarity.${clarity}`) });
        const look = 'flex w-full flex-col items-center gap-1 p-2 text-center leading-tight';
        return (
          <li key={month.dayNumber}>
            {onChange === undefined ? (
              <span className={look} role="img" aria-label={label}>
                {content}
              </span>
            ) : (
              <button
                type="button"
                className={`${look} min-h-(--target) rounded-board border-(length:--line-control) border-edge bg-chalk`}
                aria-label={label}
                onClick={() => {
                  onChange(clarityByMonth.map((each, at) => (at === index ? nextClarity(each) : each)));
                }}
              >
                {content}
              </button>
            )}
          </li>
        );
      })}
    </ul>
  );
}

function nextClarity(clarity: Clarity): Clarity {
  return CLARITIES[(CLARITIES.indexOf(clarity) + 1) % CLARITIES.length] ?? 'ordinary';
}
