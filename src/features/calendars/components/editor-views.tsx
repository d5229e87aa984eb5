import { Plus } from 'lucide-react';
import { useState, type ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import { NoticesAbove } from '#src/lib/notices-above.js';
import { paths } from '#src/lib/paths.js';
import { Button } from '#src/ui/button.js';
import { Fold } from '#src/ui/fold.js';
import { Mast, Page, ThumbBar } from '#src/ui/page.js';
import type { FormState } from '../model/form-state.js';
import type { ShownEntry } from '../model/preview-dates.js';
import type { Editor } from '../model/use-editor.js';
import type { EntryActions } from '../model/use-entry-actions.js';
import type { SaveEntry } from '../model/use-save-entry.js';
import { EditorStrip } from './editor-strip.js';
import { DraftState, SaveButton, ToolLinks, useSaveReason } from './editor-tools.js';
import { EntryForm } from './entry-form.js';
import { EntryList } from './entry-list.js';
import { EntryReading } from './entry-reading.js';
import { ListState } from './list-state.js';
import { LockedNote } from './locked-note.js';
import { OrphanNotes } from './orphan-notes.js';

export interface ViewParts {
  editor: Editor;
  saving: SaveEntry;
  actions: EntryActions;
  form: FormState | null;
  lockedAction: ReactNode;
  /** What the year before decided, for the draft and for the open entry. */
  tasks: ReactNode;
  entryTasks: ReactNode;
  /** What belongs to the open entry besides its words; null while none that is saved is open. */
  about: ReactNode;
  onSubmit: () => void;
}

/** From 1024 px: the strip above, the entry beside the list. */
export function WideView(parts: ViewParts) {
  const { t } = useTranslation('calendars');
  const { editor, actions, saving } = parts;
  const closed = useSaveReason(editor, saving);
  return (
    <Page>
      <Mast title={t('editor.title', { year: editor.calendar.year })} under={<DraftState editor={editor} />}>
        <div className="flex flex-wrap items-start gap-3">
          <ToolLinks {...parts} />
          {editor.canWriteSelected && (
            <div>
              <SaveButton {...parts} />
              {closed && <p className="text-center text-small text-umber-soft">{closed.note}</p>}
            </div>
          )}
        </div>
      </Mast>
      <Notes {...parts} />
      {parts.tasks}
      <ListState editor={editor}>
        <EditorStrip editor={editor} saving={saving} />
        <div className="editor-columns">
          <EntryList editor={editor} actions={actions} />
          <OpenEntry {...parts} />
        </div>
      </ListState>
    </Page>
  );
}

/** On a phone first the list; each entry carries its own line of the year. */
export function ListView(parts: ViewParts) {
  const { t } = useTranslation('calendars');
  const { editor, actions } = parts;
  return (
    <Page>
      <Mast
        title={t('editor.title', { year: editor.calendar.year })}
        under={<DraftState editor={editor} />}
      />
      <Notes {...parts} />
      {parts.tasks}
      <ListState editor={editor}>
        <EntryList editor={editor} actions={actions} />
        <StripFold {...parts} />
      </ListState>
      <div className="mt-4 flex flex-wrap gap-3">
        <ToolLinks {...parts} />
      </div>
      {editor.canWrite && (
        <ThumbBar>
          <Button look="main" icon={<Plus aria-hidden size={24} />} onClick={editor.selection.openNew}>
            {t(editor.isKeeper ? 'editor.addOwn' : 'editor.add')}
          </Button>
        </ThumbBar>
      )}
    </Page>
  );
}

/** On a phone the strip is drawn only when somebody wants it. */
function StripFold({ editor, saving }: ViewParts) {
  const { t } = useTranslation('calendars');
  const [isOpen, setIsOpen] = useState(false);
  return (
    <Fold title={t('strip.label')} open={isOpen} onToggle={setIsOpen}>
      {isOpen && <EditorStrip editor={editor} saving={saving} />}
    </Fold>
  );
}

/** On a phone the open entry is a view of its own. */
export function EntryView(parts: ViewParts) {
  const { t } = useTranslation('calendars');
  const { editor, saving } = parts;
  const { calendar, shown, selected } = editor;
  const closed = useSaveReason(editor, saving);
  const position = shown.findIndex((entry) => entry.id === selected?.id) + 1;
  const where =
    selected?.saved === null
      ? t('editor.newOf', { year: calendar.year })
      : t('editor.entryOf', { position, total: shown.length, year: calendar.year });
  return (
    <Page>
      <Mast
        title={<span className="text-body text-umber-soft">{where}</span>}
        backTo={paths.calendar(calendar.id)}
      />
      <Notes {...parts} />
      <OpenEntry {...parts} />
      {editor.canWriteSelected && (
        <ThumbBar note={closed?.note}>
          <SaveButton {...parts} />
        </ThumbBar>
      )}
    </Page>
  );
}

function Notes({ editor, lockedAction }: ViewParts) {
  return (
    <>
      <NoticesAbove />
      {editor.calendar.locked && (
        <LockedNote
          calendar={editor.calendar}
          state={editor.lastState}
          unsavedCount={editor.edits.all.size}
          action={lockedAction}
        />
      )}
      <OrphanNotes editor={editor} />
    </>
  );
}

function OpenEntry(parts: ViewParts) {
  const { t } = useTranslation('calendars');
  const { selected } = parts.editor;
  if (selected === null) return <p className="text-umber-soft">{t('editor.chooseOne')}</p>;
  return (
    <div className="grid min-w-0 content-start gap-4">
      {parts.entryTasks}
      <EntryBoard {...parts} selected={selected} />
      {parts.about}
    </div>
  );
}

function EntryBoard({ editor, saving, actions, form, selected }: ViewParts & { selected: ShownEntry }) {
  if (!editor.canWriteSelected || form === null) {
    return <EntryReading editor={editor} entry={selected} answers={editor.answers.get(selected.id)} />;
  }
  return (
    <EntryForm
      key={editor.formKey}
      editor={editor}
      entry={selected}
      form={form}
      saving={saving}
      actions={actions}
    />
  );
}
