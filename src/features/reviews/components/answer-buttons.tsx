import { useTranslation } from 'react-i18next';
import { ANSWERS, type AnswerWord } from '#shared/contracts/reviews.js';
import { AnswerIcon } from '#src/ui/icons/answer-icon.js';

/** Four answers of equal weight: no colour, no order of merit. */
export function AnswerButtons({
  label,
  value,
  busy,
  onAnswer,
}: {
  label: string;
  value: AnswerWord | null;
  busy: boolean;
  onAnswer: (answer: AnswerWord) => void;
}) {
  const { t } = useTranslation('reviews');
  return (
    <div className="answers" role="group" aria-label={label}>
      {ANSWERS.map((answer) => (
        <button
          key={answer}
          type="button"
          className="answer"
          aria-pressed={value === answer}
          aria-disabled={busy || undefined}
          onClick={() => {
            if (!busy) onAnswer(answer);
          }}
        >
          <AnswerIcon answer={answer} size={44} />
          <span>{t(`answer.${answer}`)}</span>
        </button>
      ))}
    </div>
  );
}
