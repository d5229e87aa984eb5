import { Printer } from 'lucide-react';
import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { CARD_FIRST_USE_DAYS, CARD_SIZES, type CardSize, type MadeCard } from '#shared/contracts/cards.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { Button } from '#src/ui/button.js';
import { Dialog } from '#src/ui/dialog.js';
import { TextField } from '#src/ui/field.js';
import { PickGroup } from '#src/ui/pick.js';
import { Care } from '#src/ui/surfaces.js';
import { usePrintCard } from '../api/cards-api.js';

/** A fresh card: its letters, shown once, and the paper. */
export function MadeCardDialog({
  communityId,
  made,
  onClose,
}: {
  communityId: string;
  made: MadeCard;
  onClose: () => void;
}) {
  const { t } = useTranslation('cards');
  const words = useProblemWords();
  const print = usePrintCard(communityId);
  const { holder, code } = made;
  const [name, setName] = useState(holder.displayName);
  const [size, setSize] = useState<CardSize>('a6');
  return (
    <Dialog
      title={t('made.title', { name: holder.displayName })}
      isOpen
      onClose={onClose}
      closesBeside={false}
    >
      <form
        className="grid gap-4"
        noValidate
        onSubmit={(event) => {
          event.preventDefault();
          print.mutate(
            { personId: holder.personId, code, name, size },
            {
              onSuccess: (file) => {
                saveFile(file, `${t('title')}.pdf`);
              },
            },
          );
        }}
      >
        <p>{t('made.lead', { count: CARD_FIRST_USE_DAYS })}</p>
        <p className="text-center text-[22px] tracking-[0.06em] break-words" translate="no">
          <strong>{code}</strong>
        </p>
        <TextField
          label={t('made.name')}
          hint={t('made.nameHint')}
          value={name}
          maxLength={60}
          onChange={(event) => {
            setName(event.currentTarget.value);
          }}
        />
        <PickGroup
          label={t('made.size')}
          value={size}
          onChange={setSize}
          options={CARD_SIZES.map((value) => ({
            value,
            label: t(`made.${value}`),
            note: t(`made.${value}Note`),
          }))}
        />
        {print.error !== null && (
          <Care blocked role="alert">
            <p>{words.problem(print.error)}</p>
          </Care>
        )}
        <Button
          type="submit"
          look="main"
          full
          busy={print.isPending}
          icon={<Printer aria-hidden size={22} />}
        >
          {t('made.print')}
        </Button>
        <p role="status">{print.isSuccess ? t('made.printed') : ''}</p>
        <Button full onClick={onClose}>
          {t('made.done')}
        </Button>
      </form>
    </Dialog>
  );
}

function saveFile(file: Blob, name: string): void {
  const address = URL.createObjectURL(file);
  const link = document.createElement('a');
  link.href = address;
  link.download = name;
  link.click();
  // The browser has taken it over once this turn is done.
  setTimeout(() => {
    URL.revokeObjectURL(address);
  }, 60_000);
}
