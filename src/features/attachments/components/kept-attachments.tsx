import { useQuery } from '@tanstack/react-query';
import { useTranslation } from 'react-i18next';
import type { AttachmentSubject } from '#shared/contracts/attachments.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { Skeleton, TroubleNote } from '#src/ui/waiting.js';
import { attachmentsQuery } from '../api/attachments-api.js';
import { PictureCard } from './picture-card.js';
import { RecordingCard } from './recording-card.js';

interface KeptAttachmentsProps {
  communityId: string;
  subject: AttachmentSubject;
  /** Says nothing where there is nothing. */
  isQuiet: boolean;
}

/** Voices and pictures that are there. */
export function KeptAttachments({ communityId, subject, isQuiet }: KeptAttachmentsProps) {
  const { t } = useTranslation('attachments');
  const words = useProblemWords();
  const { data, error, refetch } = useQuery(attachmentsQuery(communityId, subject));
  if (data === undefined) {
    if (error === null) return <Skeleton lines={2} />;
    return <TroubleNote sentence={words.problem(error)} onRetry={() => void refetch()} />;
  }
  if (data.length === 0) return isQuiet ? null : <p className="text-umber-soft">{t('none')}</p>;
  return (
    <ul className="grid gap-4">
      {data.map((attachment) => (
        <li key={attachment.id}>
          {attachment.kind === 'picture' ? (
            <PictureCard attachment={attachment} />
          ) : (
            <RecordingCard attachment={attachment} />
          )}
        </li>
      ))}
    </ul>
  );
}
