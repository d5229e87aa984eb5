import { useState } from 'react';
import type { FigureDetail, FigureInput } from '#shared/contracts/figures.js';
import { useKeptDraft } from '#src/lib/kept-draft.js';
import {
  draftOf,
  emptyDraft,
  inputOf,
  isFigureDraft,
  readDraft,
  type FigureDraft,
} from '../model/figure-draft.js';

export interface FigureDraftState {
  draft: FigureDraft;
  /** The version that it was written over; null for a new figure. */
  version: number | null;
  changed: boolean;
  keptAt: Date | null;
  foundAt: string | null;
  change: (patch: Partial<FigureDraft>) => void;
  startOver: () => void;
  /** Both states were joined: the draft now stands on the newer one. */
  join: (joined: FigureInput, version: number) => void;
  /** Saved: nothing is kept any more. */
  done: () => void;
}

/** The draft of a figure, kept on the device. */
export function useFigureDraft(
  figure: FigureDetail | null,
  communityId: string,
  languageTags: readonly string[],
): FigureDraftState {
  const keeper = useKeptDraft<FigureDraft>(
    figure === null ? `new-figure.${communityId}` : `figure.${figure.id}`,
    isFigureDraft,
  );
  const saved = figure === null ? emptyDraft(languageTags) : draftOf(inputOf(figure), figure.storyShown);
  const [draft, setDraft] = useState(keeper.found?.value ?? saved);
  const [version, setVersion] = useState(keeper.found?.baseVersion ?? figure?.version ?? null);
  const [foundAt, setFoundAt] = useState(keeper.found?.keptAt ?? null);
  return {
    draft,
    version,
    changed: !isSame(draft, saved),
    keptAt: keeper.keptAt,
    foundAt,
    change: (patch) => {
      const next = { ...draft, ...patch };
      setDraft(next);
      setFoundAt(null);
      keeper.keepDraft(next, version);
    },
    startOver: () => {
      keeper.dropDraft();
      setDraft(saved);
      setVersion(figure?.version ?? null);
      setFoundAt(null);
    },
    join: (joined, onto) => {
      const next = draftOf(joined, figure?.storyShown);
      setDraft(next);
      setVersion(onto);
      keeper.keepDraft(next, onto);
    },
    done: () => {
      keeper.dropDraft();
      setFoundAt(null);
    },
  };
}

/** What is typed differently but means the same is no change. */
function isSame(a: FigureDraft, b: FigureDraft): boolean {
  const [left, right] = [readDraft(a), readDraft(b)];
  return JSON.stringify(left.ok ? left.input : a) === JSON.stringify(right.ok ? right.input : b);
}
