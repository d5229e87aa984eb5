import type { FigureDraft } from '../model/figure-draft.js';

/** What each part of the form is handed. */
export interface FigurePart {
  draft: FigureDraft;
  change: (patch: Partial<FigureDraft>) => void;
  /** The sentence at a field (`names.0`, `memberHrs`), or undefined while all is well. */
  problem: (field: string) => string | undefined;
}
