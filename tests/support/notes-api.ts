import type { Note, NoteInput } from '#shared/contracts/notes.js';
import type { Client } from './api.js';

export function noteInput(changes: Partial<NoteInput> = {}): NoteInput {
  return {
    subjectType: 'entry',
    subjectId: '',
    pin: { at: 'whole' },
    text: 'We do this a week later.',
    isSpoken: false,
    level: 'village',
    ...changes,
  };
}

export function notesPath({ communityId }: Client, rest = ''): string {
  return `/api/communities/${communityId}/notes${rest}`;
}

export async function addNote(client: Client, changes: Partial<NoteInput>): Promise<Note> {
  return (await client.post(notesPath(client), noteInput(changes)).expect(201)).body as Note;
}

export async function notesOn(client: Client, subjectType: string, subjectId: string): Promise<Note[]> {
  const path = notesPath(client, `?subjectType=${subjectType}&subjectId=${subjectId}`);
  return ((await client.get(path).expect(200)).body as { items: Note[] }).items;
}
