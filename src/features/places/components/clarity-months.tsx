import { useTranslation } from 'react-i18next';
import { CLARITIES, type Clarity } from '#shared/sky/vocabulary.js';
import { useDateWords } from '#src/lib/date-words.js';
import { ClarityIcon } from '#src/ui/icons/clarity-icon.js';

/** The air of twelve months by shape, with a legend. With `onChange` each month steps on when pressed. */
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
    <>
      <ul className="grid grid-cols-4 gap-1 mid:grid-cols-6">
        {words.months(ANY_YEAR).map((month, index) => {
          const clarity = clarityByMonth[index] ?? 'ordinary';
          return (
            <li key={month.dayNumber}>
              <Month
                short={month.short}
                clarity={clarity}
                label={t('clarity.month', { month: month.long, clarity: t(`sky:clarity.${clarity}`) })}
                onPress={
                  onChange &&
                  (() => {
                    onChange(clarityByMonth.map((each, at) => (at === index ? nextClarity(each) : each)));
                  })
                }
              />
            </li>
          );
        })}
      </ul>
      <ul className="mt-2 flex flex-wrap gap-x-5 gap-y-1 text-small">
        {CLARITIES.map((clarity) => (
          <li key={clarity} className="flex items-center gap-2">
            <ClarityIcon clarity={clarity} size={20} />
            {t(`sky:clarity.${clarity}`)}
          </li>
        ))}
      </ul>
    </>
  );
}

/** Names of the months are those of any year. */
const ANY_YEAR = 2027;

function Month({
  short,
  clarity,
  label,
  onPress,
}: {
  short: string;
  clarity: Clarity;
  label: string;
  onPress: (() => void) | undefined;
}) {
  const look = 'flex w-full flex-col items-center gap-1 p-1.5 text-center text-small leading-tight';
  const content = (
    <>
      <ClarityIcon clarity={clarity} size={26} />
      <span aria-hidden>{short}</span>
    </>
  );
  if (onPress === undefined) {
    return (
      <span className={look} role="img" aria-label={label}>
        {content}
      </span>
    );
  }
  return (
    <button
      type="button"
      className={`${look} min-h-14 rounded-board border-(length:--line-control) border-edge`}
      aria-label={label}
      onClick={onPress}
    >
      {content}
    </button>
  );
}

function nextClarity(clarity: Clarity): Clarity {
  return CLARITIES[(CLARITIES.indexOf(clarity) + 1) % CLARITIES.length] ?? 'ordinary';
}
