import { useQuery } from '@tanstack/react-query';
import { useTranslation } from 'react-i18next';
import { useProblemWords } from '#src/lib/problem-words.js';
import { Board } from '#src/ui/surfaces.js';
import { Skeleton, TroubleNote } from '#src/ui/waiting.js';
import { letterChoiceQuery } from '../api/letters-api.js';
import { LetterChoiceForm } from './letter-choice-form.js';

/** How the person is asked when something waits for them. */
export function LetterChoiceBoard() {
  const { t } = useTranslation('letters');
  const words = useProblemWords();
  const choice = useQuery({ ...letterChoiceQuery, staleTime: Infinity });
  return (
    <Board title={t('choice.title')}>
      {choice.isPending && <Skeleton lines={4} />}
      {choice.error !== null && (
        <TroubleNote sentence={words.problem(choice.error)} onRetry={() => void choice.refetch()} />
      )}
      {choice.data && <LetterChoiceForm saved={choice.data} />}
    </Board>
  );
}
