import { Check, Pin, Undo2 } from 'lucide-react';
import { useState, type ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import type { Note } from '#shared/contracts/notes.js';
import { useDateWords } from '#src/lib/date-words.js';
import { useKeptDraft } from '#src/lib/kept-draft.js';
import { useWriterWords } from '#src/lib/giver-words.js';
import { LevelChip } from '#src/lib/level-chip.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { Button } from '#src/ui/button.js';
import { Well } from '#src/ui/surfaces.js';
import { useToast } from '#src/ui/toast.js';
import { useCloseNote, type NotedThing } from '../api/notes-api.js';
import { answerDraft, isText } from '../model/note-draft.js';
import { AnswerForm } from './answer-form.js';

/** One note: where it is pinned, who wrote it when, what was answered, and what this person can do. */
export function NoteCard({ thing, note, voices }: { thing: NotedThing; note: Note; voices: ReactNode }) {
  const { t } = useTranslation('notes');
  const keeper = useKeptDraft(answerDraft(thing, note.id), isText);
  const [isAnswering, setIsAnswering] = useState(keeper.found !== null);
  const isClosed = note.closedAt !== null;
  return (
    <Well className="grid gap-2">
      <p className="flex flex-wrap items-center gap-x-3 gap-y-1 text-small text-umber-soft">
        <span className="flex min-w-0 items-center gap-2">
          <Pin aria-hidden size={18} className="shrink-0" />
          <PinWords note={note} />
        </span>
        {note.level === 'elders' && <LevelChip level="elders" />}
      </p>
      {!note.wordsStand && <p className="text-small font-semibold">{t('wordsChanged')}</p>}
      <Said {...note} text={note.text || t(note.voices > 0 ? 'spoken' : 'toBeSpoken')} />
      {voices}
      {note.answers.length > 0 && (
        <ul aria-label={t('answers')} className="grid gap-2 border-s-2 border-hairline ps-3">
          {note.answers.map((answer) => (
            <li key={answer.id}>
              <Said {...answer} />
            </li>
          ))}
        </ul>
      )}
      {isAnswering && !isClosed ? (
        <AnswerForm
          thing={thing}
          noteId={note.id}
          keeper={keeper}
          onDone={() => {
            setIsAnswering(false);
          }}
        />
      ) : (
        <div className="flex flex-wrap gap-x-4 gap-y-1">
          {!isClosed && (
            <Button
              look="quiet"
              onClick={() => {
                setIsAnswering(true);
              }}
            >
              {t('answer')}
            </Button>
          )}
          {note.mine && <CloseButton thing={thing} note={note} />}
        </div>
      )}
    </Well>
  );
}

function PinWords({ note: { pin } }: { note: Note }) {
  const { t } = useTranslation('notes');
  if (pin.at !== 'words') return <span>{t(`pin.${pin.at}`)}</span>;
  return (
    <span className="min-w-0 break-words">
      {t(`field.${pin.field}`)}: <q>{pin.quote}</q>
    </span>
  );
}

function Said({
  authorName,
  typedByName,
  writtenAt,
  text,
}: Pick<Note, 'authorName' | 'typedByName' | 'writtenAt' | 'text'>) {
  const { t } = useTranslation('notes');
  const dates = useDateWords();
  const nameOf = useWriterWords();
  return (
    <>
      <p className="whitespace-pre-line break-words">{text}</p>
      <p className="text-small text-umber-soft">
        {typedByName === undefined
          ? nameOf(authorName)
          : t('typedBy', { name: nameOf(authorName), typist: typedByName })}{' '}
        · {dates.moment(writtenAt)}
      </p>
    </>
  );
}

function CloseButton({ thing, note }: { thing: NotedThing; note: Note }) {
  const { t } = useTranslation('notes');
  const say = useToast();
  const words = useProblemWords();
  const close = useCloseNote(thing);
  const isClosed = note.closedAt !== null;
  return (
    <Button
      look="quiet"
      busy={close.isPending}
      icon={isClosed ? <Undo2 aria-hidden size={20} /> : <Check aria-hidden size={20} />}
      onClick={() => {
        close.mutate(
          { noteId: note.id, isClosed: !isClosed },
          {
            onSuccess: () => {
              say(t(isClosed ? 'reopened' : 'closedNow'));
            },
            onError: (cause) => {
              say(words.problem(cause));
            },
          },
        );
      }}
    >
      {t(isClosed ? 'reopen' : 'close')}
    </Button>
  );
}
