import { AboutEntryButton } from '#src/app/items/about-entry.js';
import { FeedsBoard } from '#src/features/exports/components/feeds-board.js';
import { TakeAlongBoard } from '#src/features/exports/components/take-along-board.js';
import { OpenPageBoard } from '#src/features/open-page/components/open-page-board.js';
import { ReviewBoard } from '#src/features/reviews/components/review-board.js';
import { VersionPage } from '#src/features/versions/components/version-page.js';

export function Component() {
  return (
    <VersionPage
      review={(version) => <ReviewBoard version={version} />}
      about={(entry) => <AboutEntryButton entry={entry} />}
      takeAlong={({ calendarId, number, state }, communityId) => (
        <>
          <TakeAlongBoard calendarId={calendarId} number={number} isPublished={state === 'published'} />
          {state === 'published' && <FeedsBoard communityId={communityId} />}
          {state === 'published' && <OpenPageBoard communityId={communityId} />}
        </>
      )}
    />
  );
}
