import { useTranslation } from 'react-i18next';
import type { LeftOutOfOpenPage } from '#shared/contracts/open-page.js';
import { useDateWords } from '#src/lib/date-words.js';
import { useWriterWords } from '#src/lib/giver-words.js';
import { useProblemWords } from '#src/lib/problem-words.js';
import { Button } from '#src/ui/button.js';
import { TroubleNote } from '#src/ui/waiting.js';
import { useTakeBackNoName } from '../api/open-page-api.js';

interface NoNamesProps {
  communityId: string;
  leftOut: readonly LeftOutOfOpenPage[];
}

/** What stands on the page because somebody said that it names nobody: who and when, and the way back. */
export function NoNames({ communityId, leftOut }: NoNamesProps) {
  const { t } = useTranslation('open');
  const words = useProblemWords();
  const dates = useDateWords();
  const writer = useWriterWords();
  const takeBack = useTakeBackNoName(communityId);
  const said = leftOut.flatMap(({ title, noNames }) => noNames.map((noName) => ({ title, ...noName })));
  if (said.length === 0) return null;
  return (
    <div className="border-t border-hairline pt-3">
      <p>{t('board.noName.title')}</p>
      <ul className="mt-2 grid gap-3">
        {said.map(({ id, title, word, text, name, saidByName, saidAt }) => (
          <li key={id}>
            <p>
              <strong>{title}</strong>
            </p>
            <p>{t('board.leftOut.words', { word: t(`board.leftOut.word.${word}`), text })}</p>
            <p className="text-small">
              {t('board.noName.said', { name, who: writer(saidByName), when: dates.moment(saidAt) })}
            </p>
            <Button
              look="quiet"
              busy={takeBack.isPending && takeBack.variables === id}
              onClick={() => {
                takeBack.mutate(id);
              }}
            >
              {t('board.noName.takeBack')}
            </Button>
          </li>
        ))}
      </ul>
      {takeBack.error !== null && <TroubleNote sentence={words.problem(takeBack.error)} />}
    </div>
  );
}
