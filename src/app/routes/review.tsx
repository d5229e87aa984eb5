import { AboutFrozenEntry } from '#src/app/items/about-entry.js';
import { SpeakAboutEntry } from '#src/app/items/speak-about-entry.js';
import { ReviewPage } from '#src/features/reviews/components/review-page.js';

/** The review, where an elder may speak instead of writing, and everybody may pin a note. */
export function Component() {
  return (
    <ReviewPage
      about={(entry) => <AboutFrozenEntry key={entry.entryId} entry={entry} />}
      speak={(entry, done) => <SpeakAboutEntry key={entry.entryId} entryId={entry.entryId} {...done} />}
    />
  );
}
