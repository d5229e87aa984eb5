import { useCallback, useEffect, useRef, useState } from 'react';
import { forget, keep, readKept } from './device-storage.js';
import { useActing, useSession } from './session.js';

/** What was typed, when, and over which saved version of the row (null for something new). */
export interface KeptDraft<T> {
  value: T;
  keptAt: string;
  baseVersion: number | null;
}

export interface DraftKeeper<T> {
  /** The draft found when the screen opened; null when there was none or it did not fit `isFit`. */
  found: KeptDraft<T> | null;
  /** When the present text was last kept; null before the first time. */
  keptAt: Date | null;
  /** Keeps what is typed; written after a short pause, and at once when the page is left. */
  keepDraft: (value: T, baseVersion: number | null) => void;
  /** Call after saving, or when the person throws the draft away. */
  dropDraft: () => void;
}

const PAUSE_MS = 400;

export function draftPrefix(personId: string): string {
  return `draft.${personId}.`;
}

/**
 * Unsaved text that survives a reload, for one person on this device. `isFit` looks at what was found: a draft
 * that an older release kept may have another shape and is then left alone.
 */
export function useKeptDraft<T>(name: string, isFit: (value: unknown) => value is T): DraftKeeper<T> {
  const { person } = useSession();
  const acting = useActing();
  // Below whoever signed in, so that it leaves the device with them.
  const own = person?.id ?? 'visitor';
  const personId = acting.id === '' || acting.id === own ? own : `${own}.${acting.id}`;
  const key = draftPrefix(personId) + name;
  const [found, setFound] = useState(() => ({ key, draft: readDraft(key, isFit) }));
  const [keptAt, setKeptAt] = useState<Date | null>(null);
  const pending = useRef<{ key: string; draft: KeptDraft<T> } | null>(null);
  const timer = useRef<ReturnType<typeof setTimeout> | undefined>(undefined);

  if (found.key !== key) {
    setFound({ key, draft: readDraft(key, isFit) });
    setKeptAt(null);
  }

  const flush = useCallback(() => {
    clearTimeout(timer.current);
    if (pending.current === null) return false;
    const done = keep(pending.current.key, pending.current.draft);
    pending.current = null;
    return done;
  }, []);

  useEffect(() => {
    addEventListener('pagehide', flush);
    return () => {
      removeEventListener('pagehide', flush);
      flush();
    };
  }, [flush, key]);

  const keepDraft = useCallback(
    (value: T, baseVersion: number | null) => {
      const now = new Date();
      pending.current = { key, draft: { value, keptAt: now.toISOString(), baseVersion } };
      clearTimeout(timer.current);
      timer.current = setTimeout(() => {
        if (flush()) setKeptAt(now);
      }, PAUSE_MS);
    },
    [key, flush],
  );

  const dropDraft = useCallback(() => {
    clearTimeout(timer.current);
    pending.current = null;
    forget(key);
    setFound({ key, draft: null });
    setKeptAt(null);
  }, [key]);

  return { found: found.draft, keptAt, keepDraft, dropDraft };
}

function readDraft<T>(key: string, isFit: (value: unknown) => value is T): KeptDraft<T> | null {
  const kept = readKept(key);
  if (typeof kept !== 'object' || kept === null) return null;
  const { value, keptAt, baseVersion } = kept as Partial<Record<keyof KeptDraft<T>, unknown>>;
  if (typeof keptAt !== 'string' || !(baseVersion === null || typeof baseVersion === 'number')) return null;
  return isFit(value) ? { value, keptAt, baseVersion } : null;
}
