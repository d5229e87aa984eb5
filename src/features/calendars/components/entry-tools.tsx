import { Copy, Trash2 } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import type { Entry } from '#shared/contracts/calendars.js';
import { Button, IconButton } from '#src/ui/button.js';
import type { EntryActions } from '../model/use-entry-actions.js';

interface EntryToolsProps {
  entry: Entry;
  actions: EntryActions;
  /** On a phone they stand in words at the end of the form. */
  inWords?: boolean;
}

/** Duplicate it, or take it out (which can be undone). */
export function EntryTools({ entry, actions, inWords = false }: EntryToolsProps) {
  const { t } = useTranslation('calendars');
  const tools = [
    { label: t('editor.duplicate'), Icon: Copy, act: actions.duplicate, look: 'plain' },
    { label: t('editor.takeOut'), Icon: Trash2, act: actions.takeOut, look: 'quiet' },
  ] as const;
  return (
    <div className={inWords ? 'mt-4 flex flex-wrap gap-2' : 'flex gap-2'}>
      {tools.map(({ label, Icon, act, look }) => {
        const press = () => {
          if (!actions.isBusy) act(entry);
        };
        return inWords ? (
          <Button key={label} look={look} icon={<Icon aria-hidden size={20} />} onClick={press}>
            {label}
          </Button>
        ) : (
          <IconButton
            key={label}
            label={label}
            icon={<Icon aria-hidden size={22} />}
            closed={actions.isBusy}
            onClick={press}
          />
        );
      })}
    </div>
  );
}
