import { useTranslation } from 'react-i18next';
import { useDateWords } from '#src/lib/date-words.js';
import { Button } from '#src/ui/button.js';
import type { ShownEntry } from '../model/preview-dates.js';
import type { Editor } from '../model/use-editor.js';
import type { EntryActions } from '../model/use-entry-actions.js';

/** Says that what is written is kept here and not saved yet, with the way back. */
export function UnsavedLine({
  editor,
  entry,
  actions,
}: {
  editor: Editor;
  entry: ShownEntry;
  actions: EntryActions;
}) {
  const { t } = useTranslation('calendars');
  const dates = useDateWords();
  const keptAt = editor.edits.keptAt(entry.id);
  const isUnderway = editor.edits.all.get(entry.id)?.sending !== undefined;
  if (!entry.unsaved) {
    return entry.saved ? (
      <p className="text-small text-umber-soft">
        {t('editor.lastSaved', { name: entry.saved.updatedBy, when: dates.moment(entry.saved.updatedAt) })}
      </p>
    ) : null;
  }
  return (
    <div className="flex flex-wrap items-center gap-x-3">
      <p className="text-small text-umber-soft">
        {keptAt === null ? t('editor.notKept') : t('editor.keptHere', { when: dates.moment(keptAt) })}
        {isUnderway && ` ${t('live.sentAgain')}`}
      </p>
      {entry.saved && (
        <Button
          look="quiet"
          onClick={() => {
            actions.throwAway(entry);
          }}
        >
          {t('editor.throwAway')}
        </Button>
      )}
    </div>
  );
}
