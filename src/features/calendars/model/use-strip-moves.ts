import { startTransition, useMemo } from 'react';
import { useTranslation } from 'react-i18next';
import { useDateWords } from '#src/lib/date-words.js';
import { useWindowSentence, windowDayNumbers } from '#src/lib/entry-words.js';
import type { BarMoves, MoveWords } from '#src/ui/pictures/bar-surface.js';
import type { DraftChange } from './use-entry-edits.js';
import { isStale } from './shown-entries.js';
import type { ShownEntry } from './preview-dates.js';
import { movedDays, movedOffsets } from './strip-moves.js';
import type { Editor } from './use-editor.js';

const NOWHERE = { earliest: 0, bestFrom: 0, bestTo: 0, lastAdvised: 0 };

/** An entry that this person may write on the strip and in its table now. */
export function mayWriteHere({ canWrite, edits }: Editor, entry: ShownEntry): boolean {
  return canWrite && (entry.saved?.mine ?? true) && !isStale(entry.saved, edits.all.get(entry.id));
}

export function changeEntry({ edits, newStart }: Editor, entry: ShownEntry, change: DraftChange): void {
  edits.change(entry.id, entry.saved ?? newStart, change);
}

/** Moving windows on the strip: a change of the entry's four days like any other. */
export function useStripMoves(editor: Editor, onZoom: (step: 1 | -1) => void): BarMoves {
  const words = useMoveWords();
  return useMemo(() => {
    const byId = new Map(editor.shown.map((entry) => [entry.id, entry]));
    const windowOf = (key: string) => byId.get(key)?.dates?.window ?? null;
    const mayMove = (key: string) => {
      const entry = byId.get(key);
      return entry !== undefined && mayWriteHere(editor, entry);
    };
    return {
      mayMove,
      onMove: (key, part, days) => {
        const entry = byId.get(key);
        if (!entry || !mayMove(key)) return;
        // Drawn piece by piece: with hundreds of entries the hand goes on before all of it is drawn.
        startTransition(() => {
          changeEntry(editor, entry, ({ offsets }) => ({ offsets: movedOffsets(offsets, part, days) }));
        });
        // On a wide screen the form beside follows; on a phone it would cover the strip.
        if (editor.selection.isWide && editor.selection.openId !== key) editor.selection.open(key);
      },
      preview: (key, part, days) => {
        const [window, entry] = [windowOf(key), byId.get(key)];
        return window && entry
          ? movedDays(windowDayNumbers(window), entry.content.offsets, part, days)
          : NOWHERE;
      },
      words,
      onZoom,
    };
  }, [editor, onZoom, words]);
}

/** Of a bar's own name and days alone: they change with the language only. */
function useMoveWords(): MoveWords {
  const { t } = useTranslation(['calendars', 'strip']);
  const dates = useDateWords();
  const sentence = useWindowSentence();
  return useMemo(
    () => ({
      label: (title, part, mayMove) =>
        mayMove ? t(`strip.move.${part}`, { title }) : t('strip:notYours', { title }),
      value: (days, part) =>
        part === 'all' ? sentence(days) : dates.day(part === 'start' ? days.earliest : days.lastAdvised),
      say: ({ earliest, lastAdvised }) => dates.range(earliest, lastAdvised, 'short'),
    }),
    [t, dates, sentence],
  );
}
