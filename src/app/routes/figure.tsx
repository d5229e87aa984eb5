import { AttachmentsPanel } from '#src/features/attachments/components/attachments-panel.js';
import { FigurePage } from '#src/features/figures/components/figure-page.js';
import { MarkerDays } from '#src/features/stars/components/marker-days.js';

/** A figure with its four days, and the voices and pictures that belong to it. */
export function Component() {
  return (
    <FigurePage
      days={(markerKey) => <MarkerDays key={markerKey} markerKey={markerKey} />}
      voices={({ id, communityId }) => (
        <AttachmentsPanel communityId={communityId} subject={{ subjectType: 'figure', subjectId: id }} />
      )}
    />
  );
}
