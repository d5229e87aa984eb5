import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { versionsEndpoints } from '#shared/contracts/versions.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { Button } from '#src/ui/button.js';
import { Dialog } from '#src/ui/dialog.js';
import { TextField } from '#src/ui/field.js';
import { StateIcon } from '#src/ui/icons/state-icon.js';
import { Care } from '#src/ui/surfaces.js';
import { useToast } from '#src/ui/toast.js';
import { useRecall } from '../api/version-mutations.js';

interface RecallProps {
  calendarId: string;
  number: number;
  label: string;
}

export function Recall(props: RecallProps) {
  const { t } = useTranslation('versions');
  const [isOpen, setIsOpen] = useState(false);
  const close = () => {
    setIsOpen(false);
  };
  return (
    <>
      <Button
        look="quiet"
        icon={<StateIcon state="recalled" size={22} />}
        onClick={() => {
          setIsOpen(true);
        }}
      >
        {t('actions.recall')}
      </Button>
      <Dialog title={t('recall.title', { label: props.label })} isOpen={isOpen} onClose={close}>
        <RecallQuestion {...props} onClose={close} />
      </Dialog>
    </>
  );
}

function RecallQuestion({ calendarId, number, label, onClose }: RecallProps & { onClose: () => void }) {
  const { t } = useTranslation('versions');
  const words = useProblemWords();
  const say = useToast();
  const recall = useRecall(calendarId, number);
  const [note, setNote] = useState('');
  const [refused, setRefused] = useState<string | undefined>(undefined);
  // The button that opened this question may be gone when the answer comes; what follows must happen all the same.
  const answer = async (reason: string) => {
    try {
      await recall.mutateAsync(reason);
      say(t('recall.done', { label }));
      onClose();
    } catch {
      // Said above the button.
    }
  };
  return (
    <form
      noValidate
      className="grid gap-4"
      onSubmit={(event) => {
        event.preventDefault();
        const parsed = versionsEndpoints.recall.body.shape.note.safeParse(note);
        setRefused(parsed.success ? undefined : words.field(parsed.error.issues[0]?.message ?? 'unknown'));
        if (!parsed.success) return;
        void answer(parsed.data);
      }}
    >
      <p>{t('recall.lead')}</p>
      <TextField
        label={t('recall.note')}
        hint={t('recall.noteHint')}
        problem={refused}
        value={note}
        onChange={(event) => {
          setNote(event.currentTarget.value);
        }}
      />
      {recall.error !== null && (
        <Care blocked role="alert">
          <p>{words.problem(recall.error)}</p>
        </Care>
      )}
      <Button type="submit" look="main" full busy={recall.isPending}>
        {t('recall.go')}
      </Button>
    </form>
  );
}
