import { useQuery } from '@tanstack/react-query';
import { useParams } from 'react-router-dom';
import { AttachmentsPanel } from '#src/features/attachments/components/attachments-panel.js';
import { ConsentLink } from '#src/features/consents/components/consent-link.js';
import { ReviewPage } from '#src/features/reviews/components/review-page.js';
import { calendarQuery } from '#src/lib/calendar-queries.js';
import { TakeBackLink } from '#src/lib/take-back-link.js';

/** The review, where an elder may speak instead of writing. */
export function Component() {
  return <ReviewPage voices={(entryId) => <EntryVoices key={entryId} entryId={entryId} />} />;
}

function EntryVoices({ entryId }: { entryId: string }) {
  const { calendarId = '' } = useParams();
  const { data: calendar } = useQuery(calendarQuery(calendarId));
  if (calendar === undefined) return null;
  return (
    <>
      <ConsentLink itemType="entry" itemId={entryId} />
      <AttachmentsPanel
        look="plain"
        communityId={calendar.communityId}
        subject={{ subjectType: 'entry', subjectId: entryId }}
      />
      <div>
        <TakeBackLink communityId={calendar.communityId} itemType="entry" itemId={entryId} />
      </div>
    </>
  );
}
