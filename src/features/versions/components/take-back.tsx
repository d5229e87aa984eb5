import { Undo2 } from 'lucide-react';
import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import type { VersionState } from '#shared/contracts/versions.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { Button } from '#src/ui/button.js';
import { Dialog } from '#src/ui/dialog.js';
import { TextField } from '#src/ui/field.js';
import { PickGroup } from '#src/ui/pick.js';
import { Care } from '#src/ui/surfaces.js';
import { useToast } from '#src/ui/toast.js';
import { useAskChanges } from '../api/version-mutations.js';

interface TakeBackProps {
  calendarId: string;
  number: number;
  state?: VersionState | undefined;
  onDone?: (() => void) | undefined;
}

/** Ends a submission, so that the draft opens again. */
export function TakeBack(props: TakeBackProps) {
  const { t } = useTranslation('versions');
  const [isOpen, setIsOpen] = useState(false);
  const close = () => {
    setIsOpen(false);
  };
  return (
    <>
      <Button
        icon={<Undo2 aria-hidden className="turns" size={20} />}
        onClick={() => {
          setIsOpen(true);
        }}
      >
        {t('actions.takeBack')}
      </Button>
      <Dialog title={t('takeBack.title')} isOpen={isOpen} onClose={close}>
        <TakeBackQuestion {...props} onClose={close} />
      </Dialog>
    </>
  );
}

const REASONS = ['taken-back', 'elder-asked'] as const;

function TakeBackQuestion({
  calendarId,
  number,
  state,
  onDone,
  onClose,
}: TakeBackProps & { onClose: () => void }) {
  const { t } = useTranslation(['versions', 'common']);
  const words = useProblemWords();
  const say = useToast();
  const askChanges = useAskChanges(calendarId, number);
  const [reason, setReason] = useState<(typeof REASONS)[number]>('taken-back');
  const [note, setNote] = useState('');
  // The button that opened this question may be gone when the answer comes; what follows must happen all the same.
  const submit = async () => {
    try {
      await askChanges.mutateAsync({ reason, note });
    } catch {
      return; // Said above the button.
    }
    say(t('takeBack.done', { number }));
    onClose();
    onDone?.();
  };
  return (
    <form
      className="grid gap-4"
      onSubmit={(event) => {
        event.preventDefault();
        void submit();
      }}
    >
      <p>{t('takeBack.lead', { number })}</p>
      {state === 'signed-off' && (
        <Care>
          <p>{t('takeBack.signedOff')}</p>
        </Care>
      )}
      <PickGroup
        label={t('takeBack.why')}
        stacked
        value={reason}
        onChange={setReason}
        options={REASONS.map((value) => ({
          value,
          label: t(`takeBack.${value}`),
          note: t(`takeBack.${value}Note`),
        }))}
      />
      <TextField
        label={t('common:optional', { label: t('takeBack.note') })}
        value={note}
        onChange={(event) => {
          setNote(event.currentTarget.value);
        }}
      />
      {askChanges.error !== null && (
        <Care blocked role="alert">
          <p>{words.problem(askChanges.error)}</p>
        </Care>
      )}
      <Button type="submit" look="main" full busy={askChanges.isPending}>
        {t('takeBack.go')}
      </Button>
    </form>
  );
}
