import type { EntityManager } from 'typeorm';
import { NoteEntity } from '../../db/entities/note.entity.js';
import { maySee } from '../../policy/policy.js';
import { sharedById } from '../../policy/sharing.repository.js';
import type { Viewer } from '../../policy/viewer.js';
import { notedTexts } from './note-subjects.service.js';

/** Whether a note is there for somebody: what it is about, and its own level. */
export async function readsNote(manager: EntityManager, viewer: Viewer, noteId: string): Promise<boolean> {
  const row = await manager.findOneBy(NoteEntity, { id: noteId, communityId: viewer.communityId });
  if (row === null) return false;
  if (!maySee(viewer, (await sharedById(manager, 'note', [noteId])).get(noteId))) return false;
  return (await notedTexts(manager, viewer, row)) !== null;
}
