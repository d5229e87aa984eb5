import { useTranslation } from 'react-i18next';
import { VoicesOfNote } from '#src/app/items/voices-of-note.js';
import { NotesPanel } from '#src/features/notes/components/notes-panel.js';
import { StarPage } from '#src/features/stars/components/star-page.js';
import { useCurrentCommunity } from '#src/lib/community.js';
import { Board } from '#src/ui/surfaces.js';

/** A star with its days, and the village's notes on it. */
export function Component() {
  return <StarPage notes={(markerKey) => <StarNotes markerKey={markerKey} />} />;
}

function StarNotes({ markerKey }: { markerKey: string }) {
  const { t } = useTranslation('notes');
  const { communityId } = useCurrentCommunity();
  return (
    <Board title={t('title')}>
      <NotesPanel
        key={markerKey}
        thing={{ communityId, subjectType: 'marker', subjectId: markerKey }}
        texts={[]}
        voices={(note, begins) => <VoicesOfNote communityId={communityId} note={note} begins={begins} />}
      />
    </Board>
  );
}
