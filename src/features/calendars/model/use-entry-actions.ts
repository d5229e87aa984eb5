import { useTranslation } from 'react-i18next';
import type { Entry } from '#shared/contracts/calendars.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { useToast } from '#src/ui/toast.js';
import {
  useDeleteEntry,
  useDuplicateEntry,
  useReorderEntries,
  useRestoreEntry,
} from '../api/entry-mutations.js';
import { idsByDate, moved } from './entry-order.js';
import type { ShownEntry } from './preview-dates.js';
import type { Editor } from './use-editor.js';

export interface EntryActions {
  duplicate: (entry: Entry) => void;
  takeOut: (entry: Entry) => void;
  throwAway: (entry: ShownEntry) => void;
  move: (from: number, to: number) => void;
  sortByDate: () => void;
  isBusy: boolean;
}

/** What can be done to entries besides writing; whatever takes something away can be undone. */
export function useEntryActions(editor: Editor): EntryActions {
  const { calendar, edits, selection, shown } = editor;
  const { t } = useTranslation('calendars');
  const say = useToast();
  const words = useProblemWords();
  const copy = useDuplicateEntry(calendar.id);
  const remove = useDeleteEntry(calendar.id);
  const restore = useRestoreEntry(calendar.id);
  const reorder = useReorderEntries(calendar.id);
  const onError = (cause: unknown) => {
    say(words.problem(cause));
  };
  const title = (entry: Pick<Entry, 'content'>) => entry.content.titleOfficer || t('editor.untitled');
  const savedIds = shown.flatMap((entry) => (entry.saved ? [entry.id] : []));
  const setOrder = (ids: readonly string[], said: string | null) => {
    const before = savedIds;
    reorder.mutate(ids, {
      onError,
      onSuccess: () => {
        if (said === null) return;
        say(said, {
          onUndo: () => {
            reorder.mutate(before, {
              onError,
              onSuccess: () => {
                say(t('order.takenBack'));
              },
            });
          },
        });
      },
    });
  };

  return {
    duplicate: (entry) => {
      copy.mutate(entry.id, {
        onError,
        onSuccess: (made) => {
          selection.open(made.id);
          say(t('editor.copied', { title: title(entry) }));
        },
      });
    },
    takeOut: (entry) => {
      remove.mutate(entry.id, {
        onError,
        onSuccess: () => {
          const unsaved = edits.all.get(entry.id);
          edits.drop(entry.id);
          selection.close();
          say(t('editor.removed', { title: title(entry) }), {
            onUndo: () => {
              restore.mutate(entry.id, {
                onError,
                onSuccess: () => {
                  if (unsaved) edits.put(entry.id, unsaved);
                  selection.open(entry.id);
                  say(t('editor.putBack', { title: title(entry) }));
                },
              });
            },
          });
        },
      });
    },
    throwAway: (entry) => {
      const edit = edits.all.get(entry.id);
      edits.drop(entry.id);
      if (entry.saved === null) selection.close();
      if (!edit) return;
      say(t('editor.thrownAway', { title: title(entry) }), {
        onUndo: () => {
          edits.put(entry.id, edit);
          selection.open(entry.id);
        },
      });
    },
    move: (from, to) => {
      if (to >= 0 && to < savedIds.length && from !== to) setOrder(moved(savedIds, from, to), null);
    },
    sortByDate: () => {
      setOrder(idsByDate(shown.filter((entry) => entry.saved !== null)), t('order.sorted'));
    },
    isBusy: copy.isPending || remove.isPending || restore.isPending || reorder.isPending,
  };
}
