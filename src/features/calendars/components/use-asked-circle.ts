import { PLAIN_DETAILS } from '#shared/contracts/sharing.js';
import type { FieldProblems } from '../model/field-problems.js';
import type { Editor } from '../model/use-editor.js';
import type { AboutEntry } from './editor-page.js';

/**
 * The open entry for the panel of who may see it. A save that was refused because its circle is wider leads on to
 * asking for that circle; afterwards the form holds the circle that is saved, so that the rest of it can be saved.
 */
export function useAskedCircle(editor: Editor, problems: FieldProblems): AboutEntry | null {
  const { calendar, selected, edits, selection } = editor;
  const saved = selected?.saved ?? null;
  if (selected === null || saved === null) return null;
  const { sharingLevel, sharing } = selected.content;
  const isRefused = problems.get('sharingLevel')?.code === 'wider-needs-two';
  return {
    communityId: calendar.communityId,
    entryId: saved.id,
    content: saved.content,
    wanted: isRefused ? { level: sharingLevel, details: sharing ?? PLAIN_DETAILS } : null,
    onSettled: () => {
      if (!isRefused) return;
      edits.change(saved.id, saved, {
        sharingLevel: saved.content.sharingLevel,
        sharing: saved.content.sharing ?? PLAIN_DETAILS,
      });
    },
    onHidden: selection.close,
  };
}
