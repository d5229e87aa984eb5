import { useCallback } from 'react';
import { useTranslation } from 'react-i18next';
import { useProblemWords } from '#src/lib/problem-words.js';
import type { Axis, CoordinateProblem } from '../model/coordinate.js';
import type { PlaceField, PlaceProblem } from '../model/place-draft.js';
import type { LineProblem } from '../model/skyline-text.js';

/** Sentences for what stands at the fields of a place: what happened, and what to change. */
export interface PlaceProblemWords {
  /** One sentence for a field; a skyline table has one for each line and is said beside its text. */
  at: (field: PlaceField, problem: PlaceProblem | undefined) => string | undefined;
  line: (problem: LineProblem) => string;
}

export function usePlaceProblemWords(): PlaceProblemWords {
  const { t } = useTranslation('places');
  const words = useProblemWords();

  const line = useCallback(
    (problem: LineProblem) =>
      t(`skyline.line.${problem.code}`, {
        line: problem.line,
        piece: problem.piece,
        other: problem.other ?? '',
      }),
    [t],
  );

  const at = useCallback(
    (field: PlaceField, problem: PlaceProblem | undefined) => {
      if (problem === undefined) return undefined;
      switch (problem.kind) {
        case 'coordinate': {
          const axis: Axis = field === 'longitudeDeg' ? 'longitude' : 'latitude';
          const { code, value } = problem.problem;
          return hasTwoTexts(code)
            ? t(`coordinate.${code}.${axis}`, { value })
            : t(`coordinate.${code}`, { value });
        }
        case 'elevation':
          return problem.value === ''
            ? t('elevationMissing')
            : t('elevationNotANumber', { value: problem.value });
        case 'no-clock':
          return t('zone.required');
        case 'skyline-lines':
          return t('skyline.nothingSaved');
        case 'code':
          return words.field(problem.code, problem.message);
      }
    },
    [t, words],
  );

  return { at, line };
}

type TwoTexts = 'required' | 'wrong-letter' | 'range';

function hasTwoTexts(code: CoordinateProblem['code']): code is TwoTexts {
  return code === 'required' || code === 'wrong-letter' || code === 'range';
}
