import { useMemo } from 'react';
import { useProblemWords } from '#src/lib/problem-words.js';
import { isStarLead } from '#shared/calendar/entry-model.js';
import { circleTitles } from '../model/hung-entries.js';
import type { FieldProblems } from '../model/field-problems.js';
import type { FormState } from '../model/form-state.js';
import { signOf } from '../model/signs.js';
import type { Editor } from '../model/use-editor.js';

/** The form of the entry that is open; null while none is. */
export function useFormState(editor: Editor, problems: FieldProblems): FormState | null {
  const words = useProblemWords();
  const { selected, draft, shown, markers, signs, community, calendar, edits, newStart } = editor;
  const inUse = useMemo(
    () => new Set(shown.flatMap(({ content }) => (isStarLead(content.lead) ? [content.lead.markerKey] : []))),
    [shown],
  );
  if (selected === null || draft === null) return null;
  return {
    calendarId: calendar.id,
    entryId: selected.id,
    placeId: calendar.placeId,
    draft,
    content: selected.content,
    dates: selected.dates,
    year: calendar.year,
    change: (change) => {
      edits.change(selected.id, selected.saved ?? newStart, change);
    },
    at: (field) => {
      const problem = problems.get(field);
      return problem && words.field(problem.code, problem.message);
    },
    markers: markers.data?.byKey ?? null,
    sign: draft.leadType === 'sky' ? signOf(signs, draft.sky.spec) : null,
    inUse,
    villageLanguage: community?.villageLanguage ?? null,
    officerLanguage: community?.officerLanguage ?? null,
    isKeepers: editor.isKeeper,
    others: shown
      .filter(({ id, saved }) => saved !== null && id !== selected.id)
      .map(({ id, content }) => ({ id, title: content.titleOfficer })),
    circle: circleTitles(selected.id, shown),
  };
}
