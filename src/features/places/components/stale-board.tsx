import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import type { PlaceInput } from '#shared/contracts/places.js';
import { Button } from '#src/ui/button.js';
import { PickGroup } from '#src/ui/pick.js';
import { Board } from '#src/ui/surfaces.js';
import { clashesOf, firstChoices, joinStates, type Choices } from '../model/stale-choice.js';
import { FIELD_NAMES } from './field-names.js';
import { PlaceFieldValue } from './place-field-value.js';

export interface StaleBoardProps {
  /** What the draft began from; null where nobody knows any more. */
  base: PlaceInput | null;
  theirs: PlaceInput;
  mine: PlaceInput;
  onJoin: (joined: PlaceInput) => void;
}

/** Two people wrote to one place: both states field by field, and the person says which stays. */
export function StaleBoard({ base, theirs, mine, onJoin }: StaleBoardProps) {
  const { t } = useTranslation('places');
  const clashes = clashesOf(base, theirs, mine);
  const [choices, setChoices] = useState<Choices>(() => firstChoices(clashes));
  const joined = joinStates(clashes, choices, theirs, mine);
  return (
    <Board title={t('stale.title')} role="alert" className="border-s-[6px] border-s-ochre">
      <p>{clashes.length === 0 ? t('stale.same') : t('stale.lead', { count: clashes.length })}</p>
      <div className="mt-4 grid gap-5">
        {clashes.map(({ field, changedBy }) => (
          <PickGroup
            key={field}
            label={t(FIELD_NAMES[field])}
            hint={base === null ? undefined : t(`stale.changedBy.${changedBy}`)}
            stacked
            className="mid:[&_.picks]:grid-cols-2"
            value={choices[field] ?? null}
            onChange={(side) => {
              setChoices({ ...choices, [field]: side });
            }}
            options={[
              {
                value: 'theirs',
                label: t('stale.theirs'),
                note: <PlaceFieldValue field={field} place={theirs} />,
              },
              { value: 'mine', label: t('stale.mine'), note: <PlaceFieldValue field={field} place={mine} /> },
            ]}
          />
        ))}
      </div>
      <div className="mt-4 flex flex-wrap gap-3">
        <Button
          closedBecause={joined === null ? t('stale.takeBecause') : undefined}
          onClick={() => {
            if (joined !== null) onJoin(joined);
          }}
        >
          {t('stale.take')}
        </Button>
        <Button
          look="quiet"
          onClick={() => {
            onJoin(theirs);
          }}
        >
          {t('stale.takeTheirs')}
        </Button>
      </div>
    </Board>
  );
}
