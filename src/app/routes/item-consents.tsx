import { AttachmentsPanel } from '#src/features/attachments/components/attachments-panel.js';
import { ItemConsentsPage } from '#src/features/consents/components/item-consents-page.js';
import { useCurrentCommunity } from '#src/lib/community.js';

/** The consent sheet of one thing, with the voices and pictures that prove what was said. */
export function Component() {
  const { communityId } = useCurrentCommunity();
  return (
    <ItemConsentsPage
      proofs={(consentId) => (
        <AttachmentsPanel
          look="plain"
          communityId={communityId}
          subject={{ subjectType: 'consent', subjectId: consentId }}
        />
      )}
    />
  );
}
