import { useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import {
  entry as entrySchema,
  entryInput,
  type Entry,
  type EntryInput,
} from '#shared/contracts/calendars.js';
import { sameJson } from '#shared/kernel/canonical-json.js';
import { ApiProblem } from '#src/lib/api-problem.js';
import { calendarKeys } from '#src/lib/calendar-queries.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { useToast } from '#src/ui/toast.js';
import { useTakeEntry } from '../api/entry-mutations.js';
import { draftOf } from './entry-draft.js';
import { NO_PROBLEMS, problemsFrom, problemsOf, type FieldProblems } from './field-problems.js';
import { useDeliver } from './use-deliver.js';
import type { ShownEntry } from './preview-dates.js';
import { isStale } from './shown-entries.js';
import type { Editor } from './use-editor.js';
import { useSendAgain } from './use-send-again.js';

/** The last try to save an entry that did not come through. */
interface Refused {
  entryId: string;
  content: EntryInput;
  server: FieldProblems;
  overall: string | null;
  /** Counts the tries, so that each moves the focus to its first field again. */
  attempt: number;
}

export interface SaveEntry {
  save: () => Promise<void>;
  /** The same for one that need not be open. */
  saveOne: (entryId: string) => Promise<void>;
  /** One after the other; where one is refused it is opened, and the others wait. */
  saveAll: () => Promise<void>;
  /** Saves a text that was joined from two; `theirs` is the saved state that it was joined over. */
  saveJoined: (content: EntryInput, theirs: Entry) => Promise<void>;
  /** Opens the choice between two texts of an entry. */
  choose: (entryId: string) => void;
  /** The entry whose two texts are shown; null while somebody writes on. */
  choosingId: string | null;
  isSaving: boolean;
  problems: FieldProblems;
  overall: string | null;
  attempt: number;
}

export function useSaveEntry(editor: Editor): SaveEntry {
  const { calendar, selected, edits, selection } = editor;
  const { t } = useTranslation('calendars');
  const say = useToast();
  const words = useProblemWords();
  const client = useQueryClient();
  const takeEntry = useTakeEntry(calendar.id);
  const deliver = useDeliver(calendar.id, edits);
  const [refused, setRefused] = useState<Refused | null>(null);
  const [choosingId, setChoosingId] = useState<string | null>(null);
  useSendAgain(editor, deliver, (entryId) => {
    setRefused((before) => (before?.entryId === entryId ? null : before));
  });

  const refuse = (entryId: string, content: EntryInput, server: FieldProblems, overall: string | null) => {
    setRefused((before) => ({ entryId, content, server, overall, attempt: (before?.attempt ?? 0) + 1 }));
  };

  const meet = (cause: unknown, entryId: string, content: EntryInput) => {
    const problem = cause instanceof ApiProblem ? cause : null;
    if (problem?.slug === 'stale') {
      // The newer state is shown beside this one; see StaleChoice.
      const current = entrySchema.safeParse(problem.current);
      if (current.success) takeEntry(current.data);
      setChoosingId(entryId);
    } else if (problem?.slug !== 'not-found') {
      const server = problemsFrom(problem?.errors ?? []);
      refuse(entryId, content, server, server.size > 0 ? null : words.problem(cause));
    }
    // Locked, taken out or newer: whatever it was, the screen shall show the present state.
    if (problem !== null && problem.status !== 0) {
      void client.invalidateQueries({ queryKey: calendarKeys.one(calendar.id) });
    }
  };

  /** @returns whether it is saved */
  const send = async (entryId: string, content: EntryInput, version: number | null): Promise<boolean> => {
    const parsed = entryInput.safeParse(content);
    if (!parsed.success) {
      refuse(entryId, content, NO_PROBLEMS, null);
      return false;
    }
    try {
      const saved = await deliver.send(entryId, parsed.data, version);
      setRefused(null);
      setChoosingId(null);
      if (saved.id !== entryId && selected?.id === entryId) selection.rename(saved.id);
      say(t('editor.saved', { title: saved.content.titleOfficer }));
      return true;
    } catch (cause) {
      meet(cause, entryId, content);
      return false;
    }
  };

  const saveOne = async ({ id, saved, content }: ShownEntry): Promise<boolean> => {
    const edit = edits.all.get(id);
    if (!edit?.sending && isStale(saved, edit)) {
      setChoosingId(id);
      return false;
    }
    return send(id, content, edit?.baseVersion ?? saved?.version ?? null);
  };
  const saveOrOpen = async (entry: ShownEntry): Promise<boolean> => {
    const isSaved = await saveOne(entry);
    if (!isSaved) selection.open(entry.id);
    return isSaved;
  };

  const isRefused = refused !== null && selected !== null && refused.entryId === selected.id;
  const isUnchanged = isRefused && sameJson(refused.content, selected.content);
  return {
    save: async () => {
      if (selected !== null) await saveOne(selected);
    },
    saveOne: async (entryId) => {
      const entry = editor.shown.find(({ id }) => id === entryId);
      if (entry) await saveOrOpen(entry);
    },
    saveAll: async () => {
      for (const entry of editor.shown) {
        if (entry.unsaved && !(await saveOrOpen(entry))) return;
      }
    },
    saveJoined: async (content, theirs) => {
      const base = theirs.content;
      const baseVersion = theirs.version;
      // From here on this is what I wrote, over their state: also if it cannot be saved just now.
      edits.put(theirs.id, { draft: draftOf(content), base, baseVersion, keptAt: new Date().toISOString() });
      await send(theirs.id, content, baseVersion);
    },
    choose: setChoosingId,
    choosingId,
    isSaving: deliver.isPending,
    problems:
      selected === null ? NO_PROBLEMS : shownProblems(selected.content, isRefused, refused, isUnchanged),
    overall: isUnchanged ? refused.overall : null,
    attempt: isRefused ? refused.attempt : 0,
  };
}

/** Days out of order are said at once; everything else after the first try to save, so that nobody is nagged. */
function shownProblems(
  content: EntryInput,
  isRefused: boolean,
  refused: Refused | null,
  isUnchanged: boolean,
): FieldProblems {
  const own = problemsOf(content);
  if (!isRefused) return new Map([...own].filter(([field]) => field.startsWith('offsets')));
  return new Map([...(isUnchanged && refused ? refused.server : []), ...own]);
}
