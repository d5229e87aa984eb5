import { AboutEntryButton } from '#src/app/items/about-entry.js';
import { ReviewBoard } from '#src/features/reviews/components/review-board.js';
import { VersionPage } from '#src/features/versions/components/version-page.js';

export function Component() {
  return (
    <VersionPage
      review={(version) => <ReviewBoard version={version} />}
      about={(entry) => <AboutEntryButton entry={entry} />}
    />
  );
}
