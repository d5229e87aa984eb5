import { zodResolver } from '@hookform/resolvers/zod';
import type { ChangeEvent } from 'react';
import { useForm } from 'react-hook-form';
import { useTranslation } from 'react-i18next';
import { noteAnswerInput, type NoteAnswerInput } from '#shared/contracts/notes.js';
import type { DraftKeeper } from '#src/lib/kept-draft.js';
import { useFormProblems } from '#src/lib/form-problems.js';
import { Button } from '#src/ui/button.js';
import { TextAreaField } from '#src/ui/field.js';
import { Care } from '#src/ui/surfaces.js';
import { useAnswerNote, type NotedThing } from '../api/notes-api.js';

const FIELDS = ['text'] as const;

export interface AnswerFormProps {
  thing: NotedThing;
  noteId: string;
  keeper: DraftKeeper<string>;
  onDone: () => void;
}

export function AnswerForm({ thing, noteId, keeper, onDone }: AnswerFormProps) {
  const { t } = useTranslation(['notes', 'common']);
  const answer = useAnswerNote(thing);
  const form = useForm({
    resolver: zodResolver(noteAnswerInput),
    defaultValues: { text: keeper.found?.value ?? '' },
  });
  const problems = useFormProblems(form, FIELDS);
  const submit = async ({ text }: NoteAnswerInput) => {
    try {
      await answer.mutateAsync({ noteId, text });
      keeper.dropDraft();
      onDone();
    } catch (cause) {
      problems.show(cause);
    }
  };
  return (
    <form
      noValidate
      className="grid gap-3"
      onSubmit={(event) => {
        event.stopPropagation();
        void form.handleSubmit(submit)(event);
      }}
    >
      {problems.overall !== undefined && (
        <Care blocked role="alert">
          <p>{problems.overall}</p>
        </Care>
      )}
      <TextAreaField
        {...form.register('text', {
          onChange: (event: ChangeEvent<HTMLTextAreaElement>) => {
            keeper.keepDraft(event.target.value, null);
          },
        })}
        label={t('yourAnswer')}
        rows={2}
        problem={problems.at('text')}
      />
      <div className="flex flex-wrap gap-3">
        <Button type="submit" busy={answer.isPending}>
          {t('sendAnswer')}
        </Button>
        <Button
          look="quiet"
          onClick={() => {
            keeper.dropDraft();
            onDone();
          }}
        >
          {t('leave')}
        </Button>
      </div>
    </form>
  );
}
