import { useState, type ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import { useProblemWords } from './problem-words.js';
import { Button, type ButtonLook } from '#src/ui/button.js';
import { Dialog } from '#src/ui/dialog.js';
import { TickField } from '#src/ui/field.js';
import { Care } from '#src/ui/surfaces.js';

interface SureButtonProps {
  label: string;
  look?: ButtonLook;
  icon?: ReactNode;
  /** The question, what stands below it, and the answer that does it. */
  question: string;
  what: ReactNode;
  yes: string;
  /** Where it cannot be undone: a line to tick first, and what the button says while it is not ticked. */
  tick?: { label: string; reason: string } | undefined;
  /** Whatever it rejects with is told in the dialog, and the dialog stays. */
  act: () => Promise<void>;
}

/** A button that asks first: nothing is taken back or hidden by one slip. */
export function SureButton({ label, look = 'plain', icon, ...dialog }: SureButtonProps) {
  const [isOpen, setIsOpen] = useState(false);
  const close = () => {
    setIsOpen(false);
  };
  return (
    <>
      <Button
        look={look}
        icon={icon}
        onClick={() => {
          setIsOpen(true);
        }}
      >
        {label}
      </Button>
      <Dialog title={dialog.question} isOpen={isOpen} onClose={close}>
        <Question {...dialog} onClose={close} />
      </Dialog>
    </>
  );
}

type QuestionProps = Omit<SureButtonProps, 'label' | 'look' | 'icon'> & { onClose: () => void };

function Question({ what, yes, tick, act, onClose }: QuestionProps) {
  const { t } = useTranslation('common');
  const words = useProblemWords();
  const [isTicked, setIsTicked] = useState(tick === undefined);
  const [isBusy, setIsBusy] = useState(false);
  const [trouble, setTrouble] = useState<string | null>(null);
  const doIt = async () => {
    setIsBusy(true);
    setTrouble(null);
    try {
      await act();
      onClose();
    } catch (cause) {
      setTrouble(words.problem(cause));
      setIsBusy(false);
    }
  };
  return (
    <div className="grid gap-4">
      <div>{what}</div>
      {tick !== undefined && (
        <TickField
          label={tick.label}
          checked={isTicked}
          onChange={(event) => {
            setIsTicked(event.currentTarget.checked);
          }}
        />
      )}
      {trouble !== null && (
        <Care blocked role="alert">
          <p>{trouble}</p>
        </Care>
      )}
      <Button
        look="main"
        full
        busy={isBusy}
        closedBecause={isTicked ? undefined : tick?.reason}
        onClick={() => void doIt()}
      >
        {yes}
      </Button>
      <Button look="quiet" onClick={onClose}>
        {t('cancel')}
      </Button>
    </div>
  );
}
