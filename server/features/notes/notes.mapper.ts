import type { Note } from '#shared/contracts/notes.js';
import type { SharingLevel } from '#shared/contracts/sharing.js';
import type { NoteAnswerEntity } from '../../db/entities/note-answer.entity.js';
import type { NoteEntity } from '../../db/entities/note.entity.js';

export interface NoteFacts {
  row: NoteEntity;
  /** Oldest first. */
  answers: readonly NoteAnswerEntity[];
  level: SharingLevel;
  wordsStand: boolean;
  voices: number;
  names: ReadonlyMap<string, string>;
  askingId: string;
}

export function toNote({ row, answers, level, wordsStand, voices, names, askingId }: NoteFacts): Note {
  return {
    id: row.id,
    subjectType: row.subjectType,
    subjectId: row.subjectId,
    pin: row.pin,
    wordsStand,
    text: row.text,
    voices,
    level,
    authorName: names.get(row.authorId) ?? '',
    writtenAt: row.writtenAt.toISOString(),
    closedAt: row.closedAt?.toISOString() ?? null,
    answers: answers.map((answer) => ({
      id: answer.id,
      authorName: names.get(answer.authorId) ?? '',
      text: answer.text,
      writtenAt: answer.writtenAt.toISOString(),
      mine: answer.authorId === askingId,
    })),
    mine: row.authorId === askingId,
  };
}
