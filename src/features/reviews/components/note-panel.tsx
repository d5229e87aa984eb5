import { useId, useState } from 'react';
import { useTranslation } from 'react-i18next';
import type { AnswerWord } from '#shared/contracts/reviews.js';
import { useKeptDraft } from '#src/lib/kept-draft.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { Button } from '#src/ui/button.js';
import { TextAreaField } from '#src/ui/field.js';

const NOTE_MAX = 1000;
const isText = (value: unknown): value is string => typeof value === 'string';
const LABELS = {
  agree: 'note.agree',
  'change-this': 'note.change',
  'not-for-the-board': 'note.not',
  'not-mine-to-say': 'note.not',
} as const satisfies Record<AnswerWord, string>;

/** A note to an answer, in the elder's words. It survives a reload until it is saved. */
export function NotePanel({
  draftName,
  answer,
  before,
  busy,
  onSave,
  onClose,
}: {
  draftName: string;
  answer: AnswerWord;
  before: string;
  busy: boolean;
  onSave: (note: string) => Promise<boolean>;
  onClose: () => void;
}) {
  const { t } = useTranslation(['reviews', 'common']);
  const words = useProblemWords();
  const formId = useId();
  const { found, keepDraft, dropDraft } = useKeptDraft(draftName, isText);
  const [note, setNote] = useState(found?.value ?? before);
  const [problem, setProblem] = useState<string | undefined>(undefined);

  const save = async () => {
    const text = note.trim();
    if (answer === 'change-this' && text === '') {
      setProblem(words.field('say-what-to-change'));
      return;
    }
    if (text.length > NOTE_MAX) {
      setProblem(words.field('too-long'));
      return;
    }
    if (await onSave(text)) dropDraft();
  };
  return (
    <form
      id={formId}
      className="grid gap-3"
      noValidate
      onSubmit={(event) => {
        event.preventDefault();
        void save();
      }}
    >
      <TextAreaField
        label={t(LABELS[answer])}
        hint={t('note.kept')}
        problem={problem}
        rows={4}
        value={note}
        // The elder has just chosen to write: the field is what they are waiting for.
        // eslint-disable-next-line jsx-a11y/no-autofocus -- see above; focus would otherwise stay on a gone button
        autoFocus
        onChange={(event) => {
          setNote(event.currentTarget.value);
          setProblem(undefined);
          keepDraft(event.currentTarget.value, null);
        }}
      />
      <Button type="submit" look="main" full busy={busy}>
        {t('note.save')}
      </Button>
      <Button look="quiet" onClick={onClose}>
        {t('common:cancel')}
      </Button>
    </form>
  );
}
