import { Check, GitCompareArrows, Layers, Plus, Send } from 'lucide-react';
import type { ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import { paths } from '#src/lib/paths.js';
import { Button, ButtonLink } from '#src/ui/button.js';
import { Mast, Page, ThumbBar } from '#src/ui/page.js';
import { StateChip } from '#src/ui/state-chip.js';
import type { FormState } from '../model/form-state.js';
import type { Editor } from '../model/use-editor.js';
import type { EntryActions } from '../model/use-entry-actions.js';
import type { SaveEntry } from '../model/use-save-entry.js';
import { EditorStrip } from './editor-strip.js';
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
  onSubmit: () => void;
}

/** From 1024 px: the strip above, the entry beside the list. */
export function WideView(parts: ViewParts) {
  const { t } = useTranslation('calendars');
  const { editor, actions, form } = parts;
  return (
    <Page>
      <Mast title={t('editor.title', { year: editor.calendar.year })} under={<DraftState editor={editor} />}>
        <div className="flex flex-wrap items-center justify-end gap-3">
          <ToolLinks {...parts} />
          {editor.canWrite && editor.selected !== null && <SaveButton {...parts} />}
        </div>
      </Mast>
      <Notes {...parts} />
      <ListState editor={editor}>
        <EditorStrip editor={editor} form={form} />
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
      <ListState editor={editor}>
        <EntryList editor={editor} actions={actions} />
      </ListState>
      <div className="mt-4 flex flex-wrap gap-3">
        <ToolLinks {...parts} />
      </div>
      {editor.canWrite && (
        <ThumbBar>
          <Button look="main" icon={<Plus aria-hidden size={24} />} onClick={editor.selection.openNew}>
            {t('editor.add')}
          </Button>
        </ThumbBar>
      )}
    </Page>
  );
}

/** On a phone the open entry is a view of its own. */
export function EntryView(parts: ViewParts) {
  const { t } = useTranslation('calendars');
  const { editor } = parts;
  const { calendar, shown, selected } = editor;
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
      {editor.canWrite && (
        <ThumbBar>
          <SaveButton {...parts} />
        </ThumbBar>
      )}
    </Page>
  );
}

function Notes({ editor, lockedAction }: ViewParts) {
  return (
    <>
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

function OpenEntry({ editor, saving, actions, form }: ViewParts) {
  const { t } = useTranslation('calendars');
  const { selected } = editor;
  if (selected === null) return <p className="text-umber-soft">{t('editor.chooseOne')}</p>;
  if (!editor.canWrite || form === null) {
    return <EntryReading editor={editor} entry={selected} answers={editor.answers.get(selected.id)} />;
  }
  return (
    <EntryForm
      key={selected.id}
      editor={editor}
      entry={selected}
      form={form}
      saving={saving}
      actions={actions}
    />
  );
}

function SaveButton({ editor, saving }: ViewParts) {
  const { t } = useTranslation('calendars');
  const { selected, stale } = editor;
  const reason = stale
    ? t('editor.chooseFirst')
    : selected?.saved && !selected.unsaved
      ? t('editor.nothingToSave')
      : undefined;
  return (
    <Button
      look="main"
      icon={<Check aria-hidden size={24} />}
      busy={saving.isSaving}
      closedBecause={reason}
      onClick={() => void saving.save()}
    >
      {t('editor.save')}
    </Button>
  );
}

function ToolLinks({ editor, onSubmit }: ViewParts) {
  const { t } = useTranslation('calendars');
  const { calendar, canWrite, shown } = editor;
  return (
    <>
      <ButtonLink to={paths.versions(calendar.id)} icon={<Layers aria-hidden size={20} />}>
        {t('editor.versions')}
      </ButtonLink>
      {editor.lastNumber !== null && (
        <ButtonLink to={paths.compare(calendar.id)} icon={<GitCompareArrows aria-hidden size={20} />}>
          {t('editor.compare')}
        </ButtonLink>
      )}
      {canWrite && shown.length > 0 && (
        <Button icon={<Send aria-hidden className="turns" size={20} />} onClick={onSubmit}>
          {t('editor.submit')}
        </Button>
      )}
    </>
  );
}

/** Draft or locked, where, and what is not saved yet. */
function DraftState({ editor }: { editor: Editor }) {
  const { t } = useTranslation('calendars');
  const { calendar, lastNumber, unsavedIds } = editor;
  const chip = calendar.locked
    ? t('editor.locked')
    : lastNumber === null
      ? t('editor.draft')
      : t('editor.afterSubmission', { number: lastNumber });
  return (
    <span className="flex flex-wrap items-center gap-x-3 gap-y-1">
      <StateChip state="draft">{chip}</StateChip>
      <span>{t('editor.place', { place: calendar.placeName })}</span>
      {unsavedIds.length > 0 && <span>{t('editor.unsaved', { count: unsavedIds.length })}</span>}
      {!editor.isOfficer && <span>{t('editor.readOnly')}</span>}
    </span>
  );
}
