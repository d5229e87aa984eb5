import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import type { AnswerWord, OwnAnswer } from '#shared/contracts/reviews.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { Button } from '#src/ui/button.js';
import { useToast } from '#src/ui/toast.js';
import { usePutOwnAnswer, useTakeBackOwnAnswer } from '../api/own-entries-api.js';
import type { VersionRef } from '../api/reviews-api.js';
import { AnswerButtons } from './answer-buttons.js';
import { NotePanel } from './note-panel.js';

/** The same four buttons as in the elders' review, for whoever keeps the entry. */
export function OwnAnswerFoot({
  versionRef,
  entryId,
  answer,
  onAnswered,
}: {
  versionRef: VersionRef;
  entryId: string;
  answer: OwnAnswer | null;
  onAnswered: () => void;
}) {
  const { t } = useTranslation('reviews');
  const words = useProblemWords();
  const say = useToast();
  const put = usePutOwnAnswer(versionRef);
  const takeBack = useTakeBackOwnAnswer(versionRef);
  const [noteFor, setNoteFor] = useState<AnswerWord | null>(null);

  const save = async (chosen: AnswerWord, note: string): Promise<boolean> => {
    try {
      await put.mutateAsync({ entryId, answer: chosen, note });
    } catch (cause) {
      say(words.problem(cause));
      return false;
    }
    setNoteFor(null);
    say(t('keptToast', { answer: t(`answer.${chosen}`) }));
    onAnswered();
    return true;
  };
  const forget = () => {
    takeBack.mutate(entryId, {
      onSuccess: () => {
        say(t('takenBack'));
      },
      onError: (cause) => {
        say(words.problem(cause));
      },
    });
  };

  if (noteFor !== null) {
    return (
      <div className="answer-foot">
        <NotePanel
          draftName={`own-answer.${versionRef.calendarId}.${versionRef.number}.${entryId}`}
          answer={noteFor}
          before={answer?.note ?? ''}
          busy={put.isPending}
          speak={null}
          onSave={(note) => save(noteFor, note)}
          onClose={() => {
            setNoteFor(null);
          }}
        />
      </div>
    );
  }
  return (
    <>
      {answer !== null && (
        <div className="answer-said">
          <span>
            {t('saidNow', { answer: t(`answer.${answer.answer}`) })}{' '}
            {answer.note !== '' && t('yourNote', { note: answer.note })}
          </span>
          <span className="flex flex-wrap">
            <Button
              look="quiet"
              onClick={() => {
                setNoteFor(answer.answer);
              }}
            >
              {answer.note === '' ? t('addNote') : t('changeNote')}
            </Button>
            <Button look="quiet" busy={takeBack.isPending} onClick={forget}>
              {t('takeBack')}
            </Button>
          </span>
        </div>
      )}
      <div className="answer-foot">
        <AnswerButtons
          label={t('answers')}
          value={answer?.answer ?? null}
          busy={put.isPending}
          onAnswer={(chosen) => {
            if (chosen === 'agree') void save(chosen, answer?.answer === 'agree' ? answer.note : '');
            else setNoteFor(chosen);
          }}
        />
      </div>
    </>
  );
}
