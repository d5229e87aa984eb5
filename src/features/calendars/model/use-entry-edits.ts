import { useCallback, useEffect, useMemo, useRef, useState } from 'react';
import type { Entry, EntryInput } from '#shared/contracts/calendars.js';
import { sameJson } from '#shared/kernel/canonical-json.js';
import { useSession } from '#src/lib/session.js';
import { contentOf, differsFrom, draftOf, sameContent, type EntryDraft } from './entry-draft.js';
import { forgetEdit, keepEdit, readEdits, type EntryEdit, type Edits, type Sending } from './kept-edits.js';
import { isStale } from './shown-entries.js';
import { takenIn } from './take-in.js';

const PAUSE_MS = 400;

export const NO_EDITS: Edits = new Map();

/** Some fields of an entry, or how they follow from what stands there now. */
export type DraftChange = Partial<EntryDraft> | ((draft: EntryDraft) => Partial<EntryDraft>);

/** New entries that are saved by now, by the word that each went by before. */
export type Born = ReadonlyMap<string, Entry>;

export interface EntryEdits {
  all: Edits;
  /** A page may go on calling an entry by its word for a moment; what comes under it is meant for the saved one. */
  born: Born;
  bornAs: (entryId: string) => Entry | null;
  /** When the writing of an entry was last kept on this device; null where it could not be. */
  keptAt: (entryId: string) => Date | null;
  /** Changes an entry; `from` is what it starts from: the saved entry, or how a new one begins. */
  change: (entryId: string, from: Entry | EntryDraft, change: DraftChange) => void;
  put: (entryId: string, edit: EntryEdit) => void;
  /** When the person throws the writing away. */
  drop: (entryId: string) => void;
  /** After saving `sent`. What was written while it was on its way stays, over the state that is saved now. */
  settle: (entryId: string, sent: EntryInput, saved: Entry) => void;
  /** Keeps at once what is on its way to the server; null when it is known what became of it. */
  mark: (entryId: string, sending: Sending | null) => void;
  sendingOf: (entryId: string) => Sending | null;
  /** Lays what is written over newer saved states, where nobody has to choose. */
  takeIn: (saved: readonly Entry[]) => void;
}

/**
 * Everything that is written and not saved in one calendar, entry by entry. It is kept on this device after a short
 * pause, and at once when the page is left, so a reload or a dead battery loses nothing.
 */
export function useEntryEdits(calendarId: string): EntryEdits {
  const personId = useSession().person?.id ?? 'visitor';
  const [all, setAll] = useState<Edits>(() => readEdits(personId, calendarId));
  const [unkept, setUnkept] = useState<ReadonlySet<string>>(new Set());
  // Two changes may come before the screen is drawn again; the second must see the first.
  const newest = useRef(all);
  const [born, setBorn] = useState<Born>(new Map());
  const newestBorn = useRef(born);
  const pending = useRef(new Map<string, EntryEdit>());
  const timer = useRef<ReturnType<typeof setTimeout> | undefined>(undefined);

  const flush = useCallback(() => {
    clearTimeout(timer.current);
    const waiting = [...pending.current];
    pending.current.clear();
    const lost = waiting.filter(([entryId, edit]) => !keepEdit(personId, calendarId, entryId, edit));
    return new Set(lost.map(([entryId]) => entryId));
  }, [personId, calendarId]);

  useEffect(() => {
    addEventListener('pagehide', flush);
    return () => {
      removeEventListener('pagehide', flush);
      flush();
    };
  }, [flush]);

  const set = useCallback((edits: Edits) => {
    newest.current = edits;
    setAll(edits);
  }, []);

  const put = useCallback(
    (entryId: string, edit: EntryEdit) => {
      set(new Map(newest.current).set(entryId, edit));
      pending.current.set(entryId, edit);
      clearTimeout(timer.current);
      timer.current = setTimeout(() => {
        const lost = flush();
        setUnkept((before) => (before.size === 0 && lost.size === 0 ? before : lost));
      }, PAUSE_MS);
    },
    [set, flush],
  );

  const drop = useCallback(
    (entryId: string) => {
      pending.current.delete(entryId);
      forgetEdit(personId, calendarId, entryId);
      set(new Map([...newest.current].filter(([id]) => id !== entryId)));
    },
    [set, personId, calendarId],
  );

  const change = useCallback(
    (entryId: string, from: Entry | EntryDraft, changed: DraftChange) => {
      const saved = newestBorn.current.get(entryId);
      const id = saved?.id ?? entryId;
      const edit = changedEdit(newest.current.get(id), saved ?? from, changed);
      if (edit === null) drop(id);
      else put(id, edit);
    },
    [put, drop],
  );

  const settle = useCallback(
    (entryId: string, sent: EntryInput, saved: Entry) => {
      const edit = newest.current.get(entryId);
      drop(entryId);
      if (saved.id !== entryId) {
        newestBorn.current = new Map(newestBorn.current).set(entryId, saved);
        setBorn(newestBorn.current);
      }
      if (!edit || sameContent(contentOf(edit.draft), sent)) return;
      const { sending: _done, ...rest } = edit;
      // An answer that came late may tell of a newer state than the one that was sent.
      const isMine = sameContent(saved.content, sent);
      const over = {
        ...{ ...rest, base: sent },
        baseVersion: isMine ? saved.version : saved.version - 1,
      };
      put(saved.id, isMine ? over : (takenIn(over, saved) ?? over));
    },
    [put, drop],
  );

  const mark = useCallback(
    (entryId: string, sending: Sending | null) => {
      const edit = newest.current.get(entryId);
      if (edit === undefined) return;
      const { sending: _before, ...rest } = edit;
      put(entryId, sending === null ? rest : { ...rest, sending });
      flush();
    },
    [put, flush],
  );

  const sendingOf = useCallback((entryId: string) => newest.current.get(entryId)?.sending ?? null, []);

  const bornAs = useCallback((entryId: string) => newestBorn.current.get(entryId) ?? null, []);

  const takeIn = useCallback(
    (saved: readonly Entry[]) => {
      for (const entry of saved) {
        const edit = newest.current.get(entry.id);
        // What is on its way may be the newer state itself.
        if (!isStale(entry, edit) || edit === undefined || edit.sending) continue;
        const laid = takenIn(edit, entry);
        if (laid === null) continue;
        if (differsFrom(laid.draft, entry.content)) put(entry.id, laid);
        else drop(entry.id);
      }
    },
    [put, drop],
  );

  return useMemo(
    () => ({
      all,
      born,
      bornAs,
      keptAt: (entryId) => {
        const edit = all.get(entryId);
        return edit === undefined || unkept.has(entryId) ? null : new Date(edit.keptAt);
      },
      change,
      put,
      drop,
      settle,
      mark,
      sendingOf,
      takeIn,
    }),
    [all, born, bornAs, unkept, change, put, drop, settle, mark, sendingOf, takeIn],
  );
}

/** The edit after a change; null where nothing is left that saving would change. */
export function changedEdit(
  before: EntryEdit | undefined,
  from: Entry | EntryDraft,
  change: DraftChange,
  now: Date = new Date(),
): EntryEdit | null {
  const saved = 'content' in from ? from : null;
  const beginning = 'content' in from ? draftOf(from.content) : from;
  const start = before?.draft ?? beginning;
  const draft = withoutUnsaid({ ...start, ...(typeof change === 'function' ? change(start) : change) });
  const base = before ? before.base : (saved?.content ?? null);
  const baseVersion = before ? before.baseVersion : (saved?.version ?? null);
  // Written back to what is saved now: nothing is unsaved any more. Over an older state it must still be decided.
  const isBack =
    saved === null
      ? sameJson(draft, beginning)
      : baseVersion === saved.version && !differsFrom(draft, saved.content);
  const sending = before?.sending;
  if (isBack && sending === undefined) return null;
  return { draft, base, baseVersion, keptAt: now.toISOString(), ...(sending ? { sending } : {}) };
}

/** A member that a change sets to undefined is taken out, such as a word of the village's own. */
function withoutUnsaid(draft: EntryDraft): EntryDraft {
  return Object.fromEntries(Object.entries(draft).filter(([, said]) => said !== undefined)) as typeof draft;
}
