import { Mic } from 'lucide-react';
import { useId, useState, type ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import type { AnswerWord } from '#shared/contracts/reviews.js';
import { useKeptDraft } from '#src/lib/kept-draft.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { Button } from '#src/ui/button.js';
import { TextAreaField } from '#src/ui/field.js';

/** Records a voice about the entry on screen, and says which one was kept. */
export type Speak = (done: { onKept: (recordingId: string) => void; onClose: () => void }) => ReactNode;

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
  speak,
}: {
  draftName: string;
  answer: AnswerWord;
  before: string;
  busy: boolean;
  onSave: (note: string, recordingId: string | null) => Promise<boolean>;
  onClose: () => void;
  /** The recorder, where the elder may speak instead of writing. */
  speak: Speak | null;
}) {
  const { t } = useTranslation(['reviews', 'common']);
  const words = useProblemWords();
  const formId = useId();
  const { found, keepDraft, dropDraft } = useKeptDraft(draftName, isText);
  const [note, setNote] = useState(found?.value ?? before);
  const [problem, setProblem] = useState<string | undefined>(undefined);

  const [isSpeaking, setIsSpeaking] = useState(false);

  const save = async (recordingId: string | null = null) => {
    const text = note.trim();
    if (answer === 'change-this' && text === '' && recordingId === null) {
      setProblem(words.field('say-what-to-change'));
      return;
    }
    if (text.length > NOTE_MAX) {
      setProblem(words.field('too-long'));
      return;
    }
    if (await onSave(text, recordingId)) dropDraft();
  };
  if (speak !== null && isSpeaking) {
    return speak({
      onKept: (recordingId) => {
        void save(recordingId);
      },
      onClose: () => {
        setIsSpeaking(false);
      },
    });
  }
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
      {speak !== null && (
        <Button
          look="main"
          full
          icon={<Mic aria-hidden size={26} />}
          onClick={() => {
            setIsSpeaking(true);
          }}
        >
          {t('note.speak')}
        </Button>
      )}
      <TextAreaField
        label={t(LABELS[answer])}
        hint={t('note.kept')}
        problem={problem}
        rows={4}
        value={note}
        // The elder has just chosen to write: the field is what they are waiting for.
        // eslint-disable-next-line jsx-a11y/no-autofocus -- see above; focus would otherwise stay on a gone button
        autoFocus={speak === null}
        onChange={(event) => {
          setNote(event.currentTarget.value);
          setProblem(undefined);
          keepDraft(event.currentTarget.value, null);
        }}
      />
      <Button type="submit" look={speak === null ? 'main' : 'plain'} full busy={busy}>
        {t('note.save')}
      </Button>
      <Button look="quiet" onClick={onClose}>
        {t('common:cancel')}
      </Button>
    </form>
  );
}
