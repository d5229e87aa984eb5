import { Feather } from 'lucide-react';
import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { IconButton } from '#src/ui/button.js';
import { Dialog } from '#src/ui/dialog.js';
import type { Whom } from '../api/after-death-api.js';
import type { Villager } from './heir-form.js';
import { AfterDeath } from './after-death.js';

/** A quiet way to note that somebody has died. */
export function AfterDeathButton({
  name,
  people,
  ...whom
}: Whom & { name: string; people: readonly Villager[] }) {
  const { t } = useTranslation('people');
  const [isOpen, setIsOpen] = useState(false);
  const close = () => {
    setIsOpen(false);
  };
  return (
    <>
      <IconButton
        label={t('death.action', { name })}
        icon={<Feather aria-hidden size={22} />}
        onClick={() => {
          setIsOpen(true);
        }}
      />
      {isOpen && (
        <Dialog title={t('death.title', { name })} isOpen onClose={close} closesBeside={false}>
          <AfterDeath whom={whom} others={people.filter(({ id }) => id !== whom.personId)} onDone={close} />
        </Dialog>
      )}
    </>
  );
}
