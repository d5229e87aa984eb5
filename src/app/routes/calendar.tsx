import { AboutItem } from '#src/app/items/about-item.js';
import { textsOfEntry } from '#src/app/items/noted-texts.js';
import { EditorPage } from '#src/features/calendars/components/editor-page.js';
import { DraftTasks, EntryTasks } from '#src/features/season-reviews/components/season-tasks.js';
import { TakeBack } from '#src/features/versions/components/take-back.js';

/** The draft; where a submission locks it, the versions know the way out. */
export function Component() {
  return (
    <EditorPage
      lockedAction={({ id, outNumber }, isOfficer) =>
        isOfficer && outNumber !== null ? <TakeBack calendarId={id} number={outNumber} /> : null
      }
      tasks={({ id: calendarId }, entryId, isOfficer) =>
        entryId === null ? (
          <DraftTasks calendarId={calendarId} isOfficer={isOfficer} />
        ) : (
          <EntryTasks calendarId={calendarId} entryId={entryId} isOfficer={isOfficer} />
        )
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
