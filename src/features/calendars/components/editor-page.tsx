import { useSuspenseQuery } from '@tanstack/react-query';
import { useMemo, useState, type ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import { useParams } from 'react-router-dom';
import type { Calendar, EntryInput } from '#shared/contracts/calendars.js';
import { calendarQuery } from '#src/lib/calendar-queries.js';
import { EntryTitles } from '#src/lib/entry-titles.js';
import { usePageTitle } from '#src/lib/page-title.js';
import type { SharingValue } from '#src/lib/sharing-fields.js';
import { useRolesIn } from '#src/lib/roles-in.js';
import type { ShownEntry } from '../model/preview-dates.js';
import { useDraftChanges } from '../model/use-draft-changes.js';
import { useEditor, type Writer } from '../model/use-editor.js';
import { useEntryActions } from '../model/use-entry-actions.js';
import { useSaveEntry } from '../model/use-save-entry.js';
import { useWantedMarker } from '../model/use-wanted-marker.js';
import { DraftClosed } from './draft-closed.js';
import { EntryView, ListView, WideView } from './editor-views.js';
import { SubmitDialog } from './submit-dialog.js';
import { useAskedCircle } from './use-asked-circle.js';
import { useFormState } from './use-form-state.js';

interface EditorPageProps {
  /** The way out of a locked draft: "take it back". It belongs to the versions. */
  lockedAction: (calendar: Calendar, isOfficer: boolean) => ReactNode;
  /** What the year before decided for this draft: for all of it, or for one entry. */
  tasks: (calendar: Calendar, entryId: string | null, isOfficer: boolean) => ReactNode;
  /** Who may see the open entry, and what else belongs to it. */
  about: (entry: AboutEntry) => ReactNode;
}

export interface AboutEntry {
  communityId: string;
  entryId: string;
  /** As it is saved. */
  content: EntryInput;
  /** A wider circle that was refused in the form, to be asked for. */
  wanted: SharingValue | null;
  onSettled: () => void;
  onHidden: () => void;
}

/** The draft of a calendar: the year's strip, its entries, and the one that is open. */
export function EditorPage({ lockedAction, tasks, about }: EditorPageProps) {
  const { calendarId = '' } = useParams();
  const { data: calendar } = useSuspenseQuery(calendarQuery(calendarId));
  const roles = useRolesIn(calendar.communityId);
  const { seesDrafts, isOfficer } = roles;
  if (!seesDrafts) return <DraftClosed calendar={calendar} />;
  return (
    <DraftEditor
      key={calendar.id}
      calendar={calendar}
      writer={roles}
      lockedAction={lockedAction(calendar, isOfficer)}
      tasks={(entryId) => tasks(calendar, entryId, isOfficer)}
      about={about}
    />
  );
}

interface DraftEditorProps {
  calendar: Calendar;
  writer: Writer;
  lockedAction: ReactNode;
  tasks: (entryId: string | null) => ReactNode;
  about: EditorPageProps['about'];
}

function DraftEditor({ calendar, writer, lockedAction, tasks, about }: DraftEditorProps) {
  const { t } = useTranslation('calendars');
  const editor = useEditor(calendar, writer);
  useWantedMarker(editor);
  useDraftChanges(calendar.id);
  const saving = useSaveEntry(editor);
  const actions = useEntryActions(editor);
  const form = useFormState(editor, saving.problems);
  const [isSubmitting, setIsSubmitting] = useState(false);
  const asked = useAskedCircle(editor, saving.problems);
  usePageTitle(t('editor.title', { year: calendar.year }));
  const parts = {
    editor,
    saving,
    actions,
    form,
    lockedAction,
    tasks: tasks(null),
    entryTasks: asked === null ? null : tasks(asked.entryId),
    about: asked === null ? null : about(asked),
    onSubmit: () => {
      setIsSubmitting(true);
    },
  };
  const { selection, selected } = editor;
  const isEntryView = !selection.isWide && selected !== null;
  const titles = useTitles(editor.shown);
  return (
    <EntryTitles titles={titles}>
      {selection.isWide ? (
        <WideView {...parts} />
      ) : isEntryView ? (
        <EntryView key="entry" {...parts} />
      ) : (
        <ListView key="list" {...parts} />
      )}
      <SubmitDialog
        editor={editor}
        isOpen={isSubmitting}
        onClose={() => {
          setIsSubmitting(false);
        }}
      />
    </EntryTitles>
  );
}

/** The same map until a title changes. */
function useTitles(shown: readonly ShownEntry[]): ReadonlyMap<string, string> {
  const pairs = JSON.stringify(shown.map(({ id, content }) => [id, content.titleOfficer]));
  return useMemo(() => new Map(JSON.parse(pairs) as [string, string][]), [pairs]);
}
