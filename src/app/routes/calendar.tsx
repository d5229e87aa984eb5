import { AboutItem } from '#src/app/items/about-item.js';
import { textsOfEntry } from '#src/app/items/noted-texts.js';
import { EditorPage } from '#src/features/calendars/components/editor-page.js';
import { TakeBack } from '#src/features/versions/components/take-back.js';

/** The draft; where a submission locks it, the versions know the way out. */
export function Component() {
  return (
    <EditorPage
      lockedAction={({ id, outNumber }, isOfficer) =>
        isOfficer && outNumber !== null ? <TakeBack calendarId={id} number={outNumber} /> : null
      }
      about={({ communityId, entryId, content, ...asked }) => (
        <AboutItem
          item={{ communityId, itemType: 'entry', itemId: entryId }}
          texts={textsOfEntry(content)}
          {...asked}
        />
      )}
    />
  );
}
