import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import type { AnswerWord, OwnAnswer } from '#shared/contracts/reviews.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { useActing } from '#src/lib/session.js';
import { Button } from '#src/ui/button.js';
import { useToast } from '#src/ui/toast.js';
import { useLetOwnStand, usePutOwnAnswer, useTakeBackOwnAnswer } from '../api/own-entries-api.js';
import type { VersionRef } from '../api/reviews-api.js';
import { AnswerButtons } from './answer-buttons.js';
import { SpokenLine } from './answer-voice.js';
import { NotePanel, type Speak } from './note-panel.js';

/** The same four buttons as in the elders' review, for whoever keeps the entry. */
export function OwnAnswerFoot({
  versionRef,
  entryId,
  answer,
  speak,
  onAnswered,
}: {
  versionRef: VersionRef;
  entryId: string;
  answer: OwnAnswer | null;
  speak: Speak;
  onAnswered: () => void;
}) {
  const { t } = useTranslation('reviews');
  const words = useProblemWords();
  const say = useToast();
  const put = usePutOwnAnswer(versionRef);
  const takeBack = useTakeBackOwnAnswer(versionRef);
  const letStand = useLetOwnStand(versionRef);
  const { displayName } = useActing();
  const [noteFor, setNoteFor] = useState<AnswerWord | null>(null);

  const save = async (
    chosen: AnswerWord,
    note: string,
    recordingId = answer?.answer === chosen ? (answer.spoken?.attachmentId ?? null) : null,
  ): Promise<boolean> => {
    try {
      await put.mutateAsync({ entryId, answer: chosen, note, recordingId });
    } catch (cause) {
      say(words.problem(cause));
      return false;
    }
    setNoteFor(null);
    say(t('keptToast', { answer: t(`answer.${chosen}`) }));
    onAnswered();
    return true;
  };
  const done = (sentence: string) => ({
    onSuccess: () => {
      say(sentence);
    },
    onError: (cause: Error) => {
      say(words.problem(cause));
    },
  });

  if (noteFor !== null) {
    return (
      <div className="answer-foot">
        <NotePanel
          draftName={`own-answer.${versionRef.calendarId}.${versionRef.number}.${entryId}`}
          answer={noteFor}
          before={answer?.note ?? ''}
          busy={put.isPending}
          speak={speak}
          onSave={(note, recordingId) => save(noteFor, note, recordingId ?? undefined)}
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
          <SpokenLine answer={{ ...answer, elderName: displayName }} />
          <span className="flex flex-wrap">
            <Button
              look="quiet"
              onClick={() => {
                setNoteFor(answer.answer);
              }}
            >
              {answer.note === '' ? t('addNote') : t('changeNote')}
            </Button>
            <Button
              look="quiet"
              busy={takeBack.isPending}
              onClick={() => {
                takeBack.mutate(entryId, done(t('takenBack')));
              }}
            >
              {t('takeBack')}
            </Button>
            {answer.answer === 'change-this' && !answer.letStand && (
              <Button
                busy={letStand.isPending}
                onClick={() => {
                  letStand.mutate(entryId, done(t('letStandDone')));
                }}
              >
                {t('letStand')}
              </Button>
            )}
          </span>
          {answer.letStand && <span>{t('standing')}</span>}
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
