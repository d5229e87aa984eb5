import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { calendarQuery } from '#src/lib/calendar-queries.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { Button } from '#src/ui/button.js';
import { Dialog } from '#src/ui/dialog.js';
import { StateIcon } from '#src/ui/icons/state-icon.js';
import { Care } from '#src/ui/surfaces.js';
import { useToast } from '#src/ui/toast.js';
import { usePublish } from '../api/version-mutations.js';

interface PublishProps {
  calendarId: string;
  number: number;
}

export function Publish(props: PublishProps) {
  const { t } = useTranslation('versions');
  const [isOpen, setIsOpen] = useState(false);
  const close = () => {
    setIsOpen(false);
  };
  return (
    <>
      <Button
        look="main"
        icon={<StateIcon state="published" size={24} />}
        onClick={() => {
          setIsOpen(true);
        }}
      >
        {t('actions.publish')}
      </Button>
      <Dialog title={t('publish.title')} isOpen={isOpen} onClose={close}>
        <PublishQuestion {...props} onClose={close} />
      </Dialog>
    </>
  );
}

function PublishQuestion({ calendarId, number, onClose }: PublishProps & { onClose: () => void }) {
  const { t } = useTranslation('versions');
  const words = useProblemWords();
  const say = useToast();
  const { data: calendar } = useQuery(calendarQuery(calendarId));
  const publish = usePublish(calendarId, number);
  const replaced = calendar?.published ?? null;
  // The button that opened this question may be gone when the answer comes; what follows must happen all the same.
  const answer = async () => {
    try {
      const { label } = await publish.mutateAsync();
      say(t('publish.done', { label: label ?? '' }));
      onClose();
    } catch {
      // Said above the button.
    }
  };
  return (
    <div className="grid gap-3">
      <p>{t('publish.lead')}</p>
      {replaced !== null && <p>{t('publish.replaces', { label: replaced.label })}</p>}
      <p>{t('publish.frozen')}</p>
      <Care>
        <p>{t('publish.caution')}</p>
      </Care>
      {publish.error !== null && (
        <Care blocked role="alert">
          <p>{words.problem(publish.error)}</p>
        </Care>
      )}
      <Button look="main" full busy={publish.isPending} onClick={() => void answer()}>
        {t('publish.go')}
      </Button>
    </div>
  );
}
