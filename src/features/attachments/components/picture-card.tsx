import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import type { Attachment } from '#shared/contracts/attachments.js';
import { Dialog } from '#src/ui/dialog.js';
import { partUrl, thumbnailUrl } from '../api/attachments-api.js';
import { AttachmentFoot } from './attachment-foot.js';

/** One picture, small; a press shows it large. */
export function PictureCard({ attachment }: { attachment: Attachment }) {
  const { t } = useTranslation('attachments');
  const [isLarge, setIsLarge] = useState(false);
  const { id, title, picture } = attachment;
  return (
    <article className="attachment" aria-label={title}>
      <button
        type="button"
        className="thumbnail"
        aria-label={t('card.open', { title })}
        onClick={() => {
          setIsLarge(true);
        }}
      >
        <img
          src={thumbnailUrl(id)}
          alt={title}
          loading="lazy"
          style={{ aspectRatio: picture === null ? undefined : `${picture.widthPx} / ${picture.heightPx}` }}
        />
      </button>
      <p className="own-words">{title}</p>
      <AttachmentFoot attachment={attachment} />
      <Dialog
        title={title}
        isOpen={isLarge}
        onClose={() => {
          setIsLarge(false);
        }}
      >
        <img className="large-picture" src={partUrl(id, 1)} alt={title} />
      </Dialog>
    </article>
  );
}
