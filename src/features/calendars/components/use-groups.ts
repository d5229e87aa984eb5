import { useEffect, useRef, useState, type RefObject } from 'react';
import { groupsWithProblems, type FieldGroup } from '../model/field-problems.js';
import type { SaveEntry } from '../model/use-save-entry.js';

export interface Groups {
  opened: ReadonlySet<FieldGroup>;
  toggle: (group: FieldGroup, isOpen: boolean) => void;
  /** Opens a group and puts the focus into its first field. */
  goTo: (group: FieldGroup) => void;
}

/** Which groups of the form stand open. A refused save opens those it concerns and goes to the first field. */
export function useGroups(
  board: RefObject<HTMLElement | null>,
  first: readonly FieldGroup[],
  { attempt, problems }: SaveEntry,
): Groups {
  const [opened, setOpened] = useState<ReadonlySet<FieldGroup>>(() => new Set(first));
  const newest = useRef(problems);
  useEffect(() => {
    newest.current = problems;
  });
  useEffect(() => {
    if (attempt === 0) return undefined;
    setOpened((before) => new Set([...before, ...groupsWithProblems(newest.current)]));
    return afterDrawing(board, ':is([aria-invalid="true"], button[data-invalid])');
  }, [attempt, board]);

  return {
    opened,
    toggle: (group, isOpen) => {
      setOpened((before) => toggled(before, group, isOpen));
    },
    goTo: (group) => {
      setOpened((before) => new Set(before).add(group));
      afterDrawing(board, `[data-group="${group}"] :is(input, textarea, select)`);
    },
  };
}

/** A fold opens with the next drawing; only then can the focus go into it. */
function afterDrawing(board: RefObject<HTMLElement | null>, selector: string): () => void {
  const frame = requestAnimationFrame(() => {
    board.current?.querySelector<HTMLElement>(selector)?.focus();
  });
  return () => {
    cancelAnimationFrame(frame);
  };
}

function toggled(
  groups: ReadonlySet<FieldGroup>,
  group: FieldGroup,
  isOpen: boolean,
): ReadonlySet<FieldGroup> {
  if (groups.has(group) === isOpen) return groups;
  const next = new Set(groups);
  if (isOpen) next.add(group);
  else next.delete(group);
  return next;
}
