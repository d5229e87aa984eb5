import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { notesEndpoints, type Note, type NoteInput, type NoteSubject } from '#shared/contracts/notes.js';
import { callApi } from '#src/lib/api-client.js';

/** What a note is pinned to, and in which village. */
export interface NotedThing extends NoteSubject {
  communityId: string;
}

export function notesQuery({ communityId, ...subject }: NotedThing) {
  return queryOptions({
    queryKey: ['notes', communityId, subject],
    queryFn: async ({ signal }) =>
      (await callApi(notesEndpoints.list, { params: { communityId }, query: subject, signal })).items,
  });
}

export function useAddNote(thing: NotedThing) {
  const show = useShowNote(thing);
  const { communityId, ...subject } = thing;
  return useMutation({
    mutationFn: (input: Omit<NoteInput, keyof NoteSubject>) =>
      callApi(notesEndpoints.add, { params: { communityId }, body: { ...subject, ...input } }),
    onSuccess: show,
  });
}

export function useAnswerNote(thing: NotedThing) {
  const show = useShowNote(thing);
  const { communityId } = thing;
  return useMutation({
    mutationFn: ({ noteId, text }: { noteId: string; text: string }) =>
      callApi(notesEndpoints.answer, { params: { communityId, noteId }, body: { text } }),
    onSuccess: show,
  });
}

/** Closes the own note, or opens it again. */
export function useCloseNote(thing: NotedThing) {
  const show = useShowNote(thing);
  const { communityId } = thing;
  return useMutation({
    mutationFn: ({ noteId, isClosed }: { noteId: string; isClosed: boolean }) =>
      callApi(isClosed ? notesEndpoints.close : notesEndpoints.reopen, { params: { communityId, noteId } }),
    onSuccess: show,
  });
}

/** Shows the note as it is now at once; then the list looks again, because others write, too. */
function useShowNote(thing: NotedThing) {
  const client = useQueryClient();
  const { queryKey } = notesQuery(thing);
  return (saved: Note) => {
    client.setQueryData(queryKey, (notes) => {
      if (notes === undefined) return notes;
      const isThere = notes.some(({ id }) => id === saved.id);
      return isThere ? notes.map((each) => (each.id === saved.id ? saved : each)) : [...notes, saved];
    });
    void client.invalidateQueries({ queryKey });
  };
}
