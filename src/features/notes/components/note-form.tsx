import { useState, type SubmitEvent } from 'react';
import { useTranslation } from 'react-i18next';
import { NOTE_LEVELS, noteInput, type NoteLevel, type NotePin } from '#shared/contracts/notes.js';
import { ApiProblem } from '#src/lib/api-problem.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { Button } from '#src/ui/button.js';
import { SelectField, TextAreaField } from '#src/ui/field.js';
import { PickGroup } from '#src/ui/pick.js';
import { Care } from '#src/ui/surfaces.js';
import { useToast } from '#src/ui/toast.js';
import { useAddNote, type NotedThing } from '../api/notes-api.js';
import type { NotedText } from './notes-panel.js';
import { QuoteField } from './quote-field.js';

export interface NoteFormProps {
  thing: NotedThing;
  texts: readonly NotedText[];
  onDone: () => void;
}

/** Pins a note: where, what, and for whom. */
export function NoteForm({ thing, texts, onDone }: NoteFormProps) {
  const { t } = useTranslation('notes');
  const words = useProblemWords();
  const say = useToast();
  const add = useAddNote(thing);
  const [pin, setPin] = useState<NotePin>({ at: 'whole' });
  const [text, setText] = useState('');
  const [level, setLevel] = useState<NoteLevel>('village');
  const [refused, setRefused] = useState<ReadonlyMap<string, string>>(new Map());
  const [overall, setOverall] = useState<string | null>(null);
  const places = placesOf(thing, texts);

  const refuse = (errors: readonly (readonly [string, string])[]) => {
    setRefused(new Map(errors.map(([field, said]) => [field.split('.')[0] ?? '', said])));
  };
  const send = async () => {
    const { communityId: _village, ...subject } = thing;
    const parsed = noteInput.safeParse({ ...subject, pin, text, level });
    setOverall(null);
    refuse(
      parsed.success
        ? []
        : parsed.error.issues.map(({ path, message }) => [String(path[0]), words.field(message)] as const),
    );
    if (!parsed.success) return;
    try {
      await add.mutateAsync({ pin: parsed.data.pin, text: parsed.data.text, level });
      say(t('pinned'));
      onDone();
    } catch (cause) {
      const errors = cause instanceof ApiProblem ? cause.errors : [];
      refuse(errors.map(({ field, code, message }) => [field, words.field(code, message)] as const));
      if (errors.length === 0) setOverall(words.problem(cause));
    }
  };
  return (
    <form
      noValidate
      className="grid gap-4"
      onSubmit={(event: SubmitEvent<HTMLFormElement>) => {
        event.preventDefault();
        event.stopPropagation();
        void send();
      }}
    >
      {places.length > 1 && (
        <SelectField
          label={t('where')}
          value={pin.at}
          onChange={(event) => {
            setPin(pinAt(event.currentTarget.value as NotePin['at'], texts));
          }}
        >
          {places.map((at) => (
            <option key={at} value={at}>
              {t(`pin.${at}`)}
            </option>
          ))}
        </SelectField>
      )}
      {pin.at === 'words' && (
        <QuoteField pin={pin} texts={texts} problem={refused.get('pin')} onChange={setPin} />
      )}
      <TextAreaField
        label={t('yourNote')}
        rows={3}
        value={text}
        problem={refused.get('text')}
        onChange={(event) => {
          setText(event.currentTarget.value);
        }}
      />
      <PickGroup
        label={t('forWhom')}
        stacked
        value={level}
        onChange={setLevel}
        options={NOTE_LEVELS.map((one) => ({ value: one, label: t(`level.${one}`) }))}
      />
      {overall !== null && (
        <Care blocked role="alert">
          <p>{overall}</p>
        </Care>
      )}
      <div className="flex flex-wrap gap-3">
        <Button type="submit" busy={add.isPending}>
          {t('pinIt')}
        </Button>
        <Button look="quiet" onClick={onDone}>
          {t('leave')}
        </Button>
      </div>
    </form>
  );
}

/** Where on such a thing a note can stand. */
function placesOf({ subjectType }: NotedThing, texts: readonly NotedText[]): NotePin['at'][] {
  return [
    'whole',
    ...(subjectType === 'entry' ? (['window', 'marker'] as const) : []),
    ...(texts.some(({ text }) => text !== '') ? (['words'] as const) : []),
  ];
}

function pinAt(at: NotePin['at'], texts: readonly NotedText[]): NotePin {
  if (at !== 'words') return { at };
  const first = texts.find(({ text }) => text !== '');
  return { at, field: first?.field ?? 'notes', quote: '' };
}
