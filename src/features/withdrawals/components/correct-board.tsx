import { PenLine } from 'lucide-react';
import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import type { ItemState } from '#shared/contracts/withdrawals.js';
import { ApiProblem } from '#src/lib/api-problem.js';
import { useKeptDraft } from '#src/lib/kept-draft.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { Button } from '#src/ui/button.js';
import { TextAreaField } from '#src/ui/field.js';
import { Board } from '#src/ui/surfaces.js';
import { useToast } from '#src/ui/toast.js';
import { useAskCorrection, type Item } from '../api/withdrawals-api.js';

const isText = (value: unknown): value is string => typeof value === 'string';

/** Nothing is taken back: the words are put right. A recording's are changed where it stands, all others asked for here. */
export function CorrectBoard({ item, state }: { item: Item; state: ItemState }) {
  const { t } = useTranslation('withdrawals');
  const { itemType } = item;
  if (state.state !== 'shared' || state.title === null) return null;
  if (itemType === 'attachment' && state.isMine) {
    return (
      <Board title={t('correct.title')}>
        <p>{t('correct.words')}</p>
      </Board>
    );
  }
  if (itemType !== 'entry' && itemType !== 'figure') return null;
  return (
    <Board title={t('correct.title')}>
      <Asking item={item} subjectType={itemType} />
    </Board>
  );
}

function Asking({ item, subjectType }: { item: Item; subjectType: 'entry' | 'figure' }) {
  const { t } = useTranslation('withdrawals');
  const words = useProblemWords();
  const say = useToast();
  const keeper = useKeptDraft(`correction.${item.itemId}`, isText);
  const [text, setText] = useState(keeper.found?.value ?? '');
  const [problem, setProblem] = useState<string | undefined>(undefined);
  const ask = useAskCorrection(item, subjectType);
  const send = async () => {
    if (text.trim() === '') {
      setProblem(words.field('required'));
      return;
    }
    try {
      await ask.mutateAsync(text.trim());
      keeper.dropDraft();
      setText('');
      say(t('correct.done'));
    } catch (cause) {
      const [first] = cause instanceof ApiProblem ? cause.errors : [];
      setProblem(first ? words.field(first.code, first.message) : words.problem(cause));
    }
  };
  return (
    <form
      noValidate
      className="grid gap-3"
      onSubmit={(event) => {
        event.preventDefault();
        void send();
      }}
    >
      <p>{t('correct.what')}</p>
      <TextAreaField
        label={t('correct.say')}
        rows={3}
        value={text}
        problem={problem}
        onChange={(event) => {
          setText(event.currentTarget.value);
          setProblem(undefined);
          keeper.keepDraft(event.currentTarget.value, null);
        }}
      />
      <div>
        <Button type="submit" icon={<PenLine aria-hidden size={20} />} busy={ask.isPending}>
          {t('correct.ask')}
        </Button>
      </div>
    </form>
  );
}
