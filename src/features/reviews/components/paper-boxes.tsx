import { useTranslation } from 'react-i18next';
import { ANSWERS, type AnswerWord } from '#shared/contracts/reviews.js';
import { AnswerIcon } from '#src/ui/icons/answer-icon.js';

/** The four boxes of a row, in the paper's order. The marked one pressed again is no mark. */
export function PaperBoxes({
  label,
  value,
  onChange,
}: {
  label: string;
  value: AnswerWord | '';
  onChange: (marked: AnswerWord | '') => void;
}) {
  const { t } = useTranslation('reviews');
  return (
    <div className="paper-boxes" role="group" aria-label={label}>
      {ANSWERS.map((answer) => (
        <button
          key={answer}
          type="button"
          className="paper-box"
          aria-pressed={value === answer}
          onClick={() => {
            onChange(value === answer ? '' : answer);
          }}
        >
          <AnswerIcon answer={answer} size={28} />
          <span>{t(`answer.${answer}`)}</span>
        </button>
      ))}
    </div>
  );
}
