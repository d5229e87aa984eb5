import type { Note } from '#shared/contracts/notes.js';
import type { NoteAnswerEntity } from '../../db/entities/note-answer.entity.js';
import type { NoteEntity } from '../../db/entities/note.entity.js';
import { givenName } from '../../policy/giver-naming.js';
import type { Shared } from '../../policy/policy.js';
import type { Viewer } from '../../policy/viewer.js';

export interface NoteFacts {
  row: NoteEntity;
  /** Oldest first. */
  answers: readonly NoteAnswerEntity[];
  shared: Shared;
  viewer: Viewer;
  wordsStand: boolean;
  voices: number;
  names: ReadonlyMap<string, string>;
}

export function toNote({ row, answers, shared, viewer, wordsStand, voices, names }: NoteFacts): Note {
  // Their writer is named as they wish, in the answers too.
  const nameOf = (id: string) => {
    const name = names.get(id) ?? '';
    return id === row.authorId ? givenName(viewer, shared, name) : name;
  };
  return {
    id: row.id,
    subjectType: row.subjectType,
    subjectId: row.subjectId,
    pin: row.pin,
    wordsStand,
    text: row.text,
    voices,
    level: shared.level,
    authorName: nameOf(row.authorId),
    ...typed(row, names),
    writtenAt: row.writtenAt.toISOString(),
    closedAt: row.closedAt?.toISOString() ?? null,
    answers: answers.map((answer) => ({
      id: answer.id,
      authorName: nameOf(answer.authorId),
      ...typed(answer, names),
      text: answer.text,
      writtenAt: answer.writtenAt.toISOString(),
      mine: answer.authorId === viewer.personId,
    })),
    mine: row.authorId === viewer.personId,
  };
}

function typed(
  { typedBy }: { typedBy: string | null },
  names: ReadonlyMap<string, string>,
): { typedByName?: string } {
  return typedBy === null ? {} : { typedByName: names.get(typedBy) ?? '' };
}
