import { notesEndpoints } from '#shared/contracts/notes.js';
import type { Mount } from '../../http/mount.js';
import { wholeList } from '../../http/reply.js';
import type { NotesService } from './notes.service.js';

export function notesRoutes(mount: Mount, notes: NotesService): void {
  mount.forMember(notesEndpoints.list, async ({ query }, actor) => wholeList(await notes.list(actor, query)));
  mount.forMember(notesEndpoints.add, ({ body }, actor) => notes.add(actor, body));
  mount.forMember(notesEndpoints.answer, ({ params, body }, actor) =>
    notes.answer(actor, params.noteId, body),
  );
  mount.forMember(notesEndpoints.close, ({ params }, actor) => notes.close(actor, params.noteId));
  mount.forMember(notesEndpoints.reopen, ({ params }, actor) => notes.reopen(actor, params.noteId));
}
