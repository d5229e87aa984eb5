import type { NoteSubjectType } from '#shared/contracts/notes.js';
import type { EntityManager } from 'typeorm';
import { NoteEntity } from '../../db/entities/note.entity.js';

/** Takes a note with its answers out of the tables. */
export async function eraseNote(manager: EntityManager, noteId: string): Promise<void> {
  await manager.delete(NoteEntity, { id: noteId });
}

/** What people remarked on a thing goes with it: a note quotes and tells of it. Returns which notes went. */
export async function eraseNotesOf(
  manager: EntityManager,
  subjectType: NoteSubjectType,
  subjectId: string,
): Promise<string[]> {
  const rows = await manager.findBy(NoteEntity, { subjectType, subjectId });
  for (const { id } of rows) await eraseNote(manager, id);
  return rows.map(({ id }) => id);
}
