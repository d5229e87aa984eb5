import { AboutFrozenEntry } from '#src/app/items/about-entry.js';
import { SpeakAboutEntry } from '#src/app/items/speak-about-entry.js';
import { OwnEntriesPage } from '#src/features/reviews/components/own-entries-page.js';

/** What somebody keeps with others, with its voices and notes; they may speak instead of writing. */
export function Component() {
  return (
    <OwnEntriesPage
      about={(entry) => <AboutFrozenEntry key={entry.entryId} entry={entry} />}
      speak={(entry, done) => <SpeakAboutEntry key={entry.entryId} entryId={entry.entryId} {...done} />}
    />
  );
}
