import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import type { AfterDeath as Chosen } from '#shared/contracts/after-death.js';
import { ApiProblem } from '#src/lib/api-problem.js';
import { useDateWords } from '#src/lib/date-words.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { Button } from '#src/ui/button.js';
import { TextField, TickField } from '#src/ui/field.js';
import { Care } from '#src/ui/surfaces.js';
import { useToast } from '#src/ui/toast.js';
import { Skeleton, TroubleNote } from '#src/ui/waiting.js';
import { afterDeathQuery, useNoteDeath, useUndoDeath, type Whom } from '../api/after-death-api.js';
import { HeirForm, type Villager } from './heir-form.js';

/** What they chose, in numbers; the day; and the way back while nothing was removed. */
export function AfterDeath({
  whom,
  others,
  onDone,
}: {
  whom: Whom;
  /** Everybody else of the village. */
  others: readonly Villager[];
  onDone: () => void;
}) {
  const words = useProblemWords();
  const { data, error, refetch } = useQuery(afterDeathQuery(whom));
  if (data === undefined) {
    if (error === null) return <Skeleton lines={4} />;
    return <TroubleNote sentence={words.problem(error)} onRetry={() => void refetch()} />;
  }
  return data.diedOn === null ? (
    <Note whom={whom} state={data} onDone={onDone} />
  ) : (
    <Noted whom={whom} others={others} state={data} onDone={onDone} />
  );
}

const CHOICES = ['keep', 'tighten', 'passTo', 'remove'] as const;

function Note({ whom, state, onDone }: { whom: Whom; state: Chosen; onDone: () => void }) {
  const { t } = useTranslation('people');
  const words = useProblemWords();
  const say = useToast();
  const { chosen, openHeirs } = state;
  const note = useNoteDeath(whom);
  const [diedOn, setDiedOn] = useState('');
  const [isSure, setIsSure] = useState(false);
  const [problem, setProblem] = useState<{ field: string | undefined; overall: string | undefined }>();
  const send = async () => {
    if (diedOn === '') {
      setProblem({ field: words.field('required'), overall: undefined });
      return;
    }
    try {
      await note.mutateAsync({ diedOn, removesForGood: isSure });
      say(t('death.done'));
      onDone();
    } catch (cause) {
      const [first] = cause instanceof ApiProblem ? cause.errors : [];
      setProblem({
        field: first && words.field(first.code, first.message),
        overall: first ? undefined : words.problem(cause),
      });
    }
  };
  return (
    <div className="grid gap-4">
      <p>{t('death.what')}</p>
      <ul className="grid gap-1">
        {CHOICES.filter((choice) => chosen[choice] > 0).map((choice) => (
          <li key={choice}>{t(`death.chosen.${choice}`, { count: chosen[choice] })}</li>
        ))}
      </ul>
      {openHeirs.length > 0 && (
        <p>{t('death.openHeirs', { names: openHeirs.map((each) => `“${each}”`).join(', ') })}</p>
      )}
      <TextField
        type="date"
        label={t('death.day')}
        value={diedOn}
        problem={problem?.field}
        onChange={(event) => {
          setDiedOn(event.currentTarget.value);
          setProblem(undefined);
        }}
      />
      {chosen.remove > 0 && (
        <TickField
          label={t('death.sure')}
          checked={isSure}
          onChange={(event) => {
            setIsSure(event.currentTarget.checked);
          }}
        />
      )}
      {problem?.overall !== undefined && (
        <Care blocked role="alert">
          <p>{problem.overall}</p>
        </Care>
      )}
      <Button look="main" full busy={note.isPending} onClick={() => void send()}>
        {t('death.note')}
      </Button>
    </div>
  );
}

function Noted({
  whom,
  others,
  state,
  onDone,
}: {
  whom: Whom;
  others: readonly Villager[];
  state: Chosen;
  onDone: () => void;
}) {
  const { t } = useTranslation('people');
  const dates = useDateWords();
  const words = useProblemWords();
  const say = useToast();
  const undo = useUndoDeath(whom);
  const takeBack = async () => {
    try {
      await undo.mutateAsync();
      say(t('death.undone'));
      onDone();
    } catch (cause) {
      say(words.problem(cause));
    }
  };
  return (
    <div className="grid gap-4">
      {state.diedOn !== null && <p>{t('death.noted', { day: dates.day(state.diedOn, 'year') })}</p>}
      {state.openHeirs.map((name) => (
        <HeirForm key={name} whom={whom} name={name} others={others} />
      ))}
      {state.mayUndo ? (
        <Button busy={undo.isPending} onClick={() => void takeBack()}>
          {t('death.undo')}
        </Button>
      ) : (
        <p>{t('death.final')}</p>
      )}
    </div>
  );
}
