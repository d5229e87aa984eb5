import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import type { Answer, AnswerInput, AnswerWord } from '#shared/contracts/reviews.js';
import type { Version } from '#shared/contracts/versions.js';
import { ApiProblem } from '#src/lib/api-problem.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { useSession } from '#src/lib/session.js';
import { Button } from '#src/ui/button.js';
import { Care } from '#src/ui/surfaces.js';
import { useToast } from '#src/ui/toast.js';
import { useLetStand, usePutAnswer, usePutSpokenAnswer, useTakeBackAnswer } from '../api/reviews-api.js';
import { AnswerButtons } from './answer-buttons.js';
import type { Spokesman, SpokesmanProblem } from './for-whom.js';
import { ProofPanel, type Proof } from './proof-panel.js';
import { NotePanel, type Speak } from './note-panel.js';
import { SpokenLine } from './answer-voice.js';

type Unproved = Pick<AnswerInput, 'answer' | 'note' | 'recordingId'>;

interface AnswerFootProps {
  version: Version;
  entryId: string;
  answer: Answer | null;
  /** Null where the elder answers; else on whose behalf, and before whom. */
  spokesman: (Spokesman & { name: string }) | null;
  onMissing: (missing: SpokesmanProblem) => void;
  onAnswered: () => void;
  /** The recorder; null where there is nobody to speak. */
  speak: Speak | null;
}

/** What is said about the elder's PIN, if that was refused. */
function pinProblem(cause: unknown): string | undefined {
  return cause instanceof ApiProblem ? cause.errors.find(({ field }) => field === 'pin')?.code : undefined;
}

/** The four buttons in thumb reach, the note behind them, and what follows an answer. */
export function AnswerFoot(props: AnswerFootProps) {
  const { version, entryId, answer, spokesman, onMissing, onAnswered, speak } = props;
  const { t } = useTranslation(['reviews', 'common', 'problems']);
  const words = useProblemWords();
  const say = useToast();
  const ref = { calendarId: version.calendarId, number: version.number };
  const put = usePutAnswer(ref);
  const takeBack = useTakeBackAnswer(ref);
  const letStand = useLetStand(ref);
  const putSpoken = usePutSpokenAnswer(ref);
  const { helping } = useSession();
  const [noteFor, setNoteFor] = useState<AnswerWord | null>(null);
  const [toProve, setToProve] = useState<Unproved | null>(null);
  const [pinWords, setPinWords] = useState<string | undefined>(undefined);

  if (version.state !== 'in-review') {
    return (
      <Care>
        <p>{t('notInReview', { state: t(`common:state.${version.state}`) })}</p>
      </Care>
    );
  }

  const ready = (): boolean => {
    if (spokesman === null) return true;
    const elder = spokesman.elderId === '' ? t('needElder') : undefined;
    const witness =
      spokesman.witness.trim() === '' && spokesman.pin === '' ? words.field('witness-required') : undefined;
    onMissing({ ...(elder ? { elder } : {}), ...(witness ? { witness } : {}) });
    return elder === undefined && witness === undefined;
  };
  const save = async (
    chosen: AnswerWord,
    note: string,
    recordingId: string | null = answer?.answer === chosen ? (answer.spoken?.attachmentId ?? null) : null,
  ): Promise<boolean> => {
    if (!ready()) return false;
    const needsProof = helping !== undefined && (chosen === 'agree' || !helping.shownPin);
    if (needsProof) {
      setPinWords(undefined);
      setToProve({ answer: chosen, note, recordingId });
      // What was written stays on the device until it is proved.
      return false;
    }
    try {
      await put.mutateAsync({
        entryId,
        answer: chosen,
        note,
        recordingId,
        onBehalfOf: spokesman?.elderId ?? null,
        witness: spokesman?.witness.trim() ?? null,
        ...(spokesman !== null && spokesman.pin !== '' ? { pin: spokesman.pin } : {}),
      });
    } catch (cause) {
      const pin = pinProblem(cause);
      if (pin === undefined) say(words.problem(cause));
      else onMissing({ pin: words.field(pin) });
      return false;
    }
    kept(chosen);
    return true;
  };
  const prove = async (word: Unproved, proof: Proof) => {
    const body = { ...word, entryId, onBehalfOf: null };
    try {
      if ('pin' in proof) await put.mutateAsync({ ...body, witness: null, pin: proof.pin });
      else await putSpoken.mutateAsync({ ...body, clip: proof.clip });
    } catch (cause) {
      const pin = pinProblem(cause);
      if (pin === undefined) say(words.problem(cause));
      else setPinWords(words.field(pin));
      return;
    }
    setToProve(null);
    kept(word.answer);
  };
  const kept = (chosen: AnswerWord) => {
    setNoteFor(null);
    say(
      t('keptToast', { answer: t(`answer.${chosen}`) }),
      spokesman === null && helping === undefined ? { onUndo: undo } : {},
    );
    onAnswered();
  };
  /** Undo brings the answer of before back, or none. */
  const undo = () => {
    if (answer === null) takeBack.mutate(entryId);
    else {
      const { answer: before, note } = answer;
      const recordingId = answer.spoken?.attachmentId ?? null;
      put.mutate({ entryId, answer: before, note, recordingId, onBehalfOf: null, witness: null });
    }
  };
  const choose = (chosen: AnswerWord) => {
    // "Agree" needs no words and is kept at once; the others are asked for a note, which may stay empty for two.
    if (chosen === 'agree') void save(chosen, answer?.answer === 'agree' ? answer.note : '');
    else if (ready()) setNoteFor(chosen);
  };

  if (toProve !== null) {
    return (
      <div className="answer-foot">
        <ProofPanel
          name={helping?.displayName ?? ''}
          answer={toProve.answer}
          busy={put.isPending || putSpoken.isPending}
          problem={pinWords}
          onProof={(proof) => void prove(toProve, proof)}
          onClose={() => {
            setToProve(null);
          }}
        />
      </div>
    );
  }
  if (noteFor !== null) {
    return (
      <div className="answer-foot">
        <NotePanel
          draftName={`answer.${version.id}.${entryId}`}
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
            {spokesman === null
              ? t('saidNow', { answer: t(`answer.${answer.answer}`) })
              : t('saidNowFor', { name: spokesman.name, answer: t(`answer.${answer.answer}`) })}{' '}
            {answer.note !== '' && t('yourNote', { note: answer.note })}
          </span>
          <SpokenLine answer={answer} />
          <span className="flex flex-wrap">
            <Button
              look="quiet"
              onClick={() => {
                setNoteFor(answer.answer);
              }}
            >
              {answer.note === '' ? t('addNote') : t('changeNote')}
            </Button>
            {answer.mine && (
              <Button
                look="quiet"
                onClick={() => {
                  takeBack.mutate(entryId, {
                    onSuccess: () => {
                      say(t('takenBack'));
                    },
                    onError: (cause) => {
                      say(words.problem(cause));
                    },
                  });
                }}
              >
                {t('takeBack')}
              </Button>
            )}
            {answer.mine && answer.answer === 'change-this' && !answer.letStand && (
              <Button
                busy={letStand.isPending}
                onClick={() => {
                  letStand.mutate(entryId, {
                    onSuccess: () => {
                      say(t('letStandDone'));
                    },
                    onError: (cause) => {
                      say(words.problem(cause));
                    },
                  });
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
          label={spokesman?.name ? t('answersFor', { name: spokesman.name }) : t('answers')}
          value={answer?.answer ?? null}
          busy={put.isPending}
          onAnswer={choose}
        />
      </div>
    </>
  );
}
