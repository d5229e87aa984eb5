import { In, type EntityManager } from 'typeorm';
import { AttachmentEntity } from '../../db/entities/attachment.entity.js';
import { maySee } from '../../policy/policy.js';
import { sharedById } from '../../policy/sharing.repository.js';
import type { Viewer } from '../../policy/viewer.js';

export interface NoteVoices {
  /** Something was said and has come whole, whoever may hear it. */
  isSaid: boolean;
  /** How many recordings this viewer may hear of. */
  heard: number;
}

/** What was said to notes that the viewer reads, by the note's id. */
export async function voicesOfNotes(
  manager: EntityManager,
  viewer: Viewer,
  noteIds: readonly string[],
): Promise<(noteId: string) => NoteVoices> {
  const rows =
    noteIds.length === 0
      ? []
      : await manager.find(AttachmentEntity, {
          where: { communityId: viewer.communityId, subjectType: 'note', subjectId: In([...noteIds]) },
          relations: { parts: true, words: true },
        });
  const whole = rows.filter(({ parts, words }) => words.length > 0 || parts.some(({ part }) => part > 0));
  const shared = await sharedById(
    manager,
    'attachment',
    whole.map(({ id }) => id),
  );
  return (noteId) => {
    const said = whole.filter(({ subjectId }) => subjectId === noteId);
    return {
      isSaid: said.length > 0,
      heard: said.filter(({ id }) => maySee(viewer, shared.get(id))).length,
    };
  };
}
