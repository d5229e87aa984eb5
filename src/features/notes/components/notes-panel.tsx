import { useQuery } from '@tanstack/react-query';
import { MessageSquarePlus } from 'lucide-react';
import { useState, type ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import type { Note, NoteField } from '#shared/contracts/notes.js';
import { useKeptDraft } from '#src/lib/kept-draft.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { Button } from '#src/ui/button.js';
import { Fold } from '#src/ui/fold.js';
import { Skeleton, TroubleNote } from '#src/ui/waiting.js';
import { notesQuery, type NotedThing } from '../api/notes-api.js';
import { isNoteDraft } from '../model/note-draft.js';
import { NoteCard } from './note-card.js';
import { NoteForm } from './note-form.js';

/** A text of the thing, in which a note can be pinned to a word. */
export interface NotedText {
  field: NoteField;
  text: string;
}

/** Recordings that belong to a note, with the way to add one; `begins` where the note itself is to be spoken. */
export type VoicesOfNote = (note: Note, begins: boolean) => ReactNode;

export interface NotesPanelProps {
  thing: NotedThing;
  texts: readonly NotedText[];
  voices: VoicesOfNote;
}

/** What people remarked on a thing: open notes with their answers, closed ones folded, and the way to pin another. */
export function NotesPanel({ thing, texts, voices }: NotesPanelProps) {
  const { t } = useTranslation('notes');
  const words = useProblemWords();
  const notes = useQuery(notesQuery(thing));
  const keeper = useKeptDraft(`note.${thing.subjectType}.${thing.subjectId}`, isNoteDraft);
  const [isWriting, setIsWriting] = useState(keeper.found !== null);
  const [toSpeakId, setToSpeakId] = useState<string | null>(null);
  const open = (notes.data ?? []).filter(({ closedAt }) => closedAt === null);
  const closed = (notes.data ?? []).filter(({ closedAt }) => closedAt !== null);
  return (
    <div className="grid gap-3">
      {notes.isPending && <Skeleton lines={2} />}
      {notes.error !== null && !notes.data && (
        <TroubleNote sentence={words.problem(notes.error)} onRetry={() => void notes.refetch()} />
      )}
      {notes.isSuccess && open.length === 0 && <p className="text-umber-soft">{t('none')}</p>}
      {open.length > 0 && (
        <ul aria-label={t('open')} className="grid gap-3">
          {open.map((note) => (
            <li key={note.id}>
              <NoteCard thing={thing} note={note} voices={voices(note, note.id === toSpeakId)} />
            </li>
          ))}
        </ul>
      )}
      {isWriting ? (
        <NoteForm
          thing={thing}
          texts={texts}
          keeper={keeper}
          onDone={(toSpeak) => {
            setIsWriting(false);
            setToSpeakId(toSpeak);
          }}
        />
      ) : (
        <div>
          <Button
            icon={<MessageSquarePlus aria-hidden size={20} />}
            onClick={() => {
              setIsWriting(true);
            }}
          >
            {t('write')}
          </Button>
        </div>
      )}
      {closed.length > 0 && (
        <Fold title={t('closed', { count: closed.length })}>
          <ul className="grid gap-3">
            {closed.map((note) => (
              <li key={note.id}>
                <NoteCard thing={thing} note={note} voices={voices(note, false)} />
              </li>
            ))}
          </ul>
        </Fold>
      )}
    </div>
  );
}
