import { useTranslation } from 'react-i18next';
import { Button } from '#src/ui/button.js';
import { Care } from '#src/ui/surfaces.js';
import { newEntryId } from '../model/kept-edits.js';
import type { Editor } from '../model/use-editor.js';

/** Writing to entries that somebody else took out: it is not lost with them. */
export function OrphanNotes({ editor }: { editor: Editor }) {
  const { t } = useTranslation('calendars');
  const { orphans, edits, selection } = editor;
  return orphans.map(({ id, edit }) => (
    <Care key={id} className="mb-4">
      <p>{t('editor.orphan', { title: edit.draft.titleOfficer || t('editor.untitled') })}</p>
      <div className="mt-1 flex flex-wrap gap-x-3">
        <Button
          onClick={() => {
            const newId = newEntryId(id);
            edits.put(newId, { ...edit, base: null, baseVersion: null });
            edits.drop(id);
            selection.open(newId);
          }}
        >
          {t('editor.orphanSave')}
        </Button>
        <Button
          look="quiet"
          onClick={() => {
            edits.drop(id);
          }}
        >
          {t('editor.throwNewAway')}
        </Button>
      </div>
    </Care>
  ));
}
