import { useTranslation } from 'react-i18next';
import type { Answer, AnswerWord } from '#shared/contracts/reviews.js';
import { TextField } from '#src/ui/field.js';
import { PaperBoxes } from './paper-boxes.js';

interface Mark {
  answer: AnswerWord | '';
  note: string;
}

/** One elder's row on the paper: which box, and what was said. */
export function PaperMark({
  name,
  own,
  value,
  problem,
  onChange,
}: {
  name: string;
  /** Given with their own hand: then there is nothing to type. */
  own: Answer | null;
  value: Mark;
  problem: string | undefined;
  onChange: (mark: Mark) => void;
}) {
  const { t } = useTranslation('reviews');
  if (own !== null) {
    return (
      <p className="text-umber-soft">{t('meeting.ownStands', { name, answer: t(`answer.${own.answer}`) })}</p>
    );
  }
  return (
    <div className="grid content-start gap-2">
      <p aria-hidden className="font-bold">
        {name}
      </p>
      <PaperBoxes
        label={t('meeting.answerOf', { name })}
        value={value.answer}
        onChange={(answer) => {
          onChange({ ...value, answer });
        }}
      />
      {value.answer !== '' && value.answer !== 'agree' && (
        <TextField
          label={t('meeting.noteOf', { name })}
          value={value.note}
          maxLength={1000}
          problem={problem}
          onChange={(event) => {
            onChange({ ...value, note: event.currentTarget.value });
          }}
        />
      )}
    </div>
  );
}
