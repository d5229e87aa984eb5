import { Trash2 } from 'lucide-react';
import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import type { Attachment } from '#shared/contracts/attachments.js';
import { useDateWords } from '#src/lib/date-words.js';
import { TakeBackLink } from '#src/lib/take-back-link.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { Button } from '#src/ui/button.js';
import { Dialog } from '#src/ui/dialog.js';
import { useToast } from '#src/ui/toast.js';
import { useRemoveAttachment } from '../api/attachments-api.js';

/** Who added it, who may see it, and the way to take it away for good. */
export function AttachmentFoot({ attachment }: { attachment: Attachment }) {
  const { t } = useTranslation(['attachments', 'common', 'sharing']);
  const { moment } = useDateWords();
  const say = useToast();
  const words = useProblemWords();
  const remove = useRemoveAttachment();
  const [isAsking, setIsAsking] = useState(false);
  const { communityId, title, speaker, id, addedBy, addedAt, sharingLevel, may } = attachment;
  const when = { name: addedBy, moment: moment(addedAt) };
  const removeIt = async () => {
    try {
      await remove.mutateAsync(id);
      say(t('card.removed'));
    } catch (cause) {
      say(words.problem(cause));
    }
    setIsAsking(false);
  };
  return (
    <div className="flex flex-wrap items-center justify-between gap-2">
      <p className="text-small text-umber-soft">
        {addedBy === '' ? t('card.whenOnly', when) : t('card.when', when)} ·{' '}
        {t(`sharing:level.${sharingLevel}.name`)}
      </p>
      <TakeBackLink
        communityId={communityId}
        itemType="attachment"
        itemId={id}
        about={title === '' ? speaker : title}
      />
      {may.remove && (
        <Button
          look="quiet"
          icon={<Trash2 aria-hidden size={20} />}
          onClick={() => {
            setIsAsking(true);
          }}
        >
          {t('card.remove')}
        </Button>
      )}
      <Dialog
        title={t('card.removeTitle')}
        isOpen={isAsking}
        onClose={() => {
          setIsAsking(false);
        }}
      >
        <p>{t('card.removeSentence')}</p>
        <div className="mt-4 grid gap-3">
          <Button look="main" full busy={remove.isPending} onClick={() => void removeIt()}>
            {t('card.removeYes')}
          </Button>
          <Button
            look="quiet"
            onClick={() => {
              setIsAsking(false);
            }}
          >
            {t('common:cancel')}
          </Button>
        </div>
      </Dialog>
    </div>
  );
}
