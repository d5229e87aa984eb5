import { useSuspenseQuery } from '@tanstack/react-query';
import { useState, type ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import { useParams } from 'react-router-dom';
import type { Calendar } from '#shared/contracts/calendars.js';
import { calendarQuery } from '#src/lib/calendar-queries.js';
import { usePageTitle } from '#src/lib/page-title.js';
import { useRolesIn } from '#src/lib/roles-in.js';
import { useEditor } from '../model/use-editor.js';
import { useEntryActions } from '../model/use-entry-actions.js';
import { useSaveEntry } from '../model/use-save-entry.js';
import { useWantedMarker } from '../model/use-wanted-marker.js';
import { DraftClosed } from './draft-closed.js';
import { EntryView, ListView, WideView } from './editor-views.js';
import { SubmitDialog } from './submit-dialog.js';
import { useFormState } from './use-form-state.js';

interface EditorPageProps {
  /** The way out of a locked draft: "take it back". It belongs to the versions. */
  lockedAction: (calendar: Calendar, isOfficer: boolean) => ReactNode;
  /** What was spoken and photographed about a saved entry. */
  voices: (communityId: string, entryId: string) => ReactNode;
}

/** The draft of a calendar: the year's strip, its entries, and the one that is open. */
export function EditorPage({ lockedAction, voices }: EditorPageProps) {
  const { calendarId = '' } = useParams();
  const { data: calendar } = useSuspenseQuery(calendarQuery(calendarId));
  const { seesDrafts, isOfficer } = useRolesIn(calendar.communityId);
  if (!seesDrafts) return <DraftClosed calendar={calendar} />;
  return (
    <DraftEditor
      key={calendar.id}
      calendar={calendar}
      isOfficer={isOfficer}
      lockedAction={lockedAction(calendar, isOfficer)}
      voices={(entryId) => voices(calendar.communityId, entryId)}
    />
  );
}

interface DraftEditorProps {
  calendar: Calendar;
  isOfficer: boolean;
  lockedAction: ReactNode;
  voices: (entryId: string) => ReactNode;
}

function DraftEditor({ calendar, isOfficer, lockedAction, voices }: DraftEditorProps) {
  const { t } = useTranslation('calendars');
  const editor = useEditor(calendar, isOfficer);
  useWantedMarker(editor);
  const saving = useSaveEntry(editor);
  const actions = useEntryActions(editor);
  const form = useFormState(editor, saving.problems);
  const [isSubmitting, setIsSubmitting] = useState(false);
  usePageTitle(t('editor.title', { year: calendar.year }));
  const parts = {
    editor,
    saving,
    actions,
    form,
    lockedAction,
    voices,
    onSubmit: () => {
      setIsSubmitting(true);
    },
  };
  const { selection, selected } = editor;
  const isEntryView = !selection.isWide && selected !== null;
  return (
    <>
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
    </>
  );
}
