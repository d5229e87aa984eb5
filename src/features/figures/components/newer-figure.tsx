import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import type { Chart, FigureInput } from '#shared/contracts/figures.js';
import { Button } from '#src/ui/button.js';
import { PickGroup } from '#src/ui/pick.js';
import { Board } from '#src/ui/surfaces.js';
import { differingParts, joinParts, type FigurePartName } from '../model/figure-draft.js';
import { useFigureFieldWords } from './figure-field-words.js';

/** Two people wrote to one figure: both texts of each field that differs, and the person says which stays. */
export function NewerFigure({
  theirs,
  mine,
  chart,
  onJoin,
}: {
  theirs: FigureInput;
  mine: FigureInput;
  chart: Chart;
  onJoin: (joined: FigureInput) => void;
}) {
  const { t } = useTranslation('figures');
  const words = useFigureFieldWords(chart);
  const parts = differingParts(theirs, mine);
  const [choices, setChoices] = useState<Partial<Record<FigurePartName, 'theirs' | 'mine'>>>({});
  const take = () => {
    onJoin(
      joinParts(
        theirs,
        mine,
        parts.filter((part) => choices[part] === 'mine'),
      ),
    );
  };
  const isOpen = parts.some((part) => choices[part] === undefined);
  return (
    <Board title={t('stale.title')} role="alert" className="border-s-[6px] border-s-ochre">
      <p>{parts.length === 0 ? t('stale.same') : t('stale.lead', { count: parts.length })}</p>
      <div className="mt-4 grid gap-5">
        {parts.map((part) => (
          <PickGroup
            key={part}
            label={t(`part.${part}`)}
            stacked
            value={choices[part] ?? null}
            onChange={(side) => {
              setChoices({ ...choices, [part]: side });
            }}
            options={[
              { value: 'theirs', label: t('stale.theirs'), note: words(part, theirs) },
              { value: 'mine', label: t('stale.mine'), note: words(part, mine) },
            ]}
          />
        ))}
      </div>
      <div className="mt-4">
        <Button closedBecause={isOpen ? t('stale.first') : undefined} onClick={take}>
          {t('stale.take')}
        </Button>
      </div>
    </Board>
  );
}
