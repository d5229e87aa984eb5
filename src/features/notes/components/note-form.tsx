import { Mic } from 'lucide-react';
import { useState, type SubmitEvent } from 'react';
import { useTranslation } from 'react-i18next';
import { NOTE_LEVELS, noteInput, type NotePin } from '#shared/contracts/notes.js';
import { ApiProblem } from '#src/lib/api-problem.js';
import type { DraftKeeper } from '#src/lib/kept-draft.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { useRolesIn } from '#src/lib/roles-in.js';
import { Button } from '#src/ui/button.js';
import { SelectField, TextAreaField } from '#src/ui/field.js';
import { PickGroup } from '#src/ui/pick.js';
import { Care } from '#src/ui/surfaces.js';
import { useToast } from '#src/ui/toast.js';
import { useAddNote, type NotedThing } from '../api/notes-api.js';
import { EMPTY_NOTE, type NoteDraft } from '../model/note-draft.js';
import type { NotedText } from './notes-panel.js';
import { QuoteField } from './quote-field.js';

export interface NoteFormProps {
  thing: NotedThing;
  texts: readonly NotedText[];
  /** What was written is on this device until it is sent or thrown away. */
  keeper: DraftKeeper<NoteDraft>;
  /** Left, or pinned; with the note that is still to be spoken. */
  onDone: (toSpeakId: string | null) => void;
}

/** Pins a note: where, what, and for whom. It is written, or spoken afterwards. */
export function NoteForm({ thing, texts, keeper, onDone }: NoteFormProps) {
  const { t } = useTranslation('notes');
  const words = useProblemWords();
  const say = useToast();
  const add = useAddNote(thing);
  const { seesDrafts: maySpeak } = useRolesIn(thing.communityId);
  const [draft, setDraft] = useState(keeper.found?.value ?? EMPTY_NOTE);
  const { pin, text, level } = draft;
  const [refused, setRefused] = useState<ReadonlyMap<string, string>>(new Map());
  const [overall, setOverall] = useState<string | null>(null);
  const places = placesOf(thing, texts);

  const change = (changed: Partial<NoteDraft>) => {
    const next = { ...draft, ...changed };
    setDraft(next);
    keeper.keepDraft(next, null);
  };
  const setPin = (next: NotePin) => {
    change({ pin: next });
  };
  const refuse = (errors: readonly (readonly [string, string])[]) => {
    setRefused(new Map(errors.map(([field, said]) => [field.split('.')[0] ?? '', said])));
  };
  const send = async (isSpoken: boolean) => {
    const { communityId: _village, ...subject } = thing;
    const parsed = noteInput.safeParse({ ...subject, ...draft, isSpoken });
    setOverall(null);
    refuse(
      parsed.success
        ? []
        : parsed.error.issues.map(({ path, message }) => [String(path[0]), words.field(message)] as const),
    );
    if (!parsed.success) return;
    try {
      const { pin: where, text: said } = parsed.data;
      const { id } = await add.mutateAsync({ pin: where, text: said, level, isSpoken });
      keeper.dropDraft();
      if (!isSpoken) say(t('pinned'));
      onDone(isSpoken ? id : null);
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
        void send(false);
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
        hint={t('keptHere')}
        rows={3}
        value={text}
        problem={refused.get('text')}
        onChange={(event) => {
          change({ text: event.currentTarget.value });
        }}
      />
      <PickGroup
        label={t('forWhom')}
        stacked
        value={level}
        onChange={(next) => {
          change({ level: next });
        }}
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
        {maySpeak && (
          <Button icon={<Mic aria-hidden size={20} />} onClick={() => void send(true)}>
            {t('sayIt')}
          </Button>
        )}
        <Button
          look="quiet"
          onClick={() => {
            keeper.dropDraft();
            onDone(null);
          }}
        >
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
