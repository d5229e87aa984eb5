import { useTranslation } from 'react-i18next';
import { AttachmentsPanel } from '#src/features/attachments/components/attachments-panel.js';
import { ConsentLink } from '#src/features/consents/components/consent-link.js';
import { SharingPanel } from '#src/features/sharing/components/sharing-panel.js';
import type { SharingValue } from '#src/lib/sharing-fields.js';
import type { ItemRef } from '#src/lib/sharing-queries.js';
import { TakeBackLink } from '#src/lib/take-back-link.js';
import { Board } from '#src/ui/surfaces.js';

export interface AboutItemProps {
  item: ItemRef & { itemType: 'entry' | 'figure' };
  wanted?: SharingValue | null | undefined;
  onSettled?: (() => void) | undefined;
  onHidden?: (() => void) | undefined;
}

/**
 * What belongs to a thing besides its own words, wherever it is shown: voices and pictures, who may see it, what was
 * agreed, and the way to take it back.
 */
export function AboutItem({ item, ...sharing }: AboutItemProps) {
  const { t } = useTranslation('sharing');
  const { communityId, itemType, itemId } = item;
  return (
    <>
      <AttachmentsPanel
        key={`voices ${itemId}`}
        communityId={communityId}
        subject={{ subjectType: itemType, subjectId: itemId }}
      />
      <Board title={t('title')}>
        <SharingPanel key={itemId} item={item} {...sharing} />
        <div className="mt-3 grid justify-items-start gap-3">
          <ConsentLink itemType={itemType} itemId={itemId} />
          <TakeBackLink {...item} />
        </div>
      </Board>
    </>
  );
}
