import { useTranslation } from 'react-i18next';
import type { DriftTurn } from '#shared/contracts/drift.js';
import { useDateWords } from '#src/lib/date-words.js';

/** Where the day begins or ceases to exist, and what the star does without it. */
export function DriftTurns({ turns }: { turns: readonly DriftTurn[] }) {
  const { t } = useTranslation('drift');
  const dates = useDateWords();
  if (turns.length === 0) return null;
  return (
    <ul className="mt-2 grid gap-1">
      {turns.map((turn) => {
        const state = turn.outcomeDetail ?? turn.outcome;
        return (
          <li key={turn.year}>
            {turn.change === 'begins'
              ? t('turn.begins', { year: dates.year(turn.year), before: t(`turn.before.${state}`) })
              : t('turn.ceases', { year: dates.year(turn.year), now: t(`turn.now.${state}`) })}
          </li>
        );
      })}
    </ul>
  );
}
