import { useQueryClient } from '@tanstack/react-query';
import type { Note } from '#shared/contracts/notes.js';
import { SpokenWords } from '#src/features/attachments/components/spoken-words.js';

/** What was said to a note, and the way to say more; it goes to whoever reads the note. */
export function VoicesOfNote({
  communityId,
  note,
  begins,
}: {
  communityId: string;
  note: Note;
  begins: boolean;
}) {
  const client = useQueryClient();
  const isUnsaid = note.text === '' && note.voices === 0;
  return (
    <SpokenWords
      communityId={communityId}
      subject={{ subjectType: 'note', subjectId: note.id }}
      level={note.level === 'elders' ? 'elders' : 'village'}
      count={note.voices}
      begins={begins}
      maySpeak={note.closedAt === null && (note.mine || !isUnsaid)}
      onSaid={() => void client.invalidateQueries({ queryKey: ['notes', communityId] })}
    />
  );
}
